import { expect, test } from "vitest";
import { characteristicA, characteristicB } from "../../../services/physics/characteristic-values.ts";
import {
  type CharacteristicCurve,
  CROSSING_ORDER_MAX,
  CROSSING_Q_MAX,
  crossingShift,
  scanLineCrossing,
} from "../../../services/physics/regions/scan-line-crossing.ts";
import { type Deviation, expectWithin, relativeError } from "../../measured-bound.ts";

const CURVES: readonly CharacteristicCurve[] = Array.from({ length: CROSSING_ORDER_MAX + 1 }, (_, order) => [
  { kind: "a", order } as const,
  ...(order > 0 ? [{ kind: "b", order } as const] : []),
]).flat();

function characteristicValue({ kind, order }: CharacteristicCurve, q: number): number {
  return kind === "a" ? characteristicA(order, q)! : characteristicB(order, q)!;
}

test("crossings lie on the characteristic curve, and exist exactly where the curve falls below the line in the domain", () => {
  const deviations: Deviation[] = [];
  for (const curve of CURVES) {
    for (let i = 0; i <= 300; i++) {
      const sigma = -1.98 + i * 0.0133;
      const found = scanLineCrossing(curve, sigma, 3, 100);
      const startsAbove = curve.order > 0 || sigma < 0;
      const exists = startsAbove && characteristicValue(curve, CROSSING_Q_MAX) / CROSSING_Q_MAX <= sigma;
      expect(found.kind, `${curve.kind}_${curve.order}, slope ${sigma}`).toBe(exists ? "crossing" : "none");
      if (found.kind !== "crossing") continue;
      const value = characteristicValue(curve, found.q);
      const error = Math.abs(value - sigma * found.q) / Math.max(1, Math.abs(value));
      deviations.push({ at: `${curve.kind}_${curve.order}, slope ${sigma}`, error });
    }
  }
  expect(deviations.length).toBeGreaterThan(1000);
  expectWithin(1e-14, deviations);
});

test("c(q)/q falls for every curve, so that no line meets a curve twice", () => {
  for (const curve of CURVES) {
    let before = Number.POSITIVE_INFINITY;
    for (let q = 0.01; q <= CROSSING_Q_MAX; q += 0.01) {
      const quotient = characteristicValue(curve, q) / q;
      expect(quotient).toBeLessThan(before);
      before = quotient;
    }
  }
});

test("the start of the search changes its cost and nothing else", () => {
  for (const curve of CURVES) {
    const sigma = curve.order === 0 ? -0.3 : 0.9;
    const found = [1e-6, 0.5, 3, 7, 11.99].map((start) => scanLineCrossing(curve, sigma, start, 100));
    const deviations: Deviation[] = found.map((one) => {
      const reference = found[0]!;
      if (one.kind !== reference.kind) throw new Error(`${one.kind} and ${reference.kind}`);
      const same = one.kind !== "crossing" || reference.kind !== "crossing";
      return { at: `${curve.kind}_${curve.order}`, error: same ? 0 : relativeError(one.q, reference.q) };
    });
    expectWithin(1e-14, deviations);
  }
});

test("a budget that is too small is said, not overstepped", () => {
  const found = scanLineCrossing({ kind: "a", order: 1 }, 0.004, 1, 2);
  expect(found).toEqual({ kind: "not-converged", steps: 2 });
});

test("how a crossing moves with the line agrees with differences", () => {
  const deviations: Deviation[] = [];
  for (const curve of CURVES) {
    const sigma = curve.order === 0 ? -0.3 : 0.9;
    const at = (slope: number) => {
      const found = scanLineCrossing(curve, slope, 3, 100);
      return found.kind === "crossing" ? found.q : null;
    };
    const middle = at(sigma);
    if (middle === null) continue;
    const h = 1e-4;
    // Fourth-order differences leave about h⁴ and rounding over h.
    const difference =
      (8 * (at(sigma + h)! - at(sigma - h)!) - (at(sigma + 2 * h)! - at(sigma - 2 * h)!)) / (12 * h);
    const error = relativeError(crossingShift(curve, middle, sigma), difference);
    deviations.push({ at: `${curve.kind}_${curve.order}`, error });
  }
  expect(deviations.length).toBeGreaterThan(5);
  expectWithin(2e-11, deviations);
});
