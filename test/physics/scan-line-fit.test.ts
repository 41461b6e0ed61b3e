import { describe, expect, it, test } from "vitest";
import { APEX_RATIO } from "../../services/physics/first-region.ts";
import { leastWorstStep } from "../../services/physics/least-worst-line.ts";
import {
  closedSpanOf,
  type LinePoint,
  leastSquaresLine,
  leastWorstWidthLine,
  type ScanLine,
  widthOnLine,
} from "../../services/physics/scan-line-fit.ts";
import { fastestScanRate, shiftForLoss } from "../../services/physics/scan-rate.ts";
import { setPointOf } from "../../services/physics/set-point.ts";
import { relativeError } from "../measured-bound.ts";
import { SCAN_AND_DRIFT } from "../reference/scan-and-drift.ts";

const FIELD = { fieldRadius: 0.004, frequency: 1.2e6 };

function points(mzFrom: number, mzTo: number, widthAt: (mz: number) => number, count = 129): LinePoint[] {
  return Array.from({ length: count }, (_, k) => {
    const mz = mzFrom * Math.exp((Math.log(mzTo / mzFrom) * k) / (count - 1));
    const mzWidth = widthAt(mz);
    const found = setPointOf(mz, mzWidth, FIELD);
    if (found.kind !== "set-point") throw new Error(found.kind);
    return { mz, mzWidth, dcVolts: found.dcVolts, rfVolts: found.rfVolts };
  });
}

const errorsOf = (line: ScanLine, judged: readonly LinePoint[]) =>
  judged.map((point) => widthOnLine(line, point, FIELD)!.error!);
const largest = (errors: readonly number[]) => Math.max(...errors.map(Math.abs));

describe.each(SCAN_AND_DRIFT.lines)(
  "m/z $mzFrom to $mzTo at width $width (test/reference, scan-and-drift)",
  ({ mzFrom, mzTo, width, leastSquares, leastWorst }) => {
    const judged = points(mzFrom, mzTo, () => width);
    const squares = leastSquaresLine(judged);
    const worst = leastWorstWidthLine(judged, squares, FIELD)!;

    it("has the least-squares line, and the worst width where the lightest ion is", () => {
      // Reference volts are doubles from another library: 1e-12 on a slope that U rounds to 1e-15, 1e-9 on the offset.
      expect(relativeError(squares.slope, leastSquares.slope)).toBeLessThan(1e-13);
      expect(relativeError(squares.offset, leastSquares.offset)).toBeLessThan(1e-11);
      const errors = errorsOf(squares, judged);
      expect(relativeError(largest(errors), Math.abs(leastSquares.worstError))).toBeLessThan(1e-9);
      expect(errors.findIndex((error) => Math.abs(error) === largest(errors))).toBe(0);
    });

    it("has the line of the least worst width, better than least squares", () => {
      expect(relativeError(worst.slope, leastWorst.slope)).toBeLessThan(1e-12);
      expect(relativeError(worst.offset, leastWorst.offset)).toBeLessThan(1e-9);
      const errors = errorsOf(worst, judged);
      expect(relativeError(largest(errors), leastWorst.worstError)).toBeLessThan(1e-8);
      expect(largest(errors)).toBeLessThan(largest(errorsOf(squares, judged)));
    });

    it("cannot be bettered by a line beside it", () => {
      const least = largest(errorsOf(worst, judged));
      for (const [slope, offset] of [
        [1e-7, 0],
        [-1e-7, 0],
        [0, 1e-5],
        [0, -1e-5],
        [1e-7, 1e-5],
        [-1e-7, -1e-5],
      ] as const) {
        const beside = { slope: worst.slope + slope, offset: worst.offset + offset };
        expect(largest(errorsOf(beside, judged))).toBeGreaterThan(least);
      }
    });
  },
);

test("at constant resolution the line is exact and has no offset", () => {
  const judged = points(10, 1000, (mz) => mz / 500);
  const line = leastSquaresLine(judged);
  expect(Math.abs(line.offset)).toBeLessThan(1e-12);
  expect(largest(errorsOf(line, judged))).toBeLessThan(1e-10);
});

test("a residual-gas range from m/z 1 at width 1 has a line, though least squares gives the lightest ions no DC", () => {
  const judged = points(1, 100, () => 1);
  const squares = leastSquaresLine(judged);
  expect(widthOnLine(squares, judged[0]!, FIELD)).toMatchObject({
    reason: "no-dc",
    width: null,
    error: null,
  });
  const worst = leastWorstWidthLine(judged, squares, FIELD)!;
  expect(largest(errorsOf(worst, judged))).toBeLessThan(0.4);
});

test("a line passes nothing where it lies above the apex, and only there", () => {
  const judged = points(10, 1000, () => 0.7);
  for (const line of [
    { slope: 0.1679, offset: 0.02 },
    { slope: 0.1675, offset: -0.02 },
  ]) {
    const closed = closedSpanOf(line, 10, 1000, FIELD)!;
    for (const point of judged) {
      const { reason, error } = widthOnLine(line, point, FIELD)!;
      // q of a set point differs from that of the apex by a per cent at m/z 10: points next to the crossing are left out.
      const inside = point.mz > closed.mzFrom * 1.02 && point.mz < closed.mzTo * 0.98;
      const outside = point.mz < closed.mzFrom * 0.98 || point.mz > closed.mzTo * 1.02;
      if (inside) expect([reason, error]).toEqual(["above-apex", -point.mzWidth]);
      if (outside) expect(reason).toBeNull();
    }
  }
  expect(closedSpanOf({ slope: 0.1678, offset: 0.01 }, 10, 1000, FIELD)).toBeNull();
  expect(closedSpanOf({ slope: APEX_RATIO, offset: 0 }, 10, 1000, FIELD)).toBeNull();
  expect(closedSpanOf({ slope: APEX_RATIO, offset: -1 }, 10, 1000, FIELD)).toEqual({
    mzFrom: 10,
    mzTo: 1000,
  });
  expect(closedSpanOf({ slope: 0.17, offset: 0 }, 10, 1000, FIELD)).toEqual({ mzFrom: 10, mzTo: 1000 });
});

test("the exchange levels three errors of x² over 0, 1/2, 1: the best line is x − 1/8 (Cheney 1966, worked by hand)", () => {
  const errors = Array.from({ length: 101 }, (_, k) => ({
    rfVolts: k / 100,
    error: -(k / 100) * (k / 100),
    gain: 1,
  }));
  const found = leastWorstStep(errors)!;
  expect(found.slope).toBeCloseTo(1, 12);
  expect(found.offset).toBeCloseTo(0.125, 12);
  expect(found.worst).toBeCloseTo(0.125, 12);
  expect(leastWorstStep(errors.slice(0, 2))).toBeNull();
});

test("the shift that costs a loss inverts the table of peak shapes: 8 % at 0.25 W, 11 % at 0.33, 18 % at 0.5", () => {
  for (const [loss, shift] of [
    [0.08, 0.25],
    [0.11, 0.33],
    [0.18, 0.5],
    [0.47, 1],
    [0.91, 2],
  ] as const) {
    expect(shiftForLoss(loss)).toBeCloseTo(shift, 12);
  }
  expect(shiftForLoss(0)).toBeNull();
  expect(shiftForLoss(0.92)).toBeNull();
  // A window of 0.7 may move by 0.35 W = 0.245 in a flight of 227.6 us.
  expect(fastestScanRate(0.7, 0.35, 227.6e-6)).toBeCloseTo(0.245 / 227.6e-6, 8);
});
