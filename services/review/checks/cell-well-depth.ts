import { fieldOf } from "../../contract/rod-set.ts";
import { adiabaticity, wellDepth } from "../../physics/rf-only.ts";
import { defineCheck } from "../check.ts";
import type { Bounds, PassesIf } from "../finding.ts";
import { boundsOf, LowerLimit } from "../limit.ts";
import type { Observation } from "../observation.ts";
import type { GuidedIon, Guiding } from "../resolve/resolved-method.ts";
import { digits } from "../statement.ts";

/** Motion in an effective potential holds while the adiabaticity stays below this, out to this part of the field radius. */
const ADIABATIC_LIMIT = 0.3;
const USABLE_RADIUS = 0.8;

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
  examine: (method, limits) =>
    method.acquisitions.flatMap(({ cells }) =>
      cells.flatMap((cell) => [
        depthOverEnergy(cell, cell.precursor!, "precursor", boundsOf(limits.pass), boundsOf(limits.caution)),
        depthOverEnergy(cell, cell.product!, "product", boundsOf(limits.pass), boundsOf(limits.caution)),
      ]),
    ),
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
  { pointer, ion, mz }: GuidedIon,
  which: "precursor" | "product",
  pass: Bounds,
  caution: Bounds,
): Observation {
  const { stage } = cell.placed;
  const about = {
    quantity: `${which}-depth-over-energy`,
    unit: "1",
    subject: { pointer, acquisition: cell.acquisition.id, stage: stage.name, ion },
  };
  const energy = radialEnergyOf(cell);
  const missing = [
    ...(energy === undefined ? [`${cell.placed.pointer}/maxRadialEnergy_eVPerCharge`] : []),
    ...(cell.rodSet === null ? [`${cell.placed.pointer}/rodSet`] : []),
    ...cell.rfMissing.filter((input) => input !== `${cell.placed.pointer}/rodSet`),
  ];
  if (energy === undefined || cell.rodSet === null || cell.rfVolts === null) {
    return {
      ...about,
      kind: "indeterminate",
      missing,
      statement: `The well depth of ${stage.name} does not follow without ${missing.join(", ")}.`,
    };
  }
  const field = fieldOf(cell.rodSet);
  const eta = adiabaticity(cell.rfVolts, mz, field, cell.polePairs, USABLE_RADIUS);
  if (eta > ADIABATIC_LIMIT) {
    return {
      ...about,
      kind: "not-applicable",
      statement: `The adiabaticity of m/z ${mz} in ${stage.name} is ${digits(eta, 3)}, above ${ADIABATIC_LIMIT}: an effective potential does not describe its motion.`,
    };
  }
  const depth = wellDepth(cell.rfVolts, mz, field, cell.polePairs, USABLE_RADIUS);
  const value = depth / energy;
  return {
    ...about,
    kind: "value",
    value,
    evidence: cell.evidence,
    pass,
    caution,
    passesIf: passesIfDeeper(cell, value, pass.min),
    statement: `${which === "precursor" ? "Precursor" : "Product"} m/z ${mz}: the well at 0.8 r0 of ${stage.name} is ${digits(depth, 4)} eV per charge deep, ${digits(value, 3)} times the stated radial energy (adiabaticity ${digits(eta, 2)}).`,
  };
}

/** The depth grows with the square of the RF, so each input that sets the RF grows with the root. */
function passesIfDeeper(cell: Guiding, value: number, min: number | null): PassesIf | null {
  if (cell.setting === null || min === null || value <= 0) return null;
  const { rf, pointer } = cell.setting;
  const factor = Math.sqrt(min / value);
  switch (rf.mode) {
    case "fixed":
      return { input: `${pointer}/rf/volts`, min: rf.rf.volts * factor, max: null, unit: "V" };
    case "cutoff":
      return { input: `${pointer}/mz`, min: rf.mz * factor, max: null, unit: "1" };
    case "table":
      return { input: `${pointer}/points`, min: cell.cutoffMz! * factor, max: null, unit: "1" };
    default:
      return { input: `${pointer}/q`, min: rf.q * factor, max: null, unit: "1" };
  }
}
