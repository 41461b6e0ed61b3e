/*
 * The parameters of the Mathieu equation in every direction (Paul and Steinwedel, Z. Naturforsch. 8a (1953) 448;
 * Dawson (ed.), Quadrupole Mass Spectrometry and its Applications, 1976, chapter II):
 *
 *   a = 8 e U / (m r0² Ω²),   q = 4 e V / (m r0² Ω²),   Ω = 2 π f,
 *
 * with the rod pairs at ±(U − V cos Ωt), so U and V run from a pole to ground and V is zero-to-peak. `mz` is the
 * mass of the ion in u per elementary charge, `field` in m and Hz. A signed volt gives a signed a or q. Where a
 * divisor is zero the quantity does not exist: callers keep m/z, radius, frequency and q away from zero.
 */
import { CHARGE_PER_ATOMIC_MASS } from "./constants.ts";

/** The geometry and the clock of a rod set: field radius in m, frequency in Hz. */
export interface Field {
  readonly fieldRadius: number;
  readonly frequency: number;
}

/** e / (u π²) in C/kg: q = this · V / (m/z r0² f²). */
const Q_CONSTANT = CHARGE_PER_ATOMIC_MASS / (Math.PI * Math.PI);

/** The product m/z · q of one volt in this field; it scales every conversion of this file. */
export function mzTimesQPerVolt(field: Field): number {
  const velocity = field.fieldRadius * field.frequency;
  return Q_CONSTANT / (velocity * velocity);
}

export function aOf(mz: number, dcVolts: number, field: Field): number {
  return (2 * mzTimesQPerVolt(field) * dcVolts) / mz;
}

export function qOf(mz: number, rfVolts: number, field: Field): number {
  return (mzTimesQPerVolt(field) * rfVolts) / mz;
}

/** m/z of the ion that has this q at this amplitude. */
export function mzOf(q: number, rfVolts: number, field: Field): number {
  return (mzTimesQPerVolt(field) * rfVolts) / q;
}

/** RF amplitude in V that gives the ion this q. */
export function rfVoltsOf(mz: number, q: number, field: Field): number {
  return (mz * q) / mzTimesQPerVolt(field);
}

/** DC in V that gives the ion this a. */
export function dcVoltsOf(mz: number, a: number, field: Field): number {
  return (mz * a) / (2 * mzTimesQPerVolt(field));
}

/** Frequency in Hz at which the ion has this q; NaN-free for mz, q, rfVolts > 0. */
export function frequencyOf(mz: number, q: number, rfVolts: number, fieldRadius: number): number {
  return Math.sqrt((Q_CONSTANT * rfVolts) / (mz * q)) / fieldRadius;
}

/** Field radius in m at which the ion has this q; NaN-free for mz, q, rfVolts > 0. */
export function fieldRadiusOf(mz: number, q: number, rfVolts: number, frequency: number): number {
  return Math.sqrt((Q_CONSTANT * rfVolts) / (mz * q)) / frequency;
}
