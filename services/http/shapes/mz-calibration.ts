import { z } from "zod";
import { Drive } from "../../contract/drive.ts";
import { Frequency_MHz, Mz, quantity } from "../../contract/quantity.ts";
import { Width } from "../../contract/width.ts";
import { MOST_ITEMS } from "../limits.ts";
import { Confidence } from "./confidence.ts";

/** A calibration has a few dozen peaks. */
const MOST_PEAKS = 200;

const CalibrationPeak = z
  .strictObject({
    setMz: Mz.meta({ description: "The m/z that was set." }),
    observedMz: Mz.meta({ description: "The m/z at which the peak was observed." }),
    sigma: quantity(
      "Standard uncertainty of observedMz; stated for all peaks or for none.",
      1e-9,
      1e3,
    ).optional(),
    width: Width.optional(),
    drive: Drive.optional().meta({ description: "The volts at this peak, for the effective field radius." }),
  })
  .meta({ id: "CalibrationPeak" });

export const MzCalibrationRequest = z
  .strictObject({
    peaks: z.array(CalibrationPeak).min(1).max(MOST_PEAKS),
    positionDegree: z
      .int()
      .min(1)
      .max(2)
      .meta({ description: "Degree of the polynomial of observed less set m/z: 1 linear, 2 quadratic." }),
    confidence: Confidence,
    wanted: z.array(Mz).max(MOST_ITEMS).optional().meta({ description: "Set m/z at which to predict." }),
    frequency_MHz: Frequency_MHz.optional().meta({ description: "Needed where a peak states its drive." }),
  })
  .meta({ id: "MzCalibrationRequest" });

const PeakInfluence = z
  .strictObject({
    peak: z.int().meta({ description: "Index in the request's peaks." }),
    residual: z.number(),
    leverage: z.number().meta({ description: "0 to 1: at 1 the fit follows this peak whatever it says." }),
    studentizedResidual: z.number().nullable().meta({
      description: "Residual over its scatter without this peak; beyond about 3 the peak does not belong.",
    }),
    cookDistance: z.number().nullable().meta({
      description: "How far the whole fit moves without this peak, over its own uncertainty.",
    }),
  })
  .meta({ id: "PeakInfluence" });

const CalibrationLine = z
  .strictObject({
    coefficients: z
      .array(
        z.strictObject({
          power: z.int(),
          value: z.number(),
          standardUncertainty: z.number().nullable(),
        }),
      )
      .meta({ description: "Of powers of the set m/z, 0 upwards." }),
    degreesOfFreedom: z.int(),
    residualStandardDeviation: z.number().nullable().meta({
      description: "In m/z; where sigma is stated, in units of it. null without degrees of freedom.",
    }),
    influences: z.array(PeakInfluence),
    mostInfluential: z
      .int()
      .nullable()
      .meta({ description: "The peak with the largest Cook distance, by its index." }),
  })
  .meta({ id: "CalibrationLine" });
export type CalibrationLine = z.input<typeof CalibrationLine>;

const NotFitted = z.enum(["too-few-points", "too-few-different-points", "widths-at-different-heights"]);

const Interval = z.strictObject({
  value: z.number(),
  standardUncertainty: z.number().nullable().meta({ description: "Of the fit itself." }),
  low: z.number().nullable().meta({ description: "Of the interval for one more peak." }),
  high: z.number().nullable(),
});

export const MzCalibrationAnswer = z
  .strictObject({
    position: CalibrationLine.nullable().meta({ description: "Observed less set m/z against set m/z." }),
    positionReason: NotFitted.nullable(),
    width: CalibrationLine.nullable().meta({
      description: "Width in m/z against set m/z, linear, of the peaks that state one.",
    }),
    widthReason: NotFitted.nullable(),
    widthAt: z.enum(["edges", "half-height", "tenth-height"]).nullable(),
    predictions: z.array(
      z
        .strictObject({
          setMz: z.number(),
          extrapolated: z.boolean().meta({ description: "Outside the set m/z of the peaks." }),
          offset: Interval.nullable(),
          observedMz: z.number().nullable(),
          width: Interval.nullable(),
        })
        .meta({ id: "CalibrationPrediction" }),
    ),
    effectiveFieldRadius: z
      .strictObject({
        mean_mm: z.number().nullable(),
        standardDeviation_mm: z
          .number()
          .nullable()
          .meta({ description: "Scatter of the peaks; null with fewer than two." }),
        peaks: z.array(
          z.strictObject({
            peak: z.int(),
            fieldRadius_mm: z.number().nullable(),
            reason: z.enum(["no-window"]).nullable().meta({
              description: "no-window: these volts pass nothing, or everything above a cutoff.",
            }),
          }),
        ),
      })
      .nullable()
      .meta({
        description:
          "The r0 with which the stated volts centre their window on the observed m/z; null where no peak states its drive.",
      }),
  })
  .meta({ id: "MzCalibrationAnswer" });
