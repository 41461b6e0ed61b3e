import { expect, test } from "vitest";
import { boundaryArcs } from "../../../services/physics/regions/boundary-arcs.ts";
import { regionsInBox } from "../../../services/physics/regions/regions-in-box.ts";
import { REGIONS } from "../../../services/physics/regions/stability-regions.ts";
import { pointStability } from "../../../services/physics/stability.ts";
import { seededRandom } from "../../bench/random.ts";

const names = (box: Parameters<typeof regionsInBox>[0]) =>
  regionsInBox(box).regions.map(({ bands }) => `${bands.x},${bands.y}`);

test("the whole domain holds every region and says that nothing is missing", () => {
  const box = { aMin: -12, aMax: 12, qMin: 0, qMax: 12 };
  expect(regionsInBox(box)).toEqual({ regions: REGIONS, complete: true });
  expect(regionsInBox({ ...box, qMax: 15 }).complete).toBe(false);
});

test("boxes around a part of a region, inside it, and beside it", () => {
  expect(names({ aMin: 0.1, aMax: 0.11, qMin: 0.6, qMax: 0.61 })).toEqual(["0,0"]);
  expect(names({ aMin: 0.1, aMax: 0.2, qMin: 0.3, qMax: 0.4 })).toEqual([]);
  expect(names({ aMin: 2.5, aMax: 3.2, qMin: 2, qMax: 4 })).toEqual(["1,0"]);
  expect(names({ aMin: -3.2, aMax: -2.5, qMin: 2, qMax: 4 })).toEqual(["0,1"]);
  expect(names({ aMin: 0, aMax: 9, qMin: 0, qMax: 12 })).toEqual(["0,0", "1,0", "2,0", "1,1"]);
  expect(names({ aMin: 1, aMax: 0, qMin: 0, qMax: 1 })).toEqual([]);
  // A sliver at the apex, 1e-6 below and above it.
  expect(names({ aMin: 0.23699299, aMax: 0.3, qMin: 0.7, qMax: 0.71 })).toEqual(["0,0"]);
  expect(names({ aMin: 0.23699499, aMax: 0.3, qMin: 0.7, qMax: 0.71 })).toEqual([]);
});

test("a random box meets exactly the regions that its own points or a region's outline tell", () => {
  const random = seededRandom(20250301);
  const outlines = REGIONS.map((region) => boundaryArcs(region, 400).flatMap(({ points }) => points));
  let met = 0;
  for (let i = 0; i < 400; i++) {
    const region = REGIONS[i % REGIONS.length]!;
    const width = (region.outer.q - region.inner.q) * random();
    const height = (region.highTip.a - region.lowTip.a) * random();
    const qMin = Math.max(0, region.inner.q - 0.3 * width + (region.outer.q - region.inner.q) * random());
    const aMin = region.lowTip.a - 0.3 * height + (region.highTip.a - region.lowTip.a) * random();
    const box = { aMin, aMax: aMin + height, qMin, qMax: qMin + width };
    const answered = new Set(regionsInBox(box).regions);
    for (const [k, candidate] of REGIONS.entries()) {
      const outlineInside = outlines[k]!.some(
        ({ q, a }) => q > box.qMin && q < box.qMax && a > box.aMin && a < box.aMax,
      );
      let pointInside = false;
      for (let j = 1; j < 20 && !pointInside; j++) {
        for (let m = 1; m < 20 && !pointInside; m++) {
          const found = pointStability(aMin + (height * m) / 20, qMin + (width * j) / 20)!.region;
          pointInside = found?.x === candidate.bands.x && found.y === candidate.bands.y;
        }
      }
      if (outlineInside || pointInside) {
        expect(answered.has(candidate)).toBe(true);
        met++;
      } else if (answered.has(candidate)) {
        // Only a corner of the box smaller than the lattice may have been overlooked by the points.
        expect(candidate).toBe(region);
        met--;
      }
    }
  }
  expect(met).toBeGreaterThan(200);
});
