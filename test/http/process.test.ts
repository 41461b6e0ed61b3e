import { type ChildProcess, spawn } from "node:child_process";
import { once } from "node:events";
import { existsSync } from "node:fs";
import { type AddressInfo, connect, createServer, type Socket } from "node:net";
import { createInterface } from "node:readline";
import { afterEach, beforeAll, describe, expect, it } from "vitest";
import { stability } from "../../services/http/endpoints/stability.ts";

const BUILT = "dist/services/http/main.js";
const BODY = JSON.stringify(stability.examples["unit-mass-window"]!.request);

/** The service as it is run in operation: compiled, as a process of its own. */
class Service {
  readonly process: ChildProcess;
  readonly lines: Record<string, unknown>[] = [];
  errors = "";

  constructor(environment: Record<string, string>) {
    this.process = spawn(process.execPath, [BUILT], {
      env: { PATH: process.env.PATH, RODSET_PORT: "0", RODSET_ADMIN_PORT: "0", ...environment },
      stdio: ["ignore", "pipe", "pipe"],
    });
    createInterface({ input: this.process.stdout! }).on("line", (line) => this.lines.push(JSON.parse(line)));
    this.process.stderr!.on("data", (data) => {
      this.errors += data;
    });
  }

  async line(message: string): Promise<Record<string, unknown>> {
    for (let waited_ms = 0; waited_ms < 20_000; waited_ms += 20) {
      const found = this.lines.find(({ msg }) => msg === message);
      if (found !== undefined) return found;
      await new Promise((resolve) => setTimeout(resolve, 20));
    }
    throw new Error(`No line ${message} came. ${this.errors}`);
  }

  async addresses(): Promise<{ address: string; adminAddress: string }> {
    return (await this.line("listening")) as { address: string; adminAddress: string };
  }

  async exitCode(): Promise<number | null> {
    if (this.process.exitCode === null && this.process.signalCode === null) await once(this.process, "close");
    return this.process.exitCode;
  }
}

let service: Service;

beforeAll(() => {
  if (!existsSync(BUILT))
    throw new Error(`${BUILT} is not there: run \`npm run build\` first, as \`npm test\` does.`);
});

afterEach(() => {
  service.process.kill("SIGKILL");
});

/** A request of which everything but the last byte has arrived. */
async function halfPosted(address: string): Promise<{ socket: Socket; finish(): Promise<string> }> {
  const { hostname, port } = new URL(address);
  const socket = connect(Number(port), hostname);
  await once(socket, "connect");
  socket.write(
    `POST /v1/stability HTTP/1.1\r\nHost: x\r\nContent-Type: application/json\r\nContent-Length: ${Buffer.byteLength(BODY)}\r\n\r\n${BODY.slice(0, -1)}`,
  );
  await new Promise((resolve) => setTimeout(resolve, 200));
  return {
    socket,
    async finish() {
      socket.write(BODY.slice(-1));
      return Buffer.concat(await socket.toArray()).toString();
    },
  };
}

describe("the built service", () => {
  it("says where it listens, answers there, and is alive and ready on the other listener only", async () => {
    service = new Service({});
    const { address, adminAddress } = await service.addresses();
    const response = await fetch(`${address}/v1/stability`, {
      method: "POST",
      headers: { "Content-Type": "application/json" },
      body: BODY,
    });
    expect(response.status).toBe(200);
    expect(await fetch(`${address}/openapi.json`).then((answer) => answer.json())).toMatchObject({
      openapi: "3.1.0",
    });
    const admin = async (path: string, method = "GET") => {
      const answer = await fetch(`${adminAddress}${path}`, { method });
      return [answer.status, ((await answer.json()) as { status: string }).status];
    };
    expect(await admin("/livez")).toEqual([200, "alive"]);
    expect(await admin("/readyz")).toEqual([200, "ready"]);
    expect(await admin("/v1/about")).toEqual([404, "not found"]);
    expect(await admin("/livez", "POST")).toEqual([405, "method not allowed"]);
    expect((await fetch(`${address}/livez`)).status).toBe(404);
  });

  it.each(["SIGTERM", "SIGINT"] as const)(
    "finishes what is in flight after %s, takes nothing new, and ends with 0",
    async (signal) => {
      service = new Service({});
      const { address, adminAddress } = await service.addresses();
      const inFlight = await halfPosted(address);
      service.process.kill(signal);
      await service.line("draining");
      expect((await fetch(`${adminAddress}/readyz`)).status).toBe(503);
      await expect(fetch(`${address}/v1/about`)).rejects.toThrow();
      expect(await inFlight.finish()).toMatch(/^HTTP\/1\.1 200 OK/);
      expect(await service.exitCode()).toBe(0);
      expect(await service.line("stopped")).toMatchObject({ inTime: true });
    },
  );

  it("does not wait for an idle connection that a client keeps alive", async () => {
    service = new Service({ RODSET_DRAIN_S: "60" });
    const { address } = await service.addresses();
    await (await fetch(`${address}/v1/about`)).text();
    service.process.kill("SIGTERM");
    expect(await service.exitCode()).toBe(0);
  });

  it("gives up on a request that does not end, at the deadline", async () => {
    service = new Service({ RODSET_DRAIN_S: "1" });
    const { socket } = await halfPosted((await service.addresses()).address);
    socket.on("error", () => {});
    service.process.kill("SIGTERM");
    expect(await service.exitCode()).toBe(0);
    expect(await service.line("stopped")).toMatchObject({ inTime: false });
  });

  it("says on the standard error which setting is wrong, and ends with 1", async () => {
    service = new Service({ RODSET_PORT: "eighty" });
    expect(await service.exitCode()).toBe(1);
    expect(service.errors).toBe(
      'RODSET_PORT is "eighty"; it must be a whole number from 0 to 65535.\nThe variables are described in README.md, section Settings.\n',
    );
  });

  it("ends with 1 when the port is taken, and leaves no half-started service behind", async () => {
    const first = new Service({});
    const { port } = new URL((await first.addresses()).address);
    service = new Service({ RODSET_PORT: port });
    expect(await service.exitCode()).toBe(1);
    expect(service.errors).toContain("EADDRINUSE");
    first.process.kill("SIGKILL");
  });

  it("can be told to log nothing", async () => {
    const adminPort = await freePort();
    service = new Service({ RODSET_LOG_LEVEL: "silent", RODSET_ADMIN_PORT: String(adminPort) });
    const ready = () =>
      fetch(`http://127.0.0.1:${adminPort}/readyz`).then(
        ({ status }) => status === 200,
        () => false,
      );
    while (!(await ready())) await new Promise((resolve) => setTimeout(resolve, 20));
    service.process.kill("SIGTERM");
    expect(await service.exitCode()).toBe(0);
    expect(service.lines).toEqual([]);
  });
});

async function freePort(): Promise<number> {
  const server = createServer().listen(0, "127.0.0.1");
  await once(server, "listening");
  const { port } = server.address() as AddressInfo;
  server.close();
  return port;
}
