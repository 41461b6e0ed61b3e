import fc from "fast-check";
import { expect, test } from "vitest";
import {
  attainableResolution,
  axialEnergyOf,
  flightTime,
  H_CONSTANTS,
  rfCycles,
  scanLossOf,
} from "../../services/physics/transit.ts";
import { expectWithin, relativeError } from "../measured-bound.ts";
import { TRANSIT } from "../reference/worked-examples.ts";
import { anyMz, logUniform } from "./settings.ts";

test("the worked example: 227.6 µs, 227.6 cycles, R 4230 and 2591", () => {
  const { mz, axialEnergyVolts, rodLength, frequency } = TRANSIT;
  const time = flightTime(mz, axialEnergyVolts, rodLength);
  const cycles = rfCycles(time, frequency);
  expect((time * 1e6).toFixed(1)).toBe(TRANSIT.flightTime_us.toFixed(1));
  expect(cycles.toFixed(1)).toBe("227.6");
  const resolutions = H_CONSTANTS.map(({ h }) => Math.round(attainableResolution(cycles, h)));
  expect(resolutions).toEqual(TRANSIT.resolutions);
});

test("the smallest width is 4e9 E/(f² L²) with h near 20, whatever the m/z", () => {
  // Δm = 4e9 Vz/(f² L²): Austin, Holme and Leck in Dawson 1976, from memory, one digit; with h = 20 exactly 3.859e9,
  // and 4e9 taken literally is h = 20.7 (recomputed from first principles).
  const constant = (mz: number, h: number) => {
    const [energy, length, frequency] = [3, 0.15, 1.4e6];
    const cycles = rfCycles(flightTime(mz, energy, length), frequency);
    return (mz / attainableResolution(cycles, h)) * ((frequency * frequency * length * length) / energy);
  };
  expect(constant(300, 20).toExponential(3)).toBe("3.859e+9");
  expect(constant(300, 12.25).toExponential(3)).toBe("2.364e+9");
  expect((4e9 / constant(1, 1)).toFixed(1)).toBe("20.7");
  expect(relativeError(constant(17, 20), constant(1900, 20))).toBeLessThan(1e-14);
});

test("the number of cycles follows the published constant", () => {
  // N = 7.198704629e-5 f L sqrt(M/Vz), SI: recomputed from CODATA 2022.
  const cycles = rfCycles(flightTime(500, 2, 0.2), 1e6);
  expectWithin(5e-11, [
    { at: "N", error: relativeError(cycles, 7.198704629e-5 * 1e6 * 0.2 * Math.sqrt(500 / 2)) },
  ]);
});

test("flight time and axial energy undo each other, and energy is half m v² per charge", () => {
  fc.assert(
    fc.property(anyMz, logUniform(1e-3, 1e3), logUniform(1e-3, 2), (mz, energy, length) => {
      const time = flightTime(mz, energy, length);
      expect(relativeError(axialEnergyOf(mz, time, length), energy)).toBeLessThan(2e-15);
      expect(relativeError(flightTime(4 * mz, energy, length), 2 * time)).toBeLessThan(1e-15);
      expect(relativeError(flightTime(mz, energy, 3 * length), 3 * time)).toBeLessThan(1e-15);
    }),
  );
});

test("both constants of the literature stand with their source", () => {
  expect(H_CONSTANTS.map(({ h }) => h)).toEqual([12.25, 20]);
  expect(12.25).toBe(3.5 * 3.5);
  for (const { source } of H_CONSTANTS) expect(source).toMatch(/\(from memory\)$/);
});

test("the loss of a moving window: computed points, straight lines between, nothing outside", () => {
  // Peak shapes at 228 RF cycles, computed outside this project's code; two beams gave 40 and 47 % at a shift of 1.
  const points = [0.25, 0.33, 0.5, 2].map((shift) => scanLossOf(shift));
  expect(points).toEqual([0.08, 0.11, 0.18, 0.91]);
  expect(scanLossOf(1)).toBe(0.47);
  expect(scanLossOf(0)).toBe(0);
  expect(scanLossOf(1.5)).toBeCloseTo(0.69, 14);
  expect(scanLossOf(-0.01)).toBeNull();
  expect(scanLossOf(2.01)).toBeNull();
  expect(scanLossOf(Number.NaN)).toBeNull();
});
