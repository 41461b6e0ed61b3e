/** Prints the digests of the records as the runtime at hand makes them, and whether it reproduces those on stdin. */
import { readFileSync } from "node:fs";
import { ENGINE } from "../../services/http/engine.ts";
import { verifyContent } from "../../services/review/record/verification.ts";
import { madeRecords } from "./made-record.ts";

const given = JSON.parse(readFileSync(0, "utf8")) as Record<string, Record<string, unknown>>;
const made = madeRecords(ENGINE);
const found = made.map(([name, record]) => {
  const { intact, reproduced } = verifyContent({ record: given[name] ?? {} }, ENGINE);
  return [name, { digests: record.digests, intact, reproduced, record }];
});
process.stdout.write(JSON.stringify({ runtime: process.version, found: Object.fromEntries(found) }));
