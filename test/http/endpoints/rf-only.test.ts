import { describe, expect, it } from "vitest";
import { expectClose } from "../close-to.ts";
import { answerTo, errorsOf } from "../test-app.ts";
import { drive, rodSet } from "./requests.ts";

const PATH = "/v1/rf-only";
const request = (rods: object, rfVolts: number, mz: number, more: object = {}) => ({
  rodSet: rods,
  drive: drive(rfVolts),
  ions: [{ mz }],
  ...more,
});

describe("POST /v1/rf-only of a quadrupole", () => {
  // Independent computation at 50 digits (test/reference, rods without DC): r0, f, V, cutoff, second window, m/z, q, depth,
  // secular frequency.
  it.each([
    [
      8, 1.5, 77.228, 5.773854516762347, 0.6977907046718981, 0.6917073345936732, 7.3844, 0.7100004638782949,
      13.707978956098238, 430628.99364577845,
    ],
    [
      6, 1.5, 62.88, 8.357589866980113, 1.010044244396539, 1.0012386342144224, 113.27, 0.06699990145288734,
      1.0532384508393888, 35563.29383121856,
    ],
    [
      4, 3, 1047.6, 78.32249950484584, 9.465550606182736, 9.383029519349614, 86.3112, 0.8240003443852424,
      215.80569019449499, 1089048.2902712973,
    ],
  ])(
    "agrees with the reference: r0 %d mm, %d MHz, %d V",
    async (r0, f, v, cutoff, mzHigh, mzLow, mz, q, depth, secular) => {
      const { lowMassCutoff, secondWindow, results } = await answerTo(PATH, request(rodSet(r0, f), v, mz));
      expectClose([lowMassCutoff, secondWindow], [cutoff, { mzLow, mzHigh }], 1e-12);
      const { wellDepth_eVPerCharge, secularFrequency_kHz, ...result } = results[0];
      expectClose([result.q, result.adiabaticity, wellDepth_eVPerCharge], [q, q, depth], 1e-12);
      expectClose(secularFrequency_kHz, secular / 1e3, 1e-10);
      expect(result.stable).toBe(true);
    },
  );

  it("holds nothing below the cutoff but the second window", async () => {
    const { lowMassCutoff, secondWindow } = await answerTo(PATH, request(rodSet(4, 1), 500, 100));
    const stableAt = async (mz: number) =>
      (await answerTo(PATH, request(rodSet(4, 1), 500, mz))).results[0].stable;
    expect(await stableAt(lowMassCutoff * (1 + 1e-9))).toBe(true);
    expect(await stableAt(lowMassCutoff * (1 - 1e-9))).toBe(false);
    expect(await stableAt(secondWindow.mzLow * (1 - 1e-9))).toBe(false);
    expect(await stableAt((secondWindow.mzLow + secondWindow.mzHigh) / 2)).toBe(true);
    expect(await stableAt(secondWindow.mzHigh * (1 + 1e-9))).toBe(false);
  });

  // m/z 500, 1 MHz, 4.17 mm: 200 V gives q 0.2249 and 11.24 eV, and 0.64 of the depth remains at 0.8 r0 (recomputed from
  // CODATA 2022; Gerlich 1992 for the 0.8, from memory).
  it.each([
    [7.19, true],
    [7.2, false],
  ])("confines against a radial energy of %d eV: %s", async (energy, confined) => {
    const { results, highMassLimit } = await answerTo(
      PATH,
      request(rodSet(4.17, 1), 200, 500, { maxRadialEnergy_eVPerCharge: energy }),
    );
    expect(results[0].confined).toBe(confined);
    // The 11.24 eV are rounded to their last digit.
    expectClose(highMassLimit, (500 * 0.64 * 11.24) / energy, 0.005 / 11.24);
  });

  it("does not call confined what the effective potential cannot judge", async () => {
    const { results, highMassLimit } = await answerTo(
      PATH,
      request(rodSet(4.17, 1), 400, 500, { maxRadialEnergy_eVPerCharge: 1 }),
    );
    expect(results[0].adiabaticity).toBeGreaterThan(0.3);
    expect(results[0].confined).toBeNull();
    expect(highMassLimit).toBeGreaterThan(500);
    expect((await answerTo(PATH, request(rodSet(4.17, 1), 200, 500))).results[0].confined).toBeNull();
  });

  it("holds no ion without RF, and has no cutoff then", async () => {
    const answer = await answerTo(PATH, request(rodSet(4, 1), 0, 100));
    expect(answer).toMatchObject({ lowMassCutoff: null, secondWindow: null, highMassLimit: null });
    expect(answer.results[0]).toMatchObject({
      q: 0,
      stable: false,
      wellDepth_eVPerCharge: 0,
      secularFrequency_kHz: null,
    });
  });
});

describe("POST /v1/rf-only of other rod sets", () => {
  // The same source: pole pairs, m/z, r0, f, V, depth at r0 per charge, η.
  it.each([
    [4, 12000, 6, 0.5, 97.635, 0.8628769264193323, 0.05302669696846411],
    [6, 100 / 3, 4, 1, 32.375, 129.683925895274 / 3, 8.90151357496518],
    [8, 1250, 8, 0.5, 84.757, 28.091355397300863 / 2, 1.1600191593679934],
  ])(
    "gives depth and adiabaticity of %d pole pairs, and no quantity of a quadrupole",
    async (polePairs, mz, r0, f, v, depth, eta) => {
      const { lowMassCutoff, secondWindow, results } = await answerTo(
        PATH,
        request(rodSet(r0, f, { polePairs }), v, mz),
      );
      expect([lowMassCutoff, secondWindow]).toEqual([null, null]);
      expect(results[0]).toMatchObject({ q: null, stable: null, secularFrequency_kHz: null });
      expectClose([results[0].wellDepth_eVPerCharge, results[0].adiabaticity], [depth, eta], 1e-11);
    },
  );

  it.each([
    [request(rodSet(4, 1), 100, 50, { drive: drive(100, 0) }), [["/drive/dc", "dc-not-taken"]]],
    [request(rodSet(4, 1, { polePairs: 12 }), 100, 50), [["/rodSet/polePairs", "out-of-range"]]],
    [
      request(rodSet(4, 1, { waveform: { shape: "rectangular", dutyCycle: 0.5, coupling: "ac" } }), 100, 50),
      [["/rodSet/waveform", "waveform-not-computed"]],
    ],
    [
      request(rodSet(4, 1), 100, 50, { maxRadialEnergy_eVPerCharge: 0 }),
      [["/maxRadialEnergy_eVPerCharge", "out-of-range"]],
    ],
  ])("refuses what cannot be answered (%#)", async (body, expected) => {
    expect(await errorsOf(PATH, body)).toEqual(expected);
  });
});
