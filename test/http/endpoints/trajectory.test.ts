import { describe, expect, it } from "vitest";
import { TRAJECTORIES } from "../../reference/trajectories.ts";
import { expectClose } from "../close-to.ts";
import { answerTo, ask, errorsOf, problemIn } from "../test-app.ts";
import { drive, rodSet } from "./requests.ts";

const PATH = "/v1/trajectory";
const start = { x_mm: 0.2, y_mm: -0.1, vx_mPerS: 100, vy_mPerS: 40, phase_deg: 30 };
/** Slow and near the axis: an ion that stays. */
const calm = { x_mm: 0.02, y_mm: -0.01, vx_mPerS: 1, vy_mPerS: 1, phase_deg: 30 };
const unitMass = drive(831.55739482, 139.42457479);
const flight = (more: object = {}) => ({
  rodSet: rodSet(4, 1.2),
  drive: unitMass,
  ion: { mz: 500 },
  start,
  residence: { rfCycles: 20 },
  samplesPerCycle: 4,
  ...more,
});
/** e/u in C/kg, CODATA 2022. */
const CHARGE_PER_MASS = 9.64853320218501e7;

describe("POST /v1/trajectory", () => {
  // Integrated with 30 digits in units of r0 and ξ (test/reference, trajectories).
  it.each(TRAJECTORIES.map((row) => ({ ...row })))(
    "a $a, q $q over $rfCycles cycles",
    async ({ a, q, phase, x, slopeX, y, slopeY, rfCycles, lost, end }) => {
      const [r0, f, mz] = [0.004, 1.2e6, 300];
      const perVolt = CHARGE_PER_MASS / (Math.PI * r0 * f) ** 2 / mz;
      const speed = Math.PI * f * r0;
      const found = await answerTo(
        PATH,
        flight({
          drive: drive(q / perVolt, a / (2 * perVolt)),
          ion: { mz },
          start: {
            x_mm: x * 4,
            y_mm: y * 4,
            vx_mPerS: slopeX * speed,
            vy_mPerS: slopeY * speed,
            phase_deg: (phase * 180) / Math.PI,
          },
          residence: { rfCycles },
        }),
      );
      expectClose([found.a, found.q], [a, q], 1e-12);
      expect(found.flight.lost?.to ?? null).toBe(lost?.to ?? null);
      if (lost !== null) expect(Math.abs(found.flight.lost.atCycle - lost.atCycle)).toBeLessThan(1e-9);
      const { x_mm, y_mm, vx_mPerS, vy_mPerS } = found.flight.end;
      for (const [index, value] of [x_mm / 4, vx_mPerS / speed, y_mm / 4, vy_mPerS / speed].entries()) {
        expect(Math.abs(value - end[index]!)).toBeLessThan(1e-9 * Math.max(1, Math.abs(end[index]!)));
      }
    },
  );

  it("samples equally, ends at the exit and stays inside its envelope", async () => {
    const { flight: found } = await answerTo(PATH, flight({ start: calm, residence: { flightTime_us: 10 } }));
    const { time_us, x_mm, y_mm } = found.samples;
    expect(found.rfCycles).toBeCloseTo(12, 10);
    expect([time_us.length, x_mm.length, y_mm.length]).toEqual([49, 49, 49]);
    expect(time_us[1]).toBeCloseTo(1 / 4.8, 12);
    expect(time_us.at(-1)).toBeCloseTo(10, 10);
    const { x, y } = found.envelope;
    expect(Math.max(...x_mm.map(Math.abs))).toBeLessThanOrEqual(x.largest_mm);
    expect(Math.max(...y_mm.map(Math.abs))).toBeLessThanOrEqual(y.largest_mm);
    expect(x.largestEver_mm).toBeGreaterThan(x.largest_mm);
    expect(y.largestEver_mm).toBeGreaterThan(y.largest_mm);
  });

  it("loses light ions to the x rods, heavy ones to the y rods, and passes the ion between", async () => {
    const beside = async (mz: number) =>
      (
        await answerTo(
          PATH,
          flight({ ion: { mz }, start: { ...start, vx_mPerS: 0 }, residence: { rfCycles: 900 } }),
        )
      ).flight;
    const light = await beside(495);
    const heavy = await beside(505);
    expect([light.lost.to, heavy.lost.to]).toEqual(["x", "y"]);
    expect(Math.abs(light.lost.x_mm)).toBeCloseTo(4, 10);
    expect(Math.abs(heavy.lost.y_mm)).toBeCloseTo(4, 10);
    expect(light.samples.x_mm.at(-1)).toBe(light.lost.x_mm);
    expect(light.envelope.x.largestEver_mm).toBeNull();
  });

  // DC and RF as sine and cosine alone: free flight, harmonic motion, handbook mechanics.
  it("flies straight without volts and swings harmonically with DC alone", async () => {
    const free = (await answerTo(PATH, flight({ drive: drive(0) }))).flight.end;
    expectClose([free.x_mm, free.vx_mPerS], [0.2 + (100 * 20) / 1.2e3, 100], 1e-12);
    const still = { x_mm: 1, y_mm: 0, vx_mPerS: 0, vy_mPerS: 0, phase_deg: 0 };
    const { end } = (await answerTo(PATH, flight({ drive: drive(0, 50), start: still }))).flight;
    const omega = Math.sqrt((2 * 50 * CHARGE_PER_MASS) / 500) / 0.004;
    expect(end.x_mm).toBeCloseTo(Math.cos((omega * 20) / 1.2e6), 9);
  });

  it("counts how long the rods are positive, and their largest voltage with the rod offset", async () => {
    const rf = { volts: 831.55739482, as: "zero-to-peak", between: "pole-and-ground" };
    const pairs = { rf, dc: { pairX_V: 149.42457479, pairY_V: -129.42457479 } };
    const { rods } = await answerTo(PATH, flight({ drive: pairs }));
    expect(rods.rodOffset_V).toBeCloseTo(10, 10);
    expectClose([rods.x.dcToGround_V, rods.y.dcToGround_V], [149.42457479, -129.42457479], 1e-12);
    expectClose(rods.x.peakToGround_V, 149.42457479 + 831.55739482, 1e-12);
    const plain = (await answerTo(PATH, flight())).rods;
    // Common saying of the trade, put right: 55.4 % of a cycle, not three quarters.
    expect((100 * plain.x.positiveShare).toFixed(1)).toBe("55.4");
    const negative = (await answerTo(PATH, flight({ ion: { mz: 500, charge: -1 } }))).rods;
    expect((100 * negative.x.positiveShare).toFixed(1)).toBe("44.6");
    const offset = (await answerTo(PATH, flight({ drive: pairs, ion: { mz: 500, charge: -1 } }))).rods;
    expectClose([offset.x.dcToGround_V, offset.y.dcToGround_V], [-129.42457479, 149.42457479], 1e-12);
  });

  it("moves a negative ion as a positive one, in a field of the other sign", async () => {
    const fieldAt = { x_mm: 1, y_mm: 2, phase_deg: 90 };
    const positive = await answerTo(PATH, flight({ fieldAt, ion: { mz: 500, charge: 2 } }));
    const negative = await answerTo(PATH, flight({ fieldAt, ion: { mz: 500, charge: -2 } }));
    expect(negative.flight).toEqual(positive.flight);
    expect(negative.fieldAt.fieldX_VPerM).toBe(-positive.fieldAt.fieldX_VPerM);
    expect(negative.fieldAt.forceX_N).toBe(positive.fieldAt.forceX_N);
    // At 90° the RF is zero: E = −2 U x/r0², F = 2 e E.
    const field = (-2 * 139.42457479 * 1e-3) / 0.004 ** 2;
    expectClose(positive.fieldAt.fieldX_VPerM, field, 1e-12);
    expectClose(positive.fieldAt.forceX_N, 2 * 1.602176634e-19 * field, 1e-12);
    expect((await answerTo(PATH, flight())).fieldAt).toBeNull();
  });

  it("answers above the apex, for RF alone and beyond the computed domain", async () => {
    const above = await answerTo(PATH, flight({ drive: drive(831.6, 145), residence: { rfCycles: 500 } }));
    expect(above.flight.lost).not.toBeNull();
    const rfOnly = await answerTo(PATH, flight({ drive: drive(300) }));
    expect(rfOnly.flight.lost).toBeNull();
    expectClose([rfOnly.rods.x.positiveShare, rfOnly.rods.x.dcToGround_V], [0.5, 0], 1e-15);
    const far = await answerTo(PATH, flight({ drive: drive(3000), ion: { mz: 1 } }));
    expect(far).toMatchObject({ flight: null, reason: "outside-computed-domain" });
  });

  it("counts samples, and a cycle as ten at least", async () => {
    const problem = problemIn(
      await ask(PATH, flight({ residence: { rfCycles: 30 }, samplesPerCycle: 1000 })),
    );
    expect(problem).toMatchObject({ code: "too-much-work" });
    expect(problem.detail).toContain("30001 samples");
    const long = problemIn(await ask(PATH, flight({ residence: { rfCycles: 1e7 }, samplesPerCycle: 1 })));
    expect(long.code).toBe("too-much-work");
    const most = await answerTo(
      PATH,
      flight({ start: calm, residence: { rfCycles: 199.9 }, samplesPerCycle: 100 }),
    );
    expect(most.flight.samples.x_mm.length).toBe(19_991);
  });

  it.each([
    [flight({ ion: { mz: 500, charge: 0 } }), [["/ion/charge", "charge-is-zero"]]],
    [flight({ residence: { axialEnergy_eVPerCharge: 2 } }), [["/rodSet/rodLength_mm", "missing-member"]]],
    [flight({ samplesPerCycle: 0 }), [["/samplesPerCycle", "out-of-range"]]],
    [flight({ start: { ...start, phase: 3 } }), [["/start/phase", "unknown-member"]]],
    [flight({ rodSet: rodSet(4, 1.2, { polePairs: 4 }) }), [["/rodSet/polePairs", "needs-two-pole-pairs"]]],
  ])("refuses what cannot be answered (%#)", async (body, expected) => {
    expect(await errorsOf(PATH, body)).toEqual(expected);
  });
});
