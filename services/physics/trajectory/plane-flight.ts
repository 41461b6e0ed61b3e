import { type Motion, type PlaneStep, slopeAt, valueAt } from "./cycle-steps.ts";

/** Halvings that take a step of at most half a radian to the spacing of doubles. */
const HALVINGS = 54;

/** The zero between `from` and `to` of a function that changes sign there once. */
function zeroBetween(from: number, to: number, heightAt: (s: number) => number): number {
  const rises = heightAt(to) > 0;
  let below = from;
  let above = to;
  for (let i = 0; i < HALVINGS; i++) {
    const middle = (below + above) / 2;
    if (middle === below || middle === above) break;
    if (heightAt(middle) > 0 === rises) above = middle;
    else below = middle;
  }
  return (below + above) / 2;
}

/** What one plane does on a step, up to `end`. */
export interface PlaneStretch {
  readonly value: number;
  readonly slope: number;
  /** Largest distance from the axis on the stretch, and where on it; nothing below `known` is looked for. */
  readonly peak: number;
  readonly peakAt: number;
  /** Where the distance first reaches the limit, or null. */
  readonly reached: number | null;
}

/**
 * One plane through a step, or through its beginning where `end` is stated, with everything between the ends. Q keeps its
 * sign on a step that is shorter than a quarter of the fastest oscillation: the slope vanishes at most once, and where
 * Q < 0 that is the closest approach to the axis, so that the largest distance is at either end or at a slope of zero.
 * `known` is a distance that has been reached before: a peak below it need not be found.
 */
export function stretchOf(
  step: PlaneStep,
  motion: Readonly<Motion>,
  end: number | null,
  length: number,
  limit: number,
  known: number,
): PlaneStretch {
  const { value: from, slope: fromSlope } = motion;
  const span = end ?? length;
  const [c, dc, s, ds] = step.whole;
  const value = end === null ? c * from + s * fromSlope : valueAt(step, from, fromSlope, span);
  const slope = end === null ? dc * from + ds * fromSlope : slopeAt(step, from, fromSlope, span);
  let peak = Math.abs(from);
  let peakAt = 0;
  if (Math.abs(value) >= peak) {
    peak = Math.abs(value);
    peakAt = span;
  }
  const turns = fromSlope > 0 ? slope < 0 : fromSlope < 0 && slope > 0;
  if (turns && highestTurn(from, fromSlope, value, slope, span) > known) {
    const turn = zeroBetween(0, span, (at) => slopeAt(step, from, fromSlope, at));
    const there = Math.abs(valueAt(step, from, fromSlope, turn));
    if (there > peak) {
      peak = there;
      peakAt = turn;
    }
  }
  return { value, slope, peak, peakAt, reached: peak >= limit ? firstAt(step, motion, peakAt, limit) : null };
}

/** An arch lies below both of its end tangents, so a turn is no higher than where they meet. */
function highestTurn(from: number, fromSlope: number, to: number, toSlope: number, span: number): number {
  const meeting = (to - from - toSlope * span) / (fromSlope - toSlope);
  return Math.abs(from + fromSlope * meeting);
}

/** Where |w| first reaches `limit` before `peakAt`, where it is at least that; it grows on the way, once past the axis. */
function firstAt(step: PlaneStep, { value, slope }: Readonly<Motion>, peakAt: number, limit: number): number {
  if (Math.abs(value) >= limit) return 0;
  const side = valueAt(step, value, slope, peakAt) > 0 ? 1 : -1;
  return zeroBetween(0, peakAt, (s) => side * valueAt(step, value, slope, s) - limit);
}
