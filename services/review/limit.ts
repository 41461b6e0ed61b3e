import { z } from "zod";
import type { Bounds } from "./finding.ts";

const bound = (description: string) => z.number().min(-1e12).max(1e12).meta({ description });

/** How criteria state the limit of a quantity that must be large. */
export const LowerLimit = z
  .strictObject({ min: bound("Smallest value, in the unit of the finding.") })
  .meta({ id: "LowerLimit" });

/** How criteria state the limit of a quantity that must be small. */
export const UpperLimit = z
  .strictObject({ max: bound("Largest value, in the unit of the finding.") })
  .meta({ id: "UpperLimit" });

/** How criteria state the limits of a quantity that must lie near a value. */
export const TwoSidedLimit = z
  .strictObject({
    min: bound("Smallest value, in the unit of the finding."),
    max: bound("Largest value, in the unit of the finding."),
  })
  .meta({ id: "TwoSidedLimit" });

/** How criteria state the limits of a quantity that must not be large, and may be judged too small. */
export const RangeLimit = z
  .strictObject({
    max: bound("Largest value, in the unit of the finding."),
    min: bound("Smallest value, in the unit of the finding.").optional(),
  })
  .meta({ id: "RangeLimit" });

/** A lower limit in m/z, which may grow with the width of the window. Both hold. */
export const LowerLimitByWidth = z
  .strictObject({
    min: bound("Smallest value in m/z."),
    minOfWidth: bound("Smallest value as a fraction of the window's width.").optional(),
  })
  .meta({ id: "LowerLimitByWidth" });

/** An upper limit as a fraction of the window's width, or in m/z. Both hold. */
export const UpperLimitByWidth = z
  .union([
    z
      .strictObject({
        max: bound("Largest value in m/z."),
        maxOfWidth: bound("Largest value as a fraction of the window's width.").optional(),
      })
      .meta({ id: "UpperLimitInMz" }),
    z
      .strictObject({ maxOfWidth: bound("Largest value as a fraction of the window's width.") })
      .meta({ id: "UpperLimitOfWidth" }),
  ])
  .meta({ id: "UpperLimitByWidth" });

/** A lower limit that may grow with a stated tolerance. Both hold. */
export const LowerLimitByTolerance = z
  .strictObject({
    min: bound("Smallest value, in the unit of the finding."),
    minOfTolerance: bound("Smallest value as a multiple of the stated tolerance.").optional(),
  })
  .meta({ id: "LowerLimitByTolerance" });

/** A lower limit of a dwell time, and of the counts where a count rate is known. */
export const LowerLimitOfDwell = z
  .strictObject({
    min: bound("Shortest dwell time in ms."),
    minCounts: bound("Fewest counts in one dwell time.").optional(),
  })
  .meta({ id: "LowerLimitOfDwell" });

export interface Limit {
  readonly minOfTolerance?: number | undefined;
  readonly minCounts?: number | undefined;
  readonly min?: number | undefined;
  readonly max?: number | undefined;
  readonly minOfWidth?: number | undefined;
  readonly maxOfWidth?: number | undefined;
}

/** The limit as an interval of the value; parts that grow with a width or a tolerance need it in the unit of the value. */
export function boundsOf(limit: Limit, width?: number, tolerance?: number): Bounds {
  const lower = [limit.min, scaled(limit.minOfWidth, width), scaled(limit.minOfTolerance, tolerance)].filter(
    (bound) => bound !== undefined,
  );
  const upper = [limit.max, scaled(limit.maxOfWidth, width)].filter((bound) => bound !== undefined);
  return {
    min: lower.length > 0 ? Math.max(...lower) : null,
    max: upper.length > 0 ? Math.min(...upper) : null,
  };
}

function scaled(fraction: number | undefined, of: number | undefined): number | undefined {
  return fraction === undefined || of === undefined ? undefined : fraction * of;
}
