import { describe, expect, it } from "vitest";
import { beamOf, REFERENCE_PEAKS } from "../../physics/transmission/reference-peaks.ts";
import { expectClose } from "../close-to.ts";
import { answerTo, ask, errorsOf, problemIn } from "../test-app.ts";
import { drive, otherStatementsOf, rodSet, wave } from "./requests.ts";

const PATH = "/v1/peak-profile";

/** A window of 0.70 at m/z 500 (test/reference/transmission_public.json, setting p1: U, V, beam and 80 RF cycles). */
const [U, V] = [139.42457479, 831.55739482];
const beam = { sigma_mm: 0.4, meanRadialEnergy_eVPerCharge: 0.1 };
const request = (more: object = {}) => ({
  rodSet: rodSet(4, 1.2),
  drive: drive(V, U),
  residence: { rfCycles: 80 },
  beam,
  mz: { values: [500] },
  ...more,
});

describe("POST /v1/peak-profile", () => {
  it.each(REFERENCE_PEAKS.map((setting) => ({ ...setting })))(
    "agrees with the independent polygon integral of setting $id within the bound it states",
    async (setting) => {
      const { sigmaX, sigmaY, sigmaVx, sigmaVy } = beamOf(setting);
      const { points, peak, method } = await answerTo(PATH, {
        rodSet: rodSet(setting.r0_m * 1e3, setting.f_Hz / 1e6),
        drive: drive(setting.V_V, setting.U_V),
        residence: { rfCycles: setting.rf_cycles },
        beam: {
          sigmaX_mm: sigmaX * 1e3,
          sigmaY_mm: sigmaY * 1e3,
          sigmaVx_mPerS: sigmaVx,
          sigmaVy_mPerS: sigmaVy,
        },
        mz: { values: setting.points.map(([mz]) => mz) },
      });
      expect(method.errorBound).toBeLessThanOrEqual(1e-3);
      let highest = 0;
      setting.points.forEach(([mz, , , , , integral], index) => {
        expect(points[index]).toMatchObject({ mz, reason: null });
        expect(Math.abs(points[index].transmission - integral!), `m/z ${mz}`).toBeLessThanOrEqual(
          method.errorBound,
        );
        highest = Math.max(highest, integral!);
      });
      // The maximum lies between two points of the table, so it is at least as high as they are.
      expect(peak.transmission).toBeGreaterThan(highest * (1 - 2e-3));
      expect(peak.transmission).toBeLessThan(highest * 1.02);
      for (const [flanks, share] of [
        [peak.halfHeight, 0.5],
        [peak.tenthHeight, 0.1],
      ] as const) {
        const level = share * peak.transmission;
        const outside = setting.points.filter(([mz]) => mz! < flanks.mzLow || mz! > flanks.mzHigh);
        for (const [, , , , , integral] of outside) expect(integral).toBeLessThan(level * 1.01);
      }
    },
  );

  it("gives both widths, the flanks and how far they lie from the middle of the edges", async () => {
    const { peak, peakReason } = await answerTo(PATH, request());
    expect(peakReason).toBeNull();
    // The table of setting p1 crosses half height at 499.67..499.77 and 500.23..500.33, a tenth at 499.48..499.58 and 500.66..500.94.
    expect(peak.widthHalfHeight).toBeGreaterThan(500.2344 - 499.7656);
    expect(peak.widthHalfHeight).toBeLessThan(500.3281 - 499.6719);
    expect(peak.widthTenthHeight).toBeGreaterThan(500.6562 - 499.5781);
    expect(peak.widthTenthHeight).toBeLessThan(500.9375 - 499.4844);
    // Edges of setting p1, and what follows from them.
    expectClose([peak.edges.mzLow, peak.edges.mzHigh], [499.65000000517057, 500.34999998795803], 1e-10);
    for (const [flanks, width] of [
      [peak.halfHeight, peak.widthHalfHeight],
      [peak.tenthHeight, peak.widthTenthHeight],
    ]) {
      expect(flanks.mzHigh - flanks.mzLow).toBeCloseTo(width, 9);
      expect((flanks.mzHigh + flanks.mzLow) / 2 - peak.edges.mzCentre).toBeCloseTo(flanks.shiftFromCentre, 9);
    }
    expect(peak.mz - peak.edges.mzCentre).toBeCloseTo(peak.shiftFromCentre, 9);
  });

  it("takes a range with both ends, and reads every way to state the same drive alike", async () => {
    const mz = { from: 499.6, to: 500.4, points: 5 };
    const { points } = await answerTo(PATH, request({ mz, findPeak: false }));
    expectClose(
      points.map((point: { mz: number }) => point.mz),
      [499.6, 499.8, 500, 500.2, 500.4],
      1e-12,
    );
    for (const stated of otherStatementsOf(V, U)) {
      const other = await answerTo(PATH, request({ mz, drive: stated, findPeak: false }));
      expectClose(other.points, points, 1e-7);
    }
  });

  it("gives ions of one radial energy the velocities of their own mass", async () => {
    // σ_v = √(E e/m): at four times the mass half the velocity; 0.1 eV at m/z 500 is 138.914 m/s (setting p1).
    const byAxes = (mz: number) => {
      const velocity = 138.914 * Math.sqrt(500 / mz);
      return { sigmaX_mm: 0.4, sigmaY_mm: 0.4, sigmaVx_mPerS: velocity, sigmaVy_mPerS: velocity };
    };
    const rfOnly = { drive: drive(300), findPeak: false };
    const byEnergy = await answerTo(PATH, request({ ...rfOnly, mz: { values: [500, 2000] } }));
    for (const [index, mz] of [500, 2000].entries()) {
      const { points } = await answerTo(PATH, request({ ...rfOnly, beam: byAxes(mz), mz: { values: [mz] } }));
      expectClose(byEnergy.points[index].transmission, points[0].transmission, 1e-5);
    }
  });

  it("agrees between a peak and a point at the top of it, for a light ion whose velocity depends much on m/z", async () => {
    // A window of about 1.0 at m/z 4: V = 7.2217 M f² r0² (MHz, cm), U/V = 0.16784 − 0.1264/R (Dawson 1976).
    const light = request({ drive: drive(6.656, 0.92), residence: { rfCycles: 20 } });
    const { peak } = await answerTo(PATH, light);
    const top = { values: [peak.mz, peak.halfHeight.mzLow, peak.halfHeight.mzHigh] };
    const { points } = await answerTo(PATH, { ...light, mz: top, accuracy: 1e-4, findPeak: false });
    expect(points[0].transmission / peak.transmission).toBeCloseTo(1, 2);
    expect(points[1].transmission / peak.transmission).toBeCloseTo(0.5, 2);
    expect(points[2].transmission / peak.transmission).toBeCloseTo(0.5, 2);
  });

  it("lowers the peak while the window moves during the flight", async () => {
    // Computed elsewhere: at N = 228 a shift of half the width costs 18 % of the height, for a beam that is not stated.
    const flight = { residence: { rfCycles: 228 }, accuracy: 1e-2 };
    const still = await answerTo(PATH, request(flight));
    const flightTime = 228 / 1.2e6;
    const moving = await answerTo(PATH, request({ ...flight, scanRate_mzPerS: (0.5 * 0.7) / flightTime }));
    const loss = 1 - moving.peak.transmission / still.peak.transmission;
    expect(loss).toBeGreaterThan(0.13);
    expect(loss).toBeLessThan(0.24);
  });

  it.each([
    ["no-upper-edge", { drive: drive(V) }],
    ["above-apex", { drive: drive(V, 141) }],
    ["no-rf", { drive: drive(0, 10) }],
    ["not-asked-for", { findPeak: false }],
    [
      "nothing-passes",
      { drive: drive(V, 139.5693), residence: { rfCycles: 150 }, beam: { ...beam, sigma_mm: 50 } },
    ],
    ["no-maximum-near-the-window", { residence: { rfCycles: 0.5 } }],
  ])("answers that there is no peak: %s", async (peakReason, more) => {
    const answer = await answerTo(PATH, request(more));
    expect(answer).toMatchObject({ peak: null, peakReason });
  });

  it.each([
    ["outside-computed-domain", { mz: { values: [0.5] } }],
    ["dc-not-below-rf", { drive: drive(V, V) }],
    ["dc-not-below-rf", { drive: drive(0) }],
    ["no-window-to-scan", { drive: drive(V), scanRate_mzPerS: 1000 }],
  ])("answers that a point has no value: %s", async (reason, more) => {
    const { points, method } = await answerTo(PATH, request({ ...more, findPeak: false }));
    expect(points).toEqual([expect.objectContaining({ transmission: null, reason })]);
    expect(method).toBeNull();
  });

  it.each([
    [{ rodSet: rodSet(4, 1.2, { waveform: wave(0.5) }) }, [["/rodSet/waveform", "waveform-not-computed"]]],
    [{ rodSet: rodSet(4, 1.2, { polePairs: 3 }) }, [["/rodSet/polePairs", "needs-two-pole-pairs"]]],
    [{ residence: { axialEnergy_eVPerCharge: 2 } }, [["/rodSet/rodLength_mm", "missing-member"]]],
    [{ mz: { from: 500, to: 500, points: 3 } }, [["/mz/to", "not-above"]]],
    [{ mz: { from: 499, to: 501, points: 1 } }, [["/mz/points", "out-of-range"]]],
    [{ mz: { values: [] } }, [["/mz/values", "wrong-count"]]],
    [{ accuracy: 1e-6 }, [["/accuracy", "out-of-range"]]],
    [{ beam: { ...beam, sigma_mm: 0 } }, [["/beam/sigma_mm", "out-of-range"]]],
    [{ scanRate: 1000 }, [["/scanRate", "unknown-member"]]],
  ])("refuses what cannot be answered (%#)", async (more, expected) => {
    expect(await errorsOf(PATH, request(more))).toEqual(expected);
  });

  it("counts RF cycles, accuracy, scan and peak as work, and refuses too much of it", async () => {
    const tooMuch = async (more: object) => {
      const problem = problemIn(await ask(PATH, request(more)));
      expect(problem).toMatchObject({ status: 422, code: "too-much-work" });
      expect(problem.detail).toContain("RF cycles of work; one request may ask for 25000.");
    };
    const range = (points: number) => ({ mz: { from: 499, to: 501, points } });
    await tooMuch({ residence: { rfCycles: 1e6 }, findPeak: false });
    await tooMuch({ ...range(1000), findPeak: false });
    await tooMuch({ ...range(60), accuracy: 1e-5 });
    await tooMuch({ residence: { rfCycles: 400 }, scanRate_mzPerS: 1 });
    await answerTo(PATH, request({ residence: { rfCycles: 400 }, accuracy: 1e-2 }));
    await answerTo(PATH, request({ ...range(100), findPeak: false }));
  });
});
