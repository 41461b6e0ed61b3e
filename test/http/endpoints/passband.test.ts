import { describe, expect, it } from "vitest";
import { expectClose } from "../close-to.ts";
import { answerTo, errorsOf } from "../test-app.ts";
import { drive, otherStatementsOf, rodSet } from "./requests.ts";

const PATH = "/v1/passband";

// Independent computation at 50 digits (test/reference, passbands): r0 in mm, f in MHz, U, V, edges, resolution.
const SETTINGS = [
  [7, 1.5, 16.7200906, 167.200906, 19.09609319241332, 36.41735648941388, 1.6024653840185028],
  [4, 0.65, 36.8263159, 223.590273, 456.07050505904846, 467.61659298601495, 40.00000276664031],
  [2.5, 0.8, 86.8204171, 517.826315, 1792.1656861612407, 1794.7277521010465, 700.0002190682052],
  [2, 2.5, 11.2395956, 66.9814664, 37.0979020072791, 37.11026999718408, 3000.009402278943],
] as const;

describe("POST /v1/passband of a drive", () => {
  it.each(SETTINGS)(
    "finds the edges: r0 %d mm, %d MHz, U %d V, V %d V",
    async (r0, f, u, v, mzLow, mzHigh, resolution) => {
      const { passbands, reason, dcToRfRatio } = await answerTo(PATH, {
        rodSet: rodSet(r0, f),
        drive: drive(v, u),
      });
      expect(reason).toBeNull();
      const [{ low, high, ...found }] = passbands;
      expectClose([found.mzLow, found.mzHigh], [mzLow, mzHigh], 1e-10);
      // The reference's resolution is a quotient of rounded edges: it holds 1e-10 times the resolution.
      expectClose(found.resolution, resolution, 1e-10 * resolution);
      expectClose([low.a / low.q, high.a / high.q], [2 * dcToRfRatio, 2 * dcToRfRatio], 1e-14);
      expect([low.lostTo, high.lostTo]).toEqual(["x", "y"]);
    },
  );

  it("has no upper edge without DC", async () => {
    const { passbands, dcToRfRatio } = await answerTo(PATH, { rodSet: rodSet(3, 1), drive: drive(974.14) });
    expect(dcToRfRatio).toBe(0);
    expect(passbands[0]).toMatchObject({
      mzHigh: null,
      mzCentre: null,
      mzWidth: null,
      resolution: null,
      high: null,
    });
    // Independent computation at 50 digits (test/reference, rods without DC).
    expectClose(passbands[0].mzLow, 1165.2856764818714, 1e-12);
  });

  it.each([
    ["above-apex", drive(500, 83.925), 0.16785],
    ["above-apex", drive(500, 90), 0.18],
    ["no-rf", drive(0, 90), null],
    ["no-rf", drive(0), null],
  ])("is empty with a reason: %s", async (reason, volts, ratio) => {
    const answer = await answerTo(PATH, { rodSet: rodSet(4, 1.2), drive: volts });
    expect(answer).toMatchObject({ passbands: [], reason, dcToRfRatio: ratio });
  });

  it("answers the same however the voltages are stated", async () => {
    const plain = await answerTo(PATH, { rodSet: rodSet(4, 1.2), drive: drive(831.5, 139) });
    for (const stated of otherStatementsOf(831.5, 139)) {
      expectClose(await answerTo(PATH, { rodSet: rodSet(4, 1.2), drive: stated }), plain, 1e-11);
    }
  });

  it.each([
    [{ rodSet: rodSet(4, 1), drive: drive(1), region: "second" }, [["/region", "region-not-computed"]]],
    [
      { rodSet: rodSet(4, 1, { polePairs: 4 }), drive: drive(1), region: "any" },
      [
        ["/rodSet/polePairs", "needs-two-pole-pairs"],
        ["/region", "region-not-computed"],
      ],
    ],
    [{ rodSet: rodSet(4, 1), drive: drive(1), region: "fourth" }, [["/region", "not-one-of"]]],
    [{ rodSet: rodSet(4, 1) }, [["/drive", "missing-member"]]],
  ])("refuses %j", async (body, expected) => {
    expect(await errorsOf(PATH, body)).toEqual(expected);
  });
});

describe("POST /v1/passband of a window on an unknown instrument", () => {
  it("gives ratio, edges and the margin to the apex", async () => {
    // Independent computation at 50 digits (test/reference, passbands): the setting of resolution 3000.
    const width = { value: 3000.009402278943, as: "resolution", at: "edges" };
    const { passbands, dcToRfRatio, apexRatio, apexMargin_ppm } = await answerTo(PATH, {
      mzCentre: 37.10408600223159,
      width,
    });
    expectClose(dcToRfRatio, 0.16780157563107637, 1e-13);
    expectClose([passbands[0].mzLow, passbands[0].mzHigh], [37.0979020072791, 37.11026999718408], 1e-10);
    // Apex at 18 digits: 0.167843705708369849 (the same source).
    expectClose(apexMargin_ppm, (1 - 0.16780157563107637 / apexRatio) * 1e6, 1e-9);
  });

  it("takes a width in m/z or as a resolution", async () => {
    const inMz = await answerTo(PATH, { mzCentre: 500, width: { value: 0.5, as: "mz", at: "edges" } });
    const asResolution = await answerTo(PATH, {
      mzCentre: 500,
      width: { value: 1000, as: "resolution", at: "edges" },
    });
    expect(asResolution).toEqual(inMz);
    expectClose(inMz.passbands[0].mzWidth, 0.5, 1e-12);
  });

  it.each([
    ["width-height-needs-peak-profile", { value: 0.7, as: "mz", at: "half-height" }],
    ["resolution-not-reachable", { value: 0.4, as: "resolution", at: "edges" }],
  ])("is empty with a reason: %s", async (reason, width) => {
    expect(await answerTo(PATH, { mzCentre: 500, width })).toMatchObject({
      passbands: [],
      reason,
      dcToRfRatio: null,
      apexMargin_ppm: null,
    });
  });

  it("refuses a width that does not say at which height it is taken", async () => {
    expect(await errorsOf(PATH, { mzCentre: 500, width: { value: 0.7, as: "mz" } })).toEqual([
      ["/width/at", "missing-member"],
    ]);
  });
});
