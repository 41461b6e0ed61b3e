/**
 * Makes the same records with this Node.js and with Node.js 24, and has each verify the other's:
 * `npx tsx test/records/across-runtimes.ts [path of the other node]`. Without a path it installs the package node@24 in a
 * temporary folder, and skips with status 0 where that cannot be had.
 */
import { spawnSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import type { SealedRecord } from "../../services/review/record/record-schema.ts";

interface Found {
  readonly runtime: string;
  readonly found: Record<
    string,
    { digests: SealedRecord["digests"]; intact: boolean; reproduced: boolean; record: SealedRecord }
  >;
}

const say = (line: string) => process.stdout.write(`${line}\n`);
const folder = mkdtempSync(join(tmpdir(), "node-24-"));
try {
  const other = process.argv[2] ?? installed();
  if (other === null) say("skipped: Node.js 24 cannot be installed here");
  else compare(other);
} finally {
  rmSync(folder, { recursive: true });
}

function installed(): string | null {
  const { status } = spawnSync("npm", ["install", "--prefix", folder, "--no-audit", "--no-fund", "node@24"], {
    stdio: "ignore",
  });
  const binary = join(folder, "node_modules/node/bin/node");
  return status === 0 && spawnSync(binary, ["--version"]).status === 0 ? binary : null;
}

function foundBy(node: string, given: unknown): Found {
  const script = fileURLToPath(new URL("print-digests.ts", import.meta.url));
  const { status, stdout, stderr } = spawnSync(node, ["--import", "tsx", script], {
    input: JSON.stringify(given),
    encoding: "utf8",
    maxBuffer: 1e9,
  });
  if (status !== 0) throw new Error(stderr);
  return JSON.parse(stdout) as Found;
}

function recordsOf({ found }: Found): Record<string, SealedRecord> {
  return Object.fromEntries(Object.entries(found).map(([name, { record }]) => [name, record]));
}

function compare(other: string): void {
  const ofOther = recordsOf(foundBy(other, {}));
  const here = foundBy(process.execPath, ofOther);
  const there = foundBy(other, recordsOf(here));
  for (const [name, mine] of Object.entries(here.found)) {
    const theirs = there.found[name]!;
    const same = mine.digests.record === theirs.digests.record;
    say(
      `${name}: ${here.runtime} ${mine.digests.record.slice(0, 16)}, ${there.runtime} ${theirs.digests.record.slice(0, 16)}, ${same ? "the same document" : "other last digits"}`,
    );
    const holds = [mine, theirs].every(({ intact, reproduced }) => intact && reproduced);
    say(`  each verifies the other's: ${holds ? "intact and reproduced" : "NO"}`);
    if (!holds) process.exitCode = 1;
  }
}
