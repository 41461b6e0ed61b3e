import fc from "fast-check";
import { expect, test } from "vitest";
import { characteristicA, characteristicB } from "../../services/physics/characteristic-values.ts";
import { qOf } from "../../services/physics/mathieu-parameters.ts";
import {
  adiabaticity,
  CUTOFF_Q,
  lowMassCutoff,
  SECOND_WINDOW_Q_HIGH,
  SECOND_WINDOW_Q_LOW,
  secondWindow,
  secularFrequency,
  secularFrequencyAdiabatic,
  wellDepth,
} from "../../services/physics/rf-only.ts";
import { pointStability } from "../../services/physics/stability.ts";
import { type Deviation, expectWithin, relativeError } from "../measured-bound.ts";
import { RF_ONLY, STABILITY_REGIONS } from "../reference/tables.ts";
import { ION_GUIDE, SECOND_REGION } from "../reference/worked-examples.ts";
import { anyField, anyMz, anyVolts, logUniform } from "./settings.ts";

test("cutoffs, second windows, depths and secular frequencies of ten reference settings", () => {
  const windows: Deviation[] = [];
  const depths: Deviation[] = [];
  const frequencies: Deviation[] = [];
  for (const row of RF_ONLY.quadrupole) {
    const [fieldRadius, frequency, V, cutoff, secondHigh, secondLow, mz, q, depth, beta, exact, adiabatic] =
      row;
    const field = { fieldRadius, frequency };
    const at = `V ${V}, m/z ${mz}`;
    const second = secondWindow(V, field);
    windows.push({ at, error: relativeError(lowMassCutoff(V, field), cutoff) });
    windows.push({ at, error: relativeError(second.mzLow, secondLow) });
    windows.push({ at, error: relativeError(second.mzHigh, secondHigh) });
    depths.push({ at, error: relativeError(qOf(mz, V, field), q) });
    depths.push({ at, error: relativeError(wellDepth(V, mz, field, 2), depth) });
    depths.push({ at, error: relativeError(adiabaticity(V, mz, field, 2), q) });
    const computed = qOf(mz, V, field);
    frequencies.push({ at, error: relativeError(secularFrequency(computed, frequency)!, exact) });
    frequencies.push({ at, error: relativeError(secularFrequencyAdiabatic(computed, frequency), adiabatic) });
    frequencies.push({ at, error: relativeError((beta * frequency) / 2, exact) });
  }
  expectWithin(2e-15, windows);
  expectWithin(2e-15, depths);
  expectWithin(2e-14, frequencies);
});

test("effective potential and adiabaticity of ten rod sets of two to eleven pole pairs", () => {
  const deviations: Deviation[] = [];
  for (const [n, z, mass, fieldRadius, frequency, V, radius, potential, eta] of RF_ONLY.multipole) {
    const field = { fieldRadius, frequency };
    const at = `n ${n}, z ${z}, m ${mass}`;
    // The table gives an energy of the ion; ours is per elementary charge.
    deviations.push({ at, error: relativeError(wellDepth(V, mass / z, field, n, radius) * z, potential) });
    deviations.push({ at, error: relativeError(adiabaticity(V, mass / z, field, n, radius), eta) });
  }
  expectWithin(3e-15, deviations);
});

test("exact secular frequencies from q 0.01 to 0.9, and how far the adiabatic ones are below", () => {
  const exponents: Deviation[] = [];
  const shortfalls: Deviation[] = [];
  for (const [q, beta, adiabatic, error] of RF_ONLY.beta_table) {
    const exact = secularFrequency(q, 2)!;
    const approximate = secularFrequencyAdiabatic(q, 2);
    exponents.push({ at: `q ${q}`, error: Math.abs(exact - beta) });
    exponents.push({ at: `q ${q}, adiabatic`, error: Math.abs(approximate - adiabatic) });
    shortfalls.push({ at: `q ${q}`, error: Math.abs(approximate / exact - 1 - error) });
  }
  expectWithin(2e-14, exponents);
  expectWithin(1e-13, shortfalls);
});

test("the published small-q law: the adiabatic frequency is low by 25 q²/128", () => {
  // β² = q²/2 + 25 q⁴/128 + …, from the series of a_ν(q) in DLMF 28.15.1; Dehmelt, Adv. At. Mol. Phys. 3 (1967) 53.
  for (const q of [0.005, 0.01, 0.02]) {
    const shortfall = 1 - secularFrequencyAdiabatic(q, 2) / secularFrequency(q, 2)!;
    expect(relativeError(shortfall, (25 * q * q) / 128)).toBeLessThan(2 * q * q + 1e-9);
  }
});

test("worked examples of an ion guide", () => {
  const field = { fieldRadius: 0.00417, frequency: 1e6 };
  for (const { volts, q, depth, cutoff } of ION_GUIDE) {
    expect(qOf(500, volts, field).toFixed(4)).toBe(q.toFixed(4));
    expect(wellDepth(volts, 500, field, 2).toFixed(2)).toBe(depth.toFixed(2));
    expect(lowMassCutoff(volts, field).toFixed(1)).toBe(cutoff.toFixed(1));
  }
});

test("at 0.8 of the field radius 0.64, 0.41 and 0.26 of the depth are left", () => {
  // Gerlich, Adv. Chem. Phys. 82 (1992) 1, from memory: usable up to 0.8 r0; the shares are 0.8^(2n−2).
  const field = { fieldRadius: 0.004, frequency: 1e6 };
  const share = (n: number) => wellDepth(100, 300, field, n, 0.8) / wellDepth(100, 300, field, n);
  expect([2, 3, 4].map((n) => share(n).toFixed(2))).toEqual(["0.64", "0.41", "0.26"]);
});

test("the second window is region (1,1) at a = 0", () => {
  expect([SECOND_WINDOW_Q_LOW, SECOND_WINDOW_Q_HIGH]).toEqual(
    STABILITY_REGIONS.headline.region_II.q_limits_a0.map(Number),
  );
  expectWithin(1e-14, [
    { at: "a_1", error: Math.abs(characteristicA(1, SECOND_WINDOW_Q_LOW)!) },
    { at: "b_2", error: Math.abs(characteristicB(2, SECOND_WINDOW_Q_HIGH)!) },
  ]);
  expect(pointStability(0, (SECOND_WINDOW_Q_LOW + SECOND_WINDOW_Q_HIGH) / 2)!.region).toEqual({ x: 1, y: 1 });
  const centre = (SECOND_WINDOW_Q_LOW + SECOND_WINDOW_Q_HIGH) / 2;
  const resolution = centre / (SECOND_WINDOW_Q_HIGH - SECOND_WINDOW_Q_LOW);
  expect(Math.round(resolution)).toBe(SECOND_REGION.resolution);
  expect(SECOND_WINDOW_Q_LOW.toFixed(5)).toBe(SECOND_REGION.qLow.toFixed(5));
  expect(SECOND_WINDOW_Q_HIGH.toFixed(4)).toBe(SECOND_REGION.qHigh.toFixed(4));
});

test("ions either side of the cutoff, between the windows and beyond the domain", () => {
  expect(secularFrequency(CUTOFF_Q * (1 - 1e-12), 1e6)).toBeCloseTo(5e5, -1);
  expect(secularFrequency(CUTOFF_Q * (1 + 1e-12), 1e6)).toBeNull();
  expect(secularFrequency(3, 1e6)).toBeNull();
  expect(secularFrequency(1e4, 1e6)).toBeNull();
  expect(secularFrequency(0, 1e6)).toBeNull();
});

test("depth rises with V², falls with m/z, and never turns negative", () => {
  fc.assert(
    fc.property(
      anyVolts,
      anyMz,
      anyField,
      fc.integer({ min: 2, max: 11 }),
      logUniform(0.1, 1),
      (volts, mz, field, n, radius) => {
        const depth = wellDepth(volts, mz, field, n, radius);
        expect(depth).toBeGreaterThan(0);
        expect(wellDepth(-volts, mz, field, n, radius)).toBe(depth);
        expect(relativeError(wellDepth(2 * volts, mz, field, n, radius), 4 * depth)).toBeLessThan(1e-15);
        expect(relativeError(wellDepth(volts, 2 * mz, field, n, radius), depth / 2)).toBeLessThan(1e-15);
        // V*/V = η n/(8(n−1)) · (r/r0)^n, both formulas of Gerlich 1992 divided.
        const eta = adiabaticity(volts, mz, field, n, radius);
        let power = 1;
        for (let i = 0; i < n; i++) power *= radius;
        expect(relativeError(depth, (volts * eta * n * power) / (8 * (n - 1)))).toBeLessThan(1e-14);
        // A rod set of two pole pairs: D = qV/4, η = q.
        expect(relativeError(adiabaticity(volts, mz, field, 2, radius), qOf(mz, volts, field))).toBeLessThan(
          1e-14,
        );
      },
    ),
  );
});
