/*
 * How the edges of a passband move with the drive and the geometry: exact first derivatives.
 *
 * On a scan line every edge has a fixed q and m/z = const · V / (f² r0²), so that amplitude (U and V together),
 * frequency and field radius act with the exponents 1, −2 and −2. U/V moves q itself: where the residual F(q, U/V) of
 * an edge stays zero, dq/d(U/V) = −F_{U/V}/F_q (implicit differentiation).
 */
import { apexEdgeResidual, HIGH_Q_EDGE, LOW_Q_EDGE } from "./apex-edges.ts";
import { NEAR_ORIGIN_RATIO } from "./edge-solver.ts";
import { APEX_Q, APEX_RATIO, APEX_RATIO_REST } from "./first-region.ts";
import { nearOriginEdgeResidual } from "./near-origin-edge.ts";
import { scanLineEdges } from "./passband.ts";
import { ratioForResolution } from "./set-point.ts";

/** Relative change of the m/z of an edge per relative change of each cause; plain numbers. */
interface EdgeSensitivity {
  /** U and V together. */
  readonly amplitude: 1;
  readonly frequency: -2;
  readonly fieldRadius: -2;
  /** U/V at constant V. */
  readonly ratio: number;
}

/** Both edges of a window; `low` is the edge at low m/z. */
export interface WindowSensitivity {
  readonly low: EdgeSensitivity;
  readonly high: EdgeSensitivity;
}

const residual = new Float64Array(3);

function sensitivity(ratio: number, q: number, qByRatio: number): EdgeSensitivity {
  return { amplitude: 1, frequency: -2, fieldRadius: -2, ratio: (-ratio * qByRatio) / q };
}

function sensitivityAt(ratio: number, margin: number, qLow: number, qHigh: number): WindowSensitivity {
  apexEdgeResidual(HIGH_Q_EDGE, qHigh - APEX_Q, margin, residual);
  const low = sensitivity(ratio, qHigh, residual[2]! / residual[1]!);
  if (ratio < NEAR_ORIGIN_RATIO) {
    nearOriginEdgeResidual(qLow, ratio, residual);
    return { low, high: sensitivity(ratio, qLow, -residual[2]! / residual[1]!) };
  }
  apexEdgeResidual(LOW_Q_EDGE, qLow - APEX_Q, margin, residual);
  return { low, high: sensitivity(ratio, qLow, residual[2]! / residual[1]!) };
}

/** Sensitivities of the window on the scan line U/V = `ratio` (either sign); null where there is no window. */
export function edgeSensitivities(ratio: number): WindowSensitivity | null {
  const edges = scanLineEdges(ratio);
  if (edges.kind !== "window") return null;
  const magnitude = Math.abs(ratio);
  return sensitivityAt(magnitude, APEX_RATIO - magnitude + APEX_RATIO_REST, edges.qLow, edges.qHigh);
}

/** Sensitivities of a window known only by its resolution centre/width; null where no window has that resolution. */
export function sensitivitiesForResolution(resolution: number): WindowSensitivity | null {
  const solved = ratioForResolution(resolution);
  if (solved.kind !== "ratio") return null;
  return sensitivityAt(solved.ratio, solved.margin * APEX_RATIO, solved.qLow, solved.qHigh);
}

/** Relative changes (1e-6 is one ppm) of the four independent causes. */
export interface RelativeChanges {
  readonly amplitude?: number;
  readonly frequency?: number;
  readonly fieldRadius?: number;
  readonly ratio?: number;
}

/** Shifts in m/z, to first order in the changes. */
export interface WindowShift {
  readonly low: number;
  readonly high: number;
  readonly centre: number;
  readonly width: number;
}

function relativeShift(edge: EdgeSensitivity, changes: RelativeChanges): number {
  const { amplitude = 0, frequency = 0, fieldRadius = 0, ratio = 0 } = changes;
  return (
    edge.amplitude * amplitude +
    edge.frequency * frequency +
    edge.fieldRadius * fieldRadius +
    edge.ratio * ratio
  );
}

/**
 * First-order shift of the edges of a window known by centre and width (u per charge, between the edges); null where no
 * window of the first region has that resolution. Good while the changes of U/V are small against the apex margin.
 */
export function windowShiftOf(
  mzCentre: number,
  mzWidth: number,
  changes: RelativeChanges,
): WindowShift | null {
  const window = sensitivitiesForResolution(mzCentre / mzWidth);
  if (window === null) return null;
  const low = (mzCentre - mzWidth / 2) * relativeShift(window.low, changes);
  const high = (mzCentre + mzWidth / 2) * relativeShift(window.high, changes);
  return { low, high, centre: (low + high) / 2, width: high - low };
}

/**
 * Narrowing of a window in m/z per relative increase of U/V, a positive number: a rise of one ppm takes 1e-6 of it from
 * the width. Null where no window of the first region has that resolution.
 */
export function widthSensitivityToRatio(mzCentre: number, mzWidth: number): number | null {
  const shift = windowShiftOf(mzCentre, mzWidth, { ratio: 1 });
  return shift === null ? null : -shift.width;
}
