/*
 * The Mathieu equation w'' + (a − 2q cos 2ξ) w = 0 over half a period (DLMF 28.2.1, https://dlmf.nist.gov/28.2).
 *
 * In u = sin²(ξ/2) the equation becomes
 *
 *   u (1 − u) w_uu + (1 − 2u)/2 · w_u + (a − 2q + 16 q u − 16 q u²) w = 0,
 *
 * whose power series about u = 0 (exponents 0 and 1/2: the even and the odd solution) converges for |u| < 1. A quarter
 * period, ξ = π/4, lies at u = sin²(π/8) = 0.146, so that eighteen terms carry a double. (The better known algebraic
 * form in sin²ξ lies at 1/2 there and needs forty-six.) The other quarter is the same series with −q, run backwards
 * from ξ = π/2, and the two meet in the middle.
 *
 * Terms are scaled by u^k. With d_k the scaled term, κ = k for the even and k + 1/2 for the odd solution,
 *
 *   d_{k+1} = [ (κ² − a + 2q) d_k − 16 q u d_{k−1} + 16 q u² d_{k−2} ] · u / ((κ+1)(κ+1/2)).
 */
import { halfPeriodExtended } from "./half-period-extended.ts";

const U = (2 - Math.SQRT2) / 4;

/** w' = w_u · du/dξ with du/dξ = sin ξ / 2; the sums carry κ·d_k, hence the 1/u. */
const SLOPE = Math.SQRT1_2 / (2 * U);
/** The odd solution starts as 2 sin(ξ/2), so that S'(0) = 1. */
const ODD = 2 * Math.sqrt(U);

/** Weight u/((κ+1)(κ+1/2)) and weight · κ² of the even, then of the odd solution: four numbers a term. */
const MAX_TERMS = 30;
const table = new Float64Array(4 * MAX_TERMS);
for (let k = 0; k < MAX_TERMS; k++) {
  const even = U / ((k + 1) * (k + 0.5));
  const odd = U / ((k + 1.5) * (k + 1));
  table.set([even, even * k * k, odd, odd * (k + 0.5) * (k + 0.5)], 4 * k);
}

/** |a| + 2|q| up to which a double carries every digit that is promised: the first region and its surroundings. */
const PLAIN_SIZE = 2.6;
/** |a| + 2|q| from which the terms themselves grow so much that only pairs of doubles hold them. */
const EXTENDED_SIZE = 40;
/** Growth of rounding in the joining of the quarters that a half-trace right to 1e-12 allows; 3e-13 was measured. */
const PLAIN_GROWTH = 100;

/** Enough terms that the rest is below the rounding of the sum; measured against 75-digit references. */
function termsFor(size: number): number {
  return size <= PLAIN_SIZE ? 17 : size <= 12 ? 23 : MAX_TERMS;
}

/**
 * Writes C, C', S, S' at ξ = π/2 into `out[0..3]`: the solutions with C(0) = 1, C'(0) = 0 and S(0) = 0, S'(0) = 1.
 * `a`, `q` plain numbers. The half-trace over the whole period π is C S' + S C' = 1 + 2 S C' = 2 C S' − 1.
 */
export function halfPeriod(a: number, q: number, out: Float64Array): void {
  const size = Math.abs(a) + 2 * Math.abs(q);
  if (size > EXTENDED_SIZE) {
    halfPeriodExtended(a, q, out);
    return;
  }
  const end = 4 * termsFor(size);
  const twoQ = 2 * q;
  // Four series run side by side, since each alone would wait for its own last term: even and odd, near (q) and far (−q).
  let c = 1;
  let c1 = 0;
  let c2 = 0;
  let sumC = 1;
  let slopeC = 0;
  let s = 1;
  let s1 = 0;
  let s2 = 0;
  let sumS = 1;
  let slopeS = 0;
  let farC = 1;
  let farC1 = 0;
  let farC2 = 0;
  let farSumC = 1;
  let farSlopeC = 0;
  let farS = 1;
  let farS1 = 0;
  let farS2 = 0;
  let farSumS = 1;
  let farSlopeS = 0;
  let order = 1;
  for (let i = 0; i < end; i += 4) {
    const even = table[i]!;
    const evenMain = table[i + 1]! - a * even;
    const evenQ = twoQ * even;
    const evenPast = 8 * U * evenQ;
    const nextC = (evenMain + evenQ) * c + evenPast * (U * c2 - c1);
    c2 = c1;
    c1 = c;
    c = nextC;
    sumC += c;
    slopeC += order * c;
    const nextFarC = (evenMain - evenQ) * farC - evenPast * (U * farC2 - farC1);
    farC2 = farC1;
    farC1 = farC;
    farC = nextFarC;
    farSumC += farC;
    farSlopeC += order * farC;
    const odd = table[i + 2]!;
    const oddMain = table[i + 3]! - a * odd;
    const oddQ = twoQ * odd;
    const oddPast = 8 * U * oddQ;
    const nextS = (oddMain + oddQ) * s + oddPast * (U * s2 - s1);
    s2 = s1;
    s1 = s;
    s = nextS;
    sumS += s;
    slopeS += order * s;
    const nextFarS = (oddMain - oddQ) * farS - oddPast * (U * farS2 - farS1);
    farS2 = farS1;
    farS1 = farS;
    farS = nextFarS;
    farSumS += farS;
    farSlopeS += order * farS;
    order += 1;
  }
  const dc = SLOPE * slopeC;
  const ds = ODD * SLOPE * (slopeS + 0.5 * sumS);
  const sine = ODD * sumS;
  const farDc = SLOPE * farSlopeC;
  const farDs = ODD * SLOPE * (farSlopeS + 0.5 * farSumS);
  const farSine = ODD * farSumS;
  const endC = farDs * sumC + farSine * dc;
  const endDs = farDc * sine + farSumC * ds;
  if (size > PLAIN_SIZE) {
    const errorC = Math.abs(farDs * sumC) + Math.abs(farSine * dc);
    const errorDs = Math.abs(farDc * sine) + Math.abs(farSumC * ds);
    const growth = errorC * Math.abs(endDs) + errorDs * Math.abs(endC);
    if (growth > PLAIN_GROWTH * Math.max(1, Math.abs(endC * endDs))) {
      halfPeriodExtended(a, q, out);
      return;
    }
  }
  out[0] = endC;
  out[1] = farDc * sumC + farSumC * dc;
  out[2] = farDs * sine + farSine * ds;
  out[3] = endDs;
}
