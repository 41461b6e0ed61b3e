import { z } from "zod";
import { Drive, driveToCanonical } from "../../contract/drive.ts";
import { mzOfIon } from "../../contract/ion.ts";
import { MathieuA, MathieuQ } from "../../contract/quantity.ts";
import { fieldOf, RodSet, sinusoid, sinusoidalQuadrupole, Waveform } from "../../contract/rod-set.ts";
import { aOf, qOf } from "../../physics/mathieu-parameters.ts";
import { DOMAIN_LIMIT, type PlaneStability, pointStability } from "../../physics/stability.ts";
import { defineEndpoint } from "../endpoint.ts";
import { MOST_ITEMS } from "../limits.ts";
import { Ions, ionsErrors } from "../shapes/ions.ts";
import { RegionName, regionNameOf } from "../shapes/region.ts";
import { SOURCES } from "../shapes/sources.ts";

const StabilityRequest = z
  .discriminatedUnion("given", [
    z
      .strictObject({ given: z.literal("ions"), rodSet: RodSet, drive: Drive, ions: Ions })
      .meta({ id: "StabilityOfIons" }),
    z
      .strictObject({
        given: z.literal("points"),
        waveform: Waveform.optional(),
        points: z
          .array(z.strictObject({ a: MathieuA, q: MathieuQ }))
          .min(1)
          .max(MOST_ITEMS)
          .meta({ description: `1 to ${MOST_ITEMS} points; the results come back in the same order.` }),
      })
      .meta({ id: "StabilityOfPoints" }),
  ])
  .meta({ id: "StabilityRequest" });

const Plane = z
  .strictObject({
    stable: z.boolean().nullable(),
    band: z.int().nullable().meta({ description: "The stable band n, between a_n(q) and b_{n+1}(q)." }),
    characteristicExponent: z
      .number()
      .nullable()
      .meta({ description: "Total characteristic exponent β, between n and n + 1 in band n." }),
    halfTrace: z
      .number()
      .nullable()
      .meta({ description: "Half the trace over one RF period, cos πβ where the motion is stable." }),
  })
  .meta({ id: "PlaneStability", description: "Motion in one plane; all null outside the computed domain." });

const StabilityResult = z
  .strictObject({
    mz: z.number().nullable().meta({ description: "null for a point." }),
    a: z.number(),
    q: z.number(),
    stable: z.boolean().nullable(),
    reason: z.enum(["outside-computed-domain"]).nullable(),
    region: z.strictObject({ x: z.int(), y: z.int(), name: RegionName.nullable() }).nullable().meta({
      description: "The bands n_x and n_y of a stable ion, and the name of the region if it has one.",
    }),
    lostTo: z.enum(["x", "y", "both"]).nullable().meta({
      description: "The rods that take an unstable ion; x are those whose DC has the sign of the ion.",
    }),
    x: Plane,
    y: Plane,
  })
  .meta({ id: "StabilityResult" });

const StabilityAnswer = z.strictObject({ results: z.array(StabilityResult) }).meta({ id: "StabilityAnswer" });

export const stability = defineEndpoint({
  operationId: "stability",
  method: "post",
  path: "/v1/stability",
  tag: "Ion motion",
  summary: "Whether ions or points (a, q) are stable, and which rods take them if not",
  description: `Solves the Mathieu equation in both planes. a and q belong to x, −a and −q to y. Beyond |a| or q of ${DOMAIN_LIMIT} nothing is computed and reason says so. Stable means bounded for ever in an ideal field, not that the ion fits between the rods.`,
  request: StabilityRequest,
  rules: [
    (request) =>
      request.given === "ions"
        ? [...sinusoidalQuadrupole(request.rodSet, "/rodSet"), ...ionsErrors(request)]
        : sinusoid(request.waveform, "/waveform"),
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
  },
  handler(request) {
    if (request.given === "points") {
      return { results: request.points.map(({ a, q }) => resultAt(null, a, q)) };
    }
    const field = fieldOf(request.rodSet);
    const { dcVolts, rfVolts } = driveToCanonical(request.drive);
    return {
      results: request.ions.map((ion) => {
        const mz = mzOfIon(ion);
        return resultAt(mz, aOf(mz, dcVolts, field), qOf(mz, rfVolts, field));
      }),
    };
  },
});

const NOTHING_COMPUTED = { stable: null, band: null, characteristicExponent: null, halfTrace: null };

function resultAt(mz: number | null, a: number, q: number): z.input<typeof StabilityResult> {
  const found = pointStability(a, q);
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
    region: region && { ...region, name: regionNameOf(region) },
    lostTo,
    x: planeOf(x),
    y: planeOf(y),
  };
}

function planeOf({ stable, band, characteristicExponent, halfTrace }: PlaneStability): z.input<typeof Plane> {
  return { stable, band, characteristicExponent, halfTrace };
}
