import { generateKeyPairSync } from "node:crypto";
import { describe, expect, test } from "vitest";
import { digestOf } from "../../services/review/record/digest.ts";
import { sealFindingOf } from "../../services/review/record/seal.ts";
import { readSealingKey } from "../../services/review/record/seal-keys.ts";
import { type Capability, deviationOf } from "../../services/review/self-check/capability.ts";
import { CHARACTERISTIC_VALUE_CHECKS } from "../../services/review/self-check/characteristic-value-checks.ts";
import { MASS_FILTER_CHECKS } from "../../services/review/self-check/mass-filter-checks.ts";
import { RF_ONLY_CHECKS } from "../../services/review/self-check/rf-only-checks.ts";
import { sealedSelfCheck, selfCheck } from "../../services/review/self-check/self-check.ts";
import { SelfCheckAnswer } from "../../services/review/self-check/self-check-schema.ts";
import { selfCheckSheet } from "../../services/review/self-check/sheet.ts";
import { STABILITY_CHECKS } from "../../services/review/self-check/stability-checks.ts";
import { CHARACTERISTIC_VALUES, PASSBANDS, RF_ONLY, STABILITY_POINTS } from "../reference/tables.ts";
import { ENGINE } from "./record/recorded-method.ts";

const ALL = [...CHARACTERISTIC_VALUE_CHECKS, ...STABILITY_CHECKS, ...MASS_FILTER_CHECKS, ...RF_ONLY_CHECKS];
const HOST = { runtime: "Node.js", version: "v20.19.0", architecture: "x64", system: "linux" };

test("this machine passes, and every capability names source, worst deviation and limit", () => {
  const answer = SelfCheckAnswer.parse(selfCheck(ENGINE));
  expect(answer.capabilities.filter(({ outcome }) => outcome !== "pass")).toEqual([]);
  expect(answer.outcome).toBe("pass");
  expect(answer.capabilities.length).toBeGreaterThanOrEqual(12);
  for (const { source, values, worstAt } of answer.capabilities) {
    expect(source.length).toBeGreaterThan(20);
    expect(values).toBeGreaterThan(3);
    expect(worstAt).not.toBe("");
  }
});

/** A reference value that was mistyped, or made to fit, is in none of the tables that were computed elsewhere. */
test("the reference values are those of the tables that were computed elsewhere", () => {
  const inTables = new Set<number>();
  const collect = (value: unknown): void => {
    if (typeof value === "number") inTables.add(value);
    else if (typeof value === "object" && value !== null) Object.values(value).forEach(collect);
  };
  [CHARACTERISTIC_VALUES, STABILITY_POINTS, PASSBANDS, RF_ONLY].forEach(collect);
  for (const [polePairs, charge, , , , , , energy] of RF_ONLY.multipole) {
    expect(polePairs).toBeGreaterThan(1);
    inTables.add(energy / charge);
  }
  const checked = ALL.filter(
    ({ limit, capability }) => limit > 0 && limit < 1e-9 && !capability.includes("corners"),
  );
  expect(checked.length).toBeGreaterThanOrEqual(8);
  for (const { capability, values } of checked) {
    for (const { at, reference } of values())
      expect(inTables.has(reference), `${capability}: ${at}`).toBe(true);
  }
});

describe("a machine that computes otherwise fails", () => {
  test.each(ALL.filter(({ limit }) => limit > 0).map((each) => [each.capability, each] as const))(
    "in one value of: %s",
    (_name, capability) => {
      const planted: Capability = {
        ...capability,
        values: () =>
          capability.values().map((value, index) => {
            if (index !== 1) return value;
            const scale =
              capability.kind === "relative"
                ? Math.abs(value.reference)
                : Math.max(1, Math.abs(value.reference));
            return { ...value, computed: value.reference + 3 * capability.limit * scale };
          }),
      };
      const answer = selfCheck(ENGINE, [planted]);
      expect(answer.outcome).toBe("fail");
      expect(answer.capabilities[0]).toMatchObject({ outcome: "fail", worstAt: capability.values()[1]!.at });
    },
  );

  test("where nothing comes out at all", () => {
    for (const computed of [null, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(deviationOf("absolute", { at: "", reference: 0, computed })).toBe(Number.POSITIVE_INFINITY);
      const broken: Capability = {
        ...ALL[0]!,
        limit: 1e300,
        values: () => [{ at: "here", reference: 1, computed }],
      };
      const answer = SelfCheckAnswer.parse(selfCheck(ENGINE, [broken]));
      expect(answer.capabilities[0]).toMatchObject({
        outcome: "fail",
        worstDeviation: null,
        worstAt: "here",
      });
      expect(selfCheckSheet(answer, new Date(0))).toContain("no value came out");
    }
  });
});

describe("the sheet", () => {
  test("is sealed with its date where there is a key, and no record's seal stands for it", async () => {
    const jwk = generateKeyPairSync("ed25519").privateKey.export({ format: "jwk" });
    const key = await readSealingKey(JSON.stringify(jwk));
    const date = new Date("2026-03-04T05:06:07Z");
    const answer = await sealedSelfCheck(selfCheck(ENGINE), HOST, key, () => date);
    const { digest, seal, ...content } = answer;
    expect(digest).toBe(digestOf(content));
    expect(await sealFindingOf(seal!.jws, digest, "rodset-self-check-seal", [key.published])).toMatchObject({
      seal: "valid",
      sealedAt: "2026-03-04T05:06:07.000Z",
    });
    expect((await sealFindingOf(seal!.jws, digest, "rodset-record-seal", [key.published])).seal).toBe(
      "invalid",
    );
    const sheet = selfCheckSheet(answer, date);
    for (const line of [
      "2026-03-04T05:06:07.000Z",
      "Node.js v20.19.0, x64, linux",
      `SHA-256 ${digest}`,
      seal!.jws,
    ]) {
      expect(sheet).toContain(line);
    }
    for (const { capability, source } of answer.capabilities) {
      expect(sheet).toContain(`PASS  ${capability}\n`);
      expect(sheet).toContain(`Source: ${source}\n`);
    }
  });

  test("says so where there is no key", async () => {
    const answer = await sealedSelfCheck(selfCheck(ENGINE), HOST, null, () => new Date(0));
    expect(answer.seal).toBeNull();
    expect(selfCheckSheet(answer, new Date(0))).toContain("none: the service holds no key");
  });
});
