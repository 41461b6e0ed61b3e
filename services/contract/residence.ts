import { z } from "zod";
import { flightTime } from "../physics/transit.ts";
import { quantity } from "./quantity.ts";
import type { RodSet } from "./rod-set.ts";
import type { ErrorItem } from "./rule.ts";

export const Residence = z
  .union([
    z
      .strictObject({
        axialEnergy_eVPerCharge: quantity("Axial energy in the rods, in eV per charge.", 1e-4, 1e5),
      })
      .meta({ id: "ResidenceByEnergy" }),
    z
      .strictObject({
        flightTime_us: quantity("Time in the field in us, the same for every ion.", 1e-3, 1e7),
      })
      .meta({ id: "ResidenceByTime" }),
    z
      .strictObject({ rfCycles: quantity("RF cycles in the field, the same for every ion.", 0.1, 1e7) })
      .meta({ id: "ResidenceByCycles" }),
  ])
  .meta({ id: "Residence", description: "How long ions stay in the field of a rod set." });
export type Residence = z.output<typeof Residence>;

/** Flight by axial energy needs the length of the rods. */
export function residenceErrors(residence: Residence, rodSet: RodSet, pointer: string): ErrorItem[] {
  if (!("axialEnergy_eVPerCharge" in residence) || rodSet.rodLength_mm !== undefined) return [];
  return [
    {
      pointer: `${pointer}/rodLength_mm`,
      code: "missing-member",
      detail: "rodLength_mm is missing; a residence stated by axialEnergy_eVPerCharge needs it.",
    },
  ];
}

/** Flight time in s of an ion of this m/z, or null where the rod length is needed and not stated. */
export function flightTimeOf(residence: Residence, rodSet: RodSet, mz: number): number | null {
  if ("flightTime_us" in residence) return residence.flightTime_us * 1e-6;
  if ("rfCycles" in residence) return residence.rfCycles / (rodSet.frequency_MHz * 1e6);
  if (rodSet.rodLength_mm === undefined) return null;
  return flightTime(mz, residence.axialEnergy_eVPerCharge, rodSet.rodLength_mm / 1e3);
}

/** RF cycles in the field, or null where the rod length is needed and not stated. */
export function rfCyclesOf(residence: Residence, rodSet: RodSet, mz: number): number | null {
  if ("rfCycles" in residence) return residence.rfCycles;
  const time = flightTimeOf(residence, rodSet, mz);
  return time === null ? null : time * rodSet.frequency_MHz * 1e6;
}
