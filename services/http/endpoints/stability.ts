import { driveToCanonical } from "../../contract/drive.ts";
import { mzOfIon } from "../../contract/ion.ts";
import { fieldOf, quadrupole, rectangularWaveOf, waveShapeOf } from "../../contract/rod-set.ts";
import { aOf, qOf } from "../../physics/mathieu-parameters.ts";
import type { RectangularWave } from "../../physics/rectangular/rectangular-wave.ts";
import { pointStabilityRectangular } from "../../physics/rectangular/wave-stability.ts";
import { DOMAIN_LIMIT, type PlaneStability, pointStability } from "../../physics/stability.ts";
import { defineEndpoint } from "../endpoint.ts";
import { MOST_ITEMS } from "../limits.ts";
import { ionsErrors } from "../shapes/ions.ts";
import { regionOf } from "../shapes/region.ts";
import { SOURCES } from "../shapes/sources.ts";
import { StabilityAnswer, StabilityRequest, type StabilityResult } from "../shapes/stability.ts";

export const stability = defineEndpoint({
  operationId: "stability",
  method: "post",
  path: "/v1/stability",
  tag: "Ion motion",
  summary: "Whether ions or points (a, q) are stable, and which rods take them if not",
  description: `Solves the Mathieu equation in both planes, or with a rectangular wave the Meissner equation, in which V is half the swing of the wave and a only the DC besides it. a and q belong to x, −a and −q to y. Beyond |a| or q of ${DOMAIN_LIMIT}, under a rectangular wave also where rounding would show before, nothing is computed and reason says so. Stable means bounded for ever in an ideal field, not that the ion fits between the rods.`,
  request: StabilityRequest,
  rules: [
    (request) =>
      request.given === "ions" ? [...quadrupole(request.rodSet, "/rodSet"), ...ionsErrors(request)] : [],
  ],
  work: {
    unit: "ions or points",
    of: (request) => (request.given === "ions" ? request.ions.length : request.points.length),
    most: MOST_ITEMS,
  },
  answer: StabilityAnswer,
  examples: {
    "points-of-four-kinds": {
      summary: "First, third and second region, and an ion lost to the y rods",
      source: SOURCES.stability,
      request: {
        given: "points",
        points: [
          { a: 0.1228015, q: 0.594671 },
          { a: 3.1530933, q: 3.246094 },
          { a: 0.0064105, q: 7.558195 },
          { a: 0.110838, q: 0.054242 },
        ],
      },
      answer: {
        results: [
          {
            mz: null,
            a: 0.1228015,
            q: 0.594671,
            stable: true,
            reason: null,
            region: { x: 0, y: 0, name: "first" },
            lostTo: null,
            x: {
              stable: true,
              band: 0,
              characteristicExponent: 0.612711008105169,
              halfTrace: -0.3467389094394905,
            },
            y: {
              stable: true,
              band: 0,
              characteristicExponent: 0.23836660431245416,
              halfTrace: 0.7324717432106599,
            },
          },
          {
            mz: null,
            a: 3.1530933,
            q: 3.246094,
            stable: true,
            reason: null,
            region: { x: 1, y: 0, name: "third" },
            lostTo: null,
            x: {
              stable: true,
              band: 1,
              characteristicExponent: 1.951529478293582,
              halfTrace: 0.9884286031045079,
            },
            y: {
              stable: true,
              band: 0,
              characteristicExponent: 0.6439907580170111,
              halfTrace: -0.43708965264366567,
            },
          },
          {
            mz: null,
            a: 0.0064105,
            q: 7.558195,
            stable: true,
            reason: null,
            region: { x: 1, y: 1, name: "second" },
            lostTo: null,
            x: {
              stable: true,
              band: 1,
              characteristicExponent: 1.6882917209774047,
              halfTrace: 0.5576365974785251,
            },
            y: {
              stable: true,
              band: 1,
              characteristicExponent: 1.5395856264978607,
              halfTrace: 0.12404160000471993,
            },
          },
          {
            mz: null,
            a: 0.110838,
            q: 0.054242,
            stable: false,
            reason: null,
            region: null,
            lostTo: "y",
            x: {
              stable: true,
              band: 0,
              characteristicExponent: 0.33540246372080756,
              halfTrace: 0.4943599949248016,
            },
            y: { stable: false, band: null, characteristicExponent: null, halfTrace: 1.5908860824538855 },
          },
        ],
      },
    },
    "unit-mass-window": {
      summary: "An ion inside a window of 0.70 around m/z 500, and one below it",
      request: {
        given: "ions",
        rodSet: { fieldRadius_mm: 4, frequency_MHz: 1.2 },
        drive: {
          rf: { volts: 831.55739482, as: "zero-to-peak", between: "pole-and-ground" },
          dc: { volts: 139.42457479, between: "pole-and-ground" },
        },
        ions: [{ mz: 500 }, { mz: 499.0625, label: "below the window" }],
      },
      answer: {
        results: [
          {
            mz: 500,
            a: 0.23663468138174998,
            q: 0.7056694254590696,
            stable: true,
            reason: null,
            region: { x: 0, y: 0, name: "first" },
            lostTo: null,
            x: {
              stable: true,
              band: 0,
              characteristicExponent: 0.9805753253790458,
              halfTrace: -0.9981385881441105,
            },
            y: {
              stable: true,
              band: 0,
              characteristicExponent: 0.013744811476007247,
              halfTrace: 0.999067862794753,
            },
          },
          {
            mz: 499.0625,
            a: 0.23707920489092044,
            q: 0.706995041161247,
            stable: false,
            reason: null,
            region: null,
            lostTo: "x",
            x: { stable: false, band: null, characteristicExponent: null, halfTrace: -1.003131459776088 },
            y: {
              stable: true,
              band: 0,
              characteristicExponent: 0.026420033213612547,
              halfTrace: 0.9965573955422344,
            },
          },
        ],
      },
    },
    "duty-cycle-0.61": {
      summary: "A rectangular wave without DC: inside its window, and an ion too heavy for it",
      request: {
        given: "points",
        waveform: { shape: "rectangular", dutyCycle: 0.61, coupling: "dc" },
        points: [
          { a: 0, q: 0.585 },
          { a: 0, q: 0.57 },
        ],
      },
      answer: {
        results: [
          {
            mz: null,
            a: 0,
            q: 0.585,
            stable: true,
            reason: null,
            region: { x: 0, y: 0, name: "first" },
            lostTo: null,
            x: {
              stable: true,
              band: 0,
              characteristicExponent: 0.921134133273525,
              halfTrace: -0.9694630895243626,
            },
            y: {
              stable: true,
              band: 0,
              characteristicExponent: 0.06189003267822242,
              halfTrace: 0.9811573249192571,
            },
          },
          {
            mz: null,
            a: 0,
            q: 0.57,
            stable: false,
            reason: null,
            region: null,
            lostTo: "y",
            x: {
              stable: true,
              band: 0,
              characteristicExponent: 0.8626476150483972,
              halfTrace: -0.9083372280910262,
            },
            y: { stable: false, band: null, characteristicExponent: null, halfTrace: 1.021187170130438 },
          },
        ],
      },
    },
  },
  handler(request) {
    if (request.given === "points") {
      const wave = rectangularWaveOf(request.waveform);
      return { results: request.points.map(({ a, q }) => resultAt(null, a, q, wave)) };
    }
    const { rodSet } = request;
    const field = fieldOf(rodSet);
    const wave = rectangularWaveOf(rodSet.waveform);
    const { dcVolts, rfVolts } = driveToCanonical(request.drive, waveShapeOf(rodSet.waveform));
    return {
      results: request.ions.map((ion) => {
        const mz = mzOfIon(ion);
        return resultAt(mz, aOf(mz, dcVolts, field), qOf(mz, rfVolts, field), wave);
      }),
    };
  },
});

const NOTHING_COMPUTED = { stable: null, band: null, characteristicExponent: null, halfTrace: null };

function resultAt(mz: number | null, a: number, q: number, wave: RectangularWave | null): StabilityResult {
  const found = wave === null ? pointStability(a, q) : pointStabilityRectangular(a, q, wave);
  if (found === null) {
    return {
      mz,
      a,
      q,
      stable: null,
      reason: "outside-computed-domain",
      region: null,
      lostTo: null,
      x: NOTHING_COMPUTED,
      y: NOTHING_COMPUTED,
    };
  }
  const { stable, region, lostTo, x, y } = found;
  return {
    mz,
    a,
    q,
    stable,
    reason: null,
    region: region && regionOf(region),
    lostTo,
    x: planeOf(x),
    y: planeOf(y),
  };
}

function planeOf({ stable, band, characteristicExponent, halfTrace }: PlaneStability): StabilityResult["x"] {
  return { stable, band, characteristicExponent, halfTrace };
}
