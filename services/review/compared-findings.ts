import type { Pair } from "./comparison-pairs.ts";
import type { ComparedFinding } from "./comparison-schema.ts";
import type { Bounds, Finding, Outcome } from "./finding.ts";
import { agree } from "./record/agreement.ts";

/** The finding with what is not the same of it, or null where nothing is. */
export function comparedFinding({ base, other }: Pair<Finding>): ComparedFinding | null {
  const { check, quantity, unit, subject } = (base ?? other)!;
  const changed = changesOf(base, other);
  if (changed.length === 0) return null;
  return {
    check,
    quantity,
    unit,
    acquisition: subject.acquisition ?? null,
    ion: subject.ion ?? null,
    changed,
    direction: base === null || other === null ? "not-comparable" : directionOf(base.outcome, other.outcome),
    base: base && sideOf(base),
    other: other && sideOf(other),
  };
}

function changesOf(base: Finding | null, other: Finding | null): ComparedFinding["changed"] {
  if (base === null) return ["added"];
  if (other === null) return ["removed"];
  const scale = Math.max(
    ...[base, other].flatMap(({ pass: { min, max } }) => [min ?? 0, max ?? 0].map(Math.abs)),
  );
  const changes: ComparedFinding["changed"] = [];
  if (base.outcome !== other.outcome) changes.push("outcome");
  if (!same(base.value, other.value, scale) || base.unit !== other.unit) changes.push("value");
  if (!sameBounds(base.pass, other.pass) || !sameBounds(base.caution, other.caution)) changes.push("limits");
  if (base.required !== other.required) changes.push("required");
  return changes;
}

function same(one: number | null, other: number | null, scale = 0): boolean {
  return one === null || other === null ? one === other : agree(one, other, scale);
}

function sameBounds(one: Bounds, other: Bounds): boolean {
  return same(one.min, other.min) && same(one.max, other.max);
}

/** From good to bad; a question that does not arise is neither. */
const ORDER: readonly Outcome[] = ["pass", "caution", "indeterminate", "fail"];

function directionOf(base: Outcome, other: Outcome): ComparedFinding["direction"] {
  if (base === other) return "same";
  const [from, to] = [ORDER.indexOf(base), ORDER.indexOf(other)];
  if (from < 0 || to < 0) return "not-comparable";
  return to > from ? "worse" : "better";
}

function sideOf({ subject, outcome, required, value, pass, statement }: Finding): ComparedFinding["base"] {
  return {
    pointer: subject.pointer,
    stage: subject.stage ?? null,
    outcome,
    required,
    value,
    pass,
    statement,
  };
}
