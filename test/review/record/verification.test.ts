import { generateKeyPairSync } from "node:crypto";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { integrityOf } from "../../../services/review/record/integrity.ts";
import { keptRecordErrors } from "../../../services/review/record/kept-record.ts";
import { digestsOf } from "../../../services/review/record/record.ts";
import type { SealedRecord } from "../../../services/review/record/record-schema.ts";
import { seal } from "../../../services/review/record/seal.ts";
import { readSealingKey } from "../../../services/review/record/seal-keys.ts";
import { inWords, verifyContent, verifySeal } from "../../../services/review/record/verification.ts";
import { VerificationAnswer } from "../../../services/review/record/verification-schema.ts";
import { ENGINE, recordOf, throughJson } from "./recorded-method.ts";

const key = await readSealingKey(
  JSON.stringify(generateKeyPairSync("ed25519").privateKey.export({ format: "jwk" })),
);

async function sealed(record: SealedRecord): Promise<SealedRecord> {
  const jws = await seal(record.digests.record, new Date("2026-03-04T05:06:07Z"), "rodset-record-seal", key);
  return { ...record, seal: { jws } };
}

/** The record as another engine would have made it: digests and seal are right for what stands in it. */
async function resealed({ format, engine, input, result }: SealedRecord): Promise<SealedRecord> {
  const digests = digestsOf(format, engine, input, result);
  return sealed({ format, engine, input, result, digests, seal: null });
}

type Kept = Record<string, unknown>;

async function verified(record: unknown, criteria?: SealedRecord["input"]["criteria"]) {
  const kept = record as Kept;
  const request = criteria === undefined ? { record: kept } : { record: kept, criteria };
  const content = verifyContent(request, ENGINE);
  return VerificationAnswer.parse(
    inWords(content, await verifySeal(kept, content.recordDigest, [key.published])),
  );
}

const record = await sealed(recordOf(4));
const small = await sealed(recordOf(1));
const altered = (change: (copy: SealedRecord) => void): SealedRecord => {
  const copy = throughJson(record);
  change(copy);
  return copy;
};

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

/** Every place of a document: the path to each value in it. */
function* placesIn(
  value: unknown,
  path: readonly (string | number)[] = [],
): Generator<readonly (string | number)[]> {
  if (path.length > 0) yield path;
  if (Array.isArray(value))
    for (const [index, item] of value.entries()) yield* placesIn(item, [...path, index]);
  else if (typeof value === "object" && value !== null) {
    for (const [name, member] of Object.entries(value)) yield* placesIn(member, [...path, name]);
  }
}

// biome-ignore lint/suspicious/noExplicitAny: a document of any shape is altered in any place.
function parentOf(document: any, path: readonly (string | number)[]): any {
  return path.slice(0, -1).reduce((object, token) => object[token], document);
}

async function isTold(record: Kept): Promise<boolean> {
  const { altered, recordDigest } = integrityOf(record);
  return altered.length > 0 || (await verifySeal(record, recordDigest, [key.published])).seal !== "valid";
}

describe("tampering is found", () => {
  const places = [...placesIn(small)];

  test("in every member: changed, taken away or added to", async () => {
    const untold: string[] = [];
    for (const path of places) {
      const last = path.at(-1)!;
      for (const change of ["change", "remove", "add"] as const) {
        const copy: unknown = throughJson(small);
        const parent = parentOf(copy, path);
        if (change === "change") parent[last] = other(parent[last]);
        else if (change === "remove")
          Array.isArray(parent) ? parent.splice(Number(last), 1) : delete parent[last];
        else if (Array.isArray(parent)) parent.push(null);
        else parent[`${last}2`] = null;
        const kept = copy as Kept;
        if (!(await isTold(kept))) untold.push(`${change} ${path.join("/")}`);
      }
    }
    expect(untold).toEqual([]);
    expect(places.length).toBeGreaterThan(400);
  });

  test("in random bytes of the file, wherever it is still JSON that says something else", async () => {
    const bytes = Buffer.from(JSON.stringify(small));
    let altered = 0;
    await fc.assert(
      fc.asyncProperty(fc.nat(bytes.length - 1), fc.integer({ min: 1, max: 255 }), async (at, flip) => {
        const copy = Buffer.from(bytes);
        copy[at] = copy[at]! ^ flip;
        let kept: unknown;
        try {
          kept = JSON.parse(new TextDecoder("utf-8", { fatal: true }).decode(copy));
        } catch {
          return;
        }
        if (keptRecordErrors(kept, "").length > 0) return;
        altered++;
        expect(await isTold(kept as Kept)).toBe(true);
      }),
      { numRuns: 1500 },
    );
    expect(altered).toBeGreaterThan(300);
  });

  test("in the digests themselves, whose seal still belongs to the content", async () => {
    const copy = altered(({ digests }) => {
      digests.result = digests.input;
    });
    expect(await verified(copy)).toMatchObject({
      intact: false,
      altered: ["/digests/result"],
      seal: "valid",
    });
  });

  test("where new digests were made but no new seal", async () => {
    const copy = altered(({ result }) => {
      result.verdict = "pass";
    });
    copy.digests = digestsOf(copy.format, copy.engine, copy.input, copy.result);
    expect(await verified(copy)).toMatchObject({
      intact: true,
      seal: "invalid",
      sealedAt: null,
      reproduced: false,
    });
  });
});

function other(value: unknown): unknown {
  if (typeof value === "string") return `${value} `;
  if (typeof value === "number") return value === 0 ? 1 : value * (1 + 2 * Number.EPSILON);
  if (typeof value === "boolean") return !value;
  return value === null ? 0 : null;
}

describe("a planted change of engine is not reproduced and named", () => {
  const position = record.result.findings.findIndex(({ check }) => check === "product-above-cutoff");

  test("in the value of a finding", async () => {
    const planted = throughJson(record);
    planted.engine.version = "0.0.9";
    const finding = planted.result.findings[position]!;
    const right = finding.value!;
    finding.value = right * (1 + 1e-7);
    const answer = await verified(await resealed(planted));
    expect(answer).toMatchObject({
      intact: true,
      seal: "valid",
      reproduced: false,
      notReproducedBecause: "result-differs",
      differences: [
        { pointer: `/result/findings/${position}/value`, recorded: finding.value, recomputed: right },
      ],
    });
    expect(answer.statement).toContain("This version finds otherwise in one place.");
  });

  test("in a window, a bound, an outcome, a verdict and a count", async () => {
    const planted = throughJson(record);
    planted.result.settings[0]!.window!.mzHigh += 1e-5;
    planted.result.findings[position]!.pass.min! += 0.01;
    planted.result.findings[0]!.outcome = "not-applicable";
    planted.result.verdict = "caution";
    planted.result.outcomeCounts.pass++;
    const { differences } = await verified(await resealed(planted));
    expect(differences.map(({ pointer }) => pointer).sort()).toEqual([
      "/result/findings/0/outcome",
      `/result/findings/${position}/pass/min`,
      "/result/outcomeCounts/pass",
      "/result/settings/0/window/mzHigh",
      "/result/verdict",
    ]);
  });

  test("where it found less, or more, than this version does", async () => {
    const planted = throughJson(record);
    const [first] = planted.result.findings.splice(0, 1);
    const invented = { ...first!, check: "rod-polish" };
    planted.result.findings.push(invented);
    const { differences } = await verified(await resealed(planted));
    expect(differences).toHaveLength(2);
    expect(differences[0]).toMatchObject({
      pointer: `/result/findings/${planted.result.findings.length - 1}`,
    });
    expect(differences[0]!.recorded).toContain("rod-polish");
    expect(differences[0]).not.toHaveProperty("recomputed");
    expect(differences[1]).toMatchObject({ pointer: "/result/findings/-" });
    expect(differences[1]).not.toHaveProperty("recorded");
  });

  test("up to a hundred times, and the rest is counted", async () => {
    const planted = throughJson(recordOf(60));
    for (const finding of planted.result.findings) finding.unit = "furlong";
    const answer = await verified(await resealed(planted));
    expect(answer.differences).toHaveLength(100);
    expect(answer.differencesOmitted).toBe(planted.result.findings.length - 100);
  });
});

describe("what may differ between two machines or two wordings is reproduced", () => {
  test("sentences", async () => {
    const worded = throughJson(record);
    worded.result.verdictStatement = "In other words.";
    for (const finding of worded.result.findings) {
      finding.statement = "In other words.";
      finding.basis = "In other words.";
    }
    for (const group of worded.result.notShown) group.statement = "In other words.";
    expect(await verified(await resealed(worded))).toMatchObject({ intact: true, reproduced: true });
  });

  test("the last digits of every number, on the scale of what was subtracted", async () => {
    const rounded = throughJson(record);
    for (const finding of rounded.result.findings) {
      if (finding.value !== null) finding.value *= 1 + 1e-14;
      // A margin of bound and value has their rounding, however small it is.
      if (finding.margin !== null) finding.margin += 1e-14 * Math.abs(finding.value!);
    }
    expect(await verified(await resealed(rounded))).toMatchObject({ reproduced: true });
  });

  test("but no number by more than the tolerance that the answer states", async () => {
    const { tolerance } = await verified(record);
    expect(tolerance).toBe(1e-9);
    for (const [factor, reproduced] of [
      [1 + 0.5 * tolerance, true],
      [1 + 2 * tolerance, false],
    ] as const) {
      const changed = throughJson(record);
      changed.result.settings[0]!.window!.mzLow *= factor;
      expect((await verified(await resealed(changed))).reproduced, String(factor)).toBe(reproduced);
    }
  });
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
