import fc from "fast-check";
import { expect, test } from "vitest";
import { sensitivitiesForResolution } from "../../services/physics/drift.ts";
import {
  allowedTolerances,
  DRIFT_CAUSES,
  derivativesOf,
  driftBudgetOf,
  type SensitiveWindow,
  SHIFTED,
} from "../../services/physics/drift-budget.ts";
import { passbandOf } from "../../services/physics/passband.ts";
import { setPointOf } from "../../services/physics/set-point.ts";
import { type Deviation, expectWithin, relativeError } from "../measured-bound.ts";
import { SCAN_AND_DRIFT } from "../reference/scan-and-drift.ts";
import { DRIFT_AT_1000 } from "../reference/worked-examples.ts";
import { anyMz, logUniform } from "./settings.ts";

const windowAt = (mzCentre: number, mzWidth: number): SensitiveWindow => ({
  mzCentre,
  mzWidth,
  sensitivity: sensitivitiesForResolution(mzCentre / mzWidth)!,
});

test("the derivatives by U/V agree with differences of 40-digit edges (test/reference, scan-and-drift)", () => {
  const deviations: Deviation[] = [];
  for (const [mz, width, , , , lowByRatio, highByRatio] of SCAN_AND_DRIFT.drift) {
    const { low, high, centre, width: wide } = derivativesOf(windowAt(mz, width), "ratio");
    const expected = [(mz - width / 2) * lowByRatio, (mz + width / 2) * highByRatio] as const;
    const at = `${mz}`;
    deviations.push(
      { at, error: relativeError(low, expected[0]) },
      { at, error: relativeError(high, expected[1]) },
      { at, error: relativeError(centre, (expected[0] + expected[1]) / 2) },
      { at, error: relativeError(wide, expected[1] - expected[0]) },
    );
  }
  expectWithin(1e-14, deviations);
});

test("every derivative agrees with a difference of the passband of moved volts, frequency and radius", () => {
  const field = { fieldRadius: 0.004, frequency: 1.2e6 };
  for (const [mz, mzWidth] of [
    [1000, 0.7],
    [28, 1],
    [4, 2],
  ] as const) {
    const point = setPointOf(mz, mzWidth, field);
    if (point.kind !== "set-point") throw new Error(point.kind);
    const step = 1e-4 * point.margin;
    const moved = {
      fieldRadius: (by: number) =>
        passbandOf(point.dcVolts, point.rfVolts, { ...field, fieldRadius: field.fieldRadius * by }),
      frequency: (by: number) =>
        passbandOf(point.dcVolts, point.rfVolts, { ...field, frequency: field.frequency * by }),
      amplitude: (by: number) => passbandOf(point.dcVolts * by, point.rfVolts * by, field),
      ratio: (by: number) => passbandOf(point.dcVolts * by, point.rfVolts, field),
    };
    for (const cause of DRIFT_CAUSES) {
      const [above, below] = [moved[cause](1 + step), moved[cause](1 - step)];
      if (above.kind !== "window" || below.kind !== "window") throw new Error(above.kind);
      const derivatives = derivativesOf(windowAt(mz, mzWidth), cause);
      const centre = (above.passband.mzCentre! - below.passband.mzCentre!) / (2 * step);
      const width = (above.passband.mzWidth! - below.passband.mzWidth!) / (2 * step);
      // A difference of numbers near m/z over a step of 1e-4 of the margin keeps five to six digits of the width.
      expect(relativeError(derivatives.centre, centre)).toBeLessThan(1e-5);
      expect(relativeError(derivatives.width, width)).toBeLessThan(1e-5);
    }
  }
});

test("worked examples at m/z 1000 and width 0.70: a hundred ppm of the volts, fifty of f or r0, one of U/V", () => {
  const zero = { fieldRadius: 0, frequency: 0, amplitude: 0, ratio: 0 };
  const window = windowAt(1000, 0.7);
  const centreOf = (changes: object) => driftBudgetOf(window, { ...zero, ...changes }).worstCase.centre;
  expect(centreOf({ amplitude: 1e-4 })).toBeCloseTo(DRIFT_AT_1000.common, 12);
  expect(centreOf({ frequency: 5e-5 })).toBeCloseTo(DRIFT_AT_1000.common, 12);
  expect(centreOf({ fieldRadius: 5e-5 })).toBeCloseTo(DRIFT_AT_1000.common, 12);
  const { width } = driftBudgetOf(window, { ...zero, ratio: 1e-6 }).worstCase;
  expect(width.toFixed(5)).toBe(DRIFT_AT_1000.widthPerRatio_ppm.toFixed(5));
});

const tolerance = fc.oneof(fc.constant(0), logUniform(1e-9, 1e-3));
const tolerances = fc.record({
  fieldRadius: tolerance,
  frequency: tolerance,
  amplitude: tolerance,
  ratio: tolerance,
});

test("root-sum-square never exceeds the worst case, and the worst case is at most twice it", () => {
  fc.assert(
    fc.property(anyMz, logUniform(0.6, 1e5), tolerances, (mz, resolution, stated) => {
      const { worstCase, rootSumSquare } = driftBudgetOf(windowAt(mz, mz / resolution), stated);
      for (const what of SHIFTED) {
        expect(rootSumSquare[what]).toBeLessThanOrEqual(worstCase[what] * (1 + 1e-14));
        // Four causes: Cauchy's inequality.
        expect(worstCase[what]).toBeLessThanOrEqual(2 * rootSumSquare[what] * (1 + 1e-14));
      }
    }),
  );
});

test("allowed tolerances, put back into the budget, reach the limit and no more", () => {
  fc.assert(
    fc.property(
      anyMz,
      logUniform(0.6, 1e5),
      fc.record({
        centreShift: logUniform(1e-3, 1),
        edgeShift: logUniform(1e-3, 1),
        widthChange: logUniform(1e-3, 1),
      }),
      (mz, resolution, limits) => {
        const window = windowAt(mz, mz / resolution);
        const allowed = allowedTolerances(window, limits);
        const zero = { fieldRadius: 0, frequency: 0, amplitude: 0, ratio: 0 };
        const used = (stated: typeof zero, sum: "worstCase" | "rootSumSquare") => {
          const { [sum]: shifts } = driftBudgetOf(window, stated);
          return Math.max(
            shifts.centre / limits.centreShift,
            Math.max(shifts.low, shifts.high) / limits.edgeShift,
            shifts.width / limits.widthChange,
          );
        };
        const shared = { worstCase: { ...zero }, rootSumSquare: { ...zero } };
        for (const { cause, alone, sharedWorstCase, sharedRootSumSquare } of allowed) {
          expect(used({ ...zero, [cause]: alone! }, "worstCase")).toBeCloseTo(1, 10);
          shared.worstCase[cause] = sharedWorstCase!;
          shared.rootSumSquare[cause] = sharedRootSumSquare!;
        }
        expect(used(shared.worstCase, "worstCase")).toBeLessThanOrEqual(1 + 1e-12);
        expect(used(shared.rootSumSquare, "rootSumSquare")).toBeLessThanOrEqual(1 + 1e-12);
      },
    ),
  );
});

test("without a limit nothing is bound", () => {
  for (const { alone, sharedWorstCase, boundBy } of allowedTolerances(windowAt(500, 0.7), {})) {
    expect([alone, sharedWorstCase, boundBy]).toEqual([null, null, null]);
  }
});
