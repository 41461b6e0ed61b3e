/**
 * Every problem the service answers with (RFC 9457). The one registry behind the type `ProblemCode`, the problem
 * documents, `GET /problems` and the responses in the OpenAPI document.
 */
export const PROBLEMS = {
  "malformed-json": {
    status: 400,
    title: "The body is not JSON",
    when: "The body is empty, is not well-formed JSON in UTF-8, or its top level is no object.",
    remedy: "Send one JSON object (RFC 8259), encoded in UTF-8.",
  },
  "interrupted-body": {
    status: 400,
    title: "The body did not arrive whole",
    when: "The connection ended, or fewer bytes came than Content-Length announced.",
    remedy: "Send the request again; look at time limits on the way.",
  },
  "not-found": {
    status: 404,
    title: "There is nothing at this path",
    when: "No endpoint has this path. Paths are case-sensitive and end without a slash.",
    remedy: "Take the path from /openapi.json.",
  },
  "method-not-allowed": {
    status: 405,
    title: "The path does not take this method",
    when: "The path exists, but not with this method.",
    remedy: "Use a method that the Allow header names.",
  },
  "not-acceptable": {
    status: 406,
    title: "The answer has no such form",
    when: "The Accept header admits none of the media types in which this endpoint answers.",
    remedy: "Accept application/json, or another form that /openapi.json lists for the operation.",
  },
  "body-too-large": {
    status: 413,
    title: "The body is too large",
    when: "The body is larger than the limit that GET /v1/about shows.",
    remedy: "Split the request; the service keeps no state between two requests.",
  },
  "unsupported-media-type": {
    status: 415,
    title: "The body is of a media type that is not taken",
    when: "Content-Type is not application/json (with or without charset=utf-8), or the body is compressed.",
    remedy: "Send Content-Type: application/json and no Content-Encoding.",
  },
  "invalid-request": {
    status: 422,
    title: "The request has members that are missing, unknown or wrong",
    when: "The body is JSON, or the query well-formed, but breaks the request schema or a rule between its members. `errors` says where.",
    remedy: "Correct the members that `errors` points at. The codes are listed at GET /problems.",
  },
  "too-much-work": {
    status: 422,
    title: "The request asks for too much work at once",
    when: "Each part is valid, but together they cost more than one request may.",
    remedy: "Split the request; the service keeps no state between two requests.",
  },
  "internal-error": {
    status: 500,
    title: "The service failed",
    when: "A defect of the service, never a property of the request's numbers. Nothing was computed.",
    remedy: "Report the requestId to whoever runs the service: the log names the defect under it.",
  },
} as const satisfies Record<string, ProblemDefinition>;

export interface ProblemDefinition {
  readonly status: number;
  readonly title: string;
  /** When it is answered, as a sentence. */
  readonly when: string;
  /** What the caller does about it, as a sentence. */
  readonly remedy: string;
}

export type ProblemCode = keyof typeof PROBLEMS;

export const PROBLEM_CODES = Object.keys(PROBLEMS) as [ProblemCode, ...ProblemCode[]];
