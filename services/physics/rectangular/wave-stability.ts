import { type PlaneStability, type PointStability, planeStability } from "../stability.ts";
import { hasBothLevels, type RectangularWave } from "./rectangular-wave.ts";
import {
  C,
  C_SLOPE,
  FIRST_K,
  FIRST_T,
  S,
  S_SLOPE,
  SECOND_K,
  SECOND_T,
  waveHalfPeriod,
  waveHalfPeriodArray,
} from "./wave-half-period.ts";
import { zerosInHalfPeriod } from "./wave-rotation.ts";

/** Largest |a| and |q| of a rectangular wave that are computed at all. */
export const WAVE_DOMAIN_LIMIT = 100;

/**
 * Largest Σ √|K| t of a half period, levels that throw the ion out counted twice: rounding of pairs of doubles grows with
 * its exponential. The box |a|, |q| <= 12 stays below 20 whatever the duty cycle.
 */
const WAVE_GROWTH_LIMIT = 44;

/** Bound of the error of a half-trace over max(1, |half-trace|). */
export const WAVE_HALF_TRACE_ERROR = 1e-12;

const half = waveHalfPeriodArray();

function growth(k: number, t: number): number {
  return k > 0 ? Math.sqrt(k) * t : 2 * Math.sqrt(-k) * t;
}

/**
 * Stability of one plane with its own (a, q) under a rectangular wave; plain numbers, for y the caller gives (−a, −q).
 * The parameters are those of the sinusoid with V half the swing. Null outside the computed domain (|a|, |q| <=
 * WAVE_DOMAIN_LIMIT, WAVE_GROWTH_LIMIT) and for a duty cycle that is not between 0 and 1. As with the sinusoid
 * cos²(πβ/2) = C S' and sin²(πβ/2) = −S C'; the band is the number of zeros of C and S in half a period.
 */
export function planeStabilityRectangular(
  a: number,
  q: number,
  wave: RectangularWave,
): PlaneStability | null {
  if (!hasBothLevels(wave)) return null;
  if (!(Math.abs(a) <= WAVE_DOMAIN_LIMIT && Math.abs(q) <= WAVE_DOMAIN_LIMIT)) return null;
  if (q === 0) return planeStability(a, 0);
  waveHalfPeriod(a, q, wave, half);
  const grown = growth(half[FIRST_K]!, half[FIRST_T]!) + growth(half[SECOND_K]!, half[SECOND_T]!);
  if (grown > WAVE_GROWTH_LIMIT) return null;
  const cosSquared = half[C]! * half[S_SLOPE]!;
  const sinSquared = 0 - half[S]! * half[C_SLOPE]!;
  const halfTrace = cosSquared - sinSquared;
  const margin = 2 * Math.min(cosSquared, sinSquared);
  if (!(margin > 0)) return { stable: false, band: null, characteristicExponent: null, halfTrace, margin };
  const fold = Math.atan2(Math.sqrt(sinSquared), Math.sqrt(cosSquared)) / (Math.PI / 2);
  const band = zerosInHalfPeriod("C", half) + zerosInHalfPeriod("S", half);
  const characteristicExponent = band % 2 === 0 ? band + fold : band + 1 - fold;
  return { stable: true, band, characteristicExponent, halfTrace, margin };
}

/** Stability of an ion at (a, q) under a rectangular wave: x moves with (a, q), y with (−a, −q). Null as above. */
export function pointStabilityRectangular(
  a: number,
  q: number,
  wave: RectangularWave,
): PointStability | null {
  const x = planeStabilityRectangular(a, q, wave);
  const y = planeStabilityRectangular(-a, -q, wave);
  if (x === null || y === null) return null;
  if (x.stable && y.stable) {
    return { x, y, stable: true, lostTo: null, region: { x: x.band!, y: y.band! } };
  }
  return { x, y, stable: false, lostTo: x.stable ? "y" : y.stable ? "x" : "both", region: null };
}
