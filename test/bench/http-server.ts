/** One of the two sides of the HTTP benchmark, as a process of its own: the service, or a bare Express that echoes. */
import { createServer } from "node:http";
import express from "express";
import { createApp } from "../../services/http/app.ts";
import { ENDPOINTS } from "../../services/http/endpoints.ts";
import { limitsOf } from "../../services/http/limits.ts";
import { listen } from "../../services/http/listening.ts";
import { createLogger } from "../../services/http/logger.ts";
import { readOpenApiDocument } from "../../services/http/openapi-document.ts";

function bareEcho() {
  const app = express();
  app.use(express.json());
  app.post("/v1/stability", (request, response) => {
    response.json(request.body);
  });
  return app;
}

const app =
  process.argv[2] === "echo"
    ? bareEcho()
    : createApp({
        endpoints: ENDPOINTS,
        openApiDocument: readOpenApiDocument(),
        limits: limitsOf({ bodyLimit_kB: 512 }),
        // As in operation: a line a request, written to the standard output.
        logger: createLogger("info"),
      });

process.stderr.write(`${await listen(createServer(app), "127.0.0.1", 0)}\n`);
