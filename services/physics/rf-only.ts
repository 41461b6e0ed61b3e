import { CHARGE_PER_ATOMIC_MASS } from "./constants.ts";
import { RF_ONLY_LIMIT_Q } from "./first-region.ts";
import { type Field, mzOf } from "./mathieu-parameters.ts";
import { planeStability } from "./stability.ts";

/** q of the low-mass cutoff of a rod set of two pole pairs without DC. */
export const CUTOFF_Q = RF_ONLY_LIMIT_Q;

/** Where region (1,1) crosses a = 0: the zeros of a_1 and b_2 (computed at 50 digits). */
export const SECOND_WINDOW_Q_LOW = 7.513610299420813;
export const SECOND_WINDOW_Q_HIGH = 7.579690373736909;

/**
 * m/z below which no ion is stable without DC, the second window apart. Volts in V, field in m and Hz. Without RF it is
 * 0 and means nothing: then no ion is held.
 */
export function lowMassCutoff(rfVolts: number, field: Field): number {
  return mzOf(CUTOFF_Q, Math.abs(rfVolts), field);
}

/** The narrow second window in m/z, near 0.12 of the cutoff, in which light ions are stable again. */
export function secondWindow(rfVolts: number, field: Field): { mzLow: number; mzHigh: number } {
  const magnitude = Math.abs(rfVolts);
  return {
    mzLow: mzOf(SECOND_WINDOW_Q_HIGH, magnitude, field),
    mzHigh: mzOf(SECOND_WINDOW_Q_LOW, magnitude, field),
  };
}

/** Product of `exponent` equal factors; an integer power without the operator that differs between runtimes. */
function integerPower(base: number, exponent: number): number {
  let product = 1;
  for (let i = 0; i < exponent; i++) product *= base;
  return product;
}

/** e V over m Ω² r0², plain (m per charge): the strength that both η and the effective potential are multiples of. */
function driveStrength(rfVolts: number, mz: number, field: Field): number {
  const edgeVelocity = 2 * Math.PI * field.frequency * field.fieldRadius;
  return (CHARGE_PER_ATOMIC_MASS * rfVolts) / (mz * edgeVelocity * edgeVelocity);
}

/** Adiabaticity up to which an effective potential describes the motion (Gerlich 1992, from memory). */
export const ADIABATIC_LIMIT = 0.3;

/** Part of r0 within which ions are guided safely at that adiabaticity (Gerlich 1992, from memory). */
export const USABLE_RADIUS_FRACTION = 0.8;

/**
 * Effective potential in V (eV per elementary charge) at `radiusFraction` of r0 in a rod set of `polePairs` n >= 2:
 * V* = n² e V² / (4 m Ω² r0²) · (r/r0)^(2n−2), m per charge (Gerlich, Adv. Chem. Phys. 82 (1992) 1, from memory).
 * Good while the adiabaticity is small. For n = 2 it is qV/4 at r0.
 */
export function wellDepth(
  rfVolts: number,
  mz: number,
  field: Field,
  polePairs: number,
  radiusFraction = 1,
): number {
  const shape = integerPower(radiusFraction, 2 * polePairs - 2);
  return (polePairs * polePairs * driveStrength(rfVolts, mz, field) * rfVolts * shape) / 4;
}

/**
 * Adiabaticity η = 2n(n−1) e V / (m Ω² r0²) · (r/r0)^(n−2), plain, of a rod set of `polePairs` n >= 2 (Gerlich 1992,
 * from memory; common limit 0.3). For n = 2 it is q at every radius.
 */
export function adiabaticity(
  rfVolts: number,
  mz: number,
  field: Field,
  polePairs: number,
  radiusFraction = 1,
): number {
  const shape = integerPower(radiusFraction, polePairs - 2);
  return 2 * polePairs * (polePairs - 1) * Math.abs(driveStrength(rfVolts, mz, field)) * shape;
}

/** Exact secular frequency β f / 2 in Hz of an ion at q without DC; null when it is unstable or outside the domain. */
export function secularFrequency(q: number, frequency: number): number | null {
  const beta = planeStability(0, q)?.characteristicExponent ?? null;
  return beta === null ? null : (beta * frequency) / 2;
}

/** Adiabatic secular frequency q f / sqrt(8) in Hz; low by 25 q²/128 to first order. */
export function secularFrequencyAdiabatic(q: number, frequency: number): number {
  return (Math.abs(q) * frequency) / Math.sqrt(8);
}
