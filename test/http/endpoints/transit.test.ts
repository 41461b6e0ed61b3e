import { describe, expect, it } from "vitest";
import { expectClose } from "../close-to.ts";
import { answerTo, errorsOf } from "../test-app.ts";
import { rodSet } from "./requests.ts";

const PATH = "/v1/transit";
const request = (residence: object, more: object = {}) => ({
  rodSet: rodSet(4, 1, more),
  residence,
  ions: [{ mz: 500 }, { mz: 125 }],
});

describe("POST /v1/transit", () => {
  it("gives flight time, cycles and both resolutions of a stated axial energy", async () => {
    const { results } = await answerTo(PATH, request({ axialEnergy_eVPerCharge: 2 }, { rodLength_mm: 200 }));
    // m/z 500, 1 MHz, 0.20 m, 2 eV: 227.6 us, 227.6 cycles, R 4230 and 2591 (worked example, recomputed from CODATA 2022).
    expectClose(results[0].flightTime_us, 227.643, 1e-5);
    expectClose(results[0].rfCycles, 227.643, 1e-5);
    expectClose(
      results[0].attainableResolution,
      [
        { h: 12.25, resolution: 4230.3 },
        { h: 20, resolution: 2591.06 },
      ],
      1e-5,
    );
    // A quarter of the mass flies twice as fast.
    expectClose(results[1].flightTime_us, results[0].flightTime_us / 2, 1e-14);
  });

  it("takes the time in the field, or the cycles themselves, the same for every ion", async () => {
    const byTime = await answerTo(PATH, request({ flightTime_us: 250 }));
    const byCycles = await answerTo(PATH, request({ rfCycles: 250 }));
    expectClose(byTime, byCycles, 1e-14);
    expectClose([byTime.results[1].rfCycles, byTime.results[1].flightTime_us], [250, 250], 1e-14);
  });

  it("needs no quadrupole", async () => {
    const { results } = await answerTo(PATH, request({ rfCycles: 100 }, { polePairs: 4 }));
    expect(results).toHaveLength(2);
  });

  it.each([
    [request({ axialEnergy_eVPerCharge: 2 }), [["/rodSet/rodLength_mm", "missing-member"]]],
    [
      request({ axialEnergy_eVPerCharge: 0 }, { rodLength_mm: 200 }),
      [["/residence/axialEnergy_eVPerCharge", "out-of-range"]],
    ],
    [request({ rfCycles: 1, flightTime_us: 1 }), [["/residence/rfCycles", "unknown-member"]]],
    [request({}), [["/residence/axialEnergy_eVPerCharge", "missing-member"]]],
  ])("refuses what cannot be answered (%#)", async (body, expected) => {
    expect(await errorsOf(PATH, body)).toEqual(expected);
  });
});
