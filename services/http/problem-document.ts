import { z } from "zod";
import { ERROR_CODES, type ErrorCode } from "./error-codes.ts";
import { type ErrorList, MOST_ERRORS_SHOWN } from "./error-list.ts";
import { PROBLEM_CODES, PROBLEMS, type ProblemCode } from "./problems.ts";

const ErrorOfMember = z
  .strictObject({
    pointer: z.string().meta({ description: "JSON Pointer (RFC 6901) to the member; empty for the body." }),
    code: z.enum(Object.keys(ERROR_CODES) as [ErrorCode, ...ErrorCode[]]),
    detail: z.string().meta({ description: "What was found and what is expected, for a person." }),
  })
  .meta({ id: "ErrorOfMember", description: "One thing that is wrong with a request, and where." });

export const Problem = z
  .strictObject({
    type: z
      .string()
      .meta({ description: "URI reference of the kind of problem, described at GET /problems." }),
    title: z
      .string()
      .meta({ description: "The kind of problem in a few words; the same for every occurrence." }),
    status: z.int().meta({ description: "The HTTP status code." }),
    detail: z.string().meta({ description: "This occurrence, for a person." }),
    code: z.enum(PROBLEM_CODES).meta({ description: "The kind of problem, for a program." }),
    requestId: z.string().meta({ description: "Also in the X-Request-Id header and in the service's log." }),
    errors: z
      .array(ErrorOfMember)
      .max(MOST_ERRORS_SHOWN)
      .optional()
      .meta({ description: "With invalid-request only." }),
    errorsOmitted: z
      .int()
      .min(0)
      .optional()
      .meta({ description: "How many errors there are beyond those shown. With invalid-request only." }),
  })
  .meta({ id: "Problem", description: "Problem details (RFC 9457)." });
export type Problem = z.output<typeof Problem>;

/** Ends the answering of a request with a problem document. */
export class ProblemError extends Error {
  override readonly name = "ProblemError";
  readonly code: ProblemCode;
  readonly detail: string;
  readonly headers: Readonly<Record<string, string>>;
  readonly errors: ErrorList | null;

  constructor(
    code: ProblemCode,
    detail: string = PROBLEMS[code].when,
    more: { headers?: Readonly<Record<string, string>>; errors?: ErrorList } = {},
  ) {
    super(code);
    this.code = code;
    this.detail = detail;
    this.headers = more.headers ?? {};
    this.errors = more.errors ?? null;
  }
}

export function invalidRequest(errors: ErrorList): ProblemError {
  return new ProblemError("invalid-request", "`errors` says which members are wrong, and how.", { errors });
}

export function problemDocument({ code, detail, errors }: ProblemError, requestId: string): Problem {
  const { status, title } = PROBLEMS[code];
  const problem = { type: `/problems#${code}`, title, status, detail, code, requestId };
  if (errors === null) return problem;
  // The registry is complete: a test posts a request for every code that schemas and rules produce.
  return { ...problem, errors: [...errors.shown] as Problem["errors"], errorsOmitted: errors.omitted };
}
