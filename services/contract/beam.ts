import { z } from "zod";
import { CHARGE_PER_ATOMIC_MASS } from "../physics/constants.ts";
import type { BeamMoments } from "../physics/transmission/transmission.ts";
import { quantity } from "./quantity.ts";
import { metresFromMm } from "./si.ts";

const spread = (what: string) => quantity(`${what}, standard deviation in mm.`, 1e-4, 50);
const velocity = (what: string) => quantity(`${what}, standard deviation in m/s.`, 0, 1e6);

export const Beam = z
  .union([
    z
      .strictObject({
        sigmaX_mm: spread("Position in x at the entrance"),
        sigmaY_mm: spread("Position in y at the entrance"),
        sigmaVx_mPerS: velocity("Velocity in x at the entrance"),
        sigmaVy_mPerS: velocity("Velocity in y at the entrance"),
      })
      .meta({ id: "BeamByAxes" }),
    z
      .strictObject({
        sigma_mm: spread("Position in x and in y at the entrance"),
        meanRadialEnergy_eVPerCharge: quantity(
          "Mean radial energy of both axes together, in eV per charge; each ion has the velocities that belong to its own m/z.",
          0,
          1e4,
        ),
      })
      .meta({ id: "BeamByEnergy" }),
  ])
  .meta({ id: "Beam", description: "Gaussian beam at the entrance, centred on the axis." });
export type Beam = z.output<typeof Beam>;

/**
 * Standard deviations in m and m/s for ions of this m/z. A mean radial energy E_r per charge is shared evenly between two
 * axes, m σ_v²/2 each, so that σ_v = √(E_r e/m).
 */
export function beamMomentsOf(beam: Beam, mz: number): BeamMoments {
  if ("sigmaX_mm" in beam) {
    return {
      sigmaX: metresFromMm(beam.sigmaX_mm),
      sigmaY: metresFromMm(beam.sigmaY_mm),
      sigmaVx: beam.sigmaVx_mPerS,
      sigmaVy: beam.sigmaVy_mPerS,
    };
  }
  const sigma = metresFromMm(beam.sigma_mm);
  const sigmaV = Math.sqrt((beam.meanRadialEnergy_eVPerCharge * CHARGE_PER_ATOMIC_MASS) / mz);
  return { sigmaX: sigma, sigmaY: sigma, sigmaVx: sigmaV, sigmaVy: sigmaV };
}
