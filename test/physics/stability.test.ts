import fc from "fast-check";
import { expect, test } from "vitest";
import { aOf, qOf } from "../../services/physics/mathieu-parameters.ts";
import {
  DOMAIN_LIMIT,
  HALF_TRACE_ERROR,
  planeStability,
  pointStability,
} from "../../services/physics/stability.ts";
import { type Deviation, expectWithin } from "../measured-bound.ts";
import { NARROW_BANDS } from "../reference/narrow-bands.ts";
import { STABILITY_POINTS, STABILITY_REGIONS } from "../reference/tables.ts";
import { anyField, anyMz, logUniform } from "./settings.ts";

test("stability, bands and characteristic exponents of the 200 reference points", () => {
  const exponents: Deviation[] = [];
  const margins: Deviation[] = [];
  for (const [a, q, , , stableX, stableY, betaX, betaY, marginX, marginY] of STABILITY_POINTS) {
    const point = pointStability(a, q)!;
    const at = `a ${a}, q ${q}`;
    for (const [plane, stable, beta, margin] of [
      [point.x, stableX, betaX, marginX],
      [point.y, stableY, betaY, marginY],
    ] as const) {
      expect(plane.stable, at).toBe(stable === 1);
      margins.push({ at, error: Math.abs(plane.margin - margin) / Math.max(1, Math.abs(margin)) });
      if (beta === null) {
        expect(plane.characteristicExponent, at).toBeNull();
        expect(plane.band, at).toBeNull();
        continue;
      }
      expect(plane.band, at).toBe(Math.floor(beta));
      exponents.push({ at, error: Math.abs(plane.characteristicExponent! - beta) });
    }
    expect(point.stable, at).toBe(stableX === 1 && stableY === 1);
    const lost = stableX ? (stableY ? null : "y") : stableY ? "x" : "both";
    expect(point.lostTo, at).toBe(lost);
  }
  expectWithin(1e-11, exponents);
  expectWithin(HALF_TRACE_ERROR, margins);
});

test("bands far beyond the first regions, up to the end of the domain", () => {
  const exponents: Deviation[] = [];
  const halfTraces: Deviation[] = [];
  for (const [a, q, halfTrace, beta] of NARROW_BANDS) {
    const plane = planeStability(a, q)!;
    const at = `a ${a}, q ${q}`;
    halfTraces.push({
      at,
      error: Math.abs(plane.halfTrace - halfTrace) / Math.max(1, Math.abs(halfTrace)),
    });
    expect(plane.stable, at).toBe(beta !== null);
    if (beta === null) continue;
    expect(plane.band, at).toBe(Math.floor(beta));
    exponents.push({ at, error: Math.abs(plane.characteristicExponent! - beta) });
  }
  expectWithin(3e-13, halfTraces);
  expectWithin(3e-13, exponents);
});

test("a point inside each known region lies in its bands", () => {
  let checked = 0;
  for (const region of STABILITY_REGIONS.regions) {
    for (const point of region.interior_check) {
      const stability = pointStability(point.a, point.q)!;
      expect(stability.region, region.label).toEqual({ x: region.n_x, y: region.n_y });
      expect(stability.x.characteristicExponent).toBeCloseTo(point.beta_x, 10);
      expect(stability.y.characteristicExponent).toBeCloseTo(point.beta_y, 10);
      checked++;
    }
  }
  expect(checked).toBeGreaterThanOrEqual(6);
});

test("without RF the motion is harmonic for a > 0 and free or lost otherwise", () => {
  const harmonic = pointStability(0.5, 0)!;
  expect(harmonic.x).toMatchObject({ stable: true, band: 0 });
  expect(harmonic.x.characteristicExponent).toBeCloseTo(Math.SQRT1_2, 15);
  expect(harmonic).toMatchObject({ stable: false, lostTo: "y", region: null });
  expect(harmonic.y.halfTrace).toBeCloseTo(Math.cosh(Math.PI * Math.SQRT1_2), 12);
  expect(pointStability(0, 0)).toMatchObject({
    stable: false,
    lostTo: "both",
    x: { stable: false, halfTrace: 1, margin: 0 },
  });
  // a = n² is harmonic motion too: the gap between b_n and a_n is closed without RF.
  expect(planeStability(4, 0)).toMatchObject({ stable: true, band: 2, characteristicExponent: 2 });
  expect(planeStability(-1, 0)!.margin).toBeCloseTo(1 - Math.cosh(Math.PI), 12);
});

test("very weak RF leaves heavy ions on the pseudopotential's frequency", () => {
  for (const q of [1e-12, 1e-9, 1e-6, 1e-4]) {
    const plane = planeStability(0, q)!;
    expect(plane.stable).toBe(true);
    expect(Math.abs(plane.characteristicExponent! - q * Math.SQRT1_2)).toBeLessThan(1e-10);
    expect(pointStability(0, q)!.region).toEqual({ x: 0, y: 0 });
  }
});

test("beyond the computed domain the answer is null", () => {
  expect(pointStability(DOMAIN_LIMIT * 1.0001, 0.5)).toBeNull();
  expect(pointStability(0.2, 1200)).toBeNull();
  expect(planeStability(Number.NaN, 0.5)).toBeNull();
  expect(planeStability(0.2, Number.POSITIVE_INFINITY)).toBeNull();
  expect(pointStability(-DOMAIN_LIMIT, DOMAIN_LIMIT)).not.toBeNull();
});

const anywhere = fc.double({ min: -DOMAIN_LIMIT, max: DOMAIN_LIMIT, noNaN: true });

test("exchanging x and y mirrors a", () => {
  fc.assert(
    fc.property(anywhere, anywhere, logUniform(1e-6, 1), (a, q, scale) => {
      const point = pointStability(a * scale, q * scale)!;
      const mirror = pointStability(-a * scale, -q * scale)!;
      expect(mirror.x).toEqual(point.y);
      expect(mirror.y).toEqual(point.x);
    }),
  );
});

test("half a period later the equation has −q, and its stability stays", () => {
  fc.assert(
    fc.property(anywhere, anywhere, logUniform(1e-6, 1), (aFull, qFull, scale) => {
      const [a, q] = [aFull * scale, qFull * scale];
      const plane = planeStability(a, q)!;
      const shifted = planeStability(a, -q)!;
      const difference = Math.abs(plane.halfTrace - shifted.halfTrace);
      expect(difference).toBeLessThanOrEqual(HALF_TRACE_ERROR * Math.max(1, Math.abs(plane.halfTrace)));
      if (Math.abs(plane.margin) > 1e-9) expect(shifted.band).toBe(plane.band);
    }),
  );
});

test("every answer is finite and its parts agree", () => {
  fc.assert(
    fc.property(anywhere, anywhere, logUniform(1e-12, 1), (a, q, scale) => {
      const plane = planeStability(a * scale, q * scale)!;
      expect(Number.isFinite(plane.halfTrace) && Number.isFinite(plane.margin)).toBe(true);
      if (plane.stable) {
        const beta = plane.characteristicExponent!;
        expect(beta).toBeGreaterThanOrEqual(plane.band!);
        expect(beta).toBeLessThanOrEqual(plane.band! + 1);
        expect(Math.abs(Math.cos(Math.PI * beta) - plane.halfTrace)).toBeLessThan(1e-12);
      } else {
        expect(Math.abs(plane.halfTrace)).toBeGreaterThanOrEqual(1 - 1e-12);
      }
    }),
    { numRuns: 500 },
  );
});

test("scaling m/z, volts, field radius and frequency so that a and q stay changes nothing", () => {
  fc.assert(
    fc.property(anyMz, anyField, logUniform(0.01, 0.7), logUniform(0.1, 10), (mz, field, q, by) => {
      const volts = q / qOf(mz, 1, field);
      const answer = pointStability(aOf(mz, volts * 0.1, field), qOf(mz, volts, field))!;
      const wider = { fieldRadius: field.fieldRadius * by, frequency: field.frequency };
      const scaled = pointStability(aOf(mz, volts * 0.1 * by * by, wider), qOf(mz, volts * by * by, wider))!;
      expect(scaled.stable).toBe(answer.stable);
      expect(Math.abs(scaled.x.halfTrace - answer.x.halfTrace)).toBeLessThan(1e-13);
      expect(Math.abs(scaled.y.halfTrace - answer.y.halfTrace)).toBeLessThan(1e-13);
    }),
  );
});
