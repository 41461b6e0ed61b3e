import { widthSensitivityToRatio } from "../../physics/drift.ts";
import type { Tolerances } from "../instrument.ts";
import { centreOf, type KnownWindow, widthOf } from "./window.ts";

/** How far the edges of a window may move inwards until the next tune, in m/z; worst case, nothing cancels. */
export interface Drift {
  readonly inward: number;
  /** False where the instrument states no tolerance at all: then nothing is allowed for. */
  readonly stated: boolean;
}

/**
 * The shift of the window that is stated, or that follows from the tolerances of its parts, whichever is larger, and
 * the uncertainty of the calibration with it; a change of U against V narrows the window from both sides.
 * m/z is proportional to V / (f r0)^2, so frequency and field radius count twice.
 */
export function driftOf(tolerances: Tolerances | undefined, window: KnownWindow): Drift {
  if (tolerances === undefined || Object.keys(tolerances).length === 0) return { inward: 0, stated: false };
  const {
    amplitude_ppm = 0,
    frequency_ppm = 0,
    fieldRadius_ppm = 0,
    ratio_ppm = 0,
    mzDriftBetweenTunes = 0,
    mzCalibration = 0,
  } = tolerances;
  const centre = centreOf(window);
  const common = centre * (amplitude_ppm + 2 * frequency_ppm + 2 * fieldRadius_ppm) * 1e-6;
  const narrowing = (ratio_ppm * 1e-6 * widthSensitivityToRatio(centre, widthOf(window))) / 2;
  return { inward: Math.max(common, mzDriftBetweenTunes) + mzCalibration + narrowing, stated: true };
}
