import { createHash } from "node:crypto";
import canonicalize from "canonicalize";

/** The canonical JSON of a JSON value (RFC 8785): the same value gives the same text everywhere. */
export function canonicalJson(value: unknown): string {
  // Only undefined, which no JSON document holds, has no text; it stands for a member that is absent.
  return canonicalize(value) ?? "null";
}

/** SHA-256 (FIPS 180-4) of the canonical JSON in UTF-8, in lower-case hexadecimal digits. */
export function digestOf(value: unknown): string {
  return createHash("sha256").update(canonicalJson(value), "utf8").digest("hex");
}
