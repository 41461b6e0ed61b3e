/** What a public key must have here; members beyond these are left alone. */
export interface SealKey {
  readonly kty?: string;
  readonly crv?: string;
  readonly x?: string;
  /** RFC 7638 thumbprint. */
  readonly kid?: string;
}

/** A JWK set (RFC 7517), as the service publishes it at `/.well-known/jwks.json`. */
export interface SealKeySet {
  readonly keys: readonly SealKey[];
}

export interface SealFinding {
  /**
   * valid: one of the given keys sealed this very content. invalid: altered, or made for another content. unknown-key:
   * none of the given keys. absent: never sealed.
   */
  readonly seal: "valid" | "invalid" | "unknown-key" | "absent";
  /** ISO 8601, UTC; null unless the seal is valid, since else anybody may have written it. */
  readonly sealedAt: string | null;
  /** The key that the seal names. */
  readonly keyId: string | null;
}

type Members = Readonly<Record<string, unknown>>;

export function membersOf(value: unknown): Members {
  return typeof value === "object" && value !== null && !Array.isArray(value) ? (value as Members) : {};
}

/** What the seal member of a document shows of a document with this digest. */
export async function sealFindingOf(
  seal: unknown,
  digest: string,
  type: "rodset-record-seal" | "rodset-self-check-seal",
  { keys }: SealKeySet,
): Promise<SealFinding> {
  if (seal === null || seal === undefined) return { seal: "absent", sealedAt: null, keyId: null };
  const { jws } = membersOf(seal);
  const invalid = (keyId: string | null): SealFinding => ({ seal: "invalid", sealedAt: null, keyId });
  // Libraries that are ES modules only: a CommonJS caller could not require them, but every caller can import.
  const { base64url, compactVerify, importJWK } = await import("jose");
  const [header, payload, signature, more] = typeof jws === "string" ? jws.split(".") : [];
  if (header === undefined || payload === undefined || signature === undefined || more !== undefined)
    return invalid(null);
  const parts = [header, payload, signature];
  const bytesOf = (part: string) => decoded(part, base64url.decode);
  const { alg, kid, typ } = jsonIn(bytesOf(header));
  if (typ !== type || typeof kid !== "string" || !ALGORITHMS.includes(String(alg))) return invalid(null);
  // Bits that no byte takes up could be altered without the signature noticing (RFC 4648, section 3.5).
  if (!parts.every((part) => part !== "" && base64url.encode(bytesOf(part)) === part)) return invalid(kid);
  const key = keys.find((each) => each.kid === kid);
  if (key === undefined) return { seal: "unknown-key", sealedAt: null, keyId: kid };
  try {
    // Only what makes the key: a set may name the retired algorithm, or uses that this runtime does not know.
    const { kty = "", crv, x } = key;
    const publicKey = await importJWK({ kty, crv: crv ?? "", x: x ?? "" }, "Ed25519");
    await compactVerify(parts.join("."), publicKey, { algorithms: [...ALGORITHMS] });
  } catch {
    return invalid(kid);
  }
  const { recordDigest, sealedAt, ...others } = jsonIn(bytesOf(payload));
  const named = recordDigest === digest && typeof sealedAt === "string" && Object.keys(others).length === 0;
  return named ? { seal: "valid", sealedAt, keyId: kid } : invalid(kid);
}

/** The name of RFC 9864, and the one it retires. */
const ALGORITHMS: readonly string[] = ["Ed25519", "EdDSA"];

function decoded(part: string, decode: (part: string) => Uint8Array): Uint8Array {
  try {
    return decode(part);
  } catch {
    return new Uint8Array();
  }
}

function jsonIn(bytes: Uint8Array): Members {
  try {
    return membersOf(JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(bytes)));
  } catch {
    return {};
  }
}
