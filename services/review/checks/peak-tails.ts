import { defineCheck } from "../check.ts";

export const peakTails = defineCheck({
  id: "peak-tails",
  computes: "Nothing: it stands here so that nobody takes its absence for a result.",
  needs: [],
  quantities: [
    {
      quantity: "abundance-sensitivity",
      unit: "1",
      meaning: "response of a neighbour in the tail of a peak",
    },
  ],
  requiredByDefault: false,
  limit: null,
  defaults: null,
  basis: "A stability model has sharp edges.",
  examine: () => [
    {
      kind: "not-applicable",
      quantity: "abundance-sensitivity",
      unit: "1",
      subject: { pointer: "/instrument" },
      statement:
        "The tails of a peak come from rod errors, fringe fields, gas and space charge, none of which a stability model has. Measure the abundance sensitivity.",
    },
  ],
});
