import fc from "fast-check";
import { expect, test } from "vitest";
import { halfPeriod } from "../../services/physics/half-period.ts";
import { halfPeriodExtended } from "../../services/physics/half-period-extended.ts";
import { type Deviation, expectWithin } from "../measured-bound.ts";
import { STABILITY_POINTS } from "../reference/tables.ts";

const half = new Float64Array(4);

function halfTraceError(kernel: typeof halfPeriod, a: number, q: number, reference: number): Deviation {
  kernel(a, q, half);
  const halfTrace = half[0]! * half[3]! + half[1]! * half[2]!;
  return { at: `a ${a}, q ${q}`, error: Math.abs(halfTrace - reference) / Math.max(1, Math.abs(reference)) };
}

function againstReference(kernel: typeof halfPeriod, within: (a: number, q: number) => boolean): Deviation[] {
  return STABILITY_POINTS.filter(([a, q]) => within(a, q)).flatMap(([a, q, x, y]) => [
    halfTraceError(kernel, a, q, x),
    halfTraceError(kernel, -a, -q, y),
  ]);
}

test("the half-trace is right to 3e-15 in and around the first region", () => {
  expectWithin(
    1e-14,
    againstReference(halfPeriod, (a, q) => Math.abs(a) <= 0.3 && q <= 1),
  );
});

test("the half-trace is right to 1e-12 wherever |a| and |q| stay below 12", () => {
  expectWithin(
    1e-12,
    againstReference(halfPeriod, () => true),
  );
});

test("pairs of doubles give the half-trace to the last digit", () => {
  expectWithin(
    3e-15,
    againstReference(halfPeriodExtended, () => true),
  );
});

test("a static field gives the circular and hyperbolic functions", () => {
  const deviations: Deviation[] = [];
  for (let a = -12; a <= 12; a += 0.37) {
    halfPeriod(a, 0, half);
    const root = Math.sqrt(Math.abs(a));
    const x = (Math.PI / 2) * root;
    const [cos, sin] = a < 0 ? [Math.cosh(x), Math.sinh(x)] : [Math.cos(x), Math.sin(x)];
    const expected = [cos, a < 0 ? root * sin : -root * sin, sin / root, cos];
    const scale = Math.max(1, Math.abs(root * sin), Math.abs(cos));
    for (let i = 0; i < 4; i++) {
      deviations.push({ at: `a ${a}, value ${i}`, error: Math.abs(half[i]! - expected[i]!) / scale });
    }
  }
  expectWithin(3e-14, deviations);
});

test("the determinant of the half-period matrix is 1 at every scale", () => {
  const deviations: Deviation[] = [];
  fc.assert(
    fc.property(
      fc.double({ min: -100, max: 100, noNaN: true }),
      fc.double({ min: -100, max: 100, noNaN: true }),
      fc.integer({ min: 0, max: 12 }),
      (aFull, qFull, tenth) => {
        let scale = 1;
        for (let i = 0; i < tenth; i++) scale /= 10;
        const a = aFull * scale;
        const q = qFull * scale;
        halfPeriod(a, q, half);
        const [c, dc, s, ds] = half as unknown as [number, number, number, number];
        const error = Math.abs(c * ds - s * dc - 1) / (1 + Math.abs(c * ds) + Math.abs(s * dc));
        deviations.push({ at: `a ${a}, q ${q}`, error });
        expect(error).toBeLessThan(2e-14);
      },
    ),
    { numRuns: 1000, seed: 28 },
  );
  expectWithin(2e-14, deviations);
});

test("plain and paired arithmetic agree where they hand over to each other", () => {
  const plain = new Float64Array(4);
  fc.assert(
    fc.property(
      fc.double({ min: -12, max: 12, noNaN: true }),
      fc.double({ min: -12, max: 12, noNaN: true }),
      (a, q) => {
        halfPeriod(a, q, plain);
        halfPeriodExtended(a, q, half);
        const scale = Math.max(...half.map(Math.abs));
        for (let i = 0; i < 4; i++) expect(Math.abs(plain[i]! - half[i]!)).toBeLessThan(2e-13 * scale);
      },
    ),
    { numRuns: 500 },
  );
});
