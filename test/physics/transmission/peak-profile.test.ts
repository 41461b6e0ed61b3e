import { describe, expect, test } from "vitest";
import {
  type Peak,
  type PeakQuery,
  peakProfileOf,
} from "../../../services/physics/transmission/peak-profile.ts";
import { beamOf, REFERENCE_PEAKS } from "./reference-peaks.ts";
import { FIELD, passing, roundBeam, setPoint } from "./settings.ts";

function peakOf(query: PeakQuery): Peak {
  const answer = peakProfileOf(query);
  if (answer.kind !== "peak") throw new Error(JSON.stringify(answer));
  return answer;
}

/*
 * Shape against residence, edges 0.70 apart at m/z 500: figures computed for the domain notes of this project with another
 * program, for "a wide beam" that is not stated. The beam below was chosen for its agreement: of 25 tried (sigma 0.05 to 0.3 r0,
 * 0.01 to 3 eV) only sigma 0.15 r0 with 0.1 eV gives every printed digit of this test and the next. Over all 25 the widths run
 * over 0.61..0.65 and 1.00..1.07, 0.61..0.64 and 0.83..0.88, 0.61..0.64 and 0.74..0.76, the neighbour over 1.9..2.3, 0.40..0.51
 * and 0.02..0.03 %, the isotopologue over 26..36 %. So this is agreement with one free choice, weaker than the reference peaks.
 */
describe("a window of 0.70 at m/z 500", () => {
  const beam = roundBeam(0.15, 0.1, 500, FIELD);
  const { dcVolts, rfVolts } = setPoint(500, 0.7, FIELD);
  test.each([
    [12.25, "0.61", "1.00", "1.9"],
    [20, "0.61", "0.84", "0.41"],
    [40, "0.61", "0.74", "0.02"],
  ])(
    "N²/R %s: half height %s, tenth %s, the neighbour at +1.003 lets in %s %%",
    (h, half, tenth, neighbour) => {
      const rfCycles = Math.sqrt((h * 500) / 0.7);
      const drive = { dcVolts, rfVolts, field: FIELD, beam };
      const peak = peakOf({ ...drive, residence: () => rfCycles, accuracy: 1e-3 });
      expect(peak.halfHeight!.width.toFixed(2)).toBe(half);
      expect(peak.tenthHeight!.width.toFixed(2)).toBe(tenth);
      const { transmission } = passing({ ...drive, mz: 501.003355, rfCycles, accuracy: 1e-5 });
      const digits = neighbour.length - 2;
      expect(((100 * transmission) / peak.height).toFixed(digits)).toBe(neighbour);
    },
  );
});

test("z = 2, m/z 725, window 1.0, N² = 20R: the M+1 outside the edge still passes at 27 % (domain notes, as above)", () => {
  const beam = roundBeam(0.15, 0.1, 725, FIELD);
  const drive = {
    ...setPoint(725, 1, FIELD),
    field: FIELD,
    beam,
    rfCycles: Math.sqrt(20 * 725),
    accuracy: 1e-5,
  };
  const target = passing({ ...drive, mz: 725 }).transmission;
  const isotopologue = passing({ ...drive, mz: 725 + 1.003355 / 2 }).transmission;
  expect(((100 * isotopologue) / target).toFixed(0)).toBe("27");
});

test("the flanks of the six reference peaks lie between the reference points where the level is passed", () => {
  let checked = 0;
  for (const setting of REFERENCE_PEAKS) {
    const { U_V: dcVolts, V_V: rfVolts, r0_m: fieldRadius, f_Hz: frequency, rf_cycles: rfCycles } = setting;
    const field = { fieldRadius, frequency };
    const peak = peakOf({
      dcVolts,
      rfVolts,
      field,
      beam: beamOf(setting),
      residence: () => rfCycles,
      accuracy: 1e-4,
    });
    for (const [flanks, share] of [
      [peak.halfHeight!, 0.5],
      [peak.tenthHeight!, 0.1],
    ] as const) {
      for (let i = 1; i < setting.points.length; i++) {
        const [mz0, , , , , t0] = setting.points[i - 1]!;
        const [mz1, , , , , t1] = setting.points[i]!;
        const level = share * peak.height;
        if ((t0! - level) * (t1! - level) >= 0) continue;
        const flank = t1! > t0! ? flanks.low : flanks.high;
        expect(flank, `${setting.id} ${share}`).toBeGreaterThan(mz0!);
        expect(flank, `${setting.id} ${share}`).toBeLessThan(mz1!);
        checked += 1;
      }
    }
  }
  expect(checked).toBe(24);
});

test("every flank lies where the transmission is half and a tenth of the height, and the top is the highest", () => {
  for (const [mzCentre, width, rfCycles] of [
    [28, 1, 60],
    [500, 0.7, 120],
    [100, 20, 30],
  ] as const) {
    const beam = roundBeam(0.1, 0.1, mzCentre, FIELD);
    const { dcVolts, rfVolts } = setPoint(mzCentre, width, FIELD);
    const drive = { dcVolts, rfVolts, field: FIELD, beam };
    const peak = peakOf({ ...drive, residence: () => rfCycles, accuracy: 1e-3 });
    const at = (mz: number) => passing({ ...drive, mz, rfCycles, accuracy: 1e-5 }).transmission / peak.height;
    for (const [flanks, share] of [
      [peak.halfHeight!, 0.5],
      [peak.tenthHeight!, 0.1],
    ] as const) {
      expect(Math.abs(at(flanks.low) - share)).toBeLessThan(2e-3);
      expect(Math.abs(at(flanks.high) - share)).toBeLessThan(2e-3);
    }
    for (let i = -10; i <= 10; i++) expect(at(mzCentre + (width * i) / 20)).toBeLessThan(1.002);
    expect(peak.shiftFromCentre).toBeCloseTo(peak.mz - mzCentre, 6);
  }
});

test("where there is no peak the answer says why", () => {
  const beam = roundBeam(0.1, 0.1, 500, FIELD);
  const query = { field: FIELD, beam, residence: () => 100, accuracy: 1e-3 };
  const none = (reason: string) => ({ kind: "none", reason });
  expect(peakProfileOf({ ...query, dcVolts: 0, rfVolts: 800 })).toEqual(none("no-upper-edge"));
  expect(peakProfileOf({ ...query, dcVolts: 100, rfVolts: 0 })).toEqual(none("no-rf"));
  expect(peakProfileOf({ ...query, dcVolts: 140, rfVolts: 800 })).toEqual(none("above-apex"));
  const { dcVolts, rfVolts } = setPoint(500, 0.1, FIELD);
  expect(peakProfileOf({ ...query, dcVolts, rfVolts, residence: () => 3 })).toEqual(
    none("no-maximum-near-the-window"),
  );
  expect(peakProfileOf({ ...query, dcVolts, rfVolts }, 10_000)).toMatchObject({ kind: "not-converged" });
});

test("a flank that never falls is null: heavy ions fly through a wide window before they are lost", () => {
  const { dcVolts, rfVolts } = setPoint(28, 20, FIELD);
  const beam = roundBeam(0.1, 0.1, 28, FIELD);
  const peak = peakOf({ dcVolts, rfVolts, field: FIELD, beam, residence: () => 3, accuracy: 1e-3 });
  expect(peak.tenthHeight).toBeNull();
});
