import fc from "fast-check";
import { expect, test } from "vitest";
import { polygonMass } from "../../../services/physics/transmission/polygon-mass.ts";
import { stripMass } from "../../../services/physics/transmission/strip-mass.ts";
import {
  addToHull,
  newSymmetricHull,
  type SymmetricHull,
} from "../../../services/physics/transmission/symmetric-hull.ts";
import { expectWithin, relativeError } from "../../measured-bound.ts";
import { logUniform } from "../settings.ts";

function hullOf(...points: readonly (readonly [number, number])[]): SymmetricHull {
  const hull = newSymmetricHull();
  for (const [x, y] of points) addToHull(hull, Float64Array.of(x, y), 0);
  return hull;
}

test("the mass of a strip is that of Abramowitz and Stegun, table 26.1: 2Φ(x) − 1", () => {
  const table = [
    [0.5, 2 * 0.691462461274013 - 1],
    [1, 2 * 0.841344746068543 - 1],
    [2, 2 * 0.977249868051821 - 1],
    [3, 2 * 0.99865010196837 - 1],
  ] as const;
  expectWithin(
    2e-14,
    table.map(([x, mass]) => ({ at: `${x}`, error: relativeError(stripMass(x), mass) })),
  );
  expect(stripMass(9)).toBe(1);
});

test("a rectangle has the product of two strips, at any turn and any spread", () => {
  fc.assert(
    fc.property(
      logUniform(1e-3, 20),
      logUniform(1e-3, 20),
      fc.double({ min: 0, max: 3, noNaN: true }),
      (w, h, turn) => {
        const [c, s] = [Math.cos(turn), Math.sin(turn)];
        const hull = hullOf([c, s], [-s, c]);
        // u = B g with B = rotation · diag(1/w, 1/h): |v·u| <= 1 becomes |g1| <= w and |g2| <= h.
        const mass = polygonMass(hull, c / w, -s / h, s / w, c / h);
        const expected = stripMass(w) * stripMass(h);
        expect(Math.abs(mass - expected)).toBeLessThanOrEqual(2e-8 * expected + 1e-12);
      },
    ),
  );
});

test("a beam without spread in one direction sees a strip", () => {
  const hull = hullOf([1, 0.3], [0.5, 2], [0.2, -0.7]);
  expect(polygonMass(hull, 1.6, 0, 0, 0)).toBeCloseTo(stripMass(1 / 1.6), 14);
});

test("a spread of next to nothing is the limit of none, without overflow", () => {
  const hull = hullOf([1, 0.3], [0.5, 2], [0.2, -0.7]);
  for (const spread of [1e-12, 1e-100, 1e-200, 5e-324]) {
    expect(polygonMass(hull, 1.6, 0, 0, spread)).toBeCloseTo(stripMass(1 / 1.6), 9);
  }
});

test("a polygon of many sides has the mass of its circle, 1 − exp(−r²/2)", () => {
  const sides = 4000;
  const points = Array.from({ length: sides }, (_, i) => {
    const angle = (Math.PI * i) / sides;
    return [Math.cos(angle), Math.sin(angle)] as const;
  });
  // The sides lie outside the circle by (π/8000)²/3 of r² in the mean: 5e-8 where the mass is proportional to r².
  expectWithin(
    8e-8,
    [0.1, 1, 3].map((radius) => {
      const mass = polygonMass(hullOf(...points), 1 / radius, 0, 0, 1 / radius);
      return { at: `r ${radius}`, error: relativeError(mass, -Math.expm1(-0.5 * radius * radius)) };
    }),
  );
});
