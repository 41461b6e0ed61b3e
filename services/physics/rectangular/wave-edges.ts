/*
 * Edges of the stable bands of one plane on a scan line a = 2 (U/V) q under a rectangular wave.
 *
 * On the line the equation is w'' + q W(ξ) w = 0 with W = 2 (U/V + level), an eigenvalue problem with q as eigenvalue and
 * an indefinite weight W. Each of the four boundary conditions of a half period has simple positive eigenvalues, in order
 * of the zeros of their solutions (oscillation theorems: Ince, Ordinary Differential Equations, 1927, chapter X, from
 * memory; here Prüfer's angle of wave-rotation.ts). So a band is one interval of q or none, and counting quarter turns
 * leaves no edge out.
 */
import { bracketedZero } from "../regions/bracketed-zero.ts";
import { meanLevel, type RectangularWave } from "./rectangular-wave.ts";
import { C, C_SLOPE, S, S_SLOPE, waveHalfPeriod, waveHalfPeriodArray } from "./wave-half-period.ts";
import { quarterTurns } from "./wave-rotation.ts";

/** Largest q at which edges are sought. */
export const WAVE_EDGE_Q_MAX = 12;

const EDGE_TOLERANCE = 4e-16;

/** One plane of a scan line: x has sign 1; y has sign −1 and sees every level reversed. */
export interface WavePlane {
  readonly wave: RectangularWave;
  readonly ratio: number;
  readonly sign: 1 | -1;
}

/** An edge at q; `none` where there is none up to WAVE_EDGE_Q_MAX; `origin` where the lowest band begins at q = 0. */
export type PlaneEdge =
  | { readonly kind: "edge"; readonly q: number; readonly steps: number }
  | { readonly kind: "none" | "origin" | "not-converged"; readonly steps: number };

const half = waveHalfPeriodArray();
/** Half periods evaluated since the module was loaded; differences of it are what an edge has cost. */
let evaluations = 0;

function halfPeriodAt({ wave, ratio, sign }: WavePlane, q: number): Float64Array {
  evaluations += 1;
  waveHalfPeriod(2 * sign * ratio * q, sign * q, wave, half);
  return half;
}

/** The periodic solution of order n that is even ("C") or odd ("S") about the middle of the upper level. */
interface PeriodicSolution {
  readonly solution: "C" | "S";
  readonly order: number;
}

/** Whether the edge of this periodic solution lies at or below q. */
function isPassed(plane: WavePlane, { solution, order }: PeriodicSolution, q: number): boolean {
  const turns = quarterTurns(solution, halfPeriodAt(plane, q));
  return turns >= (solution === "C" ? order : order - 1);
}

/** The value that vanishes at the edge; divided by q where it would also vanish in the origin. */
function residual(plane: WavePlane, { solution, order }: PeriodicSolution, q: number): number {
  const even = order % 2 === 0;
  const values = halfPeriodAt(plane, q);
  if (solution === "S") return values[even ? S : S_SLOPE]!;
  return even ? values[C_SLOPE]! / q : values[C]!;
}

function inOrigin({ wave, ratio, sign }: WavePlane, { solution, order }: PeriodicSolution): number {
  if (solution === "C" && order % 2 === 0) return -sign * Math.PI * (ratio + meanLevel(wave));
  return solution === "S" && order % 2 === 0 ? Math.PI / 2 : 1;
}

type EdgePlace =
  | { readonly kind: "edge"; readonly q: number }
  | { readonly kind: "none" | "origin" | "not-converged" };

/** The edge of one periodic solution between `low` (not passed) and `high` (passed). */
function edgeBetween(
  plane: WavePlane,
  periodic: PeriodicSolution,
  low: number,
  high: number,
  maxSteps: number,
): EdgePlace {
  let from = low;
  let to = high;
  const { solution, order } = periodic;
  const next: PeriodicSolution = { solution, order: order + 2 };
  const previous: PeriodicSolution = { solution, order: order - 2 };
  const hasPrevious = previous.order >= (solution === "C" ? 0 : 1);
  let halvings = 0;
  // Halve until both neighbours with the same boundary condition are left out, so that the residual changes sign once.
  while (isPassed(plane, next, to) || (hasPrevious && (from === 0 || !isPassed(plane, previous, from)))) {
    halvings += 1;
    if (halvings > maxSteps) return { kind: "not-converged" };
    const middle = from + (to - from) / 2;
    if (isPassed(plane, periodic, middle)) to = middle;
    else from = middle;
  }
  const valueAt = (q: number) => residual(plane, periodic, q);
  const atFrom = from === 0 ? inOrigin(plane, periodic) : valueAt(from);
  const stepsLeft = maxSteps - halvings;
  const found = bracketedZero(valueAt, from, atFrom, to, valueAt(to), EDGE_TOLERANCE, stepsLeft);
  return found.kind === "zero" ? { kind: "edge", q: found.at } : { kind: "not-converged" };
}

/**
 * Ends of the stretches of q that are looked at one after the other, so that a low edge never costs a look at a high q,
 * where a half period is dear.
 */
const STRETCH_ENDS = [0.75, 1.5, 3, 6, WAVE_EDGE_Q_MAX] as const;

/** The first stretch after `low` at whose end one of these solutions is passed, and that solution. */
function stretchWith(
  plane: WavePlane,
  periodics: readonly PeriodicSolution[],
  low: number,
): { readonly from: number; readonly to: number; readonly passed: PeriodicSolution } | null {
  let from = low;
  for (const to of STRETCH_ENDS) {
    if (to <= from) continue;
    for (const passed of periodics) if (isPassed(plane, passed, to)) return { from, to, passed };
    from = to;
  }
  return null;
}

function edgeAfter(plane: WavePlane, periodic: PeriodicSolution, low: number, maxSteps: number): EdgePlace {
  const stretch = stretchWith(plane, [periodic], low);
  if (stretch === null) return { kind: "none" };
  return edgeBetween(plane, periodic, stretch.from, stretch.to, maxSteps);
}

/** The gap below band n has two edges, one of each solution; which comes first depends on the wave. */
function gapEdge(plane: WavePlane, order: number, wanted: "first" | "last", maxSteps: number): EdgePlace {
  const even: PeriodicSolution = { solution: "C", order };
  const odd: PeriodicSolution = { solution: "S", order };
  const stretch = stretchWith(plane, [even, odd], 0);
  if (stretch === null) return { kind: "none" };
  const { from, to, passed } = stretch;
  const other = passed === even ? odd : even;
  const edge = edgeBetween(plane, passed, from, to, maxSteps);
  if (edge.kind !== "edge") return edge;
  const otherPassed = isPassed(plane, other, edge.q);
  if (wanted === "first") return otherPassed ? edgeBetween(plane, other, from, edge.q, maxSteps) : edge;
  return otherPassed ? edge : edgeAfter(plane, other, edge.q, maxSteps);
}

/**
 * Where a band begins, β = band; the lowest begins in the origin unless the mean of the field drives ions out.
 * `maxSteps` bounds the halvings and interpolations of one root, `steps` of the answer counts half periods evaluated.
 */
export function bandBegin(plane: WavePlane, band: number, maxSteps: number): PlaneEdge {
  const before = evaluations;
  const place = band > 0 ? gapEdge(plane, band, "last", maxSteps) : lowestBegin(plane, maxSteps);
  return { ...place, steps: evaluations - before };
}

function lowestBegin(plane: WavePlane, maxSteps: number): EdgePlace {
  if (plane.sign * (plane.ratio + meanLevel(plane.wave)) >= 0) return { kind: "origin" };
  const edge = edgeAfter(plane, { solution: "C", order: 0 }, 0, maxSteps);
  // A mean so small that its q underflows is none.
  return edge.kind === "edge" && edge.q === 0 ? { kind: "origin" } : edge;
}

/** Where a band ends, β = band + 1; as bandBegin. */
export function bandEnd(plane: WavePlane, band: number, maxSteps: number): PlaneEdge {
  const before = evaluations;
  const place = gapEdge(plane, band + 1, "first", maxSteps);
  return { ...place, steps: evaluations - before };
}
