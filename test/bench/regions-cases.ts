import type { RectangularWave } from "../../services/physics/rectangular/rectangular-wave.ts";
import { waveForResolution } from "../../services/physics/rectangular/wave-resolution.ts";
import { pointStabilityRectangular } from "../../services/physics/rectangular/wave-stability.ts";
import { waveWindowsOnScanLine } from "../../services/physics/rectangular/wave-windows.ts";
import { regionRatioForResolution } from "../../services/physics/regions/region-set-point.ts";
import { windowInRegion } from "../../services/physics/regions/scan-line-windows.ts";
import { REGIONS } from "../../services/physics/regions/stability-regions.ts";
import { pointStability } from "../../services/physics/stability.ts";
import { integratedHalfTrace } from "../physics/rectangular/integrated-wave.ts";
import type { BenchCase } from "./bench-case.ts";
import { seededRandom } from "./random.ts";

const THIRD = REGIONS.find(({ name }) => name === "third")!;
const SQUARE: RectangularWave = { dutyCycle: 0.5, coupling: "dc" };

function numbers(seed: number, count: number, low: number, high: number): number[] {
  const random = seededRandom(seed);
  return Array.from({ length: count }, () => low + (high - low) * random());
}

/** What a script does without the theory: walk along the line, then halve between the last two points. */
function windowByWalking(
  isStable: (q: number) => boolean,
  from: number,
  to: number,
  step: number,
): readonly [low: number, high: number] {
  const edges: number[] = [];
  let before = isStable(from);
  for (let q = from + step; q < to && edges.length < 2; q += step) {
    const now = isStable(q);
    if (now !== before) edges.push(halved(isStable, q - step, q));
    before = now;
  }
  return [edges[0] ?? 0, edges[1] ?? 0];
}

function halved(isStable: (q: number) => boolean, from: number, to: number): number {
  const atFrom = isStable(from);
  let [low, high] = [from, to];
  for (let i = 0; i < 44; i++) {
    const middle = (low + high) / 2;
    if (isStable(middle) === atFrom) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

const thirdRatios = numbers(11, 64, 0.452, 0.485);
const squareRatios = numbers(12, 64, 0.01, 0.2);
const resolutions = numbers(13, 64, 50, 5000);
const ions = numbers(14, 256, 0.3, 0.7);

function sumOverWindows(
  ratios: readonly number[],
  edges: (ratio: number) => readonly [number, number],
): number {
  let sum = 0;
  for (const ratio of ratios) {
    const [low, high] = edges(ratio);
    sum += low + high;
  }
  return sum;
}

function squareEdges(ratio: number): readonly [number, number] {
  const found = waveWindowsOnScanLine(ratio, SQUARE, "first");
  if (found.kind !== "windows") return [0, 0];
  const { low, high } = found.windows[0]!;
  return [low!.q, high!.q];
}

/** U/V of the square wave for a resolution, by halving between no DC and the apex. */
function ratioByHalving(resolution: number): number {
  let [wide, narrow] = [0, 0.21533914033629786];
  for (let i = 0; i < 50; i++) {
    const middle = (wide + narrow) / 2;
    const [low, high] = squareEdges(middle);
    if ((low + high) / (2 * (high - low)) < resolution) wide = middle;
    else narrow = middle;
  }
  return (wide + narrow) / 2;
}

export const REGIONS_CASES: readonly BenchCase[] = [
  {
    name: "window of the third region",
    target: { of: "time", most: 3 },
    unit: "us",
    a: {
      label: "crossings of the characteristic curves",
      operations: thirdRatios.length,
      run: () =>
        sumOverWindows(thirdRatios, (ratio) => {
          const found = windowInRegion(THIRD, ratio);
          return found.kind === "window" ? [found.window.low!.q, found.window.high.q] : [0, 0];
        }),
    },
    b: {
      label: "walk in steps of 0.005 and halving, same half-period kernel",
      operations: thirdRatios.length,
      run: () =>
        sumOverWindows(thirdRatios, (ratio) =>
          windowByWalking((q) => pointStability(2 * ratio * q, q)!.stable, 2.7, 3.3, 0.005),
        ),
    },
    checksumTolerance: 1e-12,
  },
  {
    name: "set point in the third region",
    target: null,
    unit: "us",
    a: {
      label: "Newton on the logarithm of the edges' quotient",
      operations: resolutions.length,
      run: () => {
        let sum = 0;
        for (const resolution of resolutions) {
          const solved = regionRatioForResolution(THIRD, resolution);
          if (solved.kind === "ratio") sum += solved.ratio;
        }
        return sum;
      },
    },
    b: {
      label: "halving of U/V, same windows",
      operations: resolutions.length,
      run: () => {
        let sum = 0;
        for (const resolution of resolutions) {
          let [wide, narrow] = [THIRD.inner.ratio, THIRD.highTip.ratio];
          for (let i = 0; i < 50; i++) {
            const middle = (wide + narrow) / 2;
            const found = windowInRegion(THIRD, middle);
            const isWide =
              found.kind === "window" &&
              (found.window.low!.q + found.window.high.q) / (2 * found.window.qWidth) < resolution;
            if (isWide) wide = middle;
            else narrow = middle;
          }
          sum += (wide + narrow) / 2;
        }
        return sum;
      },
    },
    checksumTolerance: 1e-12,
  },
  {
    name: "stability of an ion, rectangular wave",
    target: { of: "time", most: 0.6 },
    unit: "us",
    a: {
      label: "two exact matrices: bands, exponents, margins",
      operations: ions.length,
      run: () => {
        let sum = 0;
        for (const q of ions) {
          const { x, y } = pointStabilityRectangular(0.1 * q, q, SQUARE)!;
          sum += x.halfTrace + y.halfTrace;
        }
        return sum;
      },
    },
    b: {
      label: "Runge–Kutta, 2 x 40 steps a period, half-traces only",
      operations: ions.length,
      run: () => {
        let sum = 0;
        for (const q of ions) {
          const a = 0.1 * q;
          sum += integratedHalfTrace(a, q, SQUARE, 40) + integratedHalfTrace(-a, -q, SQUARE, 40);
        }
        return sum;
      },
    },
    checksumTolerance: 1e-4,
    note: "The integration's half-traces are right to about 1e-5, the matrices' to 1e-13.",
  },
  {
    name: "passband of a square wave with DC",
    target: null,
    unit: "us",
    a: {
      label: "edges by quarter turns",
      operations: squareRatios.length,
      run: () => sumOverWindows(squareRatios, squareEdges),
    },
    b: {
      label: "walk in steps of 0.005 and halving, same matrices",
      operations: squareRatios.length,
      run: () =>
        sumOverWindows(squareRatios, (ratio) =>
          windowByWalking((q) => pointStabilityRectangular(2 * ratio * q, q, SQUARE)!.stable, 1e-6, 1, 0.005),
        ),
    },
    checksumTolerance: 1e-12,
  },
  {
    name: "U/V of a square wave for a resolution",
    target: null,
    unit: "us",
    a: {
      label: "inverse quadratic interpolation between open and closed",
      operations: resolutions.length,
      run: () => {
        let sum = 0;
        for (const resolution of resolutions) {
          const tuned = waveForResolution(resolution, { vary: "ratio", wave: SQUARE, towards: "high" });
          if (tuned.kind === "tuned") sum += tuned.ratio;
        }
        return sum;
      },
    },
    b: {
      label: "halving, same windows",
      operations: resolutions.length,
      run: () => resolutions.reduce((sum, resolution) => sum + ratioByHalving(resolution), 0),
    },
    checksumTolerance: 1e-12,
  },
];
