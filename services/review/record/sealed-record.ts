import type { SealedRecord } from "./record-schema.ts";
import { seal } from "./seal.ts";
import type { SealingKey } from "./seal-keys.ts";

/** The record with a seal on it, or as it was where there is no key. */
export async function sealedRecord(
  record: SealedRecord,
  key: SealingKey | null,
  now: () => Date,
): Promise<SealedRecord> {
  if (key === null) return record;
  return { ...record, seal: { jws: await seal(record.digests.record, now(), "rodset-record-seal", key) } };
}
