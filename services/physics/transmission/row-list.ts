import { addToHull, copyHull, isWithinHull, newSymmetricHull, type SymmetricHull } from "./symmetric-hull.ts";

/** Rows in the order of time (in RF cycles), each as two numbers of `points`. */
export interface RowList {
  turn: Float64Array;
  points: Float64Array;
  count: number;
}

export function newRowList(): RowList {
  return { turn: new Float64Array(64), points: new Float64Array(128), count: 0 };
}

/** Appends the row whose turn, C and S stand at these places of `values`. */
export function appendRow(list: RowList, values: Float64Array, turn: number, c: number, s: number): void {
  const { count } = list;
  if (count === list.turn.length) {
    const turns = new Float64Array(2 * count);
    const points = new Float64Array(4 * count);
    turns.set(list.turn);
    points.set(list.points);
    list.turn = turns;
    list.points = points;
  }
  list.turn[count] = values[turn]!;
  list.points[2 * count] = values[c]!;
  list.points[2 * count + 1] = values[s]!;
  list.count = count + 1;
}

/**
 * Drops what no start phase can need. A phase that needs a row of the cycle of entry needs all later ones of it too
 * (`backwards`), one that needs a row after the earliest exit all earlier ones: a row inside the hull of the shared rows and of
 * those is never a side.
 */
export function keepWhatCounts(list: RowList, shared: SymmetricHull, backwards: boolean): void {
  const hull = newSymmetricHull();
  copyHull(shared, hull);
  const keep: number[] = [];
  for (let i = 0; i < list.count; i++) {
    const at = backwards ? list.count - 1 - i : i;
    if (isWithinHull(hull, list.points, 2 * at)) continue;
    addToHull(hull, list.points, 2 * at);
    keep.push(at);
  }
  if (backwards) keep.reverse();
  keep.forEach((at, i) => {
    list.turn[i] = list.turn[at]!;
    list.points[2 * i] = list.points[2 * at]!;
    list.points[2 * i + 1] = list.points[2 * at + 1]!;
  });
  list.count = keep.length;
}
