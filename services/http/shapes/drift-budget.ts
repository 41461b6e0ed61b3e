import { z } from "zod";
import { Drive } from "../../contract/drive.ts";
import { Mz, quantity, Tolerance_ppm } from "../../contract/quantity.ts";
import { RodSet } from "../../contract/rod-set.ts";
import { Width } from "../../contract/width.ts";
import { MOST_ITEMS } from "../limits.ts";
import { Confidence } from "./confidence.ts";

const Limit = (what: string) => quantity(`Largest permitted ${what}, plus or minus, in m/z.`, 1e-9, 1e6);

const asked = {
  tolerances: z
    .strictObject({
      fieldRadius_ppm: Tolerance_ppm.optional(),
      frequency_ppm: Tolerance_ppm.optional(),
      amplitude_ppm: Tolerance_ppm.optional().meta({
        description: "U and V moving together, plus or minus, in ppm.",
      }),
      ratio_ppm: Tolerance_ppm.optional().meta({
        description: "U against V at constant V, plus or minus, in ppm.",
      }),
    })
    .optional()
    .meta({ description: "Independent tolerances; one that is absent does not drift." }),
  limits: z
    .strictObject({
      centreShift: Limit("shift of the centre").optional(),
      edgeShift: Limit("shift of either edge").optional(),
      widthChange: Limit("change of the width").optional(),
    })
    .optional()
    .meta({ description: "What may move, for the question backwards: at least one of the three." }),
  tune: z
    .strictObject({
      records: z
        .array(
          z
            .strictObject({
              time_h: quantity("When the tune was done, in hours after any instant.", -1e7, 1e7),
              offset: quantity("Observed less set m/z at that tune.", -1e4, 1e4),
            })
            .meta({ id: "TuneRecord" }),
        )
        .min(1)
        .max(MOST_ITEMS),
      limit: Limit("offset"),
      confidence: Confidence,
    })
    .optional()
    .meta({ description: "Successive tunes without a correction between them, for the retune interval." }),
};

export const DriftBudgetOfDrive = z
  .strictObject({ rodSet: RodSet, drive: Drive, ...asked })
  .meta({ id: "DriftBudgetOfDrive", description: "The window that these volts open." });
export const DriftBudgetOfWidth = z
  .strictObject({ mzCentre: Mz, width: Width, ...asked })
  .meta({ id: "DriftBudgetOfWidth", description: "A window with nothing known of the instrument." });
export const DriftBudgetRequest = z
  .union([DriftBudgetOfDrive, DriftBudgetOfWidth])
  .meta({ id: "DriftBudgetRequest" });

const Cause = z.enum(["field-radius", "frequency", "amplitude", "ratio"]).meta({
  description: "amplitude: U and V together. ratio: U against V at constant V.",
});

const shifts = {
  low: z.number().meta({ description: "Of the edge at low m/z." }),
  high: z.number().meta({ description: "Of the edge at high m/z." }),
  centre: z.number(),
  width: z.number(),
};
const DriftShifts = z
  .strictObject(shifts)
  .meta({ id: "DriftShifts", description: "Shifts in m/z, to first order." });

const Budget = z
  .strictObject({
    causes: z.array(z.strictObject({ cause: Cause, tolerance_ppm: z.number(), ...shifts })).meta({
      description: "Each at the positive end of its tolerance; the negative end gives the opposite sign.",
    }),
    worstCase: DriftShifts,
    rootSumSquare: DriftShifts,
    widthAtRatioEnds: z
      .strictObject({
        raised: z.number().nullable().meta({ description: "null: the window closes before that." }),
        lowered: z.number().nullable(),
      })
      .meta({
        description:
          "The exact width with U/V at either end of its tolerance, to judge the first order by; near the apex it is not good.",
      }),
  })
  .meta({ id: "DriftBudget" });

const Allowed = z
  .strictObject({
    cause: Cause,
    alone_ppm: z.number().nullable().meta({ description: "If nothing else drifts; null where unbounded." }),
    sharedWorstCase_ppm: z
      .number()
      .nullable()
      .meta({ description: "If all four causes contribute equally and add up." }),
    sharedRootSumSquare_ppm: z.number().nullable().meta({
      description: "If all four causes contribute equally and independently, as root-sum-square.",
    }),
    boundBy: z.enum(["centreShift", "edgeShift", "widthChange"]).nullable(),
  })
  .meta({ id: "AllowedTolerance" });

const Retune = z
  .strictObject({
    reason: z
      .enum(["too-few-records", "records-at-one-time", "drift-not-distinguishable", "limit-already-reached"])
      .nullable()
      .meta({
        description:
          "Why there is no expected interval. drift-not-distinguishable: the slope is within its uncertainty at this confidence. A slope with its uncertainty needs three records.",
      }),
    slope_perHour: z.number().nullable().meta({ description: "Drift in m/z per hour, by least squares." }),
    slopeStandardUncertainty_perHour: z.number().nullable(),
    degreesOfFreedom: z.int(),
    expected_h: z
      .number()
      .nullable()
      .meta({ description: "Hours after the last record until the line reaches the limit." }),
    atConfidence_h: z.number().nullable().meta({
      description:
        "Hours after the last record until the interval of a single offset reaches the limit; null beyond a century.",
    }),
  })
  .meta({ id: "RetuneInterval" });

export const DriftBudgetAnswer = z
  .strictObject({
    window: z
      .strictObject({
        mzLow: z.number(),
        mzHigh: z.number(),
        mzCentre: z.number(),
        mzWidth: z.number(),
        resolution: z.number(),
        apexMargin_ppm: z.number().meta({ description: "How far U/V lies below the apex, in ppm of it." }),
      })
      .nullable(),
    reason: z
      .enum([
        "above-apex",
        "no-rf",
        "no-dc",
        "width-height-needs-peak-profile",
        "resolution-not-reachable",
        "not-converged",
      ])
      .nullable()
      .meta({
        description:
          "Why there is no window. no-dc: an RF-only rod set has a cutoff but no window; its cutoff moves as the amplitude and as 1/f² and 1/r0².",
      }),
    sensitivities: z
      .array(z.strictObject({ cause: Cause, ...shifts }))
      .meta({ description: "Shift in m/z per ppm of each cause." }),
    budget: Budget.nullable().meta({ description: "null without tolerances or without a window." }),
    allowed: z.array(Allowed).nullable().meta({ description: "null without limits or without a window." }),
    retune: Retune.nullable().meta({ description: "null without tune records." }),
  })
  .meta({ id: "DriftBudgetAnswer" });
