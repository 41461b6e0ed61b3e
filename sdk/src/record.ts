import { membersOf, type SealFinding, type SealKeySet, sealFindingOf } from "./seal.ts";

export type { SealFinding, SealKey, SealKeySet } from "./seal.ts";

export interface RecordFinding extends SealFinding {
  /** Whether this version of the package knows the layout of the record; if not, nothing else can be relied upon. */
  readonly formatKnown: boolean;
  /** Whether the digests fit the content. Only a valid seal shows that nobody made new digests for other content. */
  readonly intact: boolean;
  /** JSON Pointers of what does not fit; empty where intact. */
  readonly altered: readonly string[];
}

export interface SelfCheckFinding extends SealFinding {
  readonly intact: boolean;
}

const FORMAT = 1;

/**
 * Verifies digests and seal of a record without any service and without a network, against keys that were kept with the
 * records. Whether the numbers reproduce only a service can tell. The record is parsed JSON of any shape.
 */
export async function verifyRecord(record: unknown, keySet: SealKeySet): Promise<RecordFinding> {
  const members = membersOf(record);
  const { format, engine, input, result, seal } = members;
  const recorded = membersOf(members.digests);
  const parts = { input: await digestOf(input), result: await digestOf(result) };
  const digests = { ...parts, record: await digestOf({ format, engine, digests: parts }) };
  const altered = [
    ...strange(members, ["format", "engine", "input", "result", "digests", "seal"], ""),
    ...strange(recorded, Object.keys(digests), "/digests"),
    ...(seal === null || seal === undefined ? [] : strange(membersOf(seal), ["jws"], "/seal")),
    ...Object.entries(digests)
      .filter(([name, digest]) => digest === null || recorded[name] !== digest)
      .map(([name]) => `/digests/${name}`),
  ];
  return {
    formatKnown: format === FORMAT,
    intact: altered.length === 0,
    altered: [...new Set(altered)],
    ...(await sealFindingOf(seal, digests.record ?? "", "rodset-record-seal", keySet)),
  };
}

/** Verifies digest and seal of a self-check: the answer of the service, or the sheet that `npm run qualify` writes. */
export async function verifySelfCheck(sheet: unknown, keySet: SealKeySet): Promise<SelfCheckFinding> {
  // The date beside the content repeats the one in the seal for a reader; the seal's is the one that counts.
  const { digest, seal, date: _date, ...content } = membersOf(sheet);
  const made = await digestOf(content);
  return {
    intact: made !== null && digest === made,
    ...(await sealFindingOf(seal, made ?? "", "rodset-self-check-seal", keySet)),
  };
}

/** SHA-256 of the canonical JSON (RFC 8785), or null where a value has none. */
async function digestOf(value: unknown): Promise<string | null> {
  // An ES module only: a CommonJS caller could not require it, but every caller can import.
  const { default: canonicalize } = await import("canonicalize");
  let text: string;
  try {
    text = canonicalize(value) ?? "null";
  } catch {
    return null;
  }
  const bytes = new Uint8Array(await crypto.subtle.digest("SHA-256", new TextEncoder().encode(text)));
  return Array.from(bytes, (byte) => byte.toString(16).padStart(2, "0")).join("");
}

function strange(
  object: Readonly<Record<string, unknown>>,
  names: readonly string[],
  pointer: string,
): string[] {
  const missing = names.filter((name) => !Object.hasOwn(object, name)).map((name) => `${pointer}/${name}`);
  return Object.keys(object).some((name) => !names.includes(name)) ? [...missing, pointer] : missing;
}
