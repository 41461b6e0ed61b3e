/*
 * Convex hull of a centrally symmetric set of points in the plane, kept as one half of its vertices in anticlockwise
 * order: v_0, …, v_{n−1}, followed by −v_0, …, −v_{n−1}. Points are added one at a time, each found by bisection over
 * the directions; a point inside costs log n cross products and nothing else.
 *
 * Points are handed over as a place in an array: a double that is an argument of its own would be allocated.
 */

export interface SymmetricHull {
  x: Float64Array;
  y: Float64Array;
  count: number;
}

export function newSymmetricHull(): SymmetricHull {
  return { x: new Float64Array(64), y: new Float64Array(64), count: 0 };
}

function grow(hull: SymmetricHull, capacity: number): void {
  const x = new Float64Array(2 * capacity);
  const y = new Float64Array(2 * capacity);
  x.set(hull.x);
  y.set(hull.y);
  hull.x = x;
  hull.y = y;
}

/** Makes `target` the same hull as `source`. */
export function copyHull(source: SymmetricHull, target: SymmetricHull): void {
  const { count } = source;
  if (target.x.length < count) grow(target, count);
  const { x, y } = target;
  for (let i = 0; i < count; i++) {
    x[i] = source.x[i]!;
    y[i] = source.y[i]!;
  }
  target.count = count;
}

function remove(hull: SymmetricHull, at: number): void {
  const { x, y } = hull;
  hull.count -= 1;
  for (let i = at; i < hull.count; i++) {
    x[i] = x[i + 1]!;
    y[i] = y[i + 1]!;
  }
}

/** Whether of three vertices in order, by cyclic number, the middle one lies on or inside the chord of the others. */
function isCovered(hull: SymmetricHull, first: number, middle: number, last: number): boolean {
  const { x, y, count } = hull;
  const n = 2 * count;
  const f = (first + n) % n;
  const m = (middle + n) % n;
  const l = (last + n) % n;
  const xf = f < count ? x[f]! : -x[f - count]!;
  const yf = f < count ? y[f]! : -y[f - count]!;
  const xm = m < count ? x[m]! : -x[m - count]!;
  const ym = m < count ? y[m]! : -y[m - count]!;
  const xl = l < count ? x[l]! : -x[l - count]!;
  const yl = l < count ? y[l]! : -y[l - count]!;
  return (xl - xf) * (ym - yf) - (yl - yf) * (xm - xf) >= 0;
}

/** Removes what the vertex covers after it; returns its new place. */
function removeAfter(hull: SymmetricHull, at: number): number {
  let index = at;
  while (hull.count > 2 && isCovered(hull, index, index + 1, index + 2)) {
    const next = (index + 1) % hull.count;
    remove(hull, next);
    if (next < index) index -= 1;
  }
  return index;
}

function removeBefore(hull: SymmetricHull, at: number): void {
  let index = at;
  while (hull.count > 2 && isCovered(hull, index - 2, index - 1, index)) {
    const previous = (index - 1 + hull.count) % hull.count;
    remove(hull, previous);
    if (previous < index) index -= 1;
  }
}

function insert(hull: SymmetricHull, at: number, px: number, py: number): void {
  if (hull.count === hull.x.length) grow(hull, hull.count);
  const { x, y } = hull;
  for (let i = hull.count; i > at; i--) {
    x[i] = x[i - 1]!;
    y[i] = y[i - 1]!;
  }
  x[at] = px;
  y[at] = py;
  hull.count += 1;
  removeBefore(hull, removeAfter(hull, at));
}

/** Whether the point points[at], points[at + 1] lies within the hull. */
export function isWithinHull(hull: SymmetricHull, points: Float64Array, at: number): boolean {
  const { x, y, count } = hull;
  if (count < 2) return false;
  const x0 = x[0]!;
  const y0 = y[0]!;
  let px = points[at]!;
  let py = points[at + 1]!;
  if (x0 * py - y0 * px < 0) {
    px = -px;
    py = -py;
  }
  let low = 0;
  let high = count;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (x[middle]! * py - y[middle]! * px >= 0) low = middle;
    else high = middle;
  }
  const lowX = x[low]!;
  const lowY = y[low]!;
  const nextX = high < count ? x[high]! : -x0;
  const nextY = high < count ? y[high]! : -y0;
  return (nextX - lowX) * (py - lowY) - (nextY - lowY) * (px - lowX) >= 0;
}

/** Adds the pair ±(points[at], points[at + 1]); both finite. */
export function addToHull(hull: SymmetricHull, points: Float64Array, at: number): void {
  const { x, y, count } = hull;
  let px = points[at]!;
  let py = points[at + 1]!;
  if (count === 0) {
    x[0] = px;
    y[0] = py;
    hull.count = 1;
    return;
  }
  const x0 = x[0]!;
  const y0 = y[0]!;
  const turn = x0 * py - y0 * px;
  if (turn < 0 || (turn === 0 && x0 * px + y0 * py < 0)) {
    px = -px;
    py = -py;
  }
  if (count === 1 && turn === 0) {
    if (px * px + py * py > x0 * x0 + y0 * y0) {
      x[0] = px;
      y[0] = py;
    }
    return;
  }
  let low = 0;
  let high = count;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (x[middle]! * py - y[middle]! * px >= 0) low = middle;
    else high = middle;
  }
  const nextX = high < count ? x[high]! : -x0;
  const nextY = high < count ? y[high]! : -y0;
  const lowX = x[low]!;
  const lowY = y[low]!;
  if ((nextX - lowX) * (py - lowY) - (nextY - lowY) * (px - lowX) >= 0) return;
  insert(hull, high, px, py);
}
