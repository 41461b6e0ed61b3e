import { expect, test } from "vitest";
import { phaseMean } from "../../../services/physics/transmission/phase-mean.ts";

/** Mean of exp(c cos 2π(turn − t0)) is the modified Bessel function I_0(c) (DLMF 10.32.1); A&S table 9.8 at c = 1 and 5. */
test.each([
  [1, 1.2660658777520084],
  [5, 27.239871823604442],
])("the mean of exp(c cos φ), c = %s, is I_0(c), within the bound, at any place of the hump", (c, i0) => {
  for (const place of [0, 0.21, 0.5, 0.83]) {
    for (const tolerance of [1e-2, 1e-5, 1e-9]) {
      const { mean, errorBound } = phaseMean(
        (turn) => Math.exp(c * Math.cos(2 * Math.PI * (turn - place))),
        tolerance * i0,
        1024,
        true,
      );
      expect(errorBound).toBeLessThanOrEqual(tolerance * i0);
      expect(Math.abs(mean - i0)).toBeLessThanOrEqual(errorBound + 1e-13 * i0);
    }
  }
});

test("a narrow hump takes more phases, and the bound still holds", () => {
  // A Gaussian of standard deviation 0.01 turns: mean 0.01 sqrt(2π).
  const exact = 0.01 * Math.sqrt(2 * Math.PI);
  const { mean, errorBound, phases } = phaseMean(
    (turn) => Math.exp(-0.5 * ((turn - 0.3) / 0.01) ** 2),
    1e-6,
    1024,
    true,
  );
  expect(phases).toBeGreaterThanOrEqual(128);
  expect(Math.abs(mean - exact)).toBeLessThanOrEqual(errorBound + 1e-15);
});

test("a function that ends elsewhere than it began is integrated as well as a periodic one", () => {
  const { mean, phases } = phaseMean((turn) => turn + Math.cos(2 * Math.PI * turn), 1e-6, 1024, false);
  expect(Math.abs(mean - 0.5)).toBeLessThan(1e-12);
  expect(phases).toBeLessThanOrEqual(32);
});

test("when the phases do not suffice the bound says so", () => {
  expect(phaseMean((turn) => (turn < 0.3 ? 1 : 0), 1e-6, 64, true).errorBound).toBeGreaterThan(1e-6);
});
