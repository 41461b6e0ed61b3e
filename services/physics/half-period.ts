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
const U = (2 - Math.SQRT2) / 4;
const PREVIOUS = 8 * U;
const SECOND_PREVIOUS = 8 * U * U;
const MAX_TERMS = 32;

/** w' = w_u · du/dξ with du/dξ = sin ξ / 2; the sums carry k·d_k, hence the 1/u. */
const SLOPE = Math.SQRT1_2 / (2 * U);
/** The odd solution starts as 2 sin(ξ/2), so that S'(0) = 1. */
const ODD = 2 * Math.sqrt(U);

const evenWeight = new Float64Array(MAX_TERMS);
const evenDiagonal = new Float64Array(MAX_TERMS);
const oddWeight = new Float64Array(MAX_TERMS);
const oddDiagonal = new Float64Array(MAX_TERMS);
for (let k = 0; k < MAX_TERMS; k++) {
  evenWeight[k] = U / ((k + 1) * (k + 0.5));
  evenDiagonal[k] = k * k * evenWeight[k]!;
  oddWeight[k] = U / ((k + 1.5) * (k + 1));
  oddDiagonal[k] = (k + 0.5) * (k + 0.5) * oddWeight[k]!;
}

/** Enough terms that the rest is below the rounding of the sum; measured against 75-digit references. */
function termsFor(a: number, q: number): number {
  const size = Math.abs(a) + 2 * Math.abs(q);
  return size <= 2.6 ? 18 : size <= 12 ? 22 : 26;
}

const quarter = new Float64Array(4);

function quarterPeriod(a: number, q: number, terms: number): void {
  const twoQ = 2 * q;
  const shift = twoQ - a;
  let c = 1;
  let c1 = 0;
  let c2 = 0;
  let sumC = 1;
  let slopeC = 0;
  let s = 1;
  let s1 = 0;
  let s2 = 0;
  let sumS = 1;
  let slopeS = 0.5;
  for (let k = 0; k < terms; k++) {
    const wc = evenWeight[k]!;
    const nextC = (evenDiagonal[k]! + shift * wc) * c + twoQ * wc * (SECOND_PREVIOUS * c2 - PREVIOUS * c1);
    c2 = c1;
    c1 = c;
    c = nextC;
    sumC += c;
    slopeC += (k + 1) * c;
    const ws = oddWeight[k]!;
    const nextS = (oddDiagonal[k]! + shift * ws) * s + twoQ * ws * (SECOND_PREVIOUS * s2 - PREVIOUS * s1);
    s2 = s1;
    s1 = s;
    s = nextS;
    sumS += s;
    slopeS += (k + 1.5) * s;
  }
  quarter[0] = sumC;
  quarter[1] = slopeC * SLOPE;
  quarter[2] = sumS * ODD;
  quarter[3] = slopeS * ODD * SLOPE;
}

/**
 * Writes C, C', S, S' at ξ = π/2 into `out[0..3]`: the solutions with C(0) = 1, C'(0) = 0 and S(0) = 0, S'(0) = 1.
 * `a`, `q` plain numbers. The half-trace over the whole period π is C S' + S C' = 1 + 2 S C' = 2 C S' − 1.
 */
export function halfPeriod(a: number, q: number, out: Float64Array): void {
  const terms = termsFor(a, q);
  quarterPeriod(a, q, terms);
  const c = quarter[0]!;
  const dc = quarter[1]!;
  const s = quarter[2]!;
  const ds = quarter[3]!;
  quarterPeriod(a, -q, terms);
  const farC = quarter[0]!;
  const farDc = quarter[1]!;
  const farS = quarter[2]!;
  const farDs = quarter[3]!;
  out[0] = farDs * c + farS * dc;
  out[1] = farDc * c + farC * dc;
  out[2] = farDs * s + farS * ds;
  out[3] = farDc * s + farC * ds;
}
