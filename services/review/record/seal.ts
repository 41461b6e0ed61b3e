import { CompactSign, type CompactVerifyResult, compactVerify, importJWK } from "jose";
import { z } from "zod";
import { canonicalJson } from "./digest.ts";
import type { PublicSealKey, SealingKey } from "./seal-keys.ts";

/** What kind of document a seal is for, so that the seal of one cannot stand on another. */
export type SealType = "rodset-record-seal" | "rodset-self-check-seal";

export const SealState = z.enum(["valid", "invalid", "unknown-key", "absent"]).meta({
  id: "SealState",
  description:
    "valid: made with a key that this service knows, for this very content. invalid: altered, or made for another content. unknown-key: made with a key that this service does not know, so nothing can be said. absent: never sealed.",
});

export interface SealFinding {
  readonly seal: z.output<typeof SealState>;
  /** When it was sealed, told only where the seal is valid: else anybody may have written it. */
  readonly sealedAt: string | null;
  /** The key that the seal names, whether known or not. */
  readonly keyId: string | null;
}

const Payload = z.strictObject({
  recordDigest: z.string(),
  sealedAt: z.string().regex(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d(\.\d{1,3})?Z$/),
});
const Header = z.strictObject({ alg: z.string(), kid: z.string(), typ: z.string() });

/** Retired by RFC 9864 in favour of the first, and what other software still writes. */
const ALGORITHMS = ["Ed25519", "EdDSA"];

/** Seals a digest: JWS in compact form (RFC 7515), Ed25519 (RFC 8037, named as RFC 9864 wants it). */
export async function seal(
  digest: string,
  sealedAt: Date,
  type: SealType,
  { privateKey, published }: SealingKey,
): Promise<string> {
  const payload = canonicalJson({ recordDigest: digest, sealedAt: sealedAt.toISOString() });
  return new CompactSign(new TextEncoder().encode(payload))
    .setProtectedHeader({ alg: "Ed25519", kid: published.kid, typ: type })
    .sign(privateKey);
}

/** What a seal shows of a document with this digest. `jws` is whatever stands in its place. */
export async function sealFindingOf(
  jws: unknown,
  digest: string,
  type: SealType,
  keys: readonly PublicSealKey[],
): Promise<SealFinding> {
  if (jws === undefined || jws === null) return { seal: "absent", sealedAt: null, keyId: null };
  const invalid = (keyId: string | null): SealFinding => ({ seal: "invalid", sealedAt: null, keyId });
  if (typeof jws !== "string" || jws.length > LONGEST_SEAL) return invalid(null);
  const parts = jws.split(".");
  if (parts.length !== 3 || !parts.every(isCanonicalBase64url)) return invalid(null);
  const header = Header.safeParse(jsonIn(parts[0]!)).data;
  if (header === undefined || header.typ !== type || !ALGORITHMS.includes(header.alg)) return invalid(null);
  const keyId = header.kid.slice(0, LONGEST_KEY_ID);
  const key = keys.find(({ kid }) => kid === header.kid);
  if (key === undefined) return { seal: "unknown-key", sealedAt: null, keyId };
  const payload = await verifiedPayload(jws, key);
  if (payload === null || payload.recordDigest !== digest) return invalid(keyId);
  return { seal: "valid", sealedAt: payload.sealedAt, keyId };
}

const LONGEST_SEAL = 2000;
const LONGEST_KEY_ID = 100;

async function verifiedPayload(
  jws: string,
  { kty, crv, x }: PublicSealKey,
): Promise<z.output<typeof Payload> | null> {
  let verified: CompactVerifyResult;
  try {
    verified = await compactVerify(jws, await importJWK({ kty, crv, x }, "Ed25519"), {
      algorithms: ALGORITHMS,
    });
  } catch {
    return null;
  }
  return Payload.safeParse(jsonIn(Buffer.from(verified.payload).toString("base64url"))).data ?? null;
}

/**
 * The last character of a base64url text can carry bits that no byte takes up (RFC 4648, section 3.5): a signature with
 * other such bits would verify although a byte of the seal was altered.
 */
function isCanonicalBase64url(text: string): boolean {
  return Buffer.from(text, "base64url").toString("base64url") === text;
}

function jsonIn(base64url: string): unknown {
  try {
    return JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(Buffer.from(base64url, "base64url")));
  } catch {
    return null;
  }
}
