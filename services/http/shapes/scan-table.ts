import { z } from "zod";
import { Drive, VoltageConvention } from "../../contract/drive.ts";
import { Mz, quantity } from "../../contract/quantity.ts";
import { Residence } from "../../contract/residence.ts";
import { RodSet } from "../../contract/rod-set.ts";
import { Width } from "../../contract/width.ts";
import { MOST_ITEMS } from "../limits.ts";

/** The largest loss that the table of peak shapes knows. */
const MOST_LOSS = 0.91;

export const ScanTableRequest = z
  .strictObject({
    rodSet: RodSet,
    convention: VoltageConvention,
    mzFrom: Mz,
    mzTo: Mz,
    points: z
      .int()
      .min(2)
      .max(MOST_ITEMS)
      .meta({ description: "Rows, evenly spaced in m/z, both ends included." }),
    width: Width.meta({ description: "Constant width in m/z, or constant resolution." }),
    residence: Residence.optional().meta({ description: "For the fastest scan rate." }),
    permittedLoss: quantity(
      "Share of the peak height that may be lost because the window moves during the flight; needed with residence.",
      0.001,
      MOST_LOSS,
    ).optional(),
  })
  .meta({ id: "ScanTableRequest" });

const ScanTableRow = z
  .strictObject({
    mz: z.number(),
    drive: Drive.nullable().meta({ description: "Calculated volts; not settings to apply." }),
    reason: z
      .enum([
        "width-height-needs-peak-profile",
        "resolution-not-reachable",
        "drive-out-of-range",
        "not-converged",
      ])
      .nullable(),
    a: z.number().nullable(),
    q: z.number().nullable(),
    mzLow: z.number().nullable(),
    mzHigh: z.number().nullable(),
    fastestRate_mzPerS: z
      .number()
      .nullable()
      .meta({ description: "Fastest scan at this m/z for the permitted loss; null without residence." }),
  })
  .meta({ id: "ScanTableRow" });

const StraightLine = z
  .strictObject({
    sense: z.enum(["least-squares", "least-worst-width"]).meta({
      description:
        "least-squares: of U over the judged m/z. least-worst-width: the line whose largest width error over them is least.",
    }),
    dcSlope: z
      .number()
      .meta({ description: "U/V of the line, U and V between the same points and V zero-to-peak." }),
    dcOffset_V: z.number().meta({
      description: "U = dcSlope V − dcOffset_V, in V between the points that the convention names for DC.",
    }),
    worst: z
      .strictObject({
        mz: z.number(),
        wantedWidth: z.number(),
        width: z.number().nullable(),
        error: z.number().nullable().meta({ description: "Width less the wanted width." }),
        centreShift: z.number().nullable().meta({ description: "Centre of the window less m/z." }),
        reason: z.enum(["above-apex", "no-dc"]).nullable().meta({
          description:
            "above-apex: nothing passes. no-dc: the line asks for no DC, and the window has no upper end.",
        }),
      })
      .meta({ description: "The m/z at which the width is furthest from the wanted one." }),
    nothingPasses: z
      .strictObject({ mzFrom: z.number(), mzTo: z.number() })
      .nullable()
      .meta({ description: "The part of the range in which the line lies above the apex." }),
  })
  .meta({ id: "StraightScanLine", description: "A straight line in place of the exact set points." });
export type StraightLine = z.input<typeof StraightLine>;

export const ScanTableAnswer = z
  .strictObject({
    convention: VoltageConvention,
    rows: z.array(ScanTableRow),
    lines: z.array(StraightLine).meta({
      description:
        "Judged at 129 m/z evenly spaced in the logarithm, independent of the rows, where there is a set point.",
    }),
    linesReason: z
      .enum(["too-few-set-points", "least-worst-width-not-converged"])
      .nullable()
      .meta({ description: "Why a line is missing." }),
    fastest: z
      .strictObject({
        rate_mzPerS: z.number(),
        mz: z.number().meta({ description: "The row that sets it." }),
        shiftOverWidth: z.number().meta({
          description: "How far the window moves during the flight, over its width, for the permitted loss.",
        }),
      })
      .nullable()
      .meta({
        description:
          "The fastest rate that keeps the loss over all rows. From peak shapes at 228 RF cycles; the position of a peak holds only if calibrated at that rate.",
      }),
  })
  .meta({ id: "ScanTableAnswer" });
export type ScanTableAnswer = z.output<typeof ScanTableAnswer>;
export type ScanTableRow = z.output<typeof ScanTableRow>;
