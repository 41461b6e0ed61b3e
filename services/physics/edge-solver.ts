/*
 * Newton's method for the edges of the first region on a scan line. The starting values are polynomials fitted to the
 * 30-digit solution; their errors (below 1e-8 relative) set the number of steps, never the answer: a residual is
 * strictly monotone in its bracket, so the only zero inside is the edge, and an iterate that leaves is refused.
 */
import { type ApexEdge, apexEdgeResidual, HIGH_Q_EDGE, LOW_Q_EDGE } from "./apex-edges.ts";
import { APEX_Q, APEX_Q_REST, RF_ONLY_LIMIT_Q } from "./first-region.ts";
import { nearOriginEdgeResidual } from "./near-origin-edge.ts";
import { polynomial } from "./polynomial.ts";

/** Below this U/V the low-q edge is measured from the origin, above it from the apex. */
export const NEAR_ORIGIN_RATIO = 0.085;

/** (q − q_apex)/μ of the low-q edge, powers of μ. */
const LOW_START = [
  -4.637704571, 4.090091384, -10.56549479, 12.16322617, -22.4439407, 26.76758487, -31.05540367,
];
/** (q − q_apex)/μ of the high-q edge, powers of μ. */
const HIGH_START = [
  0.947627673, 1.21493375, 1.491843335, 1.756999505, 1.976253406, 2.23724224, 1.608488703, 4.188285645,
];
/** q/(U/V) of the low-q edge, powers of (U/V)². */
const NEAR_ORIGIN_START = [4, 7.000002094, 10.97080877, 15.91399615];

/** A step this small against the distance leaves an error of its square: below the rounding. */
const LAST_STEP = 1e-8;

export const DEFAULT_MAX_STEPS = 32;

/** An edge: its q, and its distance from the apex with all digits. */
export interface SolvedEdge {
  q: number;
  fromApex: number;
  steps: number;
}

const residual = new Float64Array(3);

function solveFromApex(
  edge: ApexEdge,
  margin: number,
  start: number,
  lowest: number,
  highest: number,
  maxSteps: number,
): SolvedEdge | null {
  let delta = start;
  for (let steps = 1; steps <= maxSteps; steps++) {
    apexEdgeResidual(edge, delta, margin, residual);
    const step = residual[0]! / residual[1]!;
    delta -= step;
    if (!(delta >= lowest && delta <= highest)) return null;
    if (Math.abs(step) <= LAST_STEP * Math.abs(delta)) {
      return { q: APEX_Q + (delta + APEX_Q_REST), fromApex: delta, steps };
    }
  }
  return null;
}

function solveFromOrigin(ratio: number, maxSteps: number): SolvedEdge | null {
  let q = ratio * polynomial(NEAR_ORIGIN_START, ratio * ratio);
  for (let steps = 1; steps <= maxSteps; steps++) {
    nearOriginEdgeResidual(q, ratio, residual);
    const step = residual[0]! / residual[1]!;
    q -= step;
    if (!(q > 0 && q <= APEX_Q)) return null;
    if (Math.abs(step) <= LAST_STEP * q) return { q, fromApex: q - APEX_Q - APEX_Q_REST, steps };
  }
  return null;
}

/**
 * The edge β_y = 0 (high m/z) where U/V lies `margin` below the apex ratio, 0 < margin < APEX_RATIO; `ratio` is the
 * same U/V as a double. Null when `maxSteps` evaluations do not suffice.
 */
export function solveLowEdge(margin: number, ratio: number, maxSteps: number): SolvedEdge | null {
  if (ratio < NEAR_ORIGIN_RATIO) return solveFromOrigin(ratio, maxSteps);
  return solveFromApex(LOW_Q_EDGE, margin, margin * polynomial(LOW_START, margin), -APEX_Q, 0, maxSteps);
}

/** The edge β_x = 1 (low m/z) for 0 < margin <= APEX_RATIO; null when `maxSteps` evaluations do not suffice. */
export function solveHighEdge(margin: number, maxSteps: number): SolvedEdge | null {
  const start = margin * polynomial(HIGH_START, margin);
  return solveFromApex(HIGH_Q_EDGE, margin, start, 0, RF_ONLY_LIMIT_Q - APEX_Q + 1e-9, maxSteps);
}
