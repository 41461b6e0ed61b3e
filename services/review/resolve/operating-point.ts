import { dcFromCanonical } from "../../contract/drive.ts";
import { fieldOf, type RodSet } from "../../contract/rod-set.ts";
import { Width, widthInMz } from "../../contract/width.ts";
import { APEX_RATIO } from "../../physics/first-region.ts";
import { passbandOf } from "../../physics/passband.ts";
import { RESOLUTION_MAXIMUM } from "../../physics/set-point.ts";
import type { MassFilterStage } from "../instrument.ts";
import { digits } from "../statement.ts";
import { windowsBetweenPeaks } from "./measured-peaks.ts";
import { NO_DC_OVER_RF, NO_VOLTS } from "./negligible.ts";
import type { Placed } from "./resolved-method.ts";
import { lineByLaw, lineThroughPoints, type SupplyLine } from "./supply-line.ts";
import type { Window, WindowDrive } from "./window.ts";

/** A claim of the method on the width of a window, and where it stands. */
export interface Claim {
  readonly width: Width;
  readonly pointer: string;
}

/** What a mass filter lets through when it is set to this m/z. */
export type WindowSource = (setMz: number, claim: Claim | null) => Window;

/** The windows of a mass filter at every set m/z, worked out once for all that the method sets there. */
export function windowsOf(filter: Placed<MassFilterStage>): WindowSource {
  const { operatingPoint, rodSet } = filter.stage;
  const pointer = `${filter.pointer}/operatingPoint`;
  switch (operatingPoint?.by) {
    case "measured-peaks":
      return windowsBetweenPeaks(operatingPoint, pointer);
    case "drives":
    case "drive-law": {
      const line = supplyLineOf(filter)!;
      if (rodSet !== undefined) return (setMz) => windowOnLine(line, setMz, rodSet, pointer);
      const unknown: Window = {
        kind: "unknown",
        missing: [`${filter.pointer}/rodSet`],
        reason: "The volts say nothing of a window without the rods.",
      };
      return () => unknown;
    }
    case "stated": {
      const { width } = operatingPoint;
      return (setMz, claim) => statedWindow(claim ?? { width, pointer: `${pointer}/width` }, setMz);
    }
    default: {
      const unknown: Window = {
        kind: "unknown",
        missing: [pointer],
        reason: "No operating point is stated.",
      };
      return () => unknown;
    }
  }
}

/** The volts of a mass filter at every set m/z, null where its operating point states none. */
function supplyLineOf({ stage: { operatingPoint }, pointer }: Placed<MassFilterStage>): SupplyLine | null {
  switch (operatingPoint?.by) {
    case "drives":
      return lineThroughPoints(operatingPoint, `${pointer}/operatingPoint`);
    case "drive-law":
      return lineByLaw(operatingPoint, `${pointer}/operatingPoint`);
    default:
      return null;
  }
}

function statedWindow({ width: claimed, pointer }: Claim, setMz: number): Window {
  const width = widthInMz(claimed, setMz);
  const input = `${pointer}/value`;
  return {
    kind: "window",
    mzLow: setMz - width / 2,
    mzHigh: setMz + width / 2,
    height: claimed.at,
    evidence: "stated",
    drive: null,
    note: "The width is only claimed.",
    widthPointer: input,
    widthLever: claimedWidthLever(claimed, input, setMz),
  };
}

/** A claimed width as the lever of the width in m/z. */
export function claimedWidthLever({ as }: Width, input: string, setMz: number) {
  return {
    input,
    unit: "1",
    range: Width.shape.value,
    falling: as === "resolution",
    inputFor: (width: number) => (as === "mz" ? width : setMz / width),
  };
}

function windowOnLine(line: SupplyLine, setMz: number, rodSet: RodSet, pointer: string): Window {
  const drive = line(setMz);
  return drive.kind === "unknown" ? drive : windowOfDrive(drive, drive.note, rodSet, pointer);
}

/** The passband of a drive as a window. */
export function windowOfDrive(
  drive: WindowDrive,
  note: string | null,
  rodSet: RodSet,
  widthPointer: string,
): Window {
  const { rfVolts, dcVolts } = drive.volts;
  const none = (reason: string): Window => ({ kind: "no-window", reason, evidence: "computed", drive });
  if (rfVolts < NO_VOLTS) return none("Without RF voltage nothing is selected.");
  if (dcVolts < NO_DC_OVER_RF * rfVolts)
    return none("Without DC of the right sign every ion above the cutoff passes and none is selected.");
  const answer = passbandOf(dcVolts, rfVolts, fieldOf(rodSet));
  if (answer.kind === "window") {
    const { mzLow, mzHigh, resolution } = answer.passband;
    if (resolution! > RESOLUTION_MAXIMUM) return none("U/V is at the apex, where the window closes.");
    return {
      kind: "window",
      mzLow,
      mzHigh: mzHigh!,
      height: "edges",
      evidence: "computed",
      drive,
      note,
      widthPointer,
      widthLever: null,
    };
  }
  if (answer.kind === "not-converged") {
    return {
      kind: "unknown",
      missing: [widthPointer],
      reason: `The edges were not found within ${answer.steps} steps.`,
    };
  }
  const { between } = drive.convention.dc;
  const opens = dcFromCanonical(APEX_RATIO * rfVolts, { between }) as { volts: number };
  return none(
    `U/V is ${(dcVolts / rfVolts).toPrecision(7)}, above the apex of the stability region: no m/z passes. With this RF the window opens below ${digits(opens.volts, 7)} V DC, ${between}.`,
  );
}
