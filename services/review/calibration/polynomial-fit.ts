import { Matrix, QrDecomposition } from "ml-matrix";
import { studentT } from "./student-t.ts";

/** One observation; weights are relative (1/σ²). */
export interface Observation {
  readonly at: number;
  readonly value: number;
  readonly weight: number;
}

export interface Coefficient {
  readonly power: number;
  readonly value: number;
  /** Null where the scatter does not show it: as many observations as coefficients. */
  readonly standardUncertainty: number | null;
}

/** How much one observation says and pulls. */
export interface Influence {
  readonly residual: number;
  /** Diagonal of the hat matrix, 0 to 1: at 1 the fit runs through the observation whatever it says. */
  readonly leverage: number;
  /** Residual over what it would scatter by if this observation were left out of the scatter; null where unknown. */
  readonly studentizedResidual: number | null;
  /** Cook's distance: how far the whole fit moves without this observation, in units of its own uncertainty. */
  readonly cookDistance: number | null;
}

export interface FittedValue {
  readonly value: number;
  readonly standardUncertainty: number | null;
  /** Half the interval for one more observation of unit weight, times √(1/weight); null without degrees of freedom. */
  readonly halfInterval: number | null;
}

export interface PolynomialFit {
  readonly degree: number;
  readonly coefficients: readonly Coefficient[];
  readonly degreesOfFreedom: number;
  /** Of one observation of unit weight; null without degrees of freedom. */
  readonly residualStandardDeviation: number | null;
  readonly influences: readonly Influence[];
  predict(at: number, confidence: number, weight: number): FittedValue;
}

export type FitFailure = "too-few-points" | "too-few-different-points";

/** Powers of the scaled variable, so that an m/z squared of a million does not cost digits. */
const powersOf = (scaled: number, degree: number) =>
  Array.from({ length: degree + 1 }, (_, power) =>
    power === 0 ? 1 : power === 1 ? scaled : scaled * scaled,
  );

/** Rows: coefficients of (1, (x − c)/h, ((x − c)/h)²) in powers of x. */
function unscaling(centre: number, half: number, degree: number): Matrix {
  const rows = [
    [1, -centre / half, (centre / half) * (centre / half)],
    [0, 1 / half, (-2 * centre) / (half * half)],
    [0, 0, 1 / (half * half)],
  ];
  return new Matrix(rows.slice(0, degree + 1).map((row) => row.slice(0, degree + 1)));
}

/**
 * Weighted least squares by QR (Golub and Van Loan, Matrix Computations, section 5.3). The scatter of the residuals sets
 * the scale of every uncertainty, so that weights need only be right relative to each other. Influence after Cook,
 * Technometrics 19 (1977) 15, from memory.
 */
export function fitPolynomial(
  observations: readonly Observation[],
  degree: 1 | 2,
): PolynomialFit | FitFailure {
  const count = observations.length;
  const unknowns = degree + 1;
  if (count < unknowns) return "too-few-points";
  if (new Set(observations.map(({ at }) => at)).size < unknowns) return "too-few-different-points";
  const lowest = observations.reduce((least, { at }) => Math.min(least, at), Number.POSITIVE_INFINITY);
  const highest = observations.reduce((most, { at }) => Math.max(most, at), Number.NEGATIVE_INFINITY);
  const centre = (lowest + highest) / 2;
  const half = (highest - lowest) / 2;

  const rowOf = (at: number) => powersOf((at - centre) / half, degree);
  const roots = observations.map(({ weight }) => Math.sqrt(weight));
  const design = new Matrix(
    observations.map(({ at }, index) => rowOf(at).map((entry) => entry * roots[index]!)),
  );
  const values = Matrix.columnVector(observations.map(({ value }, index) => value * roots[index]!));
  const decomposition = new QrDecomposition(design);
  const solution = decomposition.solve(values);
  const inverse = new QrDecomposition(decomposition.upperTriangularMatrix).solve(Matrix.eye(unknowns));
  const covariance = inverse.mmul(inverse.transpose());

  const residuals = observations.map(
    ({ at, value }) =>
      value - rowOf(at).reduce((sum, entry, power) => sum + entry * solution.get(power, 0), 0),
  );
  const squares = residuals.reduce(
    (sum, residual, index) => sum + residual * residual * observations[index]!.weight,
    0,
  );
  const degreesOfFreedom = count - unknowns;
  const variance = degreesOfFreedom === 0 ? null : squares / degreesOfFreedom;
  const quadraticForm = (row: readonly number[]) => {
    const vector = Matrix.rowVector([...row]);
    return vector.mmul(covariance).mmul(vector.transpose()).get(0, 0);
  };

  const back = unscaling(centre, half, degree);
  const plain = back.mmul(solution);
  const plainCovariance = back.mmul(covariance).mmul(back.transpose());
  return {
    degree,
    coefficients: Array.from({ length: unknowns }, (_, power) => ({
      power,
      value: plain.get(power, 0),
      standardUncertainty: variance === null ? null : Math.sqrt(variance * plainCovariance.get(power, power)),
    })),
    degreesOfFreedom,
    residualStandardDeviation: variance === null ? null : Math.sqrt(variance),
    influences: observations.map(({ at, weight }, index) => {
      const leverage = Math.min(1, quadraticForm(rowOf(at)) * weight);
      return {
        residual: residuals[index]!,
        leverage,
        ...pullOf(residuals[index]! * roots[index]!, leverage),
      };
    }),
    predict: (at, confidence, weight) => {
      const row = rowOf(at);
      const value = row.reduce((sum, entry, power) => sum + entry * solution.get(power, 0), 0);
      if (variance === null) return { value, standardUncertainty: null, halfInterval: null };
      const ofFit = quadraticForm(row);
      return {
        value,
        standardUncertainty: Math.sqrt(variance * ofFit),
        halfInterval: studentT(confidence, degreesOfFreedom) * Math.sqrt(variance * (ofFit + 1 / weight)),
      };
    },
  };

  function pullOf(scaled: number, leverage: number) {
    const rest = 1 - leverage;
    if (variance === null || variance === 0 || rest <= Number.EPSILON * count) {
      return { studentizedResidual: null, cookDistance: null };
    }
    const internal = (scaled * scaled) / (variance * rest);
    const withoutIt = degreesOfFreedom - internal;
    return {
      studentizedResidual:
        degreesOfFreedom < 2 || withoutIt <= 0
          ? null
          : Math.sign(scaled) * Math.sqrt((internal * (degreesOfFreedom - 1)) / withoutIt),
      cookDistance: (internal * leverage) / (rest * unknowns),
    };
  }
}
