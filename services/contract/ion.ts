import { z } from "zod";
import { Mz } from "./quantity.ts";
import type { ErrorItem } from "./rule.ts";
import { AdductText, FormulaText, Label } from "./text.ts";

export const Ion = z
  .union([
    z
      .strictObject({
        mz: Mz,
        charge: z.int().min(-200).max(200).optional().meta({
          description: "Charge number with sign; 1 or -1 by the polarity when absent. Zero is refused.",
        }),
        label: Label.optional(),
      })
      .meta({ id: "IonByMz" }),
    z
      .strictObject({
        formula: FormulaText,
        adduct: AdductText,
        label: Label.optional(),
        isotopologue: z.enum(["monoisotopic", "most-abundant"]).optional(),
      })
      .meta({ id: "IonByFormula" }),
  ])
  .meta({ id: "Ion", description: "An ion, by its m/z or by formula and adduct." });
export type Ion = z.output<typeof Ion>;

/** The rules every ion obeys wherever it stands in a request. */
export function ionErrors(ion: Ion, pointer: string): ErrorItem[] {
  if ("formula" in ion) return [formulaNotComputed(`${pointer}/formula`)];
  if (ion.charge !== 0) return [];
  return [
    {
      pointer: `${pointer}/charge`,
      code: "charge-is-zero",
      detail:
        "charge is 0; an ion has a charge number from -200 to 200 other than 0. Leave the member out when it is not known.",
    },
  ];
}

export function formulaNotComputed(pointer: string): ErrorItem {
  return {
    pointer,
    code: "formula-not-computed",
    detail: "This version does not compute m/z from a formula; state the ion by its mz.",
  };
}

/** m/z of an ion that passed `ionErrors`. */
export function mzOfIon(ion: Ion): number {
  if ("formula" in ion)
    throw new TypeError("An ion by formula reached the computation; ionErrors refuses it first.");
  return ion.mz;
}

export function chargeNumberOf(ion: Ion): number {
  return "mz" in ion ? Math.abs(ion.charge ?? 1) : 1;
}
