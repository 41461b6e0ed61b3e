import { defineCheck } from "../check.ts";
import type { Bounds, PassesIf } from "../finding.ts";
import { leverOn, passesIfWithin } from "../lever.ts";
import { boundsOf, LowerLimit } from "../limit.ts";
import { Cycle_ms, PeakWidth_s } from "../method.ts";
import { lacking, notApplicable, type Reading } from "../observation.ts";
import { NO_TIME_MS } from "../resolve/negligible.ts";
import type { ResolvedMethod } from "../resolve/resolved-method.ts";
import { type Moment, momentText, roundOf } from "../resolve/schedule.ts";
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
  examine: (resolved, limits) => [
    {
      quantity: "points",
      unit: "1",
      subject: { pointer: "/method/acquisition" },
      ...pointsAtBusiest(resolved, boundsOf(limits.pass), boundsOf(limits.caution)),
    },
  ],
});

function pointsAtBusiest(resolved: ResolvedMethod, pass: Bounds, caution: Bounds): Reading {
  const { method, schedule } = resolved;
  const width = method.chromatographicPeakWidth;
  const missing = [...(width === undefined ? ["/method/chromatographicPeakWidth"] : []), ...schedule.missing];
  if (width === undefined || missing.length > 0)
    return lacking("The number of points across a peak", missing);
  const busiest = longestRound(schedule.moments);
  const cycle_ms = busiest.cycle_ms!;
  if (cycle_ms < NO_TIME_MS) return notApplicable("A round takes no time: dwell times and pauses are 0.");
  const base_ms = width.value_s * 1e3 * (width.at === "base" ? 1 : BASE_OVER_HALF_HEIGHT);
  const value = base_ms / cycle_ms;
  return {
    kind: "value",
    value,
    evidence: "stated",
    pass,
    caution,
    passesIf: () =>
      pass.min === null || pass.min <= 0
        ? null
        : (passesIfShorter(resolved, base_ms / pass.min) ??
          passesIfWithin(leverOn("/method/chromatographicPeakWidth/value_s", "s", PeakWidth_s), {
            min: (width.value_s * pass.min) / value,
            max: null,
          })),
    statement:
      `${momentText(busiest)}: a round takes ${digits(cycle_ms, 5)} ms, which puts ${digits(value, 3)} points across a base of ${digits(base_ms / 1e3, 4)} s.` +
      (pass.min === null || value >= pass.min
        ? ""
        : ` ${pass.min} points leave ${digits(base_ms / pass.min, 4)} ms for a round.`),
  };
}

function longestRound(moments: readonly Moment[]): Moment {
  return moments.reduce((worst, moment) => (moment.cycle_ms! > worst.cycle_ms! ? moment : worst));
}

/** A member of the timing that shortens every round to `round_ms`; null where each acquisition states its own times. */
function passesIfShorter({ method, schedule }: ResolvedMethod, round_ms: number): PassesIf | null {
  const { timing } = method;
  if (timing.mode === "dwell") return null;
  const rounds = schedule.moments.map(({ active }) => roundOf(method, active)!);
  // What a round takes however short the wanted cycle is.
  const shortest_ms = Math.max(
    ...rounds.map(({ fixed_ms, sharing }) => fixed_ms + sharing * timing.dwellMin_ms),
  );
  if (shortest_ms < round_ms) {
    const cycle = leverOn("/method/timing/cycle_ms", "ms", Cycle_ms);
    return passesIfWithin(cycle, { min: null, max: round_ms });
  }
  if (timing.cycle_ms > round_ms) return null;
  const dwell_ms = Math.min(
    ...rounds.map(({ fixed_ms, sharing }) => (sharing === 0 ? Infinity : (round_ms - fixed_ms) / sharing)),
  );
  const fits = rounds.every(({ fixed_ms, sharing }) => sharing > 0 || fixed_ms <= round_ms);
  if (!fits || dwell_ms < 0) return null;
  const dwell = leverOn("/method/timing/dwellMin_ms", "ms", { minValue: 0, maxValue: timing.dwellMax_ms });
  return passesIfWithin(dwell, { min: null, max: dwell_ms });
}
