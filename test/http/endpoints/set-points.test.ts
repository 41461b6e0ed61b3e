import { describe, expect, it } from "vitest";
import { expectClose } from "../close-to.ts";
import { answerTo, errorsOf } from "../test-app.ts";
import { many, rodSet, toGround } from "./requests.ts";

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
    expect(results[0]).toEqual({ mz: wanted.ion.mz, drive: null, reason, a: null, q: null, passband: null });
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
    [request([target(500, 0.7)], { region: "third" }), [["/region", "region-not-computed"]]],
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
