/** Everything this package throws, so that one `instanceof` tells it from a programming error. */
export class RodsetError extends Error {
  override name = "RodsetError";
}

/** One thing that is wrong with a request. */
export interface ProblemItem {
  /** RFC 6901 JSON Pointer into the request. */
  readonly pointer: string;
  readonly code: string;
  readonly detail: string;
}

/** The members of a problem document (RFC 9457) that the service sends. */
export interface ProblemDocument {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly code: string;
  readonly requestId: string;
  readonly errors?: readonly ProblemItem[];
  readonly errorsOmitted?: number;
}

/** The service understood that something is wrong and says what. */
export class RodsetProblem extends RodsetError {
  override name = "RodsetProblem";
  readonly status: number;
  readonly code: string;
  readonly requestId: string;
  readonly errors: readonly ProblemItem[];
  readonly errorsOmitted: number;
  /** Seconds after which the service asks to be tried again, where it says so. */
  readonly retryAfter_s: number | null;

  constructor(problem: ProblemDocument, retryAfter_s: number | null) {
    const items = (problem.errors ?? []).map(({ pointer, detail }) => `\n  ${pointer || "/"}: ${detail}`);
    super(`${problem.title} (${problem.code}): ${problem.detail}${items.join("")}`);
    this.status = problem.status;
    this.code = problem.code;
    this.requestId = problem.requestId;
    this.errors = problem.errors ?? [];
    this.errorsOmitted = problem.errorsOmitted ?? 0;
    this.retryAfter_s = retryAfter_s;
  }
}

/** No complete answer came: nothing listens, the connection broke, time was up, or the caller gave up. */
export class RodsetConnectionError extends RodsetError {
  override name = "RodsetConnectionError";
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
  readonly contentType: string;

  constructor(status: number, contentType: string) {
    super(
      `The answer has status ${status} and media type ${contentType || "none"}, which the service does not send; is something between this client and the service?`,
    );
    this.status = status;
    this.contentType = contentType;
  }
}
