import { readdirSync, readFileSync } from "node:fs";
import { SIGN_OFF_EXAMPLE } from "../../services/http/examples/sign-off.ts";
import { recordedSignOff } from "../../services/review/record/record.ts";
import type { Engine, SealedRecord } from "../../services/review/record/record-schema.ts";
import type { SignOffRequest } from "../../services/review/sign-off-schema.ts";
import { requestOf } from "../review/record/recorded-method.ts";

/** What the stored records are about: one small method, and one in which every part of the physics has its say. */
const REQUESTS: Readonly<Record<string, SignOffRequest>> = {
  "one-transition": SIGN_OFF_EXAMPLE,
  "forty-transitions": requestOf(40),
};

export function madeRecords(engine: Engine): [name: string, record: SealedRecord][] {
  return Object.entries(REQUESTS).map(([name, request]) => [name, recordedSignOff(request, engine).record]);
}

/** A stored file with the public keys that verify it. */
export interface Stored {
  readonly file: string;
  readonly record: Record<string, unknown>;
  readonly keySet: string;
}

/** Every record under a folder with one subfolder for each format: what was stored once must verify from then on. */
export function storedRecords(folder: URL): Stored[] {
  return readdirSync(folder, { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .flatMap(({ name: format }) => {
      const of = new URL(`${format}/`, folder);
      const keySet = readFileSync(new URL("keys.json", of), "utf8");
      return readdirSync(of)
        .filter((file) => file.endsWith(".json") && file !== "keys.json")
        .map((file) => ({
          file: `${format}/${file}`,
          record: JSON.parse(readFileSync(new URL(file, of), "utf8")),
          keySet,
        }));
    });
}
