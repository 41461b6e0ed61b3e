import { z } from "zod";
import type { Passband as ComputedPassband } from "../../physics/passband.ts";
import { RegionName } from "./region.ts";

const PassbandEdge = z
  .strictObject({
    a: z.number(),
    q: z.number(),
    lostTo: z
      .enum(["x", "y"])
      .meta({ description: "The rods that take an ion just outside this edge: light ions x, heavy ions y." }),
  })
  .meta({ id: "PassbandEdge", description: "Where the scan line leaves the region." });

export const Passband = z
  .strictObject({
    region: RegionName,
    mzLow: z.number().meta({ description: "m/z of the edge below which ions are lost." }),
    mzHigh: z.number().nullable().meta({
      description: "m/z of the edge above which ions are lost; null when there is no DC, so no upper edge.",
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

/** A computed passband of the first region on the scan line a = 2 (U/V) q. */
export function firstRegionPassband(computed: ComputedPassband, dcToRfRatio: number): Passband {
  const { mzLow, mzHigh, mzCentre, mzWidth, resolution, qLow, qHigh } = computed;
  return {
    region: "first",
    mzLow,
    mzHigh,
    mzCentre,
    mzWidth,
    resolution,
    low: { a: 2 * dcToRfRatio * qHigh, q: qHigh, lostTo: "x" },
    high: qLow === null ? null : { a: 2 * dcToRfRatio * qLow, q: qLow, lostTo: "y" },
  };
}
