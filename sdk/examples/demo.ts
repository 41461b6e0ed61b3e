/**
 * Starts the service on free ports, signs off a method of an invented laboratory over HTTP, prints what was found and
 * writes the report and the record. The demo succeeds when the service does, whatever the verdict.
 */
import { type ChildProcess, spawn } from "node:child_process";
import { mkdir, writeFile } from "node:fs/promises";
import { createInterface } from "node:readline";
import { type AnswerOf, createClient } from "@rodset/sdk";
import { demoRequest } from "./demo-request.ts";

const OUTPUT = "demo-out";

type SignOff = AnswerOf<"signOff">;

async function main(): Promise<void> {
  const service = spawn(process.execPath, ["dist/services/http/main.js"], {
    env: { ...process.env, RODSET_HOST: "127.0.0.1", RODSET_PORT: "0", RODSET_ADMIN_PORT: "0" },
    stdio: ["ignore", "pipe", "inherit"],
  });
  try {
    const client = createClient({ baseUrl: await addressOf(service) });
    const answer = await client.signOff(demoRequest);
    print(answer);
    await mkdir(OUTPUT, { recursive: true });
    await writeFile(`${OUTPUT}/report.html`, await client.form("signOff", "text/html", demoRequest));
    await writeFile(`${OUTPUT}/record.json`, `${JSON.stringify(answer.record, null, 2)}\n`);
    const { intact, reproduced } = await client.signOffVerification({ record: answer.record });
    console.log(`\nReport: ${OUTPUT}/report.html`);
    console.log(`Record: ${OUTPUT}/record.json (posted back: intact ${intact}, reproduced ${reproduced})`);
  } finally {
    service.kill("SIGTERM");
  }
}

/** The service says on its first line where it listens. */
async function addressOf(service: ChildProcess): Promise<string> {
  for await (const line of createInterface({ input: service.stdout! })) {
    const entry = JSON.parse(line) as { msg?: string; address?: string };
    if (entry.msg === "listening" && entry.address !== undefined) return entry.address;
  }
  throw new Error("The service ended before it listened.");
}

function print({ verdict, verdictStatement, findings, outcomeCounts, notShown }: SignOff): void {
  const { method, instrument } = demoRequest;
  console.log(`\nMethod ${method.id}, revision ${method.revision}, on ${instrument.id}, revision ${instrument.revision}`);
  console.log(`Verdict: ${verdict.toUpperCase()}. ${verdictStatement}\n`);
  console.log(
    Object.entries(outcomeCounts)
      .map(([outcome, count]) => `${outcome} ${count}`)
      .join(", "),
  );
  for (const outcome of ["fail", "caution"] as const) {
    const found = findings.filter((finding) => finding.outcome === outcome);
    if (found.length === 0) continue;
    console.log(`\n${outcome.toUpperCase()}`);
    for (const { check, subject, statement, passesIf } of found) {
      console.log(`  ${[subject.acquisition, subject.stage].filter(Boolean).join(" in ")}: ${check}`);
      console.log(`    ${statement}`);
      if (passesIf !== null) console.log(`    Passes if ${passesIf.input} is ${interval(passesIf)}.`);
    }
  }
  console.log("\nPASS");
  for (const [check, count] of countPasses(findings)) console.log(`  ${check}: ${count}`);
  console.log("\nNOT SHOWN");
  for (const { check, missing, findings: count } of notShown) {
    console.log(`  ${check}: ${count === 1 ? "one finding lacks" : `${count} findings lack`} ${missing.join(", ")}`);
  }
}

function countPasses(findings: SignOff["findings"]): Map<string, number> {
  const counts = new Map<string, number>();
  for (const { check, outcome } of findings) {
    if (outcome === "pass") counts.set(check, (counts.get(check) ?? 0) + 1);
  }
  return counts;
}

function interval({ min, max, unit }: NonNullable<SignOff["findings"][number]["passesIf"]>): string {
  const number = (value: number) => String(Number(value.toPrecision(6)));
  const of = unit === "1" ? "" : ` ${unit}`;
  if (min !== null && max !== null) return `from ${number(min)} to ${number(max)}${of}`;
  return min !== null ? `at least ${number(min)}${of}` : `at most ${number(max!)}${of}`;
}

await main();
