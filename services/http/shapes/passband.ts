import { z } from "zod";
import type { Passband as ComputedPassband } from "../../physics/passband.ts";
import { type Bands, regionNameOf } from "../../physics/regions/stability-regions.ts";
import { RegionName } from "./region.ts";

const PassbandEdge = z
  .strictObject({
    a: z.number(),
    q: z.number(),
    lostTo: z.enum(["x", "y"]).nullable().meta({
      description:
        "The rods that take an ion just outside this edge; in the first region light ions x, heavy ones y. null where the window goes on beyond this q, but no edge is sought there.",
    }),
  })
  .meta({ id: "PassbandEdge", description: "Where the scan line leaves the region." });

export const Passband = z
  .strictObject({
    region: RegionName.nullable().meta({ description: "null for a region without a name: see bands." }),
    bands: z
      .strictObject({ x: z.int(), y: z.int() })
      .meta({ description: "The bands n_x and n_y of the region." }),
    mzLow: z.number().meta({ description: "m/z of the edge below which ions are lost." }),
    mzHigh: z.number().nullable().meta({
      description:
        "m/z of the edge above which ions are lost; null where the field has no mean, so that there is no upper edge.",
    }),
    mzCentre: z.number().nullable().meta({ description: "Half-way between both edges in m/z." }),
    mzWidth: z.number().nullable().meta({ description: "Distance of both edges in m/z." }),
    resolution: z.number().nullable().meta({ description: "mzCentre/mzWidth, between the edges." }),
    low: PassbandEdge,
    high: PassbandEdge.nullable(),
  })
  .meta({
    id: "Passband",
    description: "The m/z that are stable in both planes in an ideal field after any number of RF cycles.",
  });
export type Passband = z.output<typeof Passband>;

/** A window as physics finds it, and the rods that take an ion beyond its ends at low and at high m/z. */
export interface ComputedWindow {
  readonly bands: Bands;
  readonly passband: ComputedPassband;
  readonly lostBeyond: { readonly low: "x" | "y" | null; readonly high: "x" | "y" | null };
}

/** A computed window on the scan line a = 2 (U/V) q. */
export function answeredPassband(window: ComputedWindow, dcToRfRatio: number): Passband {
  const { bands, passband, lostBeyond } = window;
  const { mzLow, mzHigh, mzCentre, mzWidth, resolution, qLow, qHigh } = passband;
  const edge = (q: number, lostTo: "x" | "y" | null) => ({ a: 2 * dcToRfRatio * q, q, lostTo });
  return {
    region: regionNameOf(bands),
    bands: { x: bands.x, y: bands.y },
    mzLow,
    mzHigh,
    mzCentre,
    mzWidth,
    resolution,
    low: edge(qHigh, lostBeyond.low),
    high: qLow === null ? null : edge(qLow, lostBeyond.high),
  };
}
