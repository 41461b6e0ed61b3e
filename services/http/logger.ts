import { type DestinationStream, destination, type Logger, pino, stdTimeFunctions } from "pino";

/** JSON lines; written behind the request's back, and flushed when the process ends. */
export function createLogger(
  level: string,
  stream: DestinationStream = destination({ fd: 1, sync: false }),
): Logger {
  return pino(
    {
      level,
      base: null,
      timestamp: stdTimeFunctions.isoTime,
      formatters: { level: (label) => ({ level: label }) },
    },
    stream,
  );
}
