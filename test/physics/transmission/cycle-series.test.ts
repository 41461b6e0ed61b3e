import fc from "fast-check";
import { expect, test } from "vitest";
import { halfPeriod } from "../../../services/physics/half-period.ts";
import {
  CONSTANT_FIELD,
  expandCycle,
  newCycleSeries,
  nodesPerCycle,
  solutionsAt,
} from "../../../services/physics/transmission/cycle-series.ts";
import { type Deviation, expectWithin } from "../../measured-bound.ts";

function cycleOf(a: number, q: number, growth = CONSTANT_FIELD) {
  const series = newCycleSeries(nodesPerCycle(a, q));
  const state = Float64Array.of(1, 0, 0, 1);
  expandCycle(a, q, growth, state, series);
  return { series, state };
}

const anyA = fc.double({ min: -12, max: 12, noNaN: true });
const anyQ = fc.double({ min: -12, max: 12, noNaN: true });

test("half a cycle agrees with the series in sin²(ξ/2), which shares no step with it", () => {
  const deviations: Deviation[] = [];
  const out = new Float64Array(4);
  const half = new Float64Array(4);
  for (const a of [-9, -1, -0.23, 0, 0.2369, 0.5, 4, 11]) {
    for (const q of [-11, -0.706, 0.05, 0.706, 0.9, 3, 7.55, 12]) {
      solutionsAt(cycleOf(a, q).series, 0.5, half);
      halfPeriod(a, q, out);
      const size = Math.max(...out.map(Math.abs));
      for (let i = 0; i < 4; i++) {
        deviations.push({ at: `a ${a}, q ${q}, ${i}`, error: Math.abs(half[i]! - out[i]!) / size });
      }
    }
  }
  expectWithin(2e-13, deviations);
});

test("the Wronskian C S' − S C' is 1 anywhere in the cycle, also in a growing field", () => {
  const out = new Float64Array(4);
  fc.assert(
    fc.property(anyA, anyQ, fc.double({ min: 0, max: 1, noNaN: true }), fc.boolean(), (a, q, turn, grows) => {
      const growth = grows ? { start: 0.97, perRadian: 0.01 } : CONSTANT_FIELD;
      solutionsAt(cycleOf(a, q, growth).series, turn, out);
      const size = Math.abs(out[0]! * out[3]!) + Math.abs(out[1]! * out[2]!);
      expect(Math.abs(out[0]! * out[3]! - out[1]! * out[2]! - 1)).toBeLessThan(3e-13 * Math.max(1, size));
    }),
  );
});

test("a field that has grown by a factor is a field of a and q times that factor", () => {
  const factor = 1.037;
  const grown = cycleOf(0.2, 0.7, { start: factor, perRadian: 0 }).state;
  const scaled = cycleOf(0.2 * factor, 0.7 * factor).state;
  expectWithin(
    1e-14,
    [...grown].map((value, i) => ({ at: `${i}`, error: Math.abs(value - scaled[i]!) })),
  );
});

test("a steadily growing static field moves an ion along Airy functions (DLMF 9.2.1, table 9.6 and 9.2.3 to 9.2.6)", () => {
  // x'' = −ξ x, i.e. a = 1, q = 0, k(ξ) = ξ: x(ξ) = Ai(−ξ), Bi(−ξ) combined; at ξ = 1 with x(0) = 1, x'(0) = 0:
  // C = [Bi'(0) Ai(−1) − Ai'(0) Bi(−1)] π and S = [Ai(0)Bi(−1) − Bi(0)Ai(−1)] (−π).
  const ai0 = 0.355028053887817;
  const dai0 = -0.258819403792807;
  const bi0 = 0.614926627446001;
  const dbi0 = 0.448288357353826;
  // Abramowitz and Stegun, table 10.11: Ai(−1) = 0.53556088, Bi(−1) = 0.10399739.
  const aiMinus1 = 0.53556088;
  const biMinus1 = 0.10399739;
  const { series } = cycleOf(1, 0, { start: 0, perRadian: 1 });
  const out = new Float64Array(4);
  solutionsAt(series, 1 / Math.PI, out);
  expectWithin(2e-8, [
    { at: "C", error: Math.abs(out[0]! - Math.PI * (dbi0 * aiMinus1 - dai0 * biMinus1)) },
    { at: "S", error: Math.abs(out[2]! + Math.PI * (ai0 * biMinus1 - bi0 * aiMinus1)) },
  ]);
});
