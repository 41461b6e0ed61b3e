import { ppmFromRatio, ratioFromPpm } from "../../contract/si.ts";
import { APEX_RATIO, apexMarginOf } from "../../physics/first-region.ts";
import { ratioForResolution } from "../../physics/set-point.ts";
import { defineCheck } from "../check.ts";
import type { Bounds, PassesIf } from "../finding.ts";
import { bothPassIf, leverThrough, passesIfWithin } from "../lever.ts";
import { boundsOf, LowerLimitByTolerance } from "../limit.ts";
import { lacking, notApplicable, type Observation, type Reading } from "../observation.ts";
import { NO_DC_OVER_RF, NO_VOLTS } from "../resolve/negligible.ts";
import type { Filtering } from "../resolve/resolved-method.ts";
import {
  centreOf,
  heightNote,
  type KnownWindow,
  standsForEdges,
  type WindowDrive,
  widthOf,
} from "../resolve/window.ts";
import { digits } from "../statement.ts";
import { settingsAt, worstOfStage } from "./worst-of-stage.ts";

export const apexMargin = defineCheck({
  id: "apex-margin",
  computes:
    "How far U/V stays below the apex of the stability region, where the window closes: the smallest margin of a stage.",
  needs: ["stages/operatingPoint", "stages/rodSet", "stages/tolerances/ratio_ppm"],
  quantities: [
    {
      quantity: "margin-to-apex",
      unit: "[ppm]",
      meaning: "relative distance of U/V below the apex, negative above",
    },
  ],
  requiredByDefault: true,
  limit: LowerLimitByTolerance,
  defaults: { pass: { min: 50, minOfTolerance: 3 }, caution: { min: 50 } },
  basis:
    "Above the apex, U/V 0.1678437, no m/z passes (Dawson 1976; computed). 50 ppm and three times the tolerance of U/V are common practice, no source.",
  examine: (method, limits) =>
    method.filters.map((filter): Observation => {
      const { stage, pointer } = filter;
      const tolerance = stage.tolerances?.ratio_ppm;
      const pass = boundsOf(limits.pass, undefined, tolerance);
      const caution = boundsOf(limits.caution, undefined, tolerance);
      const settings = settingsAt(method, filter);
      const onLine = settings.some(({ window }) => window.kind !== "unknown" && window.drive !== null);
      return worstOfStage(
        { quantity: "margin-to-apex", unit: "[ppm]", subject: { pointer, stage: stage.name } },
        settings,
        `The method sets no window in ${stage.name} that has a scan line.`,
        (setting) => marginToApex(setting, pass, caution),
        onLine ? () => passesIfByOneRow(settings, pass) : undefined,
      );
    }),
});

function marginToApex(setting: Filtering, pass: Bounds, caution: Bounds): Reading {
  const { window, filter, setMz } = setting;
  const { name, tolerances } = filter.stage;
  if (window.kind === "unknown") return lacking(`How far ${name} stays below the apex`, window.missing);
  const judged = { pass, caution };
  if (window.drive !== null) {
    const { drive } = window;
    const { rfVolts, dcVolts } = drive.volts;
    if (rfVolts < NO_VOLTS) return notApplicable(`${name} has no RF voltage and so no scan line.`);
    const passesIf = () => passesIfOnRow(drive, drive.row, pass);
    if (dcVolts < NO_DC_OVER_RF * rfVolts) {
      const statement = `${name} at m/z ${setMz}: without DC of the right sign nothing is selected.`;
      return { kind: "impossible", ...judged, evidence: "computed", passesIf, statement };
    }
    return margin(ppmFromRatio(apexMarginOf(dcVolts / rfVolts)), "computed", passesIf);
  }
  if (window.kind === "no-window") return notApplicable(window.reason);
  if (!standsForEdges(window, "narrow")) {
    return lacking(`How far ${name} stays below the apex`, [window.widthPointer]);
  }
  const solved = ratioForResolution(centreOf(window) / widthOf(window));
  if (solved.kind !== "ratio") return lacking(`A scan line of ${name}`, [window.widthPointer]);
  return margin(ppmFromRatio(solved.margin), window.evidence, () => passesIfWider(window, pass));

  function margin(
    value: number,
    evidence: KnownWindow["evidence"],
    passesIf: () => PassesIf | null,
  ): Reading {
    return {
      kind: "value",
      value,
      ...judged,
      evidence,
      passesIf,
      statement: () =>
        `${name} at m/z ${setMz}: U/V is ${digits(Math.abs(value), 4)} ppm ${value < 0 ? "above" : "below"} the apex, where the window closes.` +
        (tolerances?.ratio_ppm === undefined ? " No tolerance of U/V is stated." : "") +
        (window.kind === "window" ? heightNote(window) : ""),
    };
  }
}

/** The widest window that still selects: as wide as its own m/z. */
const LOWEST_RESOLUTION = 1;

/** U/V from that of the widest window up to the wanted margin below the apex. */
function neededRatio(pass: Bounds): { readonly min: number; readonly max: number } | null {
  const widest = ratioForResolution(LOWEST_RESOLUTION);
  if (pass.min === null || widest.kind !== "ratio") return null;
  return { min: widest.ratio, max: APEX_RATIO * (1 - ratioFromPpm(pass.min)) };
}

function passesIfOnRow({ dcLever, volts }: WindowDrive, row: number, pass: Bounds): PassesIf | null {
  const ratio = leverThrough(dcLever(row), (dcToRf) => dcToRf * volts.rfVolts);
  const needed = neededRatio(pass);
  return needed === null ? null : passesIfWithin(ratio, needed);
}

/** One drive point may set the DC of several settings, each of which names its nearest: try each point for all of them. */
function passesIfByOneRow(settings: readonly Filtering[], pass: Bounds): PassesIf | null {
  const drives = settings.flatMap(({ window }) => (window.kind === "unknown" ? [] : (window.drive ?? [])));
  const failing = drives.filter(({ volts }) => !passes(volts, pass));
  for (const row of new Set(failing.map((drive) => drive.row))) {
    // A setting that passes and does not hang on this row stays as it is.
    const bound = drives.filter((drive) => drive.dcLever(row) !== null || !passes(drive.volts, pass));
    const intervals = bound.map((drive) => passesIfOnRow(drive, row, pass));
    const all = intervals.reduce(bothPassIf, intervals[0] ?? null);
    if (all !== null) return all;
  }
  return null;
}

function passes({ rfVolts, dcVolts }: WindowDrive["volts"], pass: Bounds): boolean {
  return (
    dcVolts >= NO_DC_OVER_RF * rfVolts &&
    (pass.min === null || ppmFromRatio(apexMarginOf(dcVolts / rfVolts)) >= pass.min)
  );
}

function passesIfWider(window: KnownWindow, pass: Bounds): PassesIf | null {
  if (pass.min === null) return null;
  const centre = centreOf(window);
  const wide = resolutionAtMargin(ratioFromPpm(pass.min));
  return wide === null ? null : passesIfWithin(window.widthLever, { min: centre / wide, max: null });
}

const HALVINGS = 60;

/** The highest resolution whose scan line still stays this far below the apex; the margin falls as it rises. */
function resolutionAtMargin(margin: number): number | null {
  let low = LOWEST_RESOLUTION;
  let high = 1e8;
  const holds = (resolution: number) => {
    const solved = ratioForResolution(resolution);
    return solved.kind === "ratio" && solved.margin >= margin;
  };
  if (!holds(low)) return null;
  for (let halving = 0; halving < HALVINGS; halving++) {
    const middle = Math.sqrt(low * high);
    if (holds(middle)) low = middle;
    else high = middle;
  }
  return low;
}
