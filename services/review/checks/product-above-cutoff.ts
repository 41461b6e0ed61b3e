import { RF_ONLY_LIMIT_Q } from "../../physics/first-region.ts";
import { defineCheck } from "../check.ts";
import type { Bounds, PassesIf } from "../finding.ts";
import { boundsOf, LowerLimit } from "../limit.ts";
import type { Observation } from "../observation.ts";
import type { Guiding } from "../resolve/resolved-method.ts";
import { digits } from "../statement.ts";

export const productAboveCutoff = defineCheck({
  id: "product-above-cutoff",
  computes:
    "m/z of the product ion over the low-mass cutoff of the RF-only collision cell as the acquisition sets it, and of the lightest ion over the cutoff of each rod set that only passes ions.",
  needs: ["stages/rf", "stages/rodSet", "acquisition/cell/rf", "acquisition/product"],
  quantities: [
    { quantity: "product-over-cutoff", unit: "1", meaning: "product m/z over the cutoff of the cell" },
    {
      quantity: "ion-over-cutoff",
      unit: "1",
      meaning: "lightest m/z over the cutoff of a guide or an RF-only filter",
    },
  ],
  requiredByDefault: true,
  limit: LowerLimit,
  defaults: { pass: { min: 1.2 }, caution: { min: 1.05 } },
  basis:
    "Nothing below q = 0.908 is confined and acceptance falls to zero at the cutoff; 1.20 and 1.05 are common practice, no source.",
  examine: ({ acquisitions, guides }, limits) => {
    const pass = boundsOf(limits.pass);
    const caution = boundsOf(limits.caution);
    return [
      ...guides.map((guide) => overCutoff(guide, "ion-over-cutoff", pass, caution)),
      ...acquisitions.flatMap(({ cells }) =>
        cells.map((cell) => overCutoff(cell, "product-over-cutoff", pass, caution)),
      ),
    ];
  },
});

function overCutoff(cell: Guiding, quantity: string, pass: Bounds, caution: Bounds): Observation {
  const { stage } = cell.placed;
  const product = cell.product!;
  const about = {
    quantity,
    unit: "1",
    subject: {
      pointer: product.pointer,
      acquisition: cell.acquisition.id,
      stage: stage.name,
      ion: product.ion,
    },
  };
  if (cell.polePairs > 2) {
    return {
      ...about,
      kind: "not-applicable",
      statement: `${stage.name} has ${cell.polePairs} pole pairs; a sharp low-mass cutoff is defined for two.`,
    };
  }
  if (cell.cutoffMz === null) {
    return {
      ...about,
      kind: "indeterminate",
      missing: cell.cutoffMissing,
      statement: `The low-mass cutoff of ${stage.name} does not follow without ${cell.cutoffMissing.join(", ")}.`,
    };
  }
  // Without RF nothing is confined, but then there is no cutoff either.
  if (cell.cutoffMz === 0) {
    return {
      ...about,
      kind: "impossible",
      evidence: cell.evidence,
      pass,
      caution,
      passesIf: null,
      statement: `${stage.name} has no RF voltage: no ion is confined.`,
    };
  }
  const value = product.mz / cell.cutoffMz;
  const place =
    value < 1 ? "below the cutoff: the ion is lost there" : `${digits(value, 4)} times the cutoff`;
  return {
    ...about,
    kind: "value",
    value,
    evidence: cell.evidence,
    pass,
    caution,
    passesIf: passesIfLower(cell, value, pass.min),
    statement: `m/z ${product.mz} is ${place} (cutoff m/z ${digits(cell.cutoffMz, 5)}) in ${stage.name}.`,
  };
}

/** The cutoff is proportional to every way in which the cell's RF can be set, so each input scales by the same factor. */
function passesIfLower(cell: Guiding, value: number, min: number | null): PassesIf | null {
  if (cell.setting === null || min === null) return null;
  const { rf, pointer } = cell.setting;
  const factor = value / min;
  switch (rf.mode) {
    case "fixed":
      return { input: `${pointer}/rf/volts`, min: null, max: rf.rf.volts * factor, unit: "V" };
    case "cutoff":
      return { input: `${pointer}/mz`, min: null, max: rf.mz * factor, unit: "1" };
    case "precursor-q":
      return { input: `${pointer}/q`, min: null, max: rf.q * factor, unit: "1" };
    case "product-q":
      return { input: `${pointer}/q`, min: null, max: RF_ONLY_LIMIT_Q / min, unit: "1" };
    case "table":
      return { input: `${pointer}/points`, min: null, max: cell.cutoffMz! * factor, unit: "1" };
  }
}
