import { Ajv2020 } from "ajv/dist/2020.js";
import addFormats from "ajv-formats";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { z } from "zod";
import { openApiDocument } from "../../openapi/document.ts";
import { ENDPOINTS } from "../../services/http/endpoints.ts";
import { documentsOf, mutationsOf, type Schemas } from "./json-schema-documents.ts";

const RUNS = { numRuns: 60, seed: 20260712 };

const { components } = openApiDocument(ENDPOINTS);
const schemas = components!.schemas as unknown as Schemas;
// JSON Schema leaves keywords that it does not know alone; OpenAPI's `discriminator` is one.
const ajv = new Ajv2020({ strict: false, discriminator: false });
addFormats.default(ajv);
ajv.addSchema({ $id: "document", components: { schemas } });

/** The check in front of a handler and the schema that the document shows, for one component. */
function checksOf(name: string) {
  const schema = z.globalRegistry._idmap.get(name) as z.ZodType;
  const validate = ajv.getSchema(`document#/components/schemas/${name}`)!;
  return {
    service: (document: unknown) => schema.safeParse(document).success,
    contract: (document: unknown) => validate(document) as boolean,
  };
}

describe.each(Object.keys(schemas))(
  "%s means the same to the service and to a reader of the document",
  (name) => {
    const { service, contract } = checksOf(name);
    const documents = documentsOf(schemas[name]!, schemas);

    it("in documents that it accepts", () => {
      fc.assert(
        fc.property(documents, (document) => {
          expect(contract(document), JSON.stringify(ajv.errors)).toBe(true);
          expect(service(document), JSON.stringify(document)).toBe(true);
        }),
        RUNS,
      );
    });

    it("in documents that are wrong in one place", () => {
      fc.assert(
        fc.property(mutationsOf(documents), (document) => {
          expect(service(document), JSON.stringify(document)).toBe(contract(document));
        }),
        { ...RUNS, numRuns: 120 },
      );
    });
  },
);

it("finds a component whose two sides differ", () => {
  const schema = z.strictObject({ mz: z.number().min(1) });
  const contract = ajv.compile({
    type: "object",
    properties: { mz: { type: "number", minimum: 0.9 } },
    required: ["mz"],
  });
  const disagreement = fc.check(
    fc.property(fc.record({ mz: fc.double({ min: 0.5, max: 2, noNaN: true }) }), (document) => {
      return schema.safeParse(document).success === contract(document);
    }),
    { ...RUNS, numRuns: 500 },
  );
  expect(disagreement.failed).toBe(true);
});
