import { execFileSync } from "node:child_process";
import { readFileSync } from "node:fs";
import request from "supertest";
import { describe, expect, it } from "vitest";
import { z } from "zod";
import { componentsOf } from "../../openapi/components.ts";
import { openApiDocument } from "../../openapi/document.ts";
import { generatedFiles } from "../../openapi/generated-files.ts";
import { CAUTIONS } from "../../services/contract/cautions.ts";
import { problemsOf } from "../../services/http/endpoint.ts";
import { ENDPOINTS } from "../../services/http/endpoints.ts";
import { PROBLEMS } from "../../services/http/problems.ts";
import { testApp } from "../http/test-app.ts";

const document = openApiDocument(ENDPOINTS);

describe("the generated files", () => {
  it("are committed as they come out now", async () => {
    for (const [path, text] of await generatedFiles()) {
      expect(readFileSync(path, "utf8") === text, `${path} is stale: run \`npm run generate\`.`).toBe(true);
    }
  });

  it("come out the same every time", async () => {
    expect(await generatedFiles()).toEqual(await generatedFiles());
  });

  it("pass the lint of OpenAPI documents", () => {
    const lint = () =>
      execFileSync("npx", ["redocly", "lint", "openapi/openapi.json"], { encoding: "utf8", stdio: "pipe" });
    expect(lint).not.toThrow();
  });

  it("are what GET /openapi.json answers, byte for byte", async () => {
    const { text, headers } = await request(testApp({ level: "silent" }).app).get("/openapi.json");
    expect(text).toBe(readFileSync("openapi/openapi.json", "utf8"));
    expect(headers["content-type"]).toBe("application/json");
  });
});

describe("the document", () => {
  it("states the cautions", () => {
    for (const caution of CAUTIONS) expect(document.info.description).toContain(caution);
  });

  it.each(ENDPOINTS.map((endpoint) => [endpoint.operationId, endpoint] as const))(
    "describes %s whole",
    (id, endpoint) => {
      const operation = document.paths?.[endpoint.path]?.[endpoint.method];
      expect(operation).toMatchObject({
        operationId: id,
        summary: endpoint.summary,
        description: endpoint.description,
      });
      const statuses = new Set([200, ...problemsOf(endpoint).map((code) => PROBLEMS[code].status)]);
      expect(Object.keys(operation!.responses!).map(Number).sort()).toEqual([...statuses].sort());
      for (const code of problemsOf(endpoint)) {
        const response = operation!.responses![PROBLEMS[code].status];
        expect(response.description).toContain(`\`${code}\``);
        expect(Object.keys(response.content)).toEqual(["application/problem+json"]);
      }
      const answer = operation!.responses![200].content;
      expect(Object.keys(answer)).toEqual(["application/json", ...Object.keys(endpoint.forms ?? {})]);
      expect(Object.keys(answer["application/json"].examples)).toEqual(Object.keys(endpoint.examples));
    },
  );

  it("describes every parameter of a query, with its range, and of nothing else", () => {
    for (const { path, method, request } of ENDPOINTS) {
      const parameters = (document.paths?.[path]?.[method]?.parameters ?? []) as {
        name: string;
        in: string;
        description: string;
        schema: { minimum: number; maximum: number };
      }[];
      const names = method === "get" && request !== null ? Object.keys(request.shape) : [];
      expect(parameters.map(({ name }) => name)).toEqual(names);
      for (const { in: place, description, schema } of parameters) {
        expect(place).toBe("query");
        expect(description).toMatch(/when absent\.$/);
        expect(schema.minimum).toBeLessThan(schema.maximum);
      }
    }
    expect(document.paths?.["/v1/stability-regions"]?.get?.parameters).toHaveLength(5);
  });

  it("has each operation id and each path with its method once", () => {
    expect(new Set(ENDPOINTS.map(({ operationId }) => operationId)).size).toBe(ENDPOINTS.length);
    expect(new Set(ENDPOINTS.map(({ method, path }) => `${method} ${path}`)).size).toBe(ENDPOINTS.length);
  });

  it("says of every tagged union which tag leads to which component", () => {
    const schemas = document.components!.schemas!;
    for (const [name, schema] of Object.entries(schemas)) {
      const { oneOf, discriminator } = schema as {
        oneOf?: { $ref: string }[];
        discriminator?: { mapping: Record<string, string> };
      };
      if (oneOf === undefined) continue;
      expect(new Set(Object.values(discriminator?.mapping ?? {})), name).toEqual(
        new Set(oneOf.map(({ $ref }) => $ref)),
      );
    }
  });

  it("gives every array and every text of a request a maximum, and every number a range", () => {
    const free: string[] = [];
    const visit = (schema: object, path: string) => {
      const { type, maxItems, maxLength, minimum, maximum, pattern } = schema as Record<string, unknown>;
      const enumerated = "enum" in schema || "const" in schema;
      if (type === "array" && maxItems === undefined) free.push(path);
      if (type === "string" && !enumerated && (maxLength === undefined || pattern === undefined))
        free.push(path);
      if (
        (type === "number" || type === "integer") &&
        !enumerated &&
        (minimum === undefined || maximum === undefined)
      )
        free.push(path);
      for (const [name, part] of Object.entries(schema)) {
        if (typeof part === "object" && part !== null) visit(part, `${path}/${name}`);
      }
    };
    const requests = ENDPOINTS.flatMap(({ request }) =>
      request === null ? [] : [[request, "input"] as const],
    );
    for (const [name, schema] of componentsOf(requests)) visit(schema, name);
    expect(free).toEqual([]);
  });
});

describe("the components", () => {
  const named = (id: string) => z.strictObject({ mz: z.number() }).meta({ id });

  it("refuse two shapes under one name", () => {
    const twice = () =>
      componentsOf([
        [
          z
            .strictObject({
              a: named("TwiceNamed"),
              b: z.strictObject({ q: z.number() }).meta({ id: "TwiceNamed" }),
            })
            .meta({ id: "HoldsBoth" }),
          "input",
        ],
      ]);
    expect(twice).toThrow(/TwiceNamed/);
  });

  it("refuse a shape that requests and answers describe differently", () => {
    const shape = z.strictObject({ mz: z.number().default(1) }).meta({ id: "TwoFaced" });
    expect(() =>
      componentsOf([
        [shape, "input"],
        [shape, "output"],
      ]),
    ).toThrow(/TwoFaced comes out in two different ways/);
  });

  it("refuse a root and an arm of a tagged union without a name", () => {
    expect(() => componentsOf([[z.strictObject({}), "input"]])).toThrow(/has no id/);
    const arms = z
      .discriminatedUnion("kind", [z.strictObject({ kind: z.literal("a") })])
      .meta({ id: "NamelessArm" });
    expect(() => componentsOf([[arms, "input"]])).toThrow(/has no id/);
  });
});
