import fc from "fast-check";
import { expect, test } from "vitest";
import type { RectangularWave } from "../../../services/physics/rectangular/rectangular-wave.ts";
import { WAVE_EDGE_Q_MAX } from "../../../services/physics/rectangular/wave-edges.ts";
import {
  planeStabilityRectangular,
  pointStabilityRectangular,
} from "../../../services/physics/rectangular/wave-stability.ts";
import {
  type WaveWindow,
  waveWindowsOnScanLine,
} from "../../../services/physics/rectangular/wave-windows.ts";
import { seededRandom } from "../../bench/random.ts";
import { type Deviation, expectWithin, relativeError } from "../../measured-bound.ts";
import {
  DUTY_CYCLE_FILTERS,
  DUTY_CYCLE_WINDOWS,
  RECTANGULAR_WAVES,
  SQUARE_WAVE_CUTOFF,
} from "../../reference/rectangular-waves.ts";
import { anyWave, dcCoupled, inverted, SQUARE } from "./waves.ts";

function windowsAt(ratio: number, wave: RectangularWave, wanted: "first" | "any"): readonly WaveWindow[] {
  const found = waveWindowsOnScanLine(ratio, wave, wanted);
  if (found.kind !== "windows") throw new Error(`not converged at U/V ${ratio}, duty ${wave.dutyCycle}`);
  return found.windows;
}

test("the duty cycle alone as the filter: reference settings of 50 digits, one of them without a passband", () => {
  const deviations: Deviation[] = [];
  for (const { duty, q_low, q_high, stable } of DUTY_CYCLE_FILTERS) {
    const [window] = windowsAt(0, dcCoupled(duty), "first");
    expect(window !== undefined).toBe(stable);
    if (window === undefined) continue;
    deviations.push({ at: `duty ${duty}`, error: relativeError(window.high!.q, q_high!) });
    if (q_low === 0) expect(window.low).toBeNull();
    else deviations.push({ at: `duty ${duty}`, error: relativeError(window.low!.q, q_low!) });
  }
  expect(deviations).toHaveLength(9);
  expectWithin(4e-15, deviations);
});

test("windows of ten waves with and without DC, found at 60 digits by a walk in small steps", () => {
  const deviations: Deviation[] = [];
  for (const [ratio, dutyCycle, coupling, expected] of RECTANGULAR_WAVES.lines) {
    const windows = windowsAt(ratio, { dutyCycle, coupling }, "any").filter(({ low }) => (low?.q ?? 0) < 3);
    expect(windows).toHaveLength(expected.length);
    for (const [i, [qLow, qHigh]] of expected.entries()) {
      const at = `U/V ${ratio}, duty ${dutyCycle} ${coupling}`;
      deviations.push({ at, error: relativeError(windows[i]!.high!.q, qHigh) });
      if (qLow === 0) expect(windows[i]!.low).toBeNull();
      else deviations.push({ at, error: relativeError(windows[i]!.low!.q, qLow) });
    }
  }
  expectWithin(4e-15, deviations);
});

test("handbook figures: square-wave cutoff, windows of the duty cycle, and none left at 0.6125", () => {
  expect(windowsAt(0, SQUARE, "first")[0]!.high!.q).toBeCloseTo(SQUARE_WAVE_CUTOFF, 14);
  for (const example of DUTY_CYCLE_WINDOWS) {
    const { low, high, qWidth } = windowsAt(0, dcCoupled(example.dutyCycle), "first")[0]!;
    expect(low!.q).toBeCloseTo(example.qLow, 4);
    expect(high!.q).toBeCloseTo(example.qHigh, 4);
    if ("resolution" in example) {
      expect((low!.q + high!.q) / (2 * qWidth)).toBeCloseTo(example.resolution, 0);
    }
  }
  expect(windowsAt(0, dcCoupled(0.6125), "first")).toEqual([]);
  const throughCapacitor = windowsAt(0, { dutyCycle: 0.61, coupling: "ac" }, "first")[0]!;
  expect(throughCapacitor.low).toBeNull();
  expect(throughCapacitor.high!.q).toBeCloseTo(0.711, 3);
});

test("a dense scan of 600 lines under random waves finds stable ions in the windows and nowhere else", () => {
  const random = seededRandom(20250608);
  let stablePoints = 0;
  const regions = new Set<string>();
  for (let line = 0; line < 600; line++) {
    const wave = { dutyCycle: 0.02 + 0.96 * random(), coupling: line % 2 ? "dc" : "ac" } as const;
    const ratio = 2.4 * random() - 1.2;
    const windows = windowsAt(ratio, wave, "any");
    for (const { bands } of windows) regions.add(`${bands.x},${bands.y}`);
    for (let q = 0.0031; q < WAVE_EDGE_Q_MAX; q += 0.0173) {
      const point = pointStabilityRectangular(2 * ratio * q, q, wave);
      if (point === null) throw new Error(`U/V ${ratio}, q ${q}`);
      const inside = windows.find(({ low, high }) => q > (low?.q ?? 0) && q < (high?.q ?? WAVE_EDGE_Q_MAX));
      const at = `U/V ${ratio}, duty ${wave.dutyCycle} ${wave.coupling}, q ${q}`;
      expect(point.region, at).toEqual(inside?.bands ?? null);
      if (inside !== undefined) stablePoints++;
    }
  }
  expect(stablePoints).toBeGreaterThan(2000);
  expect(regions.size).toBeGreaterThan(3);
});

test("at either edge the plane named has a half-trace of one in size, stable inside and lost outside", () => {
  const random = seededRandom(3);
  const margins: Deviation[] = [];
  for (let line = 0; line < 2000; line++) {
    const wave = { dutyCycle: 0.1 + 0.8 * random(), coupling: line % 2 ? "dc" : "ac" } as const;
    const ratio = (wave.coupling === "dc" ? 1 - 2 * wave.dutyCycle : 0) + 0.5 * (random() - 0.5);
    for (const window of windowsAt(ratio, wave, "first")) {
      for (const edge of [window.low, window.high]) {
        if (edge === null) continue;
        const sign = edge.lostTo === "x" ? 1 : -1;
        const { margin } = planeStabilityRectangular(sign * edge.a, sign * edge.q, wave)!;
        margins.push({ at: `U/V ${ratio}, duty ${wave.dutyCycle}`, error: Math.abs(margin) });
        const outwards = (edge === window.high ? 1 : -1) * window.qWidth * 1e-6;
        const [inside, outside] = [edge.q - outwards, edge.q + outwards];
        expect(pointStabilityRectangular(2 * ratio * inside, inside, wave)!.region).toEqual(window.bands);
        expect(pointStabilityRectangular(2 * ratio * outside, outside, wave)![edge.lostTo].stable).toBe(
          false,
        );
        expect(edge.characteristicExponent).toBe(edge === window.high ? 1 : 0);
      }
    }
  }
  expect(margins.length).toBeGreaterThan(1500);
  expectWithin(1e-14, margins);
});

test("the wave inverted and the DC reversed give the same windows with the planes exchanged", () => {
  fc.assert(
    fc.property(fc.double({ min: -0.9, max: 0.9, noNaN: true }), anyWave, (ratio, wave) => {
      fc.pre(Math.abs(ratio) > 1e-6);
      const windows = windowsAt(ratio, wave, "any");
      const mirrored = windowsAt(-ratio, inverted(wave), "any");
      // Where the window is but a few roundings of 1 − d wide it may be there for one and not for the other.
      fc.pre(windows.every(({ qWidth }) => qWidth > 1e-12));
      expect(mirrored).toHaveLength(windows.length);
      for (const [i, { low, high, bands }] of windows.entries()) {
        const other = mirrored[i]!;
        expect(other.bands).toEqual({ x: bands.y, y: bands.x });
        for (const [one, opposite] of [
          [low, other.low],
          [high, other.high],
        ] as const) {
          if (one === null || opposite === null) {
            expect(one).toBe(opposite);
            continue;
          }
          expect(relativeError(opposite.q, one.q)).toBeLessThan(1e-9);
          expect(opposite.lostTo).not.toBe(one.lostTo);
        }
      }
    }),
  );
});

test("a nearly vanishing mean moves the high m/z edge into the origin without losing its digits", () => {
  // The integral of a square wave is a triangle of mean square π²/48, so that an effective field of π²q²/12 meets the mean
  // 2q U/V at q = 24 (U/V)/π² to lowest order; the next term is of second order in U/V.
  for (const [ratio, tolerance] of [
    [1e-3, 2e-5],
    [1e-6, 2e-11],
    [1e-9, 1e-14],
  ] as const) {
    const { low } = windowsAt(ratio, SQUARE, "first")[0]!;
    expect(relativeError(low!.q, (24 * ratio) / (Math.PI * Math.PI))).toBeLessThan(tolerance);
  }
});

test("nothing passes above the apex or with a duty cycle that is none, each with its reason", () => {
  expect(waveWindowsOnScanLine(0.3, SQUARE, "first")).toMatchObject({ windows: [], reason: "above-apex" });
  expect(waveWindowsOnScanLine(0.9, SQUARE, "any")).toMatchObject({
    windows: [],
    reason: "scan-line-misses-region",
  });
  expect(waveWindowsOnScanLine(0, dcCoupled(1), "any")).toMatchObject({
    windows: [],
    reason: "duty-cycle-not-between-0-and-1",
  });
  expect(waveWindowsOnScanLine(0.1, SQUARE, "first", 2).kind).toBe("not-converged");
});

test("a window that goes on beyond the end of the search has no end instead of a wrong one", () => {
  const [window] = windowsAt(0, { dutyCycle: 0.004, coupling: "ac" }, "first");
  expect(window!.high).toBeNull();
  expect(window!.qWidth).toBe(WAVE_EDGE_Q_MAX);
  expect(pointStabilityRectangular(0, WAVE_EDGE_Q_MAX, { dutyCycle: 0.004, coupling: "ac" })!.stable).toBe(
    true,
  );
});
