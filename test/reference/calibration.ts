import { readReference } from "./read-reference.ts";

interface LinearRegressionSet {
  readonly x: readonly number[];
  readonly y: readonly number[];
  readonly degree: 1 | 2;
  readonly coefficients: readonly number[];
  readonly standardUncertainties: readonly number[];
  readonly residualStandardDeviation: number;
  readonly influences: readonly (readonly [
    index: number,
    residual: number,
    leverage: number,
    studentizedResidual: number,
    cookDistance: number,
  ])[];
  readonly prediction: {
    readonly at: number;
    readonly value: number;
    readonly standardUncertainty: number;
    readonly ofOneMore: number;
  };
}
interface Calibration {
  readonly sets: Readonly<Record<"Norris" | "Pontius", LinearRegressionSet>>;
  readonly studentT: readonly (readonly [confidence: number, degreesOfFreedom: number, t: number])[];
}
export const CALIBRATION = readReference<Calibration>("calibration");

/** Two-sided quantiles of Student's t as statistics handbooks print them: NIST/SEMATECH 1.3.6.7.2, from memory. */
export const PRINTED_T = [
  [0.9, 1, "6.314"],
  [0.95, 1, "12.706"],
  [0.95, 2, "4.303"],
  [0.95, 5, "2.571"],
  [0.95, 10, "2.228"],
  [0.95, 30, "2.042"],
  [0.95, 100, "1.984"],
  [0.98, 4, "3.747"],
  [0.99, 10, "3.169"],
  [0.99, 60, "2.660"],
] as const;
