import { z } from "zod";
import { Beam } from "../../contract/beam.ts";
import { Drive, Rf, VoltageConvention } from "../../contract/drive.ts";
import { Ion } from "../../contract/ion.ts";
import { quantity } from "../../contract/quantity.ts";
import { Residence } from "../../contract/residence.ts";
import { RodSet } from "../../contract/rod-set.ts";
import { Width } from "../../contract/width.ts";
import { MOST_ITEMS } from "../limits.ts";
import { Passband } from "./passband.ts";
import { RegionName } from "./region.ts";

export const Target = z
  .strictObject({ ion: Ion, width: Width })
  .meta({ id: "Target", description: "The ion on which a passband is centred, and how wide it is." });
export type Target = z.output<typeof Target>;

export const SetPointsRequest = z
  .strictObject({
    rodSet: RodSet,
    convention: VoltageConvention,
    region: RegionName.optional().meta({
      description: "The region in which the window shall lie; the first when absent.",
    }),
    tip: z.enum(["high-ratio", "low-ratio"]).optional().meta({
      description:
        "A window closes at two tips of its region, so that two U/V give the same resolution: towards the tip of largest U/V (when absent), or towards that of smallest U/V. In the third region these are (q, a) = (3.234, 3.164), the usual choice, and (2.815, 2.521). Those of the first and second region differ in nothing but the names x and y, so that with a sinusoid it has no effect there. With a rectangular wave: U/V above or below that of the open window.",
    }),
    solveFor: z.enum(["volts", "frequency"]).optional().meta({
      description:
        "What puts the window on the ion: the RF volts at the frequency of the rod set (when absent), or the frequency at the RF volts of `rf`. The frequency of the rod set is then not used.",
    }),
    rf: Rf.optional().meta({ description: "The RF volts that are kept when the frequency is solved for." }),
    widthBy: z.enum(["dc", "duty-cycle"]).optional().meta({
      description:
        "What makes the width: the DC (when absent), or, with a DC-coupled rectangular wave, its duty cycle alone without DC. The duty cycle of the rod set is then not used, and that of the answer is above a half: x is the pair that is longer at the level with the sign of the ion.",
    }),
    residence: Residence.optional().meta({
      description:
        "Needed, with the beam, by widths at half or tenth height; not used by widths at the edges.",
    }),
    beam: Beam.optional().meta({
      description:
        "Needed, with the residence, by widths at half or tenth height; not used by widths at the edges.",
    }),
    accuracy: quantity(
      "Relative accuracy of widths at half or tenth height, 0.003 when absent. Widths at the edges are exact.",
      1e-3,
      1e-2,
    ).optional(),
    targets: z
      .array(Target)
      .min(1)
      .max(MOST_ITEMS)
      .meta({ description: `1 to ${MOST_ITEMS} targets; the results come back in the same order.` }),
  })
  .meta({ id: "SetPointsRequest" });
export type SetPointsRequest = z.output<typeof SetPointsRequest>;

export const SetPoint = z
  .strictObject({
    mz: z.number(),
    drive: Drive.nullable().meta({
      description: "Calculated volts in the convention of the request; not settings to apply.",
    }),
    frequency_MHz: z.number().nullable().meta({ description: "The frequency that goes with these volts." }),
    dutyCycle: z.number().nullable().meta({
      description: "The duty cycle that goes with these volts; null with a sinusoid.",
    }),
    reason: z
      .enum([
        "width-height-needs-peak-profile",
        "residence-too-short",
        "no-such-peak",
        "resolution-not-reachable",
        "needs-reversed-dc",
        "drive-out-of-range",
        "frequency-out-of-range",
        "outside-computed-domain",
        "not-converged",
      ])
      .nullable()
      .meta({
        description:
          "Why there is no drive. width-height-needs-peak-profile: the width is not taken at the edges, which needs residence and beam, and is computed for volts, a sinusoid and the first region only. residence-too-short: even nearly closed edges leave the peak wider than that. no-such-peak: nothing passes such a window, or the peak has no flank that falls to this height. resolution-not-reachable: the region has no window so wide, or none so narrow is computed. needs-reversed-dc: the DC would have to have the other sign, which exchanges x and y: state the duty cycle 1 − d and the other tip. drive-out-of-range, frequency-out-of-range: beyond what a request may state. outside-computed-domain: the wave opens the window at a q beyond those that are computed.",
      }),
    a: z.number().nullable().meta({ description: "a of the ion at the set point." }),
    q: z.number().nullable().meta({ description: "q of the ion at the set point." }),
    passband: Passband.nullable().meta({ description: "What the calculated drive lets through." }),
  })
  .meta({ id: "SetPoint" });
export type SetPoint = z.output<typeof SetPoint>;

export const SetPointsAnswer = z.strictObject({ results: z.array(SetPoint) }).meta({ id: "SetPointsAnswer" });
