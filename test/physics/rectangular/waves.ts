import fc from "fast-check";
import type { RectangularWave } from "../../../services/physics/rectangular/rectangular-wave.ts";

export const SQUARE: RectangularWave = { dutyCycle: 0.5, coupling: "dc" };

export function dcCoupled(dutyCycle: number): RectangularWave {
  return { dutyCycle, coupling: "dc" };
}

export const anyWave: fc.Arbitrary<RectangularWave> = fc.record({
  dutyCycle: fc.double({ min: 0.03, max: 0.97, noNaN: true }),
  coupling: fc.constantFrom("dc" as const, "ac" as const),
});

/** The same wave seen with the levels exchanged: what the other pair of rods carries. */
export function inverted({ dutyCycle, coupling }: RectangularWave): RectangularWave {
  return { dutyCycle: 1 - dutyCycle, coupling };
}
