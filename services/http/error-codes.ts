/**
 * What can be wrong with one member of a request: the registry behind `errors[].code` of a problem, `GET /problems`
 * and the OpenAPI document. The first group comes from schemas, the others from the rules between members.
 */
export const ERROR_CODES = {
  "unknown-member": "The object has no member of this name. Every object of a request is strict.",
  "missing-member": "A member that is required, here or because of another member, is absent.",
  "wrong-type": "The member is of another JSON type than the one it takes.",
  "not-whole": "The member takes whole numbers only.",
  "out-of-range": "The number is below the minimum or above the maximum of the member.",
  "not-one-of": "The member takes one of a few values, and this is none of them.",
  "wrong-length": "The text has too few or too many characters.",
  "wrong-count": "The array has too few or too many items.",
  "wrong-format": "The text is not of the form that the member takes, or it has control characters in it.",

  "duplicate-member": "An object names the member twice, or under a name that readers treat differently.",
  "too-deep": "Objects and arrays stand too deep in each other.",

  "not-unique": "Two items that must differ in this member share its value.",
  "not-found": "The member names something that the request does not define.",
  "not-above": "The member must be above another member.",
  "not-below": "The member must be below another member.",
  "charge-is-zero": "An ion has a charge number other than zero.",
  "charge-against-polarity": "The sign of the charge contradicts the polarity.",
  "limits-crossed": "The limit for a caution is stricter than the limit for a pass.",
  "stages-do-not-fit": "The instrument lacks a stage that this kind of acquisition runs through.",

  "needs-two-pole-pairs": "The question is about a mass filter, which has two pole pairs.",
  "member-not-taken": "The member means nothing beside another member of the request.",
  "dc-not-taken": "The question is about RF-only rods, and the drive states a DC.",
  "ion-trap-not-computed": "The formulas of a linear rod set do not hold in an ion trap.",
  "formula-not-computed": "This version does not compute m/z from a formula.",
  "waveform-not-computed": "This version does not answer this question for rectangular waves.",
  "region-not-computed":
    "With a rectangular wave, this version computes set points of the first stability region only.",
} as const satisfies Record<string, string>;

export type ErrorCode = keyof typeof ERROR_CODES;
