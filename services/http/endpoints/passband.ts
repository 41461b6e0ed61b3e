import { z } from "zod";
import { Drive, driveToCanonical } from "../../contract/drive.ts";
import { Mz } from "../../contract/quantity.ts";
import { fieldOf, RodSet, sinusoidalQuadrupole } from "../../contract/rod-set.ts";
import { ppmFromRatio } from "../../contract/si.ts";
import { Width, widthInMz } from "../../contract/width.ts";
import { APEX_RATIO, apexMarginOf } from "../../physics/first-region.ts";
import { passbandOf, windowInMz } from "../../physics/passband.ts";
import { ratioForResolution } from "../../physics/set-point.ts";
import { defineEndpoint, type Limits } from "../endpoint.ts";
import { firstRegionPassband, Passband } from "../shapes/passband.ts";
import { firstRegionOnly, WantedRegion } from "../shapes/region.ts";
import { SOURCES } from "../shapes/sources.ts";

const PassbandOfDrive = z
  .strictObject({ rodSet: RodSet, drive: Drive, region: WantedRegion.optional() })
  .meta({ id: "PassbandOfDrive", description: "What do these volts let through?" });

const PassbandOfWidth = z.strictObject({ mzCentre: Mz, width: Width }).meta({
  id: "PassbandOfWidth",
  description: "What does such a window mean, with nothing known of the instrument?",
});

const PassbandRequest = z.union([PassbandOfDrive, PassbandOfWidth]).meta({ id: "PassbandRequest" });

const PassbandAnswer = z
  .strictObject({
    passbands: z.array(Passband).meta({ description: "Empty when nothing passes; reason says why." }),
    reason: z
      .enum([
        "above-apex",
        "no-rf",
        "width-height-needs-peak-profile",
        "resolution-not-reachable",
        "not-converged",
      ])
      .nullable()
      .meta({
        description:
          "Why there is no passband. width-height-needs-peak-profile: the width is not taken at the edges, and this version cannot convert it.",
      }),
    dcToRfRatio: z
      .number()
      .nullable()
      .meta({ description: "U/V, both pole-to-ground, V zero-to-peak; null without RF." }),
    apexRatio: z.number().meta({ description: "U/V at which the first region closes." }),
    apexMargin_ppm: z
      .number()
      .nullable()
      .meta({ description: "How far U/V lies below the apex, in ppm of the apex; negative above it." }),
  })
  .meta({ id: "PassbandAnswer" });

export const passband = defineEndpoint({
  operationId: "passband",
  method: "post",
  path: "/v1/passband",
  tag: "Mass filter",
  summary: "The m/z that a mass filter lets through",
  description:
    "Where the scan line a/q = 2U/V enters and leaves the first stability region, exactly. The edge at low m/z is β_x = 1 (light ions are lost to the x rods), the edge at high m/z is β_y = 0. Real peaks are narrower or wider than the distance of the edges, by residence and beam.",
  request: PassbandRequest,
  rules: [
    (request) =>
      "rodSet" in request
        ? [...sinusoidalQuadrupole(request.rodSet, "/rodSet"), ...firstRegionOnly(request)]
        : [],
  ],
  work: null,
  answer: PassbandAnswer,
  examples: {
    "resolution-100": {
      summary: "A drive that gives a resolution of 100 between the edges",
      source: SOURCES.passbands,
      request: {
        rodSet: { fieldRadius_mm: 2, frequency_MHz: 0.65 },
        drive: {
          rf: { volts: 165.483653, as: "zero-to-peak", between: "pole-and-ground" },
          dc: { volts: 27.5667685, between: "pole-and-ground" },
        },
      },
      answer: {
        passbands: [
          {
            region: "first",
            mzLow: 1353.605792682864,
            mzHigh: 1367.2098687303862,
            mzCentre: 1360.407830706625,
            mzWidth: 13.604076047522309,
            resolution: 100.00001660931572,
            low: { a: 0.23561259157127404, q: 0.7071926538290377, lostTo: "x" },
            high: { a: 0.23326818806249455, q: 0.7001559121678081, lostTo: "y" },
          },
        ],
        reason: null,
        dcToRfRatio: 0.16658303101394553,
        apexRatio: 0.16784370570836984,
        apexMargin_ppm: 7511.003698969682,
      },
    },
    "above-the-apex": {
      summary: "So much DC that nothing passes",
      source: SOURCES.passbands,
      request: {
        rodSet: { fieldRadius_mm: 4, frequency_MHz: 1.2 },
        drive: {
          rf: { volts: 500, as: "zero-to-peak", between: "pole-and-ground" },
          dc: { volts: 83.925, between: "pole-and-ground" },
        },
      },
      answer: {
        passbands: [],
        reason: "above-apex",
        dcToRfRatio: 0.16785,
        apexRatio: 0.16784370570836984,
        apexMargin_ppm: -37.50090957290395,
      },
    },
    "unknown-instrument": {
      summary: "What a resolution of 1000 means on any mass filter",
      source: SOURCES.passbands,
      request: {
        mzCentre: 137.2453513581594,
        width: { value: 999.9990919040349, as: "resolution", at: "edges" },
      },
      answer: {
        passbands: [
          {
            region: "first",
            mzLow: 137.1767286201643,
            mzHigh: 137.3139740961545,
            mzCentre: 137.2453513581594,
            mzWidth: 0.13724547599022238,
            resolution: 999.9990919040349,
            low: { a: 0.23685573680313005, q: 0.7061158393084804, lostTo: "x" },
            high: { a: 0.23661899922013793, q: 0.70541007571007, lostTo: "y" },
          },
        ],
        reason: null,
        dcToRfRatio: 0.16771733731046856,
        apexRatio: 0.16784370570836984,
        apexMargin_ppm: 752.8932787081121,
      },
    },
  },
  handler: (request, limits) =>
    "rodSet" in request ? passbandOfDrive(request, limits) : passbandOfWidth(request, limits),
});

type Answer = z.input<typeof PassbandAnswer>;

function passbandOfDrive({ rodSet, drive }: z.output<typeof PassbandOfDrive>, { maxSteps }: Limits): Answer {
  const { dcVolts, rfVolts } = driveToCanonical(drive);
  if (rfVolts === 0) return empty("no-rf", null);
  const ratio = dcVolts / rfVolts;
  const found = passbandOf(dcVolts, rfVolts, fieldOf(rodSet), maxSteps);
  if (found.kind === "empty") return empty(found.reason, ratio);
  if (found.kind === "not-converged") return empty("not-converged", ratio);
  return {
    passbands: [firstRegionPassband(found.passband, ratio)],
    reason: null,
    ...placeOnScanLine(ratio, apexMarginOf(ratio)),
  };
}

function passbandOfWidth(
  { mzCentre, width }: z.output<typeof PassbandOfWidth>,
  { maxSteps }: Limits,
): Answer {
  if (width.at !== "edges") return empty("width-height-needs-peak-profile", null);
  const solved = ratioForResolution(mzCentre / widthInMz(width, mzCentre), maxSteps);
  if (solved.kind === "not-reachable") return empty(solved.reason, null);
  if (solved.kind === "not-converged") return empty("not-converged", null);
  const { ratio, margin, qLow, qHigh } = solved;
  const mzTimesQ = (2 * mzCentre * qLow * qHigh) / (qLow + qHigh);
  return {
    passbands: [firstRegionPassband(windowInMz({ ...solved, kind: "window" }, mzTimesQ), ratio)],
    reason: null,
    ...placeOnScanLine(ratio, margin),
  };
}

function empty(reason: Answer["reason"], ratio: number | null): Answer {
  return { passbands: [], reason, ...placeOnScanLine(ratio, ratio === null ? null : apexMarginOf(ratio)) };
}

function placeOnScanLine(ratio: number | null, margin: number | null) {
  return {
    dcToRfRatio: ratio,
    apexRatio: APEX_RATIO,
    apexMargin_ppm: margin === null ? null : ppmFromRatio(margin),
  };
}
