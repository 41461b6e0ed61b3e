import { z } from "zod";
import { quantity } from "../contract/quantity.ts";
import { FormulaText, Identifier, Label } from "../contract/text.ts";
import { Acquisition, Polarity } from "./acquisition.ts";

export const MAX_ACQUISITIONS = 2000;

export const PeakWidth_s = quantity("Width of the chromatographic peak in s.", 1e-3, 1e5);
export const Cycle_ms = quantity(
  "Wanted cycle time in ms, shared among the acquisitions of the moment.",
  0.01,
  1e6,
);

const Timing = z
  .discriminatedUnion("mode", [
    z
      .strictObject({ mode: z.literal("dwell") })
      .meta({ id: "TimingByDwell", description: "Every acquisition states its dwell time." }),
    z
      .strictObject({
        mode: z.literal("cycle"),
        cycle_ms: Cycle_ms,
        dwellMin_ms: quantity("Shortest dwell time that is given, in ms.", 0, 1e6),
        dwellMax_ms: quantity("Longest dwell time that is given, in ms.", 0, 1e6),
      })
      .meta({ id: "TimingByCycle" }),
  ])
  .meta({ id: "Timing" });
export type Timing = z.output<typeof Timing>;

const Compound = z
  .strictObject({
    id: Identifier,
    name: Label.optional(),
    formula: FormulaText.optional(),
    internalStandard: z.boolean().optional(),
    range: z
      .strictObject({
        low: quantity("Lower end of the working range, in the unit of amount.", 0, 1e12),
        high: quantity("Upper end of the working range, in the unit of amount.", 0, 1e12),
      })
      .optional(),
    amount: quantity("Amount of an internal standard, in the unit of the range.", 0, 1e12).optional(),
    isotopicPurity: quantity("Fraction of the labelled compound that is labelled.", 0, 1).optional(),
  })
  .meta({ id: "Compound" });

export const Method = z
  .strictObject({
    id: Identifier,
    revision: Identifier,
    label: Label.optional(),
    polarity: Polarity,
    timing: Timing,
    chromatographicPeakWidth: z
      .strictObject({
        value_s: PeakWidth_s,
        at: z.enum(["base", "half-height"]),
      })
      .optional(),
    compounds: z.array(Compound).max(MAX_ACQUISITIONS).optional(),
    acquisition: z.array(Acquisition).min(1).max(MAX_ACQUISITIONS),
  })
  .meta({ id: "Method", description: "What the method acquires." });
export type Method = z.output<typeof Method>;
