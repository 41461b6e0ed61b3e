import { defineCheck } from "../check.ts";
import { boundsOf, LowerLimit } from "../limit.ts";
import { momentText } from "../resolve/schedule.ts";
import { digits } from "../statement.ts";

/** Base width over width at half height of a Gaussian peak, tangents at the points of inflection: 4 sigma / 2.355 sigma. */
const BASE_OVER_HALF_HEIGHT = 1.7;

export const pointsAcrossPeak = defineCheck({
  id: "points-across-peak",
  computes:
    "Base width of the chromatographic peak over the time of one round at the busiest moment of the schedule.",
  needs: [
    "chromatographicPeakWidth",
    "acquisition/dwell_ms",
    "acquisition/pause_ms",
    "acquisition/retention",
    "timing",
  ],
  quantities: [
    { quantity: "points", unit: "1", meaning: "points across the base of a peak at the busiest moment" },
  ],
  requiredByDefault: true,
  limit: LowerLimit,
  defaults: { pass: { min: 10 }, caution: { min: 7 } },
  basis:
    "10 points across the base, 7 at least; the base is 1.70 widths at half height: common practice, no source.",
  examine: ({ method, schedule }, limits) => {
    const about = { quantity: "points", unit: "1", subject: { pointer: "/method/acquisition" } };
    const width = method.chromatographicPeakWidth;
    const missing = [
      ...(width === undefined ? ["/method/chromatographicPeakWidth"] : []),
      ...schedule.missing,
    ];
    if (width === undefined || missing.length > 0) {
      return [
        {
          ...about,
          kind: "indeterminate",
          missing,
          statement: `Points across a peak cannot be counted without ${missing.join(", ")}.`,
        },
      ];
    }
    const busiest = schedule.moments.reduce((worst, moment) =>
      moment.cycle_ms! > worst.cycle_ms! ? moment : worst,
    );
    const cycle_ms = busiest.cycle_ms!;
    if (cycle_ms === 0) {
      return [
        {
          ...about,
          kind: "not-applicable",
          statement: "A round takes no time: dwell times and pauses are 0.",
        },
      ];
    }
    const base_ms = width.value_s * 1e3 * (width.at === "base" ? 1 : BASE_OVER_HALF_HEIGHT);
    const value = base_ms / cycle_ms;
    const pass = boundsOf(limits.pass);
    return [
      {
        ...about,
        kind: "value",
        value,
        evidence: "stated",
        pass,
        caution: boundsOf(limits.caution),
        passesIf:
          pass.min === null || pass.min <= 0
            ? null
            : method.timing.mode === "cycle" && cycle_ms <= method.timing.cycle_ms
              ? { input: "/method/timing/cycle_ms", min: null, max: base_ms / pass.min, unit: "ms" }
              : {
                  input: "/method/acquisition",
                  min: null,
                  max: Math.floor((busiest.active.length * base_ms) / (pass.min * cycle_ms)),
                  unit: "1",
                },
        statement: `${momentText(busiest)}: a round takes ${digits(cycle_ms, 5)} ms, which puts ${digits(value, 3)} points across a base of ${digits(base_ms / 1e3, 4)} s.`,
      },
    ];
  },
});
