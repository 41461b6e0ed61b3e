import { randomUUID } from "node:crypto";
import type { RequestHandler } from "express";
import type { Logger } from "pino";
import { travelOf } from "./reply.ts";

/** A caller may give its own id only if it can stand in a log and in a header as it is. */
const PLAIN_ID = /^[A-Za-z0-9-]{8,64}$/;

/**
 * Names the request and writes one line when it is over. Paths, queries and bodies hold what a laboratory keeps
 * confidential, so the line says which operation was reached and never what was asked.
 */
export function arrival(logger: Logger): RequestHandler {
  return (request, response, next) => {
    const started = performance.now();
    const given = request.headers["x-request-id"];
    const travel = travelOf(response);
    travel.requestId = typeof given === "string" && PLAIN_ID.test(given) ? given : randomUUID();
    travel.operationId = null;
    travel.bytes = 0;
    response.once("close", () => {
      logger.info(
        {
          operationId: travel.operationId,
          method: request.method,
          status: response.headersSent ? response.statusCode : null,
          duration_ms: Math.round((performance.now() - started) * 1e3) / 1e3,
          bytes: travel.bytes,
          requestId: travel.requestId,
          ...(response.writableFinished ? null : { aborted: true }),
        },
        "request",
      );
    });
    next();
  };
}
