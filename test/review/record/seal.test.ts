import { generateKeyPairSync, sign } from "node:crypto";
import fc from "fast-check";
import { compactVerify, importJWK } from "jose";
import { expect, test } from "vitest";
import { seal, sealFindingOf } from "../../../services/review/record/seal.ts";
import { readSealingKey, type SealingKey } from "../../../services/review/record/seal-keys.ts";
import { payloadByRuntime, RFC_8037_JWS, RFC_8037_KEY, RFC_8037_THUMBPRINT } from "./rfc-8037.ts";

const key = await readSealingKey(JSON.stringify(RFC_8037_KEY));
const newKey = (): Promise<SealingKey> =>
  readSealingKey(JSON.stringify(generateKeyPairSync("ed25519").privateKey.export({ format: "jwk" })));

const DIGEST = "ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad";
const OTHER_DIGEST = "e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855";
const AT = new Date("2026-03-04T05:06:07.089Z");
const TYPE = "rodset-record-seal";

const jws = await seal(DIGEST, AT, TYPE, key);
const found = (text: unknown, digest = DIGEST, keys = [key.published]) =>
  sealFindingOf(text, digest, TYPE, keys);

/** A JWS made without any library. */
function signed(header: unknown, payload: unknown): string {
  const text = [header, payload]
    .map((part) => Buffer.from(JSON.stringify(part)).toString("base64url"))
    .join(".");
  return `${text}.${sign(null, Buffer.from(text), key.privateKey).toString("base64url")}`;
}

test("the verification used below accepts the JWS of RFC 8037, appendix A.4", async () => {
  expect(payloadByRuntime(RFC_8037_JWS, RFC_8037_KEY.x)).toBe("Example of Ed25519 signing");
  const { d: _, ...publicKey } = RFC_8037_KEY;
  const { payload } = await compactVerify(RFC_8037_JWS, await importJWK(publicKey, "EdDSA"));
  expect(Buffer.from(payload).toString()).toBe("Example of Ed25519 signing");
});

test("a seal is a JWS of digest and time that others can verify", () => {
  expect(payloadByRuntime(jws, RFC_8037_KEY.x)).toBe(
    `{"recordDigest":"${DIGEST}","sealedAt":"2026-03-04T05:06:07.089Z"}`,
  );
  const header = JSON.parse(Buffer.from(jws.split(".")[0]!, "base64url").toString());
  expect(header).toEqual({ alg: "Ed25519", kid: RFC_8037_THUMBPRINT, typ: TYPE });
});

test("sealing the same at the same time gives the same seal: Ed25519 draws no random number (RFC 8032)", async () => {
  expect(await seal(DIGEST, AT, TYPE, key)).toBe(jws);
});

test("valid, invalid, unknown key and absent are told apart", async () => {
  const sealedAt = "2026-03-04T05:06:07.089Z";
  expect(await found(jws)).toEqual({ seal: "valid", sealedAt, keyId: RFC_8037_THUMBPRINT });
  expect(await found(jws, OTHER_DIGEST)).toEqual({
    seal: "invalid",
    sealedAt: null,
    keyId: RFC_8037_THUMBPRINT,
  });
  expect(await found(jws, DIGEST, [])).toEqual({
    seal: "unknown-key",
    sealedAt: null,
    keyId: RFC_8037_THUMBPRINT,
  });
  expect(await found(null)).toEqual({ seal: "absent", sealedAt: null, keyId: null });
});

test("seals of both names of the algorithm are accepted (RFC 9864)", async () => {
  const payload = { recordDigest: DIGEST, sealedAt: "2026-03-04T05:06:07Z" };
  for (const alg of ["Ed25519", "EdDSA"]) {
    expect(await found(signed({ alg, kid: key.published.kid, typ: TYPE }, payload)), alg).toMatchObject({
      seal: "valid",
      sealedAt: payload.sealedAt,
    });
  }
});

test("a seal of another kind, with another header or another payload is invalid, however well signed", async () => {
  const header = { alg: "Ed25519", kid: key.published.kid, typ: TYPE };
  const payload = { recordDigest: DIGEST, sealedAt: "2026-03-04T05:06:07Z" };
  const wrong = [
    signed({ ...header, typ: "rodset-self-check-seal" }, payload),
    signed({ alg: header.alg, kid: header.kid }, payload),
    signed({ ...header, alg: "none" }, payload),
    signed({ ...header, alg: "HS256" }, payload),
    signed({ ...header, crit: ["b64"], b64: false }, payload),
    signed({ ...header, jwk: RFC_8037_KEY }, payload),
    signed(header, { recordDigest: DIGEST }),
    signed(header, { ...payload, sealedAt: "yesterday" }),
    signed(header, { ...payload, verdict: "pass" }),
    signed(header, DIGEST),
    await seal(DIGEST, AT, "rodset-self-check-seal", key),
    RFC_8037_JWS,
    `${jws}.`,
    jws.slice(0, jws.lastIndexOf(".") + 1),
    "",
    "..",
    {},
    7,
    "A".repeat(1e6),
  ];
  for (const each of wrong) expect((await found(each)).seal, String(each).slice(0, 90)).toBe("invalid");
});

test("whoever claims the id of a known key needs that key", async () => {
  const other = await newKey();
  const forged = await seal(DIGEST, AT, TYPE, {
    privateKey: other.privateKey,
    published: { ...other.published, kid: key.published.kid },
  });
  expect((await found(forged)).seal).toBe("invalid");
});

test("after a change of keys, seals of both generations are valid where both are known", async () => {
  const next = await newKey();
  const later = await seal(OTHER_DIGEST, AT, TYPE, next);
  const both = [next.published, key.published];
  expect(await found(jws, DIGEST, both)).toMatchObject({ seal: "valid", keyId: key.published.kid });
  expect(await found(later, OTHER_DIGEST, both)).toMatchObject({ seal: "valid", keyId: next.published.kid });
  expect((await found(jws, DIGEST, [next.published])).seal).toBe("unknown-key");
});

test("no character of a seal can be altered, the bits that no byte takes up included", async () => {
  const alphabet = "ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789-_";
  for (const at of [0, 40, jws.indexOf(".") + 5, jws.lastIndexOf(".") + 1, jws.length - 1]) {
    for (const character of alphabet) {
      if (character === jws[at]) continue;
      const altered = jws.slice(0, at) + character + jws.slice(at + 1);
      expect((await found(altered)).seal, altered).not.toBe("valid");
    }
  }
});

test("whatever stands in the place of a seal gets an answer", async () => {
  await fc.assert(
    fc.asyncProperty(fc.oneof(fc.string({ unit: "binary" }), fc.jsonValue()), async (text) => {
      expect((await found(text)).seal).toBe(text === null ? "absent" : "invalid");
    }),
  );
});
