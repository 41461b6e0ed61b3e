import fc from "fast-check";
import { describe, expect, it, test } from "vitest";
import { planeStability } from "../../../services/physics/stability.ts";
import { cycleSteps } from "../../../services/physics/trajectory/cycle-steps.ts";
import { type Entry, flightThrough } from "../../../services/physics/trajectory/flight.ts";
import { largestEver } from "../../../services/physics/trajectory/motion-bound.ts";
import { expectWithin } from "../../measured-bound.ts";
import { STABILITY_POINTS } from "../../reference/tables.ts";
import { TRAJECTORIES } from "../../reference/trajectories.ts";

const flightOf = (row: (typeof TRAJECTORIES)[number], samples: number) =>
  flightThrough(row.a, row.q, row, row.rfCycles, samples)!;

describe("against an integration with 30 digits (test/reference, trajectories)", () => {
  it("ends where it ends", () => {
    expectWithin(
      5e-13,
      TRAJECTORIES.flatMap((row) => {
        const { x, y, slopeX, slopeY } = flightOf(row, 4);
        return [x.at(-1)!, slopeX, y.at(-1)!, slopeY].map((value, index) => ({
          at: `a ${row.a}, q ${row.q}, ${index}`,
          error: Math.abs(value - row.end[index]!) / Math.max(1, Math.abs(row.end[index]!)),
        }));
      }),
    );
  });

  it("passes through every quarter of a cycle", () => {
    expectWithin(
      5e-13,
      TRAJECTORIES.flatMap((row) => {
        const { x, y } = flightOf(row, 4);
        // The exit stands as a sample of its own unless it is one.
        const own = row.lost !== null || !Number.isInteger(row.rfCycles * 4) ? 1 : 0;
        expect(x.length).toBe(row.quarters.length + own);
        return row.quarters.map(([atX, atY], index) => ({
          at: `a ${row.a}, q ${row.q}, quarter ${index}`,
          error: Math.max(Math.abs(x[index]! - atX), Math.abs(y[index]! - atY)),
        }));
      }),
    );
  });

  it("is lost to the same rods at the same time, to 1e-9 of a cycle and better", () => {
    const lost = TRAJECTORIES.filter((row) => row.lost !== null);
    expect(lost.length).toBeGreaterThanOrEqual(4);
    expect(new Set(lost.map((row) => row.lost!.to))).toEqual(new Set(["x", "y"]));
    expectWithin(
      2e-14,
      lost.map((row) => {
        const found = flightOf(row, 1).lost!;
        expect(found.to).toBe(row.lost!.to);
        return { at: `a ${row.a}, q ${row.q}`, error: Math.abs(found.atCycle - row.lost!.atCycle) };
      }),
    );
    for (const row of TRAJECTORIES) if (row.lost === null) expect(flightOf(row, 1).lost).toBeNull();
  });
});

test("a cycle's propagator has determinant 1 and the half-trace of the reference (stability of points)", () => {
  expectWithin(
    5e-12,
    STABILITY_POINTS.filter(([a, q]) => Math.abs(a) <= 12 && q <= 12).flatMap(([a, q, halfTraceX]) => {
      let [c, dc, s, ds] = [1, 0, 0, 1];
      for (const { x } of cycleSteps(a, q, 0, 1)) {
        const [stepC, stepDc, stepS, stepDs] = x.whole;
        [c, dc] = [stepC * c + stepS * dc, stepDc * c + stepDs * dc];
        [s, ds] = [stepC * s + stepS * ds, stepDc * s + stepDs * ds];
      }
      // Where the motion grows by the size of its propagator, rounding does too.
      const size = Math.max(1, Math.abs(c * ds), Math.abs(s * dc));
      return [
        { at: `determinant ${a}, ${q}`, error: Math.abs(c * ds - s * dc - 1) / size },
        { at: `half-trace ${a}, ${q}`, error: Math.abs((c + ds) / 2 - halfTraceX) / size },
      ];
    }),
  );
});

const entry = fc.record({
  phase: fc.double({ min: -6, max: 6, noNaN: true }),
  x: fc.double({ min: -0.1, max: 0.1, noNaN: true }),
  y: fc.double({ min: -0.1, max: 0.1, noNaN: true }),
  slopeX: fc.double({ min: -0.1, max: 0.1, noNaN: true }),
  slopeY: fc.double({ min: -0.1, max: 0.1, noNaN: true }),
});
const place = fc.record({
  a: fc.double({ min: 0, max: 0.23, noNaN: true }),
  q: fc.double({ min: 0.01, max: 0.9, noNaN: true }),
});

/** The same equation backwards: time and slopes change sign, and the RF phase runs down. */
test("run backwards from its end, an ion comes back to where it entered", () => {
  fc.assert(
    fc.property(place, entry, fc.double({ min: 0.3, max: 8, noNaN: true }), ({ a, q }, start, cycles) => {
      const there = flightThrough(a, q, start, cycles, 3)!;
      fc.pre(there.lost === null);
      const back: Entry = {
        phase: -(start.phase + 2 * Math.PI * cycles),
        x: there.x.at(-1)!,
        y: there.y.at(-1)!,
        slopeX: -there.slopeX,
        slopeY: -there.slopeY,
      };
      const home = flightThrough(a, q, back, cycles, 2)!;
      if (home.lost !== null) return;
      expect(Math.abs(home.x.at(-1)! - start.x)).toBeLessThan(1e-10);
      expect(Math.abs(home.y.at(-1)! - start.y)).toBeLessThan(1e-10);
      expect(Math.abs(home.slopeX + start.slopeX)).toBeLessThan(1e-10);
      expect(Math.abs(home.slopeY + start.slopeY)).toBeLessThan(1e-10);
    }),
  );
});

test("without RF the energy x'² + a x² stays, and the path is a cosine", () => {
  const start = { phase: 1, x: 0.3, y: 0, slopeX: 0.1, slopeY: 0 };
  const a = 0.7;
  const { x, cycles, slopeX } = flightThrough(a, 0, start, 20.25, 7)!;
  const energy = start.slopeX * start.slopeX + a * start.x * start.x;
  expect(Math.abs(slopeX * slopeX + a * x.at(-1)! * x.at(-1)! - energy)).toBeLessThan(1e-14);
  const k = Math.sqrt(a);
  for (const [index, cycle] of cycles.entries()) {
    const phase = k * Math.PI * cycle;
    expect(
      Math.abs(x[index]! - (start.x * Math.cos(phase) + (start.slopeX / k) * Math.sin(phase))),
    ).toBeLessThan(1e-13);
  }
});

test("in free flight the path is straight and meets the rods where it must", () => {
  const start = { phase: 0, x: 0, y: -0.5, slopeX: 0.01, slopeY: -0.1 };
  const { lost } = flightThrough(0, 0, start, 30, 2)!;
  expect(lost!.to).toBe("y");
  expect(lost!.atCycle).toBeCloseTo(5 / Math.PI, 13);
  expect(lost!.x).toBeCloseTo(0.05, 13);
});

test("the samples change nothing: path, excursion and loss are the same for any number of them", () => {
  fc.assert(
    fc.property(place, entry, fc.integer({ min: 1, max: 40 }), ({ a, q }, start, samples) => {
      const one = flightThrough(a, q, start, 12.3, 1)!;
      const many = flightThrough(a, q, start, 12.3, samples)!;
      expect(many.lost?.to).toBe(one.lost?.to);
      expect(Math.abs(many.endCycle - one.endCycle)).toBeLessThan(1e-11);
      expect(Math.abs(many.excursionX.most - one.excursionX.most)).toBeLessThan(1e-11);
      expect(Math.abs(many.excursionY.most - one.excursionY.most)).toBeLessThan(1e-11);
      expect(Math.max(...many.x.map(Math.abs))).toBeLessThanOrEqual(many.excursionX.most);
      expect(Math.max(...many.y.map(Math.abs))).toBeLessThanOrEqual(many.excursionY.most);
    }),
  );
});

test("dense samples find no larger excursion than the flight reports, and come close to it", () => {
  for (const row of TRAJECTORIES) {
    const dense = flightOf(row, 997);
    const coarse = flightOf(row, 1);
    const seen = Math.max(...dense.x.map(Math.abs));
    expect(seen).toBeLessThanOrEqual(coarse.excursionX.most * (1 + 1e-12));
    expect(seen).toBeGreaterThan(coarse.excursionX.most * (1 - 1e-4));
  }
});

test("no stable ion ever goes beyond its bound, and a long flight comes up to it", () => {
  for (const [a, q] of [
    [0.2366, 0.7057],
    [0, 0.3],
    [3.1530933, 3.246094],
    [0.0064105, 7.558195],
  ] as const) {
    const start = { phase: 0.3, x: 1e-4, y: 1e-4, slopeX: 1e-5, slopeY: -2e-5 };
    const { excursionX, excursionY } = flightThrough(a, q, start, 3000, 1)!;
    const bounds = [
      largestEver(a, q, start.phase, { value: start.x, slope: start.slopeX })!,
      largestEver(-a, -q, start.phase, { value: start.y, slope: start.slopeY })!,
    ];
    for (const [index, { most }] of [excursionX, excursionY].entries()) {
      expect(most).toBeLessThanOrEqual(bounds[index]! * (1 + 1e-10));
      expect(most).toBeGreaterThan(bounds[index]! * 0.999);
    }
  }
});

test("an unstable plane has no bound, and beyond the computed domain there is no flight", () => {
  const start = { phase: 0, x: 0.01, y: 0.01, slopeX: 0, slopeY: 0 };
  expect(planeStability(0, 0.95)!.stable).toBe(false);
  expect(largestEver(0, 0.95, 0, { value: 0.01, slope: 0 })).toBeNull();
  expect(largestEver(0, 1e3, 0, { value: 0.01, slope: 0 })).toBeNull();
  expect(flightThrough(0, 1e3, start, 10, 4)).toBeNull();
  expect(flightThrough(101, 1, start, 10, 4)).toBeNull();
});

test("an ion that starts on a rod is lost at once, and x is named where both are reached", () => {
  const start = { phase: 0, x: 0, y: -1.2, slopeX: 0, slopeY: 0 };
  expect(flightThrough(0, 0.3, start, 10, 4)!.lost).toEqual({ to: "y", atCycle: 0, x: 0, y: -1.2 });
  expect(flightThrough(0, 0.3, { ...start, x: 1 }, 10, 4)!.lost!.to).toBe("x");
});
