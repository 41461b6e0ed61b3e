import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { keptRecordErrors } from "../../../services/review/record/kept-record.ts";
import { ENGINE, throughJson } from "./recorded-method.ts";
import { altered, record, resealed, verified } from "./verified-records.ts";

test("a record that was kept as it was is intact, sealed and reproduced", async () => {
  expect(await verified(record)).toMatchObject({
    intact: true,
    altered: [],
    seal: "valid",
    sealedAt: "2026-03-04T05:06:07.000Z",
    reproduced: true,
    notReproducedBecause: null,
    differences: [],
    verdict: record.result.verdict,
    stillMeetsCriteria: record.result.verdict !== "fail",
    engine: ENGINE,
  });
  expect(record.result.findings.length).toBeGreaterThan(20);
});

test("order of members and white space are no part of what is sealed", async () => {
  const reversed = (value: unknown): unknown =>
    typeof value !== "object" || value === null || Array.isArray(value)
      ? value
      : Object.fromEntries(
          Object.entries(value)
            .reverse()
            .map(([name, member]) => [name, reversed(member)]),
        );
  expect(await verified(JSON.parse(JSON.stringify(reversed(record), null, 7)))).toMatchObject({
    intact: true,
    seal: "valid",
    reproduced: true,
  });
});

test("without a seal it is intact and says so", async () => {
  const { seal: _, ...rest } = record;
  expect(await verified({ ...rest, seal: null })).toMatchObject({
    intact: true,
    seal: "absent",
    keyId: null,
  });
  expect(await verified(rest)).toMatchObject({ intact: false, altered: ["/seal"], seal: "absent" });
  for (const wrong of ["", 0, false, [], {}, { jws: null }, { jws: 7 }]) {
    expect(await verified({ ...rest, seal: wrong }), JSON.stringify(wrong)).toMatchObject({
      seal: "invalid",
    });
  }
});

describe("what cannot be recomputed is told", () => {
  test("a layout that this version does not know", async () => {
    const later = { ...record, format: 2 };
    expect(await verified(later)).toMatchObject({
      reproduced: false,
      notReproducedBecause: "unknown-format",
      verdict: null,
      stillMeetsCriteria: null,
    });
    expect((await verified(later)).statement).toContain("does not know the layout");
  });

  test("an input that is no valid request", async () => {
    const broken = altered(({ input }) => {
      input.method.acquisition[1]!.id = input.method.acquisition[0]!.id;
    });
    expect(await verified(await resealed(broken))).toMatchObject({
      intact: true,
      seal: "valid",
      notReproducedBecause: "input-refused",
      stillMeetsCriteria: null,
    });
  });

  test("anything at all in place of a record", async () => {
    const answers = fc.asyncProperty(
      fc.dictionary(
        fc.oneof(fc.constantFrom(...Object.keys(record)), fc.string()),
        fc.oneof(fc.jsonValue({ maxDepth: 4 }), fc.constantFrom(...Object.values(record))),
      ),
      async (kept) => {
        const { intact, reproduced, stillMeetsCriteria } = await verified(throughJson(kept));
        expect(intact).toBe(false);
        if (!reproduced && kept.input !== record.input) expect(stillMeetsCriteria).toBeNull();
      },
    );
    await fc.assert(answers, { numRuns: 300 });
  });
});

describe("criteria of today", () => {
  test("decide whether the method still meets them", async () => {
    const strict = {
      id: "sop-112",
      revision: "5",
      checks: { "dwell-time": { pass: { min: 500 }, caution: { min: 400 } } },
    };
    const lenient = {
      id: "sop-112",
      revision: "6",
      checks: Object.fromEntries(
        record.result.findings.map(({ check }) => [
          check,
          { waiver: { reason: "exercise", reference: "none" } },
        ]),
      ),
    };
    expect(await verified(record, strict)).toMatchObject({
      verdictByCriteria: "fail",
      stillMeetsCriteria: false,
    });
    const waived = await verified(record, {
      ...lenient,
      checks: { ...lenient.checks, "dwell-time": { pass: { min: 1 }, caution: { min: 1 } } },
    });
    expect(waived).toMatchObject({
      verdictByCriteria: "pass",
      stillMeetsCriteria: true,
      verdict: record.result.verdict,
    });
  });
});

describe("what JSON holds and canonical JSON cannot", () => {
  test("is refused with its place", () => {
    const errors = keptRecordErrors(
      { a: ["\ud800"], "\udfff": 1, "b/c": { d: Number.POSITIVE_INFINITY }, fine: "😀" },
      "/record",
    );
    expect(errors.map(({ pointer, code }) => [pointer, code])).toEqual([
      ["/record/a/0", "wrong-format"],
      ["/record", "wrong-format"],
      ["/record/b~1c/d", "out-of-range"],
    ]);
  });

  test("as is what stands too deep, before anything recurses into it", () => {
    const deep = JSON.parse(`${"[".repeat(100_000)}${"]".repeat(100_000)}`);
    expect(keptRecordErrors({ input: deep }, "/record").map(({ code }) => code)).toEqual(["too-deep"]);
  });

  test("and a thousand times wrong is not answered a thousand times", () => {
    expect(keptRecordErrors({ input: Array(1000).fill("\ud800") }, "/record")).toHaveLength(100);
  });
});
