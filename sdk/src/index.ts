export {
  type AnswerOf,
  type Client,
  createClient,
  type FormOf,
  type OperationId,
  type RequestOf,
} from "./client.ts";
export {
  type ProblemDocument,
  type ProblemItem,
  RodsetConnectionError,
  RodsetError,
  RodsetProblem,
  RodsetUnexpectedAnswer,
} from "./errors.ts";
export type { CallOptions, ClientOptions } from "./exchange.ts";
export type { Schema } from "./schema-of.ts";
