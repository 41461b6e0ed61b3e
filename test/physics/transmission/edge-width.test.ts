import { expect, test } from "vitest";
import {
  edgesForHeight,
  type PeakHeight,
  widthAtHeight,
} from "../../../services/physics/transmission/edge-width.ts";
import { FIELD, roundBeam } from "./settings.ts";

const query = (mzCentre: number, rfCycles: number, at: PeakHeight) => ({
  mzCentre,
  field: FIELD,
  residence: () => rfCycles,
  beam: roundBeam(0.15, 0.1, mzCentre, FIELD),
  accuracy: 1e-3,
  at,
});

test("edges 0.70 at m/z 500 and N² = 20R are 0.61 at half height and 0.84 at a tenth (domain notes)", () => {
  const rfCycles = Math.sqrt((20 * 500) / 0.7);
  for (const [at, printed] of [
    ["half-height", "0.61"],
    ["tenth-height", "0.84"],
  ] as const) {
    const answer = widthAtHeight({ ...query(500, rfCycles, at), edgeWidth: 0.7 });
    if (answer.kind !== "width") throw new Error(JSON.stringify(answer));
    expect(answer.width.toFixed(2)).toBe(printed);
  }
});

test.each([
  [500, 0.7, 120, "half-height"],
  [500, 1.2, 120, "tenth-height"],
  [28, 0.8, 60, "half-height"],
  [100, 30, 40, "tenth-height"],
] as const)(
  "m/z %s, width %s at %s cycles and %s: the edges that are found give it back",
  (mz, width, cycles, at) => {
    const found = edgesForHeight({ ...query(mz, cycles, at), width });
    if (found.kind !== "edges") throw new Error(JSON.stringify(found));
    const back = widthAtHeight({ ...query(mz, cycles, at), edgeWidth: found.edgeWidth, accuracy: 1e-4 });
    if (back.kind !== "width") throw new Error(JSON.stringify(back));
    expect(Math.abs(back.width - width)).toBeLessThan(1.5e-3 * width);
    expect(found.setPoint.edges.qWidth).toBeGreaterThan(0);
  },
);

test("a width that the residence can't form is refused, with the narrowest that it can", () => {
  const answer = edgesForHeight({ ...query(500, 60, "tenth-height"), width: 0.3 });
  if (answer.kind !== "none" || answer.reason !== "residence-too-short")
    throw new Error(JSON.stringify(answer));
  expect(answer.narrowest).toBeGreaterThan(1);
});
