import { expect, test } from "vitest";
import { ELEMENTARY_CHARGE } from "../../services/physics/constants.ts";
import { effectiveFieldRadius } from "../../services/physics/effective-field-radius.ts";
import { APEX_RATIO } from "../../services/physics/first-region.ts";
import { fieldAt, peakVolts, positiveShare } from "../../services/physics/rod-potential.ts";
import { type Deviation, expectWithin, relativeError } from "../measured-bound.ts";
import { PASSBANDS } from "../reference/tables.ts";

test("at the apex a rod of the x pair is positive for 55.4 % of a cycle (trade saying of three quarters, recomputed)", () => {
  expect((100 * positiveShare(APEX_RATIO, 1)).toFixed(1)).toBe("55.4");
  expect((100 * positiveShare(-APEX_RATIO, 1)).toFixed(1)).toBe("44.6");
  // Three quarters would take U/V = cos 45°, four times what the apex allows.
  expect(positiveShare(Math.SQRT1_2, 1)).toBeCloseTo(0.75, 14);
  expect(Math.SQRT1_2 / APEX_RATIO).toBeGreaterThan(4);
});

test("the share counted over a cycle is the share computed", () => {
  for (const [dc, rf] of [
    [0, 100],
    [20, 100],
    [-55, 100],
    [99, 100],
    [-30, -100],
  ] as const) {
    const count = 100_000;
    let positive = 0;
    for (let k = 0; k < count; k++) if (dc - rf * Math.cos((2 * Math.PI * (k + 0.5)) / count) > 0) positive++;
    expect(Math.abs(positive / count - positiveShare(dc, rf))).toBeLessThan(2 / count);
  }
  expect(positiveShare(5, 3)).toBe(1);
  expect(positiveShare(-5, 3)).toBe(0);
  expect(positiveShare(0, 0)).toBe(0);
  expect(peakVolts(-5, 30)).toBe(35);
});

test("the field is the slope of the potential and has no divergence", () => {
  const step = 1e-7;
  const at = (x: number, y: number) => fieldAt(x, y, 0.4, 30, 200, 0.004, 2);
  const [x, y] = [0.001, -0.002];
  const there = at(x, y);
  const byX = (at(x + step, y).potential - at(x - step, y).potential) / (2 * step);
  const byY = (at(x, y + step).potential - at(x, y - step).potential) / (2 * step);
  expect(relativeError(there.fieldX, -byX)).toBeLessThan(1e-8);
  expect(relativeError(there.fieldY, -byY)).toBeLessThan(1e-8);
  expect(there.fieldX / x + there.fieldY / y).toBeCloseTo(0, 6);
  expect(relativeError(there.forceX, 2 * ELEMENTARY_CHARGE * there.fieldX)).toBeLessThan(1e-15);
  // At a rod the potential is that of the rod.
  expect(fieldAt(0.004, 0, Math.PI, 30, 200, 0.004, 1).potential).toBeCloseTo(230, 10);
  expect(fieldAt(0, 0.004, Math.PI, 30, 200, 0.004, 1).potential).toBeCloseTo(-230, 10);
});

test("volts, frequency and centre of a window give back its field radius (test/reference, passbands)", () => {
  const deviations = PASSBANDS.settings.map(([r0, f, dc, rf, , , , , , centre]): Deviation => {
    return {
      at: `${r0} ${f} ${dc} ${rf}`,
      error: relativeError(effectiveFieldRadius(centre, dc, rf, f)!, r0),
    };
  });
  expectWithin(1e-14, deviations);
  expect(effectiveFieldRadius(500, 0, 800, 1e6)).toBeNull();
  expect(effectiveFieldRadius(500, 200, 800, 1e6)).toBeNull();
  expect(effectiveFieldRadius(500, 0, 0, 1e6)).toBeNull();
});
