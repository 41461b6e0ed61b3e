import { rfToCanonical } from "../../contract/drive.ts";
import { mzOfIon } from "../../contract/ion.ts";
import { Frequency_MHz } from "../../contract/quantity.ts";
import { residenceErrors } from "../../contract/residence.ts";
import { fieldOf, quadrupole, rectangularWaveOf, waveShapeOf } from "../../contract/rod-set.ts";
import type { ErrorItem } from "../../contract/rule.ts";
import { MHzFromHertz } from "../../contract/si.ts";
import { defineEndpoint } from "../endpoint.ts";
import { MOST_ITEMS } from "../limits.ts";
import { answeredDrive } from "../shapes/answered-drive.ts";
import { edgesForTarget, edgesWorthOf } from "../shapes/edges-for-height.ts";
import { ionsInsideErrors } from "../shapes/ions.ts";
import { passbandsOfDrive } from "../shapes/passbands-of-drive.ts";
import { type SetPoint, SetPointsAnswer, SetPointsRequest, type Target } from "../shapes/set-points.ts";
import { sinusoidSetPoint, waveSetPoint } from "../shapes/solved-set-point.ts";
import { SOURCES } from "../shapes/sources.ts";

/** A rectangular wave takes so many times the work of a sinusoid in its first region. */
const WAVE_WORK = 20;

export const setPoints = defineEndpoint({
  operationId: "setPoints",
  method: "post",
  path: "/v1/set-points",
  tag: "Mass filter",
  summary: "The RF and DC, or the frequency, that give passbands of wanted position and width",
  description:
    "The inverse of the passband, solved exactly: the passband of the calculated drive is centred on the m/z of the ion and as wide as asked, in the region asked for. A rectangular wave has set points in its first region, by volts or by frequency, with DC or by its duty cycle alone. Where residence and beam are given, a width may be taken at half or at a tenth of the height: with a sinusoid, in the first region, by volts. The edges that give this peak are then solved for and centred on the ion, and `passband` states them. Calculated volts are not settings to apply, and they may exceed any supply.",
  request: SetPointsRequest,
  rules: [
    ({ rodSet }) => quadrupole(rodSet, "/rodSet"),
    rectangularInFirstRegion,
    keptVolts,
    dutyCycleAlone,
    ({ residence, rodSet }) => (residence === undefined ? [] : residenceErrors(residence, rodSet, "/rodSet")),
    ({ targets }) => ionsInsideErrors(targets, "/targets"),
  ],
  work: {
    unit: `targets (each counts ${WAVE_WORK}-fold with a rectangular wave, and some hundredfold where its peak has to be computed)`,
    of: (request) => {
      const wave = rectangularWaveOf(request.rodSet.waveform) === null ? 1 : WAVE_WORK;
      return request.targets.reduce((sum, target) => sum + wave * edgesWorthOf(target, request), 0);
    },
    most: MOST_ITEMS,
  },
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
            frequency_MHz: 0.65,
            dutyCycle: null,
            reason: null,
            a: 0.23613901774640952,
            q: 0.7052178801653954,
            passband: {
              region: "first",
              bands: { x: 0, y: 0 },
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
            frequency_MHz: null,
            dutyCycle: null,
            reason: "width-height-needs-peak-profile",
            a: null,
            q: null,
            passband: null,
          },
        ],
      },
    },
    "duty-cycle-by-frequency": {
      summary: "A digital drive at fixed volts: duty cycle for the width, frequency for the ion",
      source: SOURCES.rectangularWaves,
      request: {
        rodSet: {
          fieldRadius_mm: 4,
          frequency_MHz: 0.8,
          waveform: { shape: "rectangular", dutyCycle: 0.5, coupling: "dc" },
        },
        convention: {
          rf: { as: "zero-to-peak", between: "pole-and-ground" },
          dc: { between: "pole-and-ground" },
        },
        solveFor: "frequency",
        rf: { volts: 421.78, as: "zero-to-peak", between: "pole-and-ground" },
        widthBy: "duty-cycle",
        targets: [
          { ion: { mz: 451.2868064548762 }, width: { value: 38.19148622566769, as: "mz", at: "edges" } },
        ],
      },
      answer: {
        results: [
          {
            mz: 451.2868064548762,
            drive: {
              rf: { volts: 421.78, as: "zero-to-peak", between: "pole-and-ground" },
              dc: { volts: 0, between: "pole-and-ground" },
            },
            frequency_MHz: 1,
            dutyCycle: 0.605,
            reason: null,
            a: 0,
            q: 0.5710510220530778,
            passband: {
              region: "first",
              bands: { x: 0, y: 0 },
              mzLow: 432.1910633420424,
              mzHigh: 470.3825495677101,
              mzCentre: 451.2868064548761,
              mzWidth: 38.19148622566815,
              resolution: 11.816424314788,
              low: { a: 0, q: 0.5962820935544726, lostTo: "x" },
              high: { a: 0, q: 0.5478685216999748, lostTo: "y" },
            },
          },
        ],
      },
    },
    "third-region": {
      summary: "m/z 56 at a resolution of 1000 in the third region",
      request: {
        rodSet: { fieldRadius_mm: 6, frequency_MHz: 2 },
        convention: {
          rf: { as: "zero-to-peak", between: "pole-and-ground" },
          dc: { between: "pole-and-ground" },
        },
        region: "third",
        targets: [{ ion: { mz: 56 }, width: { value: 1000, as: "resolution", at: "edges" } }],
      },
      answer: {
        results: [
          {
            mz: 56,
            drive: {
              rf: { volts: 2666.9957373327916, as: "zero-to-peak", between: "pole-and-ground" },
              dc: { volts: 1304.2712532866249, between: "pole-and-ground" },
            },
            frequency_MHz: 2,
            dutyCycle: null,
            reason: null,
            a: 3.1623428235222275,
            q: 3.233205826267372,
            passband: {
              region: "third",
              bands: { x: 1, y: 0 },
              mzLow: 55.972,
              mzHigh: 56.02800000000001,
              mzCentre: 56.000000000000014,
              mzWidth: 0.056000000000011936,
              resolution: 999.9999999997871,
              low: { a: 3.163924785915185, q: 3.234823237886315, lostTo: "x" },
              high: { a: 3.1607624423010767, q: 3.2315900312517454, lostTo: "y" },
            },
          },
        ],
      },
    },
  },
  handler: (request, { maxSteps }) => ({
    results: request.targets.map((target) => solve(target, request, maxSteps)),
  }),
});

function rectangularInFirstRegion({ rodSet, region }: SetPointsRequest): ErrorItem[] {
  if (rectangularWaveOf(rodSet.waveform) === null || region === undefined || region === "first") return [];
  return [
    {
      pointer: "/region",
      code: "region-not-computed",
      detail: `region is ${region}; set points of a rectangular wave are computed in the first region only.`,
    },
  ];
}

function keptVolts({ solveFor, rf }: SetPointsRequest): ErrorItem[] {
  if (solveFor !== "frequency") {
    if (rf === undefined) return [];
    const detail = "rf is stated, but the RF volts are solved for; leave it out or solveFor frequency.";
    return [{ pointer: "/rf", code: "member-not-taken", detail }];
  }
  if (rf === undefined) {
    const detail = "rf is missing; a frequency is solved for at RF volts that are kept.";
    return [{ pointer: "/rf", code: "missing-member", detail }];
  }
  if (rf.volts > 0) return [];
  return [
    {
      pointer: "/rf/volts",
      code: "out-of-range",
      detail: "volts is 0; it must be above 0 where a frequency is solved for.",
    },
  ];
}

function dutyCycleAlone({ rodSet, widthBy, tip }: SetPointsRequest): ErrorItem[] {
  if (widthBy !== "duty-cycle") return [];
  if (rectangularWaveOf(rodSet.waveform)?.coupling !== "dc") {
    const detail = "widthBy is duty-cycle; only a DC-coupled rectangular wave filters by its duty cycle.";
    return [{ pointer: "/widthBy", code: "member-not-taken", detail }];
  }
  if (tip === undefined) return [];
  const detail = "tip is stated, but without DC the two duty cycles differ in the names x and y only.";
  return [{ pointer: "/tip", code: "member-not-taken", detail }];
}

function solve(target: Target, request: SetPointsRequest, maxSteps: number): SetPoint {
  const { rodSet, convention, region = "first", widthBy = "dc" } = request;
  const { waveform } = rodSet;
  const shape = waveShapeOf(waveform);
  const wave = rectangularWaveOf(waveform);
  const mz = mzOfIon(target.ion);
  const edges = edgesForTarget(target, request);
  if (edges.kind === "unsolved") return unsolved(mz, edges.reason);
  const wanted = {
    mzCentre: mz,
    mzWidth: edges.mzWidth,
    field: fieldOf(rodSet),
    keptRfVolts: request.rf === undefined ? null : rfToCanonical(request.rf, shape),
    tip: request.tip ?? "high-ratio",
  } as const;
  const solved =
    wave === null
      ? sinusoidSetPoint(wanted, region, maxSteps)
      : waveSetPoint(wanted, wave, widthBy, maxSteps);
  if (solved.kind === "unsolved") return unsolved(mz, solved.reason);
  const { frequency, a, q } = solved;
  // Asked of the drive itself and not taken from the solution, so that it shows what it really lets through.
  const field = { fieldRadius: wanted.field.fieldRadius, frequency };
  const through = passbandsOfDrive({ volts: solved, field, wave: solved.wave }, region, maxSteps);
  const [passband] = through.kind === "passbands" ? through.passbands : [];
  if (passband === undefined) return unsolved(mz, "not-converged");
  const frequency_MHz = MHzFromHertz(frequency);
  const sayable = request.rf === undefined || Frequency_MHz.safeParse(frequency_MHz).success;
  const drive = sayable ? answeredDrive(solved, convention, shape) : null;
  return {
    mz,
    drive,
    frequency_MHz: request.rf === undefined ? rodSet.frequency_MHz : frequency_MHz,
    dutyCycle: solved.wave?.dutyCycle ?? null,
    reason: drive !== null ? null : sayable ? "drive-out-of-range" : "frequency-out-of-range",
    a,
    q,
    passband,
  };
}

function unsolved(mz: number, reason: NonNullable<SetPoint["reason"]>): SetPoint {
  const nothing = { drive: null, frequency_MHz: null, dutyCycle: null, a: null, q: null, passband: null };
  return { mz, reason, ...nothing };
}
