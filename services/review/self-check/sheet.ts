import type { SelfCheckAnswer } from "./self-check-schema.ts";

/** The self-check as a sheet for the installation and operation file. */
export function selfCheckSheet(
  { outcome, capabilities, engine, host, digest, seal }: SelfCheckAnswer,
  date: Date,
): string {
  const rows = capabilities.map(
    ({ capability, source, values, worstDeviation, worstAt, kind, limit, outcome: found }) =>
      [
        `${found.toUpperCase()}  ${capability}`,
        `      ${values} values; worst deviation ${worstDeviation === null ? "none: no value came out" : worstDeviation.toExponential(2)} (${kind}) at ${worstAt}; limit ${limit.toExponential(1)}`,
        `      Source: ${source}`,
      ].join("\n"),
  );
  return `${[
    "SELF-CHECK OF THE INSTALLATION",
    "",
    `Date      ${date.toISOString()}`,
    `Engine    Rodset ${engine.version}, constants ${engine.constants}`,
    `Host      ${host === null ? "not told" : `${host.runtime} ${host.version}, ${host.architecture}, ${host.system}`}`,
    `Outcome   ${outcome.toUpperCase()}`,
    `Digest    SHA-256 ${digest}`,
    `Seal      ${seal === null ? "none: the service holds no key" : seal.jws}`,
    "",
    ...rows,
    "",
    "This sheet shows that the installation computes as it should. It validates neither a method nor the laboratory's",
    "use of the service, and its seal is no person's signature.",
    "",
    "Printed name ______________________  Meaning ______________________  Date and time ______________________",
  ].join("\n")}\n`;
}
