import { expect, test } from "vitest";
import { expectWithin, relativeError } from "./measured-bound.ts";

test("a deviation above its bound fails and is named", () => {
  expect(() => expectWithin(1e-12, [{ at: "apex", error: 2e-12 }])).toThrow(/at apex exceeds/);
});

test("a bound more than fifty times the worst deviation fails", () => {
  expect(() => expectWithin(1e-10, [{ at: "apex", error: 1e-12 }])).toThrow(/too slack/);
  expect(() => expectWithin(1e-13, [{ at: "apex", error: 0 }])).toThrow(/too slack/);
});

test("a bound close to the worst deviation holds", () => {
  expectWithin(4e-12, [
    { at: "apex", error: 1e-12 },
    { at: "limit", error: 0 },
  ]);
  expectWithin(1e-14, [{ at: "exact", error: 0 }]);
});

test("an empty comparison and one that is not a number fail", () => {
  expect(() => expectWithin(1, [])).toThrow(/nothing/);
  expect(() => expectWithin(1, [{ at: "gap", error: Number.NaN }])).toThrow(/gap/);
});

test("a relative error refers to the reference", () => {
  expect(relativeError(-1.5, -1)).toBe(0.5);
});
