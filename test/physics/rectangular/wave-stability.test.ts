import fc from "fast-check";
import { expect, test } from "vitest";
import {
  waveHalfPeriod,
  waveHalfPeriodArray,
} from "../../../services/physics/rectangular/wave-half-period.ts";
import { waveHalfPeriodExtended } from "../../../services/physics/rectangular/wave-half-period-extended.ts";
import {
  planeStabilityRectangular,
  pointStabilityRectangular,
  WAVE_DOMAIN_LIMIT,
} from "../../../services/physics/rectangular/wave-stability.ts";
import { planeStability } from "../../../services/physics/stability.ts";
import { seededRandom } from "../../bench/random.ts";
import { type Deviation, expectWithin } from "../../measured-bound.ts";
import { RECTANGULAR_WAVES, SQUARE_WAVE_CUTOFF } from "../../reference/rectangular-waves.ts";
import { integratedHalfTrace, oscillationsPerPeriod } from "./integrated-wave.ts";
import { anyWave, dcCoupled, inverted, SQUARE } from "./waves.ts";

const anyParameter = fc.double({ min: -12, max: 12, noNaN: true });

test("half-traces, margins and exponents of 120 points computed at 60 digits", () => {
  const traces: Deviation[] = [];
  const margins: Deviation[] = [];
  const exponents: Deviation[] = [];
  for (const [a, q, dutyCycle, coupling, halfTrace, margin, folded] of RECTANGULAR_WAVES.points) {
    const plane = planeStabilityRectangular(a, q, { dutyCycle, coupling })!;
    const at = `a ${a}, q ${q}, duty ${dutyCycle} ${coupling}`;
    const scale = Math.max(1, Math.abs(halfTrace));
    traces.push({ at, error: Math.abs(plane.halfTrace - halfTrace) / scale });
    margins.push({ at, error: Math.abs(plane.margin - margin) / scale });
    expect(plane.stable, at).toBe(folded !== null);
    if (folded === null) continue;
    const band = plane.band!;
    const total = band % 2 === 0 ? band + folded : band + 1 - folded;
    exponents.push({ at, error: Math.abs(plane.characteristicExponent! - total) });
  }
  expect(exponents.length).toBeGreaterThan(70);
  expectWithin(1e-13, traces);
  expectWithin(1e-13, margins);
  expectWithin(1e-13, exponents);
});

test("the half-trace is that of a direct integration from edge to edge of the wave", () => {
  const deviations: Deviation[] = [];
  const random = seededRandom(41);
  for (let i = 0; i < 40; i++) {
    const wave = { dutyCycle: 0.1 + 0.8 * random(), coupling: i % 2 ? "dc" : "ac" } as const;
    const [a, q] = [2 * random() - 1, 3 * random()];
    const { halfTrace } = planeStabilityRectangular(a, q, wave)!;
    const error =
      Math.abs(integratedHalfTrace(a, q, wave, 2000) - halfTrace) / Math.max(1, Math.abs(halfTrace));
    deviations.push({ at: `a ${a}, q ${q}, duty ${wave.dutyCycle} ${wave.coupling}`, error });
  }
  // The integration's own error: fourth order in steps of 1/2000 of a level.
  expectWithin(1e-11, deviations);
});

test("the exponent, band and all, is the number of sign changes of an integrated motion per period", () => {
  const deviations: Deviation[] = [];
  const random = seededRandom(77);
  const bands = new Set<number>();
  while (deviations.length < 60) {
    const wave = { dutyCycle: 0.1 + 0.8 * random(), coupling: random() < 0.5 ? "dc" : "ac" } as const;
    const [a, q] = [12 * random() - 2, 8 * random() - 4];
    const plane = planeStabilityRectangular(a, q, wave)!;
    if (!(plane.stable && plane.margin > 0.02)) continue;
    bands.add(plane.band!);
    const counted = oscillationsPerPeriod(a, q, wave, 400);
    deviations.push({ at: `a ${a}, q ${q}`, error: Math.abs(counted - plane.characteristicExponent!) });
  }
  expect([...bands].sort()).toEqual([0, 1, 2, 3]);
  // One sign change more or less in 400 periods.
  expectWithin(2 / 400, deviations);
});

test("without DC and coupled for DC the half-traces are cos · cosh: Richards, Huey and Hiller 1973, from memory", () => {
  const deviations: Deviation[] = [];
  for (let i = 1; i < 200; i++) {
    const q = 0.006 * i;
    for (const d of [0.31, 0.5, 0.6, 0.612]) {
      const k = Math.sqrt(2 * q);
      const { x, y } = pointStabilityRectangular(0, q, dcCoupled(d))!;
      const ofX = Math.cos(k * d * Math.PI) * Math.cosh(k * (1 - d) * Math.PI);
      const ofY = Math.cosh(k * d * Math.PI) * Math.cos(k * (1 - d) * Math.PI);
      const at = `q ${q}, duty ${d}`;
      deviations.push({ at, error: Math.abs(x.halfTrace - ofX) / Math.max(1, Math.abs(ofX)) });
      deviations.push({ at, error: Math.abs(y.halfTrace - ofY) / Math.max(1, Math.abs(ofY)) });
    }
  }
  expectWithin(1e-14, deviations);
  expect(pointStabilityRectangular(0, SQUARE_WAVE_CUTOFF * (1 - 1e-12), SQUARE)!.stable).toBe(true);
  expect(pointStabilityRectangular(0, SQUARE_WAVE_CUTOFF * (1 + 1e-12), SQUARE)!.stable).toBe(false);
});

test("a DC-coupled wave is the AC-coupled one with its mean added to the DC", () => {
  fc.assert(
    fc.property(
      anyParameter,
      anyParameter,
      fc.double({ min: 0.1, max: 0.9, noNaN: true }),
      (a, q, dutyCycle) => {
        const throughMean = planeStabilityRectangular(a, q, { dutyCycle, coupling: "ac" })!;
        const shifted = a - 2 * q * (2 * dutyCycle - 1);
        const direct = planeStabilityRectangular(shifted, q, dcCoupled(dutyCycle));
        fc.pre(direct !== null);
        // The shift is rounded once, and a half-trace may move a thousand times faster than a.
        const scale = Math.max(1, Math.abs(throughMean.halfTrace));
        expect(Math.abs(direct!.halfTrace - throughMean.halfTrace) / scale).toBeLessThan(1e-9);
      },
    ),
  );
});

test("an inverted wave with q reversed is the same motion, and exchanging the planes exchanges the answers", () => {
  fc.assert(
    fc.property(anyParameter, anyParameter, anyWave, (a, q, wave) => {
      const point = pointStabilityRectangular(a, q, wave)!;
      const exchanged = pointStabilityRectangular(-a, -q, wave)!;
      expect(exchanged.x).toEqual(point.y);
      expect(exchanged.y).toEqual(point.x);
      const other = planeStabilityRectangular(a, -q, inverted(wave))!;
      fc.pre(Math.abs(point.x.margin) > 1e-6);
      expect(other.stable).toBe(point.x.stable);
      expect(other.band).toBe(point.x.band);
    }),
  );
});

test("the determinant of the half-period matrix is one, in doubles and in pairs of doubles, and both agree", () => {
  const determinants: Deviation[] = [];
  const agreements: Deviation[] = [];
  const random = seededRandom(5);
  const [plain, extended] = [waveHalfPeriodArray(), waveHalfPeriodArray()];
  for (let i = 0; i < 500; i++) {
    const wave = { dutyCycle: 0.05 + 0.9 * random(), coupling: i % 2 ? "dc" : "ac" } as const;
    const [a, q] = [6 * random() - 3, 6 * random() - 3];
    waveHalfPeriod(a, q, wave, plain);
    waveHalfPeriodExtended(a, q, wave, extended);
    const at = `a ${a}, q ${q}, duty ${wave.dutyCycle}`;
    for (const [c, dc, s, ds] of [plain, extended] as unknown as [number, number, number, number][]) {
      const size = Math.abs(c * ds) + Math.abs(s * dc);
      determinants.push({ at, error: Math.abs(c * ds - s * dc - 1) / size });
    }
    const largest = Math.max(...Array.from(extended.slice(0, 4), Math.abs));
    for (let k = 0; k < 4; k++) agreements.push({ at, error: Math.abs(plain[k]! - extended[k]!) / largest });
  }
  expectWithin(3e-14, determinants);
  expectWithin(1e-14, agreements);
});

test("without RF the field is static, as for the sinusoid", () => {
  for (const a of [-2, 0, 0.3, 7]) {
    expect(planeStabilityRectangular(a, 0, dcCoupled(0.3))).toEqual(planeStability(a, 0));
  }
});

test("outside the domain, and for a duty cycle that is none, there is no answer instead of a wrong one", () => {
  expect(pointStabilityRectangular(0, WAVE_DOMAIN_LIMIT * 1.001, SQUARE)).toBeNull();
  expect(pointStabilityRectangular(-100, 100, dcCoupled(0.02))).toBeNull();
  for (const duty of [0, 1, -0.2, Number.NaN])
    expect(pointStabilityRectangular(0, 0.5, dcCoupled(duty))).toBeNull();
  const random = seededRandom(9);
  for (let i = 0; i < 2000; i++) {
    const wave = { dutyCycle: 0.001 + 0.998 * random(), coupling: i % 2 ? "dc" : "ac" } as const;
    expect(pointStabilityRectangular(24 * random() - 12, 24 * random() - 12, wave)).not.toBeNull();
  }
});
