import type { z } from "zod";
import type { Rule } from "../contract/rule.ts";
import type { PublicSealKey, SealingKey } from "../review/record/seal-keys.ts";
import type { Host } from "../review/self-check/self-check-schema.ts";
import type { ProblemCode } from "./problems.ts";
import type { Tag } from "./tags.ts";

/** What one request may cost. `GET /v1/about` shows these. */
export interface Limits {
  /** Steps that a solver may take for one number before it answers that it did not converge. */
  readonly maxSteps: number;
  readonly bodyLimit_kB: number;
}

/** Keys, clock and host of the service: no answer may depend on them but in a seal and in a self-check. */
export interface Sealing {
  /** null where the service was given none; then nothing is sealed. */
  readonly key: SealingKey | null;
  /** Public keys whose seals are known: the current one first, then those of earlier generations. */
  readonly known: readonly PublicSealKey[];
  /** null where the service was not told what it runs on. */
  readonly host: Host | null;
  now(): Date;
}

type RequestSchema = z.ZodType | null;
/** The request as a caller writes it. */
type Written<Request extends RequestSchema> = Request extends z.ZodType ? z.input<Request> : null;
/** The request as its schema hands it on. */
type Accepted<Request extends RequestSchema> = Request extends z.ZodType ? z.output<Request> : null;

/** How much a request asks for, in things a caller can count, and how much of it one request may ask for. */
export interface Work<Request> {
  readonly unit: string;
  of(request: Request): number;
  readonly most: number;
}

/** A request with its answer. The OpenAPI document shows it and a test posts it. */
export interface Example<Request, Answer> {
  readonly summary: string;
  readonly request: Request;
  readonly answer: Answer;
  /** Where the numbers of the answer come from, when they do not come from this service. */
  readonly source?: string;
}

/**
 * One question the service answers, as a value. The route, the validation, the limits, the entry in the OpenAPI
 * document, the test of the examples and the method of the SDK are all made from it.
 */
export interface Endpoint<Request extends RequestSchema, Answer extends z.ZodType> {
  /** Name of the operation everywhere: in the document, in the log and as the method of the SDK. */
  readonly operationId: string;
  readonly method: "get" | "post";
  readonly path: `/${string}`;
  readonly tag: Tag;
  readonly summary: string;
  readonly description: string;
  /**
   * A POST takes it as its body, a GET as its query, in which nothing confidential may stand. null for an endpoint that
   * takes nothing.
   */
  readonly request: Request;
  /** What the request schema cannot say, checked after it. */
  readonly rules?: readonly Rule<Accepted<Request>>[];
  /** Largest body, where it must be larger than that of other requests. */
  readonly bodyLimit_kB?: number;
  /** Whether a JSON object that names a member twice is refused, because what was read goes on record. */
  readonly refusesDuplicateMembers?: true;
  /** null where there is nothing to count. */
  readonly work: Work<Accepted<Request>> | null;
  readonly answer: Answer;
  /** Other media types of the answer, chosen by the Accept header. */
  readonly forms?: Readonly<Record<string, (answer: z.output<Answer>) => string>>;
  /** Problems beyond those that every endpoint with this method has. */
  readonly problems?: readonly ProblemCode[];
  readonly examples: Readonly<Record<string, Example<Written<Request>, z.output<Answer>>>>;
  handler(request: Accepted<Request>, limits: Limits): z.input<Answer>;
  /** What needs a key or the clock: it completes the answer of the handler, which stays pure. */
  withSeal?(answer: z.output<Answer>, request: Accepted<Request>, sealing: Sealing): Promise<z.input<Answer>>;
}

/** An endpoint whose types are forgotten: its own schema stands between a request and its rules and handler. */
// biome-ignore lint/suspicious/noExplicitAny: rules and handler take their own request type, which no common type covers.
export type AnyEndpoint = Endpoint<any, any>;

/** Checks the parts of an endpoint against each other: a wrong example, rule or handler does not compile. */
export function defineEndpoint<Request extends RequestSchema, Answer extends z.ZodType>(
  endpoint: Endpoint<Request, Answer>,
): Endpoint<Request, Answer> {
  return endpoint;
}

/** Every problem that an endpoint can answer with. */
export function problemsOf(endpoint: AnyEndpoint): ProblemCode[] {
  const ofBody: ProblemCode[] = [
    "malformed-json",
    "interrupted-body",
    "body-too-large",
    "unsupported-media-type",
    "invalid-request",
  ];
  return [
    ...(endpoint.request === null ? [] : endpoint.method === "get" ? (["invalid-request"] as const) : ofBody),
    ...(endpoint.work === null ? [] : (["too-much-work"] as const)),
    "not-acceptable",
    ...(endpoint.problems ?? []),
    "internal-error",
  ];
}
