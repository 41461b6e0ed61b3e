import { characteristicA, characteristicB } from "../characteristic-values.ts";
import { bracketedZero } from "./bracketed-zero.ts";
import { REGIONS, REGIONS_LIMIT, type StabilityRegion } from "./stability-regions.ts";

/** A part of the (a, q) plane, plain numbers; q is taken as above zero. */
export interface Box {
  readonly aMin: number;
  readonly aMax: number;
  readonly qMin: number;
  readonly qMax: number;
}

/** `complete` is false where the box reaches beyond REGIONS_LIMIT, where further regions exist. */
export interface RegionsInBox {
  readonly regions: readonly StabilityRegion[];
  readonly complete: boolean;
}

const MAX_STEPS = 200;

/** A side of a region: a by q, and the q of its two corners. */
interface Side {
  readonly at: (q: number) => number;
  readonly from: number;
  readonly to: number;
}

/** The regions of which some part lies inside the box. */
export function regionsInBox(box: Box): RegionsInBox {
  const complete =
    Math.max(Math.abs(box.aMin), Math.abs(box.aMax)) <= REGIONS_LIMIT && box.qMax <= REGIONS_LIMIT;
  return { regions: REGIONS.filter((region) => meets(region, box)), complete };
}

/**
 * At one q the region is the interval between its higher lower curve and its lower upper curve. Where this interval and
 * the box begin or cease to overlap, two of the curves meet (a corner) or one of them meets a side of the box: between
 * consecutive such q nothing changes, and one look half-way decides.
 */
function meets(region: StabilityRegion, { aMin, aMax, qMin, qMax }: Box): boolean {
  const { bands, inner, highTip, outer, lowTip } = region;
  const lowerX: Side = { at: (q) => characteristicA(bands.x, q)!, from: inner.q, to: lowTip.q };
  const lowerY: Side = { at: (q) => -characteristicB(bands.y + 1, q)!, from: lowTip.q, to: outer.q };
  const upperX: Side = { at: (q) => characteristicB(bands.x + 1, q)!, from: highTip.q, to: outer.q };
  const upperY: Side = { at: (q) => -characteristicA(bands.y, q)!, from: inner.q, to: highTip.q };
  const first = Math.max(qMin, inner.q);
  const last = Math.min(qMax, outer.q);
  if (!(first < last && aMin < aMax)) return false;
  const turns = [first, last];
  for (const q of [highTip.q, lowTip.q]) if (q > first && q < last) turns.push(q);
  for (const a of [aMin, aMax]) {
    for (const side of [lowerX, lowerY, upperX, upperY]) {
      const q = meetingQ(side, a);
      if (q !== null && q > first && q < last) turns.push(q);
    }
  }
  turns.sort((one, other) => one - other);
  for (let i = 1; i < turns.length; i++) {
    const q = (turns[i - 1]! + turns[i]!) / 2;
    const lower = Math.max(aMin, lowerX.at(q), lowerY.at(q));
    const upper = Math.min(aMax, upperX.at(q), upperY.at(q));
    if (lower < upper && turns[i]! > turns[i - 1]!) return true;
  }
  return false;
}

/** Between its corners every side is monotone in q (the tests look), so that it reaches an a once or never. */
function meetingQ({ at, from, to }: Side, a: number): number | null {
  const atFrom = at(from) - a;
  const atTo = at(to) - a;
  if (atFrom * atTo > 0) return null;
  const zero = bracketedZero((q) => at(q) - a, from, atFrom, to, atTo, 1e-15, MAX_STEPS);
  return zero.kind === "zero" ? zero.at : null;
}
