import { z } from "zod";
import { quantity } from "./quantity.ts";

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
        meanRadialEnergy_eVPerCharge: quantity("Mean radial energy of both axes, in eV per charge.", 0, 1e4),
      })
      .meta({ id: "BeamByEnergy" }),
  ])
  .meta({ id: "Beam", description: "Gaussian beam at the entrance, centred on the axis." });
export type Beam = z.output<typeof Beam>;
