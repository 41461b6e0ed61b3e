import { generateKeyPairSync } from "node:crypto";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { verifyRecord, verifySelfCheck } from "../../sdk/src/record.ts";
import { integrityOf } from "../../services/review/record/integrity.ts";
import { digestsOf } from "../../services/review/record/record.ts";
import { readSealingKey } from "../../services/review/record/seal-keys.ts";
import { sealedRecord } from "../../services/review/record/sealed-record.ts";
import { verifySeal } from "../../services/review/record/verification.ts";
import { sealedSelfCheck, selfCheck } from "../../services/review/self-check/self-check.ts";
import { ENGINE, recordOf, throughJson } from "../review/record/recorded-method.ts";

const newKey = () =>
  readSealingKey(JSON.stringify(generateKeyPairSync("ed25519").privateKey.export({ format: "jwk" })));
const [key, other] = [await newKey(), await newKey()];
const keys = { keys: [other.published, key.published] };
const now = () => new Date("2026-03-04T05:06:07Z");
const record = throughJson(await sealedRecord(recordOf(2), key, now));
const sealedAt = "2026-03-04T05:06:07.000Z";

describe("a record without a service", () => {
  it("is intact and its seal valid against a kept key set", async () => {
    expect(await verifyRecord(record, keys)).toEqual({
      formatKnown: true,
      intact: true,
      altered: [],
      seal: "valid",
      sealedAt,
      keyId: key.published.kid,
    });
    expect(await verifyRecord(record, { keys: [other.published] })).toMatchObject({
      intact: true,
      seal: "unknown-key",
    });
    expect(await verifyRecord({ ...record, seal: null }, keys)).toMatchObject({
      intact: true,
      seal: "absent",
    });
  });

  it("takes a key whose set names the retired algorithm, or none", async () => {
    const { kty, crv, x, kid } = key.published;
    for (const more of [{ alg: "EdDSA" }, {}, { alg: "Ed25519", key_ops: ["verify"] }]) {
      expect((await verifyRecord(record, { keys: [{ kty, crv, x, kid, ...more }] })).seal).toBe("valid");
    }
  });

  it("is found altered, by the digests where they are old and by the seal where they are new", async () => {
    const passed = throughJson(record);
    passed.result.verdict = passed.result.verdict === "pass" ? "fail" : "pass";
    expect(await verifyRecord(passed, keys)).toMatchObject({
      intact: false,
      altered: ["/digests/result", "/digests/record"],
      seal: "invalid",
    });
    passed.digests = digestsOf(passed.format, passed.engine, passed.input, passed.result);
    expect(await verifyRecord(passed, keys)).toMatchObject({ intact: true, seal: "invalid", sealedAt: null });
  });

  it("of another layout is told", async () => {
    expect(await verifyRecord({ ...record, format: 2 }, keys)).toMatchObject({
      formatKnown: false,
      intact: false,
    });
  });

  it("is never taken for sealed when a character of its seal was altered", async () => {
    const { jws } = record.seal!;
    await fc.assert(
      fc.asyncProperty(fc.nat(jws.length - 1), fc.constantFrom(..."AQgw09_-.=~"), async (at, character) => {
        if (jws[at] === character) return;
        const seal = { jws: jws.slice(0, at) + character + jws.slice(at + 1) };
        expect((await verifyRecord({ ...record, seal }, keys)).seal).not.toBe("valid");
      }),
      { numRuns: 400 },
    );
    for (const seal of ["", {}, { jws: 7 }, [], { jws: "" }, { jws: ".." }, { jws: `${jws}.` }]) {
      expect((await verifyRecord({ ...record, seal }, keys)).seal, JSON.stringify(seal)).toBe("invalid");
    }
  });

  it("gets the answer that the service would give of digests and seal, whatever has become of it", async () => {
    const parts = fc.constantFrom<unknown>(...Object.values(record));
    const kept = fc.dictionary(
      fc.oneof(fc.constantFrom(...Object.keys(record)), fc.string()),
      fc.oneof(parts, fc.jsonValue({ maxDepth: 3 })),
    );
    await fc.assert(
      fc.asyncProperty(kept, async (value) => {
        const document = throughJson(value);
        const { altered, recordDigest } = integrityOf(document);
        const offline = await verifyRecord(document, keys);
        expect([...offline.altered].sort()).toEqual([...altered].sort());
        expect(offline.seal).toBe((await verifySeal(document, recordDigest, keys.keys)).seal);
      }),
      { numRuns: 300 },
    );
  });

  it("that is no record at all gets an answer", async () => {
    for (const nothing of [null, 7, "record", [], {}, { input: "\ud800" }]) {
      expect(await verifyRecord(nothing, keys)).toMatchObject({ intact: false, seal: "absent" });
    }
  });
});

describe("a self-check without a service", () => {
  it("is intact and its seal valid, also as the sheet that bears its date", async () => {
    const answer = throughJson(await sealedSelfCheck(selfCheck(ENGINE), null, key, now));
    for (const sheet of [answer, { date: sealedAt, ...answer }]) {
      expect(await verifySelfCheck(sheet, keys)).toEqual({
        intact: true,
        seal: "valid",
        sealedAt,
        keyId: key.published.kid,
      });
    }
    expect(await verifySelfCheck({ ...answer, outcome: "fail" }, keys)).toMatchObject({
      intact: false,
      seal: "invalid",
    });
    // The seal of a self-check does not stand on a record.
    expect((await verifyRecord({ ...record, seal: answer.seal }, keys)).seal).toBe("invalid");
  });
});
