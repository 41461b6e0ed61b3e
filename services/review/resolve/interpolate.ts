/** One coordinate of a table at x: where it lies against the table, and the value on the straight line. */
export interface Interpolated {
  readonly value: number;
  readonly outside: boolean;
}

/**
 * Straight-line interpolation in points sorted by x. Outside the points `beyond` decides: "hold" keeps the value of the
 * outermost point, "extend" goes on along the outermost segment. A single point holds.
 */
export function interpolate(
  points: readonly { readonly x: number; readonly y: number }[],
  x: number,
  beyond: "hold" | "extend",
): Interpolated {
  const first = points[0]!;
  const last = points[points.length - 1]!;
  const outside = x < first.x || x > last.x;
  if (points.length === 1) return { value: first.y, outside };
  if (outside && beyond === "hold") return { value: x < first.x ? first.y : last.y, outside };
  let upper = 1;
  while (upper < points.length - 1 && points[upper]!.x < x) upper++;
  const low = points[upper - 1]!;
  const high = points[upper]!;
  if (high.x === low.x) return { value: high.y, outside };
  return { value: low.y + ((high.y - low.y) * (x - low.x)) / (high.x - low.x), outside };
}
