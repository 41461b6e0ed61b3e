import type { Rf } from "../../contract/drive.ts";
import type { RodSet } from "../../contract/rod-set.ts";
import type { Stage } from "../instrument.ts";
import { guidingOf } from "./guiding.ts";
import type { Filtering, Guiding, Placed, ResolvedAcquisition } from "./resolved-method.ts";

type Guide = Stage & { readonly rf?: Rf | undefined; readonly rodSet?: RodSet | undefined };

/** Rod sets that pass ions without selecting them: ion guides, and mass filters run as RF-only. */
function isGuide(placed: Placed<Stage>): placed is Placed<Guide> {
  const { stage } = placed;
  return stage.role === "ion-guide" || (stage.role === "mass-filter" && stage.mode === "rf-only");
}

/**
 * Every guide with the lightest ion that the method sends through it, which is the first that a cutoff would take away:
 * a precursor before the collision cell, a product behind it.
 */
export function guidesOf(
  stages: readonly Placed<Stage>[],
  acquisitions: readonly ResolvedAcquisition[],
): Guiding[] {
  const cell = stages.findIndex(({ stage }) => stage.role === "collision-cell");
  const isBehindCell = (pointer: string) =>
    cell >= 0 && stages.findIndex((each) => each.pointer === pointer) > cell;
  const filterings = acquisitions.flatMap((each) => each.filterings);
  return stages.filter(isGuide).flatMap((guide) => {
    const behind = isBehindCell(guide.pointer);
    const through = filterings.filter(({ filter }) => isBehindCell(filter.pointer) === behind);
    if (through.length === 0) return [];
    const lightest = through.reduce((best, each) => (each.mz < best.mz ? each : best));
    return [guideOf(guide, lightest)];
  });
}

function guideOf(guide: Placed<Guide>, { acquisition, pointer, ion, mz, setMz }: Filtering): Guiding {
  const { rf, rodSet } = guide.stage;
  const setting = rf === undefined ? null : { rf: { mode: "fixed" as const, rf }, pointer: guide.pointer };
  return guidingOf(acquisition, guide, rodSet, setting, {
    precursor: null,
    product: { pointer, ion, mz, setMz },
  });
}
