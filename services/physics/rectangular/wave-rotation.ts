import { C, C_SLOPE, FIRST_K, FIRST_T, S, S_SLOPE, SECOND_K, SECOND_T } from "./wave-half-period.ts";

/** Zeros of the even ("C") or the odd ("S") solution after the middle of the upper level, up to that of the lower. */
export function zerosInHalfPeriod(solution: "C" | "S", half: Float64Array): number {
  const k1 = half[FIRST_K]!;
  const k2 = half[SECOND_K]!;
  const t1 = half[FIRST_T]!;
  const t2 = half[SECOND_T]!;
  const endsPositive = half[solution === "C" ? C : S]! > 0;
  // Thrown outwards by the upper level, a solution reaches its first zero after a quarter oscillation of the lower, its
  // second after three quarters.
  if (k1 <= 0 && k2 * t2 * t2 < Math.PI * Math.PI) return endsPositive ? 0 : 1;
  const phase1 = Math.sqrt(Math.abs(k1)) * t1;
  const zerosFirst = k1 > 0 ? Math.floor(phase1 / Math.PI + (solution === "C" ? 0.5 : 0)) : 0;
  // A solution that does not oscillate has one zero at most, and the sign at the end tells.
  if (k2 <= 0) return (zerosFirst % 2 === 0) === endsPositive ? zerosFirst : zerosFirst + 1;
  const entry = entryPhase(solution, k1, phase1, t1, Math.sqrt(k2));
  const turns = (Math.sqrt(k2) * t2 - entry) / Math.PI + 0.5;
  const zeros = zerosFirst + Math.floor(turns) - Math.floor(0.5 - entry / Math.PI);
  if ((zeros % 2 === 0) === endsPositive) return zeros;
  // A zero hard by the end: the sign there is right to the last digit, the phase is not.
  return turns - Math.floor(turns) < 0.5 ? zeros - 1 : zeros + 1;
}

/** δ of w = R cos(√K₂ τ − δ) where the solution enters the lower level. */
function entryPhase(solution: "C" | "S", k1: number, phase1: number, t1: number, frequency2: number): number {
  const frequency1 = Math.sqrt(Math.abs(k1));
  if (k1 > 0) {
    const sine = Math.sin(phase1);
    const cosine = Math.cos(phase1);
    return solution === "C"
      ? Math.atan2((-frequency1 * sine) / frequency2, cosine)
      : Math.atan2(cosine / frequency2, sine / frequency1);
  }
  if (k1 === 0) return solution === "C" ? 0 : Math.atan2(1 / frequency2, t1);
  const tangent = Math.tanh(phase1);
  return solution === "C"
    ? Math.atan2((frequency1 * tangent) / frequency2, 1)
    : Math.atan2(frequency1 / frequency2, tangent);
}

/**
 * In the plane of (w, −w') the even solution starts at the angle 0, the odd one at −π/2. This is the whole number of
 * quarter turns below the angle at the end. On a scan line a solution crosses a whole number of quarter turns, that is an
 * edge, only forwards as q rises: there q dθ/dq has the sign of ∫ w'² (an indefinite weight does not alter this).
 */
export function quarterTurns(solution: "C" | "S", half: Float64Array): number {
  const zeros = zerosInHalfPeriod(solution, half);
  const position = half[solution === "C" ? C : S]!;
  const slope = half[solution === "C" ? C_SLOPE : S_SLOPE]!;
  return position < 0 === slope > 0 ? 2 * zeros : 2 * zeros - 1;
}
