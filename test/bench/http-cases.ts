import { type ChildProcess, spawn } from "node:child_process";
import { createInterface } from "node:readline";
import { fileURLToPath } from "node:url";
import autocannon from "autocannon";

const SERVER = fileURLToPath(new URL("./http-server.ts", import.meta.url));
const ROUNDS = 5;
const ROUND_S = 1;
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

export interface ThroughputRatio {
  readonly name: string;
  /** Least ratio of service to echo. */
  readonly target: number;
  readonly service_perS: readonly number[];
  readonly echo_perS: readonly number[];
  readonly ratio: number;
}

/**
 * Requests per second of a one-ion answer against a bare Express that echoes the same body. Each side is a process of
 * its own; rounds alternate, so that a slow moment of the machine meets both.
 */
export async function oneIonAgainstEcho(): Promise<ThroughputRatio> {
  const [service, echo] = await Promise.all([start("service"), start("echo")]);
  try {
    await round(service.url);
    await round(echo.url);
    const service_perS: number[] = [];
    const echo_perS: number[] = [];
    for (let i = 0; i < ROUNDS; i++) {
      service_perS.push(await round(service.url));
      echo_perS.push(await round(echo.url));
    }
    const ratio = median(service_perS) / median(echo_perS);
    return {
      name: "HTTP: one ion's stability against a bare echo",
      target: 0.7,
      service_perS,
      echo_perS,
      ratio,
    };
  } finally {
    service.process.kill();
    echo.process.kill();
  }
}

async function start(side: "service" | "echo"): Promise<{ process: ChildProcess; url: string }> {
  const child = spawn(process.execPath, ["--import", "tsx", SERVER, side], {
    stdio: ["ignore", "ignore", "pipe"],
  });
  for await (const line of createInterface({ input: child.stderr })) {
    if (line.startsWith("http://")) return { process: child, url: `${line}/v1/stability` };
  }
  throw new Error(`The side ${side} did not start.`);
}

async function round(url: string): Promise<number> {
  const { requests, non2xx, errors } = await autocannon({
    url,
    method: "POST",
    headers: { "content-type": "application/json" },
    body: BODY,
    connections: CONNECTIONS,
    duration: ROUND_S,
  });
  if (non2xx + errors > 0) throw new Error(`${non2xx + errors} requests failed at ${url}.`);
  return requests.average;
}

function median(values: readonly number[]): number {
  const sorted = [...values].sort((one, other) => one - other);
  return sorted[Math.floor(sorted.length / 2)]!;
}
