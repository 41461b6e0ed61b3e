import { generateKeyPairSync } from "node:crypto";
import { digestsOf } from "../../../services/review/record/record.ts";
import type { SealedRecord } from "../../../services/review/record/record-schema.ts";
import { seal } from "../../../services/review/record/seal.ts";
import { readSealingKey } from "../../../services/review/record/seal-keys.ts";
import { inWords, verifyContent, verifySeal } from "../../../services/review/record/verification.ts";
import { VerificationAnswer } from "../../../services/review/record/verification-schema.ts";
import { ENGINE, recordOf, throughJson } from "./recorded-method.ts";

/** A key of this run's own. */
export const key = await readSealingKey(
  JSON.stringify(generateKeyPairSync("ed25519").privateKey.export({ format: "jwk" })),
);

async function sealed(record: SealedRecord): Promise<SealedRecord> {
  const jws = await seal(record.digests.record, new Date("2026-03-04T05:06:07Z"), "rodset-record-seal", key);
  return { ...record, seal: { jws } };
}

/** The record as another engine would have made it: digests and seal are right for what stands in it. */
export async function resealed({ format, engine, input, result }: SealedRecord): Promise<SealedRecord> {
  const digests = digestsOf(format, engine, input, result);
  return sealed({ format, engine, input, result, digests, seal: null });
}

export type Kept = Record<string, unknown>;

export async function verified(record: unknown, criteria?: SealedRecord["input"]["criteria"]) {
  const kept = record as Kept;
  const request = criteria === undefined ? { record: kept } : { record: kept, criteria };
  const content = verifyContent(request, ENGINE);
  return VerificationAnswer.parse(
    inWords(content, await verifySeal(kept, content.recordDigest, [key.published])),
  );
}

export const record = await sealed(recordOf(4));
export const small = await sealed(recordOf(1));
export const altered = (change: (copy: SealedRecord) => void): SealedRecord => {
  const copy = throughJson(record);
  change(copy);
  return copy;
};
