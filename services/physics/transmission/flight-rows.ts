/*
 * The motion of one plane as rows. With u the ion's state (position over r0, velocity over r0 per radian of ξ) carried
 * back to ξ = 0, the beginning of the RF cycle in which it enters, its position at any later ξ = π · turn is
 * (C, S) · u, the same for every start phase. In a constant field the cycles repeat, C and S of cycle k are those of
 * the first cycle times the k-th power of the monodromy matrix; in a growing field every cycle has its own series.
 */
import {
  CONSTANT_FIELD,
  type CycleSeries,
  expandCycle,
  newCycleSeries,
  nodesPerCycle,
  solutionsAt,
} from "./cycle-series.ts";

/** Mathieu parameters of one plane at entry, and their relative growth per RF cycle (0: constant field). */
export interface PlaneMotion {
  readonly a: number;
  readonly q: number;
  readonly growthPerCycle: number;
}

export interface FlightRows {
  readonly motion: PlaneMotion;
  /** Cycles that are known; fewer than asked for where the motion outgrew LONGEST_ROW. */
  readonly cycles: number;
  readonly series: readonly CycleSeries[];
  /** Four numbers a cycle: C, C', S, S' at its beginning (constant field), else nothing. */
  readonly powers: Float64Array | null;
  /** C, C', S, S' at GRID + 1 equal steps of the first cycle. */
  readonly grid: Float64Array;
  /** Largest of |C|, |C'|, |S|, |S'| within the first cycle. */
  readonly growthWithinCycle: number;
}

/** Rows this long leave nothing of any beam; the square of their square still fits a double. */
const LONGEST_ROW = 1e60;

const state = new Float64Array(4);
const values = new Float64Array(4);

function longest(of: Float64Array): number {
  return Math.max(Math.abs(of[0]!), Math.abs(of[1]!), Math.abs(of[2]!), Math.abs(of[3]!));
}

function gridOf(series: CycleSeries): Float64Array {
  const grid = new Float64Array(4 * (GRID + 1));
  for (let node = 0; node <= GRID; node++) {
    solutionsAt(series, node / GRID, values);
    grid.set(values, 4 * node);
  }
  return grid;
}

function largestOf(grid: Float64Array): number {
  let largest = 0;
  for (const value of grid) largest = Math.max(largest, Math.abs(value));
  return largest;
}

/** Powers of the monodromy in `state`, one for the beginning of each cycle. */
function monodromyPowers(cycles: number): { powers: Float64Array; known: number } {
  const [c, dc, s, ds] = [state[0]!, state[1]!, state[2]!, state[3]!];
  const powers = new Float64Array(4 * cycles);
  powers[0] = 1;
  powers[3] = 1;
  for (let cycle = 1; cycle < cycles; cycle++) {
    const to = 4 * cycle;
    for (let column = 0; column < 4; column += 2) {
      const position = powers[to - 4 + column]!;
      const velocity = powers[to - 3 + column]!;
      powers[to + column] = c * position + s * velocity;
      powers[to + column + 1] = dc * position + ds * velocity;
    }
    if (!(longest(powers.subarray(to, to + 4)) < LONGEST_ROW)) return { powers, known: cycle };
  }
  return { powers, known: cycles };
}

/** The rows of `rfCycles` > 0 cycles after an entry anywhere in the first one. */
export function flightRows(motion: PlaneMotion, rfCycles: number): FlightRows {
  const { a, q, growthPerCycle } = motion;
  const cycles = Math.floor(rfCycles) + 2;
  const largest = 1 + Math.abs(growthPerCycle) * cycles;
  const nodes = nodesPerCycle(a * largest, q * largest);
  state.set([1, 0, 0, 1]);
  if (growthPerCycle === 0) {
    const series = newCycleSeries(nodes);
    expandCycle(a, q, CONSTANT_FIELD, state, series);
    const grid = gridOf(series);
    const { powers, known } = monodromyPowers(cycles);
    return { motion, cycles: known, series: [series], powers, grid, growthWithinCycle: largestOf(grid) };
  }
  const all: CycleSeries[] = [];
  for (let cycle = 0; cycle < cycles; cycle++) {
    const series = newCycleSeries(nodes);
    // Half a cycle back, so that the mean over the start phases enters at growth 0.
    const start = 1 + growthPerCycle * (cycle - 0.5);
    expandCycle(a, q, { start, perRadian: growthPerCycle / Math.PI }, state, series);
    all.push(series);
    if (!(longest(state) < LONGEST_ROW)) break;
  }
  const grid = gridOf(all[0]!);
  return { motion, cycles: all.length, series: all, powers: null, grid, growthWithinCycle: largestOf(grid) };
}

function advance(
  powers: Float64Array,
  cycle: number,
  c: number,
  dc: number,
  s: number,
  ds: number,
  out: Float64Array,
): void {
  const at = 4 * cycle;
  out[0] = c * powers[at]! + s * powers[at + 1]!;
  out[1] = dc * powers[at]! + ds * powers[at + 1]!;
  out[2] = c * powers[at + 2]! + s * powers[at + 3]!;
  out[3] = dc * powers[at + 2]! + ds * powers[at + 3]!;
}

/** Grid rows a cycle: a power of two, so that the extremes of the RF, ξ = 0 and π/2, are among them. */
export const GRID = 8;

/** As rowAt for turn = index/GRID; a constant field needs no series for it. */
export function gridRowAt(rows: FlightRows, index: number, out: Float64Array): void {
  if (rows.powers === null) {
    rowAt(rows, index / GRID, out);
    return;
  }
  const cycle = Math.min(Math.floor(index / GRID), rows.cycles - 1);
  const from = 4 * (index - cycle * GRID);
  const { grid } = rows;
  advance(rows.powers, cycle, grid[from]!, grid[from + 1]!, grid[from + 2]!, grid[from + 3]!, out);
}

/** Writes C, C', S, S' at `turn` (0 <= turn <= cycles) into `out`, referred to the beginning of the first cycle. */
export function rowAt(rows: FlightRows, turn: number, out: Float64Array): void {
  const cycle = Math.min(Math.floor(turn), rows.cycles - 1);
  if (rows.powers === null) {
    solutionsAt(rows.series[cycle]!, turn - cycle, out);
    return;
  }
  solutionsAt(rows.series[0]!, turn - cycle, out);
  advance(rows.powers, cycle, out[0]!, out[1]!, out[2]!, out[3]!, out);
}
