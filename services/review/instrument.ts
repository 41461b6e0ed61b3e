import { z } from "zod";
import { Beam } from "../contract/beam.ts";
import { Dc, Drive, Rf } from "../contract/drive.ts";
import { MathieuQ, Mz, quantity, Time_ms, Tolerance_ppm } from "../contract/quantity.ts";
import { Residence } from "../contract/residence.ts";
import { RodSet } from "../contract/rod-set.ts";
import { FormulaText, Identifier, Label } from "../contract/text.ts";
import { Width } from "../contract/width.ts";

const MAX_POINTS = 200;

export const OperatingPointByLaw = z
  .strictObject({
    by: z.literal("drive-law"),
    rfPerMz: Rf.meta({
      description: "RF volts per unit of set m/z, in the convention stated beside them.",
    }),
    dcSlope: quantity(
      "U/V of the straight line, U and V between the same points and V zero-to-peak, dimensionless.",
      0,
      1,
    ),
    dcOffset_V: quantity(
      "What the straight line takes off: U = dcSlope V - dcOffset_V, between the points that rfPerMz names.",
      -1e4,
      1e4,
    ),
  })
  .meta({ id: "OperatingPointByLaw", description: "The straight line that the supply follows." });

export const OperatingPoint = z
  .discriminatedUnion("by", [
    z
      .strictObject({
        by: z.literal("measured-peaks"),
        peaks: z
          .array(
            z
              .strictObject({
                setMz: Mz.meta({ description: "The m/z that was set." }),
                observedMz: Mz.meta({ description: "The m/z at which the peak was observed." }),
                width: Width,
              })
              .meta({ id: "MeasuredPeak" }),
          )
          .min(1)
          .max(MAX_POINTS),
      })
      .meta({ id: "OperatingPointByPeaks", description: "The peaks of a tune report." }),
    z
      .strictObject({
        by: z.literal("drives"),
        points: z
          .array(z.strictObject({ mz: Mz, drive: Drive }).meta({ id: "DrivePoint" }))
          .min(1)
          .max(MAX_POINTS),
      })
      .meta({ id: "OperatingPointByDrives", description: "Voltages read from the supply at set m/z." }),
    OperatingPointByLaw,
    z.strictObject({ by: z.literal("stated"), width: Width }).meta({
      id: "OperatingPointStated",
      description: "Only claimed: what follows from it proves nothing.",
    }),
  ])
  .meta({ id: "OperatingPoint", description: "How the working point of a mass filter is known." });
export type OperatingPoint = z.output<typeof OperatingPoint>;

const Supply = z
  .strictObject({
    rfMax: Rf.optional().meta({ description: "Largest RF voltage of the supply." }),
    dcMax: Dc.optional().meta({ description: "Largest DC voltage of the supply." }),
  })
  .meta({ id: "Supply", description: "What the supply can reach." });
export type Supply = z.output<typeof Supply>;

export const Tolerances = z
  .strictObject({
    fieldRadius_ppm: Tolerance_ppm.optional(),
    frequency_ppm: Tolerance_ppm.optional(),
    amplitude_ppm: Tolerance_ppm.optional().meta({
      description: "U and V moving together, plus or minus, in ppm.",
    }),
    ratio_ppm: Tolerance_ppm.optional().meta({ description: "U against V, plus or minus, in ppm." }),
    mzDriftBetweenTunes: quantity(
      "Shift of the window between two tunes, plus or minus, in m/z.",
      0,
      100,
    ).optional(),
    mzCalibration: quantity("Uncertainty of the m/z calibration, plus or minus, in m/z.", 0, 100).optional(),
  })
  .meta({ id: "Tolerances", description: "What may move between two tunes." });
export type Tolerances = z.output<typeof Tolerances>;

const MassFilterStage = z
  .strictObject({
    name: Identifier,
    role: z.literal("mass-filter"),
    mode: z.enum(["filtering", "rf-only"]).optional().meta({
      description: "filtering when absent; rf-only when the rods pass ions without selecting them.",
    }),
    operatingPoint: OperatingPoint.optional().meta({ description: "Required unless mode is rf-only." }),
    rf: Rf.optional().meta({ description: "The RF voltage of a mass filter run as rf-only." }),
    rodSet: RodSet.optional(),
    residence: Residence.optional(),
    beam: Beam.optional(),
    supply: Supply.optional(),
    rated: z
      .strictObject({ mzLow: Mz, mzHigh: Mz })
      .optional()
      .meta({ description: "The m/z range that the maker guarantees." }),
    tolerances: Tolerances.optional(),
    settle_ms: Time_ms.optional().meta({
      description: "Time the voltages need to settle after a step, in ms.",
    }),
  })
  .meta({ id: "MassFilterStage" });
export type MassFilterStage = z.output<typeof MassFilterStage>;

export const CellRf = z
  .discriminatedUnion("mode", [
    z.strictObject({ mode: z.literal("fixed"), rf: Rf }).meta({ id: "CellRfFixed" }),
    z
      .strictObject({
        mode: z.literal("cutoff"),
        mz: Mz.meta({ description: "The low-mass cutoff that was set." }),
      })
      .meta({ id: "CellRfCutoff" }),
    z
      .strictObject({
        mode: z.literal("precursor-q"),
        q: MathieuQ.meta({ description: "q of the set precursor m/z in the cell." }),
      })
      .meta({ id: "CellRfPrecursorQ" }),
    z
      .strictObject({
        mode: z.literal("product-q"),
        q: MathieuQ.meta({ description: "q of the set product m/z in the cell." }),
      })
      .meta({ id: "CellRfProductQ" }),
    z
      .strictObject({
        mode: z.literal("table"),
        points: z
          .array(
            z.strictObject({ mz: Mz.meta({ description: "Set precursor m/z." }), cutoffMz: Mz }).meta({
              id: "CutoffPoint",
            }),
          )
          .min(1)
          .max(MAX_POINTS)
          .meta({ description: "Low-mass cutoff against set precursor m/z, linear between the points." }),
      })
      .meta({ id: "CellRfTable" }),
  ])
  .meta({ id: "CellRf", description: "How the RF voltage of the collision cell is set." });
export type CellRf = z.output<typeof CellRf>;

const CollisionCellStage = z
  .strictObject({
    name: Identifier,
    role: z.literal("collision-cell"),
    rf: CellRf,
    rodSet: RodSet.optional(),
    residence: Residence.optional(),
    supply: Supply.optional(),
    gas: z
      .strictObject({ formula: FormulaText, pressure_Pa: quantity("Gas pressure in Pa.", 0, 1e4) })
      .optional(),
    maxRadialEnergy_eVPerCharge: quantity(
      "Largest radial energy to be confined, in eV per charge.",
      1e-4,
      1e4,
    ).optional(),
    clearing_ms: Time_ms.optional().meta({
      description: "Time in which ions of the last transition leave, in ms.",
    }),
  })
  .meta({ id: "CollisionCellStage" });
export type CollisionCellStage = z.output<typeof CollisionCellStage>;

const IonGuideStage = z
  .strictObject({
    name: Identifier,
    role: z.literal("ion-guide"),
    rf: Rf.optional(),
    rodSet: RodSet.optional(),
    residence: Residence.optional(),
    supply: Supply.optional(),
  })
  .meta({ id: "IonGuideStage" });
export type IonGuideStage = z.output<typeof IonGuideStage>;

/** Accepted by the schema so that a rule can refuse it by its own code instead of by its members. */
const IonTrapStage = z
  .looseObject({ name: Identifier, role: z.literal("ion-trap") })
  .meta({ id: "IonTrapStage", description: "Refused: a linear formula does not hold in an ion trap." });

export const Stage = z
  .discriminatedUnion("role", [MassFilterStage, CollisionCellStage, IonGuideStage, IonTrapStage])
  .meta({ id: "Stage" });
export type Stage = z.output<typeof Stage>;

export const Instrument = z
  .strictObject({
    id: Identifier,
    revision: Identifier,
    label: Label.optional(),
    stages: z
      .array(Stage)
      .min(1)
      .max(20)
      .meta({ description: "The rod sets, in the order in which ions meet them." }),
  })
  .meta({
    id: "Instrument",
    description: "What is known of the instrument. Nothing about the rods need be known.",
  });
export type Instrument = z.output<typeof Instrument>;
