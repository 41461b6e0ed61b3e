import { DEFAULT_MAX_STEPS } from "../edge-solver.ts";
import { scanLineEdges } from "../passband.ts";
import { type CharacteristicCurve, scanLineCrossing } from "./scan-line-crossing.ts";
import {
  type Corner,
  REGIONS,
  REGIONS_LIMIT,
  type RegionName,
  type StabilityRegion,
} from "./stability-regions.ts";

/** An end of a window: which rods take the ion beyond it, and the characteristic curve that is crossed there. */
export interface WindowEdge {
  readonly q: number;
  readonly a: number;
  readonly lostTo: "x" | "y";
  /** Its order is the characteristic exponent β of the plane that is lost. */
  readonly curve: CharacteristicCurve;
}

/** The part of a scan line inside one region. */
export interface RegionWindow {
  readonly region: StabilityRegion;
  /** The end at high m/z; null where the first region is open towards q = 0. */
  readonly low: WindowEdge | null;
  /** The end at low m/z. */
  readonly high: WindowEdge;
  readonly qWidth: number;
}

export type ScanLineWindows =
  | {
      readonly kind: "windows";
      /** By rising q, that is, by falling m/z. */
      readonly windows: readonly RegionWindow[];
      /** Why the list is empty. */
      readonly reason: null | "above-apex" | "scan-line-misses-region";
      /** The list is complete from 0 to this q; no window of it is cut off there. */
      readonly searchedToQ: number;
      readonly steps: number;
    }
  | { readonly kind: "not-converged"; readonly steps: number };

/** Where U/V lies between two corners, as a starting value for q. */
function interpolatedQ(from: Corner, to: Corner, ratio: number): number {
  return from.q + ((to.q - from.q) * (ratio - from.ratio)) / (to.ratio - from.ratio);
}

type WindowInRegion =
  | { readonly kind: "window"; readonly window: RegionWindow; readonly steps: number }
  | { readonly kind: "none"; readonly steps: number }
  | { readonly kind: "not-converged"; readonly steps: number };

/** The first region has its own solver, which keeps the digits of a nearly closed window. */
function windowInFirst(region: StabilityRegion, ratio: number, maxSteps: number): WindowInRegion {
  const edges = scanLineEdges(ratio, maxSteps);
  if (edges.kind === "empty") return { kind: "none", steps: 0 };
  if (edges.kind === "not-converged") return edges;
  const [light, heavy] = ratio < 0 ? (["y", "x"] as const) : (["x", "y"] as const);
  const edge = (q: number, lostTo: "x" | "y", curve: CharacteristicCurve): WindowEdge => ({
    q,
    a: 2 * ratio * q,
    lostTo,
    curve,
  });
  const high = edge(edges.qHigh, light, { kind: "b", order: 1 });
  const low = edges.kind === "high-pass" ? null : edge(edges.qLow, heavy, { kind: "a", order: 0 });
  const qWidth = edges.kind === "high-pass" ? edges.qHigh : edges.qWidth;
  return { kind: "window", window: { region, low, high, qWidth }, steps: edges.steps };
}

/**
 * The part of the scan line a = 2 (U/V) q inside a region, plain numbers, `ratio` U/V with its sign. Because every
 * characteristic curve is crossed at most once (scan-line-crossing.ts) it is one interval or none: the plane of x is
 * stable in its band from the crossing of a_{n_x} to that of b_{n_x+1}, the plane of y likewise, and the corners tell
 * which of the two comes last at the low end and first at the high end. On a corner (a = 0 in the second region, where
 * both planes end together) the edge is named as for a U/V a little larger.
 */
export function windowInRegion(
  region: StabilityRegion,
  ratio: number,
  maxSteps: number = DEFAULT_MAX_STEPS,
): WindowInRegion {
  const { bands, inner, highTip, outer, lowTip, name } = region;
  if (name === "first") return windowInFirst(region, ratio, maxSteps);
  if (!(ratio > lowTip.ratio && ratio < highTip.ratio)) return { kind: "none", steps: 0 };
  const lowPlane = ratio >= inner.ratio ? "y" : "x";
  const highPlane = ratio >= outer.ratio ? "x" : "y";
  const lowCurve: CharacteristicCurve = { kind: "a", order: bands[lowPlane] };
  const highCurve: CharacteristicCurve = { kind: "b", order: bands[highPlane] + 1 };
  const sigma = { x: 2 * ratio, y: -2 * ratio };
  const lowStart = interpolatedQ(inner, lowPlane === "y" ? highTip : lowTip, ratio);
  const low = scanLineCrossing(lowCurve, sigma[lowPlane], lowStart, maxSteps);
  if (low.kind === "not-converged") return low;
  const highStart = interpolatedQ(outer, highPlane === "x" ? highTip : lowTip, ratio);
  const high = scanLineCrossing(highCurve, sigma[highPlane], highStart, maxSteps - low.steps);
  const steps = low.steps + high.steps;
  if (high.kind === "not-converged") return { kind: "not-converged", steps: maxSteps };
  // Within rounding of a tip the crossings may come out in the wrong order: the window is closed.
  if (low.kind === "none" || high.kind === "none" || !(high.q > low.q)) return { kind: "none", steps };
  const window: RegionWindow = {
    region,
    low: { q: low.q, a: 2 * ratio * low.q, lostTo: lowPlane, curve: lowCurve },
    high: { q: high.q, a: 2 * ratio * high.q, lostTo: highPlane, curve: highCurve },
    qWidth: high.q - low.q,
  };
  return { kind: "window", window, steps };
}

/**
 * Every window that the scan line a = 2 (U/V) q has in the region named, or in any region, with |a|, q <=
 * REGIONS_LIMIT. A negative `ratio` (the DC of the x rods against the ion's sign) exchanges the planes: "third" then
 * means the mirror (0,1) of the third region, which alone such a line can cross. `steps` counts evaluations of a
 * residual, `maxSteps` bounds them for each window.
 */
export function windowsOnScanLine(
  ratio: number,
  wanted: RegionName | "any",
  maxSteps: number = DEFAULT_MAX_STEPS,
): ScanLineWindows {
  const windows: RegionWindow[] = [];
  let steps = 0;
  for (const region of REGIONS) {
    if (wanted !== "any" && !isMeant(region, wanted)) continue;
    const found = windowInRegion(region, ratio, maxSteps);
    if (found.kind === "not-converged") return found;
    steps += found.steps;
    if (found.kind === "window") windows.push(found.window);
  }
  windows.sort((one, other) => one.high.q - other.high.q);
  const reason = windows.length > 0 ? null : wanted === "first" ? "above-apex" : "scan-line-misses-region";
  const searchedToQ = Math.min(REGIONS_LIMIT, REGIONS_LIMIT / (2 * Math.abs(ratio)));
  return { kind: "windows", windows, reason, searchedToQ, steps };
}

function isMeant({ bands, name }: StabilityRegion, wanted: RegionName): boolean {
  return name === wanted || (wanted === "third" && bands.x === 0 && bands.y === 1);
}
