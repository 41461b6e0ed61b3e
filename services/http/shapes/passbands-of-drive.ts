import type { CanonicalVolts } from "../../contract/drive.ts";
import type { Field } from "../../physics/mathieu-parameters.ts";
import type { RectangularWave } from "../../physics/rectangular/rectangular-wave.ts";
import { wavePassbandsOf } from "../../physics/rectangular/wave-passbands.ts";
import { regionPassbandsOf } from "../../physics/regions/region-passbands.ts";
import { regionNameOf } from "../../physics/regions/stability-regions.ts";
import { answeredPassband, type ComputedWindow, type Passband } from "./passband.ts";
import type { WantedRegion } from "./region.ts";

/** What is on the rods: volts in V, field in m and Hz, and the wave where it is no sinusoid. */
export interface DrivenRods {
  readonly volts: CanonicalVolts;
  readonly field: Field;
  readonly wave: RectangularWave | null;
}

export type PassbandsOfDrive =
  | {
      readonly kind: "passbands";
      /** By falling m/z. */
      readonly passbands: readonly Passband[];
      readonly searchedToQ: number;
    }
  | { readonly kind: "not-converged" };

/** Every window that a drive with RF opens in the region wanted. */
export function passbandsOfDrive(
  { volts: { dcVolts, rfVolts }, field, wave }: DrivenRods,
  wanted: WantedRegion,
  maxSteps: number,
): PassbandsOfDrive {
  if (wave === null) {
    const found = regionPassbandsOf(dcVolts, rfVolts, field, wanted, maxSteps);
    if (found.kind === "not-converged") return found;
    const windows = found.passbands.map(({ region, passband, low, high }) => ({
      bands: region.bands,
      passband,
      lostBeyond: { low: low.lostTo, high: high?.lostTo ?? null },
    }));
    return answered(windows, dcVolts / rfVolts, found.searchedToQ);
  }
  const searched = wanted === "first" ? "first" : "any";
  const found = wavePassbandsOf(dcVolts, rfVolts, wave, field, searched, maxSteps);
  if (found.kind === "not-converged") return found;
  const windows = found.passbands
    .filter(({ bands }) => wanted === "any" || regionNameOf(bands) === wanted)
    .map(({ bands, passband, low, high }) => ({
      bands,
      passband,
      lostBeyond: { low: low?.lostTo ?? null, high: high?.lostTo ?? null },
    }));
  return answered(windows, dcVolts / rfVolts, found.searchedToQ);
}

function answered(
  windows: readonly ComputedWindow[],
  dcToRfRatio: number,
  searchedToQ: number,
): PassbandsOfDrive {
  const passbands = windows.map((window) => answeredPassband(window, dcToRfRatio));
  return { kind: "passbands", passbands, searchedToQ };
}
