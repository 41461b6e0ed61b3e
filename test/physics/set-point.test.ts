import fc from "fast-check";
import { expect, test } from "vitest";
import { APEX_RATIO, RESOLUTION_CONSTANT } from "../../services/physics/first-region.ts";
import { passbandOf, scanLineEdges } from "../../services/physics/passband.ts";
import {
  RESOLUTION_INFIMUM,
  RESOLUTION_MAXIMUM,
  ratioForResolution,
  setPointOf,
} from "../../services/physics/set-point.ts";
import { type Deviation, expectWithin, relativeError } from "../measured-bound.ts";
import { PASSBANDS } from "../reference/tables.ts";
import { anyField, anyMz, anyResolution } from "./settings.ts";

function solved(resolution: number) {
  const answer = ratioForResolution(resolution);
  if (answer.kind !== "ratio") throw new Error(`no ratio for R ${resolution}: ${answer.kind}`);
  return answer;
}

test("the twenty reference windows lead back to their volts", () => {
  const volts: Deviation[] = [];
  const edges: Deviation[] = [];
  for (const row of PASSBANDS.settings) {
    const [fieldRadius, frequency, U, V, ratio, qLow, qHigh, , , centre, width] = row;
    const point = setPointOf(centre, width, { fieldRadius, frequency });
    if (point.kind !== "set-point") throw new Error(`no set point at m/z ${centre}`);
    const at = `U ${U}, V ${V}`;
    volts.push(
      { at, error: relativeError(point.dcVolts, U) },
      { at, error: relativeError(point.rfVolts, V) },
    );
    edges.push({ at, error: relativeError(point.ratio, ratio) });
    edges.push({ at, error: relativeError(point.edges.qLow, qLow) });
    edges.push({ at, error: relativeError(point.edges.qHigh, qHigh) });
  }
  expectWithin(2e-15, volts);
  expectWithin(2e-15, edges);
});

test("the wanted window comes back from the drive at every scale, up to R 1e5", () => {
  fc.assert(
    fc.property(anyMz, anyResolution, anyField, (mzCentre, resolution, field) => {
      const mzWidth = mzCentre / resolution;
      const point = setPointOf(mzCentre, mzWidth, field);
      if (point.kind !== "set-point") throw new Error(point.kind);
      const answer = passbandOf(point.dcVolts, point.rfVolts, field);
      if (answer.kind !== "window") throw new Error(answer.kind);
      // The volts are doubles: half a unit of their last place moves the width by 2e-16 R, the edges hardly at all.
      expect(relativeError(answer.passband.mzWidth!, mzWidth)).toBeLessThan(1e-15 * (4 + resolution));
      expect(relativeError(answer.passband.mzLow, mzCentre - mzWidth / 2)).toBeLessThan(1e-10);
      expect(relativeError(answer.passband.mzCentre!, mzCentre)).toBeLessThan(resolution < 1 ? 1e-11 : 1e-13);
      expect(Number.isFinite(point.dcVolts) && Number.isFinite(point.rfVolts)).toBe(true);
    }),
    { numRuns: 1000 },
  );
});

test("ten thousand resolutions from the infimum to the maximum converge in at most four evaluations", () => {
  let previous = Number.POSITIVE_INFINITY;
  for (let i = 0; i <= 10_000; i++) {
    const resolution =
      RESOLUTION_INFIMUM + Math.exp(-16 + (i / 10_000) * (16 + Math.log(RESOLUTION_MAXIMUM - 1)));
    const { ratio, margin, steps } = solved(resolution);
    expect(steps).toBeLessThanOrEqual(4);
    expect(ratio).toBeGreaterThan(0);
    expect(margin).toBeGreaterThan(0);
    expect(margin).toBeLessThan(previous);
    previous = margin;
  }
});

test("the margin keeps its digits where the ratio has lost them", () => {
  // R · L · margin = c − 0.265 L · margin + …: the 50-digit limit c, so at R 1e7 the error of the limit is 1e-7.
  const deviations = [1e5, 1e6, 1e7].map((resolution) => ({
    at: `R ${resolution}`,
    error:
      relativeError(resolution * solved(resolution).margin * APEX_RATIO, RESOLUTION_CONSTANT) * resolution,
  }));
  expectWithin(1, deviations);
  for (const resolution of [0.7, 3, 40, 2e3, 1e5]) {
    const { qLow, qHigh, qWidth, ratio } = solved(resolution);
    expect(relativeError((qLow + qHigh) / (2 * qWidth), resolution)).toBeLessThan(1e-14);
    const edges = scanLineEdges(ratio);
    if (edges.kind !== "window") throw new Error(edges.kind);
    expect(relativeError(edges.qLow, qLow)).toBeLessThan(1e-14);
    expect(relativeError(edges.qHigh, qHigh)).toBeLessThan(1e-14);
  }
});

test("m/z, width, field radius and frequency scale the volts and nothing else", () => {
  fc.assert(
    fc.property(anyMz, anyResolution, anyField, (mzCentre, resolution, field) => {
      const one = setPointOf(mzCentre, mzCentre / resolution, field);
      const two = setPointOf(2 * mzCentre, (2 * mzCentre) / resolution, {
        fieldRadius: field.fieldRadius / 2,
        frequency: field.frequency * 4,
      });
      if (one.kind !== "set-point" || two.kind !== "set-point") throw new Error("no set point");
      expect(two.rfVolts).toBe(8 * one.rfVolts);
      expect(two.dcVolts).toBe(8 * one.dcVolts);
      expect({ a: two.a, q: two.q, margin: two.margin }).toEqual({ a: one.a, q: one.q, margin: one.margin });
    }),
  );
});

test("the 0.126 rule misses by what the reference says, so it is not what is solved", () => {
  for (const [ratio, resolution, , textbookError] of PASSBANDS.asymptotic_table) {
    const rule = 0.126 / (0.16784 - solved(resolution).ratio);
    expect(Math.abs(rule / resolution - 1 - textbookError)).toBeLessThan(
      1e-8 * Math.max(1, resolution / 100),
    );
    expect(relativeError(solved(resolution).ratio, ratio)).toBeLessThan(1e-14);
  }
});

test("a resolution that no window has is an answer with its limits", () => {
  for (const resolution of [
    0.5,
    0.1,
    0,
    -3,
    Number.NaN,
    Number.POSITIVE_INFINITY,
    RESOLUTION_MAXIMUM * 1.01,
  ]) {
    expect(ratioForResolution(resolution)).toEqual({
      kind: "not-reachable",
      reason: "resolution-not-reachable",
      minimum: RESOLUTION_INFIMUM,
      maximum: RESOLUTION_MAXIMUM,
    });
  }
  const field = { fieldRadius: 0.004, frequency: 1.2e6 };
  expect(setPointOf(10, 30, field).kind).toBe("not-reachable");
});

test("a budget that is too small is an answer that states it", () => {
  expect(ratioForResolution(700, 1)).toEqual({ kind: "not-converged", steps: 1 });
  expect(ratioForResolution(1, 0)).toEqual({ kind: "not-converged", steps: 0 });
});
