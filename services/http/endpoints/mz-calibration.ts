import type { z } from "zod";
import { driveToCanonical } from "../../contract/drive.ts";
import type { ErrorItem } from "../../contract/rule.ts";
import { hertzFromMHz, mmFromMetres } from "../../contract/si.ts";
import { widthInMz } from "../../contract/width.ts";
import { effectiveFieldRadius } from "../../physics/effective-field-radius.ts";
import {
  type FitFailure,
  fitPolynomial,
  type PolynomialFit,
} from "../../review/calibration/polynomial-fit.ts";
import { defineEndpoint } from "../endpoint.ts";
import { MZ_CALIBRATION_EXAMPLES } from "../examples/mz-calibration.ts";
import { type CalibrationLine, MzCalibrationAnswer, MzCalibrationRequest } from "../shapes/mz-calibration.ts";

type Request = z.output<typeof MzCalibrationRequest>;
type Answer = z.input<typeof MzCalibrationAnswer>;

export const mzCalibration = defineEndpoint({
  operationId: "mzCalibration",
  method: "post",
  path: "/v1/mz-calibration",
  tag: "Mass filter",
  summary: "Position and width of measured peaks as a line, what each peak pulls, and what to expect between",
  description:
    "Weighted least squares of observed less set m/z and of the width, with standard uncertainties from the scatter of the residuals, leverage and Cook distance of each peak, prediction intervals (Student t at the stated confidence) and a mark on extrapolations; and, where volts are stated, the field radius that they imply. sigma weighs peaks against each other; the scatter sets the scale, and for one more peak the largest stated sigma counts.",
  request: MzCalibrationRequest,
  rules: [sigmaForAllOrNone, frequencyWithDrives],
  work: null,
  answer: MzCalibrationAnswer,
  examples: MZ_CALIBRATION_EXAMPLES,
  handler(request) {
    const position = positionFit(request);
    const { fit: width, at: widthAt } = widthFit(request);
    const sigmas = request.peaks.map(({ sigma = 1 }) => sigma);
    const largest = Math.max(...sigmas);
    const weight = 1 / (largest * largest);
    const set = request.peaks.map(({ setMz }) => setMz);
    const [lowest, highest] = [Math.min(...set), Math.max(...set)];
    const predictions = (request.wanted ?? []).map((setMz) => {
      const offset = intervalOf(position, setMz, request.confidence, weight);
      return {
        setMz,
        extrapolated: setMz < lowest || setMz > highest,
        offset,
        observedMz: offset && setMz + offset.value,
        width: intervalOf(width, setMz, request.confidence, 1),
      };
    });
    return {
      ...(typeof position === "string"
        ? { position: null, positionReason: position }
        : { position: lineShown(position, indices(request.peaks.length)), positionReason: null }),
      ...(typeof width === "string"
        ? { width: null, widthReason: width }
        : { width: lineShown(width, withWidth(request)), widthReason: null }),
      widthAt,
      predictions,
      effectiveFieldRadius: radiusOf(request),
    };
  },
});

function sigmaForAllOrNone({ peaks }: Request): ErrorItem[] {
  const without = indices(peaks.length).filter((index) => peaks[index]!.sigma === undefined);
  if (without.length === 0 || without.length === peaks.length) return [];
  return without.map((index) => ({
    pointer: `/peaks/${index}/sigma`,
    code: "missing-member",
    detail: "sigma is missing; it is stated for all peaks or for none.",
  }));
}

function frequencyWithDrives({ peaks, frequency_MHz }: Request): ErrorItem[] {
  if (frequency_MHz !== undefined || peaks.every(({ drive }) => drive === undefined)) return [];
  return [
    {
      pointer: "/frequency_MHz",
      code: "missing-member",
      detail: "frequency_MHz is missing; the effective field radius of a peak with its drive needs it.",
    },
  ];
}

const indices = (count: number) => Array.from({ length: count }, (_, index) => index);

function positionFit({ peaks, positionDegree }: Request): PolynomialFit | FitFailure {
  return fitPolynomial(
    peaks.map(({ setMz, observedMz, sigma = 1 }) => ({
      at: setMz,
      value: observedMz - setMz,
      weight: 1 / (sigma * sigma),
    })),
    positionDegree === 1 ? 1 : 2,
  );
}

type NotFitted = NonNullable<Answer["widthReason"]>;

function widthFit({ peaks }: Request): { fit: PolynomialFit | NotFitted; at: Answer["widthAt"] } {
  const stated = peaks.flatMap(({ setMz, observedMz, width }) =>
    width === undefined ? [] : [{ at: setMz, value: widthInMz(width, observedMz), height: width.at }],
  );
  const heights = new Set(stated.map(({ height }) => height));
  if (heights.size > 1) return { fit: "widths-at-different-heights", at: null };
  const fit = fitPolynomial(
    stated.map(({ at, value }) => ({ at, value, weight: 1 })),
    1,
  );
  return { fit, at: stated[0]?.height ?? null };
}

function withWidth({ peaks }: Request): number[] {
  return indices(peaks.length).filter((index) => peaks[index]!.width !== undefined);
}

/** `peaks` are the indices in the request of the observations of the fit. */
function lineShown(
  { coefficients, degreesOfFreedom, residualStandardDeviation, influences }: PolynomialFit,
  peaks: readonly number[],
): CalibrationLine {
  let most = -1;
  for (const [index, { cookDistance }] of influences.entries()) {
    if (cookDistance !== null && (most < 0 || cookDistance > (influences[most]!.cookDistance ?? 0)))
      most = index;
  }
  return {
    coefficients: [...coefficients],
    degreesOfFreedom,
    residualStandardDeviation,
    influences: influences.map((influence, index) => ({ peak: peaks[index]!, ...influence })),
    mostInfluential: most < 0 ? null : peaks[most]!,
  };
}

function intervalOf(fit: PolynomialFit | string, setMz: number, confidence: number, weight: number) {
  if (typeof fit === "string") return null;
  const { value, standardUncertainty, halfInterval } = fit.predict(setMz, confidence, weight);
  return {
    value,
    standardUncertainty,
    low: halfInterval === null ? null : value - halfInterval,
    high: halfInterval === null ? null : value + halfInterval,
  };
}

function radiusOf({ peaks, frequency_MHz }: Request): Answer["effectiveFieldRadius"] {
  if (frequency_MHz === undefined || peaks.every(({ drive }) => drive === undefined)) return null;
  type Radius = NonNullable<Answer["effectiveFieldRadius"]>["peaks"][number];
  const radii = peaks.flatMap(({ observedMz, drive }, peak): Radius[] => {
    if (drive === undefined) return [];
    const { dcVolts, rfVolts } = driveToCanonical(drive);
    const radius = effectiveFieldRadius(observedMz, dcVolts, rfVolts, hertzFromMHz(frequency_MHz));
    return radius === null
      ? [{ peak, fieldRadius_mm: null, reason: "no-window" }]
      : [{ peak, fieldRadius_mm: mmFromMetres(radius), reason: null }];
  });
  const known = radii.flatMap(({ fieldRadius_mm }) => (fieldRadius_mm === null ? [] : [fieldRadius_mm]));
  const mean = known.reduce((sum, radius) => sum + radius, 0) / known.length;
  const squares = known.reduce((sum, radius) => sum + (radius - mean) * (radius - mean), 0);
  return {
    mean_mm: known.length === 0 ? null : mean,
    standardDeviation_mm: known.length < 2 ? null : Math.sqrt(squares / (known.length - 1)),
    peaks: radii,
  };
}
