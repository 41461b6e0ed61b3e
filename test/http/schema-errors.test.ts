import { describe, expect, it } from "vitest";
import { z } from "zod";
import { Dc } from "../../services/contract/drive.ts";
import { Ion } from "../../services/contract/ion.ts";
import { Label } from "../../services/contract/text.ts";
import { MOST_ERRORS_SHOWN } from "../../services/http/error-list.ts";
import { checkAgainst } from "../../services/http/schema-errors.ts";

function found(schema: z.ZodType, document: unknown) {
  return (checkAgainst(schema, document).errors?.shown ?? []).map(({ pointer, code }) => [pointer, code]);
}

function detailOf(schema: z.ZodType, document: unknown): string | undefined {
  return checkAgainst(schema, document).errors?.shown[0]?.detail;
}

const Cell = z.strictObject({
  rf: z.discriminatedUnion("mode", [
    z.strictObject({ mode: z.literal("cutoff"), mz: z.number().min(1).max(10) }),
    z.strictObject({ mode: z.literal("fixed"), volts: z.number() }),
  ]),
});

describe("a member of a union is reported by the nearest arm", () => {
  it.each([
    ["one wrong value", Dc, { volts: "1", between: "pole-and-ground" }, [["/volts", "wrong-type"]]],
    ["one missing member", Dc, { pairX_V: 1 }, [["/pairY_V", "missing-member"]]],
    [
      "a misspelt member",
      Dc,
      { pairX_V: 1, pairY: 2 },
      [
        ["/pairY_V", "missing-member"],
        ["/pairY", "unknown-member"],
      ],
    ],
    [
      "two wrong values beat one missing and one unknown member",
      Dc,
      { volts: "1", between: 2 },
      [
        ["/volts", "wrong-type"],
        ["/between", "not-one-of"],
      ],
    ],
    ["the second arm's value", Ion, { formula: "C1", adduct: 5 }, [["/adduct", "wrong-type"]]],
    ["the arm's own range", Ion, { mz: 0, label: "x" }, [["/mz", "out-of-range"]]],
    ["something that fits no arm's kind", Ion, 5, [["", "wrong-type"]]],
    ["nothing at all", z.strictObject({ ion: Ion }), {}, [["/ion", "missing-member"]]],
    ["a union inside an array", z.array(Ion).max(9), [{ mz: 1 }, { mz: "a" }], [["/1/mz", "wrong-type"]]],
  ])("%s", (_case, schema, document, expected) => {
    expect(found(schema, document)).toEqual(expected);
  });

  it("never weighs values against a tag", () => {
    const schema = z.union([
      z.strictObject({ kind: z.literal("a"), x: z.number(), y: z.number(), z: z.number() }),
      z.strictObject({ kind: z.literal("b"), w: z.number() }),
    ]);
    expect(found(schema, { kind: "a", w: 1 })).toEqual([
      ["/x", "missing-member"],
      ["/y", "missing-member"],
      ["/z", "missing-member"],
      ["/w", "unknown-member"],
    ]);
  });
});

describe("a tagged union", () => {
  it.each([
    ["a wrong tag", { rf: { mode: "cut", mz: 5 } }, [["/rf/mode", "not-one-of"]]],
    ["a missing tag", { rf: { mz: 5 } }, [["/rf/mode", "missing-member"]]],
    ["a value in the arm", { rf: { mode: "cutoff", mz: 11 } }, [["/rf/mz", "out-of-range"]]],
    ["something else in its place", { rf: [] }, [["/rf", "wrong-type"]]],
  ])("reports %s", (_case, document, expected) => {
    expect(found(Cell, document)).toEqual(expected);
  });

  it("names the tags it knows", () => {
    expect(detailOf(Cell, { rf: { mode: "cut" } })).toBe(
      'mode is a text of length 3; it must be "cutoff" or "fixed".',
    );
  });
});

describe("the sentence of an error", () => {
  it.each([
    [
      "a number out of its range",
      Ion,
      { mz: 2e6 },
      "mz is 2000000; it must be a number from 0.5 to 1000000. Mass-to-charge ratio m/z of the ion, dimensionless.",
    ],
    [
      "a text in a number's place, unquoted",
      Ion,
      { mz: "secret" },
      "mz is a text of length 6; it must be a number from 0.5 to 1000000. Mass-to-charge ratio m/z of the ion, dimensionless.",
    ],
    [
      "a long text, unquoted",
      z.strictObject({ label: Label }),
      { label: "s".repeat(201) },
      "label is a text of length 201; it must be a text of 1 to 200 characters. A short text for people, no control characters.",
    ],
    [
      "a long array",
      z.strictObject({ list: z.array(z.number()).max(2) }),
      { list: [1, 2, 3] },
      "list is an array of length 3; it must be an array of at most 2 items.",
    ],
    [
      "an item of an array",
      z.strictObject({ list: z.array(z.boolean()).max(2) }),
      { list: [true, null] },
      "Item 1 of list is null; it must be true or false.",
    ],
    [
      "the body itself",
      z.strictObject({ list: z.array(z.number()).max(2) }),
      [],
      "The body is an array of length 0; it must be an object with list.",
    ],
    [
      "a number that JSON reads as infinite",
      Ion,
      JSON.parse('{"mz":1e999}'),
      "mz is too large for a number; it must be a number from 0.5 to 1000000. Mass-to-charge ratio m/z of the ion, dimensionless.",
    ],
    [
      "an unknown member",
      z.strictObject({ mz: z.number(), charge: z.number() }),
      { mz: 1, charge: 1, mass: 2 },
      "mass is not a member here; the members are mz, charge.",
    ],
  ])("says of %s what was found and what is expected", (_case, schema, document, expected) => {
    expect(detailOf(schema, document)).toBe(expected);
  });
});

it("escapes the pointer to a member as RFC 6901, section 3 asks", () => {
  expect(found(z.strictObject({}), { "a/b~c": 1 })).toEqual([["/a~1b~0c", "unknown-member"]]);
});

it("does not hand a payload back that came as the name of a member", () => {
  const errors = checkAgainst(z.strictObject({ mz: z.number() }), { mz: 1, ["s".repeat(61)]: 1 }).errors;
  expect(errors?.shown).toEqual([
    { pointer: "", code: "unknown-member", detail: "A long name is not a member here; the members are mz." },
  ]);
});

it("refuses __proto__ like any other unknown member", () => {
  expect(found(z.strictObject({ mz: z.number() }), JSON.parse('{"mz":1,"__proto__":{"mz":2}}'))).toEqual([
    ["/__proto__", "unknown-member"],
  ]);
});

it(`shows ${MOST_ERRORS_SHOWN} errors and counts the others`, () => {
  const schema = z.array(z.number()).max(100);
  const errors = checkAgainst(
    schema,
    Array.from({ length: 100 }, () => "x"),
  ).errors;
  expect(errors?.shown).toHaveLength(MOST_ERRORS_SHOWN);
  expect(errors?.omitted).toBe(100 - MOST_ERRORS_SHOWN);
});

it("stops at the length of an array that is far too long", () => {
  const document = Array.from({ length: 250_000 }, () => "x");
  expect(found(z.array(z.number()).max(1000), document)).toEqual([["", "wrong-count"]]);
});
