/*
 * Where the scan line α = σ q meets a characteristic curve a_n(q) or b_n(q) of the Mathieu equation.
 *
 * The Fourier coefficients of the periodic solutions (DLMF 28.4.5 to 28.4.8, https://dlmf.nist.gov/28.4) are the
 * eigenvectors v of D + q E, with the squared frequencies in D >= 0, so that an eigenvalue c(q) has
 *
 *   c = <v|D|v> + q <v|E|v>,   c' = <v|E|v> (Hellmann and Feynman),   d(c/q)/dq = −<v|D|v>/q² < 0.
 *
 * c(q)/q therefore falls strictly for all q > 0: a scan line crosses every curve at most once, on which rests that no
 * edge of a region can be missed. The crossing is a zero of a pivot of D + q (E − σ), found by Newton's method on the
 * twisted factorization (Parlett and Dhillon, Linear Algebra Appl. 267 (1997) 247) in a bracket that the signs of the
 * pivots keep: as many as are negative, so many curves have been crossed (Sylvester's law of inertia).
 */

/** A characteristic curve: a_n of the even, b_n of the odd periodic solutions. */
export interface CharacteristicCurve {
  readonly kind: "a" | "b";
  readonly order: number;
}

/** Largest q at which crossings are sought, and largest order of a curve that is met there. */
export const CROSSING_Q_MAX = 12;
export const CROSSING_ORDER_MAX = 5;

/** Coefficients kept: at q = 12 the next one would change nothing up to order 5. */
const LEVELS = 18;
const TINY_PIVOT = 1e-300;
/** A Newton step this small leaves an error of its square. */
const LAST_STEP = 1e-9;
/** Near a pole of the pivot Newton's steps are small too, but not the pivot. */
const SMALL_PIVOT = 1e-3;

/** The pivot at the twist and its derivatives by q and by σ. */
interface Twisted {
  pivot: number;
  slope: number;
  bySigma: number;
  /** How many of the others are negative. */
  others: number;
}
const twisted: Twisted = { pivot: 0, slope: 0, bySigma: 0, others: 0 };

interface FourierClass {
  readonly firstFrequency: 0 | 1 | 2;
  /** Factor of q in the first element of the diagonal. */
  readonly corner: -1 | 0 | 1;
  /** Factor of q² in the first product of the elements beside the diagonal. */
  readonly firstCoupling: 1 | 2;
}
const EVEN_A: FourierClass = { firstFrequency: 0, corner: 0, firstCoupling: 2 };
const ODD_A: FourierClass = { firstFrequency: 1, corner: 1, firstCoupling: 1 };
const EVEN_B: FourierClass = { firstFrequency: 2, corner: 0, firstCoupling: 1 };
const ODD_B: FourierClass = { firstFrequency: 1, corner: -1, firstCoupling: 1 };

function classOf({ kind, order }: CharacteristicCurve): FourierClass {
  if (kind === "a") return order % 2 === 0 ? EVEN_A : ODD_A;
  return order % 2 === 0 ? EVEN_B : ODD_B;
}

/** How many curves of the same class lie below. */
function indexOf({ kind, order }: CharacteristicCurve): number {
  return Math.floor((kind === "a" ? order : order - 1) / 2);
}

/** Factorizes D + q (E − σ) from both ends to `twist`; writes to `twisted`. */
function factorize(matrix: FourierClass, q: number, sigma: number, twist: number): void {
  const qSquared = q * q;
  let negative = 0;
  let before = 0;
  let beforeSlope = 0;
  let beforeBySigma = 0;
  for (let k = 0; k < twist; k++) {
    const frequency = matrix.firstFrequency + 2 * k;
    const linear = (k === 0 ? matrix.corner : 0) - sigma;
    const level = frequency * frequency + linear * q - before || TINY_PIVOT;
    const levelSlope = linear - beforeSlope;
    if (level < 0) negative++;
    const coupling = k === 0 ? matrix.firstCoupling : 1;
    before = (coupling * qSquared) / level;
    beforeBySigma = (before * (q + beforeBySigma)) / level;
    beforeSlope = (2 * coupling * q - before * levelSlope) / level;
  }
  let after = 0;
  let afterSlope = 0;
  let afterBySigma = 0;
  for (let k = LEVELS; k > twist; k--) {
    const frequency = matrix.firstFrequency + 2 * k;
    const level = frequency * frequency - sigma * q - after || TINY_PIVOT;
    const levelSlope = -sigma - afterSlope;
    if (level < 0) negative++;
    const coupling = k === 1 ? matrix.firstCoupling : 1;
    after = (coupling * qSquared) / level;
    afterBySigma = (after * (q + afterBySigma)) / level;
    afterSlope = (2 * coupling * q - after * levelSlope) / level;
  }
  const frequency = matrix.firstFrequency + 2 * twist;
  const linear = (twist === 0 ? matrix.corner : 0) - sigma;
  twisted.pivot = frequency * frequency + (linear * q - before - after);
  twisted.slope = linear - beforeSlope - afterSlope;
  twisted.bySigma = -q - beforeBySigma - afterBySigma;
  twisted.others = negative;
}

/** A crossing, with the number of factorizations it took. */
export type Crossing =
  | { readonly kind: "crossing"; readonly q: number; readonly steps: number }
  | { readonly kind: "none"; readonly steps: number }
  | { readonly kind: "not-converged"; readonly steps: number };

/**
 * The one q in (0, CROSSING_Q_MAX] where `curve` equals σ q (all plain numbers; order <= CROSSING_ORDER_MAX), or that
 * there is none; a_0 and the line always meet in the origin, which does not count. `start` is a guess that only saves
 * steps. The error is a few units in the last place of q, also where a_0 runs into the origin.
 */
export function scanLineCrossing(
  curve: CharacteristicCurve,
  sigma: number,
  start: number,
  maxSteps: number,
): Crossing {
  const matrix = classOf(curve);
  const index = indexOf(curve);
  if (curve.kind === "a" && curve.order === 0 && sigma >= 0) return { kind: "none", steps: 0 };
  let low = 0;
  let high = CROSSING_Q_MAX;
  let q = start > low && start < high ? start : high / 2;
  let endTried = false;
  for (let steps = 1; steps <= maxSteps; steps++) {
    factorize(matrix, q, sigma, index);
    const { pivot, others } = twisted;
    const step = -pivot / twisted.slope;
    // Where the other pivots have crossed `index` curves, a small pivot belongs to this one and not to a neighbour.
    if (others === index && Math.abs(pivot) < SMALL_PIVOT && Math.abs(step) <= LAST_STEP * q) {
      return { kind: "crossing", q: q + step, steps };
    }
    if (others + (pivot < 0 ? 1 : 0) > index) high = q;
    else if (q === CROSSING_Q_MAX) return { kind: "none", steps };
    else low = q;
    const next = q + step;
    if (next > low && next < high) q = next;
    else if (next >= CROSSING_Q_MAX && !endTried) {
      endTried = true;
      q = CROSSING_Q_MAX;
    } else q = low + (high - low) / 2;
  }
  return { kind: "not-converged", steps: maxSteps };
}

/** dq/dσ of the crossing at `q`: how far it moves when the scan line turns. */
export function crossingShift(curve: CharacteristicCurve, q: number, sigma: number): number {
  factorize(classOf(curve), q, sigma, indexOf(curve));
  return -twisted.bySigma / twisted.slope;
}
