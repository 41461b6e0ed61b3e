import { describe, expect, it } from "vitest";
import type { Rf } from "../../services/contract/drive.ts";
import { dc, finding, oneFilter, RODS, rf } from "./laboratory.ts";

/** m/z 1000 at 1 MHz and r0 4.17 mm lies at the apex with 1255.80 V zero-to-peak to ground (7.22172 M f^2 r0^2, Dawson 1976). */
const TRUE_VOLTS = 7.22172145 * 1000 * 0.417 * 0.417;

const mistaken = (stated: Rf, rods: Partial<typeof RODS> = {}) =>
  finding(
    oneFilter({
      rodSet: { ...RODS, ...rods },
      operatingPoint: { by: "drives", points: [{ mz: 1000, drive: { rf: stated, dc: dc(200) } }] },
    }),
    "voltage-convention",
  );

const ground = "pole-and-ground" as const;
const poles = "pole-and-pole" as const;

describe("voltage-convention", () => {
  it.each([
    { as: "zero-to-peak" as const, between: ground, volts: TRUE_VOLTS },
    { as: "peak-to-peak" as const, between: ground, volts: 2 * TRUE_VOLTS },
    { as: "rms" as const, between: ground, volts: TRUE_VOLTS / Math.SQRT2 },
    { as: "zero-to-peak" as const, between: poles, volts: 2 * TRUE_VOLTS },
    { as: "peak-to-peak" as const, between: poles, volts: 4 * TRUE_VOLTS },
    { as: "rms" as const, between: poles, volts: Math.SQRT2 * TRUE_VOLTS },
  ])("agrees where $volts V are $as, $between", (stated) => {
    const { value, outcome, statement } = mistaken(stated);
    expect(value).toBeCloseTo(1, 7);
    expect(outcome).toBe("pass");
    expect(statement).not.toContain("comes about");
  });

  const asPeak = { as: "zero-to-peak" as const, between: ground };
  it.each([
    {
      factor: 2,
      stated: { ...asPeak, volts: 2 * TRUE_VOLTS },
      causes: ["peak-to-peak between pole and ground but", "zero-to-peak between the poles but"],
    },
    {
      factor: 0.5,
      stated: { as: "peak-to-peak" as const, between: ground, volts: TRUE_VOLTS },
      causes: ["zero-to-peak between pole and ground but stated as peak-to-peak"],
    },
    {
      factor: 4,
      stated: { ...asPeak, volts: 4 * TRUE_VOLTS },
      causes: ["peak-to-peak between the poles but", "halved as if it were a diameter"],
    },
    {
      factor: 0.25,
      stated: { as: "peak-to-peak" as const, between: poles, volts: TRUE_VOLTS },
      causes: ["zero-to-peak between pole and ground but", "field diameter"],
    },
    {
      factor: Math.SQRT2,
      stated: { as: "rms" as const, between: ground, volts: TRUE_VOLTS },
      causes: ["zero-to-peak between pole and ground but stated as rms"],
    },
    {
      factor: Math.SQRT1_2,
      stated: { ...asPeak, volts: TRUE_VOLTS / Math.SQRT2 },
      causes: ["rms between pole and ground but"],
    },
  ])("names every cause of a factor of $factor", ({ factor, stated, causes }) => {
    const { value, outcome, statement } = mistaken(stated);
    expect(value! / factor).toBeCloseTo(1, 7);
    expect(outcome).toBe("fail");
    for (const cause of causes) expect(statement).toContain(cause);
    expect(statement.match(/the (RF|field|rod|angular|frequency)\b[^,.]* (is|was) /g)).toHaveLength(
      causes.length,
    );
  });

  it.each([
    // r0 4.17 mm: its diameter; a rod of 1.148 r0; r0 taken as a rod; f as omega; f divided by 2 pi.
    {
      factor: 0.25,
      rods: { fieldRadius_mm: 2 * 4.17 },
      causes: ["the field diameter is stated as the field radius"],
    },
    {
      factor: 0.76,
      rods: { fieldRadius_mm: 1.148 * 4.17 },
      causes: ["the rod radius is stated as the field radius"],
    },
    {
      factor: 1.32,
      rods: { fieldRadius_mm: 4.17 / 1.148 },
      causes: ["the field radius was reduced as if it were a rod radius"],
    },
    {
      factor: 1 / 39.478,
      rods: { frequency_MHz: 2 * Math.PI },
      causes: ["the angular frequency is stated as the frequency"],
    },
    {
      factor: 39.478,
      rods: { frequency_MHz: 1 / (2 * Math.PI) },
      causes: ["the frequency was divided by 2 pi"],
    },
  ])("names a mistaken length or frequency, factor $factor", ({ factor, rods, causes }) => {
    const { value, outcome, statement } = mistaken(rf(TRUE_VOLTS), rods);
    // The factors are quoted to two digits.
    expect(Math.abs(value! / factor - 1)).toBeLessThan(0.01);
    expect(outcome).toBe("fail");
    for (const cause of causes) expect(statement).toContain(cause);
  });

  it("does not invent a cause for a factor that no mistake gives", () => {
    expect(mistaken(rf(3 * TRUE_VOLTS)).statement).toContain("fits no mistaken convention");
  });

  it("names only mistakes that the stated reading can be", () => {
    const { statement } = mistaken({ as: "rms", between: ground, volts: Math.SQRT2 * TRUE_VOLTS });
    expect(statement).toContain("stated as rms between pole and ground");
    expect(statement).not.toContain("stated as zero-to-peak");
  });

  it("judges the heaviest point, whose window lies nearest to the apex", () => {
    const two = oneFilter({
      rodSet: RODS,
      operatingPoint: {
        by: "drives",
        points: [
          { mz: 1000, drive: { rf: rf(TRUE_VOLTS), dc: dc(200) } },
          { mz: 10, drive: { rf: rf(TRUE_VOLTS / 50), dc: dc(2) } },
        ],
      },
    });
    const found = finding(two, "voltage-convention");
    expect(found.subject).toEqual({
      pointer: "/instrument/stages/0/operatingPoint/points/0",
      stage: "Q1",
      ion: "m/z 1000",
    });
    expect(found.outcome).toBe("pass");
  });
});
