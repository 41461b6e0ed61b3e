import type { z } from "zod";
import type { VoltageConvention } from "../../contract/drive.ts";
import { dcFromCanonical } from "../../contract/drive.ts";
import { flightTimeOf, residenceErrors } from "../../contract/residence.ts";
import { fieldOf, sinusoidalQuadrupole } from "../../contract/rod-set.ts";
import type { ErrorItem } from "../../contract/rule.ts";
import { widthInMz } from "../../contract/width.ts";
import type { Field } from "../../physics/mathieu-parameters.ts";
import { windowInMz } from "../../physics/passband.ts";
import {
  closedSpanOf,
  type LinePoint,
  type LineWidth,
  leastSquaresLine,
  leastWorstWidthLine,
  type ScanLine,
  widthOnLine,
} from "../../physics/scan-line-fit.ts";
import { fastestScanRate, shiftForLoss } from "../../physics/scan-rate.ts";
import { setPointOf } from "../../physics/set-point.ts";
import { csvText } from "../csv-text.ts";
import { defineEndpoint } from "../endpoint.ts";
import { SCAN_TABLE_EXAMPLES } from "../examples/scan-table.ts";
import { MOST_ITEMS } from "../limits.ts";
import { answeredDrive } from "../shapes/answered-drive.ts";
import {
  ScanTableAnswer,
  ScanTableRequest,
  type ScanTableRow,
  type StraightLine,
} from "../shapes/scan-table.ts";

type Request = z.output<typeof ScanTableRequest>;
type Answer = z.input<typeof ScanTableAnswer>;

export const scanTable = defineEndpoint({
  operationId: "scanTable",
  method: "post",
  path: "/v1/scan-table",
  tag: "Mass filter",
  summary: "Set points over a range, the straight line in their place, and the fastest scan",
  description:
    "Exact set points at constant width or constant resolution; the straight lines U = slope · V − offset that fit them best, by least squares and by the least worst width, with the worst width that each really gives (light ions break it) and where it passes nothing; and the fastest scan rate for a permitted loss. Calculated volts are not settings to apply. As text/csv the rows alone.",
  request: ScanTableRequest,
  rules: [
    ({ rodSet }) => sinusoidalQuadrupole(rodSet, "/rodSet"),
    ({ residence, rodSet }) => (residence === undefined ? [] : residenceErrors(residence, rodSet, "/rodSet")),
    rangeRises,
    lossWithResidence,
  ],
  work: { unit: "rows", of: ({ points }) => points, most: MOST_ITEMS },
  answer: ScanTableAnswer,
  forms: { "text/csv": rowsAsCsv },
  examples: SCAN_TABLE_EXAMPLES,
  handler(request, { maxSteps }) {
    const { rodSet, convention, mzFrom, mzTo, points, residence, permittedLoss } = request;
    const shift = permittedLoss === undefined ? null : shiftForLoss(permittedLoss);
    const rows = Array.from({ length: points }, (_, index) => {
      const mz = index === points - 1 ? mzTo : mzFrom + (index * (mzTo - mzFrom)) / (points - 1);
      const row = rowAt(mz, request, maxSteps);
      if (residence === undefined || shift === null || row.mzLow === null) return row;
      // The rule on the rod length has made sure that the flight time is known.
      const flightTime = flightTimeOf(residence, rodSet, mz)!;
      return { ...row, fastestRate_mzPerS: fastestScanRate(row.mzHigh! - row.mzLow, shift, flightTime) };
    });
    return { convention, rows, ...linesOf(request, maxSteps), fastest: fastestOf(rows, shift) };
  },
});

function rangeRises({ mzFrom, mzTo }: Request): ErrorItem[] {
  if (mzTo > mzFrom) return [];
  return [
    { pointer: "/mzTo", code: "not-above", detail: `mzTo is ${mzTo}; it must be above mzFrom, ${mzFrom}.` },
  ];
}

function lossWithResidence({ residence, permittedLoss }: Request): ErrorItem[] {
  const missing =
    residence === undefined && permittedLoss !== undefined
      ? "residence"
      : residence !== undefined && permittedLoss === undefined
        ? "permittedLoss"
        : null;
  if (missing === null) return [];
  return [
    {
      pointer: `/${missing}`,
      code: "missing-member",
      detail: `${missing} is missing; the fastest scan rate takes residence and permittedLoss together.`,
    },
  ];
}

function rowAt(mz: number, { rodSet, convention, width }: Request, maxSteps: number): ScanTableRow {
  const none = (reason: NonNullable<ScanTableRow["reason"]>) => ({
    mz,
    drive: null,
    reason,
    a: null,
    q: null,
    mzLow: null,
    mzHigh: null,
    fastestRate_mzPerS: null,
  });
  if (width.at !== "edges") return none("width-height-needs-peak-profile");
  const solved = setPointOf(mz, widthInMz(width, mz), fieldOf(rodSet), maxSteps);
  if (solved.kind === "not-reachable") return none(solved.reason);
  if (solved.kind === "not-converged") return none("not-converged");
  const drive = answeredDrive(solved, convention);
  if (drive === null) return none("drive-out-of-range");
  const { mzLow, mzHigh } = windowInMz(solved.edges, mz * solved.q);
  return { mz, drive, reason: null, a: solved.a, q: solved.q, mzLow, mzHigh, fastestRate_mzPerS: null };
}

function fastestOf(rows: readonly ScanTableRow[], shift: number | null): Answer["fastest"] {
  let slowest: Answer["fastest"] = null;
  for (const { mz, fastestRate_mzPerS: rate } of rows) {
    if (rate === null || shift === null || (slowest !== null && slowest.rate_mzPerS <= rate)) continue;
    slowest = { rate_mzPerS: rate, mz, shiftOverWidth: shift };
  }
  return slowest;
}

/** The lines are fitted and judged at these m/z, so that they do not depend on how many rows are asked for. */
const JUDGED = 129;

function linesOf(request: Request, maxSteps: number): Pick<Answer, "lines" | "linesReason"> {
  const field = fieldOf(request.rodSet);
  const points = request.width.at === "edges" ? judgedPoints(request, field, maxSteps) : [];
  if (points.length < 3) return { lines: [], linesReason: "too-few-set-points" };
  const squares = leastSquaresLine(points);
  const worst = leastWorstWidthLine(points, squares, field);
  const shown = (sense: StraightLine["sense"], line: ScanLine) =>
    lineShown(sense, line, points, request.convention, field);
  return {
    lines: [shown("least-squares", squares), ...(worst === null ? [] : [shown("least-worst-width", worst)])],
    linesReason: worst === null ? "least-worst-width-not-converged" : null,
  };
}

function judgedPoints({ mzFrom, mzTo, width }: Request, field: Field, maxSteps: number): LinePoint[] {
  return Array.from({ length: JUDGED }, (_, index) => {
    const mz =
      index === JUDGED - 1 ? mzTo : mzFrom * Math.exp((Math.log(mzTo / mzFrom) * index) / (JUDGED - 1));
    const mzWidth = widthInMz(width, mz);
    const solved = setPointOf(mz, mzWidth, field, maxSteps);
    return solved.kind === "set-point"
      ? [{ mz, mzWidth, dcVolts: solved.dcVolts, rfVolts: solved.rfVolts }]
      : [];
  }).flat();
}

/** The best line has three equal errors: the lightest ion stands for them. */
const EQUAL = 1e-6;

function lineShown(
  sense: StraightLine["sense"],
  line: ScanLine,
  points: readonly LinePoint[],
  convention: VoltageConvention,
  field: Field,
): StraightLine {
  let worst: { readonly point: LinePoint; readonly found: LineWidth } | null = null;
  for (const point of points) {
    const found = widthOnLine(line, point, field);
    if (found !== null && (worst === null || size(found) > size(worst.found) * (1 + EQUAL))) {
      worst = { point, found };
    }
  }
  const { point, found } = worst!;
  const { width, error, centreShift, reason } = found;
  const offset = dcFromCanonical(line.offset, convention.dc);
  return {
    sense,
    dcSlope: line.slope,
    dcOffset_V: "volts" in offset ? offset.volts : line.offset,
    worst: { mz: point.mz, wantedWidth: point.mzWidth, width, error, centreShift, reason },
    nothingPasses: closedSpanOf(line, points[0]!.mz, points.at(-1)!.mz, field),
  };
}

/** A window without an upper end is further from any width than all others. */
function size({ error }: LineWidth): number {
  return error === null ? Number.POSITIVE_INFINITY : Math.abs(error);
}

function rowsAsCsv({ convention, rows }: z.output<typeof ScanTableAnswer>): string {
  const { rf, dc } = convention;
  const header = [
    "mz",
    `rf_V (${rf.as} ${rf.between})`,
    `dc_V (${dc.between})`,
    "a",
    "q",
    "mzLow",
    "mzHigh",
    "fastestRate_mzPerS",
    "reason",
  ];
  return csvText(
    header,
    rows.map(({ mz, drive, a, q, mzLow, mzHigh, fastestRate_mzPerS, reason }) => [
      mz,
      drive?.rf.volts ?? null,
      drive?.dc !== undefined && "volts" in drive.dc ? drive.dc.volts : null,
      a,
      q,
      mzLow,
      mzHigh,
      fastestRate_mzPerS,
      reason,
    ]),
  );
}
