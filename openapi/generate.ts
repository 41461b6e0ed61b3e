/** Writes everything that is made from the endpoints: `npm run generate`. */
import { mkdir, readFile, writeFile } from "node:fs/promises";
import { dirname } from "node:path";
import { fileURLToPath } from "node:url";
import { generatedFiles } from "./generated-files.ts";

for (const [path, text] of await generatedFiles()) {
  const file = fileURLToPath(new URL(`../${path}`, import.meta.url));
  // A file that is fresh is left alone, so that nothing that watches it is built again.
  if ((await readFile(file, "utf8").catch(() => null)) === text) continue;
  await mkdir(dirname(file), { recursive: true });
  await writeFile(file, text);
  console.log(`wrote ${path}`);
}
