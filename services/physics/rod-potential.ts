/*
 * The rods themselves: what stands on them, and the field between them. U and V pole-to-ground, V zero-to-peak; the x pair
 * carries U − V cos θ and the y pair −(U − V cos θ) about the rod offset, θ the RF phase. SI throughout.
 */
import { ELEMENTARY_CHARGE } from "./constants.ts";

/** Share of a cycle (0..1) for which a rod at `dcVolts` − V cos θ is positive; with no volts at all it never is. */
export function positiveShare(dcVolts: number, rfVolts: number): number {
  const amplitude = Math.abs(rfVolts);
  if (Math.abs(dcVolts) >= amplitude) return dcVolts > 0 ? 1 : 0;
  return 1 - Math.acos(dcVolts / amplitude) / Math.PI;
}

/** Largest magnitude in V between a rod at `dcVolts` − V cos θ and ground. */
export function peakVolts(dcVolts: number, rfVolts: number): number {
  return Math.abs(dcVolts) + Math.abs(rfVolts);
}

export interface FieldAtPoint {
  /** Potential against the axis in V. */
  readonly potential: number;
  /** Components of the field in V/m. */
  readonly fieldX: number;
  readonly fieldY: number;
  /** Components of the force in N on an ion of the charge number. */
  readonly forceX: number;
  readonly forceY: number;
}

/** The ideal quadrupole field at a point (m) and RF phase (rad): φ = (U − V cos θ)(x² − y²)/r0² (Dawson 1976, chapter II). */
export function fieldAt(
  x: number,
  y: number,
  phase: number,
  dcVolts: number,
  rfVolts: number,
  fieldRadius: number,
  chargeNumber: number,
): FieldAtPoint {
  const perSquare = (dcVolts - rfVolts * Math.cos(phase)) / (fieldRadius * fieldRadius);
  const fieldX = -2 * perSquare * x;
  const fieldY = 2 * perSquare * y;
  const charge = chargeNumber * ELEMENTARY_CHARGE;
  return {
    potential: perSquare * (x * x - y * y),
    fieldX,
    fieldY,
    forceX: charge * fieldX,
    forceY: charge * fieldY,
  };
}
