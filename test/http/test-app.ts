import request, { type Response } from "supertest";
import { expect } from "vitest";
import { createApp } from "../../services/http/app.ts";
import { ENDPOINTS } from "../../services/http/endpoints.ts";
import type { ErrorCode } from "../../services/http/error-codes.ts";
import { limitsOf } from "../../services/http/limits.ts";
import { createLogger } from "../../services/http/logger.ts";
import { readOpenApiDocument } from "../../services/http/openapi-document.ts";
import { Problem } from "../../services/http/problem-document.ts";

/** The application with everything it logs, as text. */
export function testApp({ endpoints = ENDPOINTS, bodyLimit_kB = 512, level = "info" } = {}) {
  const log: string[] = [];
  const app = createApp({
    endpoints,
    openApiDocument: readOpenApiDocument(),
    limits: limitsOf({ bodyLimit_kB }),
    logger: createLogger(level, { write: (line: string) => void log.push(line) }),
  });
  return { app, log };
}

const { app } = testApp({ level: "silent" });

/** Asks with a document, or with the text of one that no object can stand for. */
export async function ask(path: string, body: unknown): Promise<Response> {
  return request(app)
    .post(path)
    .set("Content-Type", "application/json")
    .send((typeof body === "string" ? body : JSON.stringify(body)) as unknown as object);
}

/** The answer to a request that must succeed. */
// biome-ignore lint/suspicious/noExplicitAny: tests read answers as a caller without types does.
export async function answerTo(path: string, body: unknown): Promise<any> {
  const response = await ask(path, body);
  expect(response.status, response.text).toBe(200);
  expect(response.headers["content-type"]).toBe("application/json");
  return response.body;
}

/** What is wrong with a request that must be refused: every problem is held to its own schema. */
export async function errorsOf(path: string, body: unknown): Promise<[pointer: string, code: ErrorCode][]> {
  const problem = problemIn(await ask(path, body));
  expect(problem).toMatchObject({ status: 422, code: "invalid-request" });
  return (problem.errors ?? []).map(({ pointer, code }) => [pointer, code]);
}

export function problemIn(response: Response): Problem {
  expect(response.headers["content-type"]).toBe("application/problem+json");
  const problem = Problem.parse(response.body);
  expect(problem.status).toBe(response.status);
  expect(problem.requestId).toBe(response.headers["x-request-id"]);
  return problem;
}
