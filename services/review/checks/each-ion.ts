import type { Observation } from "../observation.ts";
import type { Filtering, ResolvedMethod } from "../resolve/resolved-method.ts";
import { settingsAt } from "./worst-of-stage.ts";

/**
 * One observation for every ion that a filter selects; where `observe` has nothing to say of any ion of a stage, one
 * sentence for the stage in place of one for each ion.
 */
export function eachIon(
  method: ResolvedMethod,
  quantity: string,
  whyNot: string,
  observe: (filtering: Filtering) => Observation | null,
  targets: readonly Filtering["target"][] = ["ion"],
): Observation[] {
  return method.filters.flatMap((filter) => {
    const observations: Observation[] = [];
    for (const filtering of settingsAt(method, filter)) {
      const observation = targets.includes(filtering.target) ? observe(filtering) : null;
      if (observation !== null) observations.push(observation);
    }
    if (observations.length > 0) return observations;
    return [
      {
        kind: "not-applicable",
        quantity,
        unit: "1",
        subject: { pointer: filter.pointer, stage: filter.stage.name },
        statement: `The method ${whyNot} in ${filter.stage.name}.`,
      },
    ];
  });
}
