import fc from "fast-check";
import { expect, test } from "vitest";
import { APEX_RATIO, RESOLUTION_CONSTANT, RF_ONLY_LIMIT_Q } from "../../services/physics/first-region.ts";
import { halfPeriod } from "../../services/physics/half-period.ts";
import { aOf, mzOf, qOf } from "../../services/physics/mathieu-parameters.ts";
import { passbandOf, scanLineEdges, type WindowEdges } from "../../services/physics/passband.ts";
import { pointStability } from "../../services/physics/stability.ts";
import { type Deviation, expectWithin, relativeError } from "../measured-bound.ts";
import { PASSBANDS } from "../reference/tables.ts";
import { NEAR_APEX } from "../reference/worked-examples.ts";
import { anyField, anyVolts, logUniform } from "./settings.ts";

function windowAt(ratio: number): WindowEdges {
  const edges = scanLineEdges(ratio);
  if (edges.kind !== "window") throw new Error(`no window at U/V ${ratio}: ${edges.kind}`);
  return edges;
}

test("the twenty reference settings, from R 1.6 to 5000", () => {
  const edges: Deviation[] = [];
  const mz: Deviation[] = [];
  const widths: Deviation[] = [];
  for (const row of PASSBANDS.settings) {
    const [fieldRadius, frequency, U, V, , qLow, qHigh, mzLow, mzHigh, centre, width, resolution] = row;
    const answer = passbandOf(U, V, { fieldRadius, frequency });
    if (answer.kind !== "window") throw new Error(`no window at U ${U}, V ${V}`);
    const { passband } = answer;
    const at = `U ${U}, V ${V}`;
    edges.push({ at, error: relativeError(passband.qLow!, qLow) });
    edges.push({ at, error: relativeError(passband.qHigh, qHigh) });
    mz.push({ at, error: relativeError(passband.mzLow, mzLow) });
    mz.push({ at, error: relativeError(passband.mzHigh!, mzHigh) });
    mz.push({ at, error: relativeError(passband.mzCentre!, centre) });
    // U and V are printed as decimals; their doubles alone move the width by up to 1e-16 R, hence the division.
    widths.push({ at, error: relativeError(passband.mzWidth!, width) / resolution });
    widths.push({ at, error: relativeError(passband.resolution!, resolution) / resolution });
  }
  expectWithin(1e-15, edges);
  expectWithin(2e-15, mz);
  expectWithin(1e-15, widths);
});

test("settings above the apex pass nothing", () => {
  for (const [fieldRadius, frequency, U, V] of PASSBANDS.no_passband_r0_f_U_V) {
    expect(passbandOf(U, V, { fieldRadius, frequency })).toEqual({ kind: "empty", reason: "above-apex" });
  }
  expect(scanLineEdges(APEX_RATIO * (1 + 1e-15))).toEqual({ kind: "empty", reason: "above-apex" });
  expect(scanLineEdges(-0.2)).toEqual({ kind: "empty", reason: "above-apex" });
});

test("the resolution of twenty scan lines, and how far the textbook's rule is from it", () => {
  const exact: Deviation[] = [];
  for (const [ratio, resolution, textbook, , rule] of PASSBANDS.asymptotic_table) {
    const { qLow, qHigh, qWidth } = windowAt(ratio);
    // A printed ratio is rounded to a double: 1e-17 against a margin of 0.126/R.
    exact.push({
      at: `U/V ${ratio}`,
      error: relativeError((qLow + qHigh) / (2 * qWidth), resolution) / resolution,
    });
    expect(relativeError(0.126 / (0.16784 - ratio), textbook)).toBeLessThan(1e-9);
    expect(relativeError(RESOLUTION_CONSTANT / (APEX_RATIO - ratio), rule)).toBeLessThan(1e-9);
  }
  expectWithin(1e-15, exact);
});

test("worked examples of the resolution rule, with the centre away from the apex", () => {
  for (const example of NEAR_APEX) {
    const { qLow, qHigh, qWidth } = windowAt(example.ratio);
    const resolution = (qLow + qHigh) / (2 * qWidth);
    expect(resolution.toFixed(example.decimals)).toBe(example.resolution.toFixed(example.decimals));
    if ("qLow" in example) {
      expect(qLow.toFixed(6)).toBe(example.qLow.toFixed(6));
      expect(qHigh.toFixed(6)).toBe(example.qHigh.toFixed(6));
      expect(((2 * qLow * qHigh) / (qLow + qHigh)).toFixed(3)).toBe("0.701");
    }
  }
});

test("two thousand and more scan lines are stable just inside both edges and unstable just outside", () => {
  const lines = 2500;
  for (let i = 1; i <= lines; i++) {
    // Half of the lines uniform in U/V, half crowding towards the apex, the last at 1 − 1e-6 of it.
    const share = i % 2 === 0 ? i / (lines + 1) : 1 - Math.exp((-i / (lines - 1)) * Math.log(1e6));
    const ratio = APEX_RATIO * Math.min(share, 1 - 1e-6);
    const { qLow, qHigh, qWidth, steps } = windowAt(ratio);
    expect(steps).toBeLessThanOrEqual(4);
    const step = Math.min(1e-10 * qLow, 1e-4 * qWidth);
    const at = (q: number) => pointStability(2 * ratio * q, q)!;
    expect(at(qLow + step).stable, `above q_low, U/V ${ratio}`).toBe(true);
    expect(at(qHigh - step).stable, `below q_high, U/V ${ratio}`).toBe(true);
    expect(at(qLow - step).lostTo, `below q_low, U/V ${ratio}`).toBe("y");
    expect(at(qHigh + step).lostTo, `above q_high, U/V ${ratio}`).toBe("x");
  }
});

test("on the edges the half-trace is 1 in y and −1 in x, by a kernel that the solver does not use", () => {
  const half = new Float64Array(4);
  const deviations: Deviation[] = [];
  fc.assert(
    fc.property(logUniform(1e-6, 1), fc.boolean(), (small, nearApex) => {
      const ratio = APEX_RATIO * (nearApex ? 1 - small * 0.999999 : small * 0.999999);
      const { qLow, qHigh } = windowAt(ratio);
      halfPeriod(-2 * ratio * qLow, -qLow, half);
      const y = Math.abs(half[0]! * half[3]! + half[1]! * half[2]! - 1);
      halfPeriod(2 * ratio * qHigh, qHigh, half);
      const x = Math.abs(half[0]! * half[3]! + half[1]! * half[2]! + 1);
      deviations.push({ at: `y edge, U/V ${ratio}`, error: y }, { at: `x edge, U/V ${ratio}`, error: x });
      expect(Math.max(x, y)).toBeLessThan(1e-14);
    }),
    { numRuns: 1000, seed: 706 },
  );
  expectWithin(1e-14, deviations);
});

test("the width of a nearly closed window follows the exact constant", () => {
  // R (L − U/V) = c − 0.265 (L − U/V) + …: the limit c of the 50-digit reference, approached linearly.
  for (const margin of [1e-5, 1e-7, 1e-9, 1e-11]) {
    const ratio = APEX_RATIO - margin;
    const exactMargin = APEX_RATIO - ratio;
    const { qLow, qHigh, qWidth } = windowAt(ratio);
    const product = ((qLow + qHigh) / (2 * qWidth)) * exactMargin;
    expect(relativeError(product, RESOLUTION_CONSTANT - 0.265 * exactMargin)).toBeLessThan(
      1e-6 * margin * 1e5 + 1e-6,
    );
    expect(relativeError(qWidth, qHigh - qLow)).toBeLessThan(1e-15 / margin);
  }
});

test("neighbouring doubles of U narrow the window by equal steps, though their U/V round to the same double", () => {
  const rf = 2.9;
  const lastPlace = 2 ** -54;
  const first = Math.round((rf * (APEX_RATIO - 1.264e-8)) / lastPlace) * lastPlace;
  const widths = Array.from({ length: 201 }, (_, i) => {
    const answer = passbandOf(first + i * lastPlace, rf, { fieldRadius: 0.004, frequency: 1.2e6 });
    if (answer.kind !== "window") throw new Error(answer.kind);
    return answer.passband.mzWidth!;
  });
  const ratios = new Set(widths.map((_, i) => (first + i * lastPlace) / rf));
  expect(ratios.size).toBeLessThan(widths.length);
  const mean = (widths[0]! - widths.at(-1)!) / 200;
  expectWithin(
    1e-5,
    widths.slice(1).map((width, i) => ({ at: `step ${i}`, error: relativeError(widths[i]! - width, mean) })),
  );
});

test("RF alone is unbounded above, no RF passes nothing", () => {
  const field = { fieldRadius: 0.004, frequency: 1.2e6 };
  const open = passbandOf(0, 800, field);
  expect(open).toMatchObject({
    kind: "high-pass",
    passband: { mzHigh: null, mzWidth: null, resolution: null, qLow: null, qHigh: RF_ONLY_LIMIT_Q },
  });
  if (open.kind === "high-pass") expect(open.passband.mzLow).toBe(mzOf(RF_ONLY_LIMIT_Q, 800, field));
  expect(passbandOf(100, 0, field)).toEqual({ kind: "empty", reason: "no-rf" });
});

test("reversing DC or RF changes no edge", () => {
  fc.assert(
    fc.property(anyVolts, logUniform(1e-6, 0.9999), anyField, (volts, share, field) => {
      const dc = volts * APEX_RATIO * share;
      expect(passbandOf(-dc, volts, field)).toEqual(passbandOf(dc, volts, field));
      expect(passbandOf(dc, -volts, field)).toEqual(passbandOf(dc, volts, field));
    }),
  );
});

test("raising U and V together moves the window up in proportion and keeps its resolution", () => {
  fc.assert(
    fc.property(anyVolts, logUniform(1e-6, 0.99999), anyField, (volts, share, field) => {
      const dc = volts * APEX_RATIO * share;
      const one = passbandOf(dc, volts, field);
      const four = passbandOf(4 * dc, 4 * volts, field);
      if (one.kind !== "window" || four.kind !== "window") throw new Error("no window");
      expect(relativeError(four.passband.mzLow, 4 * one.passband.mzLow)).toBeLessThan(1e-15);
      expect(relativeError(four.passband.mzWidth!, 4 * one.passband.mzWidth!)).toBeLessThan(1e-15);
      expect(four.passband.resolution).toBe(one.passband.resolution);
    }),
  );
});

test("ions at the edges of a drive have the edges' q and lie on its scan line", () => {
  fc.assert(
    fc.property(anyVolts, logUniform(1e-4, 0.99999), anyField, (volts, share, field) => {
      const dc = volts * APEX_RATIO * share;
      const answer = passbandOf(dc, volts, field);
      if (answer.kind !== "window") throw new Error("no window");
      const { mzLow, mzHigh, qLow, qHigh } = answer.passband;
      expect(relativeError(qOf(mzLow, volts, field), qHigh)).toBeLessThan(1e-15);
      expect(relativeError(qOf(mzHigh!, volts, field), qLow!)).toBeLessThan(1e-15);
      expect(relativeError(aOf(mzLow, dc, field), (2 * dc * qHigh) / volts)).toBeLessThan(2e-15);
    }),
  );
});

test("a budget that is too small is an answer that states it", () => {
  expect(scanLineEdges(0.1, 1)).toEqual({ kind: "not-converged", steps: 1 });
  expect(scanLineEdges(0.01, 0)).toEqual({ kind: "not-converged", steps: 0 });
  const field = { fieldRadius: 0.004, frequency: 1.2e6 };
  expect(passbandOf(50, 500, field, 1)).toEqual({ kind: "not-converged", steps: 1 });
  expect(scanLineEdges(Number.NaN).kind).toBe("empty");
});
