import { sealedSelfCheck, selfCheck as selfCheckOf } from "../../review/self-check/self-check.ts";
import { SelfCheckAnswer } from "../../review/self-check/self-check-schema.ts";
import { defineEndpoint } from "../endpoint.ts";
import { ENGINE } from "../engine.ts";

export const selfCheck = defineEndpoint({
  operationId: "selfCheck",
  method: "post",
  path: "/v1/self-check",
  tag: "Service",
  summary: "Whether this installation computes as it should, against reference values from elsewhere",
  description:
    "Recomputes published and independently computed values on the machine that answers, and gives the worst deviation of each capability with its limit and source. With a key the answer is sealed and bears the time. It takes no body. `npm run qualify` writes the same as a dated sheet for the installation and operation file; it validates neither a method nor the laboratory's use of the service.",
  request: null,
  work: null,
  answer: SelfCheckAnswer,
  examples: {
    "no-key": {
      summary: "A service without a key, which was not told what it runs on",
      source: "each capability names its own",
      request: null,
      answer: selfCheckOf(ENGINE),
    },
  },
  handler: () => selfCheckOf(ENGINE),
  withSeal: (answer, _request, { key, host, now }) => sealedSelfCheck(answer, host, key, now),
});
