import { RF_ONLY_LIMIT_Q } from "../../physics/first-region.ts";
import { defineCheck } from "../check.ts";
import type { Bounds } from "../finding.ts";
import { leverThrough, passesIfWithin } from "../lever.ts";
import { boundsOf, RangeLimit } from "../limit.ts";
import { lacking, notApplicable, type Observation, type Reading } from "../observation.ts";
import type { GuidedIon, Guiding } from "../resolve/resolved-method.ts";
import { digits } from "../statement.ts";
import { wellDepthKnown } from "./cell-well-depth.ts";
import { WEAK_CONFINEMENT_Q } from "./product-above-cutoff.ts";

export const precursorQInCell = defineCheck({
  id: "precursor-q-in-cell",
  computes: "Mathieu q of the precursor ion in the RF-only collision cell.",
  needs: ["stages/rf", "stages/rodSet", "acquisition/cell/rf", "acquisition/precursor"],
  quantities: [{ quantity: "precursor-q", unit: "1", meaning: "q of the precursor in the cell" }],
  requiredByDefault: true,
  limit: RangeLimit,
  defaults: { pass: { max: 0.7, min: WEAK_CONFINEMENT_Q }, caution: { max: 0.85 } },
  basis:
    "Stable up to q = 0.908 (computed); 0.7 and 0.85 are common practice, no source. Below 0.02 confinement is weak; that is a caution only where the well depth cannot be computed, and cell-well-depth judges it otherwise; common practice, no source.",
  examine: (method, limits) =>
    method.acquisitions.flatMap(({ cells }) =>
      cells.map((cell): Observation => {
        const { acquisition, placed } = cell;
        const precursor = cell.precursor ?? cell.product;
        const { pointer, ion } = precursor;
        return {
          quantity: "precursor-q",
          unit: "1",
          subject: { pointer, acquisition: acquisition.id, stage: placed.stage.name, ion },
          ...precursorQ(cell, precursor, boundsOf(limits.pass), boundsOf(limits.caution)),
        };
      }),
    ),
});

function precursorQ(cell: Guiding, { mz }: GuidedIon, limit: Bounds, caution: Bounds): Reading {
  const { name } = cell.placed.stage;
  if (cell.polePairs > 2) {
    return notApplicable(`${name} has ${cell.polePairs} pole pairs; q and its limit are defined for two.`);
  }
  if (cell.cutoffMz === null) return lacking(`q of the precursor in ${name}`, cell.cutoffMissing);
  const pass = wellDepthKnown(cell) ? { ...limit, min: null } : limit;
  const value = (RF_ONLY_LIMIT_Q * cell.cutoffMz) / mz;
  return {
    kind: "value",
    value,
    evidence: cell.evidence,
    pass,
    caution,
    passesIf: () =>
      passesIfWithin(
        leverThrough(cell.cutoffLever, (q) => (q * mz) / RF_ONLY_LIMIT_Q),
        pass,
      ),
    statement:
      `Precursor m/z ${mz} has q ${digits(value, 4)} in ${name}` +
      (value >= RF_ONLY_LIMIT_Q ? ", beyond the stability limit 0.908: it is lost." : "."),
  };
}
