/** The variables that the service reads, all of them: any other RODSET_ variable is taken for a slip of the pen. */
export const VARIABLES = {
  RODSET_HOST: {
    means: "Address that both listeners bind to; 0.0.0.0 inside a container.",
    fallback: "127.0.0.1",
    format: "a host name or an IP address",
    read: (text: string) => (/^[A-Za-z0-9.:-]{1,253}$/.test(text) ? text : null),
  },
  RODSET_PORT: {
    means: "Port of the service; 0 takes a free one.",
    fallback: "8080",
    format: "a whole number from 0 to 65535",
    read: wholeNumber(0, 65_535),
  },
  RODSET_ADMIN_PORT: {
    means: "Port of /livez and /readyz; 0 takes a free one.",
    fallback: "8081",
    format: "a whole number from 0 to 65535",
    read: wholeNumber(0, 65_535),
  },
  RODSET_LOG_LEVEL: {
    means: "The least important line that is logged; one line a request is logged at info.",
    fallback: "info",
    format: "one of debug, info, warn, error, silent",
    read: (text: string) => LOG_LEVELS.find((level) => level === text) ?? null,
  },
  RODSET_BODY_LIMIT_KB: {
    means: "Largest request body in kB (1000 bytes).",
    fallback: "512",
    format: "a whole number from 1 to 16384",
    read: wholeNumber(1, 16_384),
  },
  RODSET_DRAIN_S: {
    means: "Seconds that requests in flight are given at shutdown.",
    fallback: "10",
    format: "a whole number from 0 to 600",
    read: wholeNumber(0, 600),
  },
  RODSET_SEAL_KEY_FILE: {
    means:
      "File with the private Ed25519 key that seals records: PKCS #8 in PEM, or a JWK. Only its owner may read it.",
    fallback: "none",
    format: "the path of a file, or none",
    read: pathOfFile,
  },
  RODSET_SEAL_TRUSTED_KEYS_FILE: {
    means: "File with a JWK set of the public keys of earlier seals, which stay verifiable.",
    fallback: "none",
    format: "the path of a file, or none",
    read: pathOfFile,
  },
} as const satisfies Record<string, Variable<unknown>>;

interface Variable<Value> {
  readonly means: string;
  readonly fallback: string;
  readonly format: string;
  /** null when the text has not the format. */
  read(text: string): Value | null;
}

const LOG_LEVELS = ["debug", "info", "warn", "error", "silent"] as const;

export interface Settings {
  readonly host: string;
  readonly port: number;
  readonly adminPort: number;
  readonly logLevel: (typeof LOG_LEVELS)[number];
  readonly bodyLimit_kB: number;
  readonly drain_s: number;
  readonly sealKeyFile: string;
  readonly sealTrustedKeysFile: string;
}

/** Names every variable that is wrong, the format it wants and where to read about it. */
export class SettingsError extends Error {
  override readonly name = "SettingsError";

  constructor(complaints: readonly string[]) {
    super([...complaints, "The variables are described in README.md, section Settings."].join("\n"));
  }
}

export function readSettings(environment: Readonly<Record<string, string | undefined>>): Settings {
  const complaints = Object.keys(environment)
    .filter((name) => name.startsWith("RODSET_") && !Object.hasOwn(VARIABLES, name))
    .map((name) => `${name} is no setting; there are ${Object.keys(VARIABLES).join(", ")}.`);

  function valueAt<Value>(name: keyof typeof VARIABLES, { fallback, format, read }: Variable<Value>): Value {
    const text = environment[name] ?? fallback;
    const value = read(text);
    if (value === null) complaints.push(`${name} is ${JSON.stringify(text)}; it must be ${format}.`);
    // A wrong value is never handed out: the complaint throws below.
    return value as Value;
  }

  const settings: Settings = {
    host: valueAt("RODSET_HOST", VARIABLES.RODSET_HOST),
    port: valueAt("RODSET_PORT", VARIABLES.RODSET_PORT),
    adminPort: valueAt("RODSET_ADMIN_PORT", VARIABLES.RODSET_ADMIN_PORT),
    logLevel: valueAt("RODSET_LOG_LEVEL", VARIABLES.RODSET_LOG_LEVEL),
    bodyLimit_kB: valueAt("RODSET_BODY_LIMIT_KB", VARIABLES.RODSET_BODY_LIMIT_KB),
    drain_s: valueAt("RODSET_DRAIN_S", VARIABLES.RODSET_DRAIN_S),
    sealKeyFile: valueAt("RODSET_SEAL_KEY_FILE", VARIABLES.RODSET_SEAL_KEY_FILE),
    sealTrustedKeysFile: valueAt("RODSET_SEAL_TRUSTED_KEYS_FILE", VARIABLES.RODSET_SEAL_TRUSTED_KEYS_FILE),
  };
  if (complaints.length > 0) throw new SettingsError(complaints);
  return settings;
}

function pathOfFile(text: string): string | null {
  return /^[^\p{Cc}]{1,4096}$/u.test(text) ? text : null;
}

function wholeNumber(minimum: number, maximum: number): (text: string) => number | null {
  return (text) => {
    const value = /^\d{1,9}$/.test(text) ? Number(text) : Number.NaN;
    return value >= minimum && value <= maximum ? value : null;
  };
}
