import { createPrivateKey, createPublicKey, type JsonWebKey, type KeyObject } from "node:crypto";
import { calculateJwkThumbprint } from "jose";
import { z } from "zod";

/** A public key as it is published: Ed25519 (RFC 8037) with the RFC 7638 thumbprint as its id. */
export const PublicSealKey = z
  .strictObject({
    kty: z.literal("OKP"),
    crv: z.literal("Ed25519"),
    x: z.string().meta({ description: "The public key, base64url." }),
    kid: z.string().meta({ description: "RFC 7638 thumbprint, SHA-256, base64url." }),
    use: z.literal("sig"),
    alg: z.literal("Ed25519"),
  })
  .meta({ id: "PublicSealKey", description: "A public key that verifies seals (RFC 7517, RFC 8037)." });
export type PublicSealKey = z.output<typeof PublicSealKey>;

/** The key that seals, with what is published of it. */
export interface SealingKey {
  readonly privateKey: KeyObject;
  readonly published: PublicSealKey;
}

/** Why a text is no key. Says nothing of what stands in it. */
export class SealKeyError extends Error {
  override readonly name = "SealKeyError";
}

/** Reads a private Ed25519 key: PKCS #8 in PEM (RFC 5958, RFC 8410) or a JWK (RFC 8037). */
export async function readSealingKey(text: string): Promise<SealingKey> {
  const jwk = text.trimStart().startsWith("{") ? jsonOf(text) : null;
  let privateKey: KeyObject;
  try {
    privateKey = createPrivateKey(jwk === null ? text : { key: jwk as JsonWebKey, format: "jwk" });
  } catch {
    throw new SealKeyError("holds no private key, neither PKCS #8 in PEM nor a JWK");
  }
  if (privateKey.asymmetricKeyType !== "ed25519") throw new SealKeyError("holds a key that is not Ed25519");
  const published = await publishedOf(createPublicKey(privateKey).export({ format: "jwk" }).x!);
  if (jwk !== null && (jwk as JsonWebKey).x !== published.x) {
    throw new SealKeyError("holds a JWK whose public part x does not belong to its private part d");
  }
  return { privateKey, published };
}

const TrustedKeySet = z.object({
  keys: z
    .array(
      z.looseObject({
        kty: z.literal("OKP"),
        crv: z.literal("Ed25519"),
        x: z.string(),
        kid: z.string().optional(),
      }),
    )
    .max(100),
});

/** Reads the public keys of earlier generations: a JWK set (RFC 7517) of Ed25519 keys. */
export async function readTrustedKeys(text: string): Promise<PublicSealKey[]> {
  const { data } = TrustedKeySet.safeParse(jsonOf(text));
  if (data === undefined) throw new SealKeyError("holds no JWK set of up to 100 Ed25519 keys");
  return Promise.all(
    data.keys.map(async ({ x, kid, d }, index) => {
      if (d !== undefined)
        throw new SealKeyError(`holds the private part d of key ${index}; only x belongs there`);
      const published = await publishedOf(x).catch(() => {
        throw new SealKeyError(`holds a key ${index} whose x is no Ed25519 public key`);
      });
      if (kid !== undefined && kid !== published.kid) {
        throw new SealKeyError(
          `names key ${index} otherwise than by its RFC 7638 thumbprint, ${published.kid}`,
        );
      }
      return published;
    }),
  );
}

/** Refuses what is no public key, and another spelling of one: the thumbprint is made of the spelling. */
async function publishedOf(x: string): Promise<PublicSealKey> {
  const jwk = { kty: "OKP", crv: "Ed25519", x } as const;
  if (createPublicKey({ key: jwk, format: "jwk" }).export({ format: "jwk" }).x !== x) {
    throw new SealKeyError("holds a public key that is not in base64url");
  }
  return { ...jwk, kid: await calculateJwkThumbprint(jwk), use: "sig", alg: "Ed25519" };
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    throw new SealKeyError("is not JSON");
  }
}
