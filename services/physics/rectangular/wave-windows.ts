import type { Bands } from "../regions/stability-regions.ts";
import { hasBothLevels, type RectangularWave } from "./rectangular-wave.ts";
import { bandBegin, bandEnd, type PlaneEdge, WAVE_EDGE_Q_MAX, type WavePlane } from "./wave-edges.ts";

/** Halvings and interpolations that one edge may take. */
export const WAVE_MAX_STEPS = 200;

/** An end of a window, and which rods take the ion beyond it; β of that plane is a whole number there. */
export interface WaveEdge {
  readonly q: number;
  readonly a: number;
  readonly lostTo: "x" | "y";
  readonly characteristicExponent: number;
}

/** The part of a scan line that is stable in both planes, in one pair of bands. */
export interface WaveWindow {
  readonly bands: Bands;
  /** The end at high m/z; null where the window is open towards q = 0. */
  readonly low: WaveEdge | null;
  /** The end at low m/z; null where the window reaches WAVE_EDGE_Q_MAX, beyond which nothing is sought. */
  readonly high: WaveEdge | null;
  /** high − low, each replaced by 0 or WAVE_EDGE_Q_MAX where it is null. */
  readonly qWidth: number;
}

export type WaveWindows =
  | {
      readonly kind: "windows";
      /** By rising q, that is, by falling m/z. */
      readonly windows: readonly WaveWindow[];
      readonly reason: null | "above-apex" | "scan-line-misses-region" | "duty-cycle-not-between-0-and-1";
      readonly searchedToQ: number;
      readonly steps: number;
    }
  | { readonly kind: "not-converged"; readonly steps: number };

/** A stable stretch of one plane; null stands for the origin or for the end of the search. */
interface Stretch {
  readonly band: number;
  readonly from: number | null;
  readonly to: number | null;
}

interface Search {
  readonly maxSteps: number;
  steps: number;
  converged: boolean;
}

function noted(edge: PlaneEdge, search: Search): PlaneEdge {
  search.steps += edge.steps;
  if (edge.kind === "not-converged") search.converged = false;
  return edge;
}

/** The bands of a plane from 0 to `bandMax` that begin before WAVE_EDGE_Q_MAX. */
function stretches(plane: WavePlane, bandMax: number, search: Search): Stretch[] {
  const found: Stretch[] = [];
  for (let band = 0; band <= bandMax && search.converged; band++) {
    const begin = noted(bandBegin(plane, band, search.maxSteps), search);
    if (begin.kind === "none" || begin.kind === "not-converged") break;
    const end = noted(bandEnd(plane, band, search.maxSteps), search);
    const from = begin.kind === "edge" ? begin.q : null;
    const to = end.kind === "edge" ? end.q : null;
    found.push({ band, from, to });
    if (to === null) break;
  }
  return found;
}

function overlap(x: Stretch, y: Stretch, ratio: number): WaveWindow | null {
  const lowInX = (x.from ?? 0) > (y.from ?? 0);
  const highInX = (x.to ?? WAVE_EDGE_Q_MAX) <= (y.to ?? WAVE_EDGE_Q_MAX);
  const low = lowInX ? x.from : y.from;
  const high = highInX ? x.to : y.to;
  const qWidth = (high ?? WAVE_EDGE_Q_MAX) - (low ?? 0);
  if (!(qWidth > 0)) return null;
  const edge = (q: number | null, inX: boolean, above: 0 | 1): WaveEdge | null =>
    q === null
      ? null
      : {
          q,
          a: 2 * ratio * q,
          lostTo: inX ? "x" : "y",
          characteristicExponent: (inX ? x.band : y.band) + above,
        };
  return {
    bands: { x: x.band, y: y.band },
    low: edge(low, lowInX, 0),
    high: edge(high, highInX, 1),
    qWidth,
  };
}

/**
 * Every window that the scan line a = 2 (U/V) q has under a rectangular wave, in the first region (bands 0 and 0) or in
 * any up to q = WAVE_EDGE_Q_MAX; `ratio` is U/V of the DC that is applied besides the wave, of either sign, V half the
 * swing. `steps` counts half periods evaluated, `maxSteps` bounds halvings and interpolations for each edge.
 */
export function waveWindowsOnScanLine(
  ratio: number,
  wave: RectangularWave,
  wanted: "first" | "any",
  maxSteps: number = WAVE_MAX_STEPS,
): WaveWindows {
  if (!hasBothLevels(wave)) {
    const reason = "duty-cycle-not-between-0-and-1";
    return { kind: "windows", windows: [], reason, searchedToQ: 0, steps: 0 };
  }
  const search: Search = { maxSteps, steps: 0, converged: true };
  const bandMax = wanted === "first" ? 0 : Number.POSITIVE_INFINITY;
  const x = stretches({ wave, ratio, sign: 1 }, bandMax, search);
  const y = x.length > 0 ? stretches({ wave, ratio, sign: -1 }, bandMax, search) : [];
  if (!search.converged) return { kind: "not-converged", steps: search.steps };
  const windows: WaveWindow[] = [];
  for (const inX of x) {
    for (const inY of y) {
      const window = overlap(inX, inY, ratio);
      if (window !== null) windows.push(window);
    }
  }
  windows.sort((one, other) => (one.low?.q ?? 0) - (other.low?.q ?? 0));
  const missed = wanted === "first" ? "above-apex" : "scan-line-misses-region";
  const reason = windows.length > 0 ? null : missed;
  return { kind: "windows", windows, reason, searchedToQ: WAVE_EDGE_Q_MAX, steps: search.steps };
}
