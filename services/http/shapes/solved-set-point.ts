import { type Field, frequencyOf } from "../../physics/mathieu-parameters.ts";
import type { RectangularWave } from "../../physics/rectangular/rectangular-wave.ts";
import type { WaveTuning } from "../../physics/rectangular/wave-resolution.ts";
import { waveSetPointByFrequency, waveSetPointByVolts } from "../../physics/rectangular/wave-set-point.ts";
import {
  type RegionTip,
  regionRatioForResolution,
  regionSetPointOf,
} from "../../physics/regions/region-set-point.ts";
import { REGIONS, type RegionName } from "../../physics/regions/stability-regions.ts";
import { setPointOf } from "../../physics/set-point.ts";

/** What a set point is to reach, in SI; RF volts are kept where they are given, else the frequency is. */
export interface Wanted {
  readonly mzCentre: number;
  readonly mzWidth: number;
  readonly field: Field;
  readonly keptRfVolts: number | null;
  readonly tip: RegionTip;
}

export type SolvedSetPoint =
  | {
      readonly kind: "set-point";
      readonly dcVolts: number;
      readonly rfVolts: number;
      readonly frequency: number;
      readonly wave: RectangularWave | null;
      readonly a: number;
      readonly q: number;
    }
  | {
      readonly kind: "unsolved";
      readonly reason:
        | "resolution-not-reachable"
        | "needs-reversed-dc"
        | "outside-computed-domain"
        | "not-converged";
    };

function unsolved(reason: Extract<SolvedSetPoint, { kind: "unsolved" }>["reason"]): SolvedSetPoint {
  return { kind: "unsolved", reason };
}

/** The drive of a sinusoid whose window in the region named is wanted. */
export function sinusoidSetPoint(wanted: Wanted, name: RegionName, maxSteps: number): SolvedSetPoint {
  const { mzCentre, mzWidth, field, keptRfVolts } = wanted;
  const region = REGIONS.find((one) => one.name === name)!;
  // The other tip of a region that is its own mirror is the same drive with x and y exchanged.
  const tip = name === "third" ? wanted.tip : "high-ratio";
  if (keptRfVolts === null) {
    const solved =
      name === "first"
        ? setPointOf(mzCentre, mzWidth, field, maxSteps)
        : regionSetPointOf(region, mzCentre, mzWidth, field, tip, maxSteps);
    if (solved.kind !== "set-point") return unsolved("reason" in solved ? solved.reason : "not-converged");
    const { dcVolts, rfVolts, a, q } = solved;
    return { kind: "set-point", dcVolts, rfVolts, frequency: field.frequency, wave: null, a, q };
  }
  const solved = regionRatioForResolution(region, mzCentre / mzWidth, tip, maxSteps);
  if (solved.kind !== "ratio") return unsolved("reason" in solved ? solved.reason : "not-converged");
  const { ratio, window } = solved;
  const qLow = window.low?.q ?? 0;
  const q = (2 * qLow * window.high.q) / (qLow + window.high.q);
  return {
    kind: "set-point",
    dcVolts: ratio * keptRfVolts,
    rfVolts: keptRfVolts,
    frequency: frequencyOf(mzCentre, q, keptRfVolts, field.fieldRadius),
    wave: null,
    a: 2 * ratio * q,
    q,
  };
}

/** The drive of a rectangular wave whose first-region window is wanted. */
export function waveSetPoint(
  { mzCentre, mzWidth, field, keptRfVolts, tip }: Wanted,
  wave: RectangularWave,
  widthBy: "dc" | "duty-cycle",
  maxSteps: number,
): SolvedSetPoint {
  const tuning: WaveTuning =
    widthBy === "dc"
      ? { vary: "ratio", wave, towards: tip === "high-ratio" ? "high" : "low" }
      : { vary: "duty-cycle", ratio: 0, towards: "high" };
  const solved =
    keptRfVolts === null
      ? waveSetPointByVolts(mzCentre, mzWidth, field, tuning, maxSteps)
      : waveSetPointByFrequency(mzCentre, mzWidth, keptRfVolts, field.fieldRadius, tuning, maxSteps);
  switch (solved.kind) {
    case "not-reachable":
      return unsolved(solved.reason);
    case "not-converged":
      return unsolved("not-converged");
    case "impossible":
      // Duty cycles are within bounds and the ratio of a filter by duty cycle is zero, so that one reason is left.
      return unsolved("outside-computed-domain");
    case "set-point":
      // x is by definition the pair whose DC has the sign of the ion: U is never negative.
      return solved.dcVolts < 0 ? unsolved("needs-reversed-dc") : solved;
  }
}
