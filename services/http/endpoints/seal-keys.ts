import { z } from "zod";
import { PublicSealKey } from "../../review/record/seal-keys.ts";
import { defineEndpoint } from "../endpoint.ts";

const SealKeySet = z
  .strictObject({ keys: z.array(PublicSealKey) })
  .meta({ id: "SealKeySet", description: "A JWK set (RFC 7517)." });

export const sealKeys = defineEndpoint({
  operationId: "sealKeys",
  method: "get",
  path: "/.well-known/jwks.json",
  tag: "Service",
  summary: "The public keys of seals, the current one first",
  description:
    "The key that seals today and those of earlier generations that the service was told to trust; empty where it was given none. Keep a copy with the records: a seal can then be verified when the service is gone.",
  request: null,
  work: null,
  answer: SealKeySet,
  forms: { "application/jwk-set+json": (answer) => JSON.stringify(answer) },
  examples: {
    "no-key": { summary: "A service without a key", request: null, answer: { keys: [] } },
  },
  handler: () => ({ keys: [] }),
  withSeal: async (_answer, _request, { known }) => ({ keys: [...known] }),
});
