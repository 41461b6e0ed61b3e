import request from "supertest";
import { describe, expect, it } from "vitest";
import { csvText } from "../../../services/http/csv-text.ts";
import { SCAN_AND_DRIFT } from "../../reference/scan-and-drift.ts";
import { expectClose } from "../close-to.ts";
import { answerTo, errorsOf, testApp } from "../test-app.ts";
import { rodSet, toGround } from "./requests.ts";

const PATH = "/v1/scan-table";
const table = (mzFrom: number, mzTo: number, value: number, more: object = {}) => ({
  rodSet: rodSet(4, 1.2, { rodLength_mm: 200 }),
  convention: toGround,
  mzFrom,
  mzTo,
  points: 5,
  width: { value, as: "mz", at: "edges" },
  ...more,
});

describe("POST /v1/scan-table", () => {
  // Lines by another library and proved by all other points (test/reference, scan-and-drift).
  it.each(SCAN_AND_DRIFT.lines)(
    "m/z $mzFrom to $mzTo at width $width",
    async ({ mzFrom, mzTo, width, leastSquares, leastWorst }) => {
      const { lines, linesReason } = await answerTo(PATH, table(mzFrom, mzTo, width));
      expect(linesReason).toBeNull();
      const [squares, worst] = lines;
      expectClose([squares.dcSlope, squares.dcOffset_V], [leastSquares.slope, leastSquares.offset], 1e-10);
      expectClose(
        [squares.worst.mz, squares.worst.error],
        [leastSquares.worstMz, leastSquares.worstError],
        1e-8,
      );
      expectClose([worst.dcSlope, worst.dcOffset_V], [leastWorst.slope, leastWorst.offset], 1e-9);
      expectClose(Math.abs(worst.worst.error), leastWorst.worstError, 1e-8);
      expect(worst.worst.mz).toBe(mzFrom);
    },
  );

  it("gives rows whose volts open the wanted window, in any convention", async () => {
    const convention = {
      rf: { as: "peak-to-peak", between: "pole-and-pole" },
      dc: { between: "pole-and-pole" },
    };
    const { rows, lines } = await answerTo(PATH, table(28, 1000, 0.7, { convention }));
    const plain = await answerTo(PATH, table(28, 1000, 0.7));
    expect(rows.map(({ mz }: { mz: number }) => mz)).toEqual([28, 271, 514, 757, 1000]);
    for (const [index, row] of rows.entries()) {
      const { passbands } = await answerTo("/v1/passband", { rodSet: rodSet(4, 1.2), drive: row.drive });
      expectClose([passbands[0].mzLow, passbands[0].mzHigh], [row.mzLow, row.mzHigh], 1e-12);
      expectClose([passbands[0].mzCentre, passbands[0].mzWidth], [row.mz, 0.7], 1e-9);
      expectClose(row.drive.rf.volts, plain.rows[index].drive.rf.volts * 4, 1e-14);
    }
    expect(lines[0].dcSlope).toBe(plain.lines[0].dcSlope);
    expect(lines[0].dcOffset_V).toBe(plain.lines[0].dcOffset_V * 2);
  });

  it("at constant resolution has a line without offset that is exact", async () => {
    const width = { value: 800, as: "resolution", at: "edges" };
    const { lines } = await answerTo(PATH, table(20, 900, 1, { width }));
    for (const { dcOffset_V, worst } of lines) {
      expect(Math.abs(dcOffset_V)).toBeLessThan(1e-10);
      expect(Math.abs(worst.error)).toBeLessThan(1e-8);
    }
  });

  // Flight time L √(m/2eE) and the table of peak shapes: 11 % of the height at a shift of 0.33 W (recomputed).
  it("limits the scan by the slowest ion: the heaviest at constant axial energy", async () => {
    const residence = { axialEnergy_eVPerCharge: 2 };
    const { rows, fastest } = await answerTo(PATH, table(100, 500, 0.7, { residence, permittedLoss: 0.11 }));
    expect(fastest.mz).toBe(500);
    // 227.643 us at m/z 500 with 2 eV through 200 mm.
    expectClose(fastest.rate_mzPerS, (0.33 * 0.7) / (227.643028304853 / 1e6), 1e-9);
    expectClose(fastest.shiftOverWidth, 0.33, 1e-12);
    expect(rows[0].fastestRate_mzPerS).toBeGreaterThan(fastest.rate_mzPerS * 2);
    expect((await answerTo(PATH, table(100, 500, 0.7))).fastest).toBeNull();
  });

  it("says where a line passes nothing or everything, and which rows have no set point", async () => {
    const { lines } = await answerTo(PATH, table(1, 100, 1));
    expect(lines[0].worst).toMatchObject({ mz: 1, width: null, error: null, reason: "no-dc" });
    expect(lines[1].worst.reason).toBeNull();
    const wide = await answerTo(PATH, table(1, 100, 30));
    expect(wide.rows[0]).toMatchObject({
      drive: null,
      reason: "resolution-not-reachable",
      a: null,
      mzLow: null,
    });
    expect(wide.rows[4].reason).toBeNull();
    const half = await answerTo(PATH, table(1, 100, 1, { width: { value: 1, as: "mz", at: "half-height" } }));
    expect(half.rows[0].reason).toBe("width-height-needs-peak-profile");
    expect(half).toMatchObject({ lines: [], linesReason: "too-few-set-points", fastest: null });
    const huge = await answerTo(PATH, table(9e5, 1e6, 1, { rodSet: rodSet(50, 100) }));
    expect(huge.rows[0]).toMatchObject({ drive: null, reason: "drive-out-of-range" });
  });

  it("writes its rows as CSV with a header that names the convention", async () => {
    const { app } = testApp({ level: "silent" });
    const { text, headers, status } = await request(app)
      .post(PATH)
      .set("Accept", "text/csv")
      .send(table(1, 100, 30, { points: 2 }));
    expect(status).toBe(200);
    expect(headers["content-type"]).toBe("text/csv; charset=utf-8");
    const { rows } = await answerTo(PATH, table(1, 100, 30, { points: 2 }));
    const { mz, drive, a, q, mzLow, mzHigh } = rows[1];
    expect(text).toBe(
      `mz,rf_V (zero-to-peak pole-and-ground),dc_V (pole-and-ground),a,q,mzLow,mzHigh,fastestRate_mzPerS,reason\r\n1,,,,,,,,resolution-not-reachable\r\n${mz},${drive.rf.volts},${drive.dc.volts},${a},${q},${mzLow},${mzHigh},,\r\n`,
    );
  });

  it.each([
    [table(500, 500, 0.7), [["/mzTo", "not-above"]]],
    [table(500, 400, 0.7), [["/mzTo", "not-above"]]],
    [table(1, 100, 1, { points: 1 }), [["/points", "out-of-range"]]],
    [table(1, 100, 1, { points: 1001 }), [["/points", "out-of-range"]]],
    [table(1, 100, 1, { permittedLoss: 0.1 }), [["/residence", "missing-member"]]],
    [table(1, 100, 1, { residence: { rfCycles: 100 } }), [["/permittedLoss", "missing-member"]]],
    [
      table(1, 100, 1, {
        rodSet: rodSet(4, 1.2),
        residence: { axialEnergy_eVPerCharge: 2 },
        permittedLoss: 0.1,
      }),
      [["/rodSet/rodLength_mm", "missing-member"]],
    ],
  ])("refuses what cannot be answered (%#)", async (body, expected) => {
    expect(await errorsOf(PATH, body)).toEqual(expected);
  });
});

describe("a table as RFC 4180 has it", () => {
  it("quotes commas, quotes and line breaks, and doubles quotes", () => {
    expect(csvText(["a"], [['x,"y"'], ["two\r\nlines"], [null], [-1.5]])).toBe(
      'a\r\n"x,""y"""\r\n"two\r\nlines"\r\n\r\n-1.5\r\n',
    );
  });

  it.each(["=1+1", "+1", "-1", "@x", "\tx", "\rx"])("hands no formula to a spreadsheet: %j", (text) => {
    expect(csvText(["h"], [[text]])).toMatch(/^h\r\n"?'/);
  });
});
