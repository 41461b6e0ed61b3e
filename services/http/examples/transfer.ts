import type { ComparisonRequest } from "../../review/comparison-schema.ts";
import type { Instrument } from "../../review/instrument.ts";
import { SIGN_OFF_EXAMPLE } from "./sign-off.ts";

const { instrument, method } = SIGN_OFF_EXAMPLE;

/** The same kind of instrument on another bench, which names its stages otherwise and runs its cell at twice the RF. */
const otherBench: Instrument = {
  ...instrument,
  id: "south-bench-1",
  revision: "1",
  stages: instrument.stages.map((stage) =>
    stage.role === "collision-cell"
      ? {
          ...stage,
          name: "cell",
          rf: { mode: "fixed", rf: { volts: 200, as: "zero-to-peak", between: "pole-and-ground" } },
        }
      : { ...stage, name: `filter ${stage.name}` },
  ),
};

export const TRANSFER_EXAMPLE: ComparisonRequest = {
  cases: [
    { label: "north bench", instrument, method },
    { label: "south bench", instrument: otherBench, method },
  ],
};
