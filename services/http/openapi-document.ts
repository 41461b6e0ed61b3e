import { readFileSync } from "node:fs";
import { createRequire } from "node:module";

/** The committed document, byte for byte; package.json maps the name to the file for sources and for dist alike. */
export function readOpenApiDocument(): Buffer {
  return readFileSync(createRequire(import.meta.url).resolve("#openapi.json"));
}
