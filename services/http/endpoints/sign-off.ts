import { MAX_ACQUISITIONS } from "../../review/method.ts";
import { recordedSignOff } from "../../review/record/record.ts";
import { sealedRecord } from "../../review/record/sealed-record.ts";
import { reportHtml } from "../../review/report/report.ts";
import { SignOffAnswer } from "../../review/sign-off-answer.ts";
import { signOffErrors } from "../../review/sign-off-rules.ts";
import { SignOffRequest } from "../../review/sign-off-schema.ts";
import { defineEndpoint } from "../endpoint.ts";
import { ENGINE } from "../engine.ts";
import { SIGN_OFF_EXAMPLE } from "../examples/sign-off.ts";
import { METHOD_BODY_LIMIT_KB } from "../limits.ts";

export const signOff = defineEndpoint({
  operationId: "signOff",
  method: "post",
  path: "/v1/sign-off",
  tag: "Sign-off",
  summary: "Whether the mass-filter settings of a method can do what it claims, on paper",
  description:
    "Instrument, method and, where the laboratory has limits of its own, criteria; findings, settings and a verdict come back. Nothing about the rods need be known: a finding that lacks an input is indeterminate and names it. " +
    "A pass means that every check that counts met its limit, and verdictStatement says what was not shown; it never means that a method works. As text/html the answer is a report to print, with room for a person's signature. " +
    "The record holds input and result with their digests, and a seal where the service was given a key; keep it, and post it to /v1/sign-off/verification whenever the question comes up whether it still holds. A JSON object that names a member twice is refused.",
  request: SignOffRequest,
  bodyLimit_kB: METHOD_BODY_LIMIT_KB,
  refusesDuplicateMembers: true,
  rules: [signOffErrors],
  work: {
    unit: "acquisitions",
    of: ({ method }) => method.acquisition.length,
    most: MAX_ACQUISITIONS,
  },
  answer: SignOffAnswer,
  forms: { "text/html": reportHtml },
  examples: {
    "cell-at-100-volts": {
      summary: "One transition; a fragment near the cutoff of a cell at 100 V, 1 MHz and 4.17 mm",
      source:
        "cutoff m/z 61.9 of a cell with r0 4.17 mm at 1 MHz and 100 V (worked example, recomputed from e/u of CODATA 2022)",
      request: SIGN_OFF_EXAMPLE,
      // The whole answer follows from the request; a test holds its figures against published and computed references.
      answer: recordedSignOff(SIGN_OFF_EXAMPLE, ENGINE),
    },
  },
  handler: (request) => recordedSignOff(request, ENGINE),
  withSeal: async (answer, _request, { key, now }) => ({
    ...answer,
    record: await sealedRecord(answer.record, key, now),
  }),
});
