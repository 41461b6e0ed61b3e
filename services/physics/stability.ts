import { evenCharacteristicValuesBelow } from "./characteristic-values.ts";
import { halfPeriod } from "./half-period.ts";

/** Largest |a| and |q| for which stability is computed; beyond them the answer is null. */
export const DOMAIN_LIMIT = 100;

/** Bound of the error of a half-trace over max(1, |half-trace|) in the whole domain; 3e-13 was measured. */
export const HALF_TRACE_ERROR = 1e-12;

/** |a| and |q| up to which no band above the third is reached: a_4(q) > 12 there. */
const FEW_BANDS_LIMIT = 12;

/** What the Mathieu equation says of the motion in one plane. */
export interface PlaneStability {
  readonly stable: boolean;
  /** The stable band n, between a_n(q) and b_{n+1}(q); null when unstable. */
  readonly band: number | null;
  /** Total characteristic exponent β, between n and n + 1 in band n; null when unstable. */
  readonly characteristicExponent: number | null;
  /** Half the trace of the monodromy matrix over one RF period: cos πβ where stable. */
  readonly halfTrace: number;
  /** 1 − |halfTrace| without cancellation; negative when unstable. */
  readonly margin: number;
}

/** Both planes of an ion, and which rods take it when it is unstable. */
export interface PointStability {
  readonly x: PlaneStability;
  readonly y: PlaneStability;
  readonly stable: boolean;
  readonly lostTo: null | "x" | "y" | "both";
  readonly region: { readonly x: number; readonly y: number } | null;
}

/** With q = 0 the field is static and the motion harmonic (a > 0), free (a = 0) or exponential (a < 0). */
function staticField(a: number): PlaneStability {
  if (a <= 0) {
    const halfTrace = Math.cosh(Math.PI * Math.sqrt(-a));
    const sinh = Math.sinh((Math.PI / 2) * Math.sqrt(-a));
    return {
      stable: false,
      band: null,
      characteristicExponent: null,
      halfTrace,
      margin: -2 * sinh * sinh + 0,
    };
  }
  const beta = Math.sqrt(a);
  const sin = Math.sin((Math.PI / 2) * beta);
  const cos = Math.cos((Math.PI / 2) * beta);
  return {
    stable: true,
    band: Math.floor(beta),
    characteristicExponent: beta,
    halfTrace: Math.cos(Math.PI * beta),
    margin: 2 * Math.min(sin * sin, cos * cos),
  };
}

const half = new Float64Array(4);

/**
 * Stability of one plane with its own (a, q), plain numbers; q of either sign. Null outside the computed domain
 * (|a|, |q| <= DOMAIN_LIMIT). With C, C', S, S' the half-period values (Magnus and Winkler, Hill's Equation, 1966,
 * section 1.2: the coefficient is even), cos²(πβ/2) = C S' and sin²(πβ/2) = −S C', so that the distance from either
 * edge of a band and β itself come without cancellation.
 */
export function planeStability(a: number, q: number): PlaneStability | null {
  if (!(Math.abs(a) <= DOMAIN_LIMIT && Math.abs(q) <= DOMAIN_LIMIT)) return null;
  if (q === 0) return staticField(a);
  halfPeriod(a, q, half);
  const c = half[0]!;
  const s = half[2]!;
  const cosSquared = c * half[3]!;
  const sinSquared = -s * half[1]!;
  const halfTrace = cosSquared - sinSquared;
  const margin = 2 * Math.min(cosSquared, sinSquared);
  if (!(margin > 0)) {
    return { stable: false, band: null, characteristicExponent: null, halfTrace, margin };
  }
  const fold = Math.atan2(Math.sqrt(sinSquared), Math.sqrt(cosSquared)) / (Math.PI / 2);
  const band = bandOf(a, q, c, s);
  const characteristicExponent = band % 2 === 0 ? band + fold : band + 1 - fold;
  return { stable: true, band, characteristicExponent, halfTrace, margin };
}

/**
 * C changes sign at a_1, a_3 …, S at b_2, b_4 …, so that their signs inside a band give its number modulo 4. Where
 * more than four bands are in reach, a count of characteristic values tells which of those numbers it is; even a count
 * that is wrong by one, hard by an edge, leads to the right one.
 */
function bandOf(a: number, q: number, c: number, s: number): number {
  const remainder = s > 0 ? (c > 0 ? 0 : 1) : c > 0 ? 3 : 2;
  if (a <= FEW_BANDS_LIMIT && Math.abs(q) <= FEW_BANDS_LIMIT) return remainder;
  const estimate = 2 * evenCharacteristicValuesBelow(a, q) - 1.5;
  return remainder + 4 * Math.round((estimate - remainder) / 4);
}

/**
 * Stability of an ion at (a, q): x moves with (a, q), y with (−a, −q). Null outside the computed domain. `lostTo`
 * names the rods of the unstable plane; `region` is the pair of bands, (0, 0) the first region.
 */
export function pointStability(a: number, q: number): PointStability | null {
  const x = planeStability(a, q);
  const y = planeStability(-a, -q);
  if (x === null || y === null) return null;
  if (x.stable && y.stable) {
    return { x, y, stable: true, lostTo: null, region: { x: x.band!, y: y.band! } };
  }
  return { x, y, stable: false, lostTo: x.stable ? "y" : y.stable ? "x" : "both", region: null };
}
