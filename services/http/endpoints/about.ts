import { z } from "zod";
import { CAUTIONS } from "../../contract/cautions.ts";
import { CONSTANTS_EDITION } from "../../physics/constants.ts";
import { DOMAIN_LIMIT } from "../../physics/stability.ts";
import { defineEndpoint } from "../endpoint.ts";
import { METHOD_BODY_LIMIT_KB, MOST_ITEMS, RECORD_BODY_LIMIT_KB } from "../limits.ts";
import { VERSION } from "../version.ts";

const About = z
  .strictObject({
    service: z.string(),
    version: z.string().meta({ description: "The same version gives the same answer to the same request." }),
    constants: z.string().meta({ description: "Edition of the physical constants." }),
    limits: z.strictObject({
      body_kB: z.int().meta({ description: "Largest request body in kB (1000 bytes), but for these two:" }),
      methodBody_kB: z.int().meta({ description: "Largest body of a sign-off or a comparison in kB." }),
      recordBody_kB: z.int().meta({ description: "Largest body of a verification in kB." }),
      itemsPerRequest: z.int().meta({ description: "Most ions, points or targets in one request." }),
      stepsPerSolution: z.int().meta({ description: "Steps after which a solver answers not-converged." }),
      mathieuParameters: z
        .number()
        .meta({ description: "Largest |a| and |q| for which stability is computed." }),
    }),
    cautions: z.array(z.string()).meta({ description: "What must be known before a result is used." }),
  })
  .meta({ id: "About" });

export const about = defineEndpoint({
  operationId: "about",
  method: "get",
  path: "/v1/about",
  tag: "Service",
  summary: "Version, edition of the constants, limits and cautions",
  description: "Nothing in this answer changes while the service runs.",
  request: null,
  work: null,
  answer: About,
  examples: {
    "this-version": {
      summary: "With the default settings",
      request: null,
      answer: {
        service: "rodset",
        version: VERSION,
        constants: "CODATA 2022",
        limits: {
          body_kB: 512,
          methodBody_kB: 4000,
          recordBody_kB: 32_000,
          itemsPerRequest: 1000,
          stepsPerSolution: 200,
          mathieuParameters: 100,
        },
        cautions: [...CAUTIONS],
      },
    },
  },
  handler: (_request, { bodyLimit_kB, maxSteps }) => ({
    service: "rodset",
    version: VERSION,
    constants: CONSTANTS_EDITION,
    limits: {
      body_kB: bodyLimit_kB,
      methodBody_kB: Math.max(bodyLimit_kB, METHOD_BODY_LIMIT_KB),
      recordBody_kB: Math.max(bodyLimit_kB, RECORD_BODY_LIMIT_KB),
      itemsPerRequest: MOST_ITEMS,
      stepsPerSolution: maxSteps,
      mathieuParameters: DOMAIN_LIMIT,
    },
    cautions: [...CAUTIONS],
  }),
});
