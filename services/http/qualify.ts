import { mkdir, writeFile } from "node:fs/promises";
import { sealedSelfCheck, selfCheck } from "../review/self-check/self-check.ts";
import { selfCheckSheet } from "../review/self-check/sheet.ts";
import { ENGINE } from "./engine.ts";
import { readSealing } from "./seal-key-files.ts";
import { readSettings } from "./settings.ts";

/** Where the sheets are written, in the working directory. */
const FOLDER = "qualification-out";

try {
  const { key, host, now } = await readSealing(readSettings(process.env));
  const date = now();
  const answer = await sealedSelfCheck(selfCheck(ENGINE), host, key, () => date);
  const sheet = selfCheckSheet(answer, date);
  // Colons are no part of file names on every system.
  const name = `${FOLDER}/self-check-${date.toISOString().replaceAll(":", "").replace(/\.\d+/, "")}`;
  await mkdir(FOLDER, { recursive: true });
  await writeFile(`${name}.txt`, sheet, { flag: "wx" });
  await writeFile(`${name}.json`, `${JSON.stringify({ date: date.toISOString(), ...answer }, null, 2)}\n`, {
    flag: "wx",
  });
  process.stdout.write(`${sheet}\nWritten: ${name}.txt and ${name}.json\n`);
  process.exitCode = answer.outcome === "pass" ? 0 : 1;
} catch (error) {
  process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n`);
  process.exitCode = 2;
}
