import jstat from "jstat";

/** Probability that |t| exceeds `t`: Abramowitz and Stegun 26.7.3 and 26.7.4, finite sums for whole degrees of freedom. */
export function twoSidedTail(t: number, degreesOfFreedom: number): number {
  const angle = Math.atan(t / Math.sqrt(degreesOfFreedom));
  const cosine = Math.cos(angle);
  const odd = degreesOfFreedom % 2 === 1;
  let term = odd ? cosine : 1;
  let sum = degreesOfFreedom === 1 ? 0 : term;
  for (let k = odd ? 3 : 2; k <= degreesOfFreedom - 2; k += 2) {
    term *= (cosine * cosine * (k - 1)) / k;
    sum += term;
  }
  return odd ? 1 - (2 / Math.PI) * (angle + Math.sin(angle) * sum) : 1 - Math.sin(angle) * sum;
}

/** Density at t over its value at 0, without a power that differs between releases of Node.js. */
function density(t: number, degreesOfFreedom: number): number {
  return Math.exp((-(degreesOfFreedom + 1) / 2) * Math.log1p((t * t) / degreesOfFreedom));
}

/** Γ((ν+1)/2) / (√(νπ) Γ(ν/2)), the density at 0, by its recurrence in steps of two. */
function densityAtZero(degreesOfFreedom: number): number {
  const odd = degreesOfFreedom % 2 === 1;
  let ratio = odd ? 1 / Math.sqrt(Math.PI) : Math.sqrt(Math.PI) / 2;
  for (let k = odd ? 1 : 2; k < degreesOfFreedom; k += 2) ratio *= (k + 1) / k;
  return ratio / Math.sqrt(degreesOfFreedom * Math.PI);
}

/**
 * t for which |t| stays below it with this confidence (0..1), for a whole number of degrees of freedom. The library's value
 * is right to 6e-8; Newton steps on the finite sums give the other digits.
 */
export function studentT(confidence: number, degreesOfFreedom: number): number {
  let t = jstat.jStat.studentt.inv((1 + confidence) / 2, degreesOfFreedom);
  const atZero = densityAtZero(degreesOfFreedom);
  for (let step = 0; step < 2; step++) {
    t += (twoSidedTail(t, degreesOfFreedom) - (1 - confidence)) / (2 * atZero * density(t, degreesOfFreedom));
  }
  return t;
}
