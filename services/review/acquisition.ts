import { z } from "zod";
import { Ion } from "../contract/ion.ts";
import { Mz, quantity, Time_ms } from "../contract/quantity.ts";
import { FormulaText, Identifier, Label, Sentence } from "../contract/text.ts";
import { Width } from "../contract/width.ts";
import { CellRf } from "./instrument.ts";

export const Polarity = z.enum(["positive", "negative"]).meta({ id: "Polarity" });
export type Polarity = z.output<typeof Polarity>;

const Neighbour = z
  .strictObject({
    ion: Ion,
    fractionOfTarget: quantity("Response of the neighbour as a fraction of the target's.", 0, 1e9),
    attenuation: z
      .strictObject({
        factor: quantity("What is left of the neighbour, as a fraction.", 0, 1),
        evidence: Sentence,
      })
      .optional(),
  })
  .meta({ id: "Neighbour" });

const CellSetting = z
  .strictObject({
    rf: CellRf.optional(),
    collisionEnergy_eVPerCharge: quantity(
      "Collision energy, in eV per charge; the sign follows the polarity.",
      -1e4,
      1e4,
    ).optional(),
  })
  .meta({
    id: "CellSetting",
    description: "What this acquisition sets in the collision cell, in place of the instrument's.",
  });

const Retention = z
  .strictObject({
    start_min: quantity("Start of the retention window in min.", 0, 1e5),
    end_min: quantity("End of the retention window in min.", 0, 1e5),
  })
  .meta({ id: "Retention" });

const common = {
  id: Identifier,
  label: Label.optional(),
  compound: Identifier.optional().meta({ description: "id of a compound of the method." }),
  polarity: Polarity.optional().meta({ description: "The method's polarity when absent." }),
  pause_ms: Time_ms.optional().meta({
    description: "Time between the step to this acquisition and its dwell, in ms.",
  }),
  retention: Retention.optional().meta({ description: "When it is acquired; always when absent." }),
};

const counted = {
  use: z.enum(["quantifier", "qualifier"]).optional(),
  dwell_ms: Time_ms.optional().meta({ description: "Dwell time in ms." }),
  countRate_perS: quantity(
    "Expected count rate at the lower limit, in counts per second.",
    0,
    1e12,
  ).optional(),
  neighbours: z.array(Neighbour).max(50).optional(),
};

export const ScanRate_mzPerS = quantity("Scan rate in m/z per second.", 1e-3, 1e8);

const scanned = {
  mzFrom: Mz.meta({ description: "m/z at which the scan starts." }),
  mzTo: Mz.meta({ description: "m/z at which the scan ends; above mzFrom." }),
  rate_mzPerS: ScanRate_mzPerS,
};

const precursorMembers = {
  precursor: Ion,
  setPrecursorMz: Mz.optional().meta({
    description: "m/z set for the precursor; its computed m/z when absent.",
  }),
  precursorWidth: Width.optional().meta({ description: "Window that the method claims for the precursor." }),
};

const Transition = z
  .strictObject({
    ...common,
    ...counted,
    ...precursorMembers,
    kind: z.literal("transition"),
    product: z.union([
      Ion,
      z.strictObject({ neutralLoss: FormulaText }).meta({ id: "ProductByNeutralLoss" }),
    ]),
    setProductMz: Mz.optional().meta({
      description: "m/z set for the product; its computed m/z when absent.",
    }),
    productWidth: Width.optional().meta({ description: "Window that the method claims for the product." }),
    cell: CellSetting.optional(),
  })
  .meta({ id: "Transition" });
export type Transition = z.output<typeof Transition>;

const SelectedIon = z
  .strictObject({
    ...common,
    ...counted,
    kind: z.literal("selected-ion"),
    stage: Identifier.meta({ description: "Name of the mass filter that selects the ion." }),
    ion: Ion,
    setMz: Mz.optional().meta({ description: "m/z set for the ion; its computed m/z when absent." }),
    width: Width.optional().meta({ description: "Window that the method claims." }),
  })
  .meta({ id: "SelectedIon" });

const Scan = z
  .strictObject({
    ...common,
    ...scanned,
    kind: z.literal("scan"),
    stage: Identifier.meta({ description: "Name of the mass filter that scans." }),
    width: Width.optional().meta({ description: "Window that the method claims." }),
  })
  .meta({ id: "Scan" });

const ProductScan = z
  .strictObject({
    ...common,
    ...scanned,
    ...precursorMembers,
    kind: z.literal("product-scan"),
    productWidth: Width.optional(),
    cell: CellSetting.optional(),
  })
  .meta({
    id: "ProductScan",
    description: "The filter before the cell holds the precursor, the one behind it scans.",
  });

const PrecursorScan = z
  .strictObject({
    ...common,
    ...scanned,
    kind: z.literal("precursor-scan"),
    product: Ion,
    setProductMz: Mz.optional(),
    productWidth: Width.optional(),
    precursorWidth: Width.optional(),
    cell: CellSetting.optional(),
  })
  .meta({
    id: "PrecursorScan",
    description: "The filter before the cell scans, the one behind it holds the product.",
  });

const NeutralLossScan = z
  .strictObject({
    ...common,
    ...scanned,
    kind: z.literal("neutral-loss-scan"),
    lossMz: quantity("Distance of both filters in m/z: mass of the loss over the charge number.", 0.5, 1e5),
    precursorWidth: Width.optional(),
    productWidth: Width.optional(),
    cell: CellSetting.optional(),
  })
  .meta({
    id: "NeutralLossScan",
    description: "Both filters scan at a fixed distance; mzFrom and mzTo are the precursor's.",
  });

export const Acquisition = z
  .discriminatedUnion("kind", [Transition, SelectedIon, Scan, ProductScan, PrecursorScan, NeutralLossScan])
  .meta({ id: "Acquisition" });
export type Acquisition = z.output<typeof Acquisition>;
