/*
 * The series of half-period.ts in pairs of doubles. In the narrow bands at large q the half-trace moves thousands of
 * times faster than a and q do, and a double's rounding inside the series would already shift it by more than 1e-12.
 */
import { addPairs, multiplyPairs } from "./double-double.ts";

/** (2 − sqrt 2)/4 as a pair, from 40 digits of sqrt 2. */
const U_HIGH = 0.14644660940672624;
const U_LOW = -3.587342331996631e-18;

const MAX_TERMS = 72;
/** A term below this share of the largest sum ends the series. */
const NEGLIGIBLE = 1e-26;

/** w' = SLOPE · Σ κ d_k and S = ODD · Σ d_k at the middle, as in half-period.ts. */
const SLOPE = Math.SQRT1_2 / (2 * U_HIGH);
const ODD = 2 * Math.sqrt(U_HIGH);

const pair = new Float64Array(2);

/** Sums of a quarter period as pairs: Σ d_k and Σ κ d_k of the even solution, then of the odd one. */
const near = new Float64Array(8);
const far = new Float64Array(8);

/** Adds up one solution (`rho` 0: even, 1/2: odd) and its slope into `sums[at..at+3]`. */
function series(a: number, q: number, rho: number, sums: Float64Array, at: number): void {
  multiplyPairs(U_HIGH, U_LOW, -16 * q, 0, pair);
  const x1High = pair[0]!;
  const x1Low = pair[1]!;
  multiplyPairs(-x1High, -x1Low, U_HIGH, U_LOW, pair);
  const x2High = pair[0]!;
  const x2Low = pair[1]!;
  addPairs(2 * q, 0, -a, 0, pair);
  const shiftHigh = pair[0]!;
  const shiftLow = pair[1]!;
  let high = 1;
  let low = 0;
  let high1 = 0;
  let low1 = 0;
  let high2 = 0;
  let low2 = 0;
  let sumHigh = 1;
  let sumLow = 0;
  let slopeHigh = rho;
  let slopeLow = 0;
  for (let k = 0; k < MAX_TERMS; k++) {
    const kappa = k + rho;
    addPairs(shiftHigh, shiftLow, kappa * kappa, 0, pair);
    multiplyPairs(pair[0]!, pair[1]!, high, low, pair);
    const mainHigh = pair[0]!;
    const mainLow = pair[1]!;
    multiplyPairs(x1High, x1Low, high1, low1, pair);
    addPairs(mainHigh, mainLow, pair[0]!, pair[1]!, pair);
    const twoHigh = pair[0]!;
    const twoLow = pair[1]!;
    multiplyPairs(x2High, x2Low, high2, low2, pair);
    addPairs(twoHigh, twoLow, pair[0]!, pair[1]!, pair);
    multiplyPairs(pair[0]!, pair[1]!, U_HIGH, U_LOW, pair);
    const divisor = (kappa + 1) * (kappa + 0.5);
    const quotient = pair[0]! / divisor;
    const numeratorHigh = pair[0]!;
    const numeratorLow = pair[1]!;
    multiplyPairs(quotient, 0, -divisor, 0, pair);
    addPairs(numeratorHigh, numeratorLow, pair[0]!, pair[1]!, pair);
    addPairs(quotient, 0, pair[0]! / divisor, 0, pair);
    high2 = high1;
    low2 = low1;
    high1 = high;
    low1 = low;
    high = pair[0]!;
    low = pair[1]!;
    addPairs(sumHigh, sumLow, high, low, pair);
    sumHigh = pair[0]!;
    sumLow = pair[1]!;
    multiplyPairs(high, low, kappa + 1, 0, pair);
    addPairs(slopeHigh, slopeLow, pair[0]!, pair[1]!, pair);
    slopeHigh = pair[0]!;
    slopeLow = pair[1]!;
    const size = Math.abs(sumHigh) + Math.abs(slopeHigh);
    if ((k + 1) * (Math.abs(high) + Math.abs(high1) + Math.abs(high2)) < NEGLIGIBLE * size) break;
  }
  sums[at] = sumHigh;
  sums[at + 1] = sumLow;
  sums[at + 2] = slopeHigh;
  sums[at + 3] = slopeLow;
}

/** x_i·y_j + x_k·y_l of pairs in `near` and `far`, rounded to a double at the end. */
function combine(nearFirst: number, farFirst: number, nearSecond: number, farSecond: number): number {
  multiplyPairs(near[nearFirst]!, near[nearFirst + 1]!, far[farFirst]!, far[farFirst + 1]!, pair);
  const high = pair[0]!;
  const low = pair[1]!;
  multiplyPairs(near[nearSecond]!, near[nearSecond + 1]!, far[farSecond]!, far[farSecond + 1]!, pair);
  addPairs(high, low, pair[0]!, pair[1]!, pair);
  return pair[0]! + pair[1]!;
}

/** As halfPeriod of half-period.ts, every value right to a few units in its own last place. */
export function halfPeriodExtended(a: number, q: number, out: Float64Array): void {
  series(a, q, 0, near, 0);
  series(a, q, 0.5, near, 4);
  series(a, -q, 0, far, 0);
  series(a, -q, 0.5, far, 4);
  out[0] = combine(0, 6, 2, 4) * (ODD * SLOPE);
  out[1] = combine(0, 2, 2, 0) * SLOPE;
  out[2] = combine(4, 6, 6, 4) * (ODD * ODD * SLOPE);
  out[3] = combine(4, 2, 6, 0) * (ODD * SLOPE);
}
