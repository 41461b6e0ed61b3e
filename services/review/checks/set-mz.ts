import { defineCheck, type Limits } from "../check.ts";
import { boundsOf, type Limit, UpperLimitByWidth } from "../limit.ts";
import type { Observation } from "../observation.ts";
import type { Filtering } from "../resolve/resolved-method.ts";
import { heightNote, standsForEdges, widthOf } from "../resolve/window.ts";
import { digits } from "../statement.ts";
import { eachIon } from "./each-ion.ts";

export const setMz = defineCheck({
  id: "set-mz",
  computes: "Distance of the set m/z from the m/z of the ion.",
  needs: [
    "acquisition/setPrecursorMz",
    "acquisition/setProductMz",
    "acquisition/setMz",
    "stages/operatingPoint",
  ],
  quantities: [{ quantity: "set-against-ion", unit: "1", meaning: "distance in m/z, without sign" }],
  requiredByDefault: true,
  limit: UpperLimitByWidth,
  defaults: { pass: { maxOfWidth: 0.15 }, caution: { maxOfWidth: 0.3 } },
  basis:
    "At a width of 0.7 an offset of 0.11 costs 4 to 6 % of the signal and one of 0.23 costs 23 to 27 % (computed peak shapes); common practice, no source.",
  examine: (method, limits) =>
    eachIon(
      method,
      "set-against-ion",
      "states no set m/z, so the m/z of the ion itself is taken",
      (filtering) => (filtering.setMzStated ? distance(filtering, limits) : null),
    ),
});

function distance(filtering: Filtering, limits: Limits<Limit>): Observation {
  const { window, filter, acquisition, ion, mz } = filtering;
  const about = {
    quantity: "set-against-ion",
    unit: "1",
    subject: { pointer: filtering.setMzPointer, acquisition: acquisition.id, stage: filter.stage.name, ion },
  };
  const needsWidth = limits.pass.maxOfWidth !== undefined || limits.caution.maxOfWidth !== undefined;
  const usable = window.kind === "window" && standsForEdges(window, "narrow");
  if (needsWidth && !usable) {
    return {
      ...about,
      kind: "indeterminate",
      missing:
        window.kind === "unknown"
          ? window.missing
          : [window.kind === "empty" ? filter.pointer : window.widthPointer],
      statement: `How far the set m/z may be from m/z ${mz} depends on the width of the window between its edges, which is not known.`,
    };
  }
  const width = usable ? widthOf(window) : undefined;
  const value = Math.abs(filtering.setMz - mz);
  const pass = boundsOf(limits.pass, width);
  return {
    ...about,
    kind: "value",
    value,
    evidence: "stated",
    pass,
    caution: boundsOf(limits.caution, width),
    passesIf:
      pass.max === null
        ? null
        : { input: filtering.setMzPointer, min: mz - pass.max, max: mz + pass.max, unit: "1" },
    statement:
      `Set m/z ${filtering.setMz} is ${digits(value, 3)} from the ion's m/z ${mz} in ${filter.stage.name}` +
      (width === undefined
        ? "."
        : `, ${digits(value / width, 2)} of the window's width ${digits(width, 3)}.`) +
      (usable ? heightNote(window) : ""),
  };
}
