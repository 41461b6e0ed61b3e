import { z } from "zod";
import { type Bands, regionNameOf } from "../../physics/regions/stability-regions.ts";

export const RegionName = z.enum(["first", "second", "third"]).meta({
  id: "RegionName",
  description: "A stability region by its bands (n_x, n_y): first (0,0), second (1,1), third (1,0).",
});

export const Region = z.strictObject({ x: z.int(), y: z.int(), name: RegionName.nullable() }).meta({
  id: "Region",
  description: "A stability region: its bands n_x and n_y, and its name if it has one.",
});
export type Region = z.output<typeof Region>;

export function regionOf(bands: Bands): Region {
  return { x: bands.x, y: bands.y, name: regionNameOf(bands) };
}

export const WantedRegion = z
  .enum(["first", "second", "third", "any"])
  .meta({ description: "The region in which to look; the first when absent." });
export type WantedRegion = z.output<typeof WantedRegion>;
