/** A zero between two ends of opposite sign, with the number of evaluations it took. */
export type BracketedZero =
  | { readonly kind: "zero"; readonly at: number; readonly steps: number }
  | { readonly kind: "not-converged"; readonly steps: number };

/**
 * The zero of a continuous function between `low` and `high`, at which it has the values given, of opposite sign or
 * zero. Inverse quadratic interpolation where the three last points allow it, else halving (Chandrupatla, Adv. Eng.
 * Softw. 28 (1997) 145), so that the bracket never loses the zero; plain numbers of any unit. Ends when the bracket is
 * narrower than `tolerance` times the zero.
 */
export function bracketedZero(
  valueAt: (x: number) => number,
  low: number,
  valueAtLow: number,
  high: number,
  valueAtHigh: number,
  tolerance: number,
  maxSteps: number,
): BracketedZero {
  let newest = high;
  let newestValue = valueAtHigh;
  let opposite = low;
  let oppositeValue = valueAtLow;
  let share = 0.5;
  for (let steps = 0; steps <= maxSteps; steps++) {
    const better = Math.abs(newestValue) < Math.abs(oppositeValue);
    const best = better ? newest : opposite;
    const bestValue = better ? newestValue : oppositeValue;
    const span = Math.abs(opposite - newest);
    const least = (tolerance * Math.abs(best)) / span;
    if (bestValue === 0 || !(least < 0.5)) return { kind: "zero", at: best, steps };
    share = Math.min(1 - least, Math.max(least, share));
    const x = newest + share * (opposite - newest);
    if (x === newest || x === opposite) return { kind: "zero", at: best, steps };
    const value = valueAt(x);
    let past = newest;
    let pastValue = newestValue;
    if (value > 0 !== newestValue > 0) {
      past = opposite;
      pastValue = oppositeValue;
      opposite = newest;
      oppositeValue = newestValue;
    }
    newest = x;
    newestValue = value;
    share = interpolatedShare(newest, newestValue, opposite, oppositeValue, past, pastValue);
  }
  return { kind: "not-converged", steps: maxSteps };
}

/** How far from the newest point towards the opposite end the next one lies. */
function interpolatedShare(
  newest: number,
  newestValue: number,
  opposite: number,
  oppositeValue: number,
  past: number,
  pastValue: number,
): number {
  const ratio = (newest - opposite) / (past - opposite);
  const valueRatio = (newestValue - oppositeValue) / (pastValue - oppositeValue);
  const monotone = valueRatio * valueRatio < ratio && (1 - valueRatio) * (1 - valueRatio) < 1 - ratio;
  if (!monotone) return 0.5;
  const toOpposite =
    (newestValue / (oppositeValue - newestValue)) * (pastValue / (oppositeValue - pastValue));
  const toPast =
    (((past - newest) / (opposite - newest)) * newestValue * oppositeValue) /
    ((pastValue - newestValue) * (pastValue - oppositeValue));
  return toOpposite + toPast;
}
