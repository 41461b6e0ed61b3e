import { CHARGE_PER_ATOMIC_MASS } from "../../../services/physics/constants.ts";
import type { Field } from "../../../services/physics/mathieu-parameters.ts";
import { type SetPoint, setPointOf } from "../../../services/physics/set-point.ts";
import {
  type BeamMoments,
  type Flight,
  type Transmission,
  transmissionOf,
} from "../../../services/physics/transmission/transmission.ts";

export const FIELD: Field = { fieldRadius: 0.004, frequency: 1.2e6 };

/** A round beam of sigma in r0, and mean radial energy of both axes in V per charge at this m/z. */
export function roundBeam(sigma: number, radialEnergyVolts: number, mz: number, field: Field): BeamMoments {
  const sigmaX = sigma * field.fieldRadius;
  const sigmaVx = Math.sqrt((radialEnergyVolts * CHARGE_PER_ATOMIC_MASS) / mz);
  return { sigmaX, sigmaY: sigmaX, sigmaVx, sigmaVy: sigmaVx };
}

export function setPoint(mzCentre: number, mzWidth: number, field: Field): SetPoint {
  const answer = setPointOf(mzCentre, mzWidth, field);
  if (answer.kind !== "set-point") throw new Error(answer.kind);
  return answer;
}

export function passing(flight: Flight & { readonly accuracy: number }): Transmission {
  const answer = transmissionOf(flight);
  if (answer.kind !== "transmission") throw new Error(`${answer.kind} at m/z ${flight.mz}`);
  return answer;
}
