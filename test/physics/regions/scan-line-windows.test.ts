import fc from "fast-check";
import { expect, test } from "vitest";
import { APEX_RATIO } from "../../../services/physics/first-region.ts";
import { scanLineEdges } from "../../../services/physics/passband.ts";
import { scanLineCrossing } from "../../../services/physics/regions/scan-line-crossing.ts";
import {
  type RegionWindow,
  type WindowEdge,
  windowsOnScanLine,
} from "../../../services/physics/regions/scan-line-windows.ts";
import { REGIONS } from "../../../services/physics/regions/stability-regions.ts";
import { planeStability, pointStability } from "../../../services/physics/stability.ts";
import { type Deviation, expectWithin } from "../../measured-bound.ts";
import { SECOND_REGION } from "../../reference/worked-examples.ts";

function windowsAt(ratio: number): readonly RegionWindow[] {
  const found = windowsOnScanLine(ratio, "any");
  if (found.kind !== "windows") throw new Error(`not converged at U/V ${ratio}`);
  return found.windows;
}

test("a dense scan of 800 lines finds stable ions in the windows and nowhere else", () => {
  let stablePoints = 0;
  for (let line = 0; line < 800; line++) {
    // Uneven steps, so that no line runs exactly through a corner.
    const ratio = -1 + 2 * ((line + 0.37) / 800);
    const windows = windowsAt(ratio);
    const end = Math.min(12, 6 / Math.abs(ratio));
    for (let q = 0.0041; q < end; q += 0.0083) {
      const inside = windows.find(({ low, high }) => q > (low?.q ?? 0) && q < high.q);
      const point = pointStability(2 * ratio * q, q)!;
      if (point.stable !== (inside !== undefined)) throw new Error(`U/V ${ratio}, q ${q}`);
      if (inside !== undefined) {
        expect(point.region).toEqual(inside.region.bands);
        stablePoints++;
      }
    }
  }
  expect(stablePoints).toBeGreaterThan(5000);
});

test("in the domain no pair of bands overlaps on any of 6,001 lines but those of the listed regions", () => {
  const bandOn = (sigma: number, band: number): readonly [number, number] => {
    const low = scanLineCrossing({ kind: "a", order: band }, sigma, 3, 200);
    const high = scanLineCrossing({ kind: "b", order: band + 1 }, sigma, 3, 200);
    const from = low.kind === "crossing" ? low.q : band === 0 && sigma >= 0 ? 0 : 13;
    return [from, high.kind === "crossing" ? high.q : 13];
  };
  const seen = new Set<string>();
  // Above U/V = 1 the field of one plane never focuses, so that no line beyond has a window.
  for (let line = 0; line <= 6000; line++) {
    const ratio = line / 6000;
    const end = Math.min(12, 6 / ratio);
    const x = [0, 1, 2, 3, 4].map((band) => bandOn(2 * ratio, band));
    const y = [0, 1, 2, 3, 4].map((band) => bandOn(-2 * ratio, band));
    for (const [nx, [xLow, xHigh]] of x.entries()) {
      for (const [ny, [yLow, yHigh]] of y.entries()) {
        if (Math.max(xLow, yLow) < Math.min(xHigh, yHigh, end)) seen.add(`${nx},${ny}`);
      }
    }
  }
  const listed = REGIONS.filter(({ highTip }) => highTip.ratio > 0).map(
    ({ bands }) => `${bands.x},${bands.y}`,
  );
  expect([...seen].sort()).toEqual(listed.sort());
  for (const ratio of [1.0001, 1.5, 3, 40]) expect(windowsAt(ratio)).toEqual([]);
});

function edgesOf({ low, high }: RegionWindow): readonly WindowEdge[] {
  return low === null ? [high] : [low, high];
}

test("at either edge the half-trace of the plane named is one in size, and that plane alone is lost beyond", () => {
  const traces: Deviation[] = [];
  let alone = 0;
  const lines = Array.from({ length: 2000 }, (_, i) => [
    0.0019576 * ((i + 0.5) / 2000) * (i % 2 ? 1 : -1),
    (i % 2 ? 1 : -1) * (0.4478 + 0.0414 * ((i + 0.5) / 2000)),
    0.6248 + 0.01603 * ((i + 0.5) / 2000),
  ]).flat();
  for (const ratio of lines) {
    for (const window of windowsAt(ratio)) {
      if (window.region.name === "first") continue;
      for (const edge of edgesOf(window)) {
        const [a, q] = edge.lostTo === "x" ? [edge.a, edge.q] : [-edge.a, -edge.q];
        const { margin } = planeStability(a, q)!;
        // The margin is steep (up to 1e3 per unit of q) where the bands are narrow.
        traces.push({ at: `U/V ${ratio}`, error: Math.abs(margin) });
        const outwards = edge === window.high ? 1 : -1;
        const shift = window.qWidth * 1e-3;
        const outside = pointStability(2 * ratio * (edge.q + outwards * shift), edge.q + outwards * shift)!;
        const inside = pointStability(2 * ratio * (edge.q - outwards * shift), edge.q - outwards * shift)!;
        expect(inside.region).toEqual(window.region.bands);
        if (outside.lostTo === edge.lostTo) alone++;
        expect(outside[edge.lostTo].stable).toBe(false);
      }
    }
  }
  expect(traces.length).toBeGreaterThan(8000);
  // Beside a corner both planes end within the thousandth of a width.
  expect(alone / traces.length).toBeGreaterThan(0.99);
  expectWithin(2e-12, traces);
});

test("the first region's window is that of its own solver, with the planes named", () => {
  fc.assert(
    fc.property(fc.double({ min: -0.99 * APEX_RATIO, max: 0.99 * APEX_RATIO, noNaN: true }), (ratio) => {
      fc.pre(Math.abs(ratio) > 1e-9);
      const found = windowsOnScanLine(ratio, "first");
      const edges = scanLineEdges(ratio);
      if (found.kind !== "windows" || edges.kind !== "window") throw new Error("no window");
      const { low, high } = found.windows[0]!;
      expect([low!.q, high.q]).toEqual([edges.qLow, edges.qHigh]);
      expect([low!.lostTo, high.lostTo]).toEqual(ratio > 0 ? ["y", "x"] : ["x", "y"]);
      expect(low!.curve).toEqual({ kind: "a", order: 0 });
      expect(high.curve).toEqual({ kind: "b", order: 1 });
    }),
  );
});

test("reversing the DC exchanges the planes and moves no edge", () => {
  fc.assert(
    fc.property(fc.double({ min: 1e-6, max: 0.7, noNaN: true }), (ratio) => {
      const [windows, mirrored] = [windowsAt(ratio), windowsAt(-ratio)];
      expect(mirrored).toHaveLength(windows.length);
      for (const [i, window] of windows.entries()) {
        const other = mirrored[i]!;
        expect(other.region.bands).toEqual({ x: window.region.bands.y, y: window.region.bands.x });
        expect(edgesOf(other).map(({ q }) => q)).toEqual(edgesOf(window).map(({ q }) => q));
        for (const [j, edge] of edgesOf(window).entries()) {
          expect(edgesOf(other)[j]!.lostTo).not.toBe(edge.lostTo);
        }
      }
    }),
  );
});

test("RF alone opens the first region and, far above it in q, the second: Dawson and Bingqi 1984", () => {
  const [first, second] = windowsAt(0);
  expect(first!.low).toBeNull();
  expect(second!.region.name).toBe("second");
  expect(second!.low!.q).toBeCloseTo(SECOND_REGION.qLow, 5);
  expect(second!.high.q).toBeCloseTo(SECOND_REGION.qHigh, 4);
  expect((second!.low!.q + second!.high.q) / (2 * second!.qWidth)).toBeCloseTo(SECOND_REGION.resolution, 0);
});

test("a line that misses the region wanted says so", () => {
  expect(windowsOnScanLine(0.2, "first")).toMatchObject({ windows: [], reason: "above-apex" });
  expect(windowsOnScanLine(0.1, "third")).toMatchObject({ windows: [], reason: "scan-line-misses-region" });
  expect(windowsOnScanLine(0.3, "any")).toMatchObject({ windows: [], reason: "scan-line-misses-region" });
  expect(windowsOnScanLine(-0.46, "third")).toMatchObject({
    windows: [{ region: { bands: { x: 0, y: 1 } } }],
    reason: null,
  });
  expect(windowsOnScanLine(3, "any")).toMatchObject({ searchedToQ: 2 });
});

test("a budget that is too small is said", () => {
  expect(windowsOnScanLine(0.46, "third", 1).kind).toBe("not-converged");
});
