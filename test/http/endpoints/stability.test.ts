import { describe, expect, it } from "vitest";
import { WAVE_HALF_TRACE_ERROR } from "../../../services/physics/rectangular/wave-stability.ts";
import { RECTANGULAR_WAVES } from "../../reference/rectangular-waves.ts";
import { answerTo, errorsOf } from "../test-app.ts";
import { drive, many, otherStatementsOf, rodSet, wave } from "./requests.ts";

const PATH = "/v1/stability";
const ofIons = (more: object = {}) => ({
  given: "ions",
  rodSet: rodSet(4, 1.2),
  drive: drive(831.55739482, 139.42457479),
  ions: [{ mz: 500 }],
  ...more,
});
const ofPoints = (...points: object[]) => ({ given: "points", points });

describe("POST /v1/stability", () => {
  // Edges 499.65000000517057 and 500.34999998795803 of this drive: independent computation at 50 digits
  // (test/reference, peak shapes, setting p1).
  it.each([
    [499.65 - 1e-4, false, "x"],
    [499.65 + 1e-4, true, null],
    [500.35 - 1e-4, true, null],
    [500.35 + 1e-4, false, "y"],
  ])("loses light ions to x and heavy ions to y: m/z %d", async (mz, stable, lostTo) => {
    const { results } = await answerTo(PATH, ofIons({ ions: [{ mz }] }));
    expect(results[0]).toMatchObject({ mz, stable, lostTo, reason: null });
    expect(results[0].region).toEqual(stable ? { x: 0, y: 0, name: "first" } : null);
  });

  it("answers the same however the voltages are stated, and whatever the sign of the ion", async () => {
    const [plain] = (await answerTo(PATH, ofIons())).results;
    for (const stated of otherStatementsOf(831.55739482, 139.42457479)) {
      const [result] = (await answerTo(PATH, ofIons({ drive: stated, ions: [{ mz: 500, charge: -2 }] })))
        .results;
      expect(result.q).toBeCloseTo(plain.q, 13);
      expect(result.a).toBeCloseTo(plain.a, 13);
      expect([result.stable, result.lostTo]).toEqual([plain.stable, plain.lostTo]);
    }
  });

  // Corners of the regions: independent computation at 50 digits; Du, Olney and Douglas 1997 and Dawson and Bingqi 1984
  // print them to five and six digits (from memory).
  it.each([
    ["first", { a: 0.2, q: 0.706 }, { x: 0, y: 0, name: "first" }],
    ["second", { a: 0, q: 7.546 }, { x: 1, y: 1, name: "second" }],
    ["third", { a: 3.0650233, q: 3.182116 }, { x: 1, y: 0, name: "third" }],
    ["(2,0), which has no name", { a: 8.5298325, q: 6.726264 }, { x: 2, y: 0, name: null }],
  ])("names the region: %s", async (_name, point, region) => {
    const { results } = await answerTo(PATH, ofPoints(point));
    expect(results[0]).toMatchObject({ mz: null, ...point, stable: true, region });
    expect([results[0].x.band, results[0].y.band]).toEqual([region.x, region.y]);
  });

  it("computes a static field: harmonic in x with β = √a, lost to y", async () => {
    const { results } = await answerTo(PATH, ofIons({ drive: drive(0, 100) }));
    const [{ a, q, lostTo, x }] = results;
    expect([q, lostTo]).toEqual([0, "y"]);
    expect(x.characteristicExponent).toBeCloseTo(Math.sqrt(a), 12);
  });

  it("holds no ion without any field", async () => {
    const { results } = await answerTo(PATH, ofPoints({ a: 0, q: 0 }));
    expect(results[0]).toMatchObject({ stable: false, lostTo: "both" });
  });

  it("says where it computes nothing, and computes the points beside it", async () => {
    const nothing = { stable: null, band: null, characteristicExponent: null, halfTrace: null };
    const { results } = await answerTo(PATH, ofIons({ drive: drive(1e6), ions: [{ mz: 0.5 }, { mz: 1e6 }] }));
    expect(results[0]).toMatchObject({
      stable: null,
      reason: "outside-computed-domain",
      region: null,
      lostTo: null,
      x: nothing,
      y: nothing,
    });
    expect(results[1]).toMatchObject({ reason: null, stable: true });
  });

  it("solves rectangular waves: half-traces and exponents of the reference", async () => {
    // 60 digits (test/reference, rectangular waves); the plane of x alone, whose q is not negative in a request.
    const rows = RECTANGULAR_WAVES.points.filter(([, q]) => q >= 0);
    expect(rows.length).toBeGreaterThan(60);
    for (const [a, q, dutyCycle, coupling, halfTrace, margin] of rows) {
      const asked = { ...ofPoints({ a, q }), waveform: wave(dutyCycle, coupling) };
      const [{ x }] = (await answerTo(PATH, asked)).results;
      expect(x.stable).toBe(margin > 0);
      expect(Math.abs(x.halfTrace - halfTrace) / Math.max(1, Math.abs(halfTrace))).toBeLessThan(
        WAVE_HALF_TRACE_ERROR,
      );
    }
  });

  it("guides ions above the cutoff of a square wave, q 0.7125, where a sinusoid would go on to 0.908", async () => {
    // The first root of cos cosh = −1, that of a clamped beam: q = 0.7124936579.
    const square = { ...ofPoints({ a: 0, q: 0.7124 }, { a: 0, q: 0.7126 }), waveform: wave(0.5) };
    const { results } = await answerTo(PATH, square);
    expect(results.map(({ stable }: { stable: boolean }) => stable)).toEqual([true, false]);
    const rms = { rf: { volts: 500, as: "rms", between: "pole-and-ground" } };
    const ofSquare = ofIons({ rodSet: rodSet(4, 1.2, { waveform: wave(0.5) }), drive: rms });
    const peak = await answerTo(PATH, { ...ofSquare, drive: drive(500) });
    expect(await answerTo(PATH, ofSquare)).toEqual(peak);
  });

  it("answers 1,000 ions in their order and refuses 1,001", async () => {
    const ions = many(1000, 0).map((_zero, index) => ({ mz: 100 + index }));
    const { results } = await answerTo(PATH, ofIons({ ions }));
    expect(results.map(({ mz }: { mz: number }) => mz)).toEqual(ions.map(({ mz }) => mz));
    expect(await errorsOf(PATH, ofIons({ ions: many(1001, { mz: 1 }) }))).toEqual([["/ions", "wrong-count"]]);
  });

  it.each([
    [
      "more pole pairs",
      ofIons({ rodSet: rodSet(4, 1.2, { polePairs: 3 }) }),
      [["/rodSet/polePairs", "needs-two-pole-pairs"]],
    ],
    [
      "a rectangular wave without its coupling",
      { ...ofPoints({ a: 0, q: 0.5 }), waveform: { shape: "rectangular", dutyCycle: 0.6 } },
      [["/waveform/coupling", "missing-member"]],
    ],
    [
      "an ion by formula, and one without charge",
      ofIons({
        ions: [
          { formula: "C8H10N4O2", adduct: "[M+H]+" },
          { mz: 5, charge: 0 },
        ],
      }),
      [
        ["/ions/0/formula", "formula-not-computed"],
        ["/ions/1/charge", "charge-is-zero"],
      ],
    ],
    ["ions and points at once", { ...ofIons(), points: [] }, [["/points", "unknown-member"]]],
    ["a negative q", ofPoints({ a: 0, q: -1 }), [["/points/0/q", "out-of-range"]]],
    [
      "volts without a convention",
      ofIons({ drive: { rf: { volts: 1 } } }),
      [
        ["/drive/rf/as", "missing-member"],
        ["/drive/rf/between", "missing-member"],
      ],
    ],
    [
      "DC of one pair only",
      ofIons({ drive: { ...drive(1), dc: { pairX_V: 1 } } }),
      [["/drive/dc/pairY_V", "missing-member"]],
    ],
  ])("refuses %s", async (_case, body, expected) => {
    expect(await errorsOf(PATH, body)).toEqual(expected);
  });
});
