import type { Pair } from "./comparison-pairs.ts";
import type { ComparedSetting } from "./comparison-schema.ts";
import type { Setting } from "./sign-off-schema.ts";

type Carried = Pick<ComparedSetting, "reason" | "shiftOfWidth"> & { readonly carriesOver: boolean | null };

/**
 * The setting where it does not carry over, or where that cannot be told; null where it does. A window carries over
 * when neither edge moves by more than `withinOfWidth` of its width; a cutoff, when it moves by no more than that part
 * of its distance from the ion.
 */
export function comparedSetting(
  { base, other }: Pair<Setting>,
  withinOfWidth: number,
): ComparedSetting | null {
  const { acquisition, ion } = (base ?? other)!;
  const carried = carriedOver(base, other, withinOfWidth);
  if (carried.carriesOver === true) return null;
  return { acquisition, ion, ...carried, base: base && sideOf(base), other: other && sideOf(other) };
}

function carriedOver(base: Setting | null, other: Setting | null, within: number): Carried {
  const untold = (reason: ComparedSetting["reason"]): Carried => ({
    carriesOver: null,
    reason,
    shiftOfWidth: null,
  });
  if (base === null) return { ...untold("only-in-other"), carriesOver: false };
  if (other === null) return { ...untold("only-in-base"), carriesOver: false };
  const moved = (reason: ComparedSetting["reason"], shiftOfWidth: number): Carried => ({
    carriesOver: shiftOfWidth <= within,
    reason,
    shiftOfWidth,
  });
  if (base.window !== null && other.window !== null) {
    if (base.window.at !== other.window.at) return untold("other-height");
    const { mzLow, mzHigh } = base.window;
    const shift = Math.max(Math.abs(other.window.mzLow - mzLow), Math.abs(other.window.mzHigh - mzHigh));
    return mzHigh > mzLow ? moved("window-moved", shift / (mzHigh - mzLow)) : untold("not-known");
  }
  if (base.window === null && other.window === null && base.cutoffMz !== null && other.cutoffMz !== null) {
    const room = Math.abs(base.mz - base.cutoffMz);
    const shift = Math.abs(other.cutoffMz - base.cutoffMz);
    return shift === 0
      ? moved("cutoff-moved", 0)
      : room > 0
        ? moved("cutoff-moved", shift / room)
        : untold("not-known");
  }
  return untold("not-known");
}

function sideOf({ stage, setMz, window, cutoffMz }: Setting): ComparedSetting["base"] {
  return {
    stage,
    setMz,
    window: window && { mzLow: window.mzLow, mzHigh: window.mzHigh, at: window.at },
    cutoffMz,
  };
}
