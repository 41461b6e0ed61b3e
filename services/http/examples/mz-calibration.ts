import type { z } from "zod";
import type { Example } from "../endpoint.ts";
import type { MzCalibrationAnswer, MzCalibrationRequest } from "../shapes/mz-calibration.ts";

type Examples = Readonly<
  Record<string, Example<z.input<typeof MzCalibrationRequest>, z.output<typeof MzCalibrationAnswer>>>
>;

export const MZ_CALIBRATION_EXAMPLES: Examples = {
  "five-peaks": {
    summary: "Five peaks of an invented tune report, one with its volts",
    source: "Computed by an independent program (test/reference, generate-endpoint-examples).",
    request: {
      peaks: [
        { setMz: 69, observedMz: 69.02, width: { value: 0.68, as: "mz", at: "half-height" } },
        { setMz: 219, observedMz: 219.04, width: { value: 0.69, as: "mz", at: "half-height" } },
        {
          setMz: 414,
          observedMz: 414.05,
          width: { value: 0.71, as: "mz", at: "half-height" },
          drive: {
            rf: { volts: 831.55739482, as: "zero-to-peak", between: "pole-and-ground" },
            dc: { volts: 139.42457479, between: "pole-and-ground" },
          },
        },
        { setMz: 614, observedMz: 614.08, width: { value: 0.7, as: "mz", at: "half-height" } },
        { setMz: 1066, observedMz: 1066.13, width: { value: 0.74, as: "mz", at: "half-height" } },
      ],
      positionDegree: 1,
      confidence: 0.95,
      wanted: [500, 1500],
      frequency_MHz: 1.2,
    },
    answer: {
      position: {
        coefficients: [
          { power: 0, value: 0.011756757922682144, standardUncertainty: 0.0037246297084859033 },
          { power: 1, value: 0.00010966255683742186, standardUncertainty: 6.3184339196561814e-6 },
        ],
        degreesOfFreedom: 3,
        residualStandardDeviation: 0.004905177316171416,
        influences: [
          {
            peak: 0,
            residual: 0.0006765256555317685,
            leverage: 0.47539212842790896,
            studentizedResidual: 0.15642533145356857,
            cookDistance: 0.0164290141748605,
          },
          {
            peak: 1,
            residual: 0.004227142129914513,
            leverage: 0.3099326149040992,
            studentizedResidual: 1.0577459399396991,
            cookDistance: 0.2416788022062794,
          },
          {
            peak: 2,
            residual: -0.007157056453363425,
            leverage: 0.20646068627535566,
            studentizedResidual: -4.112968761736366,
            cookDistance: 0.34900362599289797,
          },
          {
            peak: 3,
            residual: 0.0009104321791817555,
            leverage: 0.2314156710667526,
            studentizedResidual: 0.17416878567154317,
            cookDistance: 0.006747851177426252,
          },
          {
            peak: 4,
            residual: 0.0013429564887353085,
            leverage: 0.7767988993258835,
            studentizedResidual: 0.502103224101933,
            cookDistance: 0.5843868078587559,
          },
        ],
        mostInfluential: 4,
      },
      positionReason: null,
      width: {
        coefficients: [
          { power: 0, value: 0.6773756448640186, standardUncertainty: 0.006757989502279282 },
          { power: 1, value: 5.58865557010526e-5, standardUncertainty: 1.1464202737415132e-5 },
        ],
        degreesOfFreedom: 3,
        residualStandardDeviation: 0.008899981851613467,
        influences: [
          {
            peak: 0,
            residual: -0.0012318172073911837,
            leverage: 0.47539212842790896,
            studentizedResidual: -0.15698328964323796,
            cookDistance: 0.016544996366085862,
          },
          {
            peak: 1,
            residual: 0.00038519943745085605,
            leverage: 0.3099326149040992,
            studentizedResidual: 0.0425600097805037,
            cookDistance: 0.0006096033258073714,
          },
          {
            peak: 2,
            residual: 0.00948732107574557,
            leverage: 0.20646068627535566,
            studentizedResidual: 1.351484520793556,
            cookDistance: 0.1862856625237712,
          },
          {
            peak: 3,
            residual: -0.011689990064464917,
            leverage: 0.2314156710667526,
            studentizedResidual: -2.4380063157066916,
            cookDistance: 0.3379323444278989,
          },
          {
            peak: 4,
            residual: 0.003049286758659342,
            leverage: 0.7767988993258835,
            studentizedResidual: 0.6520326620169972,
            cookDistance: 0.9151751849462091,
          },
        ],
        mostInfluential: 4,
      },
      widthReason: null,
      widthAt: "half-height",
      predictions: [
        {
          setMz: 500,
          extrapolated: false,
          offset: {
            value: 0.06658803634139307,
            standardUncertainty: 0.0021987242200696743,
            low: 0.049481047116124416,
            high: 0.08369502556666172,
          },
          observedMz: 500.0665880363414,
          width: {
            value: 0.7053189227145449,
            standardUncertainty: 0.003989377833663462,
            low: 0.6742799033627483,
            high: 0.7363579420663414,
          },
        },
        {
          setMz: 1500,
          extrapolated: true,
          offset: {
            value: 0.17625059317881492,
            standardUncertainty: 0.00682944671643934,
            low: 0.1494911382453832,
            high: 0.20301004811224663,
          },
          observedMz: 1500.1762505931788,
          width: {
            value: 0.7612054784155975,
            standardUncertainty: 0.012391387286344374,
            low: 0.7126529699300331,
            high: 0.8097579869011619,
          },
        },
      ],
      effectiveFieldRadius: {
        mean_mm: 4.395604395589294,
        standardDeviation_mm: null,
        peaks: [{ peak: 2, fieldRadius_mm: 4.395604395589294, reason: null }],
      },
    },
  },
};
