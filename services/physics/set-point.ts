/*
 * The inverse problem: which U and V pass a window of given centre and width. R = centre/width fixes the quotient of the
 * edges, q_high/q_low = (2R + 1)/(2R − 1), so two equations (one for each edge) determine q_low and U/V together and
 * Newton's method in two unknowns solves both at once. Nothing of the 0.126 rule is used.
 */
import { apexEdgeResidual, HIGH_Q_EDGE, LOW_Q_EDGE } from "./apex-edges.ts";
import { DEFAULT_MAX_STEPS } from "./edge-solver.ts";
import { APEX_Q, APEX_Q_REST, APEX_RATIO, APEX_RATIO_REST } from "./first-region.ts";
import { type Field, mzTimesQPerVolt } from "./mathieu-parameters.ts";
import { nearOriginEdgeResidual } from "./near-origin-edge.ts";
import type { WindowEdges } from "./passband.ts";
import { polynomial } from "./polynomial.ts";

/** The resolution of U/V = 0; no window of the first region is wider. */
export const RESOLUTION_INFIMUM = 0.5;

/** Above this the double U/V itself no longer holds the width to 1e-6; instruments end far below. */
export const RESOLUTION_MAXIMUM = 1e8;

/** Below this resolution the low-q edge is measured from the origin. */
const NEAR_ORIGIN_RESOLUTION = 2;

/** Starting values by s = 1/(2R), fitted to 30-digit solutions to about 1e-9. */
const MARGIN_START = [
  0.2528036073, -0.1341217207, 0.07952655557, -0.05011147098, 0.03320804123, -0.02275068171, 0.01460269826,
  -0.006155182394,
];
const LOW_Q_START = [
  -1.172428445, 0.8834132075, -0.8168776171, 0.7916003227, -0.7754299536, 0.738966888, -0.6041882587,
  0.2950817186,
];
const OPEN_HIGH_Q_START = [
  0.7059989485, 0.2395204439, -0.04917874205, 0.01612437236, -0.00591202939, 0.001776073393, -0.0002827348138,
];
const OPEN_RATIO_START = [
  0.1678348766, -0.08482740472, 0.04832807219, -0.02746447993, 0.01352496641, -0.00468809216, 0.0007978590305,
];

const LAST_STEP = 1e-8;

/** U/V for a resolution, with its distance below the apex (relative to the apex) in full precision. */
export interface RatioForResolution {
  readonly kind: "ratio";
  readonly ratio: number;
  readonly margin: number;
  readonly qLow: number;
  readonly qHigh: number;
  readonly qWidth: number;
  readonly steps: number;
}

export type NotReachable = {
  readonly kind: "not-reachable";
  readonly reason: "resolution-not-reachable";
  readonly minimum: number;
  readonly maximum: number;
};

export type NotConverged = { readonly kind: "not-converged"; readonly steps: number };

const lowEdge = new Float64Array(3);
const highEdge = new Float64Array(3);

function fromApex(resolution: number, maxSteps: number): RatioForResolution | NotConverged {
  const half = 1 / (2 * resolution);
  const spread = (2 * half) / (1 - half);
  let margin = half * polynomial(MARGIN_START, half);
  let low = half * polynomial(LOW_Q_START, half);
  for (let steps = 2; steps <= maxSteps; steps += 2) {
    const width = spread * (APEX_Q + low);
    apexEdgeResidual(LOW_Q_EDGE, low, margin, lowEdge);
    apexEdgeResidual(HIGH_Q_EDGE, low + width, margin, highEdge);
    const highByLow = highEdge[1]! * (1 + spread);
    const determinant = lowEdge[1]! * highEdge[2]! - lowEdge[2]! * highByLow;
    const lowStep = (lowEdge[0]! * highEdge[2]! - lowEdge[2]! * highEdge[0]!) / determinant;
    const marginStep = (lowEdge[1]! * highEdge[0]! - highByLow * lowEdge[0]!) / determinant;
    low -= lowStep;
    margin -= marginStep;
    if (!(margin > 0 && margin < APEX_RATIO && low < 0 && low > -APEX_Q)) break;
    if (Math.abs(lowStep) <= LAST_STEP * -low && Math.abs(marginStep) <= LAST_STEP * margin) {
      const qLow = APEX_Q + (low + APEX_Q_REST);
      const qWidth = spread * qLow;
      return {
        kind: "ratio",
        ratio: APEX_RATIO - (margin - APEX_RATIO_REST),
        margin: margin / APEX_RATIO,
        qLow,
        qHigh: APEX_Q + (low + qWidth + APEX_Q_REST),
        qWidth,
        steps,
      };
    }
  }
  return { kind: "not-converged", steps: maxSteps };
}

function fromOrigin(resolution: number, maxSteps: number): RatioForResolution | NotConverged {
  const half = 1 / (2 * resolution);
  const quotient = (2 * resolution - 1) / (2 * resolution + 1);
  let qHigh = polynomial(OPEN_HIGH_Q_START, half);
  let ratio = ((2 * resolution - 1) / (2 * resolution)) * polynomial(OPEN_RATIO_START, half);
  for (let steps = 2; steps <= maxSteps; steps += 2) {
    nearOriginEdgeResidual(quotient * qHigh, ratio, lowEdge);
    apexEdgeResidual(HIGH_Q_EDGE, qHigh - APEX_Q, APEX_RATIO - ratio, highEdge);
    const lowByHigh = lowEdge[1]! * quotient;
    const highByRatio = -highEdge[2]!;
    const determinant = lowByHigh * highByRatio - lowEdge[2]! * highEdge[1]!;
    const highStep = (lowEdge[0]! * highByRatio - lowEdge[2]! * highEdge[0]!) / determinant;
    const ratioStep = (lowByHigh * highEdge[0]! - highEdge[1]! * lowEdge[0]!) / determinant;
    qHigh -= highStep;
    ratio -= ratioStep;
    if (!(ratio > 0 && ratio < APEX_RATIO && qHigh > APEX_Q && qHigh < 1)) break;
    if (Math.abs(highStep) <= LAST_STEP * qHigh && Math.abs(ratioStep) <= LAST_STEP * ratio) {
      const qLow = quotient * qHigh;
      const margin = (APEX_RATIO - ratio) / APEX_RATIO;
      return { kind: "ratio", ratio, margin, qLow, qHigh, qWidth: qHigh - qLow, steps };
    }
  }
  return { kind: "not-converged", steps: maxSteps };
}

/**
 * U/V whose first-region window has `resolution` = centre/width between the edges, centre half-way in m/z. Every
 * resolution above RESOLUTION_INFIMUM, up to RESOLUTION_MAXIMUM, has exactly one. `steps` counts evaluations of a
 * residual.
 */
export function ratioForResolution(
  resolution: number,
  maxSteps: number = DEFAULT_MAX_STEPS,
): RatioForResolution | NotReachable | NotConverged {
  if (!(resolution > RESOLUTION_INFIMUM && resolution <= RESOLUTION_MAXIMUM)) {
    return {
      kind: "not-reachable",
      reason: "resolution-not-reachable",
      minimum: RESOLUTION_INFIMUM,
      maximum: RESOLUTION_MAXIMUM,
    };
  }
  return resolution < NEAR_ORIGIN_RESOLUTION
    ? fromOrigin(resolution, maxSteps)
    : fromApex(resolution, maxSteps);
}

/** A drive and the window it passes; a and q are those of the ion at the centre. */
export interface SetPoint {
  readonly kind: "set-point";
  readonly dcVolts: number;
  readonly rfVolts: number;
  readonly a: number;
  readonly q: number;
  readonly ratio: number;
  /** Distance of U/V below the apex, relative to the apex. */
  readonly margin: number;
  readonly edges: WindowEdges;
  readonly steps: number;
}

/**
 * The drive whose first-region window is centred on `mzCentre` and `mzWidth` wide between the edges (both u per charge,
 * above zero); field in m and Hz, volts in V (pole-to-ground, zero-to-peak).
 */
export function setPointOf(
  mzCentre: number,
  mzWidth: number,
  field: Field,
  maxSteps: number = DEFAULT_MAX_STEPS,
): SetPoint | NotReachable | NotConverged {
  const solved = ratioForResolution(mzCentre / mzWidth, maxSteps);
  if (solved.kind !== "ratio") return solved;
  const { ratio, margin, qLow, qHigh, qWidth, steps } = solved;
  const q = (2 * qLow * qHigh) / (qLow + qHigh);
  const rfVolts = (mzCentre * q) / mzTimesQPerVolt(field);
  return {
    kind: "set-point",
    dcVolts: ratio * rfVolts,
    rfVolts,
    a: 2 * ratio * q,
    q,
    ratio,
    margin,
    edges: { kind: "window", qLow, qHigh, qWidth, steps },
    steps,
  };
}
