const SPLIT = 134217729; // 2^27 + 1

/**
 * The rounding error of `product` = fl(x·y), exact: x·y = product + error (Dekker, Numer. Math. 18 (1971) 224). Valid
 * while the magnitudes stay between about 1e-140 and 1e140.
 */
export function productError(x: number, y: number, product: number): number {
  const xs = SPLIT * x;
  const xHigh = xs - (xs - x);
  const xLow = x - xHigh;
  const ys = SPLIT * y;
  const yHigh = ys - (ys - y);
  const yLow = y - yHigh;
  return xLow * yLow - (product - xHigh * yHigh - xLow * yHigh - xHigh * yLow);
}
