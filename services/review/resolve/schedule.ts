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
  /** Dwell time that a shared cycle leaves to each; null where every acquisition states its own. */
  readonly sharedDwell_ms: number | null;
}

export interface Schedule {
  readonly moments: readonly Moment[];
  /** JSON Pointers of the dwell times and pauses that no acquisition states. */
  readonly missing: readonly string[];
}

/** Who takes turns with whom, and how long a round takes. An acquisition without a retention window always runs. */
export function scheduleOf(method: Method): Schedule {
  const { acquisition, timing } = method;
  const missing = acquisition.flatMap((each, index) => missingTimes(each, index, timing.mode));
  const boundaries = [
    ...new Set(
      acquisition.flatMap(({ retention }) => (retention ? [retention.start_min, retention.end_min] : [])),
    ),
  ].sort((one, other) => one - other);
  if (boundaries.length === 0) {
    return {
      moments: [
        momentOf(
          method,
          null,
          null,
          acquisition.map((_, index) => index),
        ),
      ],
      missing,
    };
  }
  const moments: Moment[] = [];
  for (let index = 0; index + 1 < boundaries.length; index++) {
    const start_min = boundaries[index]!;
    const end_min = boundaries[index + 1]!;
    const active = acquisition.flatMap(({ retention }, each) =>
      retention === undefined || (retention.start_min <= start_min && retention.end_min >= end_min)
        ? [each]
        : [],
    );
    if (active.length > 0) moments.push(momentOf(method, start_min, end_min, active));
  }
  return { moments, missing };
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

function momentOf(
  method: Method,
  start_min: number | null,
  end_min: number | null,
  active: readonly number[],
): Moment {
  const { acquisition, timing } = method;
  let pauses = 0;
  let scans = 0;
  let dwells = 0;
  let counted = 0;
  for (const index of active) {
    const each = acquisition[index]!;
    pauses += each.pause_ms ?? Number.NaN;
    if (isCounted(each)) {
      counted++;
      dwells += each.dwell_ms ?? Number.NaN;
    } else {
      scans += ((each.mzTo - each.mzFrom) / each.rate_mzPerS) * 1e3;
    }
  }
  let sharedDwell_ms: number | null = null;
  if (timing.mode === "cycle" && counted > 0) {
    const share = (timing.cycle_ms - pauses - scans) / counted;
    const dwell = Math.min(Math.max(share, timing.dwellMin_ms), timing.dwellMax_ms);
    sharedDwell_ms = Number.isFinite(dwell) ? dwell : null;
    dwells = dwell * counted;
  }
  const cycle = pauses + scans + (counted > 0 ? dwells : 0);
  return { start_min, end_min, active, cycle_ms: Number.isFinite(cycle) ? cycle : null, sharedDwell_ms };
}

/** The moment for a sentence. */
export function momentText({ start_min, end_min, active }: Moment): string {
  const turns = active.length === 1 ? "one acquisition" : `${active.length} acquisitions taking turns`;
  return start_min === null ? `${turns} throughout the run` : `${turns} from ${start_min} to ${end_min} min`;
}
