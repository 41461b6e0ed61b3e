/*
 * The matrices of wave-half-period.ts in pairs of doubles. Where one level throws an ion far out and the other brings it
 * back, products of large numbers cancel, and a double would lose the half-trace. The power series of the cosine and
 * the sine in z = K t² need no square root and have all digits of a pair.
 */
import { addPairs, multiplyPairs } from "../double-double.ts";
import type { RectangularWave } from "./rectangular-wave.ts";

/** π/2 as a pair. */
const HALF_PI_HIGH = 1.5707963267948966;
const HALF_PI_LOW = 6.123233995736766e-17;

const MAX_TERMS = 120;
/** A term below this share of the largest ends a series. */
const NEGLIGIBLE = 1e-34;

const pair = new Float64Array(2);

/** 1/((2k+1)(2k+2)) and 1/((2k+2)(2k+3)) as pairs. */
const reciprocals = new Float64Array(4 * MAX_TERMS);
for (let k = 0; k < MAX_TERMS; k++) {
  for (const [at, divisor] of [
    [0, (2 * k + 1) * (2 * k + 2)],
    [2, (2 * k + 2) * (2 * k + 3)],
  ] as const) {
    const high = 1 / divisor;
    multiplyPairs(high, 0, -divisor, 0, pair);
    addPairs(1, 0, pair[0]!, pair[1]!, pair);
    reciprocals[4 * k + at] = high;
    reciprocals[4 * k + at + 1] = pair[0]! / divisor;
  }
}

/** Sum of the series of cos √z (`at` 0) or sin √z / √z (`at` 2), written to sums[to], sums[to + 1]. */
function series(zHigh: number, zLow: number, at: 0 | 2, sums: Float64Array, to: number): void {
  let high = 1;
  let low = 0;
  let sumHigh = 1;
  let sumLow = 0;
  let largest = 1;
  for (let k = 0; k < MAX_TERMS; k++) {
    multiplyPairs(high, low, -zHigh, -zLow, pair);
    multiplyPairs(pair[0]!, pair[1]!, reciprocals[4 * k + at]!, reciprocals[4 * k + at + 1]!, pair);
    high = pair[0]!;
    low = pair[1]!;
    addPairs(sumHigh, sumLow, high, low, pair);
    sumHigh = pair[0]!;
    sumLow = pair[1]!;
    const size = Math.abs(high);
    if (size > largest) largest = size;
    else if (size < NEGLIGIBLE * largest) break;
  }
  sums[to] = sumHigh;
  sums[to + 1] = sumLow;
}

/** Cosine, sine (over √K) and K, each a pair, of one level. */
const upper = new Float64Array(6);
const lower = new Float64Array(6);
const COSINE = 0;
const SINE = 2;
const K = 4;

/** One level with K = a + 2q · levelHigh (+ levelLow) over t = (π/2) · fraction. */
function level(
  a: number,
  q: number,
  levelHigh: number,
  levelLow: number,
  fractionHigh: number,
  fractionLow: number,
  out: Float64Array,
): void {
  multiplyPairs(levelHigh, levelLow, 2 * q, 0, pair);
  addPairs(pair[0]!, pair[1]!, a, 0, pair);
  const kHigh = pair[0]!;
  const kLow = pair[1]!;
  multiplyPairs(HALF_PI_HIGH, HALF_PI_LOW, fractionHigh, fractionLow, pair);
  const tHigh = pair[0]!;
  const tLow = pair[1]!;
  multiplyPairs(tHigh, tLow, tHigh, tLow, pair);
  multiplyPairs(pair[0]!, pair[1]!, kHigh, kLow, pair);
  const zHigh = pair[0]!;
  const zLow = pair[1]!;
  series(zHigh, zLow, 0, out, COSINE);
  series(zHigh, zLow, 2, out, SINE);
  multiplyPairs(out[SINE]!, out[SINE + 1]!, tHigh, tLow, pair);
  out[SINE] = pair[0]!;
  out[SINE + 1] = pair[1]!;
  out[K] = kHigh;
  out[K + 1] = kLow;
}

/** upper[i] · lower[j], times −K of `scaledBy` where given, plus upper[k] · lower[l] likewise; rounded at the end. */
function sumOfProducts(
  i: number,
  j: number,
  scaledBy: Float64Array | null,
  k: number,
  l: number,
  alsoScaledBy: Float64Array | null,
): number {
  multiplyPairs(upper[i]!, upper[i + 1]!, lower[j]!, lower[j + 1]!, pair);
  if (scaledBy) multiplyPairs(pair[0]!, pair[1]!, -scaledBy[K]!, -scaledBy[K + 1]!, pair);
  const high = pair[0]!;
  const low = pair[1]!;
  multiplyPairs(upper[k]!, upper[k + 1]!, lower[l]!, lower[l + 1]!, pair);
  if (alsoScaledBy) multiplyPairs(pair[0]!, pair[1]!, -alsoScaledBy[K]!, -alsoScaledBy[K + 1]!, pair);
  addPairs(high, low, pair[0]!, pair[1]!, pair);
  return pair[0]! + pair[1]!;
}

/** C, C', S, S' into out[0..3], as waveHalfPeriod of wave-half-period.ts. */
export function waveHalfPeriodExtended(a: number, q: number, wave: RectangularWave, out: Float64Array): void {
  const d = wave.dutyCycle;
  addPairs(1, 0, -d, 0, pair);
  const restHigh = pair[0]!;
  const restLow = pair[1]!;
  const coupledForDc = wave.coupling === "dc";
  level(a, q, coupledForDc ? 1 : 2 * restHigh, coupledForDc ? 0 : 2 * restLow, d, 0, upper);
  level(a, -q, coupledForDc ? 1 : 2 * d, 0, restHigh, restLow, lower);
  out[0] = sumOfProducts(COSINE, COSINE, null, SINE, SINE, upper);
  out[1] = sumOfProducts(COSINE, SINE, lower, SINE, COSINE, upper);
  out[2] = sumOfProducts(SINE, COSINE, null, COSINE, SINE, null);
  out[3] = sumOfProducts(COSINE, COSINE, null, SINE, SINE, lower);
}
