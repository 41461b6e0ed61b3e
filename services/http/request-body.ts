import type { IncomingMessage } from "node:http";
import express, { type RequestHandler } from "express";
import { duplicateMembers } from "./duplicate-members.ts";
import { errorList } from "./error-list.ts";
import { invalidRequest, ProblemError } from "./problem-document.ts";

const JSON_MEDIA_TYPE = /^application\/json(?:[ \t]*;[ \t]*charset=(?:utf-8|"utf-8"))?[ \t]*$/i;

/** Reads a JSON body of at most `limit_kB`, and nothing that calls itself otherwise. */
export function jsonBody(limit_kB: number, { refusesDuplicateMembers = false } = {}): RequestHandler[] {
  const raw = new WeakMap<IncomingMessage, Buffer>();
  return [
    requireJson,
    express.json({
      type: () => true,
      inflate: false,
      limit: limit_kB * 1000,
      strict: true,
      // The parser would take a body of no bytes for an empty object.
      verify: (request, _response, bytes) => {
        refuseEmpty(bytes.length === 0);
        if (refusesDuplicateMembers) raw.set(request, bytes);
      },
    }),
    // Without Content-Length and Transfer-Encoding there is nothing to parse.
    (request, _response, next) => {
      refuseEmpty(request.body === undefined);
      const bytes = raw.get(request);
      if (bytes !== undefined) refuseDuplicates(bytes);
      next();
    },
  ];
}

const requireJson: RequestHandler = (request, _response, next) => {
  const mediaType = request.headers["content-type"];
  if (mediaType === undefined) {
    throw new ProblemError("unsupported-media-type", "Content-Type is missing; it must be application/json.");
  }
  if (!JSON_MEDIA_TYPE.test(mediaType)) {
    throw new ProblemError(
      "unsupported-media-type",
      "Content-Type must be application/json, with no parameter or with charset=utf-8.",
    );
  }
  next();
};

function refuseDuplicates(bytes: Buffer): void {
  // The parser takes a byte order mark off; the scanner would trip over it.
  const errors = duplicateMembers(bytes.toString("utf8").replace(/^\uFEFF/, ""));
  if (errors.length > 0) throw invalidRequest(errorList(errors, (item) => item));
}

function refuseEmpty(empty: boolean): void {
  if (empty) throw new ProblemError("malformed-json", "The body is empty.");
}

/**
 * The problem behind an error of the body parser. The error also holds the raw body and quotes it in its message:
 * nothing of it goes any further.
 */
export function problemOfBodyError(error: unknown): ProblemError | null {
  switch ((error as { type?: unknown } | null)?.type) {
    case "entity.parse.failed":
      return new ProblemError("malformed-json");
    case "entity.too.large":
      return new ProblemError("body-too-large");
    case "encoding.unsupported":
      return new ProblemError("unsupported-media-type", "Content-Encoding must be absent or identity.");
    case "charset.unsupported":
      return new ProblemError("unsupported-media-type");
    case "request.aborted":
    case "request.size.invalid":
      return new ProblemError("interrupted-body");
    default:
      return null;
  }
}
