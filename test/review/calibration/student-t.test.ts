import { expect, test } from "vitest";
import { studentT, twoSidedTail } from "../../../services/review/calibration/student-t.ts";
import { expectWithin, relativeError } from "../../measured-bound.ts";
import { CALIBRATION, PRINTED_T } from "../../reference/calibration.ts";

test.each(PRINTED_T)(
  "confidence %d with %d degrees of freedom is %s in printed tables",
  (confidence, dof, printed) => {
    expect(studentT(confidence, dof).toFixed(3)).toBe(printed);
  },
);

test("quantiles agree with the incomplete beta function at 30 digits (test/reference, calibration)", () => {
  expectWithin(
    1e-12,
    CALIBRATION.studentT.map(([confidence, dof, t]) => ({
      at: `${confidence}, ${dof}`,
      error: relativeError(studentT(confidence, dof), t),
    })),
  );
});

test("the tail of one and of two degrees of freedom is that of their closed forms", () => {
  for (const t of [0.1, 1, 3, 20]) {
    expect(twoSidedTail(t, 1)).toBeCloseTo(1 - (2 / Math.PI) * Math.atan(t), 14);
    expect(twoSidedTail(t, 2)).toBeCloseTo(1 - t / Math.sqrt(2 + t * t), 14);
  }
});
