import { conventionOf, driveToCanonical, rfToCanonical } from "../../contract/drive.ts";
import { type OperatingPoint, OperatingPointByLaw } from "../instrument.ts";
import { type Lever, leverOn, leverThrough } from "../lever.ts";
import { nearestRow, placeIn, rowFor, valueAt, weightOf } from "./interpolate.ts";
import { dcLever } from "./volts-lever.ts";
import type { WindowDrive } from "./window.ts";

type Of<By extends OperatingPoint["by"]> = Extract<OperatingPoint, { by: By }>;

/** A drive with what has to be said of it, or why there is none at this m/z. */
export type DriveAt =
  | (WindowDrive & { readonly kind: "drive"; readonly note: string | null })
  | { readonly kind: "unknown"; readonly missing: readonly string[]; readonly reason: string };

/** Volts of a supply at every set m/z. */
export type SupplyLine = (setMz: number) => DriveAt;

/** How far from its own m/z a single drive point may be taken for the setting. */
const SAME_SETTING_MZ = 0.5;

/** U and V on straight lines between the points that were read from the supply, extended beyond them. */
export function lineThroughPoints({ points }: Of<"drives">, pointer: string): SupplyLine {
  const rows = points
    .map(({ mz, drive }, index) => ({ mz, drive, volts: driveToCanonical(drive), index }))
    .sort((one, other) => one.mz - other.mz);
  const mz = rows.map((row) => row.mz);
  const rf = rows.map(({ volts }) => volts.rfVolts);
  const dc = rows.map(({ volts }) => volts.dcVolts);
  const convention = conventionOf(points[0]!.drive);
  const furtherPoint = `${pointer}/points/${points.length}`;
  const withoutDc = points.flatMap(({ drive }, index) =>
    drive.dc === undefined ? [`${pointer}/points/${index}/drive/dc`] : [],
  );
  return (setMz) => {
    if (withoutDc.length > 0) {
      return {
        kind: "unknown",
        missing: withoutDc,
        reason: "A drive point of a stage that filters states no DC; its window does not follow without it.",
      };
    }
    if (rows.length === 1 && Math.abs(mz[0]! - setMz) > SAME_SETTING_MZ) {
      return {
        kind: "unknown",
        missing: [furtherPoint],
        reason: `The only drive point is not at m/z ${setMz}; a second point gives the line between them.`,
      };
    }
    const place = placeIn(mz, setMz, "extend");
    if (valueAt(rf, place) < 0) {
      return {
        kind: "unknown",
        missing: [furtherPoint],
        reason: `The line through the drive points falls below 0 V before m/z ${setMz}; a point nearby is missing.`,
      };
    }
    return {
      kind: "drive",
      volts: { rfVolts: valueAt(rf, place), dcVolts: valueAt(dc, place) },
      convention,
      row: nearestRow(place),
      dcLever: (row) => {
        const weight = weightOf(row, place);
        const stated = rows[row]!.drive.dc;
        if (weight === 0 || stated === undefined) return null;
        const lever = dcLever(stated, `${pointer}/points/${rows[row]!.index}/drive/dc`);
        const ofRow = leverThrough(lever, (dcVolts) => rowFor(dcVolts, row, dc, place))!;
        return { ...ofRow, falling: weight < 0 !== (lever.falling ?? false) };
      },
      note:
        place.outside && rows.length > 1
          ? `m/z ${setMz} lies outside the drive points (${mz[0]} to ${mz[mz.length - 1]}): their outermost line is extended.`
          : null,
    };
  };
}

/** The straight line U = slope V - offset, V proportional to the set m/z. */
export function lineByLaw(law: Of<"drive-law">, pointer: string): SupplyLine {
  const { rfPerMz, dcSlope, dcOffset_V } = law;
  const { as, between } = rfPerMz;
  const rfVoltsPerMz = rfToCanonical(rfPerMz);
  const offset = between === "pole-and-pole" ? dcOffset_V / 2 : dcOffset_V;
  return (setMz) => {
    const rfVolts = rfVoltsPerMz * setMz;
    const slope: Lever | null =
      rfVolts > 0
        ? leverThrough(
            leverOn(`${pointer}/dcSlope`, "1", OperatingPointByLaw.shape.dcSlope),
            (dcVolts) => (dcVolts + offset) / rfVolts,
          )
        : null;
    return {
      kind: "drive",
      volts: { rfVolts, dcVolts: dcSlope * rfVolts - offset },
      convention: { rf: { as, between }, dc: { between } },
      row: 0,
      dcLever: () => slope,
      note: null,
    };
  };
}
