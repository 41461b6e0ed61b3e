import type { BeamMoments } from "../../../services/physics/transmission/transmission.ts";
import { readReference } from "../../reference/read-reference.ts";

interface ReferenceSetting {
  readonly id: string;
  readonly U_V: number;
  readonly V_V: number;
  readonly r0_m: number;
  readonly f_Hz: number;
  readonly rf_cycles: number;
  readonly sigma_x_m: number;
  readonly sigma_y_m: number;
  readonly sigma_v_m_per_s: number;
  /** m/z, q, a, T by Monte Carlo, its standard error, T by an independent polygon integral, …; see the header. */
  readonly points: readonly (readonly number[])[];
}

export const REFERENCE_PEAKS = readReference<{ readonly settings: readonly ReferenceSetting[] }>(
  "transmission_public",
).settings;

export function beamOf(setting: ReferenceSetting): BeamMoments {
  const { sigma_x_m: sigmaX, sigma_y_m: sigmaY, sigma_v_m_per_s: sigmaV } = setting;
  return { sigmaX, sigmaY, sigmaVx: sigmaV, sigmaVy: sigmaV };
}
