/** Seven levels: for q < 0.4 the eighth changes the residual by less than 1e-22. */
const LEVELS = 7;

/**
 * The edge β_y = 0 far from the apex, where it runs into the origin: α = a_0(q) with α = −2 (U/V) q, divided by −2q,
 *
 *   U/V + q/T_1 = 0,   T_k = α − (2k)² − q²/T_{k+1}   (DLMF 28.6(ii)),
 *
 * so that a small q keeps all its digits. Writes the residual and its derivatives by q and by U/V into `out[0..2]`.
 * Domain: 0 < q < 0.5, 0 < U/V < APEX_RATIO.
 */
export function nearOriginEdgeResidual(q: number, ratio: number, out: Float64Array): void {
  const alpha = -2 * ratio * q;
  const qSquared = q * q;
  let inverse = 0;
  let level = 0;
  let byAlpha = 0;
  let byQ = 0;
  for (let k = LEVELS; k >= 1; k--) {
    const gain = qSquared * inverse * inverse;
    byQ = gain * byQ - 2 * q * inverse;
    byAlpha = 1 + gain * byAlpha;
    level = alpha - 4 * k * k - qSquared * inverse;
    inverse = 1 / level;
  }
  const slope = q * inverse * inverse;
  out[0] = ratio + q * inverse;
  out[1] = inverse - slope * (byQ - 2 * ratio * byAlpha);
  out[2] = 1 + 2 * slope * q * byAlpha;
}
