/*
 * The Meissner equation w'' + K(ξ) w = 0 with K = a + 2q s₁ for the fraction d of the period π and a − 2q s₂ for the
 * rest (Meissner, Schweizerische Bauzeitung 72 (1918) 95, from memory; Konenkov, Sudakov and Douglas, J. Am. Soc. Mass
 * Spectrom. 13 (2002) 597, on matrix methods for any waveform); s₁ and s₂ are the levels of rectangular-wave.ts. The
 * wave is even about the middle of either level, so half a period from middle to middle decides everything, and its
 * matrix is the product of two exact ones. With z = K t², t the length of a level's half,
 *
 *   cos √z = 1 − f,   sin √z / √z = 1 − e,
 *
 * and the slope C' is written as −(π/2)(mean of K) plus terms with f and e, so that nothing cancels where the mean of K
 * is small: there the high m/z edge runs into the origin.
 */
import { lowerLevel, meanLevel, type RectangularWave, upperLevel } from "./rectangular-wave.ts";
import { waveHalfPeriodExtended } from "./wave-half-period-extended.ts";

/** Growth of rounding in the products that a half-trace right to 1e-12 allows. */
const PLAIN_GROWTH = 100;
/** Below this |z| the differences f and e are summed as series. */
const SMALL_Z = 0.25;

/** f and e of one level. */
const first = new Float64Array(2);
const second = new Float64Array(2);

function levelFunctions(z: number, out: Float64Array): void {
  if (Math.abs(z) < SMALL_Z) {
    let term = z / 2;
    let f = term;
    let e = term / 3;
    for (let k = 2; k <= 8; k++) {
      term *= -z / (2 * k * (2 * k - 1));
      f += term;
      e += term / (2 * k + 1);
    }
    out[0] = f;
    out[1] = e;
  } else if (z > 0) {
    const phase = Math.sqrt(z);
    const sine = Math.sin(phase / 2);
    out[0] = 2 * sine * sine;
    out[1] = 1 - Math.sin(phase) / phase;
  } else {
    const phase = Math.sqrt(-z);
    const sine = Math.sinh(phase / 2);
    out[0] = -2 * sine * sine;
    out[1] = 1 - Math.sinh(phase) / phase;
  }
}

/** Positions in the array that waveHalfPeriod writes. */
export const C = 0;
export const C_SLOPE = 1;
export const S = 2;
export const S_SLOPE = 3;
export const FIRST_K = 4;
export const FIRST_T = 5;
export const SECOND_K = 6;
export const SECOND_T = 7;

export function waveHalfPeriodArray(): Float64Array {
  return new Float64Array(8);
}

/**
 * Writes C, C', S, S' at the middle of the lower level, of the solutions with C = 1, C' = 0 and S = 0, S' = 1 in the
 * middle of the upper one, and K and t of both levels. Plain numbers; q of either sign, 0 < d < 1. The half-trace over
 * the whole period is C S' + S C'.
 */
export function waveHalfPeriod(a: number, q: number, wave: RectangularWave, out: Float64Array): void {
  const d = wave.dutyCycle;
  const k1 = a + 2 * q * upperLevel(wave);
  const k2 = a - 2 * q * lowerLevel(wave);
  const t1 = (Math.PI / 2) * d;
  const t2 = (Math.PI / 2) * (1 - d);
  out[FIRST_K] = k1;
  out[FIRST_T] = t1;
  out[SECOND_K] = k2;
  out[SECOND_T] = t2;
  levelFunctions(k1 * t1 * t1, first);
  levelFunctions(k2 * t2 * t2, second);
  const f1 = first[0]!;
  const e1 = first[1]!;
  const f2 = second[0]!;
  const e2 = second[1]!;
  const cosines = (1 - f1) * (1 - f2);
  const sines = t1 * (1 - e1) * (t2 * (1 - e2));
  const endC = cosines - k1 * sines;
  const endDs = cosines - k2 * sines;
  const growth =
    (Math.abs(cosines) + Math.abs(k1 * sines)) * Math.abs(endDs) +
    (Math.abs(cosines) + Math.abs(k2 * sines)) * Math.abs(endC);
  if (growth > PLAIN_GROWTH * Math.max(1, Math.abs(endC * endDs))) {
    waveHalfPeriodExtended(a, q, wave, out);
    return;
  }
  const mean = (Math.PI / 2) * (a + 2 * q * meanLevel(wave));
  out[C] = endC;
  out[C_SLOPE] = k1 * t1 * (e1 + f2 - e1 * f2) + k2 * t2 * (e2 + f1 - e2 * f1) - mean;
  out[S] = t1 * (1 - e1) * (1 - f2) + t2 * (1 - e2) * (1 - f1);
  out[S_SLOPE] = endDs;
}
