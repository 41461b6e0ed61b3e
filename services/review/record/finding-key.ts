import { canonicalJson } from "./digest.ts";
import { membersOf } from "./kept-record.ts";

/** What a finding is about, as a text: two results are compared finding by finding, whatever their order. */
export function findingKey(finding: unknown): string {
  const { check, quantity, subject } = membersOf(finding);
  const { pointer, acquisition, stage, ion } = membersOf(subject);
  return canonicalJson([check, quantity, pointer, acquisition, stage, ion]);
}
