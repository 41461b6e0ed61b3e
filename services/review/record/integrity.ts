import { type KeptRecord, membersOf } from "./kept-record.ts";
import { digestsOf } from "./record.ts";

export interface Integrity {
  /** JSON Pointers into the record of what does not fit the rest of it; empty where it is intact. */
  readonly altered: readonly string[];
  /** The digest that a seal of this record must name, made anew from its content. */
  readonly recordDigest: string;
}

/**
 * Whether the digests of a record fit its content. Members that no digest covers would make room for what nobody
 * computed, so there must be none.
 */
export function integrityOf(record: KeptRecord): Integrity {
  const { format, engine, input, result, seal } = record;
  const computed = digestsOf(format, engine, input, result);
  const recorded = membersOf(record.digests);
  const altered = [
    ...strange(record, ["format", "engine", "input", "result", "digests", "seal"], ""),
    ...strange(recorded, Object.keys(computed), "/digests"),
    ...(seal === null || seal === undefined ? [] : strange(membersOf(seal), ["jws"], "/seal")),
    ...Object.entries(computed)
      .filter(([name, digest]) => recorded[name] !== digest)
      .map(([name]) => `/digests/${name}`),
  ];
  return { altered: [...new Set(altered)], recordDigest: computed.record };
}

/** Members that are missing, and an object that has others. */
function strange(
  object: Readonly<Record<string, unknown>>,
  names: readonly string[],
  pointer: string,
): string[] {
  const missing = names.filter((name) => !Object.hasOwn(object, name)).map((name) => `${pointer}/${name}`);
  return Object.keys(object).some((name) => !names.includes(name)) ? [...missing, pointer] : missing;
}
