import fc from "fast-check";
import { expect, test } from "vitest";
import { demandsOf } from "../../../services/physics/transmission/demands.ts";
import { flightRows, rowAt } from "../../../services/physics/transmission/flight-rows.ts";
import {
  addToHull,
  copyHull,
  isWithinHull,
  newSymmetricHull,
} from "../../../services/physics/transmission/symmetric-hull.ts";

const anyMotion = fc.record({
  a: fc.double({ min: -0.6, max: 0.6, noNaN: true }),
  q: fc.double({ min: -1.3, max: 1.3, noNaN: true }),
  growthPerCycle: fc.constantFrom(0, 0, 1e-3, -1e-3),
});

test("the row of any instant of any flight lies within 1 + slack times the rows that were kept for it", () => {
  const slack = 1e-4;
  const row = new Float64Array(4);
  const point = new Float64Array(2);
  fc.assert(
    fc.property(
      anyMotion,
      fc.double({ min: 0.3, max: 12, noNaN: true }),
      fc.double({ min: 0, max: 0.999, noNaN: true }),
      (motion, rfCycles, start) => {
        const rows = flightRows(motion, rfCycles);
        const demands = demandsOf(rows, rfCycles, slack, 1e5, 1e6);
        // A flight that was cut short keeps no later rows, by design: its answer is an upper limit.
        fc.pre(!demands.cutShort);
        const hull = newSymmetricHull();
        copyHull(demands.shared, hull);
        for (const list of [demands.lead, demands.tail]) {
          for (let i = 0; i < list.count; i++) {
            const turn = list.turn[i]!;
            if (turn >= start && turn <= start + rfCycles) addToHull(hull, list.points, 2 * i);
          }
        }
        for (const turn of [start, start + rfCycles]) {
          rowAt(rows, turn, row);
          addToHull(hull, Float64Array.of(row[0]!, row[2]!), 0);
        }
        const scale = (1 + slack) * (1 + 1e-9);
        for (let i = 0; i <= 400; i++) {
          rowAt(rows, start + (rfCycles * i) / 400, row);
          point[0] = row[0]! / scale;
          point[1] = row[2]! / scale;
          if (hull.count > 1) expect(isWithinHull(hull, point, 0)).toBe(true);
        }
      },
    ),
    { numRuns: 200 },
  );
});

test("a budget that is too small is reported, and hardly exceeded", () => {
  const rows = flightRows({ a: 0.23668, q: 0.70567, growthPerCycle: 0 }, 200);
  const demands = demandsOf(rows, 200, 1e-6, 1e9, 500);
  expect(demands.withinBudget).toBe(false);
  expect(demands.steps).toBeLessThan(1000);
});
