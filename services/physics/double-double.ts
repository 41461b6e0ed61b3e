/*
 * Sums and products of numbers kept as an unevaluated pair high + low, about 31 digits (Dekker, Numer. Math. 18 (1971)
 * 224; sum after Knuth, The Art of Computer Programming 2, section 4.2.2, theorem B). Results are written to `out[0]`
 * (high) and `out[1]` (low), so that nothing is allocated.
 */
import { productError } from "./exact-product.ts";

export function addPairs(xHigh: number, xLow: number, yHigh: number, yLow: number, out: Float64Array): void {
  const sum = xHigh + yHigh;
  const virtual = sum - xHigh;
  const error = xHigh - (sum - virtual) + (yHigh - virtual) + (xLow + yLow);
  const high = sum + error;
  out[0] = high;
  out[1] = error - (high - sum);
}

export function multiplyPairs(
  xHigh: number,
  xLow: number,
  yHigh: number,
  yLow: number,
  out: Float64Array,
): void {
  const product = xHigh * yHigh;
  const error = productError(xHigh, yHigh, product) + (xHigh * yLow + xLow * yHigh);
  const high = product + error;
  out[0] = high;
  out[1] = error - (high - product);
}
