/*
 * Which U/V, or which duty cycle, gives a first-region window of wanted resolution under a rectangular wave. Where the
 * mean of the field is zero the window is open towards high m/z (R = 1/2); a mean of either sign closes it from there,
 * since the plane that the mean drives out begins ever later, until it begins where the first of both planes ends.
 */
import { bracketedZero } from "../regions/bracketed-zero.ts";
import type { NotConverged, NotReachable } from "../set-point.ts";
import {
  hasBothLevels,
  lowerLevel,
  meanLevel,
  type RectangularWave,
  upperLevel,
} from "./rectangular-wave.ts";
import { bandBegin, bandEnd, type PlaneEdge, WAVE_EDGE_Q_MAX, type WavePlane } from "./wave-edges.ts";
import { WAVE_MAX_STEPS, type WaveWindow, waveWindowsOnScanLine } from "./wave-windows.ts";

/** What is varied: U/V at a given wave, or the duty cycle of a DC-coupled wave at a given U/V. */
export type WaveTuning =
  | { readonly vary: "ratio"; readonly wave: RectangularWave; readonly towards: "high" | "low" }
  | { readonly vary: "duty-cycle"; readonly ratio: number; readonly towards: "high" | "low" };

/** No window is wider than that which is open towards high m/z. */
const WAVE_RESOLUTION_INFIMUM = 0.5;
/** Above this a double U/V or duty cycle no longer holds the resolution to 1e-9. */
export const WAVE_RESOLUTION_MAXIMUM = 1e6;

const VALUE_TOLERANCE = 4e-16;

export interface TunedWave {
  readonly kind: "tuned";
  readonly ratio: number;
  readonly wave: RectangularWave;
  readonly window: WaveWindow;
  readonly steps: number;
}

/** Where the window closes: U/V and duty cycle, and the q of its last ion. */
export interface ClosedWave {
  readonly kind: "closed";
  readonly ratio: number;
  readonly wave: RectangularWave;
  readonly q: number;
  readonly steps: number;
}

export type NoSuchWave = {
  readonly kind: "impossible";
  readonly reason: "duty-cycle-not-between-0-and-1" | "dc-exceeds-wave" | "outside-computed-domain";
};

/** The varied quantity from where the window is open to where it is surely closed. */
interface Family {
  readonly open: number;
  readonly closed: number;
  readonly at: (value: number) => { readonly ratio: number; readonly wave: RectangularWave };
}

function familyOf(tuning: WaveTuning): Family | NoSuchWave {
  if (tuning.vary === "ratio") {
    const { wave, towards } = tuning;
    if (!hasBothLevels(wave)) return { kind: "impossible", reason: "duty-cycle-not-between-0-and-1" };
    // A DC as large as a level leaves one plane without any focusing.
    const closed = towards === "high" ? lowerLevel(wave) : -upperLevel(wave);
    return { open: -meanLevel(wave), closed, at: (ratio) => ({ ratio, wave }) };
  }
  const { ratio, towards } = tuning;
  if (!(Math.abs(ratio) < 1)) return { kind: "impossible", reason: "dc-exceeds-wave" };
  return {
    open: (1 - ratio) / 2,
    closed: towards === "high" ? 1 : 0,
    at: (dutyCycle) => ({ ratio, wave: { dutyCycle, coupling: "dc" } }),
  };
}

interface Search {
  readonly maxSteps: number;
  steps: number;
  converged: boolean;
}

/** q of an edge; 0 in the origin, infinite where there is none up to WAVE_EDGE_Q_MAX. */
function placeOf(edge: PlaneEdge, search: Search): number {
  search.steps += edge.steps;
  if (edge.kind === "not-converged") search.converged = false;
  return edge.kind === "edge" ? edge.q : edge.kind === "origin" ? 0 : Number.POSITIVE_INFINITY;
}

/**
 * (q_high − k q_low) / (q_high + k q_low) of the lowest bands of both planes: falls from 1 where the window is open to
 * −1 where nothing is stable, and is zero where q_high/q_low = k. The edges go on behind the point where they meet.
 */
function openness(family: Family, value: number, quotient: number, search: Search): number {
  const { ratio, wave } = family.at(value);
  const x: WavePlane = { wave, ratio, sign: 1 };
  const y: WavePlane = { wave, ratio, sign: -1 };
  const { maxSteps } = search;
  const low =
    quotient *
    Math.max(placeOf(bandBegin(x, 0, maxSteps), search), placeOf(bandBegin(y, 0, maxSteps), search));
  if (low === 0) return 1;
  if (low === Number.POSITIVE_INFINITY) return -1;
  const high = Math.min(placeOf(bandEnd(x, 0, maxSteps), search), placeOf(bandEnd(y, 0, maxSteps), search));
  return high === Number.POSITIVE_INFINITY ? 1 : (high - low) / (high + low);
}

/** The value of the family at which q_high/q_low = `quotient`, or null when it was not found. */
function valueFor(family: Family, quotient: number, search: Search): number | null {
  const { open, closed } = family;
  const valueAt = (value: number) => openness(family, value, quotient, search);
  const zero = bracketedZero(valueAt, open, 1, closed, -1, VALUE_TOLERANCE, search.maxSteps);
  return zero.kind === "zero" && search.converged ? zero.at : null;
}

/** Where the first region's window closes on the side of the tuning: the apex of this wave, or its last duty cycle. */
export function closingWave(
  tuning: WaveTuning,
  maxSteps: number = WAVE_MAX_STEPS,
): ClosedWave | NoSuchWave | NotConverged {
  const family = familyOf(tuning);
  if ("kind" in family) return family;
  const search: Search = { maxSteps, steps: 0, converged: true };
  const value = valueFor(family, 1, search);
  if (value === null) return { kind: "not-converged", steps: search.steps };
  const { ratio, wave } = family.at(value);
  const sign = ratio + meanLevel(wave) > 0 ? -1 : 1;
  const q = placeOf(bandBegin({ wave, ratio, sign }, 0, maxSteps), search);
  const end = Math.min(
    placeOf(bandEnd({ wave, ratio, sign: 1 }, 0, maxSteps), search),
    placeOf(bandEnd({ wave, ratio, sign: -1 }, 0, maxSteps), search),
  );
  if (!search.converged) return { kind: "not-converged", steps: search.steps };
  if (!(q <= WAVE_EDGE_Q_MAX && end <= WAVE_EDGE_Q_MAX)) {
    return { kind: "impossible", reason: "outside-computed-domain" };
  }
  return { kind: "closed", ratio, wave, q, steps: search.steps };
}

/**
 * U/V or duty cycle whose first-region window has `resolution` = centre/width between the edges in m/z. Every resolution
 * above WAVE_RESOLUTION_INFIMUM up to WAVE_RESOLUTION_MAXIMUM has one on either side. Levels so uneven that the window
 * would end above WAVE_EDGE_Q_MAX are outside the computed domain. `steps` counts half periods evaluated.
 */
export function waveForResolution(
  resolution: number,
  tuning: WaveTuning,
  maxSteps: number = WAVE_MAX_STEPS,
): TunedWave | NotReachable | NoSuchWave | NotConverged {
  const minimum = WAVE_RESOLUTION_INFIMUM;
  const maximum = WAVE_RESOLUTION_MAXIMUM;
  if (!(resolution > minimum && resolution <= maximum)) {
    return { kind: "not-reachable", reason: "resolution-not-reachable", minimum, maximum };
  }
  const family = familyOf(tuning);
  if ("kind" in family) return family;
  const search: Search = { maxSteps, steps: 0, converged: true };
  const value = valueFor(family, (2 * resolution + 1) / (2 * resolution - 1), search);
  if (value === null) return { kind: "not-converged", steps: search.steps };
  const { ratio, wave } = family.at(value);
  const found = waveWindowsOnScanLine(ratio, wave, "first", maxSteps);
  const steps = search.steps + found.steps;
  if (found.kind === "not-converged") return { kind: "not-converged", steps };
  const [window] = found.windows;
  // Where the ends of the bands lie beyond the search, the root found is but the place where they come into sight.
  if (!window?.low || !window.high) return { kind: "impossible", reason: "outside-computed-domain" };
  return { kind: "tuned", ratio, wave, window, steps };
}
