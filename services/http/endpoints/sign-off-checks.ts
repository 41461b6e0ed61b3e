import { Catalogue, catalogue, catalogueMarkdown } from "../../review/catalogue.ts";
import { defineEndpoint } from "../endpoint.ts";

export const signOffChecks = defineEndpoint({
  operationId: "signOffChecks",
  method: "get",
  path: "/v1/sign-off/checks",
  tag: "Sign-off",
  summary: "Every check of a sign-off, with its default limits and their basis",
  description:
    "The same list that signs off, judges criteria and names findings. As text/markdown it is a page to file.",
  request: null,
  work: null,
  answer: Catalogue,
  forms: { "text/markdown": catalogueMarkdown },
  examples: {
    catalogue: {
      summary: "The catalogue of this version",
      request: null,
      answer: catalogue(),
      source: "default limits of the trade, common practice, no source; each check names its basis",
    },
  },
  handler: catalogue,
});
