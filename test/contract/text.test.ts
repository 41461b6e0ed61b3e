import { describe, expect, it } from "vitest";
import { FormulaText, Identifier } from "../../services/contract/text.ts";

const BEYOND_BASIC_PLANE = "\u{20BB7}";
const codesOf = (value: string) => Identifier.safeParse(value).error?.issues.map(({ code }) => code) ?? [];

describe("a text", () => {
  it("is counted in characters, not in UTF-16 units", () => {
    expect(codesOf(BEYOND_BASIC_PLANE.repeat(100))).toEqual([]);
    expect(codesOf(BEYOND_BASIC_PLANE.repeat(101))).toEqual(["too_big"]);
    expect(codesOf("x".repeat(100))).toEqual([]);
    expect(codesOf("x".repeat(101))).toEqual(["too_big"]);
  });

  it("is not empty", () => {
    expect(codesOf("")).toContain("too_small");
  });

  it.each([
    ["a lone surrogate", "a\ud800"],
    ["a control character", "a\u0007b"],
    ["a line break", "a\nb"],
  ])("holds no %s", (_what, value) => {
    expect(codesOf(value)).toEqual(["invalid_format"]);
  });

  it("that is a formula has letters, digits, brackets and signs only", () => {
    expect(FormulaText.safeParse("C33H40N2O9").success).toBe(true);
    expect(FormulaText.safeParse("C33 H40").success).toBe(false);
  });
});
