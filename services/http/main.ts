import { createServer } from "node:http";
import { createApp } from "./app.ts";
import { ENDPOINTS } from "./endpoints.ts";
import { limitsOf } from "./limits.ts";
import { drain, listen } from "./listening.ts";
import { createLogger } from "./logger.ts";
import { readOpenApiDocument } from "./openapi-document.ts";
import { operations, type Readiness } from "./operations.ts";
import { readSealing } from "./seal-key-files.ts";
import { readSettings } from "./settings.ts";

try {
  const settings = readSettings(process.env);
  const logger = createLogger(settings.logLevel);
  const readiness: Readiness = { ready: false };

  const service = createServer(
    createApp({
      endpoints: ENDPOINTS,
      openApiDocument: readOpenApiDocument(),
      limits: limitsOf(settings),
      sealing: await readSealing(settings),
      logger,
    }),
  );
  const admin = createServer(operations(readiness));

  const adminAddress = await listen(admin, settings.host, settings.adminPort);
  const address = await listen(service, settings.host, settings.port);
  readiness.ready = true;
  logger.info({ address, adminAddress }, "listening");

  const stop = async (signal: NodeJS.Signals) => {
    readiness.ready = false;
    logger.info({ signal }, "draining");
    const inTime = await drain(service, settings.drain_s);
    await drain(admin, 0);
    logger.info({ inTime }, "stopped");
    logger.flush(() => process.exit(0));
  };
  process.once("SIGTERM", stop);
  process.once("SIGINT", stop);
} catch (error) {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 1;
  // A listener that is already open would keep a half-started service alive.
  setImmediate(() => process.exit());
}
