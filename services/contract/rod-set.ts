import { z } from "zod";
import type { Field } from "../physics/mathieu-parameters.ts";
import type { RectangularWave } from "../physics/rectangular/rectangular-wave.ts";
import type { WaveShape } from "./drive.ts";
import { FieldRadius_mm, Frequency_MHz, quantity } from "./quantity.ts";
import type { ErrorItem } from "./rule.ts";

export const Waveform = z
  .discriminatedUnion("shape", [
    z.strictObject({ shape: z.literal("sinusoid") }).meta({ id: "SinusoidWaveform" }),
    z
      .strictObject({
        shape: z.literal("rectangular"),
        dutyCycle: quantity(
          "Fraction of a period in which the x pair is at the level that has the sign of the ion.",
          0.01,
          0.99,
        ),
        coupling: z.enum(["dc", "ac"]).meta({
          description: "dc: the mean of the wave reaches the rods and acts as DC; ac: it does not.",
        }),
      })
      .meta({ id: "RectangularWaveform" }),
  ])
  .meta({ id: "Waveform", description: "Shape of the RF voltage; a sinusoid when absent." });
export type Waveform = z.output<typeof Waveform>;

export const RodSet = z
  .strictObject({
    fieldRadius_mm: FieldRadius_mm,
    frequency_MHz: Frequency_MHz,
    rodLength_mm: quantity("Length of the rods in mm.", 0.1, 10_000).optional(),
    polePairs: z.int().min(2).max(11).optional().meta({
      description: "Number of pole pairs: 2 is a quadrupole (when absent), 3 a hexapole, 4 an octopole.",
    }),
    waveform: Waveform.optional(),
  })
  .meta({ id: "RodSet", description: "The geometry and the drive frequency of a rod set." });
export type RodSet = z.output<typeof RodSet>;

/** The rod set in SI: field radius in m, frequency in Hz. */
export function fieldOf(rodSet: Pick<RodSet, "fieldRadius_mm" | "frequency_MHz">): Field {
  return { fieldRadius: rodSet.fieldRadius_mm / 1e3, frequency: rodSet.frequency_MHz * 1e6 };
}

export function polePairsOf(rodSet: RodSet): number {
  return rodSet.polePairs ?? 2;
}

/** How many rms volts a zero-to-peak volt is depends on this. */
export function waveShapeOf(waveform: Waveform | undefined): WaveShape {
  return waveform?.shape ?? "sinusoid";
}

/** The rectangular wave, null where the rods run a sinusoid. */
export function rectangularWaveOf(waveform: Waveform | undefined): RectangularWave | null {
  return waveform?.shape === "rectangular" ? waveform : null;
}

/** Rules of a place where only a sinusoidal quadrupole can be computed. */
export function sinusoidalQuadrupole(rodSet: RodSet, pointer: string): ErrorItem[] {
  return [...sinusoid(rodSet.waveform, `${pointer}/waveform`), ...quadrupole(rodSet, pointer)];
}

/** Rule of a place where a and q must be defined. */
export function quadrupole(rodSet: RodSet, pointer: string): ErrorItem[] {
  if (polePairsOf(rodSet) === 2) return [];
  return [
    {
      pointer: `${pointer}/polePairs`,
      code: "needs-two-pole-pairs",
      detail: `polePairs is ${rodSet.polePairs}; a mass filter has 2, and only RF-only answers are defined for more.`,
    },
  ];
}

/** Rule of a place where only a sinusoidal wave can be computed. */
export function sinusoid(waveform: Waveform | undefined, pointer: string): ErrorItem[] {
  if (waveform?.shape !== "rectangular") return [];
  return [
    {
      pointer,
      code: "waveform-not-computed",
      detail: "This question is not answered for a rectangular wave yet; shape must be sinusoid.",
    },
  ];
}
