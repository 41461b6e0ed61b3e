import { type Field, fieldRadiusOf } from "./mathieu-parameters.ts";
import { scanLineEdges } from "./passband.ts";

/**
 * The field radius in m with which these volts (V, pole-to-ground, zero-to-peak) centre their window of the first region on
 * `mzCentre` (u per charge) at `frequency` (Hz). Null where nothing passes or the window has no centre.
 */
export function effectiveFieldRadius(
  mzCentre: number,
  dcVolts: number,
  rfVolts: number,
  frequency: Field["frequency"],
): number | null {
  if (rfVolts === 0) return null;
  const edges = scanLineEdges(dcVolts / rfVolts);
  if (edges.kind !== "window") return null;
  // The centre lies half-way in m/z, so its q is the harmonic mean of both edges.
  const q = (2 * edges.qLow * edges.qHigh) / (edges.qLow + edges.qHigh);
  return fieldRadiusOf(mzCentre, q, Math.abs(rfVolts), frequency);
}
