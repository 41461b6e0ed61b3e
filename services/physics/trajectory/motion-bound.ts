/*
 * How far a stable ion can ever get. The motion over whole cycles runs on an ellipse γ w² + 2α w w' + β w'² = ε, whose
 * shape depends on the RF phase alone (Courant and Snyder, Ann. Phys. 3 (1958) 1; for rod sets Dawson 1976, chapter II; both
 * from memory). Its largest w is √(β ε), and the largest of that over the phases bounds the ion for ever.
 */
import { planeStability } from "../stability.ts";
import { type CycleStep, cycleSteps, type Motion, type PlaneStep, slopeAt, valueAt } from "./cycle-steps.ts";

/** Phases of a cycle at which every maximum of β is looked for between. */
const PARTS = 16;
const HALVINGS = 50;

interface Ellipse {
  readonly alpha: number;
  readonly beta: number;
}

/** The ellipse `s` into a step, from that at its start. */
function ellipseAt(step: PlaneStep, { alpha, beta }: Ellipse, s: number): Ellipse {
  const c = valueAt(step, 1, 0, s);
  const sine = valueAt(step, 0, 1, s);
  const dc = slopeAt(step, 1, 0, s);
  const ds = slopeAt(step, 0, 1, s);
  const gamma = (1 + alpha * alpha) / beta;
  return {
    beta: c * c * beta - 2 * c * sine * alpha + sine * sine * gamma,
    alpha: -c * dc * beta + (c * ds + sine * dc) * alpha - sine * ds * gamma,
  };
}

/** β rises while α is negative: the maximum on a step where α changes from negative to positive. */
function maximumOn(step: PlaneStep, ellipse: Ellipse, length: number): number {
  let below = 0;
  let above = length;
  for (let i = 0; i < HALVINGS; i++) {
    const middle = (below + above) / 2;
    if (ellipseAt(step, ellipse, middle).alpha < 0) below = middle;
    else above = middle;
  }
  return ellipseAt(step, ellipse, above).beta;
}

/**
 * Largest |w| that the motion in one plane, (a, q) its own, can ever reach from this start at RF phase `phase` (rad), in
 * the unit of `start.value`; slopes per rad of ξ. Null where the motion is unstable or outside the computed domain.
 */
export function largestEver(a: number, q: number, phase: number, start: Readonly<Motion>): number | null {
  const stability = planeStability(a, q);
  if (stability === null || !stability.stable) return null;
  const steps: readonly CycleStep[] = cycleSteps(a, q, phase / 2, PARTS);
  let one: Motion = { value: 1, slope: 0 };
  let other: Motion = { value: 0, slope: 1 };
  for (const { x: step, length } of steps) {
    const through = ({ value, slope }: Motion): Motion => ({
      value: valueAt(step, value, slope, length),
      slope: slopeAt(step, value, slope, length),
    });
    one = through(one);
    other = through(other);
  }
  // sin² of the advance per cycle from the margin, which does not cancel near an edge.
  const sine = Math.sqrt(stability.margin * (2 - stability.margin)) * (other.value > 0 ? 1 : -1);
  const beta = other.value / sine;
  let ellipse: Ellipse = { beta, alpha: (one.value - other.slope) / (2 * sine) };
  const { value, slope } = start;
  const gamma = (1 + ellipse.alpha * ellipse.alpha) / beta;
  const area = gamma * value * value + 2 * ellipse.alpha * value * slope + beta * slope * slope;
  let largest = beta;
  for (const { x: step, length } of steps) {
    const next = ellipseAt(step, ellipse, length);
    if (ellipse.alpha < 0 && next.alpha >= 0) {
      largest = Math.max(largest, maximumOn(step, ellipse, length));
    }
    largest = Math.max(largest, next.beta);
    ellipse = next;
  }
  return Math.sqrt(largest * area);
}
