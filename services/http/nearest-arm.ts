import type { z } from "zod";

type Issue = z.core.$ZodIssue;

/** Costs so far apart that no number of cheaper issues outweighs a dearer one (arrays hold at most thousands). */
const WRONG_TAG = 1e12;
const MISSING_OR_UNKNOWN_MEMBER = 1e6;
const WRONG_VALUE = 1;

/**
 * The issues in terms of single members: each union that no arm accepted is replaced by the issues of the arm that the
 * value comes nearest to, so that a person is led to the member that is wrong and not to the union around it.
 */
export function* issuesOfNearestArms(issues: readonly Issue[]): Generator<Issue> {
  for (const issue of issues) {
    const arms = armsOf(issue);
    if (arms === null) yield issue;
    else yield* issuesOfNearestArms(nearestOf(arms).map((inner) => rooted(inner, issue.path)));
  }
}

/** The issues arm by arm; null when the issue is about a single member (a tag that no arm has, too). */
function armsOf(issue: Issue): readonly (readonly Issue[])[] | null {
  return issue.code === "invalid_union" && issue.errors.length > 0 ? issue.errors : null;
}

function nearestOf(arms: readonly (readonly Issue[])[]): readonly Issue[] {
  let nearest = arms[0]!;
  let least = costOf(nearest);
  for (const arm of arms.slice(1)) {
    const cost = costOf(arm);
    if (cost < least) {
      nearest = arm;
      least = cost;
    }
  }
  return nearest;
}

function costOf(arm: readonly Issue[]): number {
  return arm.reduce((sum, issue) => sum + costOfIssue(issue), 0);
}

function costOfIssue(issue: Issue): number {
  const arms = armsOf(issue);
  if (arms !== null) return costOf(nearestOf(arms));
  if (issue.code === "unrecognized_keys") return issue.keys.length * MISSING_OR_UNKNOWN_MEMBER;
  if (isMissing(issue)) return MISSING_OR_UNKNOWN_MEMBER;
  const otherKind = issue.path.length === 0 && issue.code === "invalid_type";
  const otherTag = issue.code === "invalid_value" && issue.values.length === 1;
  return otherKind || otherTag ? WRONG_TAG : WRONG_VALUE;
}

/** Whether the member that the issue is about is absent. Issues must have been made with `reportInput`. */
export function isMissing(issue: Issue): boolean {
  switch (issue.code) {
    case "invalid_type":
    case "invalid_value":
      return issue.input === undefined;
    case "invalid_union":
      return issue.discriminator !== undefined && memberOf(issue.input, issue.discriminator) === undefined;
    default:
      return false;
  }
}

/** A member's value, when there is an object that could have it. */
export function memberOf(object: unknown, member: string): unknown {
  return typeof object === "object" && object !== null && Object.hasOwn(object, member)
    ? (object as Record<string, unknown>)[member]
    : undefined;
}

function rooted(issue: Issue, path: readonly PropertyKey[]): Issue {
  return { ...issue, path: [...path, ...issue.path] };
}
