import { type Field, mzTimesQPerVolt } from "../mathieu-parameters.ts";
import type { Passband } from "../passband.ts";
import type { Bands } from "../regions/stability-regions.ts";
import type { RectangularWave } from "./rectangular-wave.ts";
import { WAVE_EDGE_Q_MAX } from "./wave-edges.ts";
import {
  WAVE_MAX_STEPS,
  type WaveEdge,
  type WaveWindow,
  type WaveWindows,
  waveWindowsOnScanLine,
} from "./wave-windows.ts";

/** A window in m/z; `low` and `high` are its ends at low and at high m/z. */
export interface WavePassband {
  readonly bands: Bands;
  readonly passband: Passband;
  /** Null where `truncated`. */
  readonly low: WaveEdge | null;
  /** Null where no upper end exists. */
  readonly high: WaveEdge | null;
  /** The window goes on below passband.mzLow, beyond the q up to which edges are sought. */
  readonly truncated: boolean;
}

export type WavePassbands =
  | {
      readonly kind: "passbands";
      /** By falling m/z. */
      readonly passbands: readonly WavePassband[];
      readonly reason: Extract<WaveWindows, { kind: "windows" }>["reason"] | "no-rf";
      readonly searchedToQ: number;
      readonly steps: number;
    }
  | { readonly kind: "not-converged"; readonly steps: number };

/** A window in m/z, where `mzTimesQ` is the product m/z · q of the drive. */
function waveWindowInMz(window: WaveWindow, mzTimesQ: number): Passband {
  const qHigh = window.high?.q ?? WAVE_EDGE_Q_MAX;
  if (window.low === null) {
    const open = { mzHigh: null, mzCentre: null, mzWidth: null, resolution: null, qLow: null };
    return { mzLow: mzTimesQ / qHigh, ...open, qHigh };
  }
  const qLow = window.low.q;
  const perProduct = mzTimesQ / (qLow * qHigh);
  return {
    mzLow: mzTimesQ / qHigh,
    mzHigh: mzTimesQ / qLow,
    mzCentre: (perProduct * (qLow + qHigh)) / 2,
    mzWidth: perProduct * window.qWidth,
    resolution: (qLow + qHigh) / (2 * window.qWidth),
    qLow,
    qHigh,
  };
}

/**
 * Every m/z window of a rectangular drive, in the first region or in any with q <= WAVE_EDGE_Q_MAX. `rfVolts` is half the
 * swing in V, pole-to-ground, its sign without meaning; `dcVolts` the DC besides the wave; field in m and Hz. With
 * `dcVolts` 0 and DC coupling the duty cycle alone is the filter.
 */
export function wavePassbandsOf(
  dcVolts: number,
  rfVolts: number,
  wave: RectangularWave,
  field: Field,
  wanted: "first" | "any",
  maxSteps: number = WAVE_MAX_STEPS,
): WavePassbands {
  const rfMagnitude = Math.abs(rfVolts);
  if (rfMagnitude === 0) {
    return { kind: "passbands", passbands: [], reason: "no-rf", searchedToQ: 0, steps: 0 };
  }
  const found = waveWindowsOnScanLine(dcVolts / rfMagnitude, wave, wanted, maxSteps);
  if (found.kind === "not-converged") return found;
  const mzTimesQ = mzTimesQPerVolt(field) * rfMagnitude;
  const passbands = found.windows.map((window) => ({
    bands: window.bands,
    passband: waveWindowInMz(window, mzTimesQ),
    low: window.high,
    high: window.low,
    truncated: window.high === null,
  }));
  const { reason, searchedToQ, steps } = found;
  return { kind: "passbands", passbands, reason, searchedToQ, steps };
}
