import { z } from "zod";

/** Well-formed Unicode without control characters: a lone surrogate would make canonical JSON impossible. */
const PRINTABLE = /^[^\p{Cc}\p{Cs}]+$/u;
const FORMULA = /^[A-Za-z0-9[\]()+-]+$/;

/**
 * A text of 1 to `most` characters. JSON Schema counts characters where zod counts UTF-16 units, so the length is
 * checked here and stated beside the schema: both then agree on letters beyond the basic plane.
 */
function text(description: string, most: number, pattern: RegExp) {
  return z
    .string()
    .check(({ value, issues }) => {
      if (value.length === 0) {
        issues.push({ code: "too_small", origin: "string", minimum: 1, inclusive: true, input: value });
      } else if (value.length > most && [...value].length > most) {
        issues.push({ code: "too_big", origin: "string", maximum: most, inclusive: true, input: value });
      }
    })
    .regex(pattern)
    .meta({ description, minLength: 1, maxLength: most });
}

export const Identifier = text("A name of the laboratory's own, no control characters.", 100, PRINTABLE);
export const Label = text("A short text for people, no control characters.", 200, PRINTABLE);
export const Sentence = text("A text for people, no control characters.", 2000, PRINTABLE);
export const FormulaText = text("A molecular formula, such as C33H40N2O9.", 200, FORMULA);
export const AdductText = text("The adduct in brackets with its charge, such as [M+H]+.", 60, FORMULA);
