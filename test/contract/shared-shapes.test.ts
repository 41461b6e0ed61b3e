import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  chargeNumberOf,
  type Ion,
  Ion as IonSchema,
  ionErrors,
  mzOfIon,
} from "../../services/contract/ion.ts";
import { flightTimeOf, Residence, residenceErrors, rfCyclesOf } from "../../services/contract/residence.ts";
import { fieldOf, polePairsOf, RodSet, sinusoidalQuadrupole } from "../../services/contract/rod-set.ts";
import {
  hertzFromMHz,
  kHzFromHertz,
  MHzFromHertz,
  metresFromMm,
  microsecondsFromSeconds,
  mmFromMetres,
  ppmFromRatio,
} from "../../services/contract/si.ts";
import { Identifier } from "../../services/contract/text.ts";
import { Width, widthInMz } from "../../services/contract/width.ts";

const RODS = { fieldRadius_mm: 4.17, frequency_MHz: 1, rodLength_mm: 200 };
const positive = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe("units", () => {
  it("come back from SI within two roundings", () => {
    fc.assert(
      fc.property(positive(1e-6, 1e9), (value) => {
        const near = (one: number) =>
          expect(Math.abs(one / value - 1)).toBeLessThanOrEqual(2 * Number.EPSILON);
        near(mmFromMetres(metresFromMm(value)));
        near(MHzFromHertz(hertzFromMHz(value)));
      }),
    );
    expect([metresFromMm(4.17), hertzFromMHz(1.2), kHzFromHertz(1500)]).toEqual([0.00417, 1_200_000, 1.5]);
    expect([microsecondsFromSeconds(0.5), ppmFromRatio(0.25)]).toEqual([500_000, 250_000]);
  });

  it("of a rod set are metres and hertz", () => {
    expect(fieldOf(RODS)).toEqual({ fieldRadius: 0.00417, frequency: 1_000_000 });
  });
});

describe("a width", () => {
  it("as resolution is m/z over it, and the other way round", () => {
    fc.assert(
      fc.property(positive(0.5, 1e6), positive(1e-3, 1e5), (mz, value) => {
        expect(widthInMz({ value, as: "mz" }, mz)).toBe(value);
        const width = widthInMz({ value, as: "resolution" }, mz);
        expect(Math.abs(mz / width / value - 1)).toBeLessThanOrEqual(2 * Number.EPSILON);
      }),
    );
  });

  it("has no default height, and no default reading", () => {
    expect(Width.safeParse({ value: 0.7, as: "mz" }).success).toBe(false);
    expect(Width.safeParse({ value: 0.7, at: "edges" }).success).toBe(false);
  });
});

describe("a residence", () => {
  // m/z 500 at 2 eV through 0.20 m takes 227.6 us (recomputed with CODATA 2022 constants).
  it("by axial energy takes 227.6 us at 2 eV through 0.20 m for m/z 500: 227.6 cycles of 1 MHz", () => {
    const residence = { axialEnergy_eVPerCharge: 2 };
    expect(flightTimeOf(residence, RODS, 500)! * 1e6).toBeCloseTo(227.6, 1);
    expect(rfCyclesOf(residence, RODS, 500)).toBeCloseTo(227.6, 1);
  });

  it("by time and by cycles are each other's through the frequency, and the same for every ion", () => {
    fc.assert(
      fc.property(positive(0.1, 1e4), positive(0.5, 1e5), positive(0.1, 10), (time, mz, frequency_MHz) => {
        const rods = { ...RODS, frequency_MHz };
        const cycles = rfCyclesOf({ flightTime_us: time }, rods, mz)!;
        const back = flightTimeOf({ rfCycles: cycles }, rods, mz)! * 1e6;
        expect(Math.abs(back / time - 1)).toBeLessThan(4 * Number.EPSILON);
      }),
    );
  });

  it("by axial energy needs the length of the rods, and says where it is missing", () => {
    const { rodLength_mm: _, ...short } = RODS;
    const residence = { axialEnergy_eVPerCharge: 2 };
    expect([flightTimeOf(residence, short, 500), rfCyclesOf(residence, short, 500)]).toEqual([null, null]);
    expect(residenceErrors(residence, short, "/rodSet").map(({ pointer }) => pointer)).toEqual([
      "/rodSet/rodLength_mm",
    ]);
    expect(residenceErrors(residence, RODS, "/rodSet")).toEqual([]);
    expect(residenceErrors({ rfCycles: 100 }, short, "/rodSet")).toEqual([]);
  });

  it("is stated in one way only", () => {
    expect(Residence.safeParse({ rfCycles: 100, flightTime_us: 100 }).success).toBe(false);
  });
});

describe("an ion", () => {
  it("has the m/z and the charge number that it states", () => {
    expect(mzOfIon({ mz: 609.28066 })).toBe(609.28066);
    expect([chargeNumberOf({ mz: 500 }), chargeNumberOf({ mz: 500, charge: -3 })]).toEqual([1, 3]);
  });

  it("of charge 0 is refused: it stands for not stated in real files, never for an ion", () => {
    const neutral: Ion = { mz: 500, charge: 0 };
    expect(IonSchema.safeParse(neutral).success).toBe(true);
    expect(ionErrors(neutral, "/ion")).toMatchObject([{ pointer: "/ion/charge", code: "charge-is-zero" }]);
    expect(ionErrors({ mz: 500, charge: -1 }, "/ion")).toEqual([]);
  });
});

describe("a rod set", () => {
  it("is a quadrupole with a sinusoidal drive where nothing else is said", () => {
    expect(polePairsOf(RODS)).toBe(2);
    expect(sinusoidalQuadrupole(RODS, "/rodSet")).toEqual([]);
    expect(sinusoidalQuadrupole({ ...RODS, polePairs: 4 }, "/rodSet").map(({ code }) => code)).toEqual([
      "needs-two-pole-pairs",
    ]);
  });

  it.each([
    { fieldRadius_mm: 0.049 },
    { fieldRadius_mm: 50.1 },
    { frequency_MHz: 0.0009 },
    { frequency_MHz: 100.1 },
    { polePairs: 1 },
    { polePairs: 12 },
    { polePairs: 2.5 },
    { frequncy_MHz: 1 },
  ])("is refused with %o", (change) => {
    expect(RodSet.safeParse(RODS).success).toBe(true);
    expect(RodSet.safeParse({ ...RODS, ...change }).success).toBe(false);
  });
});

describe("texts", () => {
  it("are well-formed Unicode without control characters", () => {
    expect(Identifier.safeParse("north bench 2, Ü").success).toBe(true);
    for (const text of ["", "a\u0000b", "line\nbreak", "\ud800", "x".repeat(101)]) {
      expect(Identifier.safeParse(text).success, JSON.stringify(text)).toBe(false);
    }
  });
});
