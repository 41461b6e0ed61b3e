/*
 * The three widths of a peak converted into each other. A width between the stability edges fixes the drive (set-point.ts) and
 * with it the peak; the other way round, the edges that give a wanted width at half or at a tenth of the height are solved for.
 */
import type { Field } from "../mathieu-parameters.ts";
import { type SetPoint, setPointOf } from "../set-point.ts";
import { type Peak, type PeakAnswer, type PeakQuery, peakProfileOf } from "./peak-profile.ts";

export type PeakHeight = "half-height" | "tenth-height";

/** A centre between the edges in m/z, and what else a peak depends on. */
export interface WidthQuery extends Pick<PeakQuery, "residence" | "beam" | "accuracy"> {
  readonly mzCentre: number;
  readonly field: Field;
  readonly at: PeakHeight;
}

interface Solved {
  /** Width of the window between the stability edges in m/z. */
  readonly edgeWidth: number;
  /** Width at the height in question in m/z. */
  readonly width: number;
  readonly setPoint: SetPoint;
  readonly peak: Peak;
  readonly evaluations: number;
  readonly steps: number;
}

type NoPeak = Exclude<PeakAnswer, Peak>;

export type WidthAnswer =
  | ({ readonly kind: "width" } & Solved)
  | NoPeak
  | { readonly kind: "none"; readonly reason: "flank-does-not-fall" | "resolution-not-reachable" };

export type EdgesAnswer =
  | ({ readonly kind: "edges" } & Solved)
  | NoPeak
  | { readonly kind: "none"; readonly reason: "flank-does-not-fall" | "resolution-not-reachable" }
  /** Even nearly closed edges leave the peak wider: the residence is too short. `narrowest` in m/z. */
  | { readonly kind: "none"; readonly reason: "residence-too-short"; readonly narrowest: number };

/** Width at the height in question of the peak whose edges are `edgeWidth` apart. */
export function widthAtHeight(query: WidthQuery & { readonly edgeWidth: number }): WidthAnswer {
  const { mzCentre, edgeWidth, field } = query;
  const setPoint = setPointOf(mzCentre, edgeWidth, field);
  if (setPoint.kind === "not-reachable") return { kind: "none", reason: setPoint.reason };
  if (setPoint.kind === "not-converged") return setPoint;
  const { dcVolts, rfVolts } = setPoint;
  const { residence, beam, accuracy } = query;
  const peak = peakProfileOf({ dcVolts, rfVolts, field, residence, beam, accuracy });
  if (peak.kind !== "peak") return peak;
  const flanks = query.at === "half-height" ? peak.halfHeight : peak.tenthHeight;
  if (flanks === null) return { kind: "none", reason: "flank-does-not-fall" };
  const { evaluations, steps } = peak;
  return { kind: "width", edgeWidth, width: flanks.width, setPoint, peak, evaluations, steps };
}

/** Edges over width of a peak that residence hardly rounds: only where the search begins. */
const FIRST_GUESS = { "half-height": 1.15, "tenth-height": 0.9 } as const;
/** Edges this near to closed, as a share of the wanted width, stand for a closed window. */
const NEARLY_CLOSED = 0.05;
const MOST_PEAKS = 24;

/**
 * The window around `mzCentre` whose peak has the wanted `width` (m/z) at the height in question: secant steps on the edge width
 * inside a bracket, until the width agrees within `accuracy` of itself.
 */
export function edgesForHeight(query: WidthQuery & { readonly width: number }): EdgesAnswer {
  const { width, accuracy } = query;
  let evaluations = 0;
  let steps = 0;
  let low = { edge: 0, excess: Number.NaN };
  let high = { edge: Number.POSITIVE_INFINITY, excess: Number.NaN };
  let edge = FIRST_GUESS[query.at] * width;
  let previous: { edge: number; excess: number } | null = null;
  for (let peaks = 0; peaks < MOST_PEAKS; peaks++) {
    const answer = widthAtHeight({ ...query, edgeWidth: edge });
    if (answer.kind !== "width") {
      return answer.kind === "not-converged" ? { ...answer, steps: steps + answer.steps } : answer;
    }
    evaluations += answer.evaluations;
    steps += answer.steps;
    const now = { edge, excess: answer.width - width };
    if (Math.abs(now.excess) <= accuracy * width) return { ...answer, kind: "edges", evaluations, steps };
    if (now.excess > 0) {
      if (edge <= NEARLY_CLOSED * width) {
        return { kind: "none", reason: "residence-too-short", narrowest: answer.width };
      }
      high = now;
    } else {
      low = now;
    }
    const slope = previous === null ? 1 : (now.excess - previous.excess) / (now.edge - previous.edge);
    const secant = slope > 0 ? edge - now.excess / slope : Number.NaN;
    previous = now;
    const least = Math.max(low.edge, NEARLY_CLOSED * width);
    if (secant > low.edge && secant < high.edge && (peaks & 3) !== 3) edge = Math.max(secant, least);
    else if (high.edge === Number.POSITIVE_INFINITY) edge = 2 * low.edge;
    else edge = low.edge === 0 ? Math.max(high.edge / 4, least) : 0.5 * (low.edge + high.edge);
  }
  return { kind: "not-converged", steps };
}
