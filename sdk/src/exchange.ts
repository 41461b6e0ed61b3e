import { type ProblemDocument, RodsetConnectionError, RodsetProblem, RodsetUnexpectedAnswer } from "./errors.ts";

export interface ClientOptions {
  /** Where the service is, such as `http://127.0.0.1:8080`. A path in it is kept. */
  readonly baseUrl: string | URL;
  /** Time for the whole answer, its body included, in ms. 30,000 when absent. */
  readonly timeout_ms?: number;
  /** Headers of every request, for a proxy that wants them. */
  readonly headers?: Readonly<Record<string, string>>;
  /** What is called in place of the global `fetch`. */
  readonly fetch?: typeof globalThis.fetch;
}

export interface CallOptions {
  readonly timeout_ms?: number;
  readonly signal?: AbortSignal;
}

export interface Call extends CallOptions {
  readonly method: string;
  readonly path: string;
  readonly body: unknown;
  readonly mediaType: string;
}

const DEFAULT_TIMEOUT_MS = 30_000;

/** Sends one request and gives the text of its answer, or throws one of the errors of this package. */
export async function exchange(client: ClientOptions, call: Call): Promise<string> {
  const timeout_ms = call.timeout_ms ?? client.timeout_ms ?? DEFAULT_TIMEOUT_MS;
  const timer = AbortSignal.timeout(timeout_ms);
  const signal = call.signal === undefined ? timer : AbortSignal.any([timer, call.signal]);
  const broken = (reason: "unreachable" | "interrupted", cause: unknown) => {
    if (timer.aborted) {
      return new RodsetConnectionError("timeout", `No complete answer came within ${timeout_ms} ms.`, cause);
    }
    if (call.signal?.aborted) return new RodsetConnectionError("aborted", "The caller gave up the request.", cause);
    return new RodsetConnectionError(
      reason,
      reason === "unreachable" ? "The service cannot be reached." : "The connection broke before the answer was complete.",
      cause,
    );
  };

  let response: Response;
  try {
    response = await (client.fetch ?? globalThis.fetch)(addressOf(client.baseUrl, call.path), {
      method: call.method,
      headers: {
        ...client.headers,
        accept: `${call.mediaType}, application/problem+json`,
        ...(call.body === undefined ? {} : { "content-type": "application/json" }),
      },
      ...(call.body === undefined ? {} : { body: JSON.stringify(call.body) }),
      signal,
    });
  } catch (cause) {
    throw broken("unreachable", cause);
  }
  let text: string;
  try {
    text = await response.text();
  } catch (cause) {
    throw broken("interrupted", cause);
  }
  return accept(response, text, call.mediaType);
}

function addressOf(baseUrl: string | URL, path: string): string {
  return String(baseUrl).replace(/\/+$/, "") + path;
}

function accept(response: Response, text: string, mediaType: string): string {
  const contentType = response.headers.get("content-type") ?? "";
  const received = contentType.split(";")[0]!.trim().toLowerCase();
  if (received === "application/problem+json") {
    const problem = parsed<ProblemDocument>(text);
    if (problem !== null && typeof problem.code === "string") throw new RodsetProblem(problem, retryAfterOf(response));
  }
  if (!response.ok || received !== mediaType) throw new RodsetUnexpectedAnswer(response.status, contentType);
  return text;
}

/** The value that a JSON text holds, or null where it is none. */
export function parsed<Value>(text: string): Value | null {
  try {
    return JSON.parse(text) as Value;
  } catch {
    return null;
  }
}

function retryAfterOf(response: Response): number | null {
  const seconds = Number(response.headers.get("retry-after") ?? Number.NaN);
  return Number.isFinite(seconds) ? seconds : null;
}
