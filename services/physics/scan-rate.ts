import { scanLossOf } from "./transit.ts";

/** The largest shift over width of which a loss is known. */
const MOST_SHIFT = 2;

/**
 * The shift of the window during the flight, over its width, that costs `loss` (0..1) of the peak height: the inverse of
 * scanLossOf, with its accuracy. Null where the loss is not above zero or beyond the largest that is known.
 */
export function shiftForLoss(loss: number): number | null {
  const most = scanLossOf(MOST_SHIFT)!;
  if (!(loss > 0 && loss <= most)) return null;
  let below = 0;
  let above = MOST_SHIFT;
  // Fifty-four halvings of 2 reach the spacing of doubles.
  for (let i = 0; i < 54; i++) {
    const middle = (below + above) / 2;
    if (scanLossOf(middle)! <= loss) below = middle;
    else above = middle;
  }
  return above;
}

/** Fastest scan in m/z per s at which the window moves by `shiftOverWidth` of its width during a flight of `flightTime` s. */
export function fastestScanRate(mzWidth: number, shiftOverWidth: number, flightTime: number): number {
  return (shiftOverWidth * mzWidth) / flightTime;
}
