import { expect, test } from "vitest";
import {
  closingWave,
  WAVE_RESOLUTION_MAXIMUM,
  type WaveTuning,
  waveForResolution,
} from "../../../services/physics/rectangular/wave-resolution.ts";
import { waveWindowsOnScanLine } from "../../../services/physics/rectangular/wave-windows.ts";
import { type Deviation, expectWithin, relativeError } from "../../measured-bound.ts";
import { LARGEST_DUTY_CYCLE, SQUARE_WAVE_APEX } from "../../reference/rectangular-waves.ts";
import { dcCoupled, SQUARE } from "./waves.ts";

const TUNINGS: readonly WaveTuning[] = [
  { vary: "ratio", wave: SQUARE, towards: "high" },
  { vary: "ratio", wave: SQUARE, towards: "low" },
  { vary: "ratio", wave: dcCoupled(0.58), towards: "high" },
  { vary: "ratio", wave: dcCoupled(0.05), towards: "high" },
  { vary: "ratio", wave: { dutyCycle: 0.7, coupling: "ac" }, towards: "low" },
  { vary: "duty-cycle", ratio: 0, towards: "high" },
  { vary: "duty-cycle", ratio: 0, towards: "low" },
  { vary: "duty-cycle", ratio: 0.1, towards: "high" },
];

test("the largest duty cycle with a passband, and by symmetry the smallest", () => {
  const largest = closingWave({ vary: "duty-cycle", ratio: 0, towards: "high" });
  const smallest = closingWave({ vary: "duty-cycle", ratio: 0, towards: "low" });
  if (largest.kind !== "closed" || smallest.kind !== "closed") throw new Error("not closed");
  expectWithin(5e-15, [
    { at: "largest", error: relativeError(largest.wave.dutyCycle, LARGEST_DUTY_CYCLE.dutyCycle) },
    { at: "its q", error: relativeError(largest.q, LARGEST_DUTY_CYCLE.q) },
    { at: "smallest", error: relativeError(1 - smallest.wave.dutyCycle, LARGEST_DUTY_CYCLE.dutyCycle) },
  ]);
});

test("the apex of the square wave with DC: Konenkov, Sudakov and Douglas 2002, recomputed", () => {
  const apex = closingWave({ vary: "ratio", wave: SQUARE, towards: "high" });
  if (apex.kind !== "closed") throw new Error(apex.kind);
  expect(apex.ratio).toBeCloseTo(SQUARE_WAVE_APEX.ratio, 6);
  expect(apex.q).toBeCloseTo(SQUARE_WAVE_APEX.q, 6);
  expect(2 * apex.ratio * apex.q).toBeCloseTo(SQUARE_WAVE_APEX.a, 6);
});

test("the resolution asked for is that of the window found, from nearly open to a million", () => {
  const deviations: Deviation[] = [];
  for (const tuning of TUNINGS) {
    for (const resolution of [0.501, 0.6, 1, 3, 20, 150, 1000, 1e5, WAVE_RESOLUTION_MAXIMUM]) {
      const tuned = waveForResolution(resolution, tuning);
      if (tuned.kind !== "tuned") throw new Error(`${tuned.kind} at ${resolution}`);
      const { low, high } = tuned.window;
      const found = (low!.q + high!.q) / (2 * tuned.window.qWidth);
      // Doubles of q, U/V and the duty cycle move a window by some 1e-16, its width by R times as much.
      const error = relativeError(found, resolution) / Math.max(1, resolution);
      deviations.push({ at: `${JSON.stringify(tuning)} R ${resolution}`, error });
      const heavy = tuning.towards === "high" ? "y" : "x";
      expect(low!.lostTo).toBe(heavy);
    }
  }
  expectWithin(1e-14, deviations);
});

test("from the open to the closed end the window narrows without a turn, for waves even and uneven", () => {
  for (const tuning of TUNINGS) {
    const closed = closingWave(tuning);
    if (closed.kind !== "closed") throw new Error(closed.kind);
    const byRatio = tuning.vary === "ratio";
    const open = byRatio
      ? tuning.wave.coupling === "dc"
        ? 1 - 2 * tuning.wave.dutyCycle
        : 0
      : (1 - tuning.ratio) / 2;
    const end = byRatio ? closed.ratio : closed.wave.dutyCycle;
    let before = 0;
    for (let i = 1; i < 150; i++) {
      const value = open + ((end - open) * i) / 150;
      const found = byRatio
        ? waveWindowsOnScanLine(value, tuning.wave, "first")
        : waveWindowsOnScanLine(tuning.ratio, dcCoupled(value), "first");
      if (found.kind !== "windows") throw new Error(found.kind);
      const { low, high, qWidth } = found.windows[0]!;
      const resolution = (low!.q + high!.q) / (2 * qWidth);
      expect(resolution).toBeGreaterThan(before);
      before = resolution;
    }
  }
});

test("what cannot be reached is refused with its reason", () => {
  const square: WaveTuning = { vary: "ratio", wave: SQUARE, towards: "high" };
  expect(waveForResolution(0.5, square)).toMatchObject({ reason: "resolution-not-reachable", minimum: 0.5 });
  expect(waveForResolution(2e6, square).kind).toBe("not-reachable");
  expect(waveForResolution(100, { ...square, wave: dcCoupled(1.2) })).toMatchObject({
    reason: "duty-cycle-not-between-0-and-1",
  });
  expect(waveForResolution(100, { vary: "duty-cycle", ratio: 1.5, towards: "high" })).toMatchObject({
    reason: "dc-exceeds-wave",
  });
  const uneven: WaveTuning = { vary: "ratio", wave: { dutyCycle: 0.004, coupling: "ac" }, towards: "high" };
  expect(waveForResolution(100, uneven)).toMatchObject({ reason: "outside-computed-domain" });
  expect(waveForResolution(100, square, 2).kind).toBe("not-converged");
});
