import { conventionOf, driveToCanonical, rfToCanonical } from "../../contract/drive.ts";
import { fieldOf } from "../../contract/rod-set.ts";
import { type Width, widthInMz } from "../../contract/width.ts";
import { passbandOf } from "../../physics/passband.ts";
import type { MassFilterStage, OperatingPoint } from "../instrument.ts";
import { interpolate } from "./interpolate.ts";
import type { Placed } from "./resolved-method.ts";
import type { Window, WindowDrive } from "./window.ts";

type Of<By extends OperatingPoint["by"]> = Extract<OperatingPoint, { by: By }>;

/** A claim of the method on the width of a window, and where it stands. */
export interface Claim {
  readonly width: Width;
  readonly pointer: string;
}

/** What a mass filter lets through when it is set to this m/z. */
export function windowAt(filter: Placed<MassFilterStage>, setMz: number, claim: Claim | null): Window {
  const { operatingPoint } = filter.stage;
  const pointer = `${filter.pointer}/operatingPoint`;
  switch (operatingPoint?.by) {
    case "measured-peaks":
      return measuredWindow(operatingPoint, setMz, pointer);
    case "drives":
    case "drive-law": {
      const setting = voltsAt(operatingPoint, setMz);
      if (setting === null) {
        return {
          kind: "unknown",
          missing: [`${pointer}/points`],
          reason: `The only drive point is not at m/z ${setMz}; a second point gives the line between them.`,
        };
      }
      return computedWindow(filter, setting, pointer);
    }
    case "stated":
      return statedWindow(claim ?? { width: operatingPoint.width, pointer: `${pointer}/width` }, setMz);
    default:
      return { kind: "unknown", missing: [pointer], reason: "No operating point is stated." };
  }
}

function measuredWindow({ peaks }: Of<"measured-peaks">, setMz: number, pointer: string): Window {
  const sorted = peaks
    .map((peak, index) => ({ ...peak, index, width_mz: widthInMz(peak.width, peak.observedMz) }))
    .sort((one, other) => one.setMz - other.setMz);
  const heights = new Set(sorted.map((peak) => peak.width.at));
  if (heights.size > 1) {
    return {
      kind: "unknown",
      missing: [`${pointer}/peaks`],
      reason:
        "The widths of the peaks are taken at different heights; one line through them needs one height.",
    };
  }
  const shift = interpolate(
    sorted.map((peak) => ({ x: peak.setMz, y: peak.observedMz - peak.setMz })),
    setMz,
    "hold",
  );
  const width = interpolate(
    sorted.map((peak) => ({ x: peak.setMz, y: peak.width_mz })),
    setMz,
    "hold",
  );
  const nearest = sorted.reduce((best, peak) =>
    Math.abs(peak.setMz - setMz) < Math.abs(best.setMz - setMz) ? peak : best,
  );
  const centre = setMz + shift.value;
  return {
    kind: "window",
    mzLow: centre - width.value / 2,
    mzHigh: centre + width.value / 2,
    height: sorted[0]!.width.at,
    evidence: "measured",
    drive: null,
    note: shift.outside
      ? `m/z ${setMz} lies outside the measured peaks (${sorted[0]!.setMz} to ${sorted[sorted.length - 1]!.setMz}): offset and width of the nearest one are held.`
      : null,
    widthPointer: `${pointer}/peaks/${nearest.index}/width/value`,
  };
}

function statedWindow(claim: Claim, setMz: number): Window {
  const width = widthInMz(claim.width, setMz);
  return {
    kind: "window",
    mzLow: setMz - width / 2,
    mzHigh: setMz + width / 2,
    height: claim.width.at,
    evidence: "stated",
    drive: null,
    note: "The width is only claimed.",
    widthPointer: `${claim.pointer}/value`,
  };
}

/** Volts of a stage at a set m/z, and what has to be said of them. */
export interface VoltsSetting extends WindowDrive {
  readonly note: string | null;
}

/** Volts at a set m/z on the lines between the points or on the stated law; null where one point does not reach. */
export function voltsAt(operatingPoint: Of<"drives"> | Of<"drive-law">, setMz: number): VoltsSetting | null {
  if (operatingPoint.by === "drive-law") {
    const { rfPerMz, dcSlope, dcOffset_V } = operatingPoint;
    const rfVolts = rfToCanonical(rfPerMz) * setMz;
    const offset = rfPerMz.between === "pole-and-pole" ? dcOffset_V / 2 : dcOffset_V;
    return {
      volts: { rfVolts, dcVolts: dcSlope * rfVolts - offset },
      convention: { rf: { as: rfPerMz.as, between: rfPerMz.between }, dc: { between: rfPerMz.between } },
      note: null,
    };
  }
  const sorted = operatingPoint.points
    .map(({ mz, drive }) => ({ mz, volts: driveToCanonical(drive) }))
    .sort((one, other) => one.mz - other.mz);
  const convention = conventionOf(operatingPoint.points[0]!.drive);
  if (sorted.length === 1 && Math.abs(sorted[0]!.mz - setMz) > 0.5) return null;
  const rf = interpolate(
    sorted.map(({ mz, volts }) => ({ x: mz, y: volts.rfVolts })),
    setMz,
    "extend",
  );
  const dc = interpolate(
    sorted.map(({ mz, volts }) => ({ x: mz, y: volts.dcVolts })),
    setMz,
    "extend",
  );
  return {
    volts: { rfVolts: rf.value, dcVolts: dc.value },
    convention,
    note: rf.outside
      ? `m/z ${setMz} lies outside the drive points (${sorted[0]!.mz} to ${sorted[sorted.length - 1]!.mz}): their outermost line is extended.`
      : null,
  };
}

function computedWindow(filter: Placed<MassFilterStage>, setting: VoltsSetting, pointer: string): Window {
  const { rodSet } = filter.stage;
  if (rodSet === undefined) {
    return {
      kind: "unknown",
      missing: [`${filter.pointer}/rodSet`],
      reason: "The volts say nothing without the rods.",
    };
  }
  const { rfVolts, dcVolts } = setting.volts;
  const drive: WindowDrive = { volts: setting.volts, convention: setting.convention };
  if (rfVolts <= 0 || dcVolts < 0) {
    return {
      kind: "empty",
      reason: rfVolts <= 0 ? "There is no RF voltage." : "The DC voltage of the line is negative.",
      evidence: "computed",
      drive,
    };
  }
  const answer = passbandOf(dcVolts, rfVolts, fieldOf(rodSet));
  if (answer.kind === "empty") {
    return {
      kind: "empty",
      reason: `U/V is ${(dcVolts / rfVolts).toPrecision(7)}, above the apex of the stability region: no m/z passes.`,
      evidence: "computed",
      drive,
    };
  }
  if (answer.kind === "not-converged") {
    return {
      kind: "unknown",
      missing: [pointer],
      reason: `The edges were not found within ${answer.steps} steps.`,
    };
  }
  const { mzLow, mzHigh } = answer.passband;
  if (mzHigh === null) {
    return {
      kind: "unknown",
      missing: [pointer],
      reason: "The stated drive has no DC: the rods pass every ion above the cutoff and select none.",
    };
  }
  return {
    kind: "window",
    mzLow,
    mzHigh,
    height: "edges",
    evidence: "computed",
    drive,
    note: setting.note,
    widthPointer: pointer,
  };
}
