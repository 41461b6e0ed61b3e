import { generateKeyPairSync } from "node:crypto";
import request from "supertest";
import { describe, expect, it } from "vitest";
import { createApp } from "../../../services/http/app.ts";
import { ENDPOINTS } from "../../../services/http/endpoints.ts";
import { SIGN_OFF_EXAMPLE } from "../../../services/http/examples/sign-off.ts";
import { limitsOf } from "../../../services/http/limits.ts";
import { createLogger } from "../../../services/http/logger.ts";
import { readOpenApiDocument } from "../../../services/http/openapi-document.ts";
import type { SealedRecord } from "../../../services/review/record/record-schema.ts";
import { readSealingKey, type SealingKey } from "../../../services/review/record/seal-keys.ts";
import type { VerificationAnswer } from "../../../services/review/record/verification-schema.ts";
import { requestOf } from "../../review/record/recorded-method.ts";
import { payloadByRuntime } from "../../review/record/rfc-8037.ts";
import { errorsOf } from "../test-app.ts";

const newKey = (): Promise<SealingKey> =>
  readSealingKey(JSON.stringify(generateKeyPairSync("ed25519").privateKey.export({ format: "jwk" })));
const [first, second] = [await newKey(), await newKey()];
const AT = "2026-03-04T05:06:07.000Z";

/** The service with these keys, the first of which seals. */
function serviceWith(...keys: readonly SealingKey[]) {
  const app = createApp({
    endpoints: ENDPOINTS,
    openApiDocument: readOpenApiDocument(),
    limits: limitsOf({ bodyLimit_kB: 512 }),
    sealing: {
      key: keys[0] ?? null,
      known: keys.map(({ published }) => published),
      host: null,
      now: () => new Date(AT),
    },
    logger: createLogger("silent"),
  });
  async function post(path: string, body: object) {
    const response = await request(app).post(path).send(body);
    expect(response.status, response.text.slice(0, 500)).toBe(200);
    return response.body;
  }
  return {
    app,
    record: async (body: object = SIGN_OFF_EXAMPLE): Promise<SealedRecord> =>
      (await post("/v1/sign-off", body)).record,
    verify: (record: object, more: object = {}): Promise<VerificationAnswer> =>
      post("/v1/sign-off/verification", { record, ...more }),
  };
}

describe("a record over HTTP", () => {
  it("comes sealed from a service with a key, and holds when it is posted back", async () => {
    const service = serviceWith(first);
    const record = await service.record();
    expect(JSON.parse(payloadByRuntime(record.seal!.jws, first.published.x)!)).toEqual({
      recordDigest: record.digests.record,
      sealedAt: AT,
    });
    expect(await service.verify(record)).toMatchObject({
      intact: true,
      seal: "valid",
      sealedAt: AT,
      keyId: first.published.kid,
      reproduced: true,
      differences: [],
    });
  });

  it("is the same but for the seal whenever and with whichever key it is made", async () => {
    const { seal: _, ...one } = await serviceWith(first).record();
    const { seal, ...other } = await serviceWith().record();
    expect(other).toEqual(one);
    expect(seal).toBeNull();
  });

  it("stays valid after the keys have changed, as long as the old public key is trusted", async () => {
    const record = await serviceWith(first).record();
    expect((await serviceWith(second, first).verify(record)).seal).toBe("valid");
    expect(await serviceWith(second).verify(record)).toMatchObject({
      intact: true,
      seal: "unknown-key",
      sealedAt: null,
      keyId: first.published.kid,
      reproduced: true,
    });
  });

  it("that was tampered with gets an answer, whatever it has become", async () => {
    const service = serviceWith(first);
    const record = await service.record();
    const passed = { ...record, result: { ...record.result, verdict: "pass" } };
    expect(await service.verify(passed)).toMatchObject({
      intact: false,
      altered: ["/digests/result", "/digests/record"],
      seal: "invalid",
      reproduced: false,
      differences: [{ pointer: "/result/verdict", recorded: "pass", recomputed: record.result.verdict }],
    });
    for (const kept of [
      {},
      { format: "1" },
      { ...record, result: 7 },
      { ...record, input: null, note: "" },
    ]) {
      expect((await service.verify(kept)).intact).toBe(false);
    }
  });

  it("is held to today's criteria where the request states some", async () => {
    const service = serviceWith(first);
    const waiver = { reason: "exercise", reference: "none" };
    const criteria = { id: "sop-9", revision: "1", checks: { "product-above-cutoff": { waiver } } };
    const answer = await service.verify(await service.record(), { criteria });
    expect(answer.verdictByCriteria).not.toBeNull();
    expect(answer.stillMeetsCriteria).toBe(["pass", "caution"].includes(answer.verdictByCriteria!));
    expect(answer.reproduced).toBe(true);
  });

  it("of 2,000 acquisitions comes back and holds", { timeout: 120_000 }, async () => {
    const service = serviceWith(first);
    const record = await service.record(requestOf(2000));
    expect(JSON.stringify(record).length).toBeGreaterThan(5e6);
    expect(await service.verify(record)).toMatchObject({ intact: true, seal: "valid", reproduced: true });
  });

  it("whose key signs and is published stands in the key set, the current one first", async () => {
    const { app } = serviceWith(second, first);
    const response = await request(app).get("/.well-known/jwks.json");
    expect(response.headers["content-type"]).toBe("application/json");
    expect(response.body).toEqual({ keys: [second.published, first.published] });
    expect(response.text).not.toContain('"d"');
    const asKeySet = await request(app)
      .get("/.well-known/jwks.json")
      .set("Accept", "application/jwk-set+json");
    expect(asKeySet.headers["content-type"]).toBe("application/jwk-set+json; charset=utf-8");
  });
});

describe("what must not go on record is refused with its place", () => {
  it("half a character, in any text of a sign-off", async () => {
    const pointers: string[] = [];
    const { criteria, ...plain } = requestOf(1);
    const document = { ...plain, criteria: criteria! };
    const texts = [...textsIn(document)].filter(([, text]) => !/^(zero|pole|mz|edges|base)/.test(text));
    for (const [pointer] of texts) {
      const copy = JSON.parse(JSON.stringify(document));
      const path = pointer.split("/").slice(1);
      const parent = path.slice(0, -1).reduce((object, token) => object[token], copy);
      parent[path.at(-1)!] = "\ud800";
      const errors = await errorsOf("/v1/sign-off", copy);
      expect(errors.length, pointer).toBeGreaterThan(0);
      pointers.push(pointer);
    }
    expect(pointers).toContain("/method/acquisition/0/precursor/label");
  });

  it("half a character or a number beyond a double in a record", async () => {
    const path = "/v1/sign-off/verification";
    expect(await errorsOf(path, '{"record":{"input":["\\udc00"]}}')).toEqual([
      ["/record/input/0", "wrong-format"],
    ]);
    expect(await errorsOf(path, '{"record":{"\\ud800":1}}')).toEqual([["/record", "wrong-format"]]);
    expect(await errorsOf(path, '{"record":{"format":1e999}}')).toEqual([["/record/format", "out-of-range"]]);
  });

  it("a member named twice, or __proto__", async () => {
    expect(await errorsOf("/v1/sign-off/verification", '{"record":{"format":1,"format":2}}')).toEqual([
      ["/record/format", "duplicate-member"],
    ]);
    expect(await errorsOf("/v1/sign-off/verification", '{"record":{"__proto__":{"format":1}}}')).toEqual([
      ["/record/__proto__", "duplicate-member"],
    ]);
    const twice = JSON.stringify(SIGN_OFF_EXAMPLE).replace('"dwell_ms":20', '"dwell_ms":20,"dwell_ms":1');
    expect(await errorsOf("/v1/sign-off", twice)).toEqual([
      ["/method/acquisition/0/dwell_ms", "duplicate-member"],
    ]);
  });

  it("is announced by every endpoint that refuses it", () => {
    const refusing = ENDPOINTS.filter(({ refusesDuplicateMembers }) => refusesDuplicateMembers);
    expect(refusing.length).toBeGreaterThan(1);
    for (const { description, operationId } of refusing) {
      expect(description, operationId).toContain("A JSON object that names a member twice is refused");
    }
  });
});

function* textsIn(value: unknown, pointer = ""): Generator<[pointer: string, text: string]> {
  if (typeof value === "string") yield [pointer, value];
  else if (typeof value === "object" && value !== null) {
    for (const [name, member] of Object.entries(value)) yield* textsIn(member, `${pointer}/${name}`);
  }
}
