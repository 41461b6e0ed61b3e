import type { SignOffRequest } from "../../review/sign-off-schema.ts";

const unitMass = { value: 0.7, as: "mz", at: "edges" } as const;

/** An invented triple quadrupole with a cell whose cutoff is a worked example of the trade, and one transition. */
export const SIGN_OFF_EXAMPLE: SignOffRequest = {
  instrument: {
    id: "north-bench-2",
    revision: "4",
    stages: [
      { name: "Q1", role: "mass-filter", operatingPoint: { by: "stated", width: unitMass } },
      {
        name: "q2",
        role: "collision-cell",
        rodSet: { fieldRadius_mm: 4.17, frequency_MHz: 1 },
        rf: { mode: "fixed", rf: { volts: 100, as: "zero-to-peak", between: "pole-and-ground" } },
      },
      { name: "Q3", role: "mass-filter", operatingPoint: { by: "stated", width: unitMass } },
    ],
  },
  method: {
    id: "sulfa-12",
    revision: "7",
    polarity: "positive",
    timing: { mode: "dwell" },
    acquisition: [
      {
        id: "SMX-3",
        kind: "transition",
        precursor: { mz: 254.0594 },
        product: { mz: 65.0386 },
        dwell_ms: 20,
        pause_ms: 5,
      },
    ],
  },
};
