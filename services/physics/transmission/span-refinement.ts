/* Settling and halving of spans, as demands.ts explains. The spans under work lie on a stack of doubles. */
import { type FlightRows, GRID, gridRowAt, type PlaneMotion, rowAt } from "./flight-rows.ts";
import { appendRow, type RowList } from "./row-list.ts";
import { addToHull, isWithinHull, type SymmetricHull } from "./symmetric-hull.ts";

export interface Refinement {
  readonly rows: FlightRows;
  readonly hull: SymmetricHull;
  readonly slack: number;
  readonly maxSteps: number;
  /** Of the spans of the grid: Sturm's factor, and the weakest focus (negative: not known to focus throughout). */
  readonly gridBulge: Float64Array;
  readonly gridWeakest: Float64Array;
  finestSpan: number;
  steps: number;
}

/** Places in a span: turn, C, C', S, S' of its beginning, then of its end. */
const FROM = 0;
const TO = 5;
const SPAN = 10;
/** A span is halved at most this often; the grid's own spans are at depth 0. */
const DEEPEST = 16;

const stack = new Float64Array(SPAN * (DEEPEST + 2));
const row = new Float64Array(4);
const trial = new Float64Array(2);

/** Bounds of (a − 2q cos 2ξ) · growth between two turns, a little wide. */
export function spanFocus(
  motion: PlaneMotion,
  from: number,
  to: number,
): { readonly strongest: number; readonly weakest: number } {
  const { a, q, growthPerCycle } = motion;
  const cosine = Math.cos(Math.PI * (from + to));
  const reach = Math.PI * (to - from);
  // cos 2ξ is known in the middle and is never steeper than 1 per radian of 2ξ.
  const strong = 2 * Math.abs(q) * Math.min(1, (q > 0 ? -cosine : cosine) + reach);
  const weak = 2 * Math.abs(q) * Math.max(-1, (q > 0 ? -cosine : cosine) - reach);
  const last = Math.abs(growthPerCycle) * (to + 1);
  return { strongest: (a + strong) * (1 + last), weakest: (a + weak) * Math.max(0, 1 - last) };
}

function sturmFactor(strongest: number, span: number): number {
  if (strongest <= 0) return 1;
  const angle = 0.5 * span * Math.sqrt(strongest);
  return angle < 1.5 ? 1 / Math.cos(angle) : Number.POSITIVE_INFINITY;
}

function focusThroughout(strongest: number, weakest: number, span: number): number {
  return weakest >= 0 && span * Math.sqrt(strongest) < 0.5 * Math.PI ? weakest : -1;
}

export function newRefinement(
  rows: FlightRows,
  hull: SymmetricHull,
  slack: number,
  maxSteps: number,
): Refinement {
  const gridBulge = new Float64Array(GRID);
  const gridWeakest = new Float64Array(GRID);
  const repeats = rows.motion.growthPerCycle === 0 ? 0 : rows.cycles;
  for (let node = 0; node < GRID; node++) {
    const focus = spanFocus(rows.motion, node / GRID, (node + 1) / GRID);
    const last = spanFocus(rows.motion, repeats + node / GRID, repeats + (node + 1) / GRID);
    const strongest = Math.max(focus.strongest, last.strongest);
    gridBulge[node] = sturmFactor(strongest, Math.PI / GRID);
    gridWeakest[node] = focusThroughout(strongest, Math.min(focus.weakest, last.weakest), Math.PI / GRID);
  }
  return { rows, hull, slack, maxSteps, gridBulge, gridWeakest, finestSpan: 1 / GRID, steps: 0 };
}

/** Whether the row at this place lies within the hull times `scale`. */
function isRowWithin(work: Refinement, at: number, scale: number): boolean {
  trial[0] = stack[at + 1]! / scale;
  trial[1] = stack[at + 3]! / scale;
  work.steps += 1;
  return isWithinHull(work.hull, trial, 0);
}

/**
 * Whether the row at place `at`, followed for `span` (negative: backwards), stays within the hull times 1 + slack, by tangents
 * of the comparison solution at points that crowd at the start. Its series end on the side that weakens the focus.
 */
function staysWithin(work: Refinement, at: number, span: number, weakest: number): boolean {
  const shrink = 1 / (1 + work.slack);
  const x = stack[at + 1]!;
  const dx = stack[at + 2]!;
  const y = stack[at + 3]!;
  const dy = stack[at + 4]!;
  let from = 0;
  let length = span / 32;
  for (let piece = 0; piece < 6; piece++) {
    const square = weakest * from * from;
    const cosine = 1 - square * (1 / 2 - square / 24);
    const sine = from * (1 - square * (1 / 6 - square / 120));
    const slopeSine = weakest * from * (1 - square / 6);
    trial[0] = shrink * (x * cosine + dx * sine + length * (dx * cosine - x * slopeSine));
    trial[1] = shrink * (y * cosine + dy * sine + length * (dy * cosine - y * slopeSine));
    work.steps += 1;
    if (!isWithinHull(work.hull, trial, 0)) return false;
    from += length;
    length = from;
  }
  return true;
}

function isSettled(work: Refinement, at: number, bulge: number, weakest: number): boolean {
  const scale = 1 + work.slack;
  if (bulge <= scale) return true;
  const shrunk = scale / bulge;
  if (isRowWithin(work, at + FROM, shrunk) && isRowWithin(work, at + TO, shrunk)) return true;
  if (weakest < 0 || !isRowWithin(work, at + FROM, scale) || !isRowWithin(work, at + TO, scale)) return false;
  const span = Math.PI * (stack[at + TO]! - stack[at + FROM]!);
  return staysWithin(work, at + FROM, span, weakest) || staysWithin(work, at + TO, -span, weakest);
}

/** Halves the span at this depth of the stack and settles both halves; kept rows go into `list`, else into the hull. */
function halve(work: Refinement, list: RowList | null, depth: number): void {
  const at = SPAN * depth;
  const child = at + SPAN;
  const from = stack[at + FROM]!;
  const to = stack[at + TO]!;
  const middle = 0.5 * (from + to);
  work.finestSpan = Math.min(work.finestSpan, middle - from);
  work.steps += 1;
  rowAt(work.rows, middle, row);
  stack.copyWithin(child, at, at + TO);
  stack[child + TO] = middle;
  stack.set(row, child + TO + 1);
  if (list === null) {
    trial[0] = row[0]!;
    trial[1] = row[2]!;
    addToHull(work.hull, trial, 0);
  }
  settleChild(work, list, depth + 1);
  stack.copyWithin(child + TO, at + TO, at + SPAN);
  stack[child] = middle;
  rowAt(work.rows, middle, row);
  stack.set(row, child + 1);
  if (list !== null && !isRowWithin(work, child, 1)) appendRow(list, stack, child, child + 1, child + 3);
  settleChild(work, list, depth + 1);
}

function settleChild(work: Refinement, list: RowList | null, depth: number): void {
  if (work.steps > work.maxSteps || depth > DEEPEST) return;
  const at = SPAN * depth;
  const focus = spanFocus(work.rows.motion, stack[at + FROM]!, stack[at + TO]!);
  const span = Math.PI * (stack[at + TO]! - stack[at + FROM]!);
  const bulge = sturmFactor(focus.strongest, span);
  const weakest = focusThroughout(focus.strongest, focus.weakest, span);
  if (!isSettled(work, at, bulge, weakest)) halve(work, list, depth);
}

function loadGridRow(rows: FlightRows, index: number, at: number): void {
  gridRowAt(rows, index, row);
  stack[at] = index / GRID;
  for (let i = 0; i < 4; i++) stack[at + 1 + i] = row[i]!;
}

/**
 * Settles the spans of the grid from index `from` to index `to`. With a list, the grid rows outside the hull and those that
 * are found between them are appended in order; without, the hull takes up what is found.
 */
export function refineGrid(work: Refinement, list: RowList | null, from: number, to: number): void {
  const { rows, gridBulge, gridWeakest } = work;
  let loaded = -1;
  for (let index = from; index < to && work.steps <= work.maxSteps; index++) {
    const node = index % GRID;
    const bulge = gridBulge[node]!;
    if (list === null && bulge <= 1 + work.slack) continue;
    if (loaded === index) for (let i = 0; i < TO; i++) stack[i] = stack[TO + i]!;
    else loadGridRow(rows, index, FROM);
    if (list !== null && !isRowWithin(work, FROM, 1)) appendRow(list, stack, FROM, 1, 3);
    loadGridRow(rows, index + 1, TO);
    loaded = index + 1;
    if (!isSettled(work, FROM, bulge, gridWeakest[node]!)) halve(work, list, 0);
  }
  if (list === null) return;
  loadGridRow(rows, to, TO);
  if (!isRowWithin(work, TO, 1)) appendRow(list, stack, TO, TO + 1, TO + 3);
}
