/*
 * One RF cycle of the Mathieu equation w'' + Q(ξ) w = 0, Q = a − 2q cos 2ξ, as a list of steps, each with the Taylor
 * polynomials of its two fundamental solutions. The equation is linear and periodic, so these carry any ion through any
 * number of cycles.
 *
 * With w = Σ w_k s^k about the start of a step and cos 2ξ = Σ c_k s^k,
 *
 *   (k + 2)(k + 1) w_{k+2} = −a w_k + 2q Σ_j c_j w_{k−j}.
 */

/**
 * Degree of the polynomials. w is entire, but off the real axis it grows as exp(√(q/2) e^|Im ξ|): on steps of half a radian
 * this degree lost 4e-12 against references, on the longest allowed here nothing above rounding.
 */
const DEGREE = 22;
/** Longest step in ξ; shorter where √(|a| + 2|q|) exceeds 2. */
const LONGEST = 0.3;

/** One plane on one step: polynomials in s from 0 to the step's length. */
export interface PlaneStep {
  readonly cosine: Float64Array;
  readonly sine: Float64Array;
  /** C, C', S, S' over the whole step. */
  readonly whole: readonly [number, number, number, number];
}

/** A stretch of a cycle in which Q keeps its sign. */
export interface CycleStep {
  /** From the start of the cycle, in ξ. */
  readonly start: number;
  readonly length: number;
  /** Number of the sample at the end of the step, counted from the start of the cycle; null between samples. */
  readonly sample: number | null;
  readonly x: PlaneStep;
  readonly y: PlaneStep;
}

function planeStep(a: number, q: number, phase: number, length: number): PlaneStep {
  const drive = new Float64Array(DEGREE + 1);
  let factor = 1;
  for (let k = 0; k <= DEGREE; k++) {
    // The derivatives of cos 2ξ run through cos, −sin, −cos, sin.
    const derivative = k % 2 === 0 ? Math.cos(2 * phase) : -Math.sin(2 * phase);
    drive[k] = 2 * q * factor * (k % 4 < 2 ? derivative : -derivative);
    factor *= 2 / (k + 1);
  }
  const solution = (value: number, slope: number) => {
    const w = new Float64Array(DEGREE + 1);
    w[0] = value;
    w[1] = slope;
    for (let k = 0; k + 2 <= DEGREE; k++) {
      let sum = -a * w[k]!;
      for (let j = 0; j <= k; j++) sum += drive[j]! * w[k - j]!;
      w[k + 2] = sum / ((k + 2) * (k + 1));
    }
    return w;
  };
  const polynomials = { cosine: solution(1, 0), sine: solution(0, 1) };
  return {
    ...polynomials,
    whole: [
      valueAt(polynomials, 1, 0, length),
      slopeAt(polynomials, 1, 0, length),
      valueAt(polynomials, 0, 1, length),
      slopeAt(polynomials, 0, 1, length),
    ],
  };
}

/** Where Q changes sign within a cycle that starts at ξ = `phase`, from its start; both planes share these places. */
function signChanges(a: number, q: number, phase: number): number[] {
  const share = a / (2 * q);
  if (!(Math.abs(share) < 1)) return [];
  const angle = Math.acos(share) / 2;
  return [angle, -angle].map((place) => {
    const from = (place - phase) % Math.PI;
    return from < 0 ? from + Math.PI : from;
  });
}

/**
 * The steps of a cycle that starts at RF phase 2 · `phase`, with `samples` equal parts. x moves with (a, q), y with
 * (−a, −q); all plain numbers, ξ in radians.
 */
export function cycleSteps(a: number, q: number, phase: number, samples: number): CycleStep[] {
  const longest = LONGEST / Math.max(1, Math.sqrt(Math.abs(a) + 2 * Math.abs(q)) / 2);
  const breaks: { readonly at: number; readonly sample: number | null }[] = signChanges(a, q, phase).map(
    (at) => ({ at, sample: null }),
  );
  for (let k = 1; k <= samples; k++) breaks.push({ at: (k * Math.PI) / samples, sample: k });
  breaks.sort((one, other) => one.at - other.at);
  const steps: CycleStep[] = [];
  let start = 0;
  for (const { at, sample } of breaks) {
    const parts = Math.max(1, Math.ceil((at - start) / longest));
    const length = (at - start) / parts;
    for (let part = 1; part <= parts; part++) {
      const from = start + (part - 1) * length;
      steps.push({
        start: from,
        length,
        sample: part === parts ? sample : null,
        x: planeStep(a, q, phase + from, length),
        y: planeStep(-a, -q, phase + from, length),
      });
    }
    start = at;
  }
  return steps;
}

/** Value and slope of an ion in one plane. */
export interface Motion {
  value: number;
  slope: number;
}

type Polynomials = Pick<PlaneStep, "cosine" | "sine">;

/** Value at `s` into a step of the motion that enters it with `value` and `slope`. */
export function valueAt({ cosine, sine }: Polynomials, value: number, slope: number, s: number): number {
  let sum = 0;
  for (let k = DEGREE; k >= 0; k--) sum = sum * s + (value * cosine[k]! + slope * sine[k]!);
  return sum;
}

export function slopeAt({ cosine, sine }: Polynomials, value: number, slope: number, s: number): number {
  let sum = 0;
  for (let k = DEGREE; k >= 1; k--) sum = sum * s + k * (value * cosine[k]! + slope * sine[k]!);
  return sum;
}
