import { APEX_RATIO, apexMarginOf } from "../../physics/first-region.ts";
import { ratioForResolution } from "../../physics/set-point.ts";
import { defineCheck, type Limits } from "../check.ts";
import type { MassFilterStage } from "../instrument.ts";
import { boundsOf, type Limit, LowerLimitByTolerance } from "../limit.ts";
import type { Observation } from "../observation.ts";
import type { Filtering, Placed, ResolvedMethod } from "../resolve/resolved-method.ts";
import { centreOf, heightNote, standsForEdges, widthOf } from "../resolve/window.ts";
import { digits } from "../statement.ts";

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
  examine: (method, limits) => method.filters.map((filter) => smallestOfStage(method, filter, limits)),
});

function smallestOfStage(
  method: ResolvedMethod,
  filter: Placed<MassFilterStage>,
  limits: Limits<Limit>,
): Observation {
  const { stage, pointer } = filter;
  const about = { quantity: "margin-to-apex", unit: "[ppm]", subject: { pointer, stage: stage.name } };
  const settings = method.acquisitions.flatMap(({ filterings }) =>
    filterings.filter((each) => each.filter === filter),
  );
  const missing = new Set<string>();
  let smallest: { readonly margin: number; readonly at: Filtering } | null = null;
  for (const setting of settings) {
    const margin = marginOf(setting, missing);
    if (margin !== null && (smallest === null || margin < smallest.margin))
      smallest = { margin, at: setting };
  }
  if (missing.size > 0) {
    return {
      ...about,
      kind: "indeterminate",
      missing: [...missing],
      statement: `How far ${stage.name} stays below the apex does not follow without ${[...missing].join(", ")}.`,
    };
  }
  if (smallest === null) {
    return {
      ...about,
      kind: "not-applicable",
      statement: `The method sets no window in ${stage.name} that has a scan line.`,
    };
  }
  const { at } = smallest;
  const value = smallest.margin * 1e6;
  const pass = boundsOf(limits.pass, undefined, stage.tolerances?.ratio_ppm);
  return {
    ...about,
    kind: "value",
    subject: { ...about.subject, acquisition: at.acquisition.id, ion: at.ion },
    value,
    evidence: at.window.kind === "unknown" ? "stated" : at.window.evidence,
    pass,
    caution: boundsOf(limits.caution, undefined, stage.tolerances?.ratio_ppm),
    passesIf:
      pass.min === null
        ? null
        : {
            input: `${pointer}/operatingPoint`,
            min: null,
            max: APEX_RATIO * (1 - pass.min * 1e-6),
            unit: "1",
          },
    statement:
      `${stage.name} at m/z ${at.setMz}: U/V is ${digits(Math.abs(value), 4)} ppm ${value < 0 ? "above" : "below"} the apex, where the window closes.` +
      (stage.tolerances?.ratio_ppm === undefined ? " No tolerance of U/V is stated." : "") +
      (at.window.kind === "window" ? heightNote(at.window) : ""),
  };
}

/** From the volts where they are known, else from the width, which fixes U/V. Null where neither gives a scan line. */
function marginOf({ window }: Filtering, missing: Set<string>): number | null {
  if (window.kind === "unknown") {
    for (const input of window.missing) missing.add(input);
    return null;
  }
  if (window.drive !== null) {
    const { rfVolts, dcVolts } = window.drive.volts;
    return rfVolts > 0 ? apexMarginOf(dcVolts / rfVolts) : null;
  }
  if (window.kind === "empty") return null;
  if (!standsForEdges(window, "narrow")) {
    missing.add(window.widthPointer);
    return null;
  }
  const solved = ratioForResolution(centreOf(window) / widthOf(window));
  return solved.kind === "ratio" ? solved.margin : null;
}
