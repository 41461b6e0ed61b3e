import type { z } from "zod";
import { dcToCanonical, driveToCanonical, rfToCanonical } from "../../contract/drive.ts";
import { mzOfIon } from "../../contract/ion.ts";
import { fieldOf, sinusoidalQuadrupole } from "../../contract/rod-set.ts";
import { hertzFromMHz, MHzFromHertz, metresFromMm, mmFromMetres } from "../../contract/si.ts";
import {
  aOf,
  dcVoltsOf,
  fieldRadiusOf,
  frequencyOf,
  mzOf,
  qOf,
  rfVoltsOf,
} from "../../physics/mathieu-parameters.ts";
import { defineEndpoint } from "../endpoint.ts";
import { MOST_ITEMS } from "../limits.ts";
import { answeredDrive } from "../shapes/answered-drive.ts";
import { ionsErrors, ionsInsideErrors } from "../shapes/ions.ts";
import {
  type FindDrive,
  type FindFieldRadius,
  type FindFrequency,
  type FindMz,
  type FindParameters,
  MathieuParametersAnswer,
  MathieuParametersRequest,
} from "../shapes/mathieu-parameters.ts";
import { SOURCES } from "../shapes/sources.ts";

export const mathieuParameters = defineEndpoint({
  operationId: "mathieuParameters",
  method: "post",
  path: "/v1/mathieu-parameters",
  tag: "Ion motion",
  summary: "a and q of an ion, and every quantity that follows from them",
  description:
    "One relation in five directions, chosen by find: a = 8zeU/(m r0² Ω²) and q = 4zeV/(m r0² Ω²), U and V pole-to-ground, V zero-to-peak, Ω = 2πf.",
  request: MathieuParametersRequest,
  rules: [
    (request) => ("rodSet" in request ? sinusoidalQuadrupole(request.rodSet, "/rodSet") : []),
    (request) => ("ions" in request ? ionsErrors(request) : []),
    (request) => ("points" in request ? ionsInsideErrors(request.points, "/points") : []),
  ],
  work: {
    unit: "items",
    of: (request) =>
      "ions" in request
        ? request.ions.length
        : "points" in request
          ? request.points.length
          : request.q.length,
    most: MOST_ITEMS,
  },
  answer: MathieuParametersAnswer,
  examples: {
    parameters: {
      summary: "a and q of an ion",
      source: SOURCES.peakShapes,
      request: {
        find: "parameters",
        rodSet: { fieldRadius_mm: 4, frequency_MHz: 1.2 },
        drive: {
          rf: { volts: 831.55739482, as: "zero-to-peak", between: "pole-and-ground" },
          dc: { volts: 139.42457479, between: "pole-and-ground" },
        },
        ions: [{ mz: 499.0625 }],
      },
      answer: {
        find: "parameters",
        results: [{ mz: 499.0625, a: 0.237079204891, q: 0.706995041161 }],
        rodOffset_V: null,
      },
    },
    "pairs-to-ground": {
      summary: "The same ion with both pairs stated against ground, 10 V above it",
      source: SOURCES.peakShapes,
      request: {
        find: "parameters",
        rodSet: { fieldRadius_mm: 4, frequency_MHz: 1.2 },
        drive: {
          rf: { volts: 831.55739482, as: "zero-to-peak", between: "pole-and-ground" },
          dc: { pairX_V: 149.42457479, pairY_V: -129.42457479 },
        },
        ions: [{ mz: 499.0625 }],
      },
      answer: {
        find: "parameters",
        results: [{ mz: 499.0625, a: 0.237079204891, q: 0.706995041161 }],
        rodOffset_V: 10,
      },
    },
    "drive-at-the-apex": {
      summary: "Volts that bring m/z 1000 to the apex",
      source:
        "V = 7.22172145 M f² r0² and U = 1.21212049 M f² r0² (MHz, cm, V), recomputed from CODATA 2022; handbooks print 7.219 and 1.212 (Dawson (ed.), 1976, from memory).",
      request: {
        find: "drive",
        rodSet: { fieldRadius_mm: 4.17, frequency_MHz: 1 },
        convention: {
          rf: { as: "zero-to-peak", between: "pole-and-ground" },
          dc: { between: "pole-and-ground" },
        },
        points: [{ ion: { mz: 1000 }, a: 0.236993993112474, q: 0.705996069713371 }],
      },
      answer: {
        find: "drive",
        results: [
          {
            mz: 1000,
            drive: {
              rf: { volts: 1255.7779212190499, as: "zero-to-peak", between: "pole-and-ground" },
              dc: { volts: 210.77441988561, between: "pole-and-ground" },
            },
            reason: null,
          },
        ],
      },
    },
    "mz-at-the-cutoff": {
      summary: "The low-mass cutoff as m/z at q = 0.908",
      source: SOURCES.rfOnly,
      request: {
        find: "mz",
        rodSet: { fieldRadius_mm: 3, frequency_MHz: 1 },
        drive: { rf: { volts: 974.14, as: "zero-to-peak", between: "pole-and-ground" } },
        q: [0.908046333734578, 0],
      },
      answer: {
        find: "mz",
        results: [
          { q: 0.908046333734578, mz: 1165.2856764818714, reason: null },
          { q: 0, mz: null, reason: "q-is-zero" },
        ],
      },
    },
    frequency: {
      summary: "The frequency at which an ion has this q",
      source: SOURCES.rfOnly,
      request: {
        find: "frequency",
        fieldRadius_mm: 3,
        drive: { rf: { volts: 974.14, as: "zero-to-peak", between: "pole-and-ground" } },
        points: [{ ion: { mz: 3738.99 }, q: 0.2829997903933363 }],
      },
      answer: {
        find: "frequency",
        results: [{ mz: 3738.99, q: 0.2829997903933363, frequency_MHz: 1, reason: null }],
      },
    },
    "field-radius": {
      summary: "The field radius at which an ion has this q",
      source: SOURCES.rfOnly,
      request: {
        find: "field-radius",
        frequency_MHz: 1,
        drive: { rf: { volts: 974.14, as: "zero-to-peak", between: "pole-and-ground" } },
        points: [{ ion: { mz: 3738.99 }, q: 0.2829997903933363 }],
      },
      answer: {
        find: "field-radius",
        results: [{ mz: 3738.99, q: 0.2829997903933363, fieldRadius_mm: 3, reason: null }],
      },
    },
  },
  handler(request): z.input<typeof MathieuParametersAnswer> {
    switch (request.find) {
      case "parameters":
        return {
          find: "parameters",
          results: findParameters(request),
          rodOffset_V: dcToCanonical(request.drive.dc).rodOffset_V,
        };
      case "drive":
        return { find: "drive", results: findDrive(request) };
      case "mz":
        return { find: "mz", results: findMz(request) };
      case "frequency":
        return { find: "frequency", results: findFrequency(request) };
      case "field-radius":
        return { find: "field-radius", results: findFieldRadius(request) };
    }
  },
});

function findParameters({ rodSet, drive, ions }: z.output<typeof FindParameters>) {
  const field = fieldOf(rodSet);
  const { dcVolts, rfVolts } = driveToCanonical(drive);
  return ions.map((ion) => {
    const mz = mzOfIon(ion);
    return { mz, a: aOf(mz, dcVolts, field), q: qOf(mz, rfVolts, field) };
  });
}

function findDrive({ rodSet, convention, points }: z.output<typeof FindDrive>) {
  const field = fieldOf(rodSet);
  return points.map(({ ion, a, q }) => {
    const mz = mzOfIon(ion);
    const volts = { rfVolts: rfVoltsOf(mz, q, field), dcVolts: dcVoltsOf(mz, a, field) };
    const drive = answeredDrive(volts, convention);
    return { mz, drive, reason: drive === null ? ("drive-out-of-range" as const) : null };
  });
}

function findMz({ rodSet, drive, q: values }: z.output<typeof FindMz>) {
  const field = fieldOf(rodSet);
  const rfVolts = rfToCanonical(drive.rf);
  return values.map((q) => {
    const reason = undefinedAt(q, rfVolts);
    return { q, mz: reason === null ? mzOf(q, rfVolts, field) : null, reason };
  });
}

function findFrequency({ fieldRadius_mm, drive, points }: z.output<typeof FindFrequency>) {
  const rfVolts = rfToCanonical(drive.rf);
  return points.map(({ ion, q }) => {
    const mz = mzOfIon(ion);
    const reason = undefinedAt(q, rfVolts);
    const frequency = reason === null ? frequencyOf(mz, q, rfVolts, metresFromMm(fieldRadius_mm)) : null;
    return { mz, q, frequency_MHz: frequency && MHzFromHertz(frequency), reason };
  });
}

function findFieldRadius({ frequency_MHz, drive, points }: z.output<typeof FindFieldRadius>) {
  const rfVolts = rfToCanonical(drive.rf);
  return points.map(({ ion, q }) => {
    const mz = mzOfIon(ion);
    const reason = undefinedAt(q, rfVolts);
    const fieldRadius = reason === null ? fieldRadiusOf(mz, q, rfVolts, hertzFromMHz(frequency_MHz)) : null;
    return { mz, q, fieldRadius_mm: fieldRadius && mmFromMetres(fieldRadius), reason };
  });
}

function undefinedAt(q: number, rfVolts: number): "no-rf" | "q-is-zero" | null {
  if (rfVolts === 0) return "no-rf";
  return q === 0 ? "q-is-zero" : null;
}
