import { test } from "vitest";
import { sectorMasses } from "../../../services/physics/transmission/sector-mass.ts";
import { type Deviation, expectWithin } from "../../measured-bound.ts";

function sectorMass(distance: number, t1: number, t2: number): number {
  return sectorMasses(
    Float64Array.of(1 / (distance * distance)),
    Float64Array.of(t1),
    Float64Array.of(t2),
    1,
  );
}

/** Owen's T(h, a) = arctan(a)/2π − the mass of the triangle at distance h from slope 0 to a. */
function owensT(h: number, a: number): number {
  return Math.atan(a) / (2 * Math.PI) - sectorMass(h, 0, a);
}

test("Owen's T at the six points of Patefield and Tandy, J. Stat. Softw. 5 (2000) issue 5 (values from memory)", () => {
  const table = [
    [0.0625, 0.25, 3.891193023470137e-2],
    [6.5, 0.4375, 2.000577304850832e-11],
    [7, 0.96875, 6.399062719389869e-13],
    [4.78125, 0.0625, 1.0632974804687463e-7],
    [2, 0.5, 8.625077985521507e-3],
    [1, 0.9999975, 0.0667418089782286],
  ] as const;
  const deviations: Deviation[] = table.map(([h, a, t]) => ({
    at: `h ${h}, a ${a}`,
    error: Math.abs(owensT(h, a) - t),
  }));
  expectWithin(5e-11, deviations);
});

test("T(h, 1) = Φ(h)(1 − Φ(h))/2 and T(0, a) = arctan(a)/2π (Owen, Ann. Math. Statist. 27 (1956) 1075)", () => {
  // Φ(1) from Abramowitz and Stegun, table 26.1.
  const upToOne = 0.841344746068543;
  const deviations: Deviation[] = [
    { at: "T(1, 1)", error: Math.abs(owensT(1, 1) - 0.5 * upToOne * (1 - upToOne)) },
    { at: "T(0, 3)", error: Math.abs(owensT(1e-9, 3) - Math.atan(3) / (2 * Math.PI)) },
  ];
  expectWithin(1e-15, deviations);
});

/** Simpson's rule in x = tan θ; the angle is bounded, so equal steps in θ do. */
function bySimpson(distance: number, t1: number, t2: number): number {
  const steps = 20_000;
  const [from, to] = [Math.atan(t1), Math.atan(t2)];
  const h = (to - from) / steps;
  let sum = 0;
  for (let i = 0; i <= steps; i++) {
    const secant = 1 / Math.cos(from + i * h);
    const weight = i === 0 || i === steps ? 1 : i % 2 === 1 ? 4 : 2;
    sum += weight * -Math.expm1(-0.5 * distance * distance * secant * secant);
  }
  return (sum * h) / (6 * Math.PI);
}

test("spans of every length and distances from 0.02 to 5 agree with Simpson's rule in the angle", () => {
  const deviations: Deviation[] = [];
  for (const distance of [0.02, 0.1, 0.4, 1, 2.5, 5]) {
    for (const middle of [0, -0.7, 2, 12]) {
      for (const half of [0.003, 0.02, 0.06, 0.2, 0.5, 2, 10]) {
        const reference = bySimpson(distance, middle - half, middle + half);
        const error = Math.abs(sectorMass(distance, middle - half, middle + half) - reference) / reference;
        deviations.push({ at: `d ${distance}, ${middle} ± ${half}`, error });
      }
    }
  }
  expectWithin(4e-7, deviations);
});
