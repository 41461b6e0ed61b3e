import { fitPolynomial, type PolynomialFit } from "./polynomial-fit.ts";
import { studentT } from "./student-t.ts";

/** The offset found at a tune (observed less set m/z) at a time in hours. */
export interface TuneRecord {
  readonly time_h: number;
  readonly offset: number;
}

export type NoInterval =
  | "too-few-records"
  | "records-at-one-time"
  | "drift-not-distinguishable"
  | "limit-already-reached";

export interface RetuneInterval {
  readonly reason: NoInterval | null;
  readonly slope_perHour: number | null;
  readonly slopeStandardUncertainty_perHour: number | null;
  readonly degreesOfFreedom: number;
  /** Hours after the last record until the line reaches the limit; null where the slope is not distinguishable from none. */
  readonly expected_h: number | null;
  /** Hours after the last record until a single offset may be beyond the limit, at the stated confidence. */
  readonly atConfidence_h: number | null;
}

/** A slope needs two records, and its uncertainty a third. */
const FEWEST = 3;
/** An interval longer than this is not told from none: a century. */
const LONGEST_H = 876_600;
const HALVINGS = 80;

function none(reason: NoInterval, count: number): RetuneInterval {
  return {
    reason,
    slope_perHour: null,
    slopeStandardUncertainty_perHour: null,
    degreesOfFreedom: Math.max(0, count - 2),
    expected_h: null,
    atConfidence_h: null,
  };
}

/** Straight line through successive tune records, and how long it stays within ± `limit` after the last of them. */
export function retuneInterval(
  records: readonly TuneRecord[],
  limit: number,
  confidence: number,
): RetuneInterval {
  if (records.length < FEWEST) return none("too-few-records", records.length);
  const fit = fitPolynomial(
    records.map(({ time_h, offset }) => ({ at: time_h, value: offset, weight: 1 })),
    1,
  );
  if (typeof fit === "string") return none("records-at-one-time", records.length);
  const last = records.reduce((latest, { time_h }) => Math.max(latest, time_h), Number.NEGATIVE_INFINITY);
  const { value: slope, standardUncertainty } = fit.coefficients[1]!;
  const now = fit.predict(last, confidence, 1);
  const real = Math.abs(slope) > studentT(confidence, fit.degreesOfFreedom) * standardUncertainty!;
  const reached = Math.abs(now.value) >= limit;
  return {
    reason: reached ? "limit-already-reached" : real ? null : "drift-not-distinguishable",
    slope_perHour: slope,
    slopeStandardUncertainty_perHour: standardUncertainty,
    degreesOfFreedom: fit.degreesOfFreedom,
    expected_h: reached ? 0 : real ? (Math.sign(slope) * limit - now.value) / slope : null,
    atConfidence_h: firstBeyond(fit, last, limit, confidence),
  };
}

/** When the prediction interval first touches the limit; it may be there already. */
function firstBeyond(fit: PolynomialFit, last: number, limit: number, confidence: number): number | null {
  const beyond = (hours: number) => {
    const { value, halfInterval } = fit.predict(last + hours, confidence, 1);
    return Math.abs(value) + halfInterval! > limit;
  };
  if (beyond(0)) return 0;
  if (!beyond(LONGEST_H)) return null;
  let within = 0;
  let outside = LONGEST_H;
  for (let i = 0; i < HALVINGS; i++) {
    const middle = (within + outside) / 2;
    if (beyond(middle)) outside = middle;
    else within = middle;
  }
  return within;
}
