/**
 * Starts the service on free ports, signs off a method of an invented laboratory over HTTP, prints what was found and
 * writes the report and the record. The demo succeeds when the service does, whatever the verdict.
 */
import { type ChildProcess, spawn } from "node:child_process";
import { once } from "node:events";
import { mkdir, writeFile } from "node:fs/promises";
import { createInterface } from "node:readline";
import { createClient } from "@rodset/sdk";
import { demoRequest } from "./demo-request.ts";
import { findingsAsText } from "./findings-as-text.ts";

const OUTPUT = "demo-out";

const service = spawn(process.execPath, ["dist/services/http/main.js"], {
  env: { ...process.env, RODSET_HOST: "127.0.0.1", RODSET_PORT: "0", RODSET_ADMIN_PORT: "0" },
  stdio: ["ignore", "pipe", "inherit"],
});
try {
  const client = createClient({ baseUrl: await addressOf(service) });
  const answer = await client.signOff(demoRequest);
  console.log(findingsAsText(demoRequest, answer));

  await mkdir(OUTPUT, { recursive: true });
  await writeFile(`${OUTPUT}/report.html`, await client.form("signOff", "text/html", demoRequest));
  await writeFile(`${OUTPUT}/record.json`, `${JSON.stringify(answer.record, null, 2)}\n`);
  const { intact, reproduced, seal } = await client.signOffVerification({ record: answer.record });
  console.log(`
Written
  ${OUTPUT}/report.html   the report, to read, print and sign
  ${OUTPUT}/record.json   the record; posted back: ${intact ? "intact" : "altered"}, ${reproduced ? "reproduced" : "not reproduced"}, seal ${seal}

${answer.cautions[0]}`);
} finally {
  service.kill("SIGTERM");
}
const [status] = service.exitCode === null ? await once(service, "exit") : [service.exitCode];
if (status !== 0) throw new Error(`The service ended with status ${status}.`);

/** The service says in a line of its log where it listens. */
async function addressOf(started: ChildProcess): Promise<string> {
  for await (const line of createInterface({ input: started.stdout! })) {
    const entry = JSON.parse(line) as { msg?: string; address?: string };
    if (entry.msg === "listening" && entry.address !== undefined) return entry.address;
  }
  throw new Error("The service ended before it listened.");
}
