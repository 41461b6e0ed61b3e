import type { Field } from "../mathieu-parameters.ts";
import { passbandOf } from "../passband.ts";
import { flankAt } from "./flank.ts";
import { type Maximum, maximumIn } from "./maximum.ts";
import {
  type BeamMoments,
  DEFAULT_TRANSMISSION_STEPS,
  tolerancesOf,
  transmissionWithin,
} from "./transmission.ts";

export interface PeakQuery {
  /** Volts pole-to-ground, V zero-to-peak; of either sign. */
  readonly dcVolts: number;
  readonly rfVolts: number;
  readonly field: Field;
  /** RF cycles in the field of an ion of this m/z. */
  readonly residence: (mz: number) => number;
  /** The same for every m/z, or that of ions of an m/z: at one radial energy light ones are faster. */
  readonly beam: BeamMoments | ((mz: number) => BeamMoments);
  /** Of transmissions, relative to the height of the peak; 1e-2..1e-5. */
  readonly accuracy: number;
  /** m/z per s (either sign) at which the set m/z moves during the flight; volts and m/z are those at entry. */
  readonly scanRate?: number;
}

/** The two points of a peak at one height, in m/z. */
export interface Flanks {
  readonly low: number;
  readonly high: number;
  readonly width: number;
}

export interface Peak {
  readonly kind: "peak";
  /** m/z of the largest transmission; on a flat top any point of it. */
  readonly mz: number;
  readonly height: number;
  /** mz minus the middle between the stability edges. */
  readonly shiftFromCentre: number;
  /** Null where the flank on the heavy or the light side never comes down to that height. */
  readonly halfHeight: Flanks | null;
  readonly tenthHeight: Flanks | null;
  /** Largest absolute error bound of the transmissions that were computed. */
  readonly errorBound: number;
  readonly evaluations: number;
  readonly steps: number;
}

export type PeakAnswer =
  | Peak
  | {
      readonly kind: "none";
      readonly reason:
        | "no-upper-edge"
        | "above-apex"
        | "no-rf"
        | "nothing-passes"
        | "no-maximum-near-the-window";
    }
  | { readonly kind: "not-converged"; readonly steps: number }
  | { readonly kind: "outside-computed-domain"; readonly reason: "motion-too-violent" };

/** The first look at the height, and what counts as nothing there. */
const FIRST_LOOK = 1e-3;
const SECOND_LOOK = 1e-6;
const NOTHING = 1e-6;
/**
 * The maximum is looked for this many windows beyond each edge, in this many first steps: a short residence makes the peak
 * wider than its window and moves it out.
 */
const BEYOND = [0.5, 2, 8, 32, 128];
const FIRST_STEPS = 8;
/** Final bracket of the maximum, as a share of the first. */
const TOP_BRACKET = 0.02;
/** Error of a flank, as a share of accuracy times the stretch in which the maximum was found. */
const FLANK_SHARE = 0.1;
/** Flanks are followed to this factor below and above the window. */
const FARTHEST = 4;

interface Values {
  readonly at: (mz: number) => number;
  readonly failure: () => Exclude<PeakAnswer, Peak> | null;
  readonly sum: { evaluations: number; steps: number; errorBound: number };
}

function valuesOf(query: PeakQuery, mzCentre: number, phases: number, maxSteps: number): Values {
  const { dcVolts, rfVolts, field } = query;
  const tolerances = { phases, slack: tolerancesOf(query.accuracy).slack };
  const driveGrowth = (query.scanRate ?? 0) / mzCentre;
  const sum = { evaluations: 0, steps: 0, errorBound: 0 };
  let failure: Exclude<PeakAnswer, Peak> | null = null;
  const at = (mz: number): number => {
    if (failure !== null) return 0;
    const beam = typeof query.beam === "function" ? query.beam(mz) : query.beam;
    const flight = { mz, dcVolts, rfVolts, field, beam, rfCycles: query.residence(mz), driveGrowth };
    const answer = transmissionWithin(flight, tolerances, maxSteps - sum.steps);
    if (answer.kind === "outside-computed-domain") {
      failure = answer;
      return 0;
    }
    sum.steps += answer.steps;
    if (answer.kind === "not-converged") {
      failure = { kind: "not-converged", steps: sum.steps };
      return 0;
    }
    sum.evaluations += 1;
    sum.errorBound = Math.max(sum.errorBound, answer.errorBound);
    return answer.transmission;
  };
  return { at, failure: () => failure, sum };
}

/** Budget of a whole profile: some fifty transmissions. */
const DEFAULT_PROFILE_STEPS = 5 * DEFAULT_TRANSMISSION_STEPS;

/**
 * Position, height and widths of the peak that a drive forms in the first stability region. The flanks are bracketed from
 * the stability edges outwards and followed to a quarter of the lower and four times the upper edge. Widths are right to
 * about `accuracy` times the window. Not modelled: see transmission.ts.
 */
export function peakProfileOf(query: PeakQuery, maxSteps: number = DEFAULT_PROFILE_STEPS): PeakAnswer {
  const answer = passbandOf(query.dcVolts, query.rfVolts, query.field);
  if (answer.kind === "empty") return { kind: "none", reason: answer.reason };
  if (answer.kind === "not-converged") return { kind: "not-converged", steps: answer.steps };
  const { mzLow, mzHigh, mzCentre, mzWidth } = answer.passband;
  if (mzHigh === null || mzCentre === null || mzWidth === null)
    return { kind: "none", reason: "no-upper-edge" };
  let steps = 0;
  let look = 0;
  for (const tolerance of [FIRST_LOOK, SECOND_LOOK]) {
    const first = valuesOf(query, mzCentre, tolerance, maxSteps - steps);
    look = first.at(mzCentre);
    steps += first.sum.steps;
    const failure = first.failure();
    if (failure !== null) return failure;
    if (look > 10 * tolerance) break;
  }
  if (!(look > NOTHING)) return { kind: "none", reason: "nothing-passes" };
  const values = valuesOf(query, mzCentre, 0.7 * query.accuracy * look, maxSteps - steps);
  let top: Maximum = { kind: "at-an-end" };
  let stretch = mzWidth;
  for (const beyond of BEYOND) {
    const from = Math.max(mzLow - beyond * mzWidth, mzLow / 2);
    const to = Math.min(mzHigh + beyond * mzWidth, 2 * mzHigh);
    stretch = to - from;
    top = maximumIn(values.at, from, to, FIRST_STEPS, TOP_BRACKET * stretch);
    if (top.kind === "maximum" || values.failure() !== null) break;
  }
  if (values.failure() !== null) return values.failure()!;
  if (top.kind === "at-an-end") return { kind: "none", reason: "no-maximum-near-the-window" };
  const { x, value } = top;
  const flanksAt = (share: number): Flanks | null => {
    const tolerance = FLANK_SHARE * query.accuracy * stretch;
    const common = { inside: x, valueInside: value, tolerance };
    const light = { edge: Math.min(mzLow, x), stride: -stretch / 16, farthest: mzLow / FARTHEST };
    const heavy = { edge: Math.max(mzHigh, x), stride: stretch / 16, farthest: mzHigh * FARTHEST };
    const low = flankAt(values.at, share * value, { ...common, ...light });
    const high = flankAt(values.at, share * value, { ...common, ...heavy });
    return low === null || high === null ? null : { low, high, width: high - low };
  };
  const halfHeight = flanksAt(0.5);
  const tenthHeight = flanksAt(0.1);
  if (values.failure() !== null) return values.failure()!;
  return {
    kind: "peak",
    mz: x,
    height: value,
    shiftFromCentre: x - mzCentre,
    halfHeight,
    tenthHeight,
    errorBound: values.sum.errorBound,
    evaluations: values.sum.evaluations,
    steps: steps + values.sum.steps,
  };
}
