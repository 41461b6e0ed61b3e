import { expect, test } from "vitest";
import { characteristicA, characteristicB } from "../../../services/physics/characteristic-values.ts";
import { boundaryArcs } from "../../../services/physics/regions/boundary-arcs.ts";
import {
  type Corner,
  isInRegion,
  REGIONS,
  type StabilityRegion,
} from "../../../services/physics/regions/stability-regions.ts";
import { type Deviation, expectWithin } from "../../measured-bound.ts";
import { STABILITY_REGIONS } from "../../reference/tables.ts";
import { SECOND_REGION, THIRD_REGION_CORNERS } from "../../reference/worked-examples.ts";

function regionWith(x: number, y: number): StabilityRegion {
  return REGIONS.find(({ bands }) => bands.x === x && bands.y === y)!;
}

type Point = Pick<Corner, "a" | "q">;

function unitVector(from: Point, to: Point): Point {
  const length = Math.hypot(to.a - from.a, to.q - from.q);
  return { a: (to.a - from.a) / length, q: (to.q - from.q) / length };
}

test("the sixteen corners of the reference table, solved there at 50 digits", () => {
  const deviations: Deviation[] = [];
  for (const row of STABILITY_REGIONS.regions) {
    const region = REGIONS.find(({ bands }) => bands.x === row.n_x && bands.y === row.n_y);
    if (region === undefined) continue;
    const { x, y } = region.bands;
    const named = [
      [`a=a_${x}(q)`, `a=-a_${y}(q)`, region.inner],
      [`a=b_${x + 1}(q)`, `a=-a_${y}(q)`, region.highTip],
      [`a=b_${x + 1}(q)`, `a=-b_${y + 1}(q)`, region.outer],
      [`a=a_${x}(q)`, `a=-b_${y + 1}(q)`, region.lowTip],
    ] as const;
    for (const [xCurve, yCurve, corner] of named) {
      const expected = row.corners_all_real_a.find((c) => c.x_curve === xCurve && c.y_curve === yCurve)!;
      const at = `${row.label} ${xCurve} ${yCurve}`;
      deviations.push({ at, error: Math.abs(corner.q - expected.q) / Math.max(1, expected.q) });
      deviations.push({ at, error: Math.abs(corner.a - expected.a) });
      if (expected.q > 0) deviations.push({ at, error: Math.abs(corner.ratio - corner.a / (2 * corner.q)) });
    }
  }
  expect(deviations).toHaveLength(47);
  expectWithin(1e-15, deviations);
});

test("both characteristic curves of every corner pass through it", () => {
  const deviations: Deviation[] = [];
  for (const { bands, inner, highTip, outer, lowTip } of REGIONS) {
    const lowX = (q: number) => characteristicA(bands.x, q)!;
    const lowY = (q: number) => -characteristicA(bands.y, q)!;
    const highX = (q: number) => characteristicB(bands.x + 1, q)!;
    const highY = (q: number) => -characteristicB(bands.y + 1, q)!;
    const meetings = [
      [inner, lowX, lowY],
      [highTip, highX, lowY],
      [outer, highX, highY],
      [lowTip, lowX, highY],
    ] as const;
    for (const [{ q, a }, x, y] of meetings) {
      for (const curve of [x, y]) deviations.push({ at: `a ${a}, q ${q}`, error: Math.abs(curve(q) - a) });
    }
  }
  expectWithin(1e-14, deviations);
});

test("corners of the second and third region as published: Ying and Douglas 1996; Du, Olney and Douglas 1997", () => {
  const second = regionWith(1, 1);
  expect(second.name).toBe("second");
  expect(second.highTip.q).toBeCloseTo(SECOND_REGION.apexQ, 5);
  expect(second.highTip.a).toBeCloseTo(SECOND_REGION.apexA, 5);
  expect(second.lowTip.a).toBeCloseTo(-SECOND_REGION.apexA, 5);
  const third = regionWith(1, 0);
  expect(third.name).toBe("third");
  for (const [published, corner] of [
    [THIRD_REGION_CORNERS[0], third.highTip],
    [THIRD_REGION_CORNERS[1], third.lowTip],
  ] as const) {
    expect(corner.q).toBeCloseTo(published.q, 5);
    expect(corner.a).toBeCloseTo(published.a, 5);
  }
});

test("every region has its mirror with a of the other sign and the bands exchanged", () => {
  for (const region of REGIONS) {
    const other = regionWith(region.bands.y, region.bands.x);
    expect(other.highTip).toEqual({
      q: region.lowTip.q,
      a: -region.lowTip.a,
      ratio: -region.lowTip.ratio,
    });
    expect(other.outer.q).toBe(region.outer.q);
  }
  expect(REGIONS.map(({ name }) => name)).toEqual(["first", "third", null, null, null, "second"]);
});

test("the interior points of the reference table lie in their region and in no other", () => {
  let looked = 0;
  for (const { n_x, n_y, interior_check } of STABILITY_REGIONS.regions) {
    for (const { a, q } of interior_check) {
      for (const region of REGIONS) {
        const own = region.bands.x === n_x && region.bands.y === n_y;
        expect(isInRegion(region, a, q)).toBe(own);
        looked++;
      }
    }
  }
  expect(looked).toBeGreaterThanOrEqual(24);
});

test("just inside every corner a point belongs to the region, just outside it does not", () => {
  for (const region of REGIONS) {
    const arcs = boundaryArcs(region, 1001);
    for (const [i, { points }] of arcs.entries()) {
      const corner = points[0]!;
      if (corner.q === 0) continue;
      const along = unitVector(corner, points[1]!);
      const back = unitVector(corner, arcs[(i + 3) % 4]!.points[999]!);
      const at = (shift: number) =>
        isInRegion(region, corner.a + shift * (along.a + back.a), corner.q + shift * (along.q + back.q));
      expect(at(1e-7)).toBe(true);
      expect(at(-1e-7)).toBe(false);
    }
  }
});

test("a point beyond the domain of stability belongs to no region that could be named", () => {
  expect(isInRegion(regionWith(0, 0), 0, 1e6)).toBeNull();
});
