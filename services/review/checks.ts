import type { Check } from "./check.ts";
import { apexMargin } from "./checks/apex-margin.ts";
import { cellWellDepth } from "./checks/cell-well-depth.ts";
import { dwellTime } from "./checks/dwell-time.ts";
import { edgeMargin } from "./checks/edge-margin.ts";
import { pauseTime } from "./checks/pause-time.ts";
import { peakTails } from "./checks/peak-tails.ts";
import { pointsAcrossPeak } from "./checks/points-across-peak.ts";
import { precursorQInCell } from "./checks/precursor-q-in-cell.ts";
import { productAboveCutoff } from "./checks/product-above-cutoff.ts";
import { rfCycles } from "./checks/rf-cycles.ts";
import { scanShift } from "./checks/scan-shift.ts";
import { setMz } from "./checks/set-mz.ts";
import { supplyHeadroom } from "./checks/supply-headroom.ts";
import { voltageConvention } from "./checks/voltage-convention.ts";
import { windowWidth } from "./checks/window-width.ts";
import type { Limit } from "./limit.ts";

/** Every check, in the order in which findings, catalogue and criteria list them. A new check is one line here. */
const LIST = [
  setMz,
  edgeMargin,
  windowWidth,
  apexMargin,
  supplyHeadroom,
  voltageConvention,
  rfCycles,
  scanShift,
  productAboveCutoff,
  precursorQInCell,
  cellWellDepth,
  dwellTime,
  pauseTime,
  pointsAcrossPeak,
  peakTails,
] as const;

export type CheckId = (typeof LIST)[number]["id"];

/** The list without the type of each check's own limit: criteria are matched to checks by their schema. */
export const CHECKS: readonly Check<CheckId, Limit>[] = LIST as readonly unknown[] as readonly Check<
  CheckId,
  Limit
>[];
