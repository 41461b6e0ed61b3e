import type { MassFilterStage } from "../instrument.ts";
import type { Observation } from "../observation.ts";
import type { Placed, ResolvedMethod } from "../resolve/resolved-method.ts";
import { digits } from "../statement.ts";

/** A rated range is guaranteed up to its ends, so it has no caution and no limit of the laboratory's. */
const GUARANTEED = { min: 0, max: null };

/** Distance of the set m/z nearest to an end of the rated range from that end; nothing where no range is rated. */
export function ratedRange(method: ResolvedMethod, filter: Placed<MassFilterStage>): Observation[] {
  const { rated, name } = filter.stage;
  if (rated === undefined) return [];
  const about = {
    quantity: "rated-range",
    unit: "1",
    subject: { pointer: `${filter.pointer}/rated`, stage: name },
  };
  const inside = (setMz: number) => Math.min(rated.mzHigh - setMz, setMz - rated.mzLow);
  const settings = method.acquisitions.flatMap(({ filterings }) =>
    filterings.filter((each) => each.filter === filter),
  );
  if (settings.length === 0) {
    return [{ ...about, kind: "not-applicable", statement: `The method sets no m/z in ${name}.` }];
  }
  const worst = settings.reduce((best, setting) =>
    inside(setting.setMz) < inside(best.setMz) ? setting : best,
  );
  const value = inside(worst.setMz);
  return [
    {
      ...about,
      kind: "value",
      subject: {
        ...about.subject,
        pointer: worst.setMzPointer,
        acquisition: worst.acquisition.id,
        ion: worst.ion,
      },
      value,
      evidence: "stated",
      pass: GUARANTEED,
      caution: GUARANTEED,
      passesIf: { input: worst.setMzPointer, min: rated.mzLow, max: rated.mzHigh, unit: "1" },
      statement: `m/z ${worst.setMz} lies ${digits(Math.abs(value), 4)} ${value < 0 ? "outside" : "inside"} the nearer end of the range ${rated.mzLow} to ${rated.mzHigh} for which ${name} is rated.`,
    },
  ];
}
