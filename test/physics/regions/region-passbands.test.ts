import fc from "fast-check";
import { expect, test } from "vitest";
import { passbandOf } from "../../../services/physics/passband.ts";
import { regionPassbandsOf } from "../../../services/physics/regions/region-passbands.ts";
import { type Deviation, expectWithin, relativeError } from "../../measured-bound.ts";
import { PASSBANDS, RF_ONLY } from "../../reference/tables.ts";
import { anyField, anyVolts } from "../settings.ts";

test("RF alone: cutoff and second window of ten reference settings", () => {
  const deviations: Deviation[] = [];
  for (const [fieldRadius, frequency, V, cutoff, secondHigh, secondLow] of RF_ONLY.quadrupole) {
    const answer = regionPassbandsOf(0, V, { fieldRadius, frequency }, "any");
    if (answer.kind !== "passbands") throw new Error(answer.kind);
    const [first, second] = answer.passbands;
    const at = `V ${V}`;
    deviations.push({ at, error: relativeError(first!.passband.mzLow, cutoff) });
    deviations.push({ at, error: relativeError(second!.passband.mzLow, secondLow) });
    deviations.push({ at, error: relativeError(second!.passband.mzHigh!, secondHigh) });
    expect(first!.high).toBeNull();
    expect(second!.passband.mzHigh! / first!.passband.mzLow).toBeCloseTo(0.12, 2);
    expect(answer.passbands).toHaveLength(2);
  }
  expectWithin(4e-15, deviations);
});

test("with the DC of a filter the first region's window is to the last digit that of passbandOf", () => {
  for (const [fieldRadius, frequency, U, V] of PASSBANDS.settings) {
    const field = { fieldRadius, frequency };
    const answer = regionPassbandsOf(U, V, field, "first");
    const own = passbandOf(U, V, field);
    if (answer.kind !== "passbands" || own.kind !== "window") throw new Error("no window");
    expect(answer.passbands[0]!.passband).toEqual(own.passband);
    expect(answer.passbands[0]!.low.lostTo).toBe("x");
    expect(answer.passbands[0]!.high!.lostTo).toBe("y");
  }
});

test("the sign of V is a matter of phase, that of U exchanges the planes", () => {
  fc.assert(
    fc.property(anyVolts, anyField, fc.double({ min: 0.01, max: 0.68, noNaN: true }), (V, field, ratio) => {
      const plain = regionPassbandsOf(ratio * V, V, field, "any");
      const shifted = regionPassbandsOf(ratio * V, -V, field, "any");
      const reversed = regionPassbandsOf(-ratio * V, V, field, "any");
      if (plain.kind !== "passbands" || reversed.kind !== "passbands") throw new Error("not converged");
      expect(shifted).toEqual(plain);
      expect(reversed.passbands.map(({ passband }) => passband)).toEqual(
        plain.passbands.map(({ passband }) => passband),
      );
      for (const [i, { low }] of plain.passbands.entries()) {
        expect(reversed.passbands[i]!.low.lostTo).not.toBe(low.lostTo);
      }
    }),
  );
});

test("nothing passes without RF, above the apex, or where the line misses the region, each with its reason", () => {
  const field = { fieldRadius: 0.004, frequency: 1e6 };
  expect(regionPassbandsOf(10, 0, field, "any")).toMatchObject({ passbands: [], reason: "no-rf" });
  expect(regionPassbandsOf(200, 1000, field, "first")).toMatchObject({ passbands: [], reason: "above-apex" });
  expect(regionPassbandsOf(100, 1000, field, "second")).toMatchObject({
    passbands: [],
    reason: "scan-line-misses-region",
  });
});
