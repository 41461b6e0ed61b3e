import { z } from "zod";

/** Well-formed Unicode without control characters: a lone surrogate would make canonical JSON impossible. */
const PRINTABLE = /^[^\p{Cc}\p{Cs}]+$/u;

export const Identifier = z
  .string()
  .min(1)
  .max(100)
  .regex(PRINTABLE)
  .meta({ description: "A name of the laboratory's own, 1 to 100 characters, no control characters." });

export const Label = z
  .string()
  .min(1)
  .max(200)
  .regex(PRINTABLE)
  .meta({ description: "A short text for people, 1 to 200 characters, no control characters." });

export const Sentence = z
  .string()
  .min(1)
  .max(2000)
  .regex(PRINTABLE)
  .meta({ description: "A text for people, 1 to 2,000 characters, no control characters." });

export const FormulaText = z
  .string()
  .min(1)
  .max(200)
  .regex(/^[A-Za-z0-9[\]()+-]+$/)
  .meta({ description: "A molecular formula, such as C33H40N2O9." });

export const AdductText = z
  .string()
  .min(1)
  .max(60)
  .regex(/^[A-Za-z0-9[\]()+-]+$/)
  .meta({ description: "The adduct in brackets with its charge, such as [M+H]+." });
