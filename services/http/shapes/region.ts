import { z } from "zod";
import type { ErrorItem } from "../../contract/rule.ts";

export const RegionName = z.enum(["first", "second", "third"]).meta({
  id: "RegionName",
  description: "A stability region by its bands (n_x, n_y): first (0,0), second (1,1), third (1,0).",
});
export type RegionName = z.output<typeof RegionName>;

export function regionNameOf({ x, y }: { readonly x: number; readonly y: number }): RegionName | null {
  if (x === 0 && y === 0) return "first";
  if (x === 1 && y === 1) return "second";
  return x === 1 && y === 0 ? "third" : null;
}

export const WantedRegion = z
  .enum(["first", "second", "third", "any"])
  .meta({ description: "The region in which to look; the first when absent." });

/** Passbands and set points are computed in the first region only. */
export function firstRegionOnly({ region }: { readonly region?: string | undefined }): ErrorItem[] {
  if (region === undefined || region === "first") return [];
  return [
    {
      pointer: "/region",
      code: "region-not-computed",
      detail: `region is ${region}; this version computes passbands of the first region only.`,
    },
  ];
}
