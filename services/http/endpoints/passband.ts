import { driveToCanonical } from "../../contract/drive.ts";
import { fieldOf, quadrupole, rectangularWaveOf, waveShapeOf } from "../../contract/rod-set.ts";
import { ppmFromRatio } from "../../contract/si.ts";
import { widthInMz } from "../../contract/width.ts";
import { APEX_RATIO, apexMarginOf } from "../../physics/first-region.ts";
import { windowInMz } from "../../physics/passband.ts";
import type { RectangularWave } from "../../physics/rectangular/rectangular-wave.ts";
import { closingWave } from "../../physics/rectangular/wave-resolution.ts";
import { ratioForResolution } from "../../physics/set-point.ts";
import { defineEndpoint, type Limits } from "../endpoint.ts";
import { answeredPassband, type Passband } from "../shapes/passband.ts";
import {
  PassbandAnswer,
  type PassbandOfDrive,
  type PassbandOfWidth,
  PassbandRequest,
} from "../shapes/passband-question.ts";
import { type DrivenRods, passbandsOfDrive } from "../shapes/passbands-of-drive.ts";
import type { WantedRegion } from "../shapes/region.ts";
import { SOURCES } from "../shapes/sources.ts";

export const passband = defineEndpoint({
  operationId: "passband",
  method: "post",
  path: "/v1/passband",
  tag: "Mass filter",
  summary: "The m/z that a mass filter lets through",
  description:
    "Where the scan line a/q = 2U/V enters and leaves a stability region, exactly: the first unless the request names another. There the edge at low m/z is β_x = 1 (light ions are lost to the x rods), the edge at high m/z β_y = 0. Rods may run a sinusoid or a rectangular wave; a DC-coupled rectangular wave filters by its duty cycle alone. Real peaks are narrower or wider than the distance of the edges, by residence and beam.",
  request: PassbandRequest,
  rules: [(request) => ("rodSet" in request ? quadrupole(request.rodSet, "/rodSet") : [])],
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
            bands: { x: 0, y: 0 },
            mzLow: 1353.605792682864,
            mzHigh: 1367.2098687303862,
            mzCentre: 1360.407830706625,
            mzWidth: 13.604076047522309,
            resolution: 100.00001660931572,
            low: { a: 0.23561259157127404, q: 0.7071926538290377, lostTo: "x" },
            high: { a: 0.23326818806249455, q: 0.7001559121678081, lostTo: "y" },
          },
        ],
        otherWindows: [],
        searchedToQ: 12,
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
        otherWindows: [],
        searchedToQ: 12,
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
            bands: { x: 0, y: 0 },
            mzLow: 137.1767286201643,
            mzHigh: 137.3139740961545,
            mzCentre: 137.2453513581594,
            mzWidth: 0.13724547599022238,
            resolution: 999.9990919040349,
            low: { a: 0.23685573680313005, q: 0.7061158393084804, lostTo: "x" },
            high: { a: 0.23661899922013793, q: 0.70541007571007, lostTo: "y" },
          },
        ],
        otherWindows: null,
        searchedToQ: null,
        reason: null,
        dcToRfRatio: 0.16771733731046856,
        apexRatio: 0.16784370570836984,
        apexMargin_ppm: 752.8932787081121,
      },
    },
    "duty-cycle-filter": {
      summary: "A rectangular wave that filters by its duty cycle, without a DC supply",
      source: SOURCES.rectangularWaves,
      request: {
        rodSet: {
          fieldRadius_mm: 4,
          frequency_MHz: 1,
          waveform: { shape: "rectangular", dutyCycle: 0.605, coupling: "dc" },
        },
        drive: { rf: { volts: 421.78, as: "zero-to-peak", between: "pole-and-ground" } },
      },
      answer: {
        passbands: [
          {
            region: "first",
            bands: { x: 0, y: 0 },
            mzLow: 432.1910633420424,
            mzHigh: 470.3825495677101,
            mzCentre: 451.28680645487646,
            mzWidth: 38.19148622566818,
            resolution: 11.816424314788,
            low: { a: 0, q: 0.5962820935544725, lostTo: "x" },
            high: { a: 0, q: 0.5478685216999752, lostTo: "y" },
          },
        ],
        otherWindows: [],
        searchedToQ: 12,
        reason: null,
        dcToRfRatio: 0,
        apexRatio: 0.014280374858187641,
        apexMargin_ppm: 1000000,
      },
    },
    "rf-only-any-region": {
      summary: "Without DC: all above the cutoff, and a second window near 0.12 of it",
      source: SOURCES.rfOnly,
      request: {
        rodSet: { fieldRadius_mm: 3, frequency_MHz: 1 },
        drive: { rf: { volts: 974.14, as: "zero-to-peak", between: "pole-and-ground" } },
        region: "any",
      },
      answer: {
        passbands: [
          {
            region: "first",
            bands: { x: 0, y: 0 },
            mzLow: 1165.2856764818714,
            mzHigh: null,
            mzCentre: null,
            mzWidth: null,
            resolution: null,
            low: { a: 0, q: 0.9080463337345775, lostTo: "x" },
            high: null,
          },
          {
            region: "second",
            bands: { x: 1, y: 1 },
            mzLow: 139.60113594470002,
            mzHigh: 140.82888839262088,
            mzCentre: 140.21501216866045,
            mzWidth: 1.2277524479208453,
            resolution: 114.20462847059238,
            low: { a: 0, q: 7.579690373736909, lostTo: "x" },
            high: { a: 0, q: 7.513610299420813, lostTo: "y" },
          },
        ],
        otherWindows: [],
        searchedToQ: 12,
        reason: null,
        dcToRfRatio: 0,
        apexRatio: 0.16784370570836984,
        apexMargin_ppm: 1000000,
      },
    },
  },
  handler: (request, limits) =>
    "rodSet" in request ? passbandOfDrive(request, limits) : passbandOfWidth(request, limits),
});

function passbandOfDrive(
  { rodSet, drive, region = "first" }: PassbandOfDrive,
  { maxSteps }: Limits,
): PassbandAnswer {
  const { waveform } = rodSet;
  const wave = rectangularWaveOf(waveform);
  const volts = driveToCanonical(drive, waveShapeOf(waveform));
  const rods = { volts, field: fieldOf(rodSet), wave };
  const ratio = volts.rfVolts === 0 ? null : volts.dcVolts / volts.rfVolts;
  const place = placeOnScanLine(ratio, wave, maxSteps);
  if (ratio === null) return empty("no-rf", place);
  const found = passbandsOfDrive(rods, region, maxSteps);
  if (found.kind === "not-converged") return empty("not-converged", place);
  const { passbands, searchedToQ } = found;
  return {
    passbands: [...passbands],
    otherWindows: region === "any" ? [] : otherWindowsOf(rods, passbands, maxSteps),
    searchedToQ,
    reason: passbands.length > 0 ? null : reasonOf(region, ratio, place.apexRatio),
    ...place,
  };
}

/** The windows of all regions but those already found. */
function otherWindowsOf(rods: DrivenRods, found: readonly Passband[], maxSteps: number): Passband[] | null {
  const every = passbandsOfDrive(rods, "any", maxSteps);
  if (every.kind === "not-converged") return null;
  const isFound = ({ bands }: Passband) =>
    found.some((one) => one.bands.x === bands.x && one.bands.y === bands.y);
  return every.passbands.filter((window) => !isFound(window));
}

function reasonOf(region: WantedRegion, ratio: number, apexRatio: number | null): PassbandAnswer["reason"] {
  if (region !== "first") return "scan-line-misses-region";
  return apexRatio !== null && ratio < apexRatio ? "below-lower-apex" : "above-apex";
}

function passbandOfWidth({ mzCentre, width }: PassbandOfWidth, { maxSteps }: Limits): PassbandAnswer {
  const nowhere = placeOnScanLine(null, null, maxSteps);
  if (width.at !== "edges") return empty("width-height-needs-peak-profile", nowhere);
  const solved = ratioForResolution(mzCentre / widthInMz(width, mzCentre), maxSteps);
  if (solved.kind === "not-reachable") return empty(solved.reason, nowhere);
  if (solved.kind === "not-converged") return empty("not-converged", nowhere);
  const { ratio, margin, qLow, qHigh } = solved;
  const mzTimesQ = (2 * mzCentre * qLow * qHigh) / (qLow + qHigh);
  const window = {
    bands: { x: 0, y: 0 },
    passband: windowInMz({ ...solved, kind: "window" }, mzTimesQ),
    lostBeyond: { low: "x", high: "y" },
  } as const;
  return {
    passbands: [answeredPassband(window, ratio)],
    otherWindows: null,
    searchedToQ: null,
    reason: null,
    dcToRfRatio: ratio,
    apexRatio: APEX_RATIO,
    apexMargin_ppm: ppmFromRatio(margin),
  };
}

type Place = Pick<PassbandAnswer, "dcToRfRatio" | "apexRatio" | "apexMargin_ppm">;

function empty(reason: PassbandAnswer["reason"], place: Place): PassbandAnswer {
  return { passbands: [], otherWindows: null, searchedToQ: null, reason, ...place };
}

function placeOnScanLine(ratio: number | null, wave: RectangularWave | null, maxSteps: number): Place {
  const apexRatio = wave === null ? APEX_RATIO : apexRatioOf(wave, maxSteps);
  if (ratio === null || apexRatio === null || apexRatio <= 0) {
    return { dcToRfRatio: ratio, apexRatio, apexMargin_ppm: null };
  }
  const margin = wave === null ? apexMarginOf(ratio) : (apexRatio - ratio) / apexRatio;
  return { dcToRfRatio: ratio, apexRatio, apexMargin_ppm: ppmFromRatio(margin) };
}

function apexRatioOf(wave: RectangularWave, maxSteps: number): number | null {
  const closed = closingWave({ vary: "ratio", wave, towards: "high" }, maxSteps);
  return closed.kind === "closed" ? closed.ratio : null;
}
