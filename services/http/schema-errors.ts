import { z } from "zod";
import { jsonPointer } from "../contract/json-pointer.ts";
import type { ErrorItem } from "../contract/rule.ts";
import type { ErrorCode } from "./error-codes.ts";
import { type ErrorList, errorList } from "./error-list.ts";
import { expectationOf, membersOf, oneOf } from "./expectation.ts";
import { isMissing, issuesOfNearestArms, memberOf } from "./nearest-arm.ts";

type Issue = z.core.$ZodIssue;

/** A longer name in a pointer would hand the caller's payload back; the pointer then leads to the object around it. */
export const LONGEST_NAME_SHOWN = 60;

export type Checked<Accepted> =
  | { readonly accepted: Accepted; readonly errors: null }
  | { readonly accepted: null; readonly errors: ErrorList };

/**
 * Puts a document to a schema. Errors name the member, what was found and what is expected with range and meaning;
 * numbers are quoted, texts never: compounds and methods are confidential, and an answer may end up in a log.
 */
export function checkAgainst<Schema extends z.ZodType>(
  schema: Schema,
  document: unknown,
): Checked<z.output<Schema>> {
  // Only here does zod show the schema that refused; the message carries its number, and words come later, for few.
  const refusers: unknown[] = [];
  const error = ({ schema, inst }: z.core.$ZodRawIssue) => String(refusers.push(schema ?? inst) - 1);
  const result = schema.safeParse(document, { error, reportInput: true });
  if (result.success) return { accepted: result.data, errors: null };
  const errors = errorList(faultsOf(result.error.issues), (fault) =>
    inWords(fault, refusers[Number(fault.issue.message)]),
  );
  return { accepted: null, errors };
}

/** An issue about one member; an issue about several unknown members is as many faults. */
interface Fault {
  readonly issue: Issue;
  readonly unknownName: string | null;
}

function* faultsOf(issues: readonly Issue[]): Generator<Fault> {
  for (const issue of issuesOfNearestArms(issues)) {
    if (issue.code !== "unrecognized_keys") yield { issue, unknownName: null };
    else for (const unknownName of issue.keys) yield { issue, unknownName };
  }
}

function inWords({ issue, unknownName }: Fault, schema: unknown): ErrorItem {
  const code = codeOf(issue);
  if (unknownName !== null) {
    const shown = unknownName.length <= LONGEST_NAME_SHOWN;
    return {
      pointer: jsonPointer(shown ? [...issue.path, unknownName] : issue.path),
      code,
      detail: `${shown ? unknownName : "A long name"} is not a member here; the members are ${membersOf(schema).join(", ")}.`,
    };
  }
  return {
    pointer: jsonPointer(issue.path),
    code,
    detail: `${subjectOf(issue.path)} ${foundIn(issue)}; it must be ${expectedBy(issue, schema)}.${meaningOf(schema)}`,
  };
}

function codeOf(issue: Issue): ErrorCode {
  if (isMissing(issue)) return "missing-member";
  switch (issue.code) {
    case "unrecognized_keys":
      return "unknown-member";
    case "invalid_type":
      if (typeof issue.input !== "number") return "wrong-type";
      if (!Number.isFinite(issue.input)) return "out-of-range";
      return issue.expected === "int" ? "not-whole" : "wrong-type";
    case "invalid_value":
    case "invalid_union":
      return "not-one-of";
    case "too_big":
    case "too_small":
      if (issue.origin === "string") return "wrong-length";
      return issue.origin === "array" ? "wrong-count" : "out-of-range";
    default:
      return "wrong-format";
  }
}

function subjectOf(path: readonly PropertyKey[]): string {
  const last = path.at(-1);
  if (last === undefined) return "The body";
  if (typeof last === "string") return last;
  const array = path.findLast((token) => typeof token === "string");
  return array === undefined ? `Item ${String(last)}` : `Item ${String(last)} of ${array}`;
}

function foundIn(issue: Issue): string {
  const tag = issue.code === "invalid_union" ? issue.discriminator : undefined;
  const value = tag === undefined ? issue.input : memberOf(issue.input, tag);
  switch (typeof value) {
    case "undefined":
      return "is missing";
    case "number":
      return Number.isFinite(value) ? `is ${value}` : "is too large for a number";
    case "boolean":
      return `is ${value}`;
    case "string":
      return `is a text of length ${value.length}`;
    default:
      if (value === null) return "is null";
      return Array.isArray(value) ? `is an array of length ${value.length}` : "is an object";
  }
}

function expectedBy(issue: Issue, schema: unknown): string {
  if (issue.code === "invalid_union") return oneOf("options" in issue ? (issue.options ?? []) : []);
  const pattern = issue.code === "invalid_format" ? ` that matches ${issue.pattern}` : "";
  return `${expectationOf(schema)}${pattern}`;
}

function meaningOf(schema: unknown): string {
  const description = schema instanceof z.ZodType ? schema.description : undefined;
  return description === undefined ? "" : ` ${description}`;
}
