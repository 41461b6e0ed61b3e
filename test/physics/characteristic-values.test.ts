import { expect, test } from "vitest";
import {
  characteristicA,
  characteristicB,
  evenCharacteristicValuesBelow,
  MAX_CHARACTERISTIC_Q,
  MAX_ORDER,
} from "../../services/physics/characteristic-values.ts";
import { halfPeriodExtended } from "../../services/physics/half-period-extended.ts";
import { type Deviation, expectWithin } from "../measured-bound.ts";
import { CHARACTERISTIC_VALUES, STABILITY_REGIONS } from "../reference/tables.ts";
import { SECOND_REGION, THIRD_REGION_CORNERS } from "../reference/worked-examples.ts";

/** "a_2" or "a=-b_1(q)" to the value of that curve. */
function onCurve(name: string, q: number): number {
  const [, sign, letter, order] = /^(?:a=)?(-?)([ab])_(\d)/.exec(name)!;
  const value = letter === "a" ? characteristicA(Number(order), q)! : characteristicB(Number(order), q)!;
  return sign === "-" ? -value : value;
}

test("a_0 to a_8 and b_1 to b_8 agree with 50-digit values at sixteen q", () => {
  const deviations: Deviation[] = [];
  for (const letter of ["a", "b"] as const) {
    for (const [q, values] of Object.entries(CHARACTERISTIC_VALUES[letter])) {
      for (const [i, value] of values.entries()) {
        const name = `${letter}_${letter === "a" ? i : i + 1}`;
        const error = Math.abs(onCurve(name, Number(q)) - value) / (1 + Math.abs(value));
        deviations.push({ at: `${name}(${q})`, error });
      }
    }
  }
  expect(deviations).toHaveLength(16 * 17);
  // 1 is the natural scale: a value may pass through zero, as b_1 does at the RF-only limit.
  expectWithin(3e-15, deviations);
});

test("Abramowitz and Stegun table 20.1 (the values of NIST DLMF chapter 28) to its eight decimals", () => {
  // Recalled from memory, and so printed in the table; one unit of the last decimal is 1e-8.
  const rows = CHARACTERISTIC_VALUES.table_20_1_from_memory;
  expect(rows).toHaveLength(35);
  expectWithin(
    1e-8,
    rows.map(({ f, q, from_memory }) => ({
      at: `${f}(${q})`,
      error: Math.abs(onCurve(f, q) - from_memory),
    })),
  );
});

test("the power series of DLMF 28.6.1 to 28.6.4 hold at small q", () => {
  // Signs and coefficients as printed in DLMF 28.6(i), from memory.
  const q = 0.01;
  const q2 = q * q;
  expectWithin(2e-13, [
    { at: "a_0", error: Math.abs(characteristicA(0, q)! - (-q2 / 2 + (7 * q2 * q2) / 128)) },
    {
      at: "a_1",
      error: Math.abs(characteristicA(1, q)! - (1 + q - q2 / 8 - (q2 * q) / 64 - (q2 * q2) / 1536)),
    },
    {
      at: "b_1",
      error: Math.abs(characteristicB(1, q)! - (1 - q - q2 / 8 + (q2 * q) / 64 - (q2 * q2) / 1536)),
    },
    { at: "a_2", error: Math.abs(characteristicA(2, q)! - (4 + (5 * q2) / 12 - (763 * q2 * q2) / 13824)) },
    { at: "b_2", error: Math.abs(characteristicB(2, q)! - (4 - q2 / 12 + (5 * q2 * q2) / 13824)) },
  ]);
});

test("negative q exchanges a and b of odd order and changes no other (DLMF 28.2.26)", () => {
  for (const q of [0.2, 3, 17.3]) {
    for (let n = 1; n <= MAX_ORDER; n++) {
      const partner = n % 2 === 0 ? characteristicA(n, q) : characteristicB(n, q);
      expect(characteristicA(n, -q)).toBe(partner);
    }
  }
});

test("every corner of every region lies on both of its curves", () => {
  const deviations: Deviation[] = [];
  for (const { label, corners_all_real_a } of STABILITY_REGIONS.regions) {
    for (const { x_curve, y_curve, q, a } of corners_all_real_a) {
      for (const curve of [x_curve, y_curve]) {
        const at = `${label} ${curve} at q ${q}`;
        deviations.push({ at, error: Math.abs(onCurve(curve, q) - a) / (1 + Math.abs(a)) });
      }
    }
  }
  expect(deviations.length).toBeGreaterThanOrEqual(40);
  expectWithin(5e-15, deviations);
});

test("apexes of the second and third region as published", () => {
  const { apexQ, apexA } = SECOND_REGION;
  expectWithin(1e-4, [
    { at: "b_2 at the second apex", error: Math.abs(characteristicB(2, apexQ)! - apexA) },
    { at: "a_1 at the second apex", error: Math.abs(characteristicA(1, apexQ)! + apexA) },
  ]);
  for (const { a, q, x, y } of THIRD_REGION_CORNERS) {
    expectWithin(1e-5, [
      { at: `${x} at q ${q}`, error: Math.abs(onCurve(x, q) - a) },
      { at: `${y} at q ${q}`, error: Math.abs(onCurve(y, q) + a) },
    ]);
  }
});

test("at a characteristic value one of the half-period values vanishes: the two methods verify each other", () => {
  const half = new Float64Array(4);
  const deviations: Deviation[] = [];
  // a_odd: C = 0; a_even: C' = 0; b_even: S = 0; b_odd: S' = 0 at π/2 (DLMF 28.2.21 to 28.2.24).
  for (let q = 0.05; q <= 12; q += 0.35) {
    for (let n = 0; n <= MAX_ORDER; n++) {
      for (const [letter, value] of [
        ["a", characteristicA(n, q)!],
        ["b", n === 0 ? null : characteristicB(n, q)!],
      ] as const) {
        if (value === null) continue;
        const which = letter === "a" ? (n % 2 === 0 ? 1 : 0) : n % 2 === 0 ? 2 : 3;
        const slope = 1e-6 * (1 + Math.abs(value));
        halfPeriodExtended(value + slope, q, half);
        const above = half[which]!;
        halfPeriodExtended(value - slope, q, half);
        const derivative = (above - half[which]!) / (2 * slope);
        halfPeriodExtended(value, q, half);
        const error = Math.abs(half[which]! / derivative) / (1 + Math.abs(value));
        deviations.push({ at: `${letter}_${n}(${q})`, error });
      }
    }
  }
  expectWithin(5e-15, deviations);
});

test("the count of even values below a steps at each of them", () => {
  const q = 7;
  for (let k = 0; k <= 4; k++) {
    const value = characteristicA(2 * k, q)!;
    expect(evenCharacteristicValuesBelow(value + 1e-9, q)).toBe(k + 1);
    expect(evenCharacteristicValuesBelow(value - 1e-9, q)).toBe(k);
  }
});

test("orders and q outside the table are null", () => {
  expect(characteristicA(-1, 1)).toBeNull();
  expect(characteristicA(1.5, 1)).toBeNull();
  expect(characteristicB(0, 1)).toBeNull();
  expect(characteristicA(MAX_ORDER + 1, 1)).toBeNull();
  expect(characteristicB(1, MAX_CHARACTERISTIC_Q * 1.01)).toBeNull();
  expect(characteristicA(0, Number.NaN)).toBeNull();
  expect(characteristicB(3, 0)).toBe(9);
});
