import { fieldOf } from "../../contract/rod-set.ts";
import { ADIABATIC_LIMIT, adiabaticity, USABLE_RADIUS_FRACTION, wellDepth } from "../../physics/rf-only.ts";
import { defineCheck } from "../check.ts";
import type { Bounds } from "../finding.ts";
import { passesIfWithin } from "../lever.ts";
import { boundsOf, LowerLimit } from "../limit.ts";
import { lacking, notApplicable, type Observation, type Reading } from "../observation.ts";
import type { GuidedIon, Guiding } from "../resolve/resolved-method.ts";
import { digits } from "../statement.ts";

export const cellWellDepth = defineCheck({
  id: "cell-well-depth",
  computes:
    "Effective potential of the collision cell at 0.8 of its field radius over the largest radial energy to be confined.",
  needs: ["stages/rf", "stages/rodSet", "stages/maxRadialEnergy_eVPerCharge"],
  quantities: [
    {
      quantity: "precursor-depth-over-energy",
      unit: "1",
      meaning: "depth for the precursor over the radial energy",
    },
    {
      quantity: "product-depth-over-energy",
      unit: "1",
      meaning: "depth for the product over the radial energy",
    },
  ],
  requiredByDefault: false,
  limit: LowerLimit,
  defaults: { pass: { min: 3 }, caution: { min: 1 } },
  basis:
    "Usable to 0.8 r0 while the adiabaticity stays below 0.3 (Gerlich, Adv. Chem. Phys. 82, 1992, from memory); 3 and 1 are common practice, no source.",
  examine: (method, limits) => {
    const pass = boundsOf(limits.pass);
    const caution = boundsOf(limits.caution);
    const observe = (cell: Guiding, guided: GuidedIon, which: "precursor" | "product"): Observation => ({
      quantity: `${which}-depth-over-energy`,
      unit: "1",
      subject: {
        pointer: guided.pointer,
        acquisition: cell.acquisition.id,
        stage: cell.placed.stage.name,
        ion: guided.ion,
      },
      ...depthOverEnergy(cell, guided.mz, which, pass, caution),
    });
    return method.acquisitions.flatMap(({ cells }) =>
      cells.flatMap((cell) => [
        observe(cell, cell.precursor ?? cell.product, "precursor"),
        observe(cell, cell.product, "product"),
      ]),
    );
  },
});

function radialEnergyOf({ placed: { stage } }: Guiding): number | undefined {
  return stage.role === "collision-cell" ? stage.maxRadialEnergy_eVPerCharge : undefined;
}

/** Whether this check has what it needs, so that weak confinement is judged here. */
export function wellDepthKnown(cell: Guiding): boolean {
  return cell.rodSet !== null && cell.rfVolts !== null && radialEnergyOf(cell) !== undefined;
}

function depthOverEnergy(
  cell: Guiding,
  mz: number,
  which: "precursor" | "product",
  pass: Bounds,
  caution: Bounds,
): Reading {
  const { rfVolts, rodSet, polePairs, placed } = cell;
  const { name } = placed.stage;
  const energy = radialEnergyOf(cell);
  if (energy === undefined || rodSet === null || rfVolts === null) {
    return lacking(`The well depth of ${name}`, [
      ...(energy === undefined ? [`${placed.pointer}/maxRadialEnergy_eVPerCharge`] : []),
      ...(rodSet === null ? [`${placed.pointer}/rodSet`] : []),
      ...cell.rfMissing,
    ]);
  }
  const field = fieldOf(rodSet);
  const eta = adiabaticity(rfVolts, mz, field, polePairs, USABLE_RADIUS_FRACTION);
  if (eta > ADIABATIC_LIMIT) {
    return notApplicable(
      `The adiabaticity of m/z ${mz} in ${name} is ${digits(eta, 3)}, above ${ADIABATIC_LIMIT}: an effective potential does not describe its motion.`,
    );
  }
  const depth = wellDepth(rfVolts, mz, field, polePairs, USABLE_RADIUS_FRACTION);
  const value = depth / energy;
  return {
    kind: "value",
    value,
    evidence: cell.evidence,
    pass,
    caution,
    // The depth grows with the square of the RF, and the adiabaticity with the RF.
    passesIf: () =>
      pass.min === null
        ? null
        : passesIfWithin(cell.voltsLever, {
            min: Math.sqrt((pass.min * energy) / wellDepth(1, mz, field, polePairs, USABLE_RADIUS_FRACTION)),
            max: ADIABATIC_LIMIT / adiabaticity(1, mz, field, polePairs, USABLE_RADIUS_FRACTION),
          }),
    statement: `${which === "precursor" ? "Precursor" : "Product"} m/z ${mz}: the well at 0.8 r0 of ${name} is ${digits(depth, 4)} eV per charge deep, ${digits(value, 3)} times the stated radial energy (adiabaticity ${digits(eta, 2)}).`,
  };
}
