import { expect, test } from "vitest";
import { characteristicA, characteristicB } from "../../../services/physics/characteristic-values.ts";
import {
  boundaryArcs,
  boundaryArcsWithin,
  MOST_POINTS,
} from "../../../services/physics/regions/boundary-arcs.ts";
import { REGIONS } from "../../../services/physics/regions/stability-regions.ts";
import { planeStability, pointStability } from "../../../services/physics/stability.ts";
import { type Deviation, expectWithin } from "../../measured-bound.ts";

test("on every point of an arc the plane named is on its edge: the margin of the half-period series is zero", () => {
  const deviations: Deviation[] = [];
  for (const region of REGIONS) {
    for (const { lostTo, points, curve } of boundaryArcs(region, 41)) {
      for (const { q, a } of points) {
        if (q === 0) continue;
        const { margin } = lostTo === "x" ? planeStability(a, q)! : planeStability(-a, -q)!;
        deviations.push({ at: `${curve.kind}_${curve.order} of ${lostTo}, q ${q}`, error: Math.abs(margin) });
      }
    }
  }
  // Three thousand to one between half-trace and a in the narrowest band.
  expectWithin(2e-12, deviations);
});

test("the four arcs run once around the region", () => {
  for (const region of REGIONS) {
    const arcs = boundaryArcs(region, 7);
    expect(arcs).toHaveLength(4);
    for (const [i, { points }] of arcs.entries()) {
      expect(points).toHaveLength(7);
      expect(points[6]).toEqual(arcs[(i + 1) % 4]!.points[0]);
    }
  }
});

test("a thousandth of the region's height inside an arc an ion is stable, outside the plane named is lost", () => {
  for (const region of REGIONS) {
    const { x, y } = region.bands;
    for (const { points, lostTo, curve } of boundaryArcs(region, 21)) {
      for (const { q, a } of points.slice(1, -1)) {
        const lower = Math.max(characteristicA(x, q)!, -characteristicB(y + 1, q)!);
        const upper = Math.min(characteristicB(x + 1, q)!, -characteristicA(y, q)!);
        const shift = 1e-3 * (upper - lower) * ((lostTo === "x") === (curve.kind === "a") ? 1 : -1);
        expect(pointStability(a + shift, q)!.region).toEqual(region.bands);
        expect(pointStability(a - shift, q)!.lostTo).toBe(lostTo);
      }
    }
  }
});

test("arcs to an accuracy keep it between their points too, with few points where a curve is straight", () => {
  for (const accuracy of [1e-3, 1e-6]) {
    for (const region of REGIONS) {
      for (const arc of boundaryArcsWithin(region, accuracy)) {
        expect(arc.chordError).toBeLessThanOrEqual(accuracy);
        expect(arc.points.length).toBeLessThan(300);
      }
    }
  }
  const [fewer] = boundaryArcsWithin(REGIONS[0]!, 1e-15);
  expect(fewer!.points).toHaveLength(MOST_POINTS);
  expect(fewer!.chordError).toBeGreaterThan(1e-15);
});

test("a finer polyline stays within the chord error of a coarse one", () => {
  for (const region of REGIONS) {
    const coarse = boundaryArcs(region, 9);
    const fine = boundaryArcs(region, 9 * 16 - 15);
    for (const [i, { points, chordError }] of coarse.entries()) {
      for (const [j, { q, a }] of fine[i]!.points.entries()) {
        const k = Math.min(7, Math.floor(j / 16));
        const [from, to] = [points[k]!, points[k + 1]!];
        const onChord = from.a + ((to.a - from.a) * (q - from.q)) / (to.q - from.q);
        // Half-way is where a parabola is farthest from its chord; the next term of the curve adds a little.
        expect(Math.abs(a - onChord)).toBeLessThanOrEqual(1.05 * chordError + 1e-14);
      }
    }
  }
});
