import type { Demands } from "./demands.ts";
import { rowAt } from "./flight-rows.ts";
import { polygonMass } from "./polygon-mass.ts";
import type { RowList } from "./row-list.ts";
import { addToHull, copyHull, newSymmetricHull } from "./symmetric-hull.ts";

const work = newSymmetricHull();
const row = new Float64Array(4);
const point = new Float64Array(2);

function addBetween(list: RowList, from: number, to: number): void {
  for (let i = 0; i < list.count && list.turn[i]! <= to; i++) {
    if (list.turn[i]! >= from) addToHull(work, list.points, 2 * i);
  }
}

/** Sides of the last polygon that was integrated: what the call cost. */
export function sidesOfLastPolygon(): number {
  return work.count;
}

/**
 * Share (0..1) of a centred Gaussian beam that enters at `turn` (0 <= turn < 1, in RF cycles from Ωt = 0) and keeps
 * |x| <= r0 until it leaves; `sigmaPosition` in r0, `sigmaVelocity` in r0 per radian of ξ.
 */
export function planeTransmission(
  demands: Demands,
  turn: number,
  sigmaPosition: number,
  sigmaVelocity: number,
): number {
  const { rows, lead, tail, cutShort } = demands;
  const exit = turn + demands.rfCycles;
  copyHull(demands.shared, work);
  addBetween(lead, turn, exit);
  if (!cutShort) {
    addBetween(tail, turn, exit);
    rowAt(rows, exit, row);
    point[0] = row[0]!;
    point[1] = row[2]!;
    addToHull(work, point, 0);
  }
  rowAt(rows, turn, row);
  const [c, dc, s, ds] = [row[0]!, row[1]!, row[2]!, row[3]!];
  point[0] = c;
  point[1] = s;
  addToHull(work, point, 0);
  return polygonMass(work, ds * sigmaPosition, -s * sigmaVelocity, -dc * sigmaPosition, c * sigmaVelocity);
}
