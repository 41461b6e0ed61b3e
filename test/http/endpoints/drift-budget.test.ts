import { describe, expect, it } from "vitest";
import { SCAN_AND_DRIFT } from "../../reference/scan-and-drift.ts";
import { STABILITY_REGIONS } from "../../reference/tables.ts";
import { expectClose } from "../close-to.ts";
import { answerTo, errorsOf } from "../test-app.ts";
import { drive, many, otherStatementsOf, rodSet } from "./requests.ts";

const PATH = "/v1/drift-budget";
const ofWidth = (mzCentre: number, value: number, more: object = {}) => ({
  mzCentre,
  width: { value, as: "mz", at: "edges" },
  ...more,
});
const APEX = Number(STABILITY_REGIONS.headline.region_I.apex_U_over_V);
const record = (time_h: number, offset: number) => ({ time_h, offset });

describe("POST /v1/drift-budget", () => {
  // Edges and derivatives with 40 digits (test/reference, scan-and-drift).
  it.each(SCAN_AND_DRIFT.drift)(
    "m/z %d, width %d",
    async (mz, width, ratio, _qLow, _qHigh, lowByRatio, highByRatio) => {
      const answer = await answerTo(PATH, ofWidth(mz, width));
      expectClose(answer.window.apexMargin_ppm, (1 - ratio / APEX) * 1e6, 1e-9);
      const low = ((mz - width / 2) * lowByRatio) / 1e6;
      const high = ((mz + width / 2) * highByRatio) / 1e6;
      expectClose(
        answer.sensitivities[3],
        { cause: "ratio", low, high, centre: (low + high) / 2, width: high - low },
        1e-12,
      );
      expect(answer).toMatchObject({ reason: null, budget: null, allowed: null, retune: null });
    },
  );

  // Common practice: m/z 1000 moves by 0.1 with 100 ppm of the volts or 50 ppm of f or r0 (recomputed).
  it("shifts m/z 1000 by 0.1 for a hundred ppm of the volts and for fifty of f and of r0", async () => {
    for (const tolerances of [{ amplitude_ppm: 100 }, { frequency_ppm: 50 }, { fieldRadius_ppm: 50 }]) {
      const { budget } = await answerTo(PATH, ofWidth(1000, 0.7, { tolerances }));
      expectClose([budget.worstCase.centre, budget.rootSumSquare.centre], [0.1, 0.1], 1e-12);
    }
  });

  it("finds the same budget by volts in any statement and with the DC reversed as by centre and width", async () => {
    const asked = { tolerances: { amplitude_ppm: 30, ratio_ppm: 20 }, limits: { edgeShift: 0.2 } };
    const byWidth = await answerTo(PATH, ofWidth(500, 0.7, asked));
    for (const stated of otherStatementsOf(831.55739482, 139.42457479)) {
      const byDrive = await answerTo(PATH, { rodSet: rodSet(4, 1.2), drive: stated, ...asked });
      expect(byDrive.reason).toBeNull();
      // The volts are stated with 11 digits, which leaves seven of the width.
      expectClose([byDrive.window.mzCentre, byDrive.window.mzWidth], [500, 0.7], 1e-7);
      expectClose(byDrive.budget.worstCase, byWidth.budget.worstCase, 1e-6);
      expectClose(byDrive.allowed, byWidth.allowed, 1e-6);
    }
  });

  it("says when the ratio's tolerance closes the window, and gives the exact width at both ends", async () => {
    const { window, budget } = await answerTo(PATH, ofWidth(1000, 0.7, { tolerances: { ratio_ppm: 600 } }));
    expect(window.apexMargin_ppm).toBeLessThan(600);
    expect(budget.widthAtRatioEnds.raised).toBeNull();
    expect(budget.widthAtRatioEnds.lowered).toBeGreaterThan(0.7);
    const small = (await answerTo(PATH, ofWidth(1000, 0.7, { tolerances: { ratio_ppm: 1 } }))).budget;
    expect(0.7 - small.widthAtRatioEnds.raised).toBeCloseTo(0.001328, 6);
  });

  it("gives tolerances that reach the limit when they are asked again", async () => {
    const limits = { centreShift: 0.05, widthChange: 0.04 };
    const { allowed } = await answerTo(PATH, ofWidth(609.2807, 0.7, { limits }));
    for (const { cause, alone_ppm, boundBy } of allowed) {
      const name = cause === "field-radius" ? "fieldRadius_ppm" : `${cause}_ppm`;
      const { budget } = await answerTo(PATH, ofWidth(609.2807, 0.7, { tolerances: { [name]: alone_ppm } }));
      const [reached, limit] =
        boundBy === "centreShift" ? [budget.worstCase.centre, 0.05] : [budget.worstCase.width, 0.04];
      expectClose(reached, limit, 1e-10);
    }
    expect(allowed.map(({ boundBy }: { boundBy: string }) => boundBy)).toEqual([
      "centreShift",
      "centreShift",
      "centreShift",
      "widthChange",
    ]);
  });

  it.each([
    ["no-rf", { rodSet: rodSet(4, 1.2), drive: drive(0, 10) }],
    ["no-dc", { rodSet: rodSet(4, 1.2), drive: drive(500) }],
    ["above-apex", { rodSet: rodSet(4, 1.2), drive: drive(500, 84) }],
    ["resolution-not-reachable", ofWidth(500, 1001)],
    [
      "width-height-needs-peak-profile",
      { mzCentre: 500, width: { value: 0.7, as: "mz", at: "half-height" } },
    ],
  ])("has no window, with a reason: %s", async (reason, body) => {
    const tune = { records: [record(0, 0), record(1, 0.01), record(2, 0.021)], limit: 0.1, confidence: 0.9 };
    const answer = await answerTo(PATH, { ...body, tolerances: { ratio_ppm: 5 }, tune });
    expect(answer).toMatchObject({ window: null, reason, sensitivities: [], budget: null, allowed: null });
    expect(answer.retune.expected_h).toBeGreaterThan(0);
  });

  it("answers at the ends of what may be asked", async () => {
    for (const [mz, width] of [
      [0.5, 0.9],
      [1e6, 10],
      [1e6, 1e-2],
    ] as const) {
      const { window, sensitivities } = await answerTo(PATH, ofWidth(mz, width));
      expect(window.mzWidth).toBe(width);
      expectClose(sensitivities[2].centre, mz / 1e6, 1e-12);
    }
  });

  it.each([
    [ofWidth(500, 0.7, { limits: {} }), [["/limits", "missing-member"]]],
    [ofWidth(500, 0.7, { tolerances: { ratio_ppm: -1 } }), [["/tolerances/ratio_ppm", "out-of-range"]]],
    [ofWidth(500, 0.7, { tolerances: { volts_ppm: 1 } }), [["/tolerances/volts_ppm", "unknown-member"]]],
    [
      ofWidth(500, 0.7, { tune: { records: many(1001, record(0, 0)), limit: 1, confidence: 0.9 } }),
      [["/tune/records", "wrong-count"]],
    ],
    [
      ofWidth(500, 0.7, { tune: { records: [record(0, 0)], limit: 1, confidence: 1 } }),
      [["/tune/confidence", "out-of-range"]],
    ],
    [
      { rodSet: rodSet(4, 1.2, { polePairs: 3 }), drive: drive(500, 80) },
      [["/rodSet/polePairs", "needs-two-pole-pairs"]],
    ],
  ])("refuses what cannot be answered (%#)", async (body, expected) => {
    expect(await errorsOf(PATH, body)).toEqual(expected);
  });
});
