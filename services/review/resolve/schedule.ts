import type { Acquisition } from "../acquisition.ts";
import type { Method } from "../method.ts";

/** A stretch of the run in which the same acquisitions take turns. */
export interface Moment {
  /** Null where the run has no retention windows. */
  readonly start_min: number | null;
  readonly end_min: number | null;
  /** Indices of the acquisitions that take turns, in their order. */
  readonly active: readonly number[];
  /** Time of one round; null where a dwell time or pause is missing. */
  readonly cycle_ms: number | null;
  /** Dwell time that a shared cycle leaves to each that states none; null where all state their own. */
  readonly sharedDwell_ms: number | null;
}

/** One acquisition's place in the schedule. */
export interface Turns {
  /** The moment that leaves it the least dwell time; of equal ones, the one with the longest round. */
  readonly busiest: Moment;
  /** Indices of the acquisitions that come before it at some moment; the last of a round precedes the first of the next. */
  readonly predecessors: ReadonlySet<number>;
}

export interface Schedule {
  readonly moments: readonly Moment[];
  /** By the index of the acquisition. */
  readonly turns: readonly Turns[];
  /** JSON Pointers of the dwell times and pauses that no acquisition states. */
  readonly missing: readonly string[];
}

/** Who takes turns with whom, and how long a round takes. An acquisition without a retention window always runs. */
export function scheduleOf(method: Method): Schedule {
  const moments = momentsOf(method);
  return {
    moments,
    turns: turnsOf(moments, method.acquisition.length),
    missing: method.acquisition.flatMap((each, index) => missingTimes(each, index, method.timing.mode)),
  };
}

function momentsOf(method: Method): Moment[] {
  const { acquisition } = method;
  const boundaries = new Set<number>();
  for (const { retention } of acquisition) {
    if (retention !== undefined) boundaries.add(retention.start_min).add(retention.end_min);
  }
  if (boundaries.size === 0) return [momentOf(method, null, null, [...acquisition.keys()])];
  const sorted = [...boundaries].sort((one, other) => one - other);
  const moments: Moment[] = [];
  for (let index = 0; index + 1 < sorted.length; index++) {
    const active = activeBetween(acquisition, sorted[index]!, sorted[index + 1]!);
    if (active.length > 0) moments.push(momentOf(method, sorted[index]!, sorted[index + 1]!, active));
  }
  return moments;
}

/** Indices of the acquisitions that run all the time between two neighbouring boundaries. */
function activeBetween(acquisition: Method["acquisition"], start_min: number, end_min: number): number[] {
  const active: number[] = [];
  for (let index = 0; index < acquisition.length; index++) {
    const { retention } = acquisition[index]!;
    if (retention === undefined || (retention.start_min <= start_min && retention.end_min >= end_min)) {
      active.push(index);
    }
  }
  return active;
}

function missingTimes(acquisition: Acquisition, index: number, mode: Method["timing"]["mode"]): string[] {
  const pointer = `/method/acquisition/${index}`;
  const missing = acquisition.pause_ms === undefined ? [`${pointer}/pause_ms`] : [];
  if (mode === "dwell" && isCounted(acquisition) && acquisition.dwell_ms === undefined) {
    missing.push(`${pointer}/dwell_ms`);
  }
  return missing;
}

type Counted = Extract<Acquisition, { kind: "transition" | "selected-ion" }>;

/** Acquisitions that dwell on one set point; the others scan. */
export function isCounted(acquisition: Acquisition): acquisition is Counted {
  return acquisition.kind === "transition" || acquisition.kind === "selected-ion";
}

/** What a round is made of: times that are fixed, and how many dwell times share what a wanted cycle leaves. */
export interface Round {
  readonly fixed_ms: number;
  readonly sharing: number;
}

/** The round of these acquisitions; null where a time is missing. */
export function roundOf({ acquisition, timing }: Method, active: readonly number[]): Round | null {
  let fixed_ms = 0;
  let sharing = 0;
  for (const index of active) {
    const each = acquisition[index]!;
    if (each.pause_ms === undefined) return null;
    fixed_ms += each.pause_ms;
    if (!isCounted(each)) fixed_ms += ((each.mzTo - each.mzFrom) / each.rate_mzPerS) * 1e3;
    else if (each.dwell_ms !== undefined) fixed_ms += each.dwell_ms;
    else if (timing.mode === "cycle") sharing++;
    else return null;
  }
  return { fixed_ms, sharing };
}

function momentOf(
  method: Method,
  start_min: number | null,
  end_min: number | null,
  active: readonly number[],
): Moment {
  const { timing } = method;
  const round = roundOf(method, active);
  const moment = { start_min, end_min, active };
  if (round === null) return { ...moment, cycle_ms: null, sharedDwell_ms: null };
  const { fixed_ms, sharing } = round;
  if (timing.mode === "dwell" || sharing === 0)
    return { ...moment, cycle_ms: fixed_ms, sharedDwell_ms: null };
  const share = (timing.cycle_ms - fixed_ms) / sharing;
  const sharedDwell_ms = Math.min(Math.max(share, timing.dwellMin_ms), timing.dwellMax_ms);
  return { ...moment, cycle_ms: fixed_ms + sharedDwell_ms * sharing, sharedDwell_ms };
}

function turnsOf(moments: readonly Moment[], acquisitions: number): Turns[] {
  const busiest = new Array<Moment | undefined>(acquisitions);
  const predecessors = Array.from({ length: acquisitions }, () => new Set<number>());
  for (const moment of moments) {
    const { active } = moment;
    active.forEach((index, place) => {
      const known = busiest[index];
      if (known === undefined || isBusier(moment, known)) busiest[index] = moment;
      if (active.length > 1) predecessors[index]!.add(active[(place + active.length - 1) % active.length]!);
    });
  }
  return predecessors.map((before, index) => ({ busiest: busiest[index]!, predecessors: before }));
}

/** Whether a moment leaves less dwell time to each, or, where that is equal, has the longer round. */
function isBusier(one: Moment, other: Moment): boolean {
  const [dwell, otherDwell] = [one.sharedDwell_ms ?? Infinity, other.sharedDwell_ms ?? Infinity];
  if (dwell !== otherDwell) return dwell < otherDwell;
  return (one.cycle_ms ?? 0) > (other.cycle_ms ?? 0);
}

/** The moment for a sentence. */
export function momentText({ start_min, end_min, active }: Moment): string {
  const turns = active.length === 1 ? "one acquisition" : `${active.length} acquisitions taking turns`;
  return start_min === null ? `${turns} throughout the run` : `${turns} from ${start_min} to ${end_min} min`;
}
