import { Time_ms } from "../../contract/quantity.ts";
import { millisecondsFromSeconds } from "../../contract/si.ts";
import { defineCheck } from "../check.ts";
import type { Bounds } from "../finding.ts";
import { leverOn, passesIfWithin } from "../lever.ts";
import { boundsOf, LowerLimit } from "../limit.ts";
import { lacking, type Observation, type Reading } from "../observation.ts";
import { flightThrough } from "../resolve/flight.ts";
import { previousWithSameProduct } from "../resolve/predecessor.ts";
import type { ResolvedAcquisition, ResolvedMethod } from "../resolve/resolved-method.ts";
import { digits } from "../statement.ts";

export const pauseTime = defineCheck({
  id: "pause-time",
  computes:
    "Pause before an acquisition over the time that the voltages need to settle and the ion to fly through all stages, and the cell to clear where the acquisition before it has the same product.",
  needs: [
    "acquisition/pause_ms",
    "stages/settle_ms",
    "stages/residence",
    "stages/clearing_ms",
    "acquisition/retention",
  ],
  quantities: [
    { quantity: "pause-over-needed", unit: "1", meaning: "pause over settling, flight and clearing" },
  ],
  requiredByDefault: true,
  limit: LowerLimit,
  defaults: { pass: { min: 1 }, caution: { min: 1 } },
  basis:
    "A shorter pause lets ions of one set point be counted at the next (cross-talk): common practice, no source.",
  examine: (method, limits) =>
    method.acquisitions.map(
      (each): Observation => ({
        quantity: "pause-over-needed",
        unit: "1",
        subject: { pointer: each.pointer, acquisition: each.acquisition.id },
        ...pauseOverNeeded(method, each, boundsOf(limits.pass), boundsOf(limits.caution)),
      }),
    ),
});

function pauseOverNeeded(
  method: ResolvedMethod,
  each: ResolvedAcquisition,
  pass: Bounds,
  caution: Bounds,
): Reading {
  const { acquisition, pointer } = each;
  const { pause_ms } = acquisition;
  const missing = pause_ms === undefined ? [`${pointer}/pause_ms`] : [];
  const settle_ms = settling(method, each, missing);
  const flight_ms = flight(method, each, missing);
  const previous = previousWithSameProduct(method, each);
  const clearing_ms = previous === null ? 0 : clearing(method, missing);
  if (pause_ms === undefined || missing.length > 0) {
    return lacking(`Whether the pause before ${acquisition.id} is long enough`, missing);
  }
  // Above zero: no residence in a stage is.
  const needed_ms = settle_ms + flight_ms + clearing_ms;
  return {
    kind: "value",
    value: pause_ms / needed_ms,
    evidence: "computed",
    pass,
    caution,
    passesIf: () =>
      pass.min === null
        ? null
        : passesIfWithin(leverOn(`${pointer}/pause_ms`, "ms", Time_ms), {
            min: pass.min * needed_ms,
            max: null,
          }),
    statement:
      `${acquisition.id} pauses for ${digits(pause_ms, 4)} ms; settling takes ${digits(settle_ms, 4)} ms and the flight ${digits(flight_ms, 4)} ms` +
      (previous === null
        ? "."
        : `, and the cell clears in ${digits(clearing_ms, 4)} ms because ${previous.acquisition.id} before it has the same product.`),
  };
}

/** All stages settle at the same time, so the slowest decides. */
function settling(method: ResolvedMethod, { filterings }: ResolvedAcquisition, missing: string[]): number {
  let slowest = 0;
  for (const { stage, pointer } of method.filters) {
    if (!filterings.some(({ filter }) => filter.pointer === pointer)) continue;
    if (stage.settle_ms === undefined) missing.push(`${pointer}/settle_ms`);
    else slowest = Math.max(slowest, stage.settle_ms);
  }
  return slowest;
}

/** Flight of the heaviest ion through every stage: a product behind the collision cell. */
function flight(
  { stages }: ResolvedMethod,
  { filterings, cells }: ResolvedAcquisition,
  missing: string[],
): number {
  const cell = stages.findIndex(({ stage }) => stage.role === "collision-cell");
  const heaviest = Math.max(...filterings.map(({ mz }) => mz));
  const product = Math.max(...cells.map((each) => each.product.mz));
  let total_ms = 0;
  stages.forEach(({ stage, pointer }, index) => {
    if (stage.role === "ion-trap") return;
    const mz = cell >= 0 && index > cell ? product : heaviest;
    const through = flightThrough(stage, pointer, mz);
    missing.push(...through.missing);
    total_ms += millisecondsFromSeconds(through.time ?? 0);
  });
  return total_ms;
}

function clearing(method: ResolvedMethod, missing: string[]): number {
  const cell = method.stages.find(({ stage }) => stage.role === "collision-cell");
  if (cell?.stage.role !== "collision-cell") return 0;
  if (cell.stage.clearing_ms === undefined) missing.push(`${cell.pointer}/clearing_ms`);
  return cell.stage.clearing_ms ?? 0;
}
