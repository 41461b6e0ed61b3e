import { RF_ONLY_LIMIT_Q } from "../../physics/first-region.ts";
import { defineCheck } from "../check.ts";
import type { Bounds } from "../finding.ts";
import { passesIfWithin } from "../lever.ts";
import { boundsOf, LowerLimit } from "../limit.ts";
import { lacking, notApplicable, type Observation, type Reading } from "../observation.ts";
import { NO_CUTOFF_MZ } from "../resolve/negligible.ts";
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
    const observe = (quantity: string, guiding: Guiding): Observation => {
      const { acquisition, placed, product } = guiding;
      const { pointer, ion } = product;
      return {
        quantity,
        unit: "1",
        subject: { pointer, acquisition: acquisition.id, stage: placed.stage.name, ion },
        ...overCutoff(guiding, pass, caution),
      };
    };
    return [
      ...guides.map((guide) => observe("ion-over-cutoff", guide)),
      ...acquisitions.flatMap(({ cells }) => cells.map((cell) => observe("product-over-cutoff", cell))),
    ];
  },
});

/** Below this q an ion is hardly held. */
export const WEAK_CONFINEMENT_Q = 0.02;

function overCutoff(guiding: Guiding, pass: Bounds, caution: Bounds): Reading {
  const { placed, polePairs, product, cutoffMz, cutoffLever, evidence } = guiding;
  const { name } = placed.stage;
  if (polePairs > 2) {
    return notApplicable(`${name} has ${polePairs} pole pairs; a sharp low-mass cutoff is defined for two.`);
  }
  if (cutoffMz === null) return lacking(`The low-mass cutoff of ${name}`, guiding.cutoffMissing);
  const judged = {
    evidence,
    pass,
    caution,
    passesIf: () =>
      pass.min === null || pass.min <= 0
        ? null
        : passesIfWithin(cutoffLever, {
            min: cutoffMz < NO_CUTOFF_MZ ? (product.mz * WEAK_CONFINEMENT_Q) / RF_ONLY_LIMIT_Q : null,
            max: product.mz / pass.min,
          }),
  };
  // Without RF nothing is confined, but then there is no cutoff either.
  if (cutoffMz < NO_CUTOFF_MZ) {
    return { kind: "impossible", ...judged, statement: `${name} has no RF voltage: no ion is confined.` };
  }
  const value = product.mz / cutoffMz;
  const cutoff = `the cutoff of ${name}, m/z ${digits(cutoffMz, 5)}`;
  return {
    kind: "value",
    value,
    ...judged,
    statement:
      value < 1
        ? `m/z ${product.mz} is below ${cutoff}: the ion is lost there.`
        : `m/z ${product.mz} is ${digits(value, 4)} times ${cutoff}.`,
  };
}
