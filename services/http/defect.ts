import type { Logger } from "pino";
import { WrongAnswerError } from "./answer.ts";

/**
 * Logs a defect by the kind of error and the places in our code. Messages of runtime errors may quote values of the
 * request, so they stay out; those of our own say only where.
 */
export function logDefect(logger: Logger, error: unknown, context: object): void {
  const { name, stack } = error instanceof Error ? error : new Error(typeof error);
  const at = (stack ?? "").split("\n").filter((line) => /^ {4}at /.test(line));
  const where = error instanceof WrongAnswerError ? { where: error.message } : null;
  logger.error({ ...context, error: name, ...where, at }, "defect");
}
