import { ratioForResolution } from "../../physics/set-point.ts";
import type { PassesIf } from "../finding.ts";
import { type Lever, passesIfWithin, passingInterval } from "../lever.ts";
import { NO_VOLTS } from "../resolve/negligible.ts";
import { windowOfDrive } from "../resolve/operating-point.ts";
import type { Filtering } from "../resolve/resolved-method.ts";
import { centreOf, type KnownWindow, type Window, widthOf } from "../resolve/window.ts";

type Passes = (window: Window) => boolean;

/**
 * The input that brings a window to where `passes` holds: the set m/z where that is enough; else the width, measured or
 * claimed; else the DC behind it. Windows are worked out anew at every trial, so that what is suggested does pass.
 */
export function passesIfWindowMoves(filtering: Filtering, passes: Passes): PassesIf | null {
  return (
    passesIfSetElsewhere(filtering, passes) ??
    passesIfWider(filtering, passes) ??
    passesIfDcChanges(filtering, passes)
  );
}

const CENTRINGS = 4;

/** The set m/z, where the ion in the middle of the window would pass. */
function passesIfSetElsewhere(
  { window, mz, setMz, setMzLever, windowIfSetTo }: Filtering,
  passes: Passes,
): PassesIf | null {
  if (window.kind !== "window") return null;
  let inside = setMz;
  let there: Window = window;
  for (let centring = 0; centring < CENTRINGS; centring++) {
    if (there.kind !== "window") return null;
    inside += mz - centreOf(there);
    there = windowIfSetTo(inside);
  }
  if (!passes(there)) return null;
  const reach = there.kind === "window" ? widthOf(there) : 0;
  const passesAt = (set: number) => passes(windowIfSetTo(set));
  return passesIfWithin(setMzLever, passingInterval(passesAt, inside, inside - reach, inside + reach));
}

/** Doublings of the width that are tried; a window wider than its own m/z selects nothing. */
const DOUBLINGS = 20;

function passesIfWider({ window }: Filtering, passes: Passes): PassesIf | null {
  if (window.kind !== "window" || window.widthLever === null) return null;
  const centre = centreOf(window);
  const passesAt = (width: number) =>
    passes({ ...window, mzLow: centre - width / 2, mzHigh: centre + width / 2 });
  let width = widthOf(window);
  for (let doubling = 0; doubling < DOUBLINGS && width < centre; doubling++) {
    const narrower = width;
    width = Math.min(2 * width, centre);
    if (passesAt(width)) {
      return passesIfWithin(window.widthLever, passingInterval(passesAt, width, narrower, centre));
    }
  }
  return null;
}

/** Resolutions that are tried with the DC, from the narrowest window. */
const TRIED_RESOLUTIONS = [4000, 2000, 1000, 700, 500, 350, 250, 180, 125, 90, 60, 40, 25, 15, 10, 6, 4, 2.5];

/** The DC at which the window is open as far as it must be, the RF unchanged. */
export function passesIfDcChanges({ window, filter, setMz }: Filtering, passes: Passes): PassesIf | null {
  const { rodSet } = filter.stage;
  if (window.kind === "unknown" || window.drive === null || rodSet === undefined) return null;
  const { drive } = window;
  const { rfVolts } = drive.volts;
  const lever: Lever | null = drive.dcLever(drive.row);
  if (lever === null || rfVolts < NO_VOLTS) return null;
  const passesAt = (dcVolts: number) =>
    passes(windowOfDrive({ ...drive, volts: { rfVolts, dcVolts } }, null, rodSet, lever.input));
  for (const resolution of resolutionsFrom(window.kind === "window" ? window : null, setMz)) {
    const solved = ratioForResolution(resolution);
    if (solved.kind !== "ratio") continue;
    const dcVolts = solved.ratio * rfVolts;
    if (passesAt(dcVolts)) {
      return passesIfWithin(lever, passingInterval(passesAt, dcVolts, 0, rfVolts));
    }
  }
  return null;
}

/** Widths of half a unit and more first, as methods have them. */
function resolutionsFrom(window: KnownWindow | null, mz: number): number[] {
  const own = window === null ? [] : [centreOf(window) / widthOf(window)];
  return [mz / 0.7, mz, ...own.map((resolution) => resolution / 2), ...TRIED_RESOLUTIONS];
}
