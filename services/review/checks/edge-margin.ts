import { defineCheck, type Limits } from "../check.ts";
import type { Bounds } from "../finding.ts";
import { boundsOf, type Limit, LowerLimitByWidth } from "../limit.ts";
import { lacking, type Observation, type Reading } from "../observation.ts";
import { driftOf } from "../resolve/drift.ts";
import type { Filtering } from "../resolve/resolved-method.ts";
import { heightNote, type KnownWindow, standsForEdges, type Window, widthOf } from "../resolve/window.ts";
import { digits } from "../statement.ts";
import { passesIfWindowMoves } from "./window-that-passes.ts";

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
        .map((filtering): Observation => {
          const { pointer, acquisition, filter, ion } = filtering;
          return {
            quantity: "distance-to-edge",
            unit: "1",
            subject: { pointer, acquisition: acquisition.id, stage: filter.stage.name, ion },
            ...distanceToEdge(filtering, limits),
          };
        }),
    ),
});

function distanceToEdge(filtering: Filtering, limits: Limits<Limit>): Reading {
  const { window, filter, mz } = filtering;
  const { name } = filter.stage;
  const what = `How far m/z ${mz} lies from the edges of its window in ${name}`;
  const passesIf = () => passesIfWindowMoves(filtering, (changed) => passesIn(changed, filtering, limits));
  if (window.kind === "unknown") return lacking(what, window.missing);
  if (window.kind === "no-window") {
    const pass = boundsOf(limits.pass);
    const caution = boundsOf(limits.caution);
    const statement = `${name}: ${window.reason}`;
    return { kind: "impossible", evidence: window.evidence, pass, caution, passesIf, statement };
  }
  const distance = distanceIn(window, filtering, limits);
  if (distance === null) return lacking(what, [window.widthPointer]);
  const { value, pass, drift } = distance;
  const inward = mz - window.mzLow < window.mzHigh - mz ? drift.low : drift.high;
  return {
    kind: "value",
    value,
    evidence: window.evidence,
    pass,
    caution: boundsOf(limits.caution, widthOf(window)),
    passesIf,
    statement:
      `m/z ${mz} lies ${digits(Math.abs(value), 3)} ${value < 0 ? "outside" : "inside"} the nearer edge of ` +
      `${digits(window.mzLow, 7)} to ${digits(window.mzHigh, 7)} in ${name}, ` +
      (drift.stated
        ? `after a drift of ${digits(inward, 3)}.`
        : "with no drift allowed for, none is stated.") +
      heightNote(window),
  };
}

interface Distance {
  readonly value: number;
  readonly pass: Bounds;
  readonly drift: NonNullable<ReturnType<typeof driftOf>>;
}

/** Null where the width may not stand for the one between the edges, or no scan line gives its drift. */
function distanceIn(window: KnownWindow, { filter, mz }: Filtering, limits: Limits<Limit>): Distance | null {
  const drift = standsForEdges(window, "narrow") ? driftOf(filter.stage.tolerances, window) : null;
  if (drift === null) return null;
  const value = Math.min(mz - window.mzLow - drift.low, window.mzHigh - mz - drift.high);
  return { value, pass: boundsOf(limits.pass, widthOf(window)), drift };
}

function passesIn(window: Window, filtering: Filtering, limits: Limits<Limit>): boolean {
  const distance = window.kind === "window" ? distanceIn(window, filtering, limits) : null;
  if (distance === null) return false;
  const { value, pass } = distance;
  return (pass.min === null || value >= pass.min) && (pass.max === null || value <= pass.max);
}
