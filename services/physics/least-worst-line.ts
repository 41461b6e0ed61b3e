/*
 * The best straight line in Chebyshev's sense: changes of slope and offset that make the largest of many errors least.
 *
 * Each error is e + g · (Δslope · V − Δoffset) with g of one sign, so that the two unknowns form a Haar system over V > 0
 * (Cheney, Introduction to Approximation Theory, 1966, chapter 3; from memory): the best line is the one whose error has
 * equal size and alternating sign at three of the points, and exchanging one of the three for the worst violator until
 * there is none finds them (Remez's exchange).
 */

/** An error at an amplitude V, and its derivative `gain` by U = slope · V − offset. */
export interface ErrorAt {
  readonly rfVolts: number;
  readonly error: number;
  readonly gain: number;
}

/** The change of the line, and the size of the largest error that is left. */
export interface LineThroughErrors {
  readonly slope: number;
  readonly offset: number;
  readonly worst: number;
}

type Triple = readonly [number, number, number];

/** The line whose errors at three points are +h, −h, +h. */
function levelled(errors: readonly ErrorAt[], triple: Triple) {
  const [one, two, three] = triple.map((index) => errors[index]!) as [ErrorAt, ErrorAt, ErrorAt];
  // Divided by the gain every point asks for U to change by (± h − e)/g; a line exists where the second difference vanishes.
  const span = three.rfVolts - one.rfVolts;
  const left = (three.rfVolts - two.rfVolts) / span;
  const right = (two.rfVolts - one.rfVolts) / span;
  const ofError = left * (one.error / one.gain) - two.error / two.gain + right * (three.error / three.gain);
  const ofLevel = left / one.gain + 1 / two.gain + right / three.gain;
  const level = ofError / ofLevel;
  const first = (level - one.error) / one.gain;
  const last = (level - three.error) / three.gain;
  const slope = (last - first) / span;
  return { level, slope, offset: slope * one.rfVolts - first };
}

const MOST_EXCHANGES = 200;
/** Excess over the level, relative to it, that counts as rounding. */
const ROUNDING = 1e-12;

/** The triple with `index` in place of one of its points, so that the signs still alternate. */
function exchanged(triple: Triple, index: number, level: number, error: number): Triple {
  const [one, two, three] = triple;
  const same = level >= 0 === error >= 0;
  if (index < one) return same ? [index, two, three] : [index, one, two];
  if (index > three) return same ? [one, two, index] : [two, three, index];
  if (index < two) return same ? [index, two, three] : [one, index, three];
  return same ? [one, two, index] : [one, index, three];
}

/** Points in rising V, at least three; null where the exchange does not end. */
export function leastWorstStep(errors: readonly ErrorAt[]): LineThroughErrors | null {
  if (errors.length < 3) return null;
  let triple: Triple = [0, errors.length >> 1, errors.length - 1];
  for (let i = 0; i < MOST_EXCHANGES; i++) {
    const { level, slope, offset } = levelled(errors, triple);
    let worst = Math.abs(level);
    let index = -1;
    let errorThere = 0;
    for (const [at, { rfVolts, error, gain }] of errors.entries()) {
      const left = error + gain * (slope * rfVolts - offset);
      if (Math.abs(left) > worst) {
        worst = Math.abs(left);
        index = at;
        errorThere = left;
      }
    }
    if (index < 0 || worst <= Math.abs(level) * (1 + ROUNDING) || triple.includes(index)) {
      return { slope, offset, worst };
    }
    triple = exchanged(triple, index, level, errorThere);
  }
  return null;
}
