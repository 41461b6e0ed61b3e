import { memberPointer } from "../../contract/json-pointer.ts";
import type { ErrorItem } from "../../contract/rule.ts";

/**
 * A record as it comes back from wherever it was kept: JSON of any shape, since a record that was tampered with gets
 * an answer too. What its members hold is for the verification to find out.
 */
export type KeptRecord = Readonly<Record<string, unknown>>;

/** Objects and arrays inside each other; a record of this service needs nine. */
const DEEPEST = 40;

/** A record that is wrong in more places than these is wrong enough. */
const MOST_ERRORS = 100;

const LONE_SURROGATE = /\p{Surrogate}/u;

/** What JSON can hold and canonical JSON cannot (RFC 8785, section 3.1), and what would exhaust a recursion. */
export function keptRecordErrors(record: unknown, pointer: string): ErrorItem[] {
  const errors: ErrorItem[] = [];
  const add = (at: string, code: string, detail: string) => errors.push({ pointer: at, code, detail });
  const visit = (value: unknown, at: string, depth: number): void => {
    if (errors.length === MOST_ERRORS) return;
    if (typeof value === "string") {
      if (LONE_SURROGATE.test(value))
        add(at, "wrong-format", "The text holds half a character (a lone surrogate).");
    } else if (typeof value === "number") {
      if (!Number.isFinite(value)) add(at, "out-of-range", "The number is too large for a double.");
    } else if (typeof value === "object" && value !== null) {
      if (depth === DEEPEST) {
        add(at, "too-deep", `Objects and arrays stand more than ${DEEPEST} deep in each other here.`);
        return;
      }
      for (const [name, member] of Object.entries(value)) {
        if (LONE_SURROGATE.test(name)) {
          add(at, "wrong-format", "The name of a member holds half a character (a lone surrogate).");
        } else visit(member, memberPointer(at, name), depth + 1);
      }
    }
  };
  visit(record, pointer, 0);
  return errors;
}

/** The members of an object, none for anything else. */
export function membersOf(value: unknown): Readonly<Record<string, unknown>> {
  return typeof value === "object" && value !== null && !Array.isArray(value)
    ? (value as Readonly<Record<string, unknown>>)
    : {};
}
