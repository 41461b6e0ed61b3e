import type { Request } from "express";
import type { z } from "zod";
import type { AnyEndpoint, Limits, Sealing } from "./endpoint.ts";
import { errorList } from "./error-list.ts";
import { invalidRequest, ProblemError } from "./problem-document.ts";
import { checkAgainst } from "./schema-errors.ts";

/** An answer in the form the caller accepts. */
export interface WrittenAnswer {
  readonly mediaType: string;
  readonly body: string;
}

/** Request schema -> rules -> work limit -> handler -> seal -> answer schema. */
export async function answerOf(
  endpoint: AnyEndpoint,
  document: unknown,
  limits: Limits,
  sealing: Sealing,
): Promise<unknown> {
  const request = endpoint.request === null ? null : accept(endpoint, document);
  refuseTooMuchWork(endpoint, request);
  const handled = endpoint.handler(request, limits);
  const sealed =
    endpoint.withSeal === undefined ? handled : await endpoint.withSeal(handled, request, sealing);
  const answer = endpoint.answer.safeParse(sealed);
  // zod's numbers are finite: NaN and Infinity, which JSON would turn into null in silence, end here too.
  if (!answer.success) throw new WrongAnswerError(answer.error.issues[0]);
  return answer.data;
}

function accept(endpoint: AnyEndpoint, document: unknown): unknown {
  const { accepted, errors } = checkAgainst(endpoint.request as z.ZodType, document);
  if (errors !== null) throw invalidRequest(errors);
  const broken = (endpoint.rules ?? []).flatMap((rule) => rule(accepted));
  if (broken.length > 0) throw invalidRequest(errorList(broken, (item) => item));
  return accepted;
}

/**
 * What is admitted is computed on the event loop, which liveness shares: a few milliseconds for every question but the
 * largest sign-offs, whose 2,000 acquisitions keep it for some tenths of a second. Heavier work belongs on a worker.
 */
function refuseTooMuchWork({ work }: AnyEndpoint, request: unknown): void {
  if (work === null) return;
  const amount = work.of(request);
  if (amount <= work.most) return;
  throw new ProblemError(
    "too-much-work",
    `The request asks for ${amount} ${work.unit}; one request may ask for ${work.most}.`,
  );
}

/** The media type in which to answer; JSON unless the caller prefers another form of the endpoint. */
export function formFor(endpoint: AnyEndpoint, request: Request): string {
  const accept = request.headers.accept;
  if (accept === undefined || accept === "*/*" || accept === "application/json") return "application/json";
  const offered = ["application/json", ...Object.keys(endpoint.forms ?? {})];
  const chosen = request.accepts(offered);
  if (chosen === false) {
    throw new ProblemError("not-acceptable", `This endpoint answers as ${offered.join(" or ")}.`);
  }
  return chosen;
}

export function write(endpoint: AnyEndpoint, answer: unknown, form: string): WrittenAnswer {
  const inForm = endpoint.forms?.[form];
  return inForm === undefined
    ? { mediaType: "application/json", body: JSON.stringify(answer) }
    : { mediaType: `${form}; charset=utf-8`, body: inForm(answer) };
}

/** A handler gave what its answer schema refuses: a defect. Only the place is kept, never a value. */
export class WrongAnswerError extends Error {
  override readonly name = "WrongAnswerError";

  constructor(issue: z.core.$ZodIssue | undefined) {
    super(`${issue?.code} at ${issue?.path.join("/")}`);
  }
}
