import type { Limits } from "./endpoint.ts";
import type { Settings } from "./settings.ts";

/** Solvers need some ten steps a number; this is what an ill-natured one is given before it says so. */
const MOST_STEPS = 200;

/** Ions, points or targets in one request: a few milliseconds of work at most. */
export const MOST_ITEMS = 1000;

export function limitsOf({ bodyLimit_kB }: Pick<Settings, "bodyLimit_kB">): Limits {
  return { maxSteps: MOST_STEPS, bodyLimit_kB };
}

/** A method of 2,000 acquisitions with names, compounds and retention windows, or several such to compare. */
export const METHOD_BODY_LIMIT_KB = 4_000;

/** The record of such a method holds some nine findings an acquisition, and files of it may be indented. */
export const RECORD_BODY_LIMIT_KB = 32_000;
