/**
 * Makes the records that are kept in this folder for good: `npx tsx test/records/make.ts`, once for each version whose
 * records must verify from then on. The key exists in this process only: its public part is stored, its private part is
 * never written anywhere. What is there already is left alone, since a record that is made anew proves no ageing.
 */
import { generateKeyPairSync } from "node:crypto";
import { existsSync, mkdirSync, writeFileSync } from "node:fs";
import { pathToFileURL } from "node:url";
import { ENGINE } from "../../services/http/engine.ts";
import { RECORD_FORMAT } from "../../services/review/record/record-schema.ts";
import { readSealingKey } from "../../services/review/record/seal-keys.ts";
import { sealedRecord } from "../../services/review/record/sealed-record.ts";
import { madeRecords } from "./made-record.ts";

const [target] = process.argv.slice(2);
const home = target === undefined ? new URL("./", import.meta.url) : pathToFileURL(`${target}/`);
const folder = new URL(`format-${RECORD_FORMAT}/`, home);
if (existsSync(folder)) {
  process.stderr.write(`format-${RECORD_FORMAT} is there already and stays as it is.\n`);
  process.exit(1);
}
mkdirSync(folder, { recursive: true });
const jwk = generateKeyPairSync("ed25519").privateKey.export({ format: "jwk" });
const key = await readSealingKey(JSON.stringify(jwk));
const write = (name: string, value: unknown) =>
  writeFileSync(new URL(name, folder), `${JSON.stringify(value, null, 2)}\n`, { flag: "wx" });
write("keys.json", { keys: [key.published] });
for (const [name, record] of madeRecords(ENGINE)) {
  write(`${name}.json`, await sealedRecord(record, key, () => new Date()));
}
