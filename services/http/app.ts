import express, { type ErrorRequestHandler, type Express, type RequestHandler, type Response } from "express";
import type { Logger } from "pino";
import { answerOf, formFor, type WrittenAnswer, write } from "./answer.ts";
import { arrival } from "./arrival.ts";
import { logDefect } from "./defect.ts";
import type { AnyEndpoint, Limits, Sealing } from "./endpoint.ts";
import { ProblemError, problemDocument } from "./problem-document.ts";
import { PROBLEMS } from "./problems.ts";
import { queryDocument } from "./query-document.ts";
import { reply, replyEmpty, travelOf } from "./reply.ts";
import { jsonBody, problemOfBodyError } from "./request-body.ts";

export interface AppParts {
  readonly endpoints: readonly AnyEndpoint[];
  /** The bytes that GET /openapi.json answers. */
  readonly openApiDocument: Buffer;
  readonly limits: Limits;
  readonly sealing?: Sealing;
  readonly logger: Logger;
}

/** A service that was given no key seals nothing and knows no seal. */
const NO_KEY: Sealing = { key: null, known: [], host: null, now: () => new Date() };

/** The service as an Express application. It holds no state between two requests. */
export function createApp({
  endpoints,
  openApiDocument,
  limits,
  sealing = NO_KEY,
  logger,
}: AppParts): Express {
  const app = express();
  app.disable("x-powered-by");
  app.disable("etag");
  app.enable("case sensitive routing");
  app.enable("strict routing");

  app.use(arrival(logger));
  for (const [path, methods] of byPath(endpoints)) mount(app, path, methods, limits, sealing);
  app.get("/openapi.json", fixed("openApiDocument", openApiDocument));
  app.all("/openapi.json", otherMethods(["get"]));
  app.use(() => {
    throw new ProblemError("not-found");
  });
  app.use(replyProblem(logger));
  return app;
}

function byPath(endpoints: readonly AnyEndpoint[]): Map<string, AnyEndpoint[]> {
  const paths = new Map<string, AnyEndpoint[]>();
  for (const endpoint of endpoints) {
    paths.set(endpoint.path, [...(paths.get(endpoint.path) ?? []), endpoint]);
  }
  return paths;
}

function mount(
  app: Express,
  path: string,
  endpoints: readonly AnyEndpoint[],
  limits: Limits,
  sealing: Sealing,
): void {
  for (const endpoint of endpoints) {
    const { request, bodyLimit_kB = 0, refusesDuplicateMembers = false } = endpoint;
    const limit_kB = Math.max(limits.bodyLimit_kB, bodyLimit_kB);
    const takesBody = request !== null && endpoint.method === "post";
    const body = takesBody ? jsonBody(limit_kB, { refusesDuplicateMembers }) : [];
    app[endpoint.method](path, entered(endpoint), ...body, question(endpoint, limits, sealing));
  }
  app.all(path, otherMethods(endpoints.map(({ method }) => method)));
}

function entered({ operationId }: AnyEndpoint): RequestHandler {
  return (_request, response, next) => {
    travelOf(response).operationId = operationId;
    next();
  };
}

function question(endpoint: AnyEndpoint, limits: Limits, sealing: Sealing): RequestHandler {
  const vary = endpoint.forms === undefined ? undefined : { Vary: "Accept" };
  // Answers are deterministic, so what depends on no request is written once. A POST may be sealed with its time.
  const written = new Map<string, WrittenAnswer>();
  return async (request, response) => {
    const form = formFor(endpoint, request);
    const document = endpoint.method === "get" ? queryDocument(endpoint, request.url) : request.body;
    const answer =
      written.get(form) ?? write(endpoint, await answerOf(endpoint, document, limits, sealing), form);
    if (endpoint.method === "get" && endpoint.request === null) written.set(form, answer);
    reply(response, 200, answer.mediaType, answer.body, vary);
  };
}

function fixed(operationId: string, bytes: Buffer): RequestHandler {
  return (_request, response) => {
    travelOf(response).operationId = operationId;
    reply(response, 200, "application/json", bytes);
  };
}

function otherMethods(methods: readonly string[]): RequestHandler {
  const allowed = methods.flatMap((method) => (method === "get" ? ["GET", "HEAD"] : [method.toUpperCase()]));
  const headers = { Allow: [...allowed, "OPTIONS"].join(", ") };
  return (request, response) => {
    if (request.method === "OPTIONS") replyEmpty(response, headers);
    else throw new ProblemError("method-not-allowed", `Allowed: ${headers.Allow}.`, { headers });
  };
}

/** Every error becomes a problem document; what is not the caller's doing becomes a 500 that shows nothing. */
function replyProblem(logger: Logger): ErrorRequestHandler {
  return (error: unknown, _request, response: Response, _next) => {
    const { requestId, operationId } = travelOf(response);
    let problem = error instanceof ProblemError ? error : problemOfBodyError(error);
    if (problem === null) {
      logDefect(logger, error, { requestId, operationId });
      problem = new ProblemError("internal-error");
    }
    if (response.headersSent) {
      response.destroy();
      return;
    }
    const body = JSON.stringify(problemDocument(problem, requestId));
    reply(response, PROBLEMS[problem.code].status, "application/problem+json", body, problem.headers);
  };
}
