/*
 * Both boundaries of the first region as residuals measured from the apex.
 *
 * The boundary of the y plane is α = a_0(q) with α = −a, that of the x plane α = b_1(q) with α = a. Both are zeros of
 * a continued fraction (DLMF 28.6(ii), https://dlmf.nist.gov/28.6; after Ince 1927 and Goldstein 1927):
 *
 *   a_0:  α − 2q²/T_1 = 0,           T_k = α − (2k)² − q²/T_{k+1},
 *   b_1:  α − 1 + q − q²/T_1 = 0,    T_k = α − (2k+1)² − q²/T_{k+1}.
 *
 * A window of resolution 1e5 is 1e-5 wide in q, and a difference of two such residuals would lose what matters. So
 * each level is written as its difference ΔT_k from the value at the apex, where the residual is zero by definition:
 *
 *   ΔT_k = Δα − Δ(q²)/T_{k+1} + q_A² ΔT_{k+1} / (T_{k+1} T_{k+1,A}),
 *
 * in which nothing cancels. On the scan line a = 2 (U/V) q; δ = q − q_apex and μ = apex ratio − U/V.
 */
import { APEX_A, APEX_Q, APEX_RATIO } from "./first-region.ts";

/** Eight levels: for q < 0.91 the ninth changes the residual by less than 1e-20. */
const LEVELS = 8;

export interface ApexEdge {
  /** α over a: −1 in the y plane, +1 in the x plane. */
  readonly sign: 1 | -1;
  /** Factor of q²/T_1 in the residual, and the coefficient of q beside α. */
  readonly weight: 1 | 2;
  readonly linear: 0 | 1;
  readonly levelAtApex: Float64Array;
}

function apexEdge(sign: 1 | -1, weight: 1 | 2, linear: 0 | 1, offset: 0 | 1): ApexEdge {
  const levelAtApex = new Float64Array(LEVELS + 1);
  let level = Number.NEGATIVE_INFINITY;
  for (let k = LEVELS + 8; k >= 1; k--) {
    const frequency = 2 * k + offset;
    level = sign * APEX_A - frequency * frequency - (APEX_Q * APEX_Q) / level;
    if (k <= LEVELS) levelAtApex[k] = level;
  }
  return { sign, weight, linear, levelAtApex };
}

/** β_y = 0, the edge at high m/z. */
export const LOW_Q_EDGE: ApexEdge = apexEdge(-1, 2, 0, 0);

/** β_x = 1, the edge at low m/z. */
export const HIGH_Q_EDGE: ApexEdge = apexEdge(1, 1, 1, 1);

/**
 * Writes the residual of an edge and its derivatives by δ and by μ into `out[0..2]`. Domain: 0 < q < 0.91 and
 * 0 <= μ <= APEX_RATIO. The residual of the y plane loses its meaning towards q = 0, where it has a second zero.
 */
export function apexEdgeResidual(edge: ApexEdge, delta: number, margin: number, out: Float64Array): void {
  const q = APEX_Q + delta;
  const qSquared = q * q;
  const ratio = APEX_RATIO - margin;
  const alphaStep = edge.sign * 2 * (APEX_RATIO * delta - margin * q);
  const squareStep = delta * (APEX_Q + q);
  const apexSquared = APEX_Q * APEX_Q;
  const levels = edge.levelAtApex;
  let step = alphaStep;
  let byAlpha = 1;
  let byQ = 0;
  for (let k = LEVELS; k >= 1; k--) {
    const inverse = 1 / (levels[k]! + step);
    const gain = qSquared * inverse * inverse;
    const carried = (apexSquared * step * inverse) / levels[k]! - squareStep * inverse;
    const weight = k === 1 ? edge.weight : 1;
    step = alphaStep + weight * carried;
    byQ = weight * (gain * byQ - 2 * q * inverse);
    byAlpha = 1 + weight * gain * byAlpha;
  }
  out[0] = step + edge.linear * delta;
  out[1] = byAlpha * edge.sign * 2 * ratio + byQ + edge.linear;
  out[2] = -byAlpha * edge.sign * 2 * q;
}
