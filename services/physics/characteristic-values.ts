/*
 * Characteristic values a_n(q) and b_n(q) of the Mathieu equation, independent of the half-period kernel.
 *
 * The Fourier coefficients of the periodic solutions satisfy four three-term recurrences (DLMF 28.4.5 to 28.4.8,
 * https://dlmf.nist.gov/28.4), that is, symmetric tridiagonal eigenvalue problems (with a factor sqrt 2 taken into the
 * first coefficient of the π-periodic even ones) whose matrix has the squared frequencies on its diagonal, q beside it
 * and, for the 2π-periodic ones, 1 ± q in its corner. An eigenvalue is found by Newton's method on the pivot of the
 * twisted factorization (Parlett and Dhillon, Linear Algebra Appl. 267 (1997) 247), kept in a bracket by the count of
 * negative pivots (Sylvester's law of inertia), so that no other eigenvalue can be found by mistake.
 */

/** Largest order n and largest |q| of characteristicA and characteristicB. */
export const MAX_ORDER = 8;
export const MAX_CHARACTERISTIC_Q = 25;

/** Coefficients kept; at |q| <= 100 and a <= 150 the next one changes nothing. */
const SIZE = 32;

interface FourierMatrix {
  readonly diagonal: Float64Array;
  /** Squares of the numbers beside the diagonal. */
  readonly coupling: Float64Array;
}

function fourierMatrix(
  firstFrequency: number,
  corner: number,
  q: number,
  firstCoupling: number,
): FourierMatrix {
  const diagonal = new Float64Array(SIZE);
  const coupling = new Float64Array(SIZE).fill(q * q);
  for (let k = 0; k < SIZE; k++) {
    const frequency = firstFrequency + 2 * k;
    diagonal[k] = frequency * frequency;
  }
  diagonal[0] = diagonal[0]! + corner;
  coupling[0] = firstCoupling * q * q;
  return { diagonal, coupling };
}

/** A pivot that is exactly zero stands for one of either sign that is too small to matter. */
const TINY_PIVOT = 1e-300;

/** Eigenvalues below `value`, from the end of the matrix where the pivots are largest and harmless. */
function eigenvaluesBelow(matrix: FourierMatrix, value: number): number {
  let below = 0;
  let pivot = Number.POSITIVE_INFINITY;
  for (let k = SIZE - 1; k >= 0; k--) {
    pivot = matrix.diagonal[k]! - value - matrix.coupling[k]! / pivot || TINY_PIVOT;
    if (pivot < 0) below++;
  }
  return below;
}

/** The pivot at `twist` where the factorizations from both ends meet, and its derivative (negative) by `value`. */
function twistedPivot(matrix: FourierMatrix, value: number, twist: number): { pivot: number; slope: number } {
  let above = Number.POSITIVE_INFINITY;
  let aboveSlope = 0;
  for (let k = 0; k < twist; k++) {
    const before = k === 0 ? 0 : matrix.coupling[k - 1]! / above;
    aboveSlope = -1 + (before / above) * aboveSlope;
    above = matrix.diagonal[k]! - value - before || TINY_PIVOT;
  }
  let under = Number.POSITIVE_INFINITY;
  let underSlope = 0;
  for (let k = SIZE - 1; k > twist; k--) {
    const after = matrix.coupling[k]! / under;
    underSlope = -1 + (after / under) * underSlope;
    under = matrix.diagonal[k]! - value - after || TINY_PIVOT;
  }
  const fromAbove = twist === 0 ? 0 : matrix.coupling[twist - 1]! / above;
  const fromUnder = matrix.coupling[twist]! / under;
  return {
    pivot: matrix.diagonal[twist]! - value - fromAbove - fromUnder,
    slope: -1 + (fromAbove / above) * aboveSlope + (fromUnder / under) * underSlope,
  };
}

/** The eigenvalue with `index` others below it. */
function eigenvalue(matrix: FourierMatrix, index: number, q: number): number {
  const centre = matrix.diagonal[index]!;
  const radius = 3 * Math.abs(q) + 1;
  let low = matrix.diagonal[0]! - radius;
  let high = centre + radius;
  let value = centre;
  // Bisection alone would end after about sixty halvings; Newton's steps only shorten that.
  for (let step = 0; step < 128 && low < high; step++) {
    if (eigenvaluesBelow(matrix, value) > index) high = value;
    else low = value;
    const { pivot, slope } = twistedPivot(matrix, value, index);
    let next = value - pivot / slope;
    if (!(next > low && next < high)) next = low + (high - low) / 2;
    if (Math.abs(next - value) <= 1e-16 * Math.abs(next) || next === value) return next;
    value = next;
  }
  return value;
}

function valid(order: number, least: number, q: number): boolean {
  return (
    Number.isInteger(order) && order >= least && order <= MAX_ORDER && Math.abs(q) <= MAX_CHARACTERISTIC_Q
  );
}

/** a_n(q) of the even solutions, n from 0 to MAX_ORDER, |q| <= MAX_CHARACTERISTIC_Q; null outside. */
export function characteristicA(n: number, q: number): number | null {
  if (!valid(n, 0, q)) return null;
  if (q === 0) return n * n;
  const matrix = n % 2 === 0 ? fourierMatrix(0, 0, q, 2) : fourierMatrix(1, q, q, 1);
  return eigenvalue(matrix, Math.floor(n / 2), q);
}

/** b_n(q) of the odd solutions, n from 1 to MAX_ORDER, |q| <= MAX_CHARACTERISTIC_Q; null outside. */
export function characteristicB(n: number, q: number): number | null {
  if (!valid(n, 1, q)) return null;
  if (q === 0) return n * n;
  const matrix = n % 2 === 0 ? fourierMatrix(2, 0, q, 1) : fourierMatrix(1, -q, q, 1);
  return eigenvalue(matrix, Math.floor((n - 1) / 2), q);
}

/** How many of a_0(q), a_2(q), a_4(q) … lie below `a`; |a|, |q| <= 100. */
export function evenCharacteristicValuesBelow(a: number, q: number): number {
  return eigenvaluesBelow(fourierMatrix(0, 0, q, 2), a);
}
