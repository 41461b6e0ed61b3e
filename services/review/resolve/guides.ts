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
 * of a transition the precursor before the collision cell and the product behind it, of a single selection its ion.
 */
export function guidesOf(
  stages: readonly Placed<Stage>[],
  acquisitions: readonly ResolvedAcquisition[],
): Guiding[] {
  const order = new Map(stages.map(({ pointer }, index) => [pointer, index]));
  const cell = stages.findIndex(({ stage }) => stage.role === "collision-cell");
  const isBehindCell = (pointer: string) => cell >= 0 && order.get(pointer)! > cell;
  return stages.filter(isGuide).flatMap((guide) => {
    const behind = isBehindCell(guide.pointer);
    let lightest: Filtering | null = null;
    for (const { acquisition, filterings } of acquisitions) {
      const single = acquisition.kind === "scan" || acquisition.kind === "selected-ion";
      for (const each of filterings) {
        if (!single && isBehindCell(each.filter.pointer) !== behind) continue;
        if (lightest === null || each.mz < lightest.mz) lightest = each;
      }
    }
    return lightest === null ? [] : [guideOf(guide, lightest)];
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
