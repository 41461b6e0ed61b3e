import { comparisonErrors, comparisonOf } from "../../review/comparison.ts";
import { ComparisonAnswer, ComparisonRequest } from "../../review/comparison-schema.ts";
import { MAX_ACQUISITIONS } from "../../review/method.ts";
import { defineEndpoint } from "../endpoint.ts";
import { ENGINE } from "../engine.ts";
import { TRANSFER_EXAMPLE } from "../examples/transfer.ts";
import { METHOD_BODY_LIMIT_KB } from "../limits.ts";

export const signOffComparison = defineEndpoint({
  operationId: "signOffComparison",
  method: "post",
  path: "/v1/sign-off/comparison",
  tag: "Sign-off",
  summary: "What a transfer to another instrument, or a revision of method, instrument or criteria, changes",
  description:
    "Signs off 2 to 10 cases and sets each against the first: one method on several instruments, or two revisions of a method, an instrument or criteria. Findings are matched by check, quantity, acquisition, ion and the place of the stage by its role, so that instruments may name their stages differently; those that are not the same come back with both sides. A setting carries over when neither edge of its window moves by more than the stated fraction of the width, or its cutoff by no more than that fraction of its distance from the ion. " +
    "The acquisitions of all cases together count as the work. A JSON object that names a member twice is refused.",
  request: ComparisonRequest,
  bodyLimit_kB: METHOD_BODY_LIMIT_KB,
  refusesDuplicateMembers: true,
  rules: [comparisonErrors],
  work: {
    unit: "acquisitions",
    of: ({ cases }) => cases.reduce((sum, { method }) => sum + method.acquisition.length, 0),
    most: MAX_ACQUISITIONS,
  },
  answer: ComparisonAnswer,
  examples: {
    "cell-at-200-volts": {
      summary:
        "The same transition with the cell at 100 V and at 200 V, where its product is below the cutoff",
      source:
        "cutoff m/z 61.9 at 100 V and 123.8 at 200 V of a cell with r0 4.17 mm at 1 MHz (worked example, recomputed from e/u of CODATA 2022)",
      request: TRANSFER_EXAMPLE,
      // The whole answer follows from the request; a test holds its figures against the worked example.
      answer: comparisonOf(TRANSFER_EXAMPLE, ENGINE),
    },
  },
  handler: (request) => comparisonOf(request, ENGINE),
});
