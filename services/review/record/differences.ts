import { memberPointer } from "../../contract/json-pointer.ts";
import { agree } from "./agreement.ts";
import { canonicalJson } from "./digest.ts";
import { findingKey } from "./finding-key.ts";
import { membersOf } from "./kept-record.ts";

/** A value as far as a person needs to see it: an object or a long text is cut short. */
export type Shown = string | number | boolean | null;

export interface Difference {
  /** JSON Pointer into the record. */
  readonly pointer: string;
  /** Absent where the record, or the new result, has no such member. */
  readonly recorded?: Shown;
  readonly recomputed?: Shown;
}

/** Sentences for people may be worded better in a later version without any number having changed. */
const PROSE = new Set(["statement", "basis", "verdictStatement"]);

/** Findings whose value is itself a difference of two m/z; on their own scale, rounding alone would tell them apart. */
const DIFFERENCES_IN_MZ = new Set(["distance-to-edge", "set-against-ion", "width-against-claim"]);

/** Whether members and findings that only the new result has are differences too. */
export type Additions = "count" | "do-not-count";

interface Comparison {
  readonly differences: Difference[];
  readonly additions: Additions;
}

/** Everything in which a recorded result and the one computed now differ beyond the tolerance. */
export function differencesOf(recorded: unknown, recomputed: unknown, additions: Additions): Difference[] {
  const differences: Difference[] = [];
  const comparison: Comparison = { differences, additions };
  const one = membersOf(recorded);
  const other = membersOf(recomputed);
  if (one !== recorded) return [different("/result", recorded, recomputed)];
  const { findings: recordedFindings, ...recordedRest } = one;
  const { findings: recomputedFindings, ...recomputedRest } = other;
  compareFindings(recordedFindings, recomputedFindings, scaleOfStages(other.settings), comparison);
  compare(recordedRest, recomputedRest, "/result", 0, comparison);
  return differences;
}

function compareFindings(
  recorded: unknown,
  recomputed: unknown,
  mzOf: (finding: Members) => number,
  comparison: Comparison,
): void {
  if (!Array.isArray(recorded) || !Array.isArray(recomputed)) {
    comparison.differences.push(different("/result/findings", recorded, recomputed));
    return;
  }
  const left = new Map<string, unknown[]>();
  for (const finding of recomputed) {
    const key = findingKey(finding);
    const alike = left.get(key);
    if (alike === undefined) left.set(key, [finding]);
    else alike.push(finding);
  }
  recorded.forEach((finding: unknown, index) => {
    const pointer = `/result/findings/${index}`;
    const match = left.get(findingKey(finding))?.shift();
    if (match === undefined) comparison.differences.push(different(pointer, inShort(finding), undefined));
    else compareFinding(membersOf(finding), membersOf(match), pointer, mzOf, comparison);
  });
  for (const finding of [...left.values()].flat()) {
    comparison.differences.push(different("/result/findings/-", undefined, inShort(finding)));
  }
}

/** A whole finding, as far as it tells a person which one and what it says. */
function inShort(finding: unknown): unknown {
  const { check, quantity, outcome, value } = membersOf(finding);
  return { check, outcome, quantity, value };
}

type Members = Readonly<Record<string, unknown>>;

function compareFinding(
  recorded: Members,
  recomputed: Members,
  pointer: string,
  mzOf: (finding: Members) => number,
  comparison: Comparison,
): void {
  const { value, margin, ...rest } = recorded;
  const { value: newValue, margin: newMargin, ...newRest } = recomputed;
  const scale = DIFFERENCES_IN_MZ.has(String(newRest.quantity)) ? mzOf(recomputed) : 0;
  compare(value, newValue, `${pointer}/value`, scale, comparison);
  // A margin is value less bound: it is known as well as the larger of these two, however small it is itself.
  const { min, max } = membersOf(newRest.pass);
  const marginScale = Math.max(scale, magnitude(newValue), magnitude(min), magnitude(max));
  compare(margin, newMargin, `${pointer}/margin`, marginScale, comparison);
  compare(rest, newRest, pointer, 0, comparison);
}

const magnitude = (value: unknown): number => (typeof value === "number" ? Math.abs(value) : 0);

/** The largest m/z that a stage is set to, or that it lets pass, for the acquisition of a finding. */
function scaleOfStages(settings: unknown): (finding: Members) => number {
  const largest = new Map<string, number>();
  const keyed = ({ acquisition, stage }: Members) => canonicalJson([acquisition, stage]);
  for (const setting of Array.isArray(settings) ? settings.map(membersOf) : []) {
    const key = keyed(setting);
    const mz = Math.max(magnitude(setting.mz), magnitude(setting.setMz));
    largest.set(key, Math.max(largest.get(key) ?? 0, mz));
  }
  return (finding) => largest.get(keyed(membersOf(finding.subject))) ?? 0;
}

function compare(
  recorded: unknown,
  recomputed: unknown,
  pointer: string,
  scale: number,
  comparison: Comparison,
): void {
  if (typeof recorded === "number" && typeof recomputed === "number") {
    if (!agree(recorded, recomputed, scale))
      comparison.differences.push(different(pointer, recorded, recomputed));
  } else if (
    isObject(recorded) &&
    isObject(recomputed) &&
    Array.isArray(recorded) === Array.isArray(recomputed)
  ) {
    const added = Array.isArray(recorded) || comparison.additions === "count" ? Object.keys(recomputed) : [];
    for (const name of new Set([...Object.keys(recorded), ...added])) {
      if (PROSE.has(name)) continue;
      const at = memberPointer(pointer, name);
      compare(ownMember(recorded, name), ownMember(recomputed, name), at, 0, comparison);
    }
  } else if (recorded !== recomputed) {
    comparison.differences.push(different(pointer, recorded, recomputed));
  }
}

const isObject = (value: unknown): value is Members => typeof value === "object" && value !== null;

const ownMember = (object: Members, name: string): unknown =>
  Object.hasOwn(object, name) ? object[name] : undefined;

function different(pointer: string, recorded: unknown, recomputed: unknown): Difference {
  return {
    pointer,
    ...(recorded === undefined ? {} : { recorded: shown(recorded) }),
    ...(recomputed === undefined ? {} : { recomputed: shown(recomputed) }),
  };
}

const MOST_CHARACTERS = 200;

function shown(value: unknown): Shown {
  if (typeof value === "number" || typeof value === "boolean" || value === null) return value;
  const text = typeof value === "string" ? value : canonicalJson(value);
  // Cutting by code point: half a character must not get into an answer.
  return text.length <= MOST_CHARACTERS
    ? text
    : `${[...text.slice(0, MOST_CHARACTERS)].slice(0, -1).join("")}…`;
}
