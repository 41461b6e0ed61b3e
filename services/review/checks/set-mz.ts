import { defineCheck, type Limits } from "../check.ts";
import { passesIfWithin, passingInterval } from "../lever.ts";
import { boundsOf, type Limit, UpperLimitByWidth } from "../limit.ts";
import { lacking, notApplicable, type Observation, type Reading } from "../observation.ts";
import type { Filtering } from "../resolve/resolved-method.ts";
import { heightNote, standsForEdges, type Window, widthOf } from "../resolve/window.ts";
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
      (filtering): Observation | null => {
        const { setMzStated, setMzPointer, acquisition, filter, ion } = filtering;
        if (!setMzStated) return null;
        return {
          quantity: "set-against-ion",
          unit: "1",
          subject: { pointer: setMzPointer, acquisition: acquisition.id, stage: filter.stage.name, ion },
          ...setAgainstIon(filtering, limits),
        };
      },
    ),
});

function setAgainstIon(filtering: Filtering, limits: Limits<Limit>): Reading {
  const { window, filter, mz } = filtering;
  const { name } = filter.stage;
  const byWidth = limits.pass.maxOfWidth !== undefined || limits.caution.maxOfWidth !== undefined;
  const width = widthBetweenEdges(window);
  if (byWidth && width === undefined) {
    if (window.kind === "no-window") return notApplicable(`${name} has no window here: ${window.reason}`);
    const missing = window.kind === "unknown" ? window.missing : [window.widthPointer];
    return lacking(`How far the set m/z of ${name} may be from m/z ${mz}`, missing);
  }
  const value = Math.abs(filtering.setMz - mz);
  return {
    kind: "value",
    value,
    evidence: "stated",
    pass: boundsOf(limits.pass, width),
    caution: boundsOf(limits.caution, width),
    passesIf: () => passesIfNearer(filtering, limits, value),
    statement:
      `Set m/z ${filtering.setMz} is ${digits(value, 3)} from the ion's m/z ${mz} in ${name}` +
      (width === undefined
        ? "."
        : `, ${digits(value / width, 2)} of the window's width ${digits(width, 3)}.`) +
      (window.kind === "window" && width !== undefined ? heightNote(window) : ""),
  };
}

function widthBetweenEdges(window: Window): number | undefined {
  return window.kind === "window" && standsForEdges(window, "narrow") ? widthOf(window) : undefined;
}

/** The width, and with it the limit, goes along with the set m/z. */
function passesIfNearer({ mz, setMzLever, windowIfSetTo }: Filtering, limits: Limits<Limit>, reach: number) {
  const passes = (set: number) => {
    const { max } = boundsOf(limits.pass, widthBetweenEdges(windowIfSetTo(set)));
    return max === null || Math.abs(set - mz) <= max;
  };
  return passes(mz) ? passesIfWithin(setMzLever, passingInterval(passes, mz, mz - reach, mz + reach)) : null;
}
