import { sectorMasses } from "./sector-mass.ts";
import { stripMass } from "./strip-mass.ts";
import type { SymmetricHull } from "./symmetric-hull.ts";

/** A side that reaches this many of its distances is a side of a strip. */
const STEEPEST = 1e100;

let sideX = new Float64Array(256);
let sideY = new Float64Array(256);
let squares = new Float64Array(256);
let starts = new Float64Array(256);
let ends = new Float64Array(256);

function makeRoom(count: number): void {
  if (sideX.length >= count) return;
  sideX = new Float64Array(2 * count);
  sideY = new Float64Array(2 * count);
  squares = new Float64Array(2 * count);
  starts = new Float64Array(2 * count);
  ends = new Float64Array(2 * count);
}

/**
 * The hull's vertices times B, in order. Rounding may leave two neighbours of a very long hull in the wrong order; then
 * they point the same way within rounding, and the longer one is the side of the polygon.
 */
function mapVertices(hull: SymmetricHull, b11: number, b12: number, b21: number, b22: number): number {
  const { x, y, count } = hull;
  makeRoom(count);
  let sides = 0;
  for (let i = 0; i < count; i++) {
    const vx = x[i]! * b11 + y[i]! * b21;
    const vy = x[i]! * b12 + y[i]! * b22;
    let covered = false;
    while (sides > 0) {
      const lastX = sideX[sides - 1]!;
      const lastY = sideY[sides - 1]!;
      if (lastX * vy - lastY * vx > 0) break;
      covered = lastX * lastX + lastY * lastY >= vx * vx + vy * vy;
      if (covered) break;
      sides -= 1;
    }
    if (covered) continue;
    sideX[sides] = vx;
    sideY[sides] = vy;
    sides += 1;
  }
  return sides;
}

function longestSquare(sides: number): number {
  let longest = 0;
  for (let i = 0; i < sides; i++) {
    longest = Math.max(longest, sideX[i]! * sideX[i]! + sideY[i]! * sideY[i]!);
  }
  return longest;
}

/**
 * Mass that a centred Gaussian gives to the polygon { u : |v · u| <= 1 for every vertex v of the hull }, where u = B g
 * with g standard normal. A vertex acts on g as v B: it is one side of the polygon at the distance 1/|v B|, and that
 * side ends where the normals of the hull's adjoining edges point. A plain number 0..1; det B >= 0. Where B is
 * singular (a beam without spread in one direction) the polygon is a strip.
 */
export function polygonMass(hull: SymmetricHull, b11: number, b12: number, b21: number, b22: number): number {
  const sides = mapVertices(hull, b11, b12, b21, b22);
  let vx = -sideX[sides - 1]!;
  let vy = -sideY[sides - 1]!;
  let square = vx * vx + vy * vy;
  for (let i = 0; i <= sides; i++) {
    const nextX = i < sides ? sideX[i]! : -sideX[0]!;
    const nextY = i < sides ? sideY[i]! : -sideY[0]!;
    const area = vx * nextY - vy * nextX;
    const product = vx * nextX + vy * nextY;
    const nextSquare = nextX * nextX + nextY * nextY;
    const end = (square - product) / area;
    const start = (product - nextSquare) / area;
    if (!(area > 0 && Math.max(Math.abs(end), Math.abs(start)) < STEEPEST)) {
      return stripMass(1 / Math.sqrt(longestSquare(sides)));
    }
    if (i > 0) ends[i - 1] = end;
    if (i < sides) {
      squares[i] = nextSquare;
      starts[i] = start;
    }
    vx = nextX;
    vy = nextY;
    square = nextSquare;
  }
  return Math.min(1, 2 * sectorMasses(squares, starts, ends, sides));
}
