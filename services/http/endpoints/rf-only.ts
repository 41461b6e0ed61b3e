import { z } from "zod";
import { Drive, rfToCanonical } from "../../contract/drive.ts";
import { mzOfIon } from "../../contract/ion.ts";
import { quantity } from "../../contract/quantity.ts";
import { fieldOf, polePairsOf, RodSet, sinusoid } from "../../contract/rod-set.ts";
import type { ErrorItem } from "../../contract/rule.ts";
import { kHzFromHertz } from "../../contract/si.ts";
import { qOf } from "../../physics/mathieu-parameters.ts";
import {
  ADIABATIC_LIMIT,
  adiabaticity,
  lowMassCutoff,
  secondWindow,
  secularFrequency,
  USABLE_RADIUS_FRACTION,
  wellDepth,
} from "../../physics/rf-only.ts";
import { pointStability } from "../../physics/stability.ts";
import { defineEndpoint } from "../endpoint.ts";
import { MOST_ITEMS } from "../limits.ts";
import { Ions, ionsErrors } from "../shapes/ions.ts";
import { SOURCES } from "../shapes/sources.ts";

const RfOnlyRequest = z
  .strictObject({
    rodSet: RodSet,
    drive: Drive,
    ions: Ions,
    maxRadialEnergy_eVPerCharge: quantity(
      "Largest radial energy of an ion in eV per charge, for confined and highMassLimit.",
      1e-6,
      1e5,
    ).optional(),
  })
  .meta({ id: "RfOnlyRequest" });

const RfOnlyResult = z
  .strictObject({
    mz: z.number(),
    q: z
      .number()
      .nullable()
      .meta({ description: "Mathieu parameter q; null above two pole pairs, where it is not defined." }),
    stable: z
      .boolean()
      .nullable()
      .meta({ description: "null above two pole pairs, and where q is outside the computed domain." }),
    wellDepth_eVPerCharge: z
      .number()
      .meta({ description: "Effective potential at r0 in eV per charge; qV/4 in a quadrupole." }),
    adiabaticity: z.number().meta({
      description: "η at r0. The effective potential holds while it is small; 0.3 is a common limit.",
    }),
    secularFrequency_kHz: z
      .number()
      .nullable()
      .meta({ description: "β f/2, exact; null when unstable and above two pole pairs." }),
    confined: z.boolean().nullable().meta({
      description:
        "Whether the effective potential at 0.8 r0 exceeds maxRadialEnergy_eVPerCharge. null when that is not stated, and where η at 0.8 r0 is above 0.3, so that the effective potential proves nothing.",
    }),
  })
  .meta({ id: "RfOnlyResult" });

const RfOnlyAnswer = z
  .strictObject({
    lowMassCutoff: z
      .number()
      .nullable()
      .meta({ description: "m/z below which ions are lost; null without RF and above two pole pairs." }),
    secondWindow: z
      .strictObject({ mzLow: z.number(), mzHigh: z.number() })
      .nullable()
      .meta({ description: "The narrow window below the cutoff in which ions are stable again." }),
    highMassLimit: z.number().nullable().meta({
      description:
        "m/z above which the effective potential at 0.8 r0 is below maxRadialEnergy_eVPerCharge; null when that is not stated, because stability itself sets no upper limit without DC.",
    }),
    results: z.array(RfOnlyResult),
  })
  .meta({ id: "RfOnlyAnswer" });

export const rfOnly = defineEndpoint({
  operationId: "rfOnly",
  method: "post",
  path: "/v1/rf-only",
  tag: "Ion motion",
  summary: "Which ions an RF-only rod set guides, and how firmly",
  description:
    "Collision cells and ion guides of 2 to 11 pole pairs. q, stability, cutoff and secular frequency belong to the quadrupole; the effective potential and the adiabaticity hold for every rod set.",
  request: RfOnlyRequest,
  rules: [({ rodSet }) => sinusoid(rodSet.waveform, "/rodSet/waveform"), noDc, ionsErrors],
  work: { unit: "ions", of: ({ ions }) => ions.length, most: MOST_ITEMS },
  answer: RfOnlyAnswer,
  examples: {
    quadrupole: {
      summary: "A quadrupole cell well above its cutoff",
      source: SOURCES.rfOnly,
      request: {
        rodSet: { fieldRadius_mm: 3, frequency_MHz: 1 },
        drive: { rf: { volts: 974.14, as: "zero-to-peak", between: "pole-and-ground" } },
        ions: [{ mz: 3738.99 }],
        maxRadialEnergy_eVPerCharge: 5,
      },
      answer: {
        lowMassCutoff: 1165.2856764818714,
        secondWindow: { mzLow: 139.60113594470002, mzHigh: 140.82888839262088 },
        highMassLimit: 32984.64182123225,
        results: [
          {
            mz: 3738.99,
            q: 0.2829997903933363,
            stable: true,
            wellDepth_eVPerCharge: 68.92035395344115,
            adiabaticity: 0.2829997903933363,
            secularFrequency_kHz: 101.6941001043152,
            confined: true,
          },
        ],
      },
    },
    octopole: {
      summary: "An octopole guide, where q and cutoff are not defined",
      source: SOURCES.rfOnly,
      request: {
        rodSet: { fieldRadius_mm: 6, frequency_MHz: 0.5, polePairs: 4 },
        drive: { rf: { volts: 97.635, as: "zero-to-peak", between: "pole-and-ground" } },
        ions: [{ mz: 12000 }],
      },
      answer: {
        lowMassCutoff: null,
        secondWindow: null,
        highMassLimit: null,
        results: [
          {
            mz: 12000,
            q: null,
            stable: null,
            wellDepth_eVPerCharge: 0.8628769264193323,
            adiabaticity: 0.05302669696846411,
            secularFrequency_kHz: null,
            confined: null,
          },
        ],
      },
    },
  },
  handler({ rodSet, drive, ions, maxRadialEnergy_eVPerCharge: energy }) {
    const field = fieldOf(rodSet);
    const rfVolts = rfToCanonical(drive.rf);
    const polePairs = polePairsOf(rodSet);
    const cutsOff = polePairs === 2 && rfVolts > 0;
    const usableDepth = (mz: number) => wellDepth(rfVolts, mz, field, polePairs, USABLE_RADIUS_FRACTION);
    return {
      lowMassCutoff: cutsOff ? lowMassCutoff(rfVolts, field) : null,
      secondWindow: cutsOff ? secondWindow(rfVolts, field) : null,
      // The depth falls as 1/m, so the depth at m/z 1 is depth times m/z everywhere.
      highMassLimit: energy === undefined ? null : usableDepth(1) / energy,
      results: ions.map((ion) => {
        const mz = mzOfIon(ion);
        const q = polePairs === 2 ? qOf(mz, rfVolts, field) : null;
        const stable = q === null ? null : (pointStability(0, q)?.stable ?? null);
        const usableAdiabaticity = adiabaticity(rfVolts, mz, field, polePairs, USABLE_RADIUS_FRACTION);
        const secular = q === null ? null : secularFrequency(q, field.frequency);
        return {
          mz,
          q,
          stable,
          wellDepth_eVPerCharge: wellDepth(rfVolts, mz, field, polePairs),
          adiabaticity: adiabaticity(rfVolts, mz, field, polePairs),
          secularFrequency_kHz: secular && kHzFromHertz(secular),
          confined:
            energy === undefined || usableAdiabaticity > ADIABATIC_LIMIT ? null : usableDepth(mz) > energy,
        };
      }),
    };
  },
});

function noDc({ drive }: { readonly drive: Drive }): ErrorItem[] {
  if (drive.dc === undefined) return [];
  return [
    {
      pointer: "/drive/dc",
      code: "dc-not-taken",
      detail: "dc is stated, but this question is about rods without DC. Leave it out, or ask /v1/stability.",
    },
  ];
}
