import { z } from "zod";
import { Drive } from "../../contract/drive.ts";
import { MathieuA, MathieuQ } from "../../contract/quantity.ts";
import { RodSet, Waveform } from "../../contract/rod-set.ts";
import { MOST_ITEMS } from "../limits.ts";
import { Ions } from "./ions.ts";
import { Region } from "./region.ts";

export const StabilityRequest = z
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

export const StabilityResult = z
  .strictObject({
    mz: z.number().nullable().meta({ description: "null for a point." }),
    a: z.number(),
    q: z.number(),
    stable: z.boolean().nullable(),
    reason: z.enum(["outside-computed-domain"]).nullable(),
    region: Region.nullable().meta({ description: "The region of a stable ion." }),
    lostTo: z.enum(["x", "y", "both"]).nullable().meta({
      description: "The rods that take an unstable ion; x are those whose DC has the sign of the ion.",
    }),
    x: Plane,
    y: Plane,
  })
  .meta({ id: "StabilityResult" });

export const StabilityAnswer = z
  .strictObject({ results: z.array(StabilityResult) })
  .meta({ id: "StabilityAnswer" });
export type StabilityResult = z.input<typeof StabilityResult>;
