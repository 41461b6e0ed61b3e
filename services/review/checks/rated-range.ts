import { Mz } from "../../contract/quantity.ts";
import type { PassesIf } from "../finding.ts";
import type { MassFilterStage } from "../instrument.ts";
import { leverOn, passesIfWithin } from "../lever.ts";
import type { Observation } from "../observation.ts";
import type { Filtering, Placed, ResolvedMethod } from "../resolve/resolved-method.ts";
import { digits } from "../statement.ts";
import { settingsAt, worstOfStage } from "./worst-of-stage.ts";

type Rated = NonNullable<MassFilterStage["rated"]>;

/** A rated range is guaranteed up to its ends, so it has no caution and no limit of the laboratory's. */
const GUARANTEED = { min: 0, max: null };

/** How far inside the rated range the set m/z lies that is nearest to an end; nothing where no range is rated. */
export function ratedRange(method: ResolvedMethod, filter: Placed<MassFilterStage>): Observation[] {
  const { rated, name } = filter.stage;
  if (rated === undefined) return [];
  const settings = settingsAt(method, filter);
  const observation = worstOfStage(
    { quantity: "rated-range", unit: "1", subject: { pointer: filter.pointer, stage: name } },
    settings,
    `The method sets no m/z in ${name}.`,
    ({ setMz }) => {
      const value = Math.min(rated.mzHigh - setMz, setMz - rated.mzLow);
      return {
        kind: "value",
        value,
        evidence: "stated",
        pass: GUARANTEED,
        caution: GUARANTEED,
        passesIf: () => null,
        statement: () =>
          `m/z ${setMz} lies ${digits(Math.abs(value), 4)} ${value < 0 ? "outside" : "inside"} the nearer end of the range ${rated.mzLow} to ${rated.mzHigh} for which ${name} is rated.`,
      };
    },
    () => passesIfInside(settings, rated, filter.pointer),
  );
  return [observation];
}

/** A set m/z that is the only one outside may move inside; else an end of the range would have to lie further out. */
function passesIfInside(settings: readonly Filtering[], rated: Rated, pointer: string): PassesIf | null {
  const outside = settings.filter(({ setMz }) => setMz < rated.mzLow || setMz > rated.mzHigh);
  if (outside.length === 1) {
    return passesIfWithin(outside[0]!.setMzLever, { min: rated.mzLow, max: rated.mzHigh });
  }
  const lowest = Math.min(...settings.map(({ setMz }) => setMz));
  const highest = Math.max(...settings.map(({ setMz }) => setMz));
  if (lowest >= rated.mzLow) {
    return passesIfWithin(leverOn(`${pointer}/rated/mzHigh`, "1", Mz), { min: highest, max: null });
  }
  if (highest > rated.mzHigh) return null;
  return passesIfWithin(leverOn(`${pointer}/rated/mzLow`, "1", Mz), { min: null, max: lowest });
}
