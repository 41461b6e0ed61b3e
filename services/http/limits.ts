import type { Limits } from "./endpoint.ts";
import type { Settings } from "./settings.ts";

/** Solvers need some ten steps a number; this is what an ill-natured one is given before it says so. */
const MOST_STEPS = 200;

/** Ions, points or targets in one request: a few milliseconds of work at most. */
export const MOST_ITEMS = 1000;

export function limitsOf({ bodyLimit_kB }: Pick<Settings, "bodyLimit_kB">): Limits {
  return { maxSteps: MOST_STEPS, bodyLimit_kB };
}
