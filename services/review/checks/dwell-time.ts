import { quantity } from "../../contract/quantity.ts";
import { defineCheck, type Limits } from "../check.ts";
import type { Bounds, PassesIf } from "../finding.ts";
import { leverOn, passesIfWithin } from "../lever.ts";
import { boundsOf, type Limit, LowerLimitOfDwell } from "../limit.ts";
import { lacking, notApplicable, type Observation, type Reading } from "../observation.ts";
import type { ResolvedAcquisition, ResolvedMethod } from "../resolve/resolved-method.ts";
import { isCounted, type Moment, momentText } from "../resolve/schedule.ts";
import { digits } from "../statement.ts";

export const dwellTime = defineCheck({
  id: "dwell-time",
  computes:
    "Shortest dwell time that an acquisition is given, or the counts in it where a count rate is stated.",
  needs: ["acquisition/dwell_ms", "acquisition/countRate_perS", "timing", "acquisition/retention"],
  quantities: [
    { quantity: "dwell", unit: "ms", meaning: "shortest dwell time" },
    { quantity: "counts", unit: "1", meaning: "counts in the shortest dwell time at the stated count rate" },
  ],
  requiredByDefault: true,
  limit: LowerLimitOfDwell,
  defaults: { pass: { min: 5, minCounts: 100 }, caution: { min: 1, minCounts: 25 } },
  basis:
    "Counting statistics: n counts scatter by 1/sqrt(n), so 100 counts by 10 % and 25 by 20 %. The limits, and 5 ms and 1 ms where no count rate is stated, are common practice, no source.",
  examine: (method, limits) => {
    const observations = method.acquisitions.flatMap((each): Observation[] => {
      const { acquisition, pointer } = each;
      if (!isCounted(acquisition)) return [];
      // Criteria that limit only the time judge the time, whatever the rate.
      const rate = limits.pass.minCounts === undefined ? undefined : acquisition.countRate_perS;
      return [
        {
          quantity: rate === undefined ? "dwell" : "counts",
          unit: rate === undefined ? "ms" : "1",
          subject: { pointer, acquisition: acquisition.id },
          ...dwellOrCounts(method, each, rate, limits),
        },
      ];
    });
    if (observations.length > 0) return observations;
    const none = notApplicable("The method only scans: it dwells on no ion.");
    return [{ quantity: "dwell", unit: "ms", subject: { pointer: "/method/acquisition" }, ...none }];
  },
});

function dwellOrCounts(
  method: ResolvedMethod,
  each: ResolvedAcquisition,
  rate: number | undefined,
  limits: Limits<Limit>,
): Reading {
  const { acquisition } = each;
  const shortest = shortestDwell(method, each);
  if ("missing" in shortest) return lacking(`The dwell time of ${acquisition.id}`, shortest.missing);
  const { dwell_ms, moment } = shortest;
  const value = rate === undefined ? dwell_ms : (rate * dwell_ms) / 1e3;
  const limited = ({ min, minCounts }: Limit): Bounds =>
    boundsOf({ min: rate === undefined ? min : minCounts });
  const pass = limited(limits.pass);
  const caution =
    limits.caution.minCounts === undefined && rate !== undefined ? pass : limited(limits.caution);
  return {
    kind: "value",
    value,
    evidence: "stated",
    pass,
    caution,
    passesIf: () => passesIfLonger(method, each, shortest, rate, pass),
    statement:
      (rate === undefined
        ? `${acquisition.id} dwells for ${digits(dwell_ms, 4)} ms`
        : `${acquisition.id} collects about ${digits(value, 4)} counts in ${digits(dwell_ms, 4)} ms`) +
      (moment === null ? "." : ` at its busiest: ${momentText(moment)}.`),
  };
}

interface Shortest {
  readonly dwell_ms: number;
  /** Where a shared cycle leaves least; null where the acquisition states its dwell time. */
  readonly moment: Moment | null;
}

/** The dwell time an acquisition states, or else the least that a shared cycle leaves it. */
function shortestDwell(
  { schedule }: ResolvedMethod,
  { acquisition, index, pointer }: ResolvedAcquisition,
): Shortest | { readonly missing: readonly string[] } {
  const stated = isCounted(acquisition) ? acquisition.dwell_ms : undefined;
  if (stated !== undefined) return { dwell_ms: stated, moment: null };
  const moment = schedule.turns[index]!.busiest;
  if (schedule.missing.length > 0) return { missing: schedule.missing };
  if (moment.sharedDwell_ms === null) return { missing: [`${pointer}/dwell_ms`] };
  return { dwell_ms: moment.sharedDwell_ms, moment };
}

const Dwell_ms = quantity("A dwell time in ms.", 0, 1e6);

function passesIfLonger(
  { method }: ResolvedMethod,
  { pointer }: ResolvedAcquisition,
  { dwell_ms, moment }: Shortest,
  rate: number | undefined,
  { min }: Bounds,
): PassesIf | null {
  if (min === null) return null;
  if (rate === 0) {
    if (dwell_ms === 0) return null;
    const countRate = leverOn(`${pointer}/countRate_perS`, "s-1", { minValue: 0, maxValue: 1e12 });
    return passesIfWithin(countRate, { min: (min * 1e3) / dwell_ms, max: null });
  }
  const needed = { min: rate === undefined ? min : (min * 1e3) / rate, max: null };
  const { timing } = method;
  const own = leverOn(`${pointer}/dwell_ms`, "ms", Dwell_ms);
  if (moment === null || timing.mode === "dwell") return passesIfWithin(own, needed);
  // The shortest dwell time may rise to the longest; beyond that the acquisition needs one of its own.
  const range = { minValue: 0, maxValue: timing.dwellMax_ms };
  return (
    passesIfWithin(leverOn("/method/timing/dwellMin_ms", "ms", range), needed) ?? passesIfWithin(own, needed)
  );
}
