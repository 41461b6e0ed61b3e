import { readReference } from "./read-reference.ts";

interface RectangularWaves {
  readonly points: readonly [
    a: number,
    q: number,
    dutyCycle: number,
    coupling: "dc" | "ac",
    halfTrace: number,
    margin: number,
    foldedExponent: number | null,
  ][];
  readonly lines: readonly [
    ratio: number,
    dutyCycle: number,
    coupling: "dc" | "ac",
    windows: readonly [qLow: number, qHigh: number][],
  ][];
}
/** Computed at 60 digits; generate-rectangular-waves.py says how. */
export const RECTANGULAR_WAVES = readReference<RectangularWaves>("rectangular-waves");

interface DutyCycleFilter {
  readonly duty: number;
  readonly r0_m: number;
  readonly f_Hz: number;
  readonly V_V: number;
  readonly stable: boolean;
  readonly q_low: number | null;
  readonly q_high: number | null;
  readonly mz_high: number | null;
  readonly mz_low: number | null;
}
/** DC-coupled waves without a DC supply; 50-digit matrix products, the header of passbands.json says how. */
export const DUTY_CYCLE_FILTERS = readReference<{ rectangular: readonly DutyCycleFilter[] }>(
  "passbands",
).rectangular;

/** Largest duty cycle with a passband, and its q; facts of the same computation, sixteen digits. */
export const LARGEST_DUTY_CYCLE = { dutyCycle: 0.6120989948168764, q: 0.5909132197463803 };

/** Cutoff of the square wave: 2q = k², k π/2 = 1.8751040687 the first root of cos cosh = −1 (a clamped beam's). */
export const SQUARE_WAVE_CUTOFF = 0.7124936574179347;

/**
 * Square wave with DC: apex as in Konenkov, Sudakov and Douglas, J. Am. Soc. Mass Spectrom. 13 (2002) 597, recomputed to
 * the digits shown; windows of the duty cycle alone, recomputed likewise.
 */
export const SQUARE_WAVE_APEX = { a: 0.23811, q: 0.552873, ratio: 0.215339 };
export const DUTY_CYCLE_WINDOWS = [
  { dutyCycle: 0.57, qLow: 0.35105, qHigh: 0.6266 },
  { dutyCycle: 0.6, qLow: 0.5183, qHigh: 0.6002 },
  { dutyCycle: 0.61, qLow: 0.5781, qHigh: 0.5925, resolution: 41 },
  { dutyCycle: 0.612, qLow: 0.5903, qHigh: 0.591 },
] as const;
