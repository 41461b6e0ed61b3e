import { z } from "zod";
import { DcVolts, RfVolts } from "./quantity.ts";

const RfReading = z
  .enum(["zero-to-peak", "peak-to-peak", "rms"])
  .meta({ description: "How the RF amplitude is read. No default: a wrong guess is a factor of two." });
const Between = z.enum(["pole-and-ground", "pole-and-pole"]).meta({
  description: "Between which points the voltage is taken. No default: a wrong guess is a factor of two.",
});

export const Rf = z
  .strictObject({ volts: RfVolts, as: RfReading, between: Between })
  .meta({ id: "Rf", description: "An RF voltage with the convention in which it is stated." });
export type Rf = z.output<typeof Rf>;

export const Dc = z
  .union([
    z.strictObject({ volts: DcVolts, between: Between }).meta({ id: "DcDifference" }),
    z
      .strictObject({
        pairX_V: DcVolts.meta({ description: "DC of the x pair against ground, in V." }),
        pairY_V: DcVolts.meta({ description: "DC of the y pair against ground, in V." }),
      })
      .meta({ id: "DcPairs" }),
  ])
  .meta({
    id: "Dc",
    description:
      "The DC between the rod pairs, or both pairs against ground: the second gives U and the rod offset, which must not be taken for U.",
  });
export type Dc = z.output<typeof Dc>;

export const Drive = z
  .strictObject({ rf: Rf, dc: Dc.optional().meta({ description: "Absent means RF-only." }) })
  .meta({
    id: "Drive",
    description: "The voltages on a rod set. x is the pair whose DC has the sign of the ion.",
  });
export type Drive = z.output<typeof Drive>;

export const VoltageConvention = z
  .strictObject({
    rf: z.strictObject({ as: RfReading, between: Between }),
    dc: z.strictObject({ between: Between }),
  })
  .meta({ id: "VoltageConvention", description: "How the voltages of the answer are to be read." });
export type VoltageConvention = z.output<typeof VoltageConvention>;

/** Wave shapes differ in one number here: the ratio of zero-to-peak to rms. */
export type WaveShape = "sinusoid" | "rectangular";

function canonicalFactor(as: Rf["as"], between: Rf["between"], shape: WaveShape): number {
  const reading =
    as === "zero-to-peak" ? 1 : as === "peak-to-peak" ? 0.5 : shape === "sinusoid" ? Math.SQRT2 : 1;
  return between === "pole-and-pole" ? reading / 2 : reading;
}

/** V: zero-to-peak, pole-to-ground. */
export function rfToCanonical(rf: Rf, shape: WaveShape = "sinusoid"): number {
  return rf.volts * canonicalFactor(rf.as, rf.between, shape);
}

/** The stated form of V (zero-to-peak, pole-to-ground). */
export function rfFromCanonical(
  rfVolts: number,
  convention: VoltageConvention["rf"],
  shape: WaveShape = "sinusoid",
): Rf {
  const { as, between } = convention;
  return { volts: rfVolts / canonicalFactor(as, between, shape), as, between };
}

/**
 * U pole-to-ground as a magnitude, because x is by definition the pair whose DC has the sign of the ion; and the rod
 * offset (mean of both pairs) where both pairs were stated.
 */
export function dcToCanonical(dc: Dc | undefined): { dcVolts: number; rodOffset_V: number | null } {
  if (dc === undefined) return { dcVolts: 0, rodOffset_V: null };
  if ("pairX_V" in dc) {
    return { dcVolts: Math.abs(dc.pairX_V - dc.pairY_V) / 2, rodOffset_V: (dc.pairX_V + dc.pairY_V) / 2 };
  }
  return { dcVolts: Math.abs(dc.volts) / (dc.between === "pole-and-pole" ? 2 : 1), rodOffset_V: null };
}

/** The stated form of U (pole-to-ground). */
export function dcFromCanonical(dcVolts: number, convention: VoltageConvention["dc"]): Dc {
  const { between } = convention;
  return { volts: dcVolts * (between === "pole-and-pole" ? 2 : 1), between };
}

/** V zero-to-peak and U, both pole-to-ground, in V. */
export interface CanonicalVolts {
  readonly rfVolts: number;
  readonly dcVolts: number;
}

export function driveToCanonical(drive: Drive, shape: WaveShape = "sinusoid"): CanonicalVolts {
  return { rfVolts: rfToCanonical(drive.rf, shape), dcVolts: dcToCanonical(drive.dc).dcVolts };
}

export function driveFromCanonical(
  volts: CanonicalVolts,
  convention: VoltageConvention,
  shape: WaveShape = "sinusoid",
): Drive {
  return {
    rf: rfFromCanonical(volts.rfVolts, convention.rf, shape),
    dc: dcFromCanonical(volts.dcVolts, convention.dc),
  };
}

/** The convention in which a drive is stated; pairs are stated against ground. */
export function conventionOf(drive: Drive): VoltageConvention {
  const { as, between } = drive.rf;
  return {
    rf: { as, between },
    dc: { between: drive.dc !== undefined && "between" in drive.dc ? drive.dc.between : "pole-and-ground" },
  };
}
