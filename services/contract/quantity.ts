import { z } from "zod";

/** A number with a unit, a range and a meaning: the one way in which requests state quantities. */
export function quantity(description: string, minimum: number, maximum: number) {
  return z.number().min(minimum).max(maximum).meta({ description });
}

export const Mz = quantity("Mass-to-charge ratio m/z of the ion, dimensionless.", 0.5, 1e6);
export const FieldRadius_mm = quantity(
  "Field radius r0 in mm: half the gap between opposite rods, not the rod radius and not the diameter.",
  0.05,
  50,
);
export const Frequency_MHz = quantity("RF frequency f in MHz (not angular frequency).", 0.001, 100);
export const RfVolts = quantity("RF voltage in V, read as the members beside it say.", 0, 1e6);
export const DcVolts = quantity("DC voltage in V, read as the members beside it say.", -1e6, 1e6);
export const Time_ms = quantity("Time in ms.", 0, 1e7);
export const MathieuA = quantity("Mathieu parameter a of the x plane, dimensionless.", -1e6, 1e6);
export const MathieuQ = quantity("Mathieu parameter q of the x plane, dimensionless.", 0, 1e6);
export const Tolerance_ppm = quantity("Relative tolerance, plus or minus, in ppm.", 0, 1e5);
