import { describe, expect, it } from "vitest";
import { expectClose } from "../close-to.ts";
import { answerTo, errorsOf } from "../test-app.ts";
import { drive, otherStatementsOf, rodSet, toGround } from "./requests.ts";

const PATH = "/v1/mathieu-parameters";
const rods = rodSet(4, 1.2);
const APEX = { a: 0.236993993112474, q: 0.705996069713371 };

describe("POST /v1/mathieu-parameters", () => {
  it("gives a and q, however the voltages are stated", async () => {
    const found = (stated: object) =>
      answerTo(PATH, { find: "parameters", rodSet: rods, drive: stated, ions: [{ mz: 500 }] });
    const plain = await found(drive(831.55739482, 139.42457479));
    for (const stated of otherStatementsOf(831.55739482, 139.42457479))
      expectClose((await found(stated)).results, plain.results, 1e-14);
  });

  it("tells the rod offset from U where both pairs are stated against ground", async () => {
    const offsetOf = async (dc: object) => {
      const { rf } = drive(831.55739482, 139.42457479);
      return (
        await answerTo(PATH, { find: "parameters", rodSet: rods, drive: { rf, dc }, ions: [{ mz: 500 }] })
      ).rodOffset_V;
    };
    expect(await offsetOf({ pairX_V: 150, pairY_V: -130 })).toBe(10);
    expect(await offsetOf({ pairX_V: -130, pairY_V: 150 })).toBe(10);
    expect(await offsetOf({ volts: 140, between: "pole-and-ground" })).toBeNull();
  });

  // V = 7.2217 M f² r0² and U = 1.2121 M f² r0² (MHz, cm, pole-to-ground, zero-to-peak), recomputed from CODATA 2022;
  // handbooks print 7.219 and 1.212 (Dawson (ed.), 1976, from memory). The worked examples are rounded to 0.1 V.
  it.each([
    [1000, 1.0, 4.17, 1255.8, 210.8],
    [28, 2.0, 3.175, 81.5, 13.7],
  ])("gives the volts of the apex: m/z %d, %d MHz, r0 %d mm", async (mz, f, r0, v, u) => {
    const { results } = await answerTo(PATH, {
      find: "drive",
      rodSet: rodSet(r0, f),
      convention: toGround,
      points: [{ ion: { mz }, ...APEX }],
    });
    expect(Math.abs(results[0].drive.rf.volts - v)).toBeLessThanOrEqual(0.05);
    expect(Math.abs(results[0].drive.dc.volts - u)).toBeLessThanOrEqual(0.05);
  });

  it("comes back to where it started in every direction", async () => {
    const volts = drive(700, 100);
    const [{ a, q }] = (
      await answerTo(PATH, { find: "parameters", rodSet: rods, drive: volts, ions: [{ mz: 444 }] })
    ).results;
    const points = [{ ion: { mz: 444 }, q }];
    const found = await Promise.all([
      answerTo(PATH, { find: "drive", rodSet: rods, convention: toGround, points: [{ ...points[0], a }] }),
      answerTo(PATH, { find: "mz", rodSet: rods, drive: volts, q: [q] }),
      answerTo(PATH, { find: "frequency", fieldRadius_mm: 4, drive: volts, points }),
      answerTo(PATH, { find: "field-radius", frequency_MHz: 1.2, drive: volts, points }),
    ]);
    expectClose(
      found.map(({ results }) => results[0]),
      [
        { mz: 444, drive: volts, reason: null },
        { mz: 444, q, reason: null },
        { mz: 444, q, frequency_MHz: 1.2, reason: null },
        { mz: 444, q, fieldRadius_mm: 4, reason: null },
      ],
      1e-14,
    );
  });

  it.each([
    ["mz", { rodSet: rods, q: [0.7, 0] }, "mz"],
    [
      "frequency",
      {
        fieldRadius_mm: 4,
        points: [
          { ion: { mz: 5 }, q: 0.7 },
          { ion: { mz: 5 }, q: 0 },
        ],
      },
      "frequency_MHz",
    ],
    [
      "field-radius",
      {
        frequency_MHz: 1,
        points: [
          { ion: { mz: 5 }, q: 0.7 },
          { ion: { mz: 5 }, q: 0 },
        ],
      },
      "fieldRadius_mm",
    ],
  ])("says why there is no value: %s", async (find, rest, member) => {
    const withoutRf = await answerTo(PATH, { find, ...rest, drive: drive(0) });
    const withRf = await answerTo(PATH, { find, ...rest, drive: drive(100) });
    expect(withoutRf.find).toBe(find);
    expect(withoutRf.results.map((each: Record<string, unknown>) => [each[member], each.reason])).toEqual([
      [null, "no-rf"],
      [null, "no-rf"],
    ]);
    expect(withRf.results[1]).toMatchObject({ [member]: null, reason: "q-is-zero" });
    expect(withRf.results[0][member]).toBeGreaterThan(0);
  });

  it("gives no volts that a request could not state", async () => {
    const { results } = await answerTo(PATH, {
      find: "drive",
      rodSet: rodSet(50, 100),
      convention: toGround,
      points: [{ ion: { mz: 1e6 }, a: 1e6, q: 1e6 }],
    });
    expect(results).toEqual([{ mz: 1e6, drive: null, reason: "drive-out-of-range" }]);
  });

  it.each([
    [{ find: "a" }, [["/find", "not-one-of"]]],
    [{ rodSet: rods }, [["/find", "missing-member"]]],
    [
      { find: "mz", rodSet: rodSet(4, 1, { polePairs: 3 }), drive: drive(1), q: [1] },
      [["/rodSet/polePairs", "needs-two-pole-pairs"]],
    ],
    [
      {
        find: "frequency",
        fieldRadius_mm: 4,
        drive: drive(1),
        points: [{ ion: { formula: "C", adduct: "[M]+" }, q: 1 }],
      },
      [["/points/0/ion/formula", "formula-not-computed"]],
    ],
    [
      { find: "frequency", rodSet: rods, drive: drive(1), points: [{ ion: { mz: 5 }, q: 1 }] },
      [
        ["/fieldRadius_mm", "missing-member"],
        ["/rodSet", "unknown-member"],
      ],
    ],
  ])("refuses what cannot be answered (%#)", async (body, expected) => {
    expect(await errorsOf(PATH, body)).toEqual(expected);
  });
});
