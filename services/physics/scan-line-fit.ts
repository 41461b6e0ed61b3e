/*
 * The straight line U = slope · V − offset that stands in for the set points of a whole m/z range, and the width that it
 * really gives. At constant width the exact set points lie on a curve: with μ = apex ratio − U/V, the width is close to
 * m/z · μ/0.1264 and V to a multiple of m/z, so the offset is nearly constant for heavy ions and too large for light ones,
 * whose window is a large part of their m/z. At constant resolution U/V is constant and the line is exact.
 *
 * Volts in V (pole-to-ground, zero-to-peak), m/z in u per charge, field in m and Hz.
 */
import { edgeSensitivities } from "./drift.ts";
import { APEX_Q, APEX_RATIO, RESOLUTION_CONSTANT } from "./first-region.ts";
import { type ErrorAt, leastWorstStep } from "./least-worst-line.ts";
import { type Field, mzOf, mzTimesQPerVolt } from "./mathieu-parameters.ts";
import { passbandOf, scanLineEdges } from "./passband.ts";

/** An exact set point, with the width for which it was found. */
export interface LinePoint {
  readonly mz: number;
  readonly mzWidth: number;
  readonly dcVolts: number;
  readonly rfVolts: number;
}

export interface ScanLine {
  readonly slope: number;
  readonly offset: number;
}

/** What the line gives where an exact set point would give `mzWidth`. */
export interface LineWidth {
  readonly mz: number;
  /** Null where nothing passes, and where the line asks for no DC and the window has no upper end. */
  readonly width: number | null;
  readonly reason: null | "above-apex" | "no-dc";
  /** Width of the line less the wanted width; all of the wanted width is missing where nothing passes. */
  readonly error: number | null;
  readonly centreShift: number | null;
}

export function widthOnLine(line: ScanLine, point: LinePoint, field: Field): LineWidth | null {
  const { mz, mzWidth, rfVolts } = point;
  const dcVolts = line.slope * rfVolts - line.offset;
  if (dcVolts <= 0) return { mz, width: null, reason: "no-dc", error: null, centreShift: null };
  const found = passbandOf(dcVolts, rfVolts, field);
  if (found.kind === "empty") {
    return { mz, width: null, reason: "above-apex", error: -mzWidth, centreShift: null };
  }
  if (found.kind === "not-converged") return null;
  const { mzWidth: width, mzCentre } = found.passband;
  return { mz, width, reason: null, error: width! - mzWidth, centreShift: mzCentre! - mz };
}

/** The part of a range in which the line lies above the apex. */
export interface ClosedSpan {
  readonly mzFrom: number;
  readonly mzTo: number;
}

/**
 * Where between two m/z nothing passes because the line is above the apex: a line crosses the apex ratio at one V, or
 * never. The m/z of a span that is cut by the crossing is that of the apex at this V.
 */
export function closedSpanOf(line: ScanLine, mzFrom: number, mzTo: number, field: Field): ClosedSpan | null {
  const excess = line.slope - APEX_RATIO;
  // U/V exceeds the apex where excess · V > offset.
  if (excess === 0) return line.offset < 0 ? { mzFrom, mzTo } : null;
  const crossing = line.offset / excess;
  const mzCrossing = crossing > 0 ? mzOf(APEX_Q, crossing, field) : 0;
  const closed =
    excess > 0
      ? { mzFrom: Math.max(mzFrom, mzCrossing), mzTo }
      : { mzFrom, mzTo: Math.min(mzTo, mzCrossing) };
  return closed.mzFrom < closed.mzTo ? closed : null;
}

/** Least squares of U over the points; at least two of different V. */
export function leastSquaresLine(points: readonly LinePoint[]): ScanLine {
  const meanRf = points.reduce((sum, { rfVolts }) => sum + rfVolts, 0) / points.length;
  const meanDc = points.reduce((sum, { dcVolts }) => sum + dcVolts, 0) / points.length;
  let squares = 0;
  let products = 0;
  for (const { rfVolts, dcVolts } of points) {
    squares += (rfVolts - meanRf) * (rfVolts - meanRf);
    products += (rfVolts - meanRf) * (dcVolts - meanDc);
  }
  const slope = products / squares;
  return { slope, offset: slope * meanRf - meanDc };
}

/** U/V below which the width, which grows without bound towards RF-only, is continued by its tangent. */
const OPEN_RATIO = 0.005;

/** Width between the edges and its derivative by U/V, for a point of unit V and an m/z of one at q = 1. */
function widthAt(ratio: number): { readonly width: number; readonly byRatio: number } | null {
  const edges = scanLineEdges(ratio);
  const sensitivity = edgeSensitivities(ratio);
  if (edges.kind !== "window" || sensitivity === null) return null;
  const { qLow, qHigh, qWidth } = edges;
  return {
    width: qWidth / (qLow * qHigh),
    byRatio: (sensitivity.high.ratio / qLow - sensitivity.low.ratio / qHigh) / ratio,
  };
}

/** At the apex the window closes in proportion to its distance, with this derivative of width by U/V. */
const CLOSING: number = -1 / (RESOLUTION_CONSTANT * APEX_Q);

/**
 * Width error of the line at a point, with its derivative by U. It is continued beyond the apex and below OPEN_RATIO by
 * tangents, so that an iteration finds its way back from a line that passes nothing or everything.
 */
function continuedError(line: ScanLine, { mzWidth, rfVolts }: LinePoint, mzTimesQPerV: number): ErrorAt {
  const ratio = line.slope - line.offset / rfVolts;
  const at = Math.max(OPEN_RATIO, ratio);
  const found = at < APEX_RATIO ? widthAt(at) : null;
  const byRatio = found?.byRatio ?? CLOSING;
  const width = found === null ? CLOSING * (ratio - APEX_RATIO) : found.width + byRatio * (ratio - at);
  // Width in m/z = width · (m/z · q), and U/V changes by ΔU/V.
  return { rfVolts, error: width * mzTimesQPerV * rfVolts - mzWidth, gain: byRatio * mzTimesQPerV };
}

const MOST_ITERATIONS = 60;
const MOST_HALVINGS = 30;
/** What may still be gained by another step, relative to the narrowest wanted width. */
const SETTLED = 1e-9;

const largestOf = (errors: readonly ErrorAt[]) =>
  errors.reduce((worst, { error }) => Math.max(worst, Math.abs(error)), 0);

/**
 * The line whose largest width error over the points (in rising V) is least, starting from another line: the errors are
 * replaced by their tangents, the best line of the tangents is found exactly, and as much of the way there is gone as
 * makes the largest error smaller, until no more is to be gained. Null where that does not settle.
 */
export function leastWorstWidthLine(
  points: readonly LinePoint[],
  start: ScanLine,
  field: Field,
): ScanLine | null {
  const mzTimesQPerV = mzTimesQPerVolt(field);
  const errorsOn = (line: ScanLine) => points.map((point) => continuedError(line, point, mzTimesQPerV));
  const narrowest = points.reduce((least, { mzWidth }) => Math.min(least, mzWidth), Number.POSITIVE_INFINITY);
  let line = start;
  let errors = errorsOn(line);
  for (let i = 0; i < MOST_ITERATIONS; i++) {
    const worst = largestOf(errors);
    const step = leastWorstStep(errors);
    if (step === null) return null;
    if (worst - step.worst <= SETTLED * narrowest) return line;
    let share = 1;
    let next = line;
    for (let halvings = 0; halvings < MOST_HALVINGS; halvings++) {
      next = { slope: line.slope + share * step.slope, offset: line.offset + share * step.offset };
      errors = errorsOn(next);
      if (largestOf(errors) < worst) break;
      share /= 2;
    }
    if (largestOf(errors) >= worst) return null;
    line = next;
  }
  return null;
}
