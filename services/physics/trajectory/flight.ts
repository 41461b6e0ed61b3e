import { DOMAIN_LIMIT } from "../stability.ts";
import { type CycleStep, cycleSteps } from "./cycle-steps.ts";
import { type PlaneStretch, stretchOf } from "./plane-flight.ts";

/** How an ion enters: RF phase in rad, positions in units of r0, slopes in r0 per rad of ξ = Ωt/2. */
export interface Entry {
  readonly phase: number;
  readonly x: number;
  readonly y: number;
  readonly slopeX: number;
  readonly slopeY: number;
}

export interface Excursion {
  /** Largest |x| or |y| in units of r0. */
  readonly most: number;
  /** RF cycles after the entrance. */
  readonly atCycle: number;
}

export interface Loss {
  readonly to: "x" | "y";
  readonly atCycle: number;
  readonly x: number;
  readonly y: number;
}

export interface Flight {
  /** RF cycles after the entrance, and positions in units of r0, one after the other. */
  readonly cycles: Float64Array;
  readonly x: Float64Array;
  readonly y: Float64Array;
  readonly excursionX: Excursion;
  readonly excursionY: Excursion;
  readonly lost: Loss | null;
  /** Where the flight ends: the exit, or the loss. */
  readonly endCycle: number;
  /** Slopes there, in r0 per rad of ξ. */
  readonly slopeX: number;
  readonly slopeY: number;
}

/** What a flight needs while it is computed. */
interface Course {
  readonly cycles: number[];
  readonly xs: number[];
  readonly ys: number[];
  x: number;
  y: number;
  slopeX: number;
  slopeY: number;
  excursionX: Excursion;
  excursionY: Excursion;
}

function sample(course: Course, cycle: number): void {
  course.cycles.push(cycle);
  course.xs.push(course.x);
  course.ys.push(course.y);
}

function flightOf(course: Course, endCycle: number, lost: Loss | null): Flight {
  const { excursionX, excursionY, slopeX, slopeY } = course;
  return {
    cycles: Float64Array.from(course.cycles),
    x: Float64Array.from(course.xs),
    y: Float64Array.from(course.ys),
    excursionX,
    excursionY,
    lost,
    endCycle,
    slopeX,
    slopeY,
  };
}

function larger(known: Excursion, { peak, peakAt }: PlaneStretch, startCycle: number): Excursion {
  return peak > known.most ? { most: peak, atCycle: startCycle + peakAt / Math.PI } : known;
}

/** Carries the ion through a step, or up to `end` (in ξ) on it; the loss if there is one before that. */
function advance(course: Course, step: CycleStep, end: number | null, startCycle: number): Loss | null {
  const inX = { value: course.x, slope: course.slopeX };
  const inY = { value: course.y, slope: course.slopeY };
  const { length } = step;
  const mostX = course.excursionX.most;
  const mostY = course.excursionY.most;
  let x = stretchOf(step.x, inX, end, length, 1, mostX);
  let y = stretchOf(step.y, inY, end, length, 1, mostY);
  let loss: Loss | null = null;
  if (x.reached !== null || y.reached !== null) {
    const first = Math.min(x.reached ?? Number.POSITIVE_INFINITY, y.reached ?? Number.POSITIVE_INFINITY);
    const to = x.reached === first ? "x" : "y";
    // Without a limit: what lies beyond the loss no longer counts, and the excursion ends there.
    x = stretchOf(step.x, inX, first, length, Number.POSITIVE_INFINITY, mostX);
    y = stretchOf(step.y, inY, first, length, Number.POSITIVE_INFINITY, mostY);
    loss = { to, atCycle: startCycle + first / Math.PI, x: x.value, y: y.value };
  }
  course.excursionX = larger(course.excursionX, x, startCycle);
  course.excursionY = larger(course.excursionY, y, startCycle);
  course.x = x.value;
  course.y = y.value;
  course.slopeX = x.slope;
  course.slopeY = y.slope;
  return loss;
}

/** Distance in ξ, a few roundings of a cycle, within which the exit and a sample are one place. */
const SAME_PLACE = 1e-13;

/**
 * One ion through the ideal field: `rfCycles` cycles with `samplesPerCycle` equally spaced samples each, and one at the
 * end. a and q are those of the x plane. The ion is lost when |x| or |y| first reaches r0; that place is found between the
 * samples, and the flight ends there. Null outside the computed domain (|a|, |q| <= DOMAIN_LIMIT).
 */
export function flightThrough(
  a: number,
  q: number,
  entry: Entry,
  rfCycles: number,
  samplesPerCycle: number,
): Flight | null {
  if (!(Math.abs(a) <= DOMAIN_LIMIT && Math.abs(q) <= DOMAIN_LIMIT)) return null;
  const course: Course = {
    cycles: [],
    xs: [],
    ys: [],
    x: entry.x,
    y: entry.y,
    slopeX: entry.slopeX,
    slopeY: entry.slopeY,
    excursionX: { most: Math.abs(entry.x), atCycle: 0 },
    excursionY: { most: Math.abs(entry.y), atCycle: 0 },
  };
  sample(course, 0);
  if (Math.abs(entry.x) >= 1 || Math.abs(entry.y) >= 1) {
    const to = Math.abs(entry.x) >= 1 ? "x" : "y";
    return flightOf(course, 0, { to, atCycle: 0, x: entry.x, y: entry.y });
  }
  const steps = cycleSteps(a, q, entry.phase / 2, samplesPerCycle);
  for (let cycle = 0; ; cycle++) {
    const left = (rfCycles - cycle) * Math.PI;
    for (const step of steps) {
      const startCycle = cycle + step.start / Math.PI;
      const rest = left - step.start;
      if (rest > 0) {
        const loss = advance(course, step, rest < step.length ? rest : null, startCycle);
        if (loss !== null) {
          sample(course, loss.atCycle);
          return flightOf(course, loss.atCycle, loss);
        }
      }
      if (step.start + step.length >= left - SAME_PLACE) {
        sample(course, rfCycles);
        return flightOf(course, rfCycles, null);
      }
      if (step.sample !== null) sample(course, cycle + step.sample / samplesPerCycle);
    }
  }
}
