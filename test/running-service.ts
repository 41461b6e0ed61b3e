import { type ChildProcess, spawn } from "node:child_process";
import { once } from "node:events";
import { existsSync } from "node:fs";
import { createInterface } from "node:readline";
import { fileURLToPath } from "node:url";

export const ROOT = fileURLToPath(new URL("../", import.meta.url));
const ENTRY = "dist/services/http/main.js";

export interface RunningService {
  readonly address: string;
  readonly adminAddress: string;
  /** Every line it has logged so far. */
  readonly log: readonly Record<string, unknown>[];
  /** Ends it as an orchestrator does, and answers the exit status. */
  stop(): Promise<number | null>;
}

/** The compiled service as a process of its own, on free ports. */
export async function startService(environment: Record<string, string> = {}): Promise<RunningService> {
  requireBuilt(ENTRY);
  const service = spawn(process.execPath, [ENTRY], {
    cwd: ROOT,
    env: {
      ...process.env,
      RODSET_HOST: "127.0.0.1",
      RODSET_PORT: "0",
      RODSET_ADMIN_PORT: "0",
      ...environment,
    },
    stdio: ["ignore", "pipe", "pipe"],
  });
  let complaint = "";
  service.stderr.on("data", (chunk) => {
    complaint += chunk;
  });
  const log: Record<string, unknown>[] = [];
  const { address, adminAddress } = await new Promise<Record<string, unknown>>((resolve, reject) => {
    createInterface({ input: service.stdout }).on("line", (line) => {
      const entry = JSON.parse(line) as Record<string, unknown>;
      log.push(entry);
      if (entry.msg === "listening") resolve(entry);
    });
    service.once("error", reject);
    service.once("close", (status) =>
      reject(new Error(`The service ended with status ${status} before it listened. ${complaint}`)),
    );
  });
  return {
    address: String(address),
    adminAddress: String(adminAddress),
    log,
    stop: () => ended(service),
  };
}

async function ended(service: ChildProcess): Promise<number | null> {
  if (service.exitCode !== null) return service.exitCode;
  const closed = once(service, "close");
  service.kill("SIGTERM");
  const [status] = (await closed) as [number | null];
  return status;
}

/** Fails with a sentence where something that `npm run build` makes is missing. */
export function requireBuilt(path: string): void {
  if (!existsSync(`${ROOT}${path}`)) {
    throw new Error(`${path} is missing. \`npm run build\` makes it; \`npm test\` does so by itself.`);
  }
}
