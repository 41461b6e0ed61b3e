import { CHARGE_PER_ATOMIC_MASS } from "./constants.ts";

/**
 * Time of flight in s through a rod set of length `rodLength` (m) at constant axial velocity. `axialEnergyVolts` is
 * the axial energy per elementary charge (V), `mz` in u per charge: t = L sqrt(m / (2 e E)).
 */
export function flightTime(mz: number, axialEnergyVolts: number, rodLength: number): number {
  return rodLength * Math.sqrt(mz / (2 * CHARGE_PER_ATOMIC_MASS * axialEnergyVolts));
}

/** Axial energy per elementary charge in V of an ion that crosses `rodLength` (m) in `time` (s). */
export function axialEnergyOf(mz: number, time: number, rodLength: number): number {
  const velocity = rodLength / time;
  return (mz * velocity * velocity) / (2 * CHARGE_PER_ATOMIC_MASS);
}

/** Number of RF cycles that an ion spends in the field; `time` in s, `frequency` in Hz. */
export function rfCycles(time: number, frequency: number): number {
  return time * frequency;
}

/**
 * The constant h of N² = h R, both values of the literature: 12.25, N = 3.5 sqrt(R) (Paul, Reinhard and von Zahn,
 * Z. Phys. 152 (1958) 143), and 20 (Austin, Holme and Leck in Dawson 1976, chapter VI). Both from memory. Which
 * height of the peak either belongs to depends on the beam, so an answer gives both.
 */
export const H_CONSTANTS: readonly { readonly h: number; readonly source: string }[] = [
  { h: 12.25, source: "Paul, Reinhard and von Zahn, Z. Phys. 152 (1958) 143 (from memory)" },
  {
    h: 20,
    source:
      "Austin, Holme and Leck in Dawson (ed.), Quadrupole Mass Spectrometry and its Applications, 1976 (from memory)",
  },
];

/** Resolution centre/width that `cycles` RF cycles can form: N²/h. */
export function attainableResolution(cycles: number, h: number): number {
  return (cycles * cycles) / h;
}

/**
 * Shift of the window during the flight over its width, and the share of the peak height that it costs. Peak shapes
 * at 228 RF cycles, computed in house for this table; at 1.0 two beams gave 40 % and 47 % and the worse one stands.
 */
const SCAN_LOSS: readonly (readonly [shiftOverWidth: number, loss: number])[] = [
  [0, 0],
  [0.25, 0.08],
  [0.33, 0.11],
  [0.5, 0.18],
  [1, 0.47],
  [2, 0.91],
];

/**
 * Share (0..1) of the peak height lost because the field moves by `shiftOverWidth` window widths while an ion flies:
 * linear interpolation of SCAN_LOSS, good enough for a sentence and for nothing else; null outside 0..2.
 */
export function scanLossOf(shiftOverWidth: number): number | null {
  if (!(shiftOverWidth >= 0 && shiftOverWidth <= 2)) return null;
  for (let i = 1; i < SCAN_LOSS.length; i++) {
    const [x1, y1] = SCAN_LOSS[i]!;
    if (shiftOverWidth > x1) continue;
    const [x0, y0] = SCAN_LOSS[i - 1]!;
    return y0 + ((shiftOverWidth - x0) / (x1 - x0)) * (y1 - y0);
  }
  return null;
}
