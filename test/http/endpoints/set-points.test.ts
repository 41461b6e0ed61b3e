import { describe, expect, it } from "vitest";
import {
  DUTY_CYCLE_FILTERS,
  LARGEST_DUTY_CYCLE,
  SQUARE_WAVE_APEX,
} from "../../reference/rectangular-waves.ts";
import { SECOND_REGION, THIRD_REGION_CORNERS } from "../../reference/worked-examples.ts";
import { expectClose } from "../close-to.ts";
import { answerTo, ask, errorsOf, problemIn } from "../test-app.ts";
import { drive, many, rodSet, toGround, wave } from "./requests.ts";

const PATH = "/v1/set-points";
const target = (mz: number, value: number, as = "mz", at = "edges") => ({
  ion: { mz },
  width: { value, as, at },
});
const request = (targets: object[], more: object = {}) => ({
  rodSet: rodSet(4, 1.2),
  convention: toGround,
  targets,
  ...more,
});

describe("POST /v1/set-points", () => {
  // Independent computation at 50 digits (test/reference, passbands), read backwards: centre and width give U and V.
  it.each([
    [4, 0.65, 461.8435490225317, 11.546087926966488, 36.8263159, 223.590273],
    [2.5, 0.8, 1793.4467191311437, 2.5620659398056524, 86.8204171, 517.826315],
    [7, 1.5, 27.756724840913602, 17.321263297000563, 16.7200906, 167.200906],
  ])("finds the volts: r0 %d mm, %d MHz, m/z %d, width %d", async (r0, f, mz, width, u, v) => {
    const { results } = await answerTo(PATH, request([target(mz, width)], { rodSet: rodSet(r0, f) }));
    expectClose([results[0].drive.dc.volts, results[0].drive.rf.volts], [u, v], 1e-11);
    expect(results[0].reason).toBeNull();
  });

  it("answers in the convention of the request", async () => {
    const plain = (await answerTo(PATH, request([target(500, 0.7)]))).results[0].drive;
    const convention = {
      rf: { as: "peak-to-peak", between: "pole-and-pole" },
      dc: { between: "pole-and-pole" },
    };
    const { drive } = (await answerTo(PATH, request([target(500, 0.7)], { convention }))).results[0];
    expect(drive).toEqual({
      rf: { volts: plain.rf.volts * 4, as: "peak-to-peak", between: "pole-and-pole" },
      dc: { volts: plain.dc.volts * 2, between: "pole-and-pole" },
    });
  });

  it("gives a drive that the passband of the same volts confirms", async () => {
    for (const [mz, width] of [
      [28, 0.5],
      [609.2807, 0.7],
      [2000, 3],
    ] as const) {
      const [{ drive, passband }] = (await answerTo(PATH, request([target(mz, width)]))).results;
      const { passbands } = await answerTo("/v1/passband", { rodSet: rodSet(4, 1.2), drive });
      expect(passbands[0]).toEqual(passband);
      expectClose([passband.mzCentre, passband.mzWidth], [mz, width], 1e-9);
    }
  });

  it.each([
    ["width-height-needs-peak-profile", target(500, 0.7, "mz", "half-height")],
    ["width-height-needs-peak-profile", target(500, 700, "resolution", "tenth-height")],
    ["resolution-not-reachable", target(500, 0.5, "resolution")],
    ["resolution-not-reachable", target(0.5, 1e6)],
  ])("has no drive, with a reason: %s", async (reason, wanted) => {
    const { results } = await answerTo(PATH, request([wanted, target(500, 0.7)]));
    const nothing = { drive: null, frequency_MHz: null, dutyCycle: null, a: null, q: null, passband: null };
    expect(results[0]).toEqual({ mz: wanted.ion.mz, reason, ...nothing });
    expect(results[1].reason).toBeNull();
  });

  it("gives no volts that a request could not state", async () => {
    const { results } = await answerTo(PATH, request([target(1e6, 1)], { rodSet: rodSet(50, 100) }));
    expect(results[0]).toMatchObject({ drive: null, reason: "drive-out-of-range" });
    expectClose(results[0].passband.mzCentre, 1e6, 1e-9);
  });

  it.each([
    [request([]), [["/targets", "wrong-count"]]],
    [request(many(1001, target(5, 1))), [["/targets", "wrong-count"]]],
    [request([target(500, 0.7)], { region: "any" }), [["/region", "not-one-of"]]],
    [
      request([target(500, 0.7)], { region: "second", rodSet: rodSet(4, 1.2, { waveform: wave(0.5) }) }),
      [["/region", "region-not-computed"]],
    ],
    [request([target(500, 0.7)], { solveFor: "frequency" }), [["/rf", "missing-member"]]],
    [request([target(500, 0.7)], { rf: drive(500).rf }), [["/rf", "member-not-taken"]]],
    [
      request([target(500, 0.7)], { solveFor: "frequency", rf: drive(0).rf }),
      [["/rf/volts", "out-of-range"]],
    ],
    [request([target(500, 0.7)], { widthBy: "duty-cycle" }), [["/widthBy", "member-not-taken"]]],
    [
      request([target(500, 0.7)], {
        widthBy: "duty-cycle",
        rodSet: rodSet(4, 1.2, { waveform: wave(0.5, "ac") }),
      }),
      [["/widthBy", "member-not-taken"]],
    ],
    [
      request([target(500, 0.7)], {
        widthBy: "duty-cycle",
        tip: "low-ratio",
        rodSet: rodSet(4, 1.2, { waveform: wave(0.5) }),
      }),
      [["/tip", "member-not-taken"]],
    ],
    [
      request([target(500, 0.7)], { residence: { axialEnergy_eVPerCharge: 1 } }),
      [["/rodSet/rodLength_mm", "missing-member"]],
    ],
    [
      request([{ ...target(500, 0.7), ion: { mz: 500, charge: 0 } }]),
      [["/targets/0/ion/charge", "charge-is-zero"]],
    ],
    [
      request([target(500, 0.7)], { convention: { rf: { as: "rms" }, dc: { between: "pole-and-pole" } } }),
      [["/convention/rf/between", "missing-member"]],
    ],
  ])("refuses what cannot be answered (%#)", async (body, expected) => {
    expect(await errorsOf(PATH, body)).toEqual(expected);
  });
});

describe("POST /v1/set-points in other regions", () => {
  it("leads to the corners of the third region: the usual tip unless the other is asked for", async () => {
    // Du, Olney and Douglas 1997, recomputed to five decimals; at R = 1e5 the window lies within 1e-4 of its tip.
    const [usual, other] = THIRD_REGION_CORNERS;
    for (const [more, corner] of [
      [{}, usual],
      [{ tip: "high-ratio" }, usual],
      [{ tip: "low-ratio" }, other],
    ] as const) {
      const asked = request([target(56, 1e5, "resolution")], { region: "third", ...more });
      const [{ a, q, passband }] = (await answerTo(PATH, asked)).results;
      expect(Math.abs(a - corner.a)).toBeLessThan(1e-4);
      expect(Math.abs(q - corner.q)).toBeLessThan(1e-4);
      expect(passband.region).toBe("third");
    }
  });

  it("gives drives that the passband of the same volts confirms, by volts and by frequency", async () => {
    for (const region of ["second", "third"]) {
      for (const more of [{}, { solveFor: "frequency", rf: drive(700).rf }]) {
        const asked = request([target(40, 300, "resolution")], { region, ...more });
        const [{ drive: solved, frequency_MHz, passband }] = (await answerTo(PATH, asked)).results;
        const answer = await answerTo("/v1/passband", {
          rodSet: rodSet(4, frequency_MHz),
          drive: solved,
          region,
        });
        expectClose(answer.passbands, [passband], 1e-12);
        expectClose([passband.mzCentre, passband.resolution], [40, 300], 1e-9);
      }
    }
  });

  it("has no window wider than that of the second region at a = 0, and one tip under two names", async () => {
    // Dawson and Bingqi 1984, recomputed: R 114 at a = 0.
    const wide = await answerTo(PATH, request([target(40, 114, "resolution")], { region: "second" }));
    expect(wide.results[0].reason).toBe("resolution-not-reachable");
    const narrow = request([target(40, 1e5, "resolution")], { region: "second" });
    const [high] = (await answerTo(PATH, narrow)).results;
    expect(high.q).toBeCloseTo(SECOND_REGION.apexQ, 4);
    expect(high.a).toBeCloseTo(SECOND_REGION.apexA, 4);
    const [low] = (await answerTo(PATH, { ...narrow, tip: "low-ratio" })).results;
    expect(low).toEqual(high);
  });

  it("finds the frequency at kept volts for a sinusoid: a quarter of the m/z, twice the frequency", async () => {
    const asked = request([target(400, 300, "resolution"), target(100, 300, "resolution")], {
      solveFor: "frequency",
      rf: drive(700).rf,
    });
    const [heavy, light] = (await answerTo(PATH, asked)).results;
    expectClose(light.frequency_MHz, 2 * heavy.frequency_MHz, 1e-14);
    expect(light.drive).toEqual(heavy.drive);
    expect(heavy.drive.rf).toEqual(drive(700).rf);
    const slow = request([target(1e6, 300, "resolution")], { solveFor: "frequency", rf: drive(1e-6).rf });
    expect((await answerTo(PATH, slow)).results[0]).toMatchObject({
      drive: null,
      reason: "frequency-out-of-range",
    });
  });
});

describe("POST /v1/set-points of a rectangular wave", () => {
  const closed = DUTY_CYCLE_FILTERS.filter(({ stable, mz_high }) => stable && mz_high !== null);

  it.each(closed)("finds duty cycle, volts and frequency: $duty", async (row) => {
    // 50-digit matrix products (test/reference, rectangular waves among the passbands), read backwards.
    const [low, high] = [row.mz_low!, row.mz_high!];
    const targets = [target((low + high) / 2, high - low)];
    const waveform = wave(0.5);
    const byVolts = request(targets, {
      rodSet: rodSet(row.r0_m * 1e3, row.f_Hz / 1e6, { waveform }),
      widthBy: "duty-cycle",
    });
    const [volts] = (await answerTo(PATH, byVolts)).results;
    expectClose([volts.dutyCycle, volts.drive.rf.volts], [row.duty, row.V_V], 1e-12);
    expect(volts.drive.dc.volts).toBe(0);
    const byFrequency = request(targets, {
      rodSet: rodSet(row.r0_m * 1e3, 7, { waveform }),
      widthBy: "duty-cycle",
      solveFor: "frequency",
      rf: { volts: row.V_V, as: "rms", between: "pole-and-ground" },
    });
    const [frequency] = (await answerTo(PATH, byFrequency)).results;
    expectClose([frequency.dutyCycle, frequency.frequency_MHz], [row.duty, row.f_Hz / 1e6], 1e-12);
  });

  it("closes at the apex of the square wave, and at the largest duty cycle without DC", async () => {
    const square = rodSet(4, 1.2, { waveform: wave(0.5) });
    const narrow = request([target(100, 1e6, "resolution")], { rodSet: square });
    const [byDc] = (await answerTo(PATH, narrow)).results;
    // Konenkov, Sudakov and Douglas 2002, recomputed.
    expect(byDc.q).toBeCloseTo(SQUARE_WAVE_APEX.q, 5);
    expect(byDc.a).toBeCloseTo(SQUARE_WAVE_APEX.a, 5);
    const [byDuty] = (await answerTo(PATH, { ...narrow, widthBy: "duty-cycle" })).results;
    expect(byDuty.dutyCycle).toBeCloseTo(LARGEST_DUTY_CYCLE.dutyCycle, 5);
    expect(byDuty.q).toBeCloseTo(LARGEST_DUTY_CYCLE.q, 5);
  });

  it("needs DC against the wave for a window wider than that of the duty cycle alone, and says so", async () => {
    // At duty cycle 0.61 the wave alone gives R 41 (recomputed).
    const uneven = rodSet(4, 1.2, { waveform: wave(0.61) });
    const asked = request([target(500, 35, "resolution"), target(500, 45, "resolution")], { rodSet: uneven });
    const [wide, narrow] = (await answerTo(PATH, asked)).results;
    expect(wide).toMatchObject({ drive: null, reason: "needs-reversed-dc" });
    expect(narrow.reason).toBeNull();
    const exchanged = rodSet(4, 1.2, { waveform: wave(0.39) });
    const again = request([target(500, 35, "resolution")], { rodSet: exchanged, tip: "low-ratio" });
    const [found] = (await answerTo(PATH, again)).results;
    expectClose([found.passband.mzCentre, found.passband.resolution], [500, 35], 1e-12);
    expect([found.passband.low.lostTo, found.passband.high.lostTo]).toEqual(["y", "x"]);
  });

  it("counts twenty-fold against the limit of work", async () => {
    const square = rodSet(4, 1.2, { waveform: wave(0.5) });
    const asked = (count: number) =>
      request(many(count, target(500, 300, "resolution")), { rodSet: square, widthBy: "duty-cycle" });
    expect((await answerTo(PATH, asked(50))).results).toHaveLength(50);
    const response = await ask(PATH, asked(51));
    expect(problemIn(response)).toMatchObject({ status: 422, code: "too-much-work" });
  });
});
