import { DEFAULT_MAX_STEPS } from "../edge-solver.ts";
import { type Field, mzTimesQPerVolt } from "../mathieu-parameters.ts";
import { type Passband, passbandOf, windowInMz } from "../passband.ts";
import { type RegionWindow, type WindowEdge, windowsOnScanLine } from "./scan-line-windows.ts";
import type { RegionName, StabilityRegion } from "./stability-regions.ts";

/** A window in m/z; `low` and `high` are its ends at low and at high m/z. */
export interface RegionPassband {
  readonly region: StabilityRegion;
  readonly passband: Passband;
  readonly low: WindowEdge;
  /** Null where no upper end exists. */
  readonly high: WindowEdge | null;
}

export type RegionPassbands =
  | {
      readonly kind: "passbands";
      /** By falling m/z. */
      readonly passbands: readonly RegionPassband[];
      readonly reason: null | "above-apex" | "scan-line-misses-region" | "no-rf";
      /** Windows at q above this, that is, at very low m/z, are not sought; 0 without RF. */
      readonly searchedToQ: number;
      readonly steps: number;
    }
  | { readonly kind: "not-converged"; readonly steps: number };

function inMz(window: RegionWindow, mzTimesQ: number): Passband {
  const { low, high, qWidth } = window;
  if (low === null) {
    const open = { mzHigh: null, mzCentre: null, mzWidth: null, resolution: null, qLow: null };
    return { mzLow: mzTimesQ / high.q, ...open, qHigh: high.q };
  }
  return windowInMz({ kind: "window", qLow: low.q, qHigh: high.q, qWidth, steps: 0 }, mzTimesQ);
}

/**
 * Every m/z window that a drive opens in the region named, or in any region with |a|, q <= REGIONS_LIMIT: with "any"
 * also the narrow ones that the same volts open for ions far lighter. Volts in V (pole-to-ground, zero-to-peak); a
 * negative U exchanges the planes, the sign of V is a matter of phase. Field in m and Hz.
 */
export function regionPassbandsOf(
  dcVolts: number,
  rfVolts: number,
  field: Field,
  wanted: RegionName | "any",
  maxSteps: number = DEFAULT_MAX_STEPS,
): RegionPassbands {
  if (rfVolts === 0) return { kind: "passbands", passbands: [], reason: "no-rf", searchedToQ: 0, steps: 0 };
  const rfMagnitude = Math.abs(rfVolts);
  const found = windowsOnScanLine(dcVolts / rfMagnitude, wanted, maxSteps);
  if (found.kind === "not-converged") return found;
  const mzTimesQ = mzTimesQPerVolt(field) * rfMagnitude;
  const passbands: RegionPassband[] = [];
  let steps = found.steps;
  for (const window of found.windows) {
    const { region, low, high } = window;
    let passband = inMz(window, mzTimesQ);
    if (region.name === "first") {
      // Only the two voltages, not their rounded quotient, tell how far a nearly closed window is from the apex.
      const exact = passbandOf(dcVolts, rfVolts, field, maxSteps);
      if (exact.kind === "not-converged") return exact;
      if (exact.kind === "empty") continue;
      steps += exact.steps;
      passband = exact.passband;
    }
    passbands.push({ region, passband, low: high, high: low });
  }
  const reason = passbands.length === 0 ? (found.reason ?? "above-apex") : null;
  return { kind: "passbands", passbands, reason, searchedToQ: found.searchedToQ, steps };
}
