import { isDeepStrictEqual } from "node:util";
import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { integrityOf } from "../../../services/review/record/integrity.ts";
import { keptRecordErrors } from "../../../services/review/record/kept-record.ts";
import { digestsOf } from "../../../services/review/record/record.ts";
import { verifySeal } from "../../../services/review/record/verification.ts";
import { throughJson } from "./recorded-method.ts";
import { altered, type Kept, key, small, verified } from "./verified-records.ts";

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
    const original = throughJson(small);
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
        // The last of 17 digits may name the same double: then the file says nothing else.
        if (isDeepStrictEqual(kept, original) || keptRecordErrors(kept, "").length > 0) return;
        altered++;
        expect(await isTold(kept as Kept)).toBe(true);
      }),
      { numRuns: 1500, examples: [[3691, 1]] },
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
