/** A deviation found by a check, and where. */
export interface Deviation {
  readonly at: string;
  readonly error: number;
}

/** Bounds may exceed the measured worst case this many times; past that they would hide a loss of digits. */
const SLACKEST = 50;
/** An exact agreement still leaves room for the rounding of one double. */
const ROUNDING = 2.220446049250313e-16;

/** The largest deviation of a list; a missing, non-finite or negative one is an error of the check itself. */
function worstOf(deviations: readonly Deviation[]): Deviation {
  if (deviations.length === 0) throw new Error("nothing was compared");
  let worst = deviations[0]!;
  for (const deviation of deviations) {
    if (!(deviation.error >= 0 && deviation.error < Number.POSITIVE_INFINITY)) {
      throw new Error(`no usable deviation at ${deviation.at}: ${deviation.error}`);
    }
    if (deviation.error > worst.error) worst = deviation;
  }
  return worst;
}

/**
 * Fails when the worst deviation exceeds `bound`, and also when the bound has become more than fifty times too slack:
 * a tolerance is a measurement, to be written down anew when the code improves.
 */
export function expectWithin(bound: number, deviations: readonly Deviation[]): void {
  const worst = worstOf(deviations);
  if (worst.error > bound) {
    throw new Error(
      `deviation ${worst.error.toExponential(2)} at ${worst.at} exceeds ${bound.toExponential(1)}`,
    );
  }
  const slackest = SLACKEST * Math.max(worst.error, ROUNDING);
  if (bound > slackest) {
    throw new Error(
      `bound ${bound.toExponential(1)} is too slack: the worst deviation is ${worst.error.toExponential(2)} at ${worst.at}`,
    );
  }
}

/** |value − reference| / |reference|; the reference must not be zero. */
export function relativeError(value: number, reference: number): number {
  return Math.abs(value - reference) / Math.abs(reference);
}
