/*
 * The drive that opens a window of given centre and width in a named region. A region's window is widest where the scan
 * line passes its inner corner and closes at both tips, so that a resolution is reached on either side: towards the
 * tip of largest U/V ("high-ratio") and towards that of smallest U/V ("low-ratio"). In the second region these are
 * the corners a = +0.02955 and a = −0.02955 at q 7.5473; in the third (q, a) = (3.23408, 3.16430), the usual choice,
 * and (2.81530, 2.52100) (Du, Olney and Douglas, J. Am. Soc. Mass Spectrom. 8 (1997) 1230, from memory).
 */
import { DEFAULT_MAX_STEPS } from "../edge-solver.ts";
import { type Field, mzTimesQPerVolt } from "../mathieu-parameters.ts";
import { type NotConverged, type NotReachable, ratioForResolution } from "../set-point.ts";
import { crossingShift } from "./scan-line-crossing.ts";
import { type RegionWindow, type WindowEdge, windowInRegion } from "./scan-line-windows.ts";
import type { StabilityRegion } from "./stability-regions.ts";

export type RegionTip = "high-ratio" | "low-ratio";

/** Above this a double U/V no longer holds the resolution to 1e-9. */
export const REGION_RESOLUTION_MAXIMUM = 1e6;

/** U/V and the window that has the resolution. */
export interface RegionRatio {
  readonly kind: "ratio";
  readonly ratio: number;
  /** Distance of U/V from the tip, as a share of the tip's U/V; above zero inside the region. */
  readonly margin: number;
  readonly window: RegionWindow;
  readonly steps: number;
}

/** A step this small against the distance of U/V from the tip leaves an error of its square. */
const LAST_STEP = 1e-7;

/** Centre over width of a window between its edges in m/z; the open first region has 1/2. */
export function resolutionOf(window: RegionWindow): number {
  const qLow = window.low?.q ?? 0;
  return (qLow + window.high.q) / (2 * window.qWidth);
}

function inFirstRegion(
  region: StabilityRegion,
  resolution: number,
  sign: 1 | -1,
  maxSteps: number,
): RegionRatio | NotReachable | NotConverged {
  const solved = ratioForResolution(resolution, maxSteps);
  if (solved.kind !== "ratio") return solved;
  const { ratio, margin, qLow, qHigh, qWidth, steps } = solved;
  const [light, heavy] = sign > 0 ? (["x", "y"] as const) : (["y", "x"] as const);
  const slope = 2 * sign * ratio;
  const window: RegionWindow = {
    region,
    low: { q: qLow, a: slope * qLow, lostTo: heavy, curve: { kind: "a", order: 0 } },
    high: { q: qHigh, a: slope * qHigh, lostTo: light, curve: { kind: "b", order: 1 } },
    qWidth,
  };
  return { kind: "ratio", ratio: sign * ratio, margin, window, steps };
}

/**
 * U/V whose window in `region` has `resolution` = centre/width between the edges (plain numbers), on the side of `tip`.
 * Not reachable below the resolution of the region's widest window (minimum of the answer) and above
 * REGION_RESOLUTION_MAXIMUM. `steps` counts evaluations of a residual, `maxSteps` bounds the windows tried and the
 * evaluations of each.
 */
export function regionRatioForResolution(
  region: StabilityRegion,
  resolution: number,
  tip: RegionTip = "high-ratio",
  maxSteps: number = DEFAULT_MAX_STEPS,
): RegionRatio | NotReachable | NotConverged {
  if (region.name === "first") {
    return inFirstRegion(region, resolution, tip === "high-ratio" ? 1 : -1, maxSteps);
  }
  const tipRatio = ratioOfTip(region, tip);
  const span = region.inner.ratio - tipRatio;
  const widest = windowInRegion(region, region.inner.ratio, maxSteps);
  if (widest.kind !== "window") return { kind: "not-converged", steps: widest.steps };
  const minimum = resolutionOf(widest.window);
  if (!(resolution >= minimum && resolution <= REGION_RESOLUTION_MAXIMUM)) {
    const maximum = REGION_RESOLUTION_MAXIMUM;
    return { kind: "not-reachable", reason: "resolution-not-reachable", minimum, maximum };
  }
  const wanted = logarithmOfEdgeQuotient(resolution);
  let steps = widest.steps;
  // Shares of the way from the tip to the widest window: the wanted one lies between closed and wide enough.
  let closed = 0;
  let wide = 1;
  let share = wanted / logarithmOfEdgeQuotient(minimum);
  for (let tries = 1; tries <= maxSteps; tries++) {
    const ratio = tipRatio + share * span;
    const found = windowInRegion(region, ratio, maxSteps);
    steps += found.steps;
    if (found.kind === "not-converged") break;
    let next = wide;
    if (found.kind === "window") {
      const excess = logarithmOfEdgeQuotient(resolutionOf(found.window)) - wanted;
      if (excess < 0) closed = share;
      else wide = share;
      const step = -excess / (openingRate(found.window) * span);
      next = share + step;
      if (Math.abs(step) <= LAST_STEP * share) return atShare(region, tip, next, steps, maxSteps);
    } else {
      closed = share;
    }
    share = next > closed && next < wide ? next : closed + (wide - closed) / 2;
  }
  return { kind: "not-converged", steps };
}

function ratioOfTip(region: StabilityRegion, tip: RegionTip): number {
  return tip === "high-ratio" ? region.highTip.ratio : region.lowTip.ratio;
}

/** The window at a share of the way from the tip (0) to the widest window (1). */
function atShare(
  region: StabilityRegion,
  tip: RegionTip,
  share: number,
  stepsBefore: number,
  maxSteps: number,
): RegionRatio | NotConverged {
  const tipRatio = ratioOfTip(region, tip);
  const distance = share * (region.inner.ratio - tipRatio);
  const found = windowInRegion(region, tipRatio + distance, maxSteps);
  const steps = stepsBefore + found.steps;
  if (found.kind !== "window") return { kind: "not-converged", steps };
  const margin = Math.abs(distance / tipRatio);
  return { kind: "ratio", ratio: tipRatio + distance, margin, window: found.window, steps };
}

/** d ln(q_high/q_low) / d(U/V) of a window that is closed at both ends. */
function openingRate({ low, high }: RegionWindow): number {
  return shiftByRatio(high) / high.q - shiftByRatio(low!) / low!.q;
}

/** dq/d(U/V) of an edge of any region, plain numbers: exact, by implicit differentiation. */
export function shiftByRatio({ q, a, lostTo, curve }: WindowEdge): number {
  const sign = lostTo === "x" ? 1 : -1;
  return 2 * sign * crossingShift(curve, q, (sign * a) / q);
}

/** ln(q_high/q_low) of a window of this resolution: nearly linear in the distance from a tip. */
function logarithmOfEdgeQuotient(resolution: number): number {
  return Math.log1p(2 / (2 * resolution - 1));
}

/** A drive and the window it opens; a and q are those of the ion at the centre. */
export interface RegionSetPoint {
  readonly kind: "set-point";
  readonly dcVolts: number;
  readonly rfVolts: number;
  readonly a: number;
  readonly q: number;
  readonly ratio: number;
  readonly margin: number;
  readonly window: RegionWindow;
  readonly steps: number;
}

/**
 * The drive whose window in `region` is centred on `mzCentre` and `mzWidth` wide between the edges (both u per charge,
 * above zero); field in m and Hz, volts in V (pole-to-ground, zero-to-peak), U negative where the region wants it.
 */
export function regionSetPointOf(
  region: StabilityRegion,
  mzCentre: number,
  mzWidth: number,
  field: Field,
  tip: RegionTip = "high-ratio",
  maxSteps: number = DEFAULT_MAX_STEPS,
): RegionSetPoint | NotReachable | NotConverged {
  const solved = regionRatioForResolution(region, mzCentre / mzWidth, tip, maxSteps);
  if (solved.kind !== "ratio") return solved;
  const { ratio, margin, window, steps } = solved;
  const qLow = window.low?.q ?? 0;
  const q = (2 * qLow * window.high.q) / (qLow + window.high.q);
  const rfVolts = (mzCentre * q) / mzTimesQPerVolt(field);
  const a = 2 * ratio * q;
  return { kind: "set-point", dcVolts: ratio * rfVolts, rfVolts, a, q, ratio, margin, window, steps };
}
