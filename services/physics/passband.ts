import { DEFAULT_MAX_STEPS, type SolvedEdge, solveHighEdge, solveLowEdge } from "./edge-solver.ts";
import { productError } from "./exact-product.ts";
import { APEX_RATIO, APEX_RATIO_REST, RF_ONLY_LIMIT_Q } from "./first-region.ts";
import { type Field, mzTimesQPerVolt } from "./mathieu-parameters.ts";

/** Both edges of the first region on a scan line: qLow (β_y = 0) is the edge at high m/z, qHigh (β_x = 1) at low m/z. */
export interface WindowEdges {
  readonly kind: "window";
  readonly qLow: number;
  readonly qHigh: number;
  /** qHigh − qLow, with all its digits where the window is nearly closed. */
  readonly qWidth: number;
  readonly steps: number;
}

export type ScanLineEdges =
  | WindowEdges
  | { readonly kind: "high-pass"; readonly qHigh: number; readonly steps: number }
  | { readonly kind: "empty"; readonly reason: "above-apex" }
  | { readonly kind: "not-converged"; readonly steps: number };

function edgesAt(ratio: number, margin: number, maxSteps: number): ScanLineEdges {
  if (!(margin > 0)) return { kind: "empty", reason: "above-apex" };
  if (ratio === 0) return { kind: "high-pass", qHigh: RF_ONLY_LIMIT_Q, steps: 0 };
  const low = solveLowEdge(margin, ratio, maxSteps);
  const high: SolvedEdge | null = low && solveHighEdge(margin, maxSteps - low.steps);
  if (low === null || high === null) return { kind: "not-converged", steps: maxSteps };
  return {
    kind: "window",
    qLow: low.q,
    qHigh: high.q,
    qWidth: high.fromApex - low.fromApex,
    steps: low.steps + high.steps,
  };
}

/**
 * Where the scan line a = 2 (U/V) q crosses the first region. `ratio` is U/V of either sign: reversing the DC exchanges
 * the planes and changes no edge, so the caller names them. `steps` counts evaluations of a residual; at most
 * `maxSteps` are spent.
 */
export function scanLineEdges(ratio: number, maxSteps: number = DEFAULT_MAX_STEPS): ScanLineEdges {
  const magnitude = Math.abs(ratio);
  return edgesAt(magnitude, APEX_RATIO - magnitude + APEX_RATIO_REST, maxSteps);
}

/** A passband in m/z (u per charge) and in q; null where the window has no upper end. */
export interface Passband {
  readonly mzLow: number;
  readonly mzHigh: number | null;
  readonly mzCentre: number | null;
  readonly mzWidth: number | null;
  /** mzCentre/mzWidth between the edges. */
  readonly resolution: number | null;
  readonly qLow: number | null;
  readonly qHigh: number;
}

export type PassbandAnswer =
  | { readonly kind: "window" | "high-pass"; readonly passband: Passband; readonly steps: number }
  | { readonly kind: "empty"; readonly reason: "above-apex" | "no-rf" }
  | { readonly kind: "not-converged"; readonly steps: number };

/** The distance of U/V below the apex, right to the last digit although the quotient itself is rounded. */
function marginBelowApex(dcMagnitude: number, rfMagnitude: number, ratio: number): number {
  const product = ratio * rfMagnitude;
  const remainder = dcMagnitude - product - productError(ratio, rfMagnitude, product);
  return APEX_RATIO - ratio + (APEX_RATIO_REST - remainder / rfMagnitude);
}

/** `edges` in m/z, where `mzTimesQ` is the product m/z · q of the drive. */
export function windowInMz(edges: WindowEdges, mzTimesQ: number): Passband {
  const { qLow, qHigh, qWidth } = edges;
  const perProduct = mzTimesQ / (qLow * qHigh);
  return {
    mzLow: mzTimesQ / qHigh,
    mzHigh: mzTimesQ / qLow,
    mzCentre: (perProduct * (qLow + qHigh)) / 2,
    mzWidth: perProduct * qWidth,
    resolution: (qLow + qHigh) / (2 * qWidth),
    qLow,
    qHigh,
  };
}

/**
 * The passband of a drive in the first region. Volts in V (pole-to-ground, zero-to-peak) of either sign, field in m and
 * Hz. The low m/z edge is β_x = 1, x being the rods whose DC has the sign of the ion. Method: see
 * apex-edges.ts; the width keeps its relative accuracy up to R = 1e5 and beyond.
 */
export function passbandOf(
  dcVolts: number,
  rfVolts: number,
  field: Field,
  maxSteps: number = DEFAULT_MAX_STEPS,
): PassbandAnswer {
  const rfMagnitude = Math.abs(rfVolts);
  if (rfMagnitude === 0) return { kind: "empty", reason: "no-rf" };
  const dcMagnitude = Math.abs(dcVolts);
  const ratio = dcMagnitude / rfMagnitude;
  const edges = edgesAt(ratio, marginBelowApex(dcMagnitude, rfMagnitude, ratio), maxSteps);
  const mzTimesQ = mzTimesQPerVolt(field) * rfMagnitude;
  switch (edges.kind) {
    case "window":
      return { kind: "window", passband: windowInMz(edges, mzTimesQ), steps: edges.steps };
    case "high-pass": {
      const open = { mzHigh: null, mzCentre: null, mzWidth: null, resolution: null, qLow: null };
      return {
        kind: "high-pass",
        passband: { mzLow: mzTimesQ / edges.qHigh, ...open, qHigh: edges.qHigh },
        steps: edges.steps,
      };
    }
    default:
      return edges;
  }
}
