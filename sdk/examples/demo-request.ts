import type { RequestOf } from "@rodset/sdk";

/**
 * An invented scenario: the water laboratory of the town of Ostmoor looks for veterinary drugs in well water, on a triple
 * quadrupole of which it knows only the tune report and the cell's cutoff. One set m/z was typed a little off, and one
 * qualifier was taken over from a method with a lower cutoff.
 */
const halfHeight = (value: number) => ({ value, as: "mz", at: "half-height" }) as const;

const dwell = { dwell_ms: 20, pause_ms: 5 } as const;

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
    acquisition: [
      transition("SMX-1", "quantifier", { mz: 254.0594, label: "sulfamethoxazole" }, 254.06, { mz: 156.0114 }, 156.01),
      transition("SMX-2", "qualifier", { mz: 254.0594, label: "sulfamethoxazole" }, 254.06, { mz: 108.0444 }, 108.04),
      transition("SDZ-1", "quantifier", { mz: 251.0597, label: "sulfadiazine" }, 251.06, { mz: 156.0114 }, 156.01),
      transition("SDZ-2", "qualifier", { mz: 251.0597, label: "sulfadiazine" }, 251.06, { mz: 65.0386 }, 65.04),
      transition("TMP-1", "quantifier", { mz: 291.1452, label: "trimethoprim" }, 291.15, { mz: 230.1162 }, 230.12),
      transition("TMP-2", "qualifier", { mz: 291.1452, label: "trimethoprim" }, 291.15, { mz: 123.0665 }, 123.2),
      transition("ENR-1", "quantifier", { mz: 360.1718, label: "enrofloxacin" }, 360.17, { mz: 316.182 }, 316.18),
      transition("ENR-2", "qualifier", { mz: 360.1718, label: "enrofloxacin" }, 360.17, { mz: 245.1085 }, 245.11),
    ],
  },
};

type Transition = Extract<RequestOf<"signOff">["method"]["acquisition"][number], { kind: "transition" }>;

function transition(
  id: string,
  use: "quantifier" | "qualifier",
  precursor: Transition["precursor"],
  setPrecursorMz: number,
  product: Transition["product"],
  setProductMz: number,
): Transition {
  return {
    id,
    kind: "transition",
    use,
    precursor,
    setPrecursorMz,
    precursorWidth: halfHeight(0.7),
    product,
    setProductMz,
    productWidth: halfHeight(0.7),
    ...dwell,
  };
}
