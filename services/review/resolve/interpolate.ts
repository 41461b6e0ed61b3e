/** Where x lies in a table: between two rows, or at one. */
export interface Place {
  readonly lower: number;
  readonly upper: number;
  /** Share of the upper row; below 0 or above 1 where the outermost segment is extended. */
  readonly share: number;
  /** Whether x lies beyond the first or last row. */
  readonly outside: boolean;
}

/**
 * The place of x in a table whose rows are sorted by x. Beyond its ends "hold" keeps the outermost row, "extend" goes on
 * along the outermost segment. A single row holds.
 */
export function placeIn(sorted: readonly number[], x: number, beyond: "hold" | "extend"): Place {
  const last = sorted.length - 1;
  const outside = x < sorted[0]! || x > sorted[last]!;
  if (last === 0 || (outside && beyond === "hold")) {
    const row = x < sorted[0]! ? 0 : last;
    return { lower: row, upper: row, share: 0, outside };
  }
  let lower = 0;
  let upper = last;
  while (upper - lower > 1) {
    const middle = (lower + upper) >> 1;
    if (sorted[middle]! <= x) lower = middle;
    else upper = middle;
  }
  const length = sorted[upper]! - sorted[lower]!;
  return { lower, upper, share: length === 0 ? 0 : (x - sorted[lower]!) / length, outside };
}

/** The value on the straight line at a place; exact at a row. */
export function valueAt(values: readonly number[], { lower, upper, share }: Place): number {
  const low = values[lower]!;
  if (share === 0) return low;
  const high = values[upper]!;
  return share === 1 ? high : low + (high - low) * share;
}

/** How much a row counts at a place. */
export function weightOf(row: number, { lower, upper, share }: Place): number {
  if (lower === upper) return row === lower ? 1 : 0;
  return row === upper ? share : row === lower ? 1 - share : 0;
}

/** The row that counts most at a place. */
export function nearestRow({ lower, upper, share }: Place): number {
  return share > 0.5 ? upper : lower;
}

/** What one row would have to be for the line to have a value at a place, the other rows unchanged. */
export function rowFor(value: number, row: number, values: readonly number[], place: Place): number {
  const weight = weightOf(row, place);
  const others = valueAt(values, place) - weight * values[row]!;
  return weight === 1 ? value : (value - others) / weight;
}
