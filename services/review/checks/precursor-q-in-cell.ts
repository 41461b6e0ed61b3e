import { RF_ONLY_LIMIT_Q } from "../../physics/first-region.ts";
import { defineCheck } from "../check.ts";
import type { Bounds, PassesIf } from "../finding.ts";
import { boundsOf, RangeLimit } from "../limit.ts";
import type { Observation } from "../observation.ts";
import type { Guiding } from "../resolve/resolved-method.ts";
import { digits } from "../statement.ts";
import { wellDepthKnown } from "./cell-well-depth.ts";

export const precursorQInCell = defineCheck({
  id: "precursor-q-in-cell",
  computes: "Mathieu q of the precursor ion in the RF-only collision cell.",
  needs: ["stages/rf", "stages/rodSet", "acquisition/cell/rf", "acquisition/precursor"],
  quantities: [{ quantity: "precursor-q", unit: "1", meaning: "q of the precursor in the cell" }],
  requiredByDefault: true,
  limit: RangeLimit,
  defaults: { pass: { max: 0.7, min: 0.02 }, caution: { max: 0.85 } },
  basis:
    "Stable up to q = 0.908 (computed); 0.7 and 0.85 are common practice, no source. Below 0.02 confinement is weak; that is a caution only where the well depth cannot be computed, and cell-well-depth judges it otherwise; common practice, no source.",
  examine: (method, limits) =>
    method.acquisitions.flatMap(({ cells }) =>
      cells.map((cell) => precursorQ(cell, boundsOf(limits.pass), boundsOf(limits.caution))),
    ),
});

function precursorQ(cell: Guiding, limit: Bounds, caution: Bounds): Observation {
  const { stage } = cell.placed;
  const precursor = cell.precursor!;
  const about = {
    quantity: "precursor-q",
    unit: "1",
    subject: {
      pointer: precursor.pointer,
      acquisition: cell.acquisition.id,
      stage: stage.name,
      ion: precursor.ion,
    },
  };
  if (cell.polePairs > 2) {
    return {
      ...about,
      kind: "not-applicable",
      statement: `${stage.name} has ${cell.polePairs} pole pairs; q and its limit are defined for two.`,
    };
  }
  if (cell.cutoffMz === null) {
    return {
      ...about,
      kind: "indeterminate",
      missing: cell.cutoffMissing,
      statement: `q of the precursor in ${stage.name} does not follow without ${cell.cutoffMissing.join(", ")}.`,
    };
  }
  const pass = wellDepthKnown(cell) ? { ...limit, min: null } : limit;
  const value = (RF_ONLY_LIMIT_Q * cell.cutoffMz) / precursor.mz;
  return {
    ...about,
    kind: "value",
    value,
    evidence: cell.evidence,
    pass,
    caution,
    passesIf: passesIfScaled(cell, value, pass),
    statement:
      `Precursor m/z ${precursor.mz} has q ${digits(value, 4)} in ${stage.name}` +
      (value >= RF_ONLY_LIMIT_Q ? ", beyond the stability limit 0.908: it is lost." : "."),
  };
}

/** q is proportional to every way in which the cell's RF can be set. */
function passesIfScaled(cell: Guiding, value: number, pass: Bounds): PassesIf | null {
  if (cell.setting === null || value <= 0) return null;
  const { rf, pointer } = cell.setting;
  const interval = (input: string, current: number, unit: string): PassesIf => ({
    input,
    min: pass.min === null ? null : (current * pass.min) / value,
    max: pass.max === null ? null : (current * pass.max) / value,
    unit,
  });
  switch (rf.mode) {
    case "fixed":
      return interval(`${pointer}/rf/volts`, rf.rf.volts, "V");
    case "cutoff":
      return interval(`${pointer}/mz`, rf.mz, "1");
    case "table":
      return interval(`${pointer}/points`, cell.cutoffMz!, "1");
    default:
      return interval(`${pointer}/q`, rf.q, "1");
  }
}
