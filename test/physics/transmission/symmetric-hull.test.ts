import fc from "fast-check";
import { expect, test } from "vitest";
import {
  addToHull,
  isWithinHull,
  newSymmetricHull,
} from "../../../services/physics/transmission/symmetric-hull.ts";

/** Eighths, so that every cross product is exact and "inside" has one answer. */
const coordinate = fc.integer({ min: -800, max: 800 }).map((eighths) => eighths / 8);
const points = fc.array(fc.tuple(coordinate, coordinate), { minLength: 2, maxLength: 60 });

function hullOf(of: readonly (readonly [number, number])[]) {
  const hull = newSymmetricHull();
  for (const [x, y] of of) addToHull(hull, Float64Array.of(x, y), 0);
  return hull;
}

test("in every direction the hull reaches as far as the farthest point or its mirror image", () => {
  fc.assert(
    fc.property(points, (all) => {
      const hull = hullOf(all);
      for (let i = 0; i < 64; i++) {
        const [c, s] = [Math.cos((Math.PI * i) / 64), Math.sin((Math.PI * i) / 64)];
        const farthest = Math.max(...all.map(([x, y]) => Math.abs(c * x + s * y)));
        let reach = 0;
        for (let k = 0; k < hull.count; k++)
          reach = Math.max(reach, Math.abs(c * hull.x[k]! + s * hull.y[k]!));
        expect(reach).toBeGreaterThanOrEqual(farthest - 1e-10);
        expect(reach).toBeLessThanOrEqual(farthest + 1e-10);
      }
    }),
  );
});

test("neighbours turn left all the way round", () => {
  fc.assert(
    fc.property(points, (all) => {
      const { x, y, count } = hullOf(all);
      const at = (i: number): readonly [number, number] => {
        const k = i % (2 * count);
        return k < count ? [x[k]!, y[k]!] : [-x[k - count]!, -y[k - count]!];
      };
      for (let i = 0; i < 2 * count && count > 2; i++) {
        const [[x0, y0], [x1, y1], [x2, y2]] = [at(i), at(i + 1), at(i + 2)];
        expect((x1 - x0) * (y2 - y1) - (y1 - y0) * (x2 - x1)).toBeGreaterThan(-1e-9);
      }
    }),
  );
});

test("a point is within the hull exactly when adding it changes nothing", () => {
  fc.assert(
    fc.property(points, fc.tuple(coordinate, coordinate), (all, [x, y]) => {
      const hull = hullOf(all);
      const within = isWithinHull(hull, Float64Array.of(x, y), 0);
      const vertices = [...hull.x.slice(0, hull.count), ...hull.y.slice(0, hull.count)];
      addToHull(hull, Float64Array.of(x, y), 0);
      const after = [...hull.x.slice(0, hull.count), ...hull.y.slice(0, hull.count)];
      if (within) expect(after).toEqual(vertices);
      else if (vertices.length > 2) expect(after).not.toEqual(vertices);
    }),
  );
});
