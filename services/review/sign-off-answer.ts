import { z } from "zod";
import { SealedRecord } from "./record/record-schema.ts";
import { SignOffResult } from "./sign-off-schema.ts";

export const SignOffAnswer = z
  .strictObject({
    ...SignOffResult.shape,
    criteria: z
      .strictObject({ id: z.string(), revision: z.string() })
      .nullable()
      .meta({ description: "The laboratory's criteria, null where the defaults were used." }),
    record: SealedRecord,
    cautions: z.array(z.string()),
  })
  .meta({ id: "SignOffAnswer" });
export type SignOffAnswer = z.output<typeof SignOffAnswer>;

/** A sign-off before it is put on record. */
export type Assessment = Omit<SignOffAnswer, "record">;
