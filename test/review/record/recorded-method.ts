import type { Rf } from "../../../services/contract/drive.ts";
import { recordedSignOff } from "../../../services/review/record/record.ts";
import type { Engine, SealedRecord } from "../../../services/review/record/record-schema.ts";
import type { SignOffRequest } from "../../../services/review/sign-off-schema.ts";

export const ENGINE: Engine = { version: "0.1.0", constants: "CODATA 2022" };

const zeroToPeak = (volts: number): Rf => ({ volts, as: "zero-to-peak", between: "pole-and-ground" });
const edges = (value: number) => ({ value, as: "mz", at: "edges" }) as const;

/** An invented triple quadrupole known by its volts and rods, so that every part of the physics has its say. */
const instrument: SignOffRequest["instrument"] = {
  id: "harbour-laboratory-1",
  revision: "3",
  stages: [
    {
      name: "Q1",
      role: "mass-filter",
      operatingPoint: {
        by: "drives",
        points: [100, 500, 1000].map((mz) => ({
          mz,
          drive: { rf: zeroToPeak(1.6631 * mz), dc: { volts: 0.27886 * mz, between: "pole-and-ground" } },
        })),
      },
      rodSet: { fieldRadius_mm: 4, frequency_MHz: 1.2, rodLength_mm: 200 },
      residence: { axialEnergy_eVPerCharge: 1.5 },
      supply: { rfMax: zeroToPeak(2000), dcMax: { volts: 340, between: "pole-and-ground" } },
      tolerances: { ratio_ppm: 20, amplitude_ppm: 50, mzDriftBetweenTunes: 0.05 },
      settle_ms: 1,
    },
    {
      name: "q2",
      role: "collision-cell",
      rodSet: { fieldRadius_mm: 4.17, frequency_MHz: 1, rodLength_mm: 180 },
      rf: { mode: "fixed", rf: zeroToPeak(100) },
      maxRadialEnergy_eVPerCharge: 0.5,
      clearing_ms: 2,
    },
    {
      name: "Q3",
      role: "mass-filter",
      operatingPoint: {
        by: "measured-peaks",
        peaks: [
          { setMz: 69, observedMz: 69.02, width: edges(0.69) },
          { setMz: 502, observedMz: 501.97, width: edges(0.72) },
        ],
      },
    },
  ],
};

/** A method of so many transitions, some of them with a product below the cutoff of the cell. */
export function requestOf(transitions: number): SignOffRequest {
  return {
    instrument,
    method: {
      id: "invented-multi-residue",
      revision: "7",
      polarity: "positive",
      timing: { mode: "dwell" },
      chromatographicPeakWidth: { value_s: 6, at: "base" },
      acquisition: Array.from({ length: transitions }, (_, index) => ({
        id: `T-${index}`,
        kind: "transition",
        precursor: { mz: 180.0634 + ((index * 7.0123) % 700), label: `Prüfstoff ${index} ✓` },
        setPrecursorMz: 180.06 + ((index * 7.0123) % 700),
        product: { mz: 60.0445 + ((index * 3.0071) % 110) },
        dwell_ms: 10 + (index % 3),
        pause_ms: 4,
      })),
    },
    criteria: {
      id: "sop-112",
      revision: "4",
      checks: { "product-above-cutoff": { required: true, pass: { min: 1.3 }, caution: { min: 1.1 } } },
    },
  };
}

export function recordOf(transitions: number): SealedRecord {
  return throughJson(recordedSignOff(requestOf(transitions), ENGINE).record);
}

/** The value as it comes out of a file: nothing that JSON does not keep. */
export function throughJson<Value>(value: Value): Value {
  return JSON.parse(JSON.stringify(value));
}
