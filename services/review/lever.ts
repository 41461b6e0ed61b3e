import type { Bounds, PassesIf } from "./finding.ts";

/** Where the contract, or the physics behind it, takes an input; a quantity of the contract is such a range. */
export interface InputRange {
  readonly minValue: number | null;
  readonly maxValue: number | null;
}

/**
 * One input of the request that sets a quantity: what the input has to be for the quantity to take a value, all else
 * unchanged. `inputFor` is monotone; `falling` where a larger quantity takes a smaller input.
 */
export interface Lever {
  readonly input: string;
  readonly unit: string;
  readonly range: InputRange;
  readonly falling?: boolean;
  readonly inputFor: (quantity: number) => number;
}

/** The lever of another quantity, on which this one's depends by a rising function. */
export function leverThrough(lever: Lever | null, quantityFor: (other: number) => number): Lever | null {
  return lever === null ? null : { ...lever, inputFor: (other) => lever.inputFor(quantityFor(other)) };
}

/** An input that is itself the quantity. */
export function leverOn(input: string, unit: string, range: InputRange): Lever {
  return { input, unit, range, inputFor: (quantity) => quantity };
}

/** The interval of the input in which the quantity stays within `needed`; null where the input cannot bring it there. */
export function passesIfWithin(lever: Lever | null, needed: Bounds): PassesIf | null {
  if (lever === null) return null;
  const { input, unit, range, falling = false, inputFor } = lever;
  const [low, high] = falling ? [needed.max, needed.min] : [needed.min, needed.max];
  const min = low === null ? null : Math.max(inwards(inputFor(low), 1), range.minValue ?? -Infinity);
  const max = high === null ? null : Math.min(inwards(inputFor(high), -1), range.maxValue ?? Infinity);
  const lowest = min ?? range.minValue ?? -Infinity;
  const highest = max ?? range.maxValue ?? Infinity;
  const reachable = lowest <= highest && lowest <= (range.maxValue ?? Infinity);
  if (!reachable || highest < (range.minValue ?? -Infinity)) return null;
  if ((min !== null && !Number.isFinite(min)) || (max !== null && !Number.isFinite(max))) return null;
  return { input, min, max, unit };
}

const DIGITS = 10;
/** Many times the rounding of the few operations between an input and a value. */
const ROUNDING = 1e-12;

/**
 * A bound with ten digits that lies a little inside the interval, so that whoever takes it at its word passes: computed
 * backwards and then forwards again, an exact bound could miss by its last bit.
 */
function inwards(bound: number, towards: 1 | -1): number {
  if (bound === 0 || !Number.isFinite(bound)) return bound;
  const inside = bound + towards * Math.abs(bound) * ROUNDING;
  const rounded = Number(inside.toPrecision(DIGITS));
  if (towards * (rounded - inside) >= 0) return rounded;
  const exponent = Number(inside.toExponential().split("e")[1]);
  return Number((rounded + towards * Number(`1e${exponent - DIGITS + 1}`)).toPrecision(DIGITS));
}

/** What both intervals of one input have in common; null where they name different inputs or share nothing. */
export function bothPassIf(one: PassesIf | null, other: PassesIf | null): PassesIf | null {
  if (one === null || other === null || one.input !== other.input) return null;
  const min = one.min === null || other.min === null ? (one.min ?? other.min) : Math.max(one.min, other.min);
  const max = one.max === null || other.max === null ? (one.max ?? other.max) : Math.min(one.max, other.max);
  return min !== null && max !== null && min > max ? null : { ...one, min, max };
}

const HALVINGS = 40;
const SAMPLES = 8;

/**
 * The ends of the interval around `inside`, which passes, between `low` and `high`, found by halving. Both ends have
 * been seen to pass, and so have samples in between: what passes need not be one interval.
 */
export function passingInterval(
  passes: (value: number) => boolean,
  inside: number,
  low: number,
  high: number,
): Bounds {
  return { min: lastPassing(passes, inside, low), max: lastPassing(passes, inside, high) };
}

function lastPassing(passes: (value: number) => boolean, inside: number, end: number): number {
  if (passes(end)) return beforeGap(passes, inside, end);
  let passing = inside;
  let failing = end;
  for (let halving = 0; halving < HALVINGS; halving++) {
    const middle = (passing + failing) / 2;
    if (middle === passing || middle === failing) break;
    if (passes(middle)) passing = middle;
    else failing = middle;
  }
  return beforeGap(passes, inside, passing);
}

/** The same end, or one nearer to `inside` where a sample on the way to it fails. */
function beforeGap(passes: (value: number) => boolean, inside: number, end: number): number {
  for (let sample = 1; sample < SAMPLES; sample++) {
    const between = inside + ((end - inside) * sample) / SAMPLES;
    if (!passes(between)) return lastPassing(passes, inside, between);
  }
  return end;
}
