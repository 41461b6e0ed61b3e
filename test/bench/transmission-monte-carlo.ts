import {
  CONSTANT_FIELD,
  expandCycle,
  newCycleSeries,
  nodesPerCycle,
  solutionsAt,
} from "../../services/physics/transmission/cycle-series.ts";
import { seededRandom } from "./random.ts";

/** One plane of the ideal field and the beam in it: lengths in r0, velocities in r0 per radian of Ωt/2. */
interface Plane {
  readonly a: number;
  readonly q: number;
  readonly sigmaPosition: number;
  readonly sigmaVelocity: number;
}

/** Start phases that can be drawn, equally spaced from half a step. */
const PHASES = 256;

/** For each start of a step, the matrix that carries an ion `span` of a cycle on: four numbers each. */
function stepMatrices(plane: Plane, checksPerCycle: number): Float64Array {
  const nodes = nodesPerCycle(plane.a, plane.q);
  const series = newCycleSeries(nodes);
  const state = Float64Array.of(1, 0, 0, 1);
  expandCycle(plane.a, plane.q, CONSTANT_FIELD, state, series);
  const matrices = new Float64Array(4 * PHASES);
  const before = new Float64Array(4);
  const after = new Float64Array(4);
  for (let phase = 0; phase < PHASES; phase++) {
    const turn = (phase + 0.5) / PHASES;
    const end = turn + 1 / checksPerCycle;
    solutionsAt(series, turn, before);
    solutionsAt(series, end % 1, after);
    const wraps = end >= 1;
    let [c, dc, s, ds] = [after[0]!, after[1]!, after[2]!, after[3]!];
    if (wraps) {
      [c, dc, s, ds] = [
        c * state[0]! + s * state[1]!,
        dc * state[0]! + ds * state[1]!,
        c * state[2]! + s * state[3]!,
        dc * state[2]! + ds * state[3]!,
      ];
    }
    matrices[4 * phase] = c * before[3]! - s * before[1]!;
    matrices[4 * phase + 1] = -c * before[2]! + s * before[0]!;
    matrices[4 * phase + 2] = dc * before[3]! - ds * before[1]!;
    matrices[4 * phase + 3] = -dc * before[2]! + ds * before[0]!;
  }
  return matrices;
}

/**
 * The straightforward way: ions drawn at random, flown step by step, checked `checksPerCycle` (a divisor of 256) times a cycle.
 * Between checks an ion may swing out unseen, so that the share is a little high. `rfCycles` times checks is a whole number.
 */
export function monteCarloTransmission(
  x: Plane,
  y: Plane,
  rfCycles: number,
  checksPerCycle: number,
  ions: number,
  seed: number,
): number {
  const random = seededRandom(seed);
  const stepsX = stepMatrices(x, checksPerCycle);
  const stepsY = stepMatrices(y, checksPerCycle);
  const stride = PHASES / checksPerCycle;
  const checks = Math.round(rfCycles * checksPerCycle);
  let survivors = 0;
  for (let ion = 0; ion < ions; ion++) {
    const radius = Math.sqrt(-2 * Math.log(1 - random()));
    const angle = 2 * Math.PI * random();
    const radiusV = Math.sqrt(-2 * Math.log(1 - random()));
    const angleV = 2 * Math.PI * random();
    let px = x.sigmaPosition * radius * Math.cos(angle);
    let py = y.sigmaPosition * radius * Math.sin(angle);
    let vx = x.sigmaVelocity * radiusV * Math.cos(angleV);
    let vy = y.sigmaVelocity * radiusV * Math.sin(angleV);
    let phase = Math.floor(PHASES * random());
    let alive = Math.abs(px) <= 1 && Math.abs(py) <= 1;
    for (let check = 0; check < checks && alive; check++) {
      const at = 4 * phase;
      const nextX = stepsX[at]! * px + stepsX[at + 1]! * vx;
      vx = stepsX[at + 2]! * px + stepsX[at + 3]! * vx;
      px = nextX;
      const nextY = stepsY[at]! * py + stepsY[at + 1]! * vy;
      vy = stepsY[at + 2]! * py + stepsY[at + 3]! * vy;
      py = nextY;
      phase = (phase + stride) % PHASES;
      alive = Math.abs(px) <= 1 && Math.abs(py) <= 1;
    }
    if (alive) survivors += 1;
  }
  return survivors / ions;
}
