import { type Field, frequencyOf, mzTimesQPerVolt } from "../mathieu-parameters.ts";
import type { NotConverged, NotReachable } from "../set-point.ts";
import type { RectangularWave } from "./rectangular-wave.ts";
import { type NoSuchWave, type TunedWave, type WaveTuning, waveForResolution } from "./wave-resolution.ts";
import { WAVE_MAX_STEPS, type WaveWindow } from "./wave-windows.ts";

/** A rectangular drive and the first-region window it opens; a and q are those of the ion at the centre. */
export interface WaveSetPoint {
  readonly kind: "set-point";
  /** Half the swing, pole-to-ground, V. */
  readonly rfVolts: number;
  /** DC besides the wave, pole-to-ground, V. */
  readonly dcVolts: number;
  /** Hz. */
  readonly frequency: number;
  readonly wave: RectangularWave;
  readonly ratio: number;
  readonly a: number;
  readonly q: number;
  readonly window: WaveWindow;
  readonly steps: number;
}

export type WaveSetPointAnswer = WaveSetPoint | NotReachable | NoSuchWave | NotConverged;

/** q of the ion half-way between the edges in m/z. */
function centreQ({ window }: TunedWave): number {
  const low = window.low!.q;
  const high = window.high!.q;
  return (2 * low * high) / (low + high);
}

function setPoint(tuned: TunedWave, q: number, rfVolts: number, frequency: number): WaveSetPoint {
  const { ratio, wave, window, steps } = tuned;
  const a = 2 * ratio * q;
  return {
    kind: "set-point",
    rfVolts,
    dcVolts: ratio * rfVolts,
    frequency,
    wave,
    ratio,
    a,
    q,
    window,
    steps,
  };
}

/**
 * Volts at a fixed frequency: U/V or the duty cycle make the width, V puts the window's centre on `mzCentre` (u per
 * charge, above zero); `mzWidth` between the edges, field in m and Hz.
 */
export function waveSetPointByVolts(
  mzCentre: number,
  mzWidth: number,
  field: Field,
  tuning: WaveTuning,
  maxSteps: number = WAVE_MAX_STEPS,
): WaveSetPointAnswer {
  const tuned = waveForResolution(mzCentre / mzWidth, tuning, maxSteps);
  if (tuned.kind !== "tuned") return tuned;
  const q = centreQ(tuned);
  return setPoint(tuned, q, (mzCentre * q) / mzTimesQPerVolt(field), field.frequency);
}

/**
 * Frequency at fixed volts, as a digital drive scans: U/V or the duty cycle make the width, the frequency puts the
 * window's centre on `mzCentre`. `rfVolts` half the swing in V, above zero; `fieldRadius` in m.
 */
export function waveSetPointByFrequency(
  mzCentre: number,
  mzWidth: number,
  rfVolts: number,
  fieldRadius: number,
  tuning: WaveTuning,
  maxSteps: number = WAVE_MAX_STEPS,
): WaveSetPointAnswer {
  const tuned = waveForResolution(mzCentre / mzWidth, tuning, maxSteps);
  if (tuned.kind !== "tuned") return tuned;
  const q = centreQ(tuned);
  return setPoint(tuned, q, rfVolts, frequencyOf(mzCentre, q, rfVolts, fieldRadius));
}
