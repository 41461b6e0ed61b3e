import { z } from "zod";
import { quantity } from "./quantity.ts";

export const WidthHeight = z.enum(["edges", "half-height", "tenth-height"]).meta({
  description:
    "At which height the width is taken: between the stability edges, at half or at a tenth of the peak's height. No default: the three differ.",
});
export type WidthHeight = z.output<typeof WidthHeight>;

export const Width = z
  .strictObject({
    value: quantity("The width in m/z, or the resolution m/width.", 1e-6, 1e6),
    as: z.enum(["mz", "resolution"]),
    at: WidthHeight,
  })
  .meta({ id: "Width", description: "Width of a mass window, with the height at which it is taken." });
export type Width = z.output<typeof Width>;

/** The width in m/z of a window at this m/z. */
export function widthInMz(width: Pick<Width, "value" | "as">, mz: number): number {
  return width.as === "mz" ? width.value : mz / width.value;
}
