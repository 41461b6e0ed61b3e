import { jsonPointer } from "../contract/json-pointer.ts";
import type { AnyEndpoint } from "./endpoint.ts";
import { errorList } from "./error-list.ts";
import { invalidRequest } from "./problem-document.ts";
import { LONGEST_NAME_SHOWN } from "./schema-errors.ts";

/** A number as JSON writes it (RFC 8259, section 6). */
const JSON_NUMBER = /^-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?$/;

/**
 * The query as the document that its schema checks: what reads as a number is one, all else is text. An endpoint that
 * takes nothing has none.
 */
export function queryDocument({ request }: AnyEndpoint, url: string): unknown {
  if (request === null) return null;
  const query = new URLSearchParams(url.split("?", 2)[1] ?? "");
  const names = [...query.keys()];
  const twice = [...new Set(names.filter((name, index) => names.indexOf(name) < index))];
  const errors = twice.map((name) => ({
    pointer: jsonPointer([name].filter(({ length }) => length <= LONGEST_NAME_SHOWN)),
    code: "duplicate-member" as const,
    detail: "The query states a parameter more than once.",
  }));
  if (errors.length > 0) throw invalidRequest(errorList(errors, (item) => item));
  return Object.fromEntries(
    [...query].map(([name, text]) => [name, JSON_NUMBER.test(text) ? Number(text) : text]),
  );
}
