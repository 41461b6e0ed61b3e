import type { Schema } from "./schema-of.ts";

/** Everything this package throws about a call, so that one `instanceof` tells it from a programming error. */
export class RodsetError extends Error {
  override name = "RodsetError";
}

/** The members of a problem document (RFC 9457) that the service sends. */
export type ProblemDocument = Schema<"Problem">;

/** One thing that is wrong with a request: RFC 6901 JSON Pointer into it, code, and a sentence. */
export type ProblemItem = NonNullable<ProblemDocument["errors"]>[number];

/** The service understood that something is wrong and says what. */
export class RodsetProblem extends RodsetError {
  override name = "RodsetProblem";
  readonly status: number;
  /** The kind of problem. A service newer than this package may send others than those of the type. */
  readonly code: ProblemDocument["code"];
  /** Under this id the service's log tells more. */
  readonly requestId: string;
  readonly errors: readonly ProblemItem[];
  /** How many errors there are beyond `errors`. */
  readonly errorsOmitted: number;
  /** Seconds after which the service asks to be tried again, where it says so. */
  readonly retryAfter_s: number | null;
  readonly problem: ProblemDocument;

  constructor(problem: ProblemDocument, retryAfter_s: number | null) {
    super(sentencesOf(problem));
    this.status = problem.status;
    this.code = problem.code;
    this.requestId = problem.requestId;
    this.errors = problem.errors ?? [];
    this.errorsOmitted = problem.errorsOmitted ?? 0;
    this.retryAfter_s = retryAfter_s;
    this.problem = problem;
  }
}

function sentencesOf({ title, code, detail, errors = [], errorsOmitted = 0 }: ProblemDocument): string {
  return [
    `${title} (${code}): ${detail}`,
    ...errors.map((error) => `${error.pointer || "the whole request"}: ${error.detail}`),
    ...(errorsOmitted > 0 ? [`and ${errorsOmitted} more`] : []),
  ].join("\n  ");
}

/** No complete answer came. */
export class RodsetConnectionError extends RodsetError {
  override name = "RodsetConnectionError";
  /**
   * `unreachable`: no answer began. `interrupted`: the connection broke in the middle of one. `timeout`: time was up
   * before it was complete. `aborted`: the caller gave up.
   */
  readonly reason: "unreachable" | "interrupted" | "timeout" | "aborted";

  constructor(reason: RodsetConnectionError["reason"], message: string, cause: unknown) {
    super(message, { cause });
    this.reason = reason;
  }
}

/** An answer came that the service does not give: most often a proxy's page in its place. */
export class RodsetUnexpectedAnswer extends RodsetError {
  override name = "RodsetUnexpectedAnswer";
  readonly status: number;
  /** As received; empty where there was none. */
  readonly contentType: string;
  /** How the body begins, for whoever has to find out where it came from. */
  readonly beginning: string;

  constructor(status: number, contentType: string, body: string) {
    super(
      `An answer with status ${status} and ${contentType === "" ? "no media type" : `media type ${contentType}`} is none of the service; something between it and this client may have given it.`,
    );
    this.status = status;
    this.contentType = contentType;
    this.beginning = body.slice(0, 500);
  }
}
