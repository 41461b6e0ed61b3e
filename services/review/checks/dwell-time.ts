import { defineCheck, type Limits } from "../check.ts";
import { boundsOf, type Limit, LowerLimitOfDwell } from "../limit.ts";
import type { Observation } from "../observation.ts";
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
    const observations = method.acquisitions.flatMap((each) => {
      const shortest = shortestDwell(method, each);
      return shortest === null ? [] : [dwellOf(each, shortest, limits)];
    });
    if (observations.length > 0) return observations;
    return [
      {
        kind: "not-applicable",
        quantity: "dwell",
        unit: "ms",
        subject: { pointer: "/method/acquisition" },
        statement: "The method only scans: it dwells on no ion.",
      },
    ];
  },
});

interface Shortest {
  readonly dwell_ms: number | null;
  readonly missing: readonly string[];
  readonly moment: Moment | null;
}

/** The dwell time an acquisition states, or the least that a shared cycle leaves it; null where it scans. */
function shortestDwell(
  { method, schedule }: ResolvedMethod,
  { acquisition, pointer }: ResolvedAcquisition,
): Shortest | null {
  if (!isCounted(acquisition)) return null;
  if (method.timing.mode === "dwell") {
    const dwell_ms = acquisition.dwell_ms ?? null;
    return { dwell_ms, missing: dwell_ms === null ? [`${pointer}/dwell_ms`] : [], moment: null };
  }
  const index = method.acquisition.indexOf(acquisition);
  const moments = schedule.moments.filter(({ active }) => active.includes(index));
  if (schedule.missing.length > 0) return { dwell_ms: null, missing: schedule.missing, moment: null };
  const busiest = moments.reduce((worst, moment) =>
    moment.sharedDwell_ms! < worst.sharedDwell_ms! ? moment : worst,
  );
  return { dwell_ms: busiest.sharedDwell_ms, missing: [], moment: busiest };
}

function dwellOf(
  { acquisition, pointer }: ResolvedAcquisition,
  shortest: Shortest,
  limits: Limits<Limit>,
): Observation {
  const rate = isCounted(acquisition) ? acquisition.countRate_perS : undefined;
  const about = {
    quantity: rate === undefined ? "dwell" : "counts",
    unit: rate === undefined ? "ms" : "1",
    subject: { pointer, acquisition: acquisition.id },
  };
  const { dwell_ms, missing, moment } = shortest;
  if (dwell_ms === null) {
    return {
      ...about,
      kind: "indeterminate",
      missing,
      statement: `The dwell time does not follow without ${missing.join(", ")}.`,
    };
  }
  const value = rate === undefined ? dwell_ms : (rate * dwell_ms) / 1e3;
  const pass =
    rate === undefined ? boundsOf({ min: limits.pass.min }) : boundsOf({ min: limits.pass.minCounts });
  const caution =
    rate === undefined ? boundsOf({ min: limits.caution.min }) : boundsOf({ min: limits.caution.minCounts });
  const needed_ms =
    pass.min === null ? null : rate === undefined ? pass.min : rate > 0 ? (pass.min * 1e3) / rate : null;
  return {
    ...about,
    kind: "value",
    value,
    evidence: "stated",
    pass,
    caution,
    passesIf:
      needed_ms === null
        ? null
        : {
            input: moment === null ? `${pointer}/dwell_ms` : "/method/timing/dwellMin_ms",
            min: needed_ms,
            max: null,
            unit: "ms",
          },
    statement:
      (rate === undefined
        ? `${acquisition.id} dwells for ${digits(dwell_ms, 4)} ms`
        : `${acquisition.id} collects about ${digits(value, 4)} counts in ${digits(dwell_ms, 4)} ms`) +
      (moment === null ? "." : ` at its busiest: ${momentText(moment)}.`),
  };
}
