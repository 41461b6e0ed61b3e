import { ratioFromPpm } from "../../contract/si.ts";
import {
  edgeSensitivities,
  sensitivitiesForResolution,
  type WindowSensitivity,
} from "../../physics/drift.ts";
import type { Tolerances } from "../instrument.ts";
import { centreOf, type KnownWindow, widthOf } from "./window.ts";

/** How far each edge of a window may move inwards until the next tune, in m/z: the worst case, nothing cancels. */
export interface Drift {
  readonly low: number;
  readonly high: number;
  /** False where the instrument states no tolerance at all: then nothing is allowed for. */
  readonly stated: boolean;
}

const NONE: Drift = { low: 0, high: 0, stated: false };

/**
 * For each edge the shift that is stated, or that follows from the tolerances of its parts, whichever is larger; the
 * uncertainty of the calibration comes on top, and so does what a change of U against V takes from that edge.
 * Null where no window of this resolution has a scan line.
 */
export function driftOf(tolerances: Tolerances | undefined, window: KnownWindow): Drift | null {
  if (tolerances === undefined || Object.keys(tolerances).length === 0) return NONE;
  const { ratio_ppm = 0, mzDriftBetweenTunes = 0, mzCalibration = 0 } = tolerances;
  const common = commonShift(tolerances);
  const sensitivity = ratio_ppm === 0 ? null : sensitivityOf(window);
  if (ratio_ppm !== 0 && sensitivity === null) return null;
  const inward = (mz: number, ratio: number) =>
    Math.max(mz * common, mzDriftBetweenTunes) +
    mzCalibration +
    mz * Math.abs(ratio) * ratioFromPpm(ratio_ppm);
  return {
    low: inward(window.mzLow, sensitivity?.low.ratio ?? 0),
    high: inward(window.mzHigh, sensitivity?.high.ratio ?? 0),
    stated: true,
  };
}

/** m/z is proportional to V / (f r0)^2: relative shift of both edges, in the worst case. */
function commonShift({ amplitude_ppm = 0, frequency_ppm = 0, fieldRadius_ppm = 0 }: Tolerances): number {
  return ratioFromPpm(amplitude_ppm + 2 * frequency_ppm + 2 * fieldRadius_ppm);
}

function sensitivityOf(window: KnownWindow): WindowSensitivity | null {
  if (window.drive === null) return sensitivitiesForResolution(centreOf(window) / widthOf(window));
  const { rfVolts, dcVolts } = window.drive.volts;
  return edgeSensitivities(dcVolts / rfVolts);
}
