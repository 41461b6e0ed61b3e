/*
 * The two fundamental solutions of w'' + k(ξ)(a − 2q cos 2ξ) w = 0 over one RF cycle, 0 <= ξ <= π, as Taylor series
 * about equally spaced nodes that are tied to the RF phase (DLMF 28.2.1 for k = 1, https://dlmf.nist.gov/28.2).
 *
 * k = 1 in a constant field. While the field is scanned U and V grow together, and k(ξ) = k0 + k1 ξ multiplies a and q;
 * both cases obey the same recurrence, so the growing field needs no approximation.
 */

/** With steps up to REACH half a cycle is right to 2e-13 of its largest value, measured for |a|, |q| <= 12. */
const ORDER = 20;
const TERMS = ORDER + 1;

/** Longest step, in units of the inverse local wave number: (step · sqrt(|a| + 2|q|)). */
const REACH = 0.55;
/** Longest step against the period of the RF. */
const FEWEST_NODES = 8;

/** How many nodes a cycle needs for this a and q; a power of two, so that ξ = 0 and ξ = π/2 are nodes. */
export function nodesPerCycle(a: number, q: number): number {
  const wanted = (Math.PI * Math.sqrt(Math.abs(a) + 2 * Math.abs(q))) / REACH;
  let nodes = FEWEST_NODES;
  while (nodes < wanted) nodes *= 2;
  return nodes;
}

/** Growth of the field over a cycle: k(ξ) = start + perRadian · ξ. */
export interface FieldGrowth {
  readonly start: number;
  readonly perRadian: number;
}

export const CONSTANT_FIELD: FieldGrowth = { start: 1, perRadian: 0 };

/** C, C', S, S' anywhere in one cycle. */
export interface CycleSeries {
  readonly nodes: number;
  /** For each node TERMS coefficients of C, then TERMS of S, in powers of ξ − ξ_node. */
  readonly coefficients: Float64Array;
}

export function newCycleSeries(nodes: number): CycleSeries {
  return { nodes, coefficients: new Float64Array(2 * TERMS * nodes) };
}

const stiffness = new Float64Array(TERMS);

/** Taylor coefficients of k(ξ)(a − 2q cos 2ξ) about `phase`, into `stiffness`. */
function expandStiffness(a: number, q: number, phase: number, growth: FieldGrowth): void {
  const level = growth.start + growth.perRadian * phase;
  const cosine = Math.cos(2 * phase);
  const sine = Math.sin(2 * phase);
  let factor = -2 * q;
  let previous = 0;
  for (let i = 0; i < TERMS; i++) {
    const turned = (i & 1) === 0 ? cosine : -sine;
    const sign = (i & 3) === 2 || (i & 3) === 3 ? -1 : 1;
    const term = factor * sign * turned + (i === 0 ? a : 0);
    stiffness[i] = level * term + growth.perRadian * previous;
    previous = term;
    factor *= 2 / (i + 1);
  }
}

/** Continues the series whose first two coefficients stand at `from`. */
function expandSolution(coefficients: Float64Array, from: number): void {
  for (let m = 0; m + 2 < TERMS; m++) {
    let sum = 0;
    for (let i = 0; i <= m; i++) sum += stiffness[i]! * coefficients[from + m - i]!;
    coefficients[from + m + 2] = -sum / ((m + 1) * (m + 2));
  }
}

function valueAt(coefficients: Float64Array, from: number, offset: number): number {
  let sum = coefficients[from + ORDER]!;
  for (let i = ORDER - 1; i >= 0; i--) sum = sum * offset + coefficients[from + i]!;
  return sum;
}

function slopeAt(coefficients: Float64Array, from: number, offset: number): number {
  let sum = ORDER * coefficients[from + ORDER]!;
  for (let i = ORDER - 1; i >= 1; i--) sum = sum * offset + i * coefficients[from + i]!;
  return sum;
}

/**
 * Expands the solutions that start with the columns of `state` (C, C', S, S' at ξ = 0) over the cycle and leaves in
 * `state` their values at ξ = π. Relative error below 4e-13 a cycle, measured against the half-period series.
 */
export function expandCycle(
  a: number,
  q: number,
  growth: FieldGrowth,
  state: Float64Array,
  series: CycleSeries,
): void {
  const { nodes, coefficients } = series;
  const step = Math.PI / nodes;
  for (let node = 0; node < nodes; node++) {
    expandStiffness(a, q, node * step, growth);
    for (let solution = 0; solution < 2; solution++) {
      const from = (2 * node + solution) * TERMS;
      coefficients[from] = state[2 * solution]!;
      coefficients[from + 1] = state[2 * solution + 1]!;
      expandSolution(coefficients, from);
      state[2 * solution] = valueAt(coefficients, from, step);
      state[2 * solution + 1] = slopeAt(coefficients, from, step);
    }
  }
}

/** Writes C, C', S, S' at `turn` (0 <= turn <= 1, ξ = π · turn) into `out[0..3]`. */
export function solutionsAt(series: CycleSeries, turn: number, out: Float64Array): void {
  const { nodes, coefficients } = series;
  const node = Math.min(nodes - 1, Math.floor(turn * nodes));
  const offset = (Math.PI * (turn * nodes - node)) / nodes;
  const from = 2 * node * TERMS;
  out[0] = valueAt(coefficients, from, offset);
  out[1] = slopeAt(coefficients, from, offset);
  out[2] = valueAt(coefficients, from + TERMS, offset);
  out[3] = slopeAt(coefficients, from + TERMS, offset);
}
