/** The chapters of the document. */
export const TAGS = {
  "Ion motion": "Stability, confinement and flight of single ions.",
  "Mass filter": "What a mass filter lets through, and the volts for a wanted window.",
  "Sign-off": "A whole method on an instrument, judged against criteria.",
  Service: "The service itself, its limits and its problems.",
} as const satisfies Record<string, string>;

export type Tag = keyof typeof TAGS;
