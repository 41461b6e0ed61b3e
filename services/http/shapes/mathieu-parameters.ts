import { z } from "zod";
import { Drive, VoltageConvention } from "../../contract/drive.ts";
import { Ion } from "../../contract/ion.ts";
import { FieldRadius_mm, Frequency_MHz, MathieuA, MathieuQ } from "../../contract/quantity.ts";
import { RodSet } from "../../contract/rod-set.ts";
import { MOST_ITEMS } from "../limits.ts";
import { Ions } from "./ions.ts";

function upToMost<Item extends z.ZodType>(item: Item) {
  return z
    .array(item)
    .min(1)
    .max(MOST_ITEMS)
    .meta({ description: `1 to ${MOST_ITEMS} items; the results come back in the same order.` });
}

export const FindParameters = z
  .strictObject({ find: z.literal("parameters"), rodSet: RodSet, drive: Drive, ions: Ions })
  .meta({ id: "FindParameters" });
export const FindDrive = z
  .strictObject({
    find: z.literal("drive"),
    rodSet: RodSet,
    convention: VoltageConvention,
    points: upToMost(z.strictObject({ ion: Ion, a: MathieuA, q: MathieuQ })),
  })
  .meta({ id: "FindDrive" });
export const FindMz = z
  .strictObject({ find: z.literal("mz"), rodSet: RodSet, drive: Drive, q: upToMost(MathieuQ) })
  .meta({ id: "FindMz" });
const PointsOfQ = upToMost(z.strictObject({ ion: Ion, q: MathieuQ }));
export const FindFrequency = z
  .strictObject({
    find: z.literal("frequency"),
    fieldRadius_mm: FieldRadius_mm,
    drive: Drive,
    points: PointsOfQ,
  })
  .meta({ id: "FindFrequency" });
export const FindFieldRadius = z
  .strictObject({
    find: z.literal("field-radius"),
    frequency_MHz: Frequency_MHz,
    drive: Drive,
    points: PointsOfQ,
  })
  .meta({ id: "FindFieldRadius" });

export const MathieuParametersRequest = z
  .discriminatedUnion("find", [FindParameters, FindDrive, FindMz, FindFrequency, FindFieldRadius])
  .meta({ id: "MathieuParametersRequest" });

const Undefined = z
  .enum(["no-rf", "q-is-zero"])
  .nullable()
  .meta({ description: "Why there is no value: without RF, or at q = 0, there is none." });

const FoundParameters = z
  .strictObject({
    find: z.literal("parameters"),
    results: z.array(z.strictObject({ mz: z.number(), a: z.number(), q: z.number() })),
    rodOffset_V: z.number().nullable().meta({
      description:
        "Mean of both pairs against ground, which moves all ions alike and is no part of U; null where the drive does not state both pairs.",
    }),
  })
  .meta({ id: "FoundParameters" });
const FoundDrive = z
  .strictObject({
    find: z.literal("drive"),
    results: z.array(
      z.strictObject({
        mz: z.number(),
        drive: Drive.nullable().meta({
          description: "In the convention of the request; not settings to apply.",
        }),
        reason: z
          .enum(["drive-out-of-range"])
          .nullable()
          .meta({ description: "The volts are beyond what a request may state." }),
      }),
    ),
  })
  .meta({ id: "FoundDrive" });
const FoundMz = z
  .strictObject({
    find: z.literal("mz"),
    results: z.array(z.strictObject({ q: z.number(), mz: z.number().nullable(), reason: Undefined })),
  })
  .meta({ id: "FoundMz" });
const FoundFrequency = z
  .strictObject({
    find: z.literal("frequency"),
    results: z.array(
      z.strictObject({
        mz: z.number(),
        q: z.number(),
        frequency_MHz: z.number().nullable(),
        reason: Undefined,
      }),
    ),
  })
  .meta({ id: "FoundFrequency" });
const FoundFieldRadius = z
  .strictObject({
    find: z.literal("field-radius"),
    results: z.array(
      z.strictObject({
        mz: z.number(),
        q: z.number(),
        fieldRadius_mm: z.number().nullable(),
        reason: Undefined,
      }),
    ),
  })
  .meta({ id: "FoundFieldRadius" });

export const MathieuParametersAnswer = z
  .discriminatedUnion("find", [FoundParameters, FoundDrive, FoundMz, FoundFrequency, FoundFieldRadius])
  .meta({ id: "MathieuParametersAnswer" });
