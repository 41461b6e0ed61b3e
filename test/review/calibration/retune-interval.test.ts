import { expect, test } from "vitest";
import { retuneInterval } from "../../../services/review/calibration/retune-interval.ts";

const records = (...offsets: number[]) => offsets.map((offset, day) => ({ time_h: 24 * day, offset }));

test("a steady drift of 0.01 a day reaches 0.1 after as many days as are left", () => {
  const { reason, expected_h, atConfidence_h, slope_perHour } = retuneInterval(
    records(0.01, 0.0201, 0.0299, 0.04),
    0.1,
    0.95,
  );
  expect(reason).toBeNull();
  // Slope by hand: Σ(t − t̄)(y − ȳ)/Σ(t − t̄)² over t = 0..3 days is 0.00998 a day, the line is 0.03997 at the last.
  expect(slope_perHour! * 24).toBeCloseTo(0.00998, 12);
  expect(expected_h!).toBeCloseTo((24 * (0.1 - 0.03997)) / 0.00998, 9);
  expect(atConfidence_h!).toBeGreaterThan(0);
  expect(atConfidence_h!).toBeLessThan(expected_h!);
});

test("a falling drift runs to the lower limit in the same time, and a higher confidence says sooner", () => {
  const up = retuneInterval(records(0.01, 0.0201, 0.0299, 0.04), 0.1, 0.95);
  const down = retuneInterval(records(-0.01, -0.0201, -0.0299, -0.04), 0.1, 0.95);
  expect(down.expected_h).toBeCloseTo(up.expected_h!, 9);
  expect(down.atConfidence_h).toBeCloseTo(up.atConfidence_h!, 6);
  const surer = retuneInterval(records(0.01, 0.0201, 0.0299, 0.04), 0.1, 0.99);
  expect(surer.atConfidence_h!).toBeLessThan(up.atConfidence_h!);
});

test("scatter without drift has no expected interval, with the reason, but a time that is safe", () => {
  const found = retuneInterval(records(0.01, -0.01, 0.012, -0.009, 0.008), 0.3, 0.95);
  expect(found).toMatchObject({ reason: "drift-not-distinguishable", expected_h: null });
  expect(found.slopeStandardUncertainty_perHour!).toBeGreaterThan(0);
  expect(found.atConfidence_h!).toBeGreaterThan(0);
});

test("offsets that never change neither drift nor end", () => {
  expect(retuneInterval(records(0.02, 0.02, 0.02), 0.1, 0.95)).toMatchObject({
    reason: "drift-not-distinguishable",
    expected_h: null,
  });
});

test("a limit that is reached already leaves no time", () => {
  expect(retuneInterval(records(0.08, 0.1, 0.12, 0.14), 0.1, 0.95)).toMatchObject({
    reason: "limit-already-reached",
    expected_h: 0,
    atConfidence_h: 0,
  });
});

test("fewer than three records, or records of one hour, have no slope with its uncertainty", () => {
  expect(retuneInterval(records(0.01, 0.02), 0.1, 0.95)).toMatchObject({ reason: "too-few-records" });
  const atOnce = [0.01, 0.02, 0.03].map((offset) => ({ time_h: 5, offset }));
  expect(retuneInterval(atOnce, 0.1, 0.95)).toMatchObject({
    reason: "records-at-one-time",
    slope_perHour: null,
  });
});
