import type { Limits } from "../check.ts";
import { defineCheck } from "../check.ts";
import type { Bounds, PassesIf } from "../finding.ts";
import { boundsOf, type Limit, LowerLimitByWidth } from "../limit.ts";
import type { Observation } from "../observation.ts";
import { type Drift, driftOf } from "../resolve/drift.ts";
import type { Filtering } from "../resolve/resolved-method.ts";
import { heightNote, type KnownWindow, standsForEdges, widthOf } from "../resolve/window.ts";
import { digits } from "../statement.ts";

export const edgeMargin = defineCheck({
  id: "edge-margin",
  computes:
    "Distance in m/z from the ion to the nearer edge of its window, after the drift allowed between two tunes.",
  needs: [
    "stages/operatingPoint",
    "stages/tolerances",
    "acquisition/setPrecursorMz",
    "acquisition/setProductMz",
    "acquisition/setMz",
  ],
  quantities: [
    {
      quantity: "distance-to-edge",
      unit: "1",
      meaning: "m/z from the ion to the nearer edge, negative outside",
    },
  ],
  requiredByDefault: true,
  limit: LowerLimitByWidth,
  defaults: { pass: { min: 0.1, minOfWidth: 0.2 }, caution: { min: 0 } },
  basis: "At least 0.1 in m/z and a fifth of the window's width from the edge: common practice, no source.",
  examine: (method, limits) =>
    method.acquisitions.flatMap(({ filterings }) =>
      filterings
        .filter(({ target }) => target === "ion")
        .map((filtering) => distanceToEdge(filtering, limits)),
    ),
});

function distanceToEdge(filtering: Filtering, limits: Limits<Limit>): Observation {
  const { window, filter, acquisition, ion, mz } = filtering;
  const about = {
    quantity: "distance-to-edge",
    unit: "1",
    subject: { pointer: filtering.pointer, acquisition: acquisition.id, stage: filter.stage.name, ion },
  };
  if (window.kind === "unknown") {
    return { ...about, kind: "indeterminate", missing: window.missing, statement: window.reason };
  }
  if (window.kind === "empty") {
    return {
      ...about,
      kind: "impossible",
      evidence: window.evidence,
      pass: boundsOf(limits.pass),
      caution: boundsOf(limits.caution),
      passesIf: null,
      statement: `${filter.stage.name}: ${window.reason}`,
    };
  }
  if (!standsForEdges(window, "narrow")) {
    return {
      ...about,
      kind: "indeterminate",
      missing: [window.widthPointer],
      statement:
        "A width at a tenth of the height is wider than the one between the edges and may not stand for it here.",
    };
  }
  const drift = driftOf(filter.stage.tolerances, window);
  const pass = boundsOf(limits.pass, widthOf(window));
  const value = Math.min(mz - window.mzLow, window.mzHigh - mz) - drift.inward;
  const driftNote = drift.stated
    ? `after a drift of ${digits(drift.inward, 3)}`
    : "with no drift allowed for, none is stated";
  return {
    ...about,
    kind: "value",
    value,
    evidence: window.evidence,
    pass,
    caution: boundsOf(limits.caution, widthOf(window)),
    passesIf: passesIfMoved(filtering, window, drift, pass, limits.pass),
    statement:
      `m/z ${mz} lies ${digits(Math.abs(value), 3)} ${value < 0 ? "outside" : "inside"} the nearer edge of ` +
      `${digits(window.mzLow, 7)} to ${digits(window.mzHigh, 7)} in ${filter.stage.name}, ${driftNote}.` +
      heightNote(window),
  };
}

/** Moving the set m/z helps where the window is wide enough for the ion in its middle; else only a wider window does. */
function passesIfMoved(
  filtering: Filtering,
  window: KnownWindow,
  drift: Drift,
  pass: Bounds,
  limit: Limit,
): PassesIf | null {
  if (pass.min === null) return null;
  const needed = pass.min + drift.inward;
  const low = filtering.setMz + filtering.mz + needed - window.mzHigh;
  const high = filtering.setMz + filtering.mz - needed - window.mzLow;
  if (low <= high) return { input: filtering.setMzPointer, min: low, max: high, unit: "1" };
  const fraction = limit.minOfWidth ?? 0;
  if (fraction >= 0.5) return null;
  const byFraction = drift.inward / (0.5 - fraction);
  const byDistance = 2 * ((limit.min ?? 0) + drift.inward);
  return { input: window.widthPointer, min: Math.max(byFraction, byDistance), max: null, unit: "1" };
}
