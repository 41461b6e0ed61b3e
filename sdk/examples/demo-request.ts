import type { RequestOf } from "@rodset/sdk";

type Use = "quantifier" | "qualifier";

/** Protonated molecules and fragments of drugs in the open literature; the set values are what the laboratory typed. */
const TRANSITIONS: readonly (readonly [
  id: string,
  use: Use,
  compound: string,
  precursorMz: number,
  setPrecursorMz: number,
  productMz: number,
  setProductMz: number,
])[] = [
  ["SMX-1", "quantifier", "sulfamethoxazole", 254.0594, 254.06, 156.0114, 156.01],
  ["SMX-2", "qualifier", "sulfamethoxazole", 254.0594, 254.06, 108.0444, 108.04],
  ["SDZ-1", "quantifier", "sulfadiazine", 251.0597, 251.06, 156.0114, 156.01],
  ["SDZ-2", "qualifier", "sulfadiazine", 251.0597, 251.06, 65.0386, 65.04],
  ["TMP-1", "quantifier", "trimethoprim", 291.1452, 291.15, 230.1162, 230.12],
  ["TMP-2", "qualifier", "trimethoprim", 291.1452, 291.15, 123.0665, 123.18],
  ["ENR-1", "quantifier", "enrofloxacin", 360.1718, 360.17, 316.182, 316.18],
  ["ENR-2", "qualifier", "enrofloxacin", 360.1718, 360.17, 245.1085, 245.11],
];

const halfHeight = (value: number) => ({ value, as: "mz", at: "half-height" }) as const;

function transition([
  id,
  use,
  label,
  precursorMz,
  setPrecursorMz,
  productMz,
  setProductMz,
]: (typeof TRANSITIONS)[number]) {
  return {
    id,
    kind: "transition",
    use,
    precursor: { mz: precursorMz, label },
    setPrecursorMz,
    precursorWidth: halfHeight(0.7),
    product: { mz: productMz },
    setProductMz,
    productWidth: halfHeight(0.7),
    dwell_ms: 20,
    pause_ms: 5,
  } as const;
}

/**
 * An invented scenario: the water laboratory of the town of Ostmoor looks for veterinary drugs in well water, on a triple
 * quadrupole of which it knows only the tune report and the cell's cutoff. One set m/z was typed a little off, and one
 * qualifier was taken over from a method with a lower cutoff.
 */
export const demoRequest: RequestOf<"signOff"> = {
  instrument: {
    id: "ostmoor-bench-3",
    revision: "2",
    stages: [
      {
        name: "Q1",
        role: "mass-filter",
        operatingPoint: {
          by: "measured-peaks",
          peaks: [
            { setMz: 59.05, observedMz: 59.04, width: halfHeight(0.69) },
            { setMz: 175.12, observedMz: 175.11, width: halfHeight(0.7) },
            { setMz: 500.38, observedMz: 500.4, width: halfHeight(0.71) },
            { setMz: 906.67, observedMz: 906.7, width: halfHeight(0.72) },
          ],
        },
        rated: { mzLow: 5, mzHigh: 1250 },
        tolerances: { mzDriftBetweenTunes: 0.08 },
      },
      {
        name: "q2",
        role: "collision-cell",
        rf: { mode: "cutoff", mz: 70 },
        gas: { formula: "Ar", pressure_Pa: 0.2 },
      },
      {
        name: "Q3",
        role: "mass-filter",
        operatingPoint: {
          by: "measured-peaks",
          peaks: [
            { setMz: 59.05, observedMz: 59.06, width: halfHeight(0.7) },
            { setMz: 175.12, observedMz: 175.12, width: halfHeight(0.71) },
            { setMz: 500.38, observedMz: 500.37, width: halfHeight(0.7) },
            { setMz: 906.67, observedMz: 906.66, width: halfHeight(0.73) },
          ],
        },
        rated: { mzLow: 5, mzHigh: 1250 },
        tolerances: { mzDriftBetweenTunes: 0.08 },
      },
    ],
  },
  method: {
    id: "well-water-vet-drugs",
    revision: "5",
    polarity: "positive",
    timing: { mode: "dwell" },
    chromatographicPeakWidth: { value_s: 6, at: "base" },
    acquisition: TRANSITIONS.map(transition),
  },
};
