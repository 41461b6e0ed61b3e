import { describe, expect, it } from "vitest";
import {
  DUTY_CYCLE_FILTERS,
  DUTY_CYCLE_WINDOWS,
  RECTANGULAR_WAVES,
  SQUARE_WAVE_APEX,
  SQUARE_WAVE_CUTOFF,
} from "../../reference/rectangular-waves.ts";
import { RF_ONLY } from "../../reference/tables.ts";
import { SECOND_REGION } from "../../reference/worked-examples.ts";
import { expectClose } from "../close-to.ts";
import { answerTo, errorsOf } from "../test-app.ts";
import { drive, otherStatementsOf, rodSet, wave } from "./requests.ts";

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
    [
      { rodSet: rodSet(4, 1, { polePairs: 4 }), drive: drive(1), region: "any" },
      [["/rodSet/polePairs", "needs-two-pole-pairs"]],
    ],
    [
      { rodSet: rodSet(4, 1, { waveform: wave(1) }), drive: drive(1) },
      [["/rodSet/waveform/dutyCycle", "out-of-range"]],
    ],
    [{ rodSet: rodSet(4, 1), drive: drive(1), region: "fourth" }, [["/region", "not-one-of"]]],
    [{ rodSet: rodSet(4, 1) }, [["/drive", "missing-member"]]],
  ])("refuses %j", async (body, expected) => {
    expect(await errorsOf(PATH, body)).toEqual(expected);
  });
});

describe("POST /v1/passband in other regions", () => {
  it("names the second window that the same volts open, near 0.12 of the cutoff", async () => {
    // Independent computation at 50 digits (test/reference, rods without DC).
    for (const [r0, f, V, cutoff, secondHigh, secondLow] of RF_ONLY.quadrupole) {
      const asked = { rodSet: rodSet(r0 * 1e3, f / 1e6), drive: drive(V) };
      const { passbands, otherWindows } = await answerTo(PATH, asked);
      expect([passbands.length, otherWindows.length]).toEqual([1, 1]);
      const [second] = otherWindows;
      expect(second).toMatchObject({ region: "second", bands: { x: 1, y: 1 } });
      expectClose([passbands[0].mzLow, second.mzLow, second.mzHigh], [cutoff, secondLow, secondHigh], 1e-12);
      expect(second.mzCentre / cutoff).toBeCloseTo(0.12, 2);
      // Dawson and Bingqi 1984, recomputed: q 7.51361..7.57970, R 114.
      expect(second.high.q).toBeCloseTo(SECOND_REGION.qLow, 5);
      expect(second.resolution).toBeCloseTo(SECOND_REGION.resolution, 0);
    }
  });

  it("answers the region named, or all of them, without naming a window twice", async () => {
    const asked = { rodSet: rodSet(3, 1), drive: drive(974.14) };
    const every = await answerTo(PATH, { ...asked, region: "any" });
    expect(every.passbands.map(({ region }: { region: string }) => region)).toEqual(["first", "second"]);
    expect(every.otherWindows).toEqual([]);
    const second = await answerTo(PATH, { ...asked, region: "second" });
    expect(second.passbands).toEqual([every.passbands[1]]);
    expect(second.otherWindows).toEqual([every.passbands[0]]);
  });

  it("finds the third region between its corners in U/V, and no other window beside it", async () => {
    // Corners (a, q) of Du, Olney and Douglas 1997, recomputed: U/V 0.447731 and 0.489212.
    for (const [ratio, isOpen] of [
      [0.4477, false],
      [0.4478, true],
      [0.4892, true],
      [0.4893, false],
    ] as const) {
      const asked = { rodSet: rodSet(4, 1.2), drive: drive(1000, 1000 * ratio), region: "third" };
      const { passbands, otherWindows, reason, searchedToQ } = await answerTo(PATH, asked);
      expect(passbands).toHaveLength(isOpen ? 1 : 0);
      expect(reason).toBe(isOpen ? null : "scan-line-misses-region");
      expect(otherWindows).toEqual([]);
      // Beyond q 12, or a 12, further regions are not listed.
      expect(searchedToQ).toBe(12);
      if (isOpen) expect(passbands[0]).toMatchObject({ region: "third", bands: { x: 1, y: 0 } });
    }
  });
});

describe("POST /v1/passband of a rectangular wave", () => {
  it.each(DUTY_CYCLE_FILTERS)("filters by its duty cycle alone: $duty", async (row) => {
    // 50-digit matrix products (test/reference, rectangular waves among the passbands).
    const { passbands, reason, apexRatio } = await answerTo(PATH, {
      rodSet: rodSet(row.r0_m * 1e3, row.f_Hz / 1e6, { waveform: wave(row.duty) }),
      drive: drive(row.V_V),
    });
    expect(passbands).toHaveLength(row.stable ? 1 : 0);
    expect(reason).toBe(row.stable ? null : "above-apex");
    expect(apexRatio > 0).toBe(row.stable);
    if (!row.stable) return;
    expectClose(passbands[0].mzLow, row.mz_low, 1e-14);
    if (row.mz_high === null) expect(passbands[0].high).toBeNull();
    else expectClose(passbands[0].mzHigh, row.mz_high, 1e-14);
    expect(passbands[0].low.lostTo).toBe("x");
  });

  it.each(DUTY_CYCLE_WINDOWS)("passes the q of the handbooks at duty cycle $dutyCycle", async (row) => {
    const asked = { rodSet: rodSet(4, 1, { waveform: wave(row.dutyCycle) }), drive: drive(500) };
    const [{ low, high }] = (await answerTo(PATH, asked)).passbands;
    expect(low.q).toBeCloseTo(row.qHigh, 4);
    expect(high.q).toBeCloseTo(row.qLow, 4);
    // Through a capacitor the mean is gone, and with it the upper edge.
    const throughCapacitor = rodSet(4, 1, { waveform: wave(row.dutyCycle, "ac") });
    const coupled = await answerTo(PATH, { rodSet: throughCapacitor, drive: drive(500) });
    expect(coupled.passbands[0].high).toBeNull();
  });

  it("has the cutoff and the apex of the square wave", async () => {
    const square = rodSet(4, 1, { waveform: wave(0.5) });
    const answer = await answerTo(PATH, { rodSet: square, drive: drive(500) });
    expectClose(answer.passbands[0].low.q, SQUARE_WAVE_CUTOFF, 1e-14);
    // Konenkov, Sudakov and Douglas 2002, recomputed.
    expect(answer.apexRatio).toBeCloseTo(SQUARE_WAVE_APEX.ratio, 6);
    expect(answer.otherWindows).toMatchObject([{ region: "second" }]);
    const above = await answerTo(PATH, { rodSet: square, drive: drive(500, 500 * 0.2154) });
    expect(above).toMatchObject({ passbands: [], reason: "above-apex" });
    expect(above.apexMargin_ppm).toBeLessThan(0);
  });

  it("finds the windows of stated DC and duty cycle, whichever coupling", async () => {
    // Edges at 60 digits (test/reference, rectangular waves).
    const stateable = RECTANGULAR_WAVES.lines.filter(([ratio]) => ratio >= 0);
    expect(stateable.length).toBeGreaterThan(5);
    for (const [ratio, dutyCycle, coupling, windows] of stateable) {
      const { passbands } = await answerTo(PATH, {
        rodSet: rodSet(4, 1, { waveform: wave(dutyCycle, coupling) }),
        drive: drive(1024, 1024 * ratio),
      });
      const edges = passbands.map(({ low, high }: { low: { q: number }; high: { q: number } | null }) => [
        high?.q ?? 0,
        low.q,
      ]);
      expectClose(edges, windows, 1e-13);
    }
  });

  it("says when the wave's own mean drives the ions out, until DC makes up for it", async () => {
    const waveform = wave(0.3);
    const alone = await answerTo(PATH, { rodSet: rodSet(4, 1, { waveform }), drive: drive(500) });
    expect(alone).toMatchObject({ passbands: [], reason: "below-lower-apex" });
    const compensated = { rodSet: rodSet(4, 1, { waveform }), drive: drive(500, 250) };
    expect((await answerTo(PATH, compensated)).passbands).toHaveLength(1);
  });

  it("reads the rms of a rectangular wave as its amplitude", async () => {
    const square = rodSet(4, 1, { waveform: wave(0.5) });
    const rms = { rf: { volts: 500, as: "rms", between: "pole-and-ground" } };
    const asRms = await answerTo(PATH, { rodSet: square, drive: rms });
    expect(asRms).toEqual(await answerTo(PATH, { rodSet: square, drive: drive(500) }));
  });

  it("says of an end that it was not sought rather than that ions are lost there", async () => {
    const { passbands } = await answerTo(PATH, {
      rodSet: rodSet(4, 1, { waveform: wave(0.01, "ac") }),
      drive: drive(500),
    });
    expect(passbands[0]).toMatchObject({ low: { q: 12, lostTo: null }, high: null });
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
