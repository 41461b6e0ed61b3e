import { createScanner } from "jsonc-parser";
import { jsonPointer } from "../contract/json-pointer.ts";
import type { ErrorItem } from "../contract/rule.ts";

/* Kinds of token; the library declares them in a way that does not outlive its own compilation. */
const OPEN_BRACE = 1;
const CLOSE_BRACE = 2;
const OPEN_BRACKET = 3;
const CLOSE_BRACKET = 4;
const COMMA = 5;
const TEXT = 10;
const END = 17;

interface Frame {
  /** Names so far, where it is an object. */
  readonly names: Set<string> | null;
  /** Name of the member or index of the item that is being read. */
  at: string | number;
}

/** A document that repeats itself in more places than these is wrong enough. */
const MOST_DUPLICATES = 100;

/**
 * Members that one object of a JSON text names twice. A parser keeps the last in silence, so that two readers of one
 * document can see two contents (RFC 8259, section 4): what goes on record must leave no choice. The name __proto__
 * counts as well, since readers drop it. The text is JSON: this scans tokens and keeps a stack, so that no depth of the
 * document can exhaust a recursion.
 */
export function duplicateMembers(text: string): ErrorItem[] {
  const scanner = createScanner(text, true);
  const stack: Frame[] = [];
  const errors: ErrorItem[] = [];
  let expectsName = false;
  for (let token = scanner.scan(); token !== END; token = scanner.scan()) {
    const top = stack.at(-1);
    switch (token) {
      case OPEN_BRACE:
        stack.push({ names: new Set(), at: "" });
        expectsName = true;
        break;
      case OPEN_BRACKET:
        stack.push({ names: null, at: 0 });
        expectsName = false;
        break;
      case CLOSE_BRACE:
      case CLOSE_BRACKET:
        stack.pop();
        expectsName = false;
        break;
      case COMMA:
        expectsName = top!.names !== null;
        if (typeof top!.at === "number") top!.at++;
        break;
      case TEXT:
        if (!expectsName) break;
        expectsName = false;
        top!.at = scanner.getTokenValue();
        if (errors.length < MOST_DUPLICATES && (top!.names!.has(top!.at) || top!.at === "__proto__")) {
          errors.push(duplicateAt(stack));
        }
        top!.names!.add(top!.at);
        break;
      default:
    }
  }
  return errors;
}

/** A longer name would hand the caller's payload back; the pointer then leads to the object around it. */
const LONGEST_NAME_SHOWN = 60;

function duplicateAt(stack: readonly Frame[]): ErrorItem {
  const path = stack.map(({ at }) => at);
  const name = String(path.at(-1));
  return {
    pointer: jsonPointer(name.length <= LONGEST_NAME_SHOWN ? path : path.slice(0, -1)),
    code: "duplicate-member",
    detail:
      name === "__proto__"
        ? "The name __proto__ is read in different ways by different readers and is not taken."
        : "The object names this member more than once; readers would see different contents.",
  };
}
