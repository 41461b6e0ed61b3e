import fc from "fast-check";
import { expect, test } from "vitest";
import {
  edgeSensitivities,
  sensitivitiesForResolution,
  widthSensitivityToRatio,
  windowShiftOf,
} from "../../services/physics/drift.ts";
import { APEX_RATIO } from "../../services/physics/first-region.ts";
import { passbandOf } from "../../services/physics/passband.ts";
import { setPointOf } from "../../services/physics/set-point.ts";
import { type Deviation, expectWithin, relativeError } from "../measured-bound.ts";
import { STABILITY_REGIONS } from "../reference/tables.ts";
import { DRIFT_AT_1000 } from "../reference/worked-examples.ts";
import { anyMz, logUniform } from "./settings.ts";

test("worked examples at m/z 1000 and width 0.70", () => {
  const common = windowShiftOf(1000, 0.7, { amplitude: 1e-4 })!;
  expect(common.centre.toFixed(3)).toBe(DRIFT_AT_1000.common.toFixed(3));
  expect(windowShiftOf(1000, 0.7, { frequency: -5e-5 })!.centre.toFixed(3)).toBe("0.100");
  expect(windowShiftOf(1000, 0.7, { fieldRadius: -5e-5 })!.centre.toFixed(3)).toBe("0.100");
  expect((widthSensitivityToRatio(1000, 0.7)! * 1e-6).toFixed(5)).toBe(
    DRIFT_AT_1000.widthPerRatio_ppm.toFixed(5),
  );
  // V alone: the amplitude rises by 1e-4 and U/V falls by as much.
  const alone = windowShiftOf(1000, 0.7, { amplitude: 1e-4, ratio: -1e-4 })!;
  expect(alone.centre.toFixed(3)).toBe(DRIFT_AT_1000.voltsAloneShift.toFixed(3));
  expect((0.7 + alone.width).toFixed(2)).toBe(DRIFT_AT_1000.voltsAloneWidth.toFixed(2));
});

test("at the apex the sensitivities follow from the reference slopes of both boundaries", () => {
  // Edge a = s (q − q_A) + a_A, scan line a = 2 λ q: d ln q/d ln λ = 2 λ/(s − 2 λ).
  const { slope_b1_at_apex, slope_minus_a0_at_apex } = STABILITY_REGIONS.headline.region_I;
  const byRatio = (slope: number) => -(2 * APEX_RATIO) / (slope - 2 * APEX_RATIO);
  const close = sensitivitiesForResolution(1e8)!;
  expectWithin(1e-7, [
    { at: "low", error: relativeError(close.low.ratio, byRatio(Number(slope_b1_at_apex))) },
    { at: "high", error: relativeError(close.high.ratio, byRatio(Number(slope_minus_a0_at_apex))) },
  ]);
});

test("near U/V = 0 the high edge goes as V/U and the low edge stays", () => {
  // q_low = 4 U/V + … since −a_0(q) = q²/2 + … (DLMF 28.6.1).
  const open = edgeSensitivities(1e-7)!;
  expect(open.high.ratio).toBeCloseTo(-1, 12);
  expect(Math.abs(open.low.ratio)).toBeLessThan(1e-6);
});

test("the derivatives agree with differences of the passband itself", () => {
  const deviations: Deviation[] = [];
  const field = { fieldRadius: 0.004, frequency: 1.2e6 };
  const edgesOf = (dc: number, rf: number, changed = field) => {
    const answer = passbandOf(dc, rf, changed);
    if (answer.kind !== "window") throw new Error(answer.kind);
    return [Math.log(answer.passband.mzLow), Math.log(answer.passband.mzHigh!)] as const;
  };
  for (const share of [0.01, 0.2, 0.49, 0.51, 0.7, 0.9, 0.99, 0.999]) {
    const rf = 700;
    const dc = rf * APEX_RATIO * share;
    const { low, high } = edgeSensitivities(APEX_RATIO * share)!;
    const step = 1e-3 * Math.min(share, 1 - share);
    const central = (at: (factor: number) => readonly [number, number]) => {
      const [near, far] = [
        [at(1 + step), at(1 - step)],
        [at(1 + 2 * step), at(1 - 2 * step)],
      ] as const;
      return [0, 1].map(
        (edge) => (8 * (near[0][edge]! - near[1][edge]!) - (far[0][edge]! - far[1][edge]!)) / (12 * step),
      );
    };
    for (const [name, at, expected] of [
      ["ratio", (by: number) => edgesOf(dc * by, rf), [low.ratio, high.ratio]],
      ["amplitude", (by: number) => edgesOf(dc * by, rf * by), [low.amplitude, high.amplitude]],
      [
        "frequency",
        (by: number) => edgesOf(dc, rf, { ...field, frequency: field.frequency * by }),
        [low.frequency, high.frequency],
      ],
      [
        "field radius",
        (by: number) => edgesOf(dc, rf, { ...field, fieldRadius: field.fieldRadius * by }),
        [low.fieldRadius, high.fieldRadius],
      ],
    ] as const) {
      for (const [edge, difference] of central(at).entries()) {
        // A difference of logarithms near 6 has 1e-15 of rounding, divided by the step.
        const error = Math.abs(difference - expected[edge]!) * step;
        deviations.push({ at: `${name}, share ${share}, edge ${edge}`, error });
      }
    }
  }
  expectWithin(5e-15, deviations);
});

test("a window known by centre and width shifts as its own drive does", () => {
  fc.assert(
    fc.property(anyMz, logUniform(0.6, 5000), (mzCentre, resolution) => {
      const mzWidth = mzCentre / resolution;
      const field = { fieldRadius: 0.004, frequency: 1e6 };
      const point = setPointOf(mzCentre, mzWidth, field);
      if (point.kind !== "set-point") throw new Error(point.kind);
      const change = 1e-4 * point.margin;
      const moved = passbandOf(point.dcVolts * (1 + change), point.rfVolts, field);
      if (moved.kind !== "window") throw new Error(moved.kind);
      const shift = windowShiftOf(mzCentre, mzWidth, { ratio: change })!;
      const width = moved.passband.mzWidth! - mzWidth;
      expect(relativeError(shift.width, width)).toBeLessThan(2e-4 + 1e-7 * resolution);
      expect(shift.width).toBeLessThan(0);
      expect(shift.high).toBeLessThan(0);
      expect(shift.low).toBeGreaterThan(0);
    }),
  );
});

test("no window, no sensitivity", () => {
  expect(edgeSensitivities(0)).toBeNull();
  expect(edgeSensitivities(APEX_RATIO * 1.01)).toBeNull();
  expect(sensitivitiesForResolution(0.5)).toBeNull();
  expect(windowShiftOf(10, 30, { ratio: 1e-6 })).toBeNull();
  expect(widthSensitivityToRatio(10, 30)).toBeNull();
  expect(windowShiftOf(500, 0.7, {})).toEqual({ low: 0, high: 0, centre: 0, width: 0 });
});
