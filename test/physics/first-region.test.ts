import { expect, test } from "vitest";
import { characteristicA, characteristicB } from "../../services/physics/characteristic-values.ts";
import {
  APEX_A,
  APEX_Q,
  APEX_Q_REST,
  APEX_RATIO,
  APEX_RATIO_REST,
  apexMarginOf,
  RESOLUTION_CONSTANT,
  RF_ONLY_LIMIT_Q,
} from "../../services/physics/first-region.ts";
import { expectWithin, relativeError } from "../measured-bound.ts";
import { STABILITY_REGIONS } from "../reference/tables.ts";
import { FIRST_REGION } from "../reference/worked-examples.ts";

const { region_I: first } = STABILITY_REGIONS.headline;

test("apex and RF-only limit are the doubles nearest to the 18-digit reference", () => {
  expect(APEX_Q).toBe(Number(first.apex_q));
  expect(APEX_A).toBe(Number(first.apex_a));
  expect(APEX_RATIO).toBe(Number(first.apex_U_over_V));
  expect(RF_ONLY_LIMIT_Q).toBe(Number(first.q_limit_rf_only_a0));
  expect(RESOLUTION_CONSTANT).toBe(Number(first.resolution_constant_c));
});

test("double and rest together give all 18 digits of the apex", () => {
  const SCALE = 10n ** 40n;
  const exact = (value: number): bigint => {
    // Every double is a whole number of 2^-200 here, so the product with 10^40 is exact in integers.
    let numerator = value;
    let halvings = 0n;
    while (!Number.isInteger(numerator)) {
      numerator *= 2;
      halvings++;
    }
    return (BigInt(numerator) * SCALE) / 2n ** halvings;
  };
  const decimal = (text: string): bigint => BigInt(text.replace("0.", "")) * 10n ** (40n - 18n);
  const unit = 10n ** (40n - 18n);
  for (const [high, rest, text] of [
    [APEX_Q, APEX_Q_REST, first.apex_q],
    [APEX_RATIO, APEX_RATIO_REST, first.apex_U_over_V],
  ] as const) {
    const difference = exact(high) + exact(rest) - decimal(text);
    expect(difference < unit && difference > -unit).toBe(true);
  }
});

test("the constants round to the handbook's", () => {
  expect(Number(APEX_Q.toFixed(3))).toBe(FIRST_REGION.apexQ);
  expect(Number(APEX_A.toFixed(3))).toBe(FIRST_REGION.apexA);
  expect(Number(RF_ONLY_LIMIT_Q.toFixed(3))).toBe(FIRST_REGION.rfOnlyQ);
});

test("both boundaries and their slopes meet at the apex", () => {
  const a0 = (q: number) => characteristicA(0, q)!;
  const b1 = (q: number) => characteristicB(1, q)!;
  const step = 1e-5;
  const slope = (curve: (q: number) => number) =>
    (8 * (curve(APEX_Q + step) - curve(APEX_Q - step)) -
      (curve(APEX_Q + 2 * step) - curve(APEX_Q - 2 * step))) /
    (12 * step);
  expectWithin(2e-15, [
    { at: "b_1", error: Math.abs(b1(APEX_Q) - APEX_A) },
    { at: "-a_0", error: Math.abs(-a0(APEX_Q) - APEX_A) },
    { at: "b_1 at the limit", error: Math.abs(b1(RF_ONLY_LIMIT_Q)) },
  ]);
  const s1 = slope(b1);
  const s0 = -slope(a0);
  expectWithin(5e-11, [
    { at: "slope of b_1", error: relativeError(s1, Number(first.slope_b1_at_apex)) },
    { at: "slope of -a_0", error: relativeError(s0, Number(first.slope_minus_a0_at_apex)) },
    {
      at: "resolution constant",
      error: relativeError(
        1 / (2 * (1 / (2 * APEX_RATIO - s1) + 1 / (s0 - 2 * APEX_RATIO))),
        RESOLUTION_CONSTANT,
      ),
    },
  ]);
});

test("the apex margin is signed, relative and exact close by", () => {
  expect(apexMarginOf(0)).toBe(1);
  expect(apexMarginOf(APEX_RATIO * 1.5)).toBeCloseTo(-0.5, 14);
  const closest = APEX_RATIO * (1 - Number.EPSILON);
  expect(apexMarginOf(closest)).toBeGreaterThan(0);
  expect(apexMarginOf(APEX_RATIO)).toBeCloseTo(APEX_RATIO_REST / APEX_RATIO, 25);
});
