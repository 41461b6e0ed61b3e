import { describe, expect, it } from "vitest";
import { CALIBRATION } from "../../reference/calibration.ts";
import { PASSBANDS } from "../../reference/tables.ts";
import { expectClose } from "../close-to.ts";
import { answerTo, errorsOf } from "../test-app.ts";
import { drive, many } from "./requests.ts";

const PATH = "/v1/mz-calibration";
const peak = (setMz: number, offset: number, more: object = {}) => ({
  setMz,
  observedMz: setMz + offset,
  ...more,
});
const calibration = (peaks: object[], more: object = {}) => ({
  peaks,
  positionDegree: 1,
  confidence: 0.95,
  ...more,
});
const FIVE = [peak(69, 0.02), peak(219, 0.04), peak(414, 0.05), peak(614, 0.08), peak(1066, 0.13)];

describe("POST /v1/mz-calibration", () => {
  // NIST StRD Pontius, certified values checked in exact arithmetic (test/reference, calibration); m/z as thousandths of its x.
  it("fits the NIST set Pontius as a quadratic", async () => {
    const { x, y, coefficients, standardUncertainties, residualStandardDeviation, influences } =
      CALIBRATION.sets.Pontius;
    const peaks = x.map((load, index) => peak(load / 1000, y[index]!));
    const { position, positionReason } = await answerTo(PATH, calibration(peaks, { positionDegree: 2 }));
    expect(positionReason).toBeNull();
    // observedMz − setMz loses digits of an offset beside an m/z of 3000: 5e-13 of 2e-4 of scatter.
    for (const [power, certified] of coefficients.entries()) {
      const scale = [1, 1e3, 1e6][power]!;
      expectClose(position.coefficients[power].value, certified * scale, 1e-8);
      expectClose(
        position.coefficients[power].standardUncertainty,
        standardUncertainties[power]! * scale,
        1e-8,
      );
    }
    expectClose(position.residualStandardDeviation, residualStandardDeviation, 1e-8);
    for (const [index, , leverage, , cookDistance] of influences) {
      expectClose(position.influences[index].leverage, leverage, 1e-10);
      expectClose(position.influences[index].cookDistance, cookDistance, 1e-6);
    }
  });

  it("names the bad peak: large residual, and the fit moves most without it", async () => {
    const peaks = [...FIVE.slice(0, 4), peak(1066, 0.35)];
    const { position } = await answerTo(PATH, calibration(peaks));
    expect(position.mostInfluential).toBe(4);
    expect(position.influences[4].cookDistance).toBeGreaterThan(4);
    const typed = [...FIVE.slice(0, 2), peak(414, 0.5), ...FIVE.slice(3)];
    const middle = (await answerTo(PATH, calibration(typed))).position;
    expect(Math.abs(middle.influences[2].studentizedResidual)).toBeGreaterThan(3);
  });

  it("predicts between the peaks, and marks what lies outside", async () => {
    const wanted = [69, 500, 1066, 20, 1500];
    const { predictions } = await answerTo(PATH, calibration(FIVE, { wanted }));
    const marks = predictions.map(({ extrapolated }: { extrapolated: boolean }) => extrapolated);
    expect(marks).toEqual([false, false, false, true, true]);
    for (const { setMz, offset, observedMz } of predictions) {
      expectClose(observedMz, setMz + offset.value, 1e-15);
      expectClose(offset.high - offset.value, offset.value - offset.low, 1e-9);
    }
    const spread = predictions.map(
      ({ offset }: { offset: { low: number; high: number } }) => offset.high - offset.low,
    );
    expect(spread[4]).toBeGreaterThan(spread[1]);
    const surer = await answerTo(PATH, calibration(FIVE, { wanted: [500], confidence: 0.99 }));
    // Student t with three degrees of freedom: 3.182 and 5.841 in printed tables (NIST/SEMATECH 1.3.6.7.2, from memory).
    const ratio = (surer.predictions[0].offset.high - surer.predictions[0].offset.value) / (spread[1] / 2);
    expect(ratio).toBeCloseTo(5.841 / 3.182, 3);
  });

  it("weighs peaks by sigma, against each other only", async () => {
    const sigma = (value: number) =>
      FIVE.map((one, index) => ({ ...one, sigma: index === 0 ? value * 3 : value }));
    const small = await answerTo(PATH, calibration(sigma(0.01), { wanted: [500] }));
    const large = await answerTo(PATH, calibration(sigma(0.02), { wanted: [500] }));
    expectClose(large.position.coefficients, small.position.coefficients, 1e-12);
    expectClose(large.predictions[0].offset, small.predictions[0].offset, 1e-9);
    expectClose(
      large.position.residualStandardDeviation * 2,
      small.position.residualStandardDeviation,
      1e-12,
    );
    expect(small.position.coefficients).not.toEqual(
      (await answerTo(PATH, calibration(FIVE))).position.coefficients,
    );
  });

  it("fits the widths of the peaks that state one, by resolution too, but not across heights", async () => {
    const at = (value: number, as: string, height: string) => ({ width: { value, as, at: height } });
    const peaks = [
      peak(100, 0, at(0.5, "mz", "half-height")),
      peak(300, 0.01),
      peak(500, 0, at(1000, "resolution", "half-height")),
      peak(900, 0, at(0.5, "mz", "half-height")),
    ];
    const { width, widthAt, predictions } = await answerTo(PATH, calibration(peaks, { wanted: [700] }));
    expect(widthAt).toBe("half-height");
    expect(width.influences.map(({ peak: index }: { peak: number }) => index)).toEqual([0, 2, 3]);
    expectClose(predictions[0].width.value, 0.5, 1e-12);
    const mixed = [...peaks.slice(0, 3), peak(900, 0, at(0.5, "mz", "edges"))];
    expect(await answerTo(PATH, calibration(mixed))).toMatchObject({
      width: null,
      widthReason: "widths-at-different-heights",
      widthAt: null,
    });
  });

  // Volts, frequency and centre computed with 50 digits (test/reference, passbands).
  it("gives back the field radius of volts and centre", async () => {
    for (const [r0, f, dc, rf, , , , , , centre] of PASSBANDS.settings.slice(0, 12)) {
      const peaks = [{ setMz: centre, observedMz: centre, drive: drive(rf, dc) }, peak(centre / 2, 0)];
      const { effectiveFieldRadius } = await answerTo(PATH, calibration(peaks, { frequency_MHz: f / 1e6 }));
      expectClose(effectiveFieldRadius.mean_mm, r0 * 1e3, 1e-12);
      expect(effectiveFieldRadius).toMatchObject({
        standardDeviation_mm: null,
        peaks: [{ peak: 0, reason: null }],
      });
    }
  });

  it("has no field radius where the volts open no window", async () => {
    const peaks = [
      ...FIVE.slice(0, 3),
      { ...FIVE[3], drive: drive(800) },
      { ...FIVE[4], drive: drive(800, 200) },
    ];
    const { effectiveFieldRadius } = await answerTo(PATH, calibration(peaks, { frequency_MHz: 1 }));
    expect(effectiveFieldRadius).toEqual({
      mean_mm: null,
      standardDeviation_mm: null,
      peaks: [3, 4].map((index) => ({ peak: index, fieldRadius_mm: null, reason: "no-window" })),
    });
  });

  it.each([
    ["too-few-points", [peak(500, 0.1)], 1],
    ["too-few-points", [peak(500, 0.1), peak(600, 0.1)], 2],
    ["too-few-different-points", [peak(500, 0.1), peak(500, 0.2), peak(500, 0.3)], 1],
  ])("has no line, with a reason: %s", async (reason, peaks, positionDegree) => {
    const answer = await answerTo(PATH, calibration(peaks, { positionDegree, wanted: [500] }));
    expect(answer).toMatchObject({ position: null, positionReason: reason, widthReason: "too-few-points" });
    expect(answer.predictions[0]).toMatchObject({ offset: null, observedMz: null, width: null });
  });

  it("has a line but no uncertainty through as many peaks as coefficients", async () => {
    const answer = await answerTo(PATH, calibration([FIVE[0]!, FIVE[4]!], { wanted: [500] }));
    expect(answer.position).toMatchObject({
      degreesOfFreedom: 0,
      residualStandardDeviation: null,
      mostInfluential: null,
    });
    expect(answer.predictions[0].offset).toMatchObject({ standardUncertainty: null, low: null, high: null });
  });

  it.each([
    [calibration([]), [["/peaks", "wrong-count"]]],
    [calibration(many(201, peak(5, 0))), [["/peaks", "wrong-count"]]],
    [calibration([{ ...FIVE[0], sigma: 0.1 }, ...FIVE.slice(1, 2)]), [["/peaks/1/sigma", "missing-member"]]],
    [calibration([{ ...FIVE[0], drive: drive(800, 100) }]), [["/frequency_MHz", "missing-member"]]],
    [calibration(FIVE, { positionDegree: 3 }), [["/positionDegree", "out-of-range"]]],
    [calibration(FIVE, { confidence: 0.3 }), [["/confidence", "out-of-range"]]],
  ])("refuses what cannot be answered (%#)", async (body, expected) => {
    expect(await errorsOf(PATH, body)).toEqual(expected);
  });
});
