import { expect } from "vitest";

/** Compares two JSON values: numbers within a relative tolerance, everything else exactly. */
export function expectClose(actual: unknown, expected: unknown, relative: number, path = ""): void {
  if (typeof expected === "number" && typeof actual === "number") {
    const deviation = Math.abs(actual - expected) / (Math.abs(expected) || 1);
    expect(deviation, `${path}: ${actual} against ${expected}`).toBeLessThanOrEqual(relative);
  } else if (
    typeof expected === "object" &&
    expected !== null &&
    typeof actual === "object" &&
    actual !== null
  ) {
    expect(Object.keys(actual).sort(), path).toEqual(Object.keys(expected).sort());
    for (const [name, value] of Object.entries(expected)) {
      expectClose((actual as Record<string, unknown>)[name], value, relative, `${path}/${name}`);
    }
  } else {
    expect(actual, path).toEqual(expected);
  }
}
