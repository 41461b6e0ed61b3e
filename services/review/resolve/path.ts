import type { Instrument, MassFilterStage, Stage } from "../instrument.ts";
import type { Placed } from "./resolved-method.ts";

export function placedStages(instrument: Instrument): Placed<Stage>[] {
  return instrument.stages.map((stage, index) => ({ stage, pointer: `/instrument/stages/${index}` }));
}

function isFilter(placed: Placed<Stage>): placed is Placed<MassFilterStage> {
  return placed.stage.role === "mass-filter" && placed.stage.mode !== "rf-only";
}

/** The mass filters that select; one that is run as RF-only does not. */
export function filtersOf(stages: readonly Placed<Stage>[]): Placed<MassFilterStage>[] {
  return stages.filter(isFilter);
}

export function filterNamed(stages: readonly Placed<Stage>[], name: string): Placed<MassFilterStage> | null {
  return filtersOf(stages).find(({ stage }) => stage.name === name) ?? null;
}

type CollisionCell = Extract<Stage, { role: "collision-cell" }>;

export function cellOf(stages: readonly Placed<Stage>[]): Placed<CollisionCell> | null {
  return (
    stages.find((placed): placed is Placed<CollisionCell> => placed.stage.role === "collision-cell") ?? null
  );
}

/** The mass filter next to the collision cell on the side of the source. */
export function filterBeforeCell(stages: readonly Placed<Stage>[]): Placed<MassFilterStage> | null {
  const cell = stages.findIndex(({ stage }) => stage.role === "collision-cell");
  return filtersOf(stages.slice(0, Math.max(cell, 0))).at(-1) ?? null;
}

/** The mass filter next to the collision cell on the side of the detector. */
export function filterAfterCell(stages: readonly Placed<Stage>[]): Placed<MassFilterStage> | null {
  const cell = stages.findIndex(({ stage }) => stage.role === "collision-cell");
  return cell < 0 ? null : (filtersOf(stages.slice(cell + 1))[0] ?? null);
}
