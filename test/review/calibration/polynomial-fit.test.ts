import fc from "fast-check";
import { describe, expect, it, test } from "vitest";
import { fitPolynomial, type PolynomialFit } from "../../../services/review/calibration/polynomial-fit.ts";
import { studentT } from "../../../services/review/calibration/student-t.ts";
import { expectWithin, relativeError } from "../../measured-bound.ts";
import { CALIBRATION } from "../../reference/calibration.ts";

function fitted(points: readonly (readonly [number, number, number?])[], degree: 1 | 2): PolynomialFit {
  const fit = fitPolynomial(
    points.map(([at, value, weight = 1]) => ({ at, value, weight })),
    degree,
  );
  if (typeof fit === "string") throw new Error(fit);
  return fit;
}

// Certified values of NIST StRD from memory; generate-calibration.py recomputed each in exact rational arithmetic.
describe.each([
  // An offset of 0.26 among values of 1000 cannot keep more than twelve digits.
  ["Norris", 1e-11, 2e-13],
  ["Pontius", 2e-11, 1e-12],
] as const)("the NIST StRD set %s", (name, ofCoefficients, ofUncertainties) => {
  const set = CALIBRATION.sets[name];
  const fit = fitted(
    set.x.map((x, index) => [x, set.y[index]!] as const),
    set.degree,
  );

  it("has its certified coefficients, standard deviations and residual standard deviation", () => {
    expectWithin(
      ofCoefficients,
      set.coefficients.map((certified, power) => ({
        at: `power ${power}`,
        error: relativeError(fit.coefficients[power]!.value, certified),
      })),
    );
    expectWithin(ofUncertainties, [
      ...set.standardUncertainties.map((certified, power) => ({
        at: `uncertainty ${power}`,
        error: relativeError(fit.coefficients[power]!.standardUncertainty!, certified),
      })),
      {
        at: "residual standard deviation",
        error: relativeError(fit.residualStandardDeviation!, set.residualStandardDeviation),
      },
    ]);
  });

  it("has the leverage and influence that exact fits without a point give", () => {
    expectWithin(
      1e-10,
      set.influences.flatMap(([index, residual, leverage, studentized, cook]) => {
        const found = fit.influences[index]!;
        return [
          { at: `residual ${index}`, error: relativeError(found.residual, residual) },
          { at: `leverage ${index}`, error: relativeError(found.leverage, leverage) },
          { at: `studentized ${index}`, error: relativeError(found.studentizedResidual!, studentized) },
          { at: `Cook ${index}`, error: relativeError(found.cookDistance!, cook) },
        ];
      }),
    );
  });

  it("predicts with the exact uncertainty, of the line and of one more point", () => {
    const { at, value, standardUncertainty, ofOneMore } = set.prediction;
    const found = fit.predict(at, 0.95, 1);
    expect(relativeError(found.value, value)).toBeLessThan(1e-11);
    expect(relativeError(found.standardUncertainty!, standardUncertainty)).toBeLessThan(1e-11);
    const t = studentT(0.95, fit.degreesOfFreedom);
    expect(relativeError(found.halfInterval!, t * ofOneMore)).toBeLessThan(1e-11);
  });
});

const points = fc.uniqueArray(fc.integer({ min: 1, max: 2000 }), { minLength: 6, maxLength: 20 });

test("leverages lie between 0 and 1 and sum to the number of coefficients", () => {
  fc.assert(
    fc.property(points, fc.constantFrom(1, 2), fc.integer(), (xs, degree, seed) => {
      const fit = fitted(
        xs.map((x, index) => [x, Math.sin(x + seed + index), 1 + (index % 3)] as const),
        degree === 1 ? 1 : 2,
      );
      const leverages = fit.influences.map(({ leverage }) => leverage);
      expect(leverages.reduce((sum, leverage) => sum + leverage, 0)).toBeCloseTo(degree + 1, 9);
      for (const leverage of leverages) expect(leverage).toBeGreaterThan(0);
    }),
  );
});

test("a point of weight 4 says as much as four of weight 1", () => {
  const xs = [10, 200, 450, 800, 1000];
  const value = (x: number) => 0.01 + 1e-4 * x + 0.01 * Math.sin(x);
  const heavy = fitted(
    xs.map((x, index) => [x, value(x), index === 2 ? 4 : 1] as const),
    1,
  );
  const many = fitted(
    [...xs, 450, 450, 450].map((x) => [x, value(x)] as const),
    1,
  );
  for (const power of [0, 1]) {
    expect(relativeError(heavy.coefficients[power]!.value, many.coefficients[power]!.value)).toBeLessThan(
      1e-12,
    );
  }
});

test("points on a line leave no scatter and no influence to tell", () => {
  const fit = fitted(
    [1, 2, 3, 4].map((x) => [x, 2 * x] as const),
    1,
  );
  expect(fit.coefficients[1]!.value).toBeCloseTo(2, 13);
  expect(fit.residualStandardDeviation!).toBeLessThan(1e-14);
});

test("as many points as coefficients leave no scatter: no uncertainty, and leverage 1", () => {
  const fit = fitted(
    [
      [100, 0.1],
      [900, 0.3],
    ],
    1,
  );
  expect(fit.degreesOfFreedom).toBe(0);
  expect(fit.residualStandardDeviation).toBeNull();
  for (const { standardUncertainty } of fit.coefficients) expect(standardUncertainty).toBeNull();
  for (const { leverage, cookDistance } of fit.influences) {
    expect(leverage).toBeCloseTo(1, 12);
    expect(cookDistance).toBeNull();
  }
  expect(fit.predict(500, 0.95, 1)).toMatchObject({ standardUncertainty: null, halfInterval: null });
});

test("too few points, or too few different ones, are no line", () => {
  const at = (...xs: number[]) => xs.map((x) => ({ at: x, value: 1, weight: 1 }));
  expect(fitPolynomial(at(5), 1)).toBe("too-few-points");
  expect(fitPolynomial([], 1)).toBe("too-few-points");
  expect(fitPolynomial(at(5, 5, 5), 1)).toBe("too-few-different-points");
  expect(fitPolynomial(at(5, 9, 5, 9), 2)).toBe("too-few-different-points");
});
