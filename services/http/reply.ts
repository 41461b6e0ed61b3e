import type { Response } from "express";

/** What the log says of a request, gathered while it travels. */
export interface Travel {
  requestId: string;
  /** The operation the request reached, null when it reached none. */
  operationId: string | null;
  bytes: number;
}

/**
 * Headers of every answer. The answers are JSON for programs: nothing in them may be run, framed or guessed at, and
 * methods under review are confidential, so nothing is kept on the way.
 */
const SECURITY_HEADERS = {
  "X-Content-Type-Options": "nosniff",
  "Content-Security-Policy": "default-src 'none'; frame-ancestors 'none'",
  "X-Frame-Options": "DENY",
  "Referrer-Policy": "no-referrer",
  "Cross-Origin-Resource-Policy": "same-origin",
  "Cache-Control": "no-store",
} as const;

/** A page may be styled by its own style element; all else stays shut. */
const PAGE_POLICY = {
  "Content-Security-Policy": "default-src 'none'; style-src 'unsafe-inline'; frame-ancestors 'none'",
} as const;

export function travelOf(response: Response): Travel {
  return response.locals as Travel;
}

/** The one way out: status, headers and body in one write. A HEAD request gets the same headers and no body. */
export function reply(
  response: Response,
  status: number,
  mediaType: string,
  body: string | Buffer,
  headers: Readonly<Record<string, string>> = {},
): void {
  const travel = travelOf(response);
  travel.bytes = Buffer.byteLength(body);
  response.writeHead(status, {
    ...SECURITY_HEADERS,
    ...(mediaType.startsWith("text/html") ? PAGE_POLICY : null),
    "X-Request-Id": travel.requestId,
    "Content-Type": mediaType,
    "Content-Length": travel.bytes,
    ...headers,
  });
  response.end(body);
}

/** An answer without a body. */
export function replyEmpty(response: Response, headers: Readonly<Record<string, string>>): void {
  response.writeHead(204, {
    ...SECURITY_HEADERS,
    "X-Request-Id": travelOf(response).requestId,
    ...headers,
  });
  response.end();
}
