import type { AnswerOf, Schema } from "@rodset/sdk";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { demoRequest } from "../../sdk/examples/demo-request.ts";
import { findingsAsText } from "../../sdk/examples/findings-as-text.ts";

function printedBound(passesIf: Schema<"PassesIf">): string {
  const finding: Schema<"Finding"> = {
    check: "set-mz",
    quantity: "set-against-ion",
    subject: { pointer: "/method" },
    outcome: "fail",
    required: true,
    evidence: "stated",
    value: null,
    unit: "1",
    pass: { min: null, max: null },
    caution: { min: null, max: null },
    margin: null,
    passesIf,
    missing: [],
    statement: "One sentence.",
    basis: "common practice",
  };
  const answer = { verdict: "fail", verdictStatement: "", findings: [finding], notShown: [] };
  const text = findingsAsText(demoRequest, answer as unknown as AnswerOf<"signOff">);
  return text.split("Passes if")[1]!.split("\n\n")[0]!.replaceAll(/\s+/g, " ").trim();
}

describe("an interval in which a finding would pass", () => {
  it.each([
    [{ min: 5, max: null, unit: "ms" }, "/a is at least 5 ms."],
    [{ min: null, max: 54.19883333, unit: "1" }, "/a is at most 54.1988."],
    [{ min: 122.9606741, max: 123.1723286, unit: "1" }, "/a is from 122.961 to 123.172."],
    [{ min: -0.25, max: 0, unit: "V" }, "/a is from -0.25 to 0 V."],
  ])("is printed with its unit: %j", (bounds, sentence) => {
    expect(printedBound({ input: "/a", ...bounds })).toBe(sentence);
  });

  it("holds every bound that is printed, at any scale, and is not shortened by more than six digits", () => {
    const bound = fc
      .tuple(
        fc.double({ min: 1, max: 10, noNaN: true, maxExcluded: true }),
        fc.integer({ min: -12, max: 12 }),
        fc.boolean(),
      )
      .map(([mantissa, exponent, negative]) => (negative ? -1 : 1) * Number(`${mantissa}e${exponent}`));
    fc.assert(
      fc.property(bound, (value) => {
        const low = Number(
          printedBound({ input: "/a", min: value, max: null, unit: "1" }).match(/least (.*)\.$/)![1],
        );
        const high = Number(
          printedBound({ input: "/a", min: null, max: value, unit: "1" }).match(/most (.*)\.$/)![1],
        );
        expect(low).toBeGreaterThanOrEqual(value);
        expect(high).toBeLessThanOrEqual(value);
        expect(low - high).toBeLessThanOrEqual(1.1e-5 * Math.abs(value));
      }),
    );
  });
});
