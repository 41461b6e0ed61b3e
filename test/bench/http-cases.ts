import { type ChildProcess, spawn } from "node:child_process";
import { createInterface } from "node:readline";
import { fileURLToPath } from "node:url";
import autocannon from "autocannon";
import type { BenchCase, Side } from "./bench-case.ts";

const SERVER = fileURLToPath(new URL("./http-server.ts", import.meta.url));
const REQUESTS = 600;
const CONNECTIONS = 10;

/** One ion's stability, posted to both sides. */
const BODY = JSON.stringify({
  given: "ions",
  rodSet: { fieldRadius_mm: 4, frequency_MHz: 1.2 },
  drive: {
    rf: { volts: 831.55739482, as: "zero-to-peak", between: "pole-and-ground" },
    dc: { volts: 139.42457479, between: "pole-and-ground" },
  },
  ions: [{ mz: 500 }],
});

/** A server in a process of its own, so that the client does not compete with it for one event loop. */
class Server {
  readonly kind: "service" | "echo";
  process: ChildProcess | null = null;
  url = "";

  constructor(kind: "service" | "echo") {
    this.kind = kind;
  }

  async open(): Promise<void> {
    this.process = spawn(process.execPath, ["--import", "tsx", SERVER, this.kind], {
      stdio: ["ignore", "ignore", "pipe"],
    });
    for await (const line of createInterface({ input: this.process.stderr! })) {
      if (!line.startsWith("http://")) continue;
      this.url = `${line}/v1/stability`;
      return;
    }
    throw new Error(`The side ${this.kind} did not start.`);
  }

  /** How many requests were answered. */
  async ask(): Promise<number> {
    const answered = await autocannon({
      url: this.url,
      method: "POST",
      headers: { "content-type": "application/json" },
      body: BODY,
      connections: CONNECTIONS,
      amount: REQUESTS,
      // A run ends at a sample: at the usual one a second, every run would take a whole second.
      sampleInt: 5,
    });
    if (answered.non2xx + answered.errors > 0) throw new Error(`Requests failed at ${this.url}.`);
    return answered["2xx"];
  }
}

function sideOf(server: Server, label: string): Side {
  return { label, operations: REQUESTS, run: () => server.ask() };
}

const service = new Server("service");
const echo = new Server("echo");

export const HTTP_CASES: readonly BenchCase[] = [
  {
    name: "HTTP, stability of one ion",
    target: { of: "speed", least: 0.7 },
    unit: "us",
    a: sideOf(service, "service, a line of log a request"),
    b: sideOf(echo, "express(), express.json(), res.json(req.body)"),
    checksumTolerance: 0,
    note: `Both get the same ${Buffer.byteLength(BODY)} bytes over ${CONNECTIONS} connections.`,
    open: async () => void (await Promise.all([service.open(), echo.open()])),
    close: async () => {
      service.process?.kill();
      echo.process?.kill();
    },
  },
];
