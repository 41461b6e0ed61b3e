import { z } from "zod";
import { Beam } from "../../contract/beam.ts";
import { Drive, VoltageConvention } from "../../contract/drive.ts";
import { Ion, mzOfIon } from "../../contract/ion.ts";
import { Residence, residenceErrors } from "../../contract/residence.ts";
import { fieldOf, RodSet, sinusoidalQuadrupole } from "../../contract/rod-set.ts";
import { Width, widthInMz } from "../../contract/width.ts";
import type { Field } from "../../physics/mathieu-parameters.ts";
import { passbandOf } from "../../physics/passband.ts";
import { setPointOf } from "../../physics/set-point.ts";
import { defineEndpoint } from "../endpoint.ts";
import { MOST_ITEMS } from "../limits.ts";
import { answeredDrive } from "../shapes/answered-drive.ts";
import { ionsInsideErrors } from "../shapes/ions.ts";
import { firstRegionPassband, Passband } from "../shapes/passband.ts";
import { firstRegionOnly, WantedRegion } from "../shapes/region.ts";
import { SOURCES } from "../shapes/sources.ts";

const Target = z
  .strictObject({ ion: Ion, width: Width })
  .meta({ id: "Target", description: "The ion on which a passband is centred, and how wide it is." });

const SetPointsRequest = z
  .strictObject({
    rodSet: RodSet,
    convention: VoltageConvention,
    region: WantedRegion.optional(),
    residence: Residence.optional().meta({ description: "Not used by widths taken at the edges." }),
    beam: Beam.optional().meta({ description: "Not used by widths taken at the edges." }),
    targets: z
      .array(Target)
      .min(1)
      .max(MOST_ITEMS)
      .meta({ description: `1 to ${MOST_ITEMS} targets; the results come back in the same order.` }),
  })
  .meta({ id: "SetPointsRequest" });

const SetPoint = z
  .strictObject({
    mz: z.number(),
    drive: Drive.nullable().meta({
      description: "Calculated volts in the convention of the request; not settings to apply.",
    }),
    reason: z
      .enum([
        "width-height-needs-peak-profile",
        "resolution-not-reachable",
        "drive-out-of-range",
        "not-converged",
      ])
      .nullable()
      .meta({
        description:
          "Why there is no drive. width-height-needs-peak-profile: the width is not taken at the edges, and this version cannot convert it. resolution-not-reachable: no window of the first region is wider than twice its m/z. drive-out-of-range: the volts are beyond what a request may state.",
      }),
    a: z.number().nullable().meta({ description: "a of the ion at the set point." }),
    q: z.number().nullable().meta({ description: "q of the ion at the set point." }),
    passband: Passband.nullable().meta({ description: "What the calculated volts let through." }),
  })
  .meta({ id: "SetPoint" });
type SetPoint = z.output<typeof SetPoint>;

const SetPointsAnswer = z.strictObject({ results: z.array(SetPoint) }).meta({ id: "SetPointsAnswer" });

export const setPoints = defineEndpoint({
  operationId: "setPoints",
  method: "post",
  path: "/v1/set-points",
  tag: "Mass filter",
  summary: "The RF and DC that give passbands of wanted position and width",
  description:
    "The inverse of the passband, solved exactly: the passband of the calculated volts is centred on the m/z of the ion and as wide as asked. Calculated volts are not settings to apply, and they may exceed any supply.",
  request: SetPointsRequest,
  rules: [
    ({ rodSet }) => sinusoidalQuadrupole(rodSet, "/rodSet"),
    firstRegionOnly,
    ({ residence, rodSet }) => (residence === undefined ? [] : residenceErrors(residence, rodSet, "/rodSet")),
    ({ targets }) => ionsInsideErrors(targets, "/targets"),
  ],
  work: { unit: "targets", of: ({ targets }) => targets.length, most: MOST_ITEMS },
  answer: SetPointsAnswer,
  examples: {
    "two-widths": {
      summary: "An exact width at the edges, and one that needs the peak profile",
      source: SOURCES.passbands,
      request: {
        rodSet: { fieldRadius_mm: 3, frequency_MHz: 0.65 },
        convention: {
          rf: { as: "zero-to-peak", between: "pole-and-ground" },
          dc: { between: "pole-and-ground" },
        },
        targets: [
          { ion: { mz: 318.55112557053053 }, width: { value: 1.0618367354238343, as: "mz", at: "edges" } },
          { ion: { mz: 500 }, width: { value: 0.7, as: "mz", at: "half-height" } },
        ],
      },
      answer: {
        results: [
          {
            mz: 318.55112557053053,
            drive: {
              rf: { volts: 87.3796159, as: "zero-to-peak", between: "pole-and-ground" },
              dc: { volts: 14.6293346, between: "pole-and-ground" },
            },
            reason: null,
            a: 0.23613901774640952,
            q: 0.7052178801653954,
            passband: {
              region: "first",
              mzLow: 318.0202072028186,
              mzHigh: 319.0820439382424,
              mzCentre: 318.55112557053053,
              mzWidth: 1.0618367354238059,
              resolution: 300.00009883193593,
              low: { a: 0.23653323968267492, q: 0.7063952051194035, lostTo: "x" },
              high: { a: 0.23574610769635584, q: 0.7040444730968011, lostTo: "y" },
            },
          },
          {
            mz: 500,
            drive: null,
            reason: "width-height-needs-peak-profile",
            a: null,
            q: null,
            passband: null,
          },
        ],
      },
    },
  },
  handler({ rodSet, convention, targets }, { maxSteps }) {
    const field = fieldOf(rodSet);
    return { results: targets.map((target) => solve(target, field, convention, maxSteps)) };
  },
});

function solve(
  { ion, width }: z.output<typeof Target>,
  field: Field,
  convention: VoltageConvention,
  maxSteps: number,
): SetPoint {
  const mz = mzOfIon(ion);
  if (width.at !== "edges") return unsolved(mz, "width-height-needs-peak-profile");
  const solved = setPointOf(mz, widthInMz(width, mz), field, maxSteps);
  if (solved.kind === "not-reachable") return unsolved(mz, solved.reason);
  if (solved.kind === "not-converged") return unsolved(mz, "not-converged");
  const { a, q, ratio, dcVolts, rfVolts } = solved;
  // Asked of the volts themselves and not taken from the solution, so that it shows what they really let through.
  const through = passbandOf(dcVolts, rfVolts, field, maxSteps);
  if (!("passband" in through)) return unsolved(mz, "not-converged");
  const drive = answeredDrive(solved, convention);
  return {
    mz,
    drive,
    reason: drive === null ? "drive-out-of-range" : null,
    a,
    q,
    passband: firstRegionPassband(through.passband, ratio),
  };
}

function unsolved(mz: number, reason: NonNullable<SetPoint["reason"]>): SetPoint {
  return { mz, drive: null, reason, a: null, q: null, passband: null };
}
