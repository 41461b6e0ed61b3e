/** Values below this share of the level count as this, so that their logarithm exists. */
const LOWEST_SHARE = 1e-9;
const MOST_WIDENINGS = 16;
const MOST_STEPS = 60;

/** Where a flank is looked for, all in the unit of x. */
export interface FlankSearch {
  /** A point above the level, and the value there. */
  readonly inside: number;
  readonly valueInside: number;
  /** First guess of a point beyond the flank. */
  readonly edge: number;
  /** First step outwards from there; its sign is the direction. */
  readonly stride: number;
  readonly farthest: number;
  readonly tolerance: number;
}

/**
 * Where a peak falls to `level`: the bracket is widened outwards from the edge by strides that double, then the Illinois variant
 * of regula falsi (Dowell and Jarratt, BIT 11 (1971) 168) on the logarithm, in which tails are nearly straight. Null where
 * the peak stays above the level. The error in x is below `tolerance` if the values are exact.
 */
export function flankAt(value: (x: number) => number, level: number, search: FlankSearch): number | null {
  const { inside, valueInside, edge, stride, farthest, tolerance } = search;
  const height = (x: number): number => Math.log(Math.max(value(x) / level, LOWEST_SHARE));
  let high = inside;
  let atHigh = Math.log(valueInside / level);
  let low = edge;
  let atLow = height(edge);
  let step = stride;
  for (let i = 0; atLow > 0; i++) {
    const next = low + step;
    if (i === MOST_WIDENINGS || (next - farthest) * stride > 0) return null;
    [high, atHigh] = [low, atLow];
    [low, atLow] = [next, height(next)];
    step *= 2;
  }
  let last = 0;
  for (let i = 0; i < MOST_STEPS && Math.abs(high - low) > tolerance; i++) {
    // A long thin tail draws the chord towards itself; every fourth step halves the bracket instead.
    const chord = (high * atLow - low * atHigh) / (atLow - atHigh);
    const x = i % 4 === 3 ? 0.5 * (low + high) : chord;
    const at = height(x);
    const [near, atNear] = Math.abs(x - high) < Math.abs(x - low) ? [high, atHigh] : [low, atLow];
    if (Math.abs(at * (x - near)) <= 0.5 * tolerance * Math.abs(at - atNear)) return x;
    if (at > 0) {
      if (last > 0) atLow /= 2;
      [high, atHigh, last] = [x, at, 1];
    } else {
      if (last < 0) atHigh /= 2;
      [low, atLow, last] = [x, at, -1];
    }
  }
  return 0.5 * (low + high);
}
