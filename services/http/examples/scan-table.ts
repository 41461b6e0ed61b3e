import type { z } from "zod";
import type { Example } from "../endpoint.ts";
import type { ScanTableAnswer, ScanTableRequest } from "../shapes/scan-table.ts";

type Examples = Readonly<
  Record<string, Example<z.input<typeof ScanTableRequest>, z.output<typeof ScanTableAnswer>>>
>;

export const SCAN_TABLE_EXAMPLES: Examples = {
  "constant-width": {
    summary: "Width 0.70 from m/z 50 to 1000, and the fastest scan that costs 11 % of the height",
    source: "Computed by an independent program (test/reference, generate-endpoint-examples).",
    request: {
      rodSet: { fieldRadius_mm: 4, frequency_MHz: 1.2, rodLength_mm: 200 },
      convention: {
        rf: { as: "zero-to-peak", between: "pole-and-ground" },
        dc: { between: "pole-and-ground" },
      },
      mzFrom: 50,
      mzTo: 1000,
      points: 3,
      width: { value: 0.7, as: "mz", at: "edges" },
      residence: { axialEnergy_eVPerCharge: 2 },
      permittedLoss: 0.11,
    },
    answer: {
      convention: {
        rf: { as: "zero-to-peak", between: "pole-and-ground" },
        dc: { between: "pole-and-ground" },
      },
      rows: [
        {
          mz: 50,
          drive: {
            rf: { volts: 82.80781581129631, as: "zero-to-peak", between: "pole-and-ground" },
            dc: { volts: 13.75277382664478, between: "pole-and-ground" },
          },
          reason: null,
          a: 0.23341532563287923,
          q: 0.7027169041016925,
          mzLow: 49.65,
          mzHigh: 50.35,
          fastestRate_mzPerS: 3208.9106569108285,
        },
        {
          mz: 525,
          drive: {
            rf: { volts: 873.1545183009497, as: "zero-to-peak", between: "pole-and-ground" },
            dc: { volts: 146.4063842941834, between: "pole-and-ground" },
          },
          reason: null,
          a: 0.23665178416625107,
          q: 0.7056849863648762,
          mzLow: 524.65,
          mzHigh: 525.35,
          fastestRate_mzPerS: 990.2913281807955,
        },
        {
          mz: 1000,
          drive: {
            rf: { volts: 1663.499789046195, as: "zero-to-peak", between: "pole-and-ground" },
            dc: { volts: 279.0608078024695, between: "pole-and-ground" },
          },
          reason: null,
          a: 0.2368142970488995,
          q: 0.705832782980429,
          mzLow: 999.65,
          mzHigh: 1000.35,
          fastestRate_mzPerS: 717.5342362576116,
        },
      ],
      lines: [
        {
          sense: "least-squares",
          dcSlope: 0.16784314247371532,
          dcOffset_V: 0.14653313422078731,
          worst: {
            mz: 50,
            wantedWidth: 0.7,
            width: 0.7028185608926913,
            error: 0.0028185608926913908,
            centreShift: 0.0009391278926216273,
            reason: null,
          },
          nothingPasses: null,
        },
        {
          sense: "least-worst-width",
          dcSlope: 0.16784296535122784,
          dcOffset_V: 0.14630188009628323,
          worst: {
            mz: 50,
            wantedWidth: 0.7,
            width: 0.701771312213442,
            error: 0.0017713122134420667,
            centreShift: 0.0005901870560265365,
            reason: null,
          },
          nothingPasses: null,
        },
      ],
      linesReason: null,
      fastest: { rate_mzPerS: 717.5342362576116, mz: 1000, shiftOverWidth: 0.33 },
    },
  },
};
