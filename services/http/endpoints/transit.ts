import { z } from "zod";
import { mzOfIon } from "../../contract/ion.ts";
import { flightTimeOf, Residence, residenceErrors, rfCyclesOf } from "../../contract/residence.ts";
import { RodSet } from "../../contract/rod-set.ts";
import { microsecondsFromSeconds } from "../../contract/si.ts";
import { attainableResolution, H_CONSTANTS } from "../../physics/transit.ts";
import { defineEndpoint } from "../endpoint.ts";
import { MOST_ITEMS } from "../limits.ts";
import { Ions, ionsErrors } from "../shapes/ions.ts";

const TransitRequest = z
  .strictObject({ rodSet: RodSet, residence: Residence, ions: Ions })
  .meta({ id: "TransitRequest" });

const TransitResult = z
  .strictObject({
    mz: z.number(),
    flightTime_us: z.number().meta({ description: "Time in the field in us." }),
    rfCycles: z.number().meta({ description: "RF cycles N in the field." }),
    attainableResolution: z.array(z.strictObject({ h: z.number(), resolution: z.number() })).meta({
      description: "N²/h for both constants h of the literature; neither is promised for a given beam.",
    }),
  })
  .meta({ id: "TransitResult" });

const TransitAnswer = z.strictObject({ results: z.array(TransitResult) }).meta({ id: "TransitAnswer" });

export const transit = defineEndpoint({
  operationId: "transit",
  method: "post",
  path: "/v1/transit",
  tag: "Ion motion",
  summary: "How long ions stay in the field, and the resolution that this allows",
  description:
    "Flight time and RF cycles of each ion, and the resolution N²/h that N cycles can form, for h = 12.25 (N = 3.5 √R) and h = 20. Which height of the peak either constant belongs to depends on the beam.",
  request: TransitRequest,
  rules: [({ residence, rodSet }) => residenceErrors(residence, rodSet, "/rodSet"), ionsErrors],
  work: { unit: "ions", of: ({ ions }) => ions.length, most: MOST_ITEMS },
  answer: TransitAnswer,
  examples: {
    "two-electronvolts": {
      summary: "m/z 500 with 2 eV through 200 mm at 1 MHz",
      source: "N = 7.198704629e-5 f L √(m/z per V), recomputed from CODATA 2022.",
      request: {
        rodSet: { fieldRadius_mm: 4.17, frequency_MHz: 1, rodLength_mm: 200 },
        residence: { axialEnergy_eVPerCharge: 2 },
        ions: [{ mz: 500 }],
      },
      answer: {
        results: [
          {
            mz: 500,
            flightTime_us: 227.64302830485286,
            rfCycles: 227.64302830437407,
            attainableResolution: [
              { h: 12.25, resolution: 4230.314149843759 },
              { h: 20, resolution: 2591.0674167793027 },
            ],
          },
        ],
      },
    },
  },
  handler: ({ rodSet, residence, ions }) => ({
    results: ions.map((ion) => {
      const mz = mzOfIon(ion);
      // The rule on the rod length has made sure that neither is null.
      const flightTime = flightTimeOf(residence, rodSet, mz)!;
      const rfCycles = rfCyclesOf(residence, rodSet, mz)!;
      return {
        mz,
        flightTime_us: microsecondsFromSeconds(flightTime),
        rfCycles,
        attainableResolution: H_CONSTANTS.map(({ h }) => ({
          h,
          resolution: attainableResolution(rfCycles, h),
        })),
      };
    }),
  }),
});
