/*
 * What independent tolerances do to a window, and what they may be for a wanted limit. First order in every cause; the
 * derivatives are those of drift.ts. Plain numbers: tolerances and changes are relative (1e-6 is one ppm), shifts are in
 * m/z (u per charge).
 */
import type { WindowSensitivity } from "./drift.ts";

export const DRIFT_CAUSES = ["fieldRadius", "frequency", "amplitude", "ratio"] as const;
export type DriftCause = (typeof DRIFT_CAUSES)[number];

export const SHIFTED = ["low", "high", "centre", "width"] as const;
/** What a change moves: both edges, the centre half-way between them, and their distance. */
export type Shifted = (typeof SHIFTED)[number];
export type Shifts = Readonly<Record<Shifted, number>>;

/** A window in m/z with the sensitivity of its edges. */
export interface SensitiveWindow {
  readonly mzCentre: number;
  readonly mzWidth: number;
  readonly sensitivity: WindowSensitivity;
}

/** Shift in m/z per relative change of one cause. */
export function derivativesOf(
  { mzCentre, mzWidth, sensitivity }: SensitiveWindow,
  cause: DriftCause,
): Shifts {
  const low = sensitivity.low[cause];
  const high = sensitivity.high[cause];
  // Differences of the products with both edges, arranged so that equal exponents leave the width's own digits.
  return {
    low: (mzCentre - mzWidth / 2) * low,
    high: (mzCentre + mzWidth / 2) * high,
    centre: (mzCentre * (high + low)) / 2 + (mzWidth * (high - low)) / 4,
    width: mzCentre * (high - low) + (mzWidth * (high + low)) / 2,
  };
}

/** Shifts of one cause at the positive end of its tolerance; the negative end gives the opposite. */
export interface CauseShift {
  readonly cause: DriftCause;
  readonly tolerance: number;
  readonly shifts: Shifts;
}

export interface DriftBudget {
  readonly causes: readonly CauseShift[];
  /** Every cause at the end of its tolerance that adds to the others. */
  readonly worstCase: Shifts;
  /** Independent causes, none of which is at its end together with another. */
  readonly rootSumSquare: Shifts;
}

function combined(causes: readonly CauseShift[], join: (shifts: readonly number[]) => number): Shifts {
  const of = (what: Shifted) => join(causes.map(({ shifts }) => shifts[what]));
  return { low: of("low"), high: of("high"), centre: of("centre"), width: of("width") };
}

const sumOfMagnitudes = (shifts: readonly number[]) =>
  shifts.reduce((sum, shift) => sum + Math.abs(shift), 0);
const rootOfSquares = (shifts: readonly number[]) =>
  Math.sqrt(shifts.reduce((sum, shift) => sum + shift * shift, 0));

/** Tolerances (relative, plus or minus) to shifts. */
export function driftBudgetOf(
  window: SensitiveWindow,
  tolerances: Readonly<Record<DriftCause, number>>,
): DriftBudget {
  const causes = DRIFT_CAUSES.map((cause): CauseShift => {
    const tolerance = tolerances[cause];
    const { low, high, centre, width } = derivativesOf(window, cause);
    // Adding zero takes the sign off a zero.
    const shiftBy = (derivative: number) => derivative * tolerance + 0;
    return {
      cause,
      tolerance,
      shifts: { low: shiftBy(low), high: shiftBy(high), centre: shiftBy(centre), width: shiftBy(width) },
    };
  });
  return {
    causes,
    worstCase: combined(causes, sumOfMagnitudes),
    rootSumSquare: combined(causes, rootOfSquares),
  };
}

/** The largest permitted magnitude of each shift in m/z; an edge limit holds for both edges. */
export interface DriftLimits {
  readonly centreShift?: number | undefined;
  readonly edgeShift?: number | undefined;
  readonly widthChange?: number | undefined;
}
export type DriftLimit = keyof DriftLimits;

export interface AllowedTolerance {
  readonly cause: DriftCause;
  /** The tolerance if nothing else drifts; null where no limit binds it. */
  readonly alone: number | null;
  /** The tolerance if all four causes contribute equally and add up in the worst case. */
  readonly sharedWorstCase: number | null;
  /** The tolerance if all four contribute equally and add up as independent causes do. */
  readonly sharedRootSumSquare: number | null;
  /** The limit that binds. */
  readonly boundBy: DriftLimit | null;
}

/** Limits to the tolerance that each cause may have; limits above zero. */
export function allowedTolerances(window: SensitiveWindow, limits: DriftLimits): AllowedTolerance[] {
  return DRIFT_CAUSES.map((cause) => {
    const { low, high, centre, width } = derivativesOf(window, cause);
    const reached: readonly (readonly [DriftLimit, number])[] = [
      ["centreShift", Math.abs(centre)],
      ["edgeShift", Math.max(Math.abs(low), Math.abs(high))],
      ["widthChange", Math.abs(width)],
    ];
    let alone = Number.POSITIVE_INFINITY;
    let boundBy: DriftLimit | null = null;
    for (const [limit, derivative] of reached) {
      const most = limits[limit];
      if (most === undefined || derivative === 0 || most / derivative >= alone) continue;
      alone = most / derivative;
      boundBy = limit;
    }
    if (boundBy === null) {
      return { cause, alone: null, sharedWorstCase: null, sharedRootSumSquare: null, boundBy };
    }
    return {
      cause,
      alone,
      sharedWorstCase: alone / DRIFT_CAUSES.length,
      sharedRootSumSquare: alone / Math.sqrt(DRIFT_CAUSES.length),
      boundBy,
    };
  });
}
