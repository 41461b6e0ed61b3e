import { readFileSync } from "node:fs";

/** A table of this directory; its header says how it was computed and in which units. */
export function readReference<T>(name: string): T {
  return JSON.parse(readFileSync(new URL(`./${name}.json`, import.meta.url), "utf8")) as T;
}
