import type { z } from "zod";
import { driveToCanonical } from "../../contract/drive.ts";
import { fieldOf, sinusoidalQuadrupole } from "../../contract/rod-set.ts";
import type { ErrorItem } from "../../contract/rule.ts";
import { ppmFromRatio, ratioFromPpm } from "../../contract/si.ts";
import { widthInMz } from "../../contract/width.ts";
import { edgeSensitivities, sensitivitiesForResolution } from "../../physics/drift.ts";
import {
  allowedTolerances,
  DRIFT_CAUSES,
  type DriftCause,
  derivativesOf,
  driftBudgetOf,
  type SensitiveWindow,
  type Shifts,
} from "../../physics/drift-budget.ts";
import { APEX_RATIO, apexMarginOf } from "../../physics/first-region.ts";
import { passbandOf, scanLineEdges, windowInMz } from "../../physics/passband.ts";
import { ratioForResolution } from "../../physics/set-point.ts";
import { retuneInterval } from "../../review/calibration/retune-interval.ts";
import { defineEndpoint } from "../endpoint.ts";
import { DRIFT_EXAMPLES } from "../examples/drift-budget.ts";
import {
  DriftBudgetAnswer,
  type DriftBudgetOfDrive,
  type DriftBudgetOfWidth,
  DriftBudgetRequest,
} from "../shapes/drift-budget.ts";

type Request = z.output<typeof DriftBudgetRequest>;
type Answer = z.input<typeof DriftBudgetAnswer>;

export const driftBudget = defineEndpoint({
  operationId: "driftBudget",
  method: "post",
  path: "/v1/drift-budget",
  tag: "Mass filter",
  summary: "What tolerances do to a window, what they may be, and when to tune again",
  description:
    "First-order shifts of edges, centre and width by exact derivatives: m/z goes as the amplitude and as 1/(f r0)², and U/V moves the edges against each other. Causes are independent; the worst case adds them, the root-sum-square does not. Backwards, the tolerance each cause may have for a wanted limit. From successive tune records, how long the offset stays within a limit.",
  request: DriftBudgetRequest,
  rules: [
    (request) => ("rodSet" in request ? sinusoidalQuadrupole(request.rodSet, "/rodSet") : []),
    oneLimitAtLeast,
  ],
  work: null,
  answer: DriftBudgetAnswer,
  examples: DRIFT_EXAMPLES,
  handler(request, { maxSteps }) {
    const { tune } = request;
    const retune = tune ? retuneInterval(tune.records, tune.limit, tune.confidence) : null;
    const known = "rodSet" in request ? windowOfDrive(request, maxSteps) : windowOfWidth(request, maxSteps);
    if (typeof known === "string") {
      return { window: null, reason: known, sensitivities: [], budget: null, allowed: null, retune };
    }
    return { ...budgetOf(known, request), retune };
  },
});

function oneLimitAtLeast({ limits }: Request): ErrorItem[] {
  if (limits === undefined || Object.keys(limits).length > 0) return [];
  return [
    {
      pointer: "/limits",
      code: "missing-member",
      detail: "limits is empty; it takes at least one of centreShift, edgeShift and widthChange.",
    },
  ];
}

/** A window, the scan line on which it lies, and its product m/z · q. */
interface KnownWindow extends SensitiveWindow {
  readonly mzLow: number;
  readonly mzHigh: number;
  readonly ratio: number;
  readonly margin: number;
  readonly mzTimesQ: number;
}

function windowOfDrive(
  { rodSet, drive }: z.output<typeof DriftBudgetOfDrive>,
  maxSteps: number,
): KnownWindow | NonNullable<Answer["reason"]> {
  const { dcVolts, rfVolts } = driveToCanonical(drive);
  const found = passbandOf(dcVolts, rfVolts, fieldOf(rodSet), maxSteps);
  if (found.kind === "empty") return found.reason;
  if (found.kind === "high-pass") return "no-dc";
  if (found.kind === "not-converged") return "not-converged";
  const ratio = dcVolts / rfVolts;
  const sensitivity = edgeSensitivities(ratio);
  if (sensitivity === null) return "not-converged";
  const { mzLow, mzHigh, mzCentre, mzWidth, qHigh } = found.passband;
  return {
    mzLow,
    mzHigh: mzHigh!,
    mzCentre: mzCentre!,
    mzWidth: mzWidth!,
    ratio,
    margin: apexMarginOf(ratio),
    mzTimesQ: mzLow * qHigh,
    sensitivity,
  };
}

function windowOfWidth(
  { mzCentre, width }: z.output<typeof DriftBudgetOfWidth>,
  maxSteps: number,
): KnownWindow | NonNullable<Answer["reason"]> {
  if (width.at !== "edges") return "width-height-needs-peak-profile";
  const mzWidth = widthInMz(width, mzCentre);
  const solved = ratioForResolution(mzCentre / mzWidth, maxSteps);
  if (solved.kind === "not-reachable") return solved.reason;
  const sensitivity = sensitivitiesForResolution(mzCentre / mzWidth);
  if (solved.kind === "not-converged" || sensitivity === null) return "not-converged";
  const mzLow = mzCentre - mzWidth / 2;
  const { ratio, margin, qHigh } = solved;
  return {
    mzLow,
    mzHigh: mzCentre + mzWidth / 2,
    mzCentre,
    mzWidth,
    ratio,
    margin,
    mzTimesQ: mzLow * qHigh,
    sensitivity,
  };
}

const NAMES = {
  fieldRadius: "field-radius",
  frequency: "frequency",
  amplitude: "amplitude",
  ratio: "ratio",
} as const satisfies Record<DriftCause, string>;

function budgetOf(known: KnownWindow, { tolerances, limits }: Request): Omit<Answer, "retune"> {
  const { mzLow, mzHigh, mzCentre, mzWidth, margin } = known;
  return {
    window: {
      mzLow,
      mzHigh,
      mzCentre,
      mzWidth,
      resolution: mzCentre / mzWidth,
      apexMargin_ppm: ppmFromRatio(margin),
    },
    reason: null,
    sensitivities: DRIFT_CAUSES.map((cause) => ({
      cause: NAMES[cause],
      ...perPpm(derivativesOf(known, cause)),
    })),
    budget: tolerances === undefined ? null : toleranceBudget(known, tolerances),
    allowed:
      limits === undefined
        ? null
        : allowedTolerances(known, limits).map(
            ({ cause, alone, sharedWorstCase, sharedRootSumSquare, boundBy }) => ({
              cause: NAMES[cause],
              alone_ppm: inPpm(alone),
              sharedWorstCase_ppm: inPpm(sharedWorstCase),
              sharedRootSumSquare_ppm: inPpm(sharedRootSumSquare),
              boundBy,
            }),
          ),
  };
}

function toleranceBudget(
  known: KnownWindow,
  stated: NonNullable<Request["tolerances"]>,
): NonNullable<Answer["budget"]> {
  const { fieldRadius_ppm = 0, frequency_ppm = 0, amplitude_ppm = 0, ratio_ppm = 0 } = stated;
  const { causes, worstCase, rootSumSquare } = driftBudgetOf(known, {
    fieldRadius: ratioFromPpm(fieldRadius_ppm),
    frequency: ratioFromPpm(frequency_ppm),
    amplitude: ratioFromPpm(amplitude_ppm),
    ratio: ratioFromPpm(ratio_ppm),
  });
  return {
    causes: causes.map(({ cause, tolerance, shifts }) => ({
      cause: NAMES[cause],
      tolerance_ppm: ppmFromRatio(tolerance),
      ...shifts,
    })),
    worstCase,
    rootSumSquare,
    widthAtRatioEnds: {
      raised: widthWithRatio(known, ratioFromPpm(ratio_ppm)),
      lowered: widthWithRatio(known, ratioFromPpm(-ratio_ppm)),
    },
  };
}

function widthWithRatio({ ratio, mzTimesQ, mzWidth }: KnownWindow, change: number): number | null {
  if (change === 0) return mzWidth;
  const moved = ratio * (1 + change);
  if (moved >= APEX_RATIO) return null;
  const edges = scanLineEdges(moved);
  return edges.kind === "window" ? windowInMz(edges, mzTimesQ).mzWidth : null;
}

function perPpm({ low, high, centre, width }: Shifts): Shifts {
  return {
    low: ratioFromPpm(low),
    high: ratioFromPpm(high),
    centre: ratioFromPpm(centre),
    width: ratioFromPpm(width),
  };
}

function inPpm(relative: number | null): number | null {
  return relative === null ? null : ppmFromRatio(relative);
}
