import { readReference } from "./read-reference.ts";

interface ReferenceFlight {
  readonly a: number;
  readonly q: number;
  readonly phase: number;
  readonly x: number;
  readonly slopeX: number;
  readonly y: number;
  readonly slopeY: number;
  readonly rfCycles: number;
  readonly lost: { readonly to: "x" | "y"; readonly atCycle: number } | null;
  /** x, x', y, y' where the flight ends. */
  readonly end: readonly [number, number, number, number];
  /** x and y at every quarter of a cycle. */
  readonly quarters: readonly (readonly [number, number])[];
}
export const TRAJECTORIES = readReference<{ flights: readonly ReferenceFlight[] }>("trajectories").flights;
