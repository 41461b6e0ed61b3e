import { OpenAPIRegistry, OpenApiGeneratorV31, type RouteConfig } from "@asteasolutions/zod-to-openapi";
import type { z } from "zod";
import { CAUTIONS } from "../services/contract/cautions.ts";
import { type AnyEndpoint, type Example, problemsOf } from "../services/http/endpoint.ts";
import { Problem } from "../services/http/problem-document.ts";
import { PROBLEMS, type ProblemCode } from "../services/http/problems.ts";
import { TAGS } from "../services/http/tags.ts";
import { VERSION } from "../services/http/version.ts";
import { componentOf, componentsOf, referenceTo, type Side } from "./components.ts";

const DESCRIPTION = [
  "Rodset shows on paper, before a quadrupole mass-spectrometry method is signed off, that the mass-filter settings can do what the method claims.",
  "Every voltage states how it is read and every width at which height; there are no defaults to get wrong. Energies are per elementary charge. A quantity's member ends in its unit; m/z is dimensionless. Requests are strict: an unknown member is an error. A physical impossibility is an answer with a reason, not an error. Answers are deterministic and may gain members in later versions.",
  "Cautions:",
  CAUTIONS.map((caution) => `- ${caution}`).join("\n"),
].join("\n\n");

/** The OpenAPI 3.1 document of these endpoints. */
export function openApiDocument(endpoints: readonly AnyEndpoint[]) {
  const registry = new OpenAPIRegistry();
  for (const [name, schema] of componentsOf(rootsOf(endpoints))) {
    registry.registerComponent("schemas", name, schema as object);
  }
  registry.registerComponent("headers", "RequestId", {
    description:
      "Name of this request in the service's log; the caller's own if it sent one of 8 to 64 plain characters.",
    schema: { type: "string" },
  });
  for (const endpoint of endpoints) registry.registerPath(pathOf(endpoint));
  return new OpenApiGeneratorV31(registry.definitions).generateDocument({
    openapi: "3.1.0",
    info: {
      title: "Rodset",
      version: VERSION,
      description: DESCRIPTION,
      license: { name: "MIT", identifier: "MIT" },
    },
    servers: [{ url: "/" }],
    tags: Object.entries(TAGS).map(([name, description]) => ({ name, description })),
    security: [],
  });
}

function rootsOf(endpoints: readonly AnyEndpoint[]): (readonly [z.ZodType, Side])[] {
  return [
    ...endpoints.flatMap(({ request, method }) =>
      request === null || method === "get" ? [] : [[request, "input"] as const],
    ),
    ...endpoints.map(({ answer }) => [answer, "output"] as const),
    [Problem, "output"],
  ];
}

function pathOf(endpoint: AnyEndpoint): RouteConfig {
  const { operationId, method, path, tag, summary, description, request } = endpoint;
  return {
    method,
    path,
    operationId,
    tags: [tag],
    summary,
    description,
    ...(request === null ? null : method === "get" ? queryOf(request) : bodyOf(endpoint)),
    responses: { 200: answerOf(endpoint), ...problemResponses(problemsOf(endpoint)) },
  };
}

function bodyOf({ request, summary, examples }: AnyEndpoint) {
  const body = {
    required: true,
    description: summary,
    content: {
      "application/json": {
        schema: referenceTo(request),
        examples: examplesOf(examples, (example) => example.request),
      },
    },
  };
  return { request: { body } };
}

/** Each member of the request schema of a GET is a parameter of its query. */
function queryOf(request: z.ZodType): Pick<RouteConfig, "parameters"> {
  const { properties = {}, required = [] } = componentOf(request, "input");
  const parameters = Object.entries(properties).map(([name, schema]) => {
    const { description, ...described } = schema as { description: string };
    return { name, in: "query" as const, required: required.includes(name), description, schema: described };
  });
  return { parameters };
}

function answerOf({ answer, forms, examples }: AnyEndpoint) {
  const otherForms = Object.keys(forms ?? {}).map((form) => [form, { schema: { type: "string" as const } }]);
  return {
    description: "The answer.",
    headers: { "X-Request-Id": { $ref: "#/components/headers/RequestId" } },
    content: {
      "application/json": {
        schema: referenceTo(answer),
        examples: examplesOf(examples, (example) => example.answer),
      },
      ...Object.fromEntries(otherForms),
    },
  };
}

type AnyExample = Example<unknown, unknown>;

function examplesOf(examples: AnyEndpoint["examples"], part: (example: AnyExample) => unknown) {
  return Object.fromEntries(
    Object.entries<AnyExample>(examples).map(([name, example]) => [
      name,
      {
        summary: example.summary,
        ...(example.source === undefined
          ? null
          : { description: `Source of the numbers: ${example.source}` }),
        value: part(example),
      },
    ]),
  );
}

/** One response for each status; problems that share one are told apart by their code. */
function problemResponses(codes: readonly ProblemCode[]): RouteConfig["responses"] {
  const byStatus = new Map<number, ProblemCode[]>();
  for (const code of codes) {
    const { status } = PROBLEMS[code];
    byStatus.set(status, [...(byStatus.get(status) ?? []), code]);
  }
  return Object.fromEntries(
    [...byStatus].map(([status, sharing]) => [
      status,
      {
        description: sharing.map((code) => `\`${code}\`: ${PROBLEMS[code].when}`).join("\n\n"),
        headers: { "X-Request-Id": { $ref: "#/components/headers/RequestId" } },
        content: { "application/problem+json": { schema: referenceTo(Problem) } },
      },
    ]),
  );
}
