import { z } from "zod";
import { Beam } from "../../contract/beam.ts";
import { Drive } from "../../contract/drive.ts";
import { Mz, quantity } from "../../contract/quantity.ts";
import { Residence } from "../../contract/residence.ts";
import { RodSet } from "../../contract/rod-set.ts";
import { MOST_ITEMS } from "../limits.ts";

const MzValues = z
  .strictObject({ values: z.array(Mz).min(1).max(MOST_ITEMS) })
  .meta({ id: "MzValues", description: "These m/z, in this order." });

const MzRange = z
  .strictObject({ from: Mz, to: Mz, points: z.int().min(2).max(MOST_ITEMS) })
  .meta({ id: "MzRange", description: "Equally spaced m/z, both ends among them." });

export const PeakProfileRequest = z
  .strictObject({
    rodSet: RodSet,
    drive: Drive,
    residence: Residence,
    beam: Beam,
    mz: z.union([MzValues, MzRange]).meta({ description: "Where the transmission is wanted." }),
    accuracy: quantity(
      "Wanted accuracy, 0.001 when absent: absolute for the points, and relative to the height for the peak.",
      1e-5,
      1e-2,
    ).optional(),
    scanRate_mzPerS: quantity(
      "Rate at which the m/z of the window moves while the ions fly, negative downwards; the drive is that at entry. 0 when absent.",
      -1e7,
      1e7,
    ).optional(),
    findPeak: z.boolean().optional().meta({
      description:
        "false leaves the peak out, so that the whole work may go into the points. true when absent.",
    }),
  })
  .meta({ id: "PeakProfileRequest" });
export type PeakProfileRequest = z.output<typeof PeakProfileRequest>;

const ProfilePoint = z
  .strictObject({
    mz: z.number(),
    transmission: z.number().nullable().meta({ description: "Share of the beam that passes, 0 to 1." }),
    reason: z
      .enum(["outside-computed-domain", "not-converged", "no-window-to-scan", "dc-not-below-rf"])
      .nullable()
      .meta({
        description:
          "Why there is no transmission. outside-computed-domain: the motion is too violent, as that of very light ions. not-converged: the accuracy was not reached within the steps that one value may take. no-window-to-scan: a scan rate is stated, but the drive has no window that could move. dc-not-below-rf: with U at or above V the field of one plane never focuses, and nothing is computed.",
      }),
  })
  .meta({ id: "ProfilePoint" });
export type ProfilePoint = z.output<typeof ProfilePoint>;

const PeakFlanks = z
  .strictObject({
    mzLow: z.number(),
    mzHigh: z.number(),
    shiftFromCentre: z
      .number()
      .meta({ description: "Middle of both flanks minus the edges' centre, in m/z." }),
  })
  .meta({ id: "PeakFlanks", description: "Where the peak has fallen to a share of its height." });
export type PeakFlanks = z.output<typeof PeakFlanks>;

const Peak = z
  .strictObject({
    mz: z.number().meta({ description: "m/z of the largest transmission; on a flat top any point of it." }),
    transmission: z.number().meta({ description: "The height of the peak." }),
    widthHalfHeight: z.number().nullable().meta({
      description: "Width at half height, in m/z; null where a flank does not come down to it.",
    }),
    widthTenthHeight: z.number().nullable().meta({
      description: "Width at a tenth of the height, in m/z; null where a flank does not come down to it.",
    }),
    halfHeight: PeakFlanks.nullable(),
    tenthHeight: PeakFlanks.nullable(),
    edges: z
      .strictObject({ mzLow: z.number(), mzHigh: z.number(), mzCentre: z.number(), width: z.number() })
      .meta({ description: "The stability edges, between which the window lies whatever the beam." }),
    shiftFromCentre: z
      .number()
      .meta({ description: "m/z of the largest transmission minus the edges' centre." }),
    errorBound: z
      .number()
      .meta({ description: "Largest absolute error of the transmissions from which the peak was found." }),
  })
  .meta({
    id: "Peak",
    description: "Position, height and widths of the peak of the first stability region.",
  });

export const PeakProfileAnswer = z
  .strictObject({
    points: z.array(ProfilePoint),
    peak: Peak.nullable(),
    peakReason: z
      .enum([
        "not-asked-for",
        "no-upper-edge",
        "above-apex",
        "no-rf",
        "nothing-passes",
        "no-maximum-near-the-window",
        "outside-computed-domain",
        "not-converged",
      ])
      .nullable()
      .meta({
        description:
          "Why there is no peak. no-upper-edge: RF-only rods pass everything above their cutoff. above-apex: U/V is at or above that at which the first region closes. no-rf: no RF voltage. nothing-passes: less than a millionth of the beam passes in the middle of the window. no-maximum-near-the-window: the residence is so short that no peak forms. outside-computed-domain, not-converged: as for points.",
      }),
    method: z
      .strictObject({
        phases: z
          .int()
          .meta({ description: "Start phases of the RF over which the mean was taken, at most." }),
        samplesPerCycle: z
          .int()
          .meta({ description: "Finest spacing of the times at which the aperture was looked at." }),
        errorBound: z.number().meta({
          description:
            "Largest absolute error of a point: phases, gaps between samples and quadrature together.",
        }),
      })
      .nullable()
      .meta({ description: "How the points were computed, the worst of them; null where none was." }),
  })
  .meta({ id: "PeakProfileAnswer" });
