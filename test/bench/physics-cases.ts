import { characteristicA, characteristicB } from "../../services/physics/characteristic-values.ts";
import { APEX_Q, APEX_RATIO, RF_ONLY_LIMIT_Q } from "../../services/physics/first-region.ts";
import { mzTimesQPerVolt } from "../../services/physics/mathieu-parameters.ts";
import { passbandOf } from "../../services/physics/passband.ts";
import { setPointOf } from "../../services/physics/set-point.ts";
import { planeStability, pointStability } from "../../services/physics/stability.ts";
import type { BenchCase } from "./bench-case.ts";
import { seededRandom } from "./random.ts";
import { RungeKutta } from "./runge-kutta.ts";

const COUNT = 1024;
const FIELD = { fieldRadius: 0.004, frequency: 1.2e6 };
const MZ_TIMES_Q = mzTimesQPerVolt(FIELD);

interface Point {
  readonly a: number;
  readonly q: number;
}

function pointsBetween(seed: number, qLow: number, qHigh: number, aLow: number, aHigh: number): Point[] {
  const random = seededRandom(seed);
  return Array.from({ length: COUNT }, () => ({
    a: aLow + (aHigh - aLow) * random(),
    q: qLow + (qHigh - qLow) * random(),
  }));
}

/** Points with x in the lowest band at large q, a thousandth as wide as a is deep: there the series runs in pairs. */
function narrowBandPoints(seed: number): Point[] {
  const random = seededRandom(seed);
  return Array.from({ length: COUNT }, () => {
    const q = 7.5 + random();
    const low = characteristicA(0, q)!;
    return { a: low + (0.1 + 0.8 * random()) * (characteristicB(1, q)! - low), q };
  });
}

/** β of both planes, 0 where unstable. */
function sumOfExponents(points: readonly Point[]): number {
  let sum = 0;
  for (const { a, q } of points) {
    const answer = pointStability(a, q)!;
    sum += (answer.x.characteristicExponent ?? 0) + (answer.y.characteristicExponent ?? 0);
  }
  return sum;
}

/** The same from half-traces; the band is not known to an integration of one period, so points lie in the lowest. */
function sumOfIntegratedExponents(points: readonly Point[], integration: RungeKutta): number {
  let sum = 0;
  for (const { a, q } of points) {
    const x = integration.halfTrace(a, q);
    const y = integration.halfTrace(-a, -q);
    if (Math.abs(x) < 1) sum += Math.acos(x) / Math.PI;
    if (Math.abs(y) < 1) sum += Math.acos(y) / Math.PI;
  }
  return sum;
}

function worstHalfTrace(points: readonly Point[], integration: RungeKutta): string {
  let worst = 0;
  for (const { a, q } of points) {
    const { halfTrace } = planeStability(a, q)!;
    const error = Math.abs(integration.halfTrace(a, q) - halfTrace) / Math.max(1, Math.abs(halfTrace));
    worst = Math.max(worst, error);
  }
  return worst.toExponential(1);
}

function stabilityCase(name: string, points: readonly Point[], steps: number, timed: boolean): BenchCase {
  const integration = new RungeKutta(steps);
  return {
    name,
    target: timed ? { of: "time", most: 0.6, stretch: 0.25 } : null,
    unit: "us",
    a: {
      label: "half-period series: bands, exponents, margins",
      operations: COUNT,
      run: () => sumOfExponents(points),
    },
    b: {
      label: `Runge-Kutta of order four, ${steps} steps a cycle`,
      operations: COUNT,
      run: () => sumOfIntegratedExponents(points, integration),
    },
    checksumTolerance: 1e-5,
    note: `worst error of a half-trace: series below 1e-12, integration ${worstHalfTrace(points, integration)}`,
  };
}

const scanRandom = seededRandom(3);
/** Drives whose windows have R from about 10 to 5000. */
const DRIVES = Array.from({ length: COUNT }, () => {
  const rf = 100 + 1900 * scanRandom();
  const resolution = 10 * Math.exp(scanRandom() * Math.log(500));
  return { rf, dc: rf * (APEX_RATIO - 0.1264 / resolution) };
});

function sumOfWidths(): number {
  let sum = 0;
  for (const { dc, rf } of DRIVES) {
    const answer = passbandOf(dc, rf, FIELD);
    if (answer.kind === "window") sum += answer.passband.mzWidth!;
  }
  return sum;
}

/** The edge at which one plane stops being stable, halved down to the last digit. */
function bisectEdge(stable: number, unstable: number, isStable: (q: number) => boolean): number {
  let inside = stable;
  let outside = unstable;
  for (let i = 0; i < 60; i++) {
    const middle = (inside + outside) / 2;
    if (middle === inside || middle === outside) break;
    if (isStable(middle)) inside = middle;
    else outside = middle;
  }
  return inside;
}

function sumOfBisectedWidths(): number {
  let sum = 0;
  for (const { dc, rf } of DRIVES) {
    const slope = (2 * dc) / rf;
    const low = bisectEdge(APEX_Q, 0, (q) => planeStability(-slope * q, -q)!.stable);
    const high = bisectEdge(APEX_Q, RF_ONLY_LIMIT_Q, (q) => planeStability(slope * q, q)!.stable);
    sum += (MZ_TIMES_Q * rf) / low - (MZ_TIMES_Q * rf) / high;
  }
  return sum;
}

const targetRandom = seededRandom(4);
/** Ions of m/z 20 to 2000 with windows of 0.3 to 3. */
const TARGETS = Array.from({ length: COUNT }, () => ({
  mz: 20 * Math.exp(targetRandom() * Math.log(100)),
  width: 0.3 * Math.exp(targetRandom() * Math.log(10)),
}));

function sumOfSetPoints(): number {
  let sum = 0;
  for (const { mz, width } of TARGETS) {
    const answer = setPointOf(mz, width, FIELD);
    if (answer.kind === "set-point") sum += answer.dcVolts + answer.rfVolts;
  }
  return sum;
}

/** U/V halved until the passband has the wanted resolution, then V from the centre. */
function sumOfBisectedSetPoints(): number {
  let sum = 0;
  for (const { mz, width } of TARGETS) {
    const wanted = mz / width;
    let low = 0.01;
    let high = APEX_RATIO;
    for (let i = 0; i < 50; i++) {
      const ratio = (low + high) / 2;
      const answer = passbandOf(ratio, 1, FIELD);
      if (answer.kind === "window" && answer.passband.resolution! < wanted) low = ratio;
      else high = ratio;
    }
    const unit = passbandOf(low, 1, FIELD);
    if (unit.kind === "window") sum += (mz / unit.passband.mzCentre!) * (1 + low);
  }
  return sum;
}

export const PHYSICS_CASES: readonly BenchCase[] = [
  stabilityCase(
    "stability of an ion in and around the first region",
    pointsBetween(1, 0.1, 0.9, 0, 0.25),
    100,
    true,
  ),
  stabilityCase(
    "stability of an ion in a narrow band at q near 8 (pairs of doubles)",
    narrowBandPoints(2),
    1600,
    false,
  ),
  {
    name: "passband of a drive",
    target: { of: "time", most: 3, stretch: 1.5 },
    unit: "us",
    a: { label: "Newton on the continued fractions", operations: COUNT, run: sumOfWidths },
    b: { label: "bisection with the half-period series", operations: COUNT, run: sumOfBisectedWidths },
    checksumTolerance: 1e-9,
    note: "a also keeps the width's digits at R 1e5, b subtracts the edges",
  },
  {
    name: "set point from m/z and width",
    target: { of: "time", most: 10, stretch: 4 },
    unit: "us",
    a: { label: "Newton in two unknowns", operations: COUNT, run: sumOfSetPoints },
    b: { label: "bisection of U/V over the passband", operations: COUNT, run: sumOfBisectedSetPoints },
    checksumTolerance: 1e-9,
  },
];
