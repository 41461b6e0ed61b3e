import type { z } from "zod";
import type { Example } from "../endpoint.ts";
import type { DriftBudgetAnswer, DriftBudgetRequest } from "../shapes/drift-budget.ts";

type Examples = Readonly<
  Record<string, Example<z.input<typeof DriftBudgetRequest>, z.output<typeof DriftBudgetAnswer>>>
>;

export const DRIFT_EXAMPLES: Examples = {
  "unknown-instrument": {
    summary: "A window of 0.70 at m/z 1000: tolerances, limits and four tune records",
    source: "Computed by an independent program (test/reference, generate-endpoint-examples).",
    request: {
      mzCentre: 1000,
      width: { value: 0.7, as: "mz", at: "edges" },
      tolerances: { frequency_ppm: 1, amplitude_ppm: 50, ratio_ppm: 20 },
      limits: { centreShift: 0.1, widthChange: 0.1 },
      tune: {
        records: [
          { time_h: 0, offset: 0.01 },
          { time_h: 24, offset: 0.02 },
          { time_h: 49, offset: 0.031 },
          { time_h: 72, offset: 0.039 },
        ],
        limit: 0.1,
        confidence: 0.95,
      },
    },
    answer: {
      window: {
        mzLow: 999.65,
        mzHigh: 1000.35,
        mzCentre: 1000.0,
        mzWidth: 0.7,
        resolution: 1428.5714285714287,
        apexMargin_ppm: 527.066747564885,
      },
      reason: null,
      sensitivities: [
        {
          cause: "field-radius",
          low: -0.0019993,
          high: -0.0020007000000000002,
          centre: -0.002,
          width: -1.4e-6,
        },
        { cause: "frequency", low: -0.0019993, high: -0.0020007000000000002, centre: -0.002, width: -1.4e-6 },
        { cause: "amplitude", low: 0.00099965, high: 0.0010003500000000001, centre: 0.001, width: 7e-7 },
        {
          cause: "ratio",
          low: 0.00022511605318232677,
          high: -0.0011028426562641699,
          centre: -0.0004388633015409216,
          width: -0.0013279587094464967,
        },
      ],
      budget: {
        causes: [
          { cause: "field-radius", tolerance_ppm: 0, low: 0, high: -0.0, centre: -0.0, width: -0.0 },
          {
            cause: "frequency",
            tolerance_ppm: 1,
            low: -0.0019993,
            high: -0.0020007000000000002,
            centre: -0.002,
            width: -1.4e-6,
          },
          {
            cause: "amplitude",
            tolerance_ppm: 50,
            low: 0.0499825,
            high: 0.0500175,
            centre: 0.05,
            width: 3.5e-5,
          },
          {
            cause: "ratio",
            tolerance_ppm: 20,
            low: 0.004502321063646535,
            high: -0.022056853125283396,
            centre: -0.00877726603081843,
            width: -0.026559174188929932,
          },
        ],
        worstCase: {
          low: 0.05648412106364654,
          high: 0.0740750531252834,
          centre: 0.060777266030818435,
          width: 0.02659557418892993,
        },
        rootSumSquare: {
          low: 0.0502246792095296,
          high: 0.05470153449886323,
          centre: 0.05080394078194879,
          width: 0.026559197287529642,
        },
        widthAtRatioEnds: { raised: 0.6734412459977029, lowered: 0.726559594392679 },
      },
      allowed: [
        {
          cause: "field-radius",
          alone_ppm: 50.0,
          sharedWorstCase_ppm: 12.5,
          sharedRootSumSquare_ppm: 25.0,
          boundBy: "centreShift",
        },
        {
          cause: "frequency",
          alone_ppm: 50.0,
          sharedWorstCase_ppm: 12.5,
          sharedRootSumSquare_ppm: 25.0,
          boundBy: "centreShift",
        },
        {
          cause: "amplitude",
          alone_ppm: 100.0,
          sharedWorstCase_ppm: 25.0,
          sharedRootSumSquare_ppm: 50.0,
          boundBy: "centreShift",
        },
        {
          cause: "ratio",
          alone_ppm: 75.30354617854103,
          sharedWorstCase_ppm: 18.825886544635257,
          sharedRootSumSquare_ppm: 37.65177308927051,
          boundBy: "widthChange",
        },
      ],
      retune: {
        reason: null,
        slope_perHour: 0.00040691970049057597,
        slopeStandardUncertainty_perHour: 1.3256387971075051e-5,
        degreesOfFreedom: 2,
        expected_h: 148.5615482233502,
        atConfidence_h: 124.55651684777365,
      },
    },
  },
  "no-window": {
    summary: "Rods without DC have a cutoff, but no window",
    request: {
      rodSet: { fieldRadius_mm: 4, frequency_MHz: 1.2 },
      drive: { rf: { volts: 200, as: "zero-to-peak", between: "pole-and-ground" } },
      tolerances: { amplitude_ppm: 50 },
    },
    answer: { window: null, reason: "no-dc", sensitivities: [], budget: null, allowed: null, retune: null },
  },
};
