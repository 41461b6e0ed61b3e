import {
  type ProblemDocument,
  RodsetConnectionError,
  RodsetProblem,
  RodsetUnexpectedAnswer,
} from "./errors.ts";

/** Where the service is and how it is asked; everything that holds for all calls. */
export interface ClientOptions {
  /** Address of the service, such as `http://127.0.0.1:8080`. A path in it is kept. */
  readonly baseUrl: string | URL;
  /** Time for the whole answer, its body included, in ms. 30,000 when absent. */
  readonly timeout_ms?: number;
  /** Headers of every request, for a proxy that wants them. */
  readonly headers?: Readonly<Record<string, string>>;
  /** What is called in place of the global `fetch`. */
  readonly fetch?: typeof globalThis.fetch;
}

export interface CallOptions {
  /** In place of the client's, for this call. */
  readonly timeout_ms?: number;
  /** Gives up the call when it is aborted. */
  readonly signal?: AbortSignal;
}

export interface Call extends CallOptions {
  readonly method: string;
  readonly path: string;
  readonly body: unknown;
  readonly mediaType: string;
}

const DEFAULT_TIMEOUT_MS = 30_000;

/** The address that a path has behind the base, or a TypeError that says what is wrong with the base. */
export function addressOf(baseUrl: string | URL, path: string): string {
  const url = URL.canParse(String(baseUrl)) ? new URL(baseUrl) : null;
  const takes =
    url !== null &&
    /^https?:$/.test(url.protocol) &&
    url.username + url.password + url.search + url.hash === "";
  if (!takes) {
    throw new TypeError(
      "baseUrl must be an absolute http or https address without credentials, query and fragment.",
    );
  }
  return url.origin + url.pathname.replace(/\/+$/, "") + path;
}

/** Sends one request and gives the text of its answer, or throws one of the errors of this package. */
export async function exchange(client: ClientOptions, call: Call): Promise<string> {
  const address = addressOf(client.baseUrl, call.path);
  const headers = new Headers(client.headers);
  headers.set("accept", `${call.mediaType}, application/problem+json`);
  if (call.body !== undefined) headers.set("content-type", "application/json");
  const body = call.body === undefined ? null : JSON.stringify(call.body);

  const timeout_ms = call.timeout_ms ?? client.timeout_ms ?? DEFAULT_TIMEOUT_MS;
  const timer = AbortSignal.timeout(timeout_ms);
  const signal = call.signal === undefined ? timer : AbortSignal.any([timer, call.signal]);
  const broken = (reason: "unreachable" | "interrupted", cause: unknown) => {
    if (call.signal?.aborted)
      return new RodsetConnectionError("aborted", "The caller gave up the request.", cause);
    if (timer.aborted) {
      return new RodsetConnectionError("timeout", `No complete answer came within ${timeout_ms} ms.`, cause);
    }
    const what =
      reason === "unreachable"
        ? `No answer came from ${address}`
        : "The connection broke in the middle of the answer";
    return new RodsetConnectionError(reason, `${what}${systemCodeOf(cause)}.`, cause);
  };

  const ask = client.fetch ?? globalThis.fetch;
  let response: Response;
  try {
    // The service never redirects: whoever does is somebody else, who shall not be sent a method.
    response = await ask(address, { method: call.method, headers, body, signal, redirect: "manual" });
  } catch (cause) {
    throw broken("unreachable", cause);
  }
  let text: string;
  try {
    text = await response.text();
  } catch (cause) {
    throw broken("interrupted", cause);
  }
  return accepted(response, text, call.mediaType);
}

/** The system's name for what happened, which fetch hides in the cause. */
function systemCodeOf(error: unknown): string {
  const cause = error instanceof Error ? (error.cause as { code?: unknown } | undefined) : undefined;
  return typeof cause?.code === "string" ? ` (${cause.code})` : "";
}

function accepted(response: Response, text: string, mediaType: string): string {
  const contentType = response.headers.get("content-type") ?? "";
  const received = contentType.split(";")[0]!.trim().toLowerCase();
  if (received === "application/problem+json") {
    const problem = parsed(text);
    if (isProblem(problem)) throw new RodsetProblem(problem, retryAfterOf(response));
  }
  const unexpected = () => new RodsetUnexpectedAnswer(response.status, contentType, text);
  if (response.status !== 200 || received !== mediaType) throw unexpected();
  if (mediaType === "application/json" && parsed(text) === undefined) throw unexpected();
  return text;
}

/** The value that a JSON text holds, or undefined where it is none. */
function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}

/** Problem documents of others, which proxies send too, lack some of what the service always says. */
function isProblem(value: unknown): value is ProblemDocument {
  const { title, status, detail, code, requestId, errors } = (value ?? {}) as Partial<
    Record<string, unknown>
  >;
  return (
    [title, detail, code, requestId].every((member) => typeof member === "string") &&
    typeof status === "number" &&
    (errors === undefined || Array.isArray(errors))
  );
}

/** RFC 9110, section 10.2.3: whole seconds, or a date. */
function retryAfterOf(response: Response): number | null {
  const text = response.headers.get("retry-after")?.trim() ?? "";
  if (/^\d+$/.test(text)) return Number(text);
  const until = Date.parse(text);
  return Number.isNaN(until) ? null : Math.max(0, Math.ceil((until - Date.now()) / 1000));
}
