import { Width, widthInMz } from "../../contract/width.ts";
import type { OperatingPoint } from "../instrument.ts";
import type { Lever } from "../lever.ts";
import { nearestRow, type Place, placeIn, rowFor, valueAt } from "./interpolate.ts";
import type { Window } from "./window.ts";

type MeasuredPeaks = Extract<OperatingPoint, { by: "measured-peaks" }>;

/** Windows at every set m/z: offset and width on straight lines between the peaks of a tune report, held beyond them. */
export function windowsBetweenPeaks({ peaks }: MeasuredPeaks, pointer: string): (setMz: number) => Window {
  if (new Set(peaks.map(({ width }) => width.at)).size > 1) {
    const unknown: Window = {
      kind: "unknown",
      missing: [`${pointer}/peaks`],
      reason:
        "The widths of the peaks are taken at different heights; one line through them needs one height.",
    };
    return () => unknown;
  }
  const rows = peaks
    .map((peak, index) => ({ ...peak, index, width_mz: widthInMz(peak.width, peak.observedMz) }))
    .sort((one, other) => one.setMz - other.setMz);
  const set = rows.map(({ setMz }) => setMz);
  const shifts = rows.map(({ setMz, observedMz }) => observedMz - setMz);
  const widths = rows.map(({ width_mz }) => width_mz);

  const leverOfWidth = (place: Place): Lever => {
    const row = nearestRow(place);
    const { index, width, observedMz } = rows[row]!;
    return {
      input: `${pointer}/peaks/${index}/width/value`,
      unit: "1",
      range: Width.shape.value,
      falling: width.as === "resolution",
      inputFor: (wanted) => {
        const ofRow = rowFor(wanted, row, widths, place);
        return width.as === "mz" ? ofRow : ofRow > 0 ? observedMz / ofRow : Number.POSITIVE_INFINITY;
      },
    };
  };

  return (setMz) => {
    const place = placeIn(set, setMz, "hold");
    const centre = setMz + valueAt(shifts, place);
    const width = valueAt(widths, place);
    const widthLever = leverOfWidth(place);
    return {
      kind: "window",
      mzLow: centre - width / 2,
      mzHigh: centre + width / 2,
      height: rows[0]!.width.at,
      evidence: "measured",
      drive: null,
      note: place.outside
        ? `m/z ${setMz} lies outside the measured peaks (${set[0]} to ${set[set.length - 1]}): offset and width of the nearest one are held.`
        : null,
      widthPointer: widthLever.input,
      widthLever,
    };
  };
}
