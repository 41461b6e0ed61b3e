import { z } from "zod";
import { Drive } from "../../contract/drive.ts";
import { Mz } from "../../contract/quantity.ts";
import { RodSet } from "../../contract/rod-set.ts";
import { Width } from "../../contract/width.ts";
import { Passband } from "./passband.ts";
import { WantedRegion } from "./region.ts";

export const PassbandOfDrive = z
  .strictObject({ rodSet: RodSet, drive: Drive, region: WantedRegion.optional() })
  .meta({ id: "PassbandOfDrive", description: "What do these volts let through?" });
export type PassbandOfDrive = z.output<typeof PassbandOfDrive>;

export const PassbandOfWidth = z.strictObject({ mzCentre: Mz, width: Width }).meta({
  id: "PassbandOfWidth",
  description: "What does such a window mean, with nothing known of the instrument?",
});
export type PassbandOfWidth = z.output<typeof PassbandOfWidth>;

export const PassbandRequest = z.union([PassbandOfDrive, PassbandOfWidth]).meta({ id: "PassbandRequest" });

export const PassbandAnswer = z
  .strictObject({
    passbands: z.array(Passband).meta({
      description:
        "The windows in the region asked for, by falling m/z; empty when nothing passes, and reason says why.",
    }),
    otherWindows: z.array(Passband).nullable().meta({
      description:
        "What the same volts let through in other regions, the second window near 0.12 of an RF-only cutoff for one; null where that was not found out.",
    }),
    searchedToQ: z
      .number()
      .nullable()
      .meta({ description: "Windows at q above this, that is, at very low m/z, are not sought." }),
    reason: z
      .enum([
        "above-apex",
        "below-lower-apex",
        "scan-line-misses-region",
        "no-rf",
        "width-height-needs-peak-profile",
        "resolution-not-reachable",
        "not-converged",
      ])
      .nullable()
      .meta({
        description:
          "Why there is no passband. above-apex: U/V is at or above that at which the first region closes. below-lower-apex: the mean of the rectangular wave drives the ions out and the DC does not make up for it. scan-line-misses-region: the line of this U/V does not cross the region asked for. width-height-needs-peak-profile: the width is not taken at the edges, and this version cannot convert it.",
      }),
    dcToRfRatio: z
      .number()
      .nullable()
      .meta({ description: "U/V, both pole-to-ground, V zero-to-peak; null without RF." }),
    apexRatio: z.number().nullable().meta({
      description:
        "U/V at which the first region closes; with a rectangular wave that of its duty cycle, null where it lies outside the computed domain.",
    }),
    apexMargin_ppm: z.number().nullable().meta({
      description:
        "How far U/V lies below the apex, in ppm of the apex; negative above it. null without RF, and where the apex is not above zero.",
    }),
  })
  .meta({ id: "PassbandAnswer" });
export type PassbandAnswer = z.input<typeof PassbandAnswer>;
