import { z } from "zod";
import { Criteria } from "../criteria.ts";
import { Verdict } from "../sign-off-schema.ts";
import { Engine } from "./record-schema.ts";
import { SealState } from "./seal.ts";

export const VerificationRequest = z
  .strictObject({
    record: z.looseObject({}).meta({
      id: "KeptRecord",
      description: "The record as it was kept: a SealedRecord, or what has become of one.",
    }),
    criteria: Criteria.optional().meta({
      description: "Criteria to hold the method to today, in place of those on record.",
    }),
  })
  .meta({ id: "VerificationRequest" });
export type VerificationRequest = z.output<typeof VerificationRequest>;

const Shown = z.union([z.string(), z.number(), z.boolean(), z.null()]).meta({
  id: "ShownValue",
  description: "A value; objects, arrays and long texts as the start of their JSON.",
});

const RecordDifference = z
  .strictObject({
    pointer: z.string().meta({
      description: "JSON Pointer into the record; /result/findings/- is a finding that is not on record.",
    }),
    recorded: Shown.optional().meta({ description: "Absent where the record has no such member." }),
    recomputed: Shown.optional().meta({ description: "Absent where this version has no such member." }),
  })
  .meta({ id: "RecordDifference" });

export const MOST_DIFFERENCES = 100;

export const NotReproduced = z.enum(["unknown-format", "input-refused", "result-differs"]).meta({
  id: "NotReproduced",
  description:
    "unknown-format: this version does not know the layout of the record. input-refused: the input on record is no valid request to this version. result-differs: see differences.",
});

export const VerificationAnswer = z
  .strictObject({
    statement: z.string().meta({ description: "What was found, for a person." }),
    intact: z.boolean().meta({
      description:
        "Whether the digests fit the content. Without a valid seal that shows no more than that nothing was altered by accident: whoever alters a record can make new digests.",
    }),
    altered: z
      .array(z.string())
      .meta({ description: "JSON Pointers of what does not fit; empty where intact." }),
    recordDigest: z.string().meta({
      description: "SHA-256 that the content on record has today, made anew: what a seal of it must name.",
    }),
    seal: SealState,
    sealedAt: z.string().nullable().meta({ description: "ISO 8601, UTC; null unless the seal is valid." }),
    keyId: z.string().nullable().meta({ description: "RFC 7638 thumbprint of the key that the seal names." }),
    reproduced: z.boolean().meta({
      description:
        "Whether this version finds the same from the same input: every number within the tolerance, everything else but sentences exactly. Where another version made the record, checks and members that it did not have are left out.",
    }),
    notReproducedBecause: NotReproduced.nullable(),
    differences: z.array(RecordDifference).max(MOST_DIFFERENCES),
    differencesOmitted: z.int().min(0),
    checksAdded: z.array(z.string()).meta({
      description:
        "Checks that this version has and the one that made the record had not. They count in verdict and not in reproduced.",
    }),
    tolerance: z.number().meta({
      description:
        "Relative to the larger of two numbers. A margin is measured on the scale of the value and the bounds it is the difference of, a difference of two m/z on that of the m/z.",
    }),
    verdict: Verdict.nullable().meta({
      description:
        "Verdict that this version comes to by the criteria on record; null where it can come to none.",
    }),
    verdictByCriteria: Verdict.nullable().meta({
      description: "Verdict by the criteria of this request; null where it states none.",
    }),
    stillMeetsCriteria: z.boolean().nullable().meta({
      description:
        "Whether the verdict, by the criteria of this request or else by those on record, is pass or caution.",
    }),
    engine: Engine.meta({ description: "What recomputed." }),
  })
  .meta({ id: "VerificationAnswer" });
export type VerificationAnswer = z.output<typeof VerificationAnswer>;
