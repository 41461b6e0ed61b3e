import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { copyFileSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";
import { afterAll, beforeAll, describe, expect, it } from "vitest";

const ROOT = fileURLToPath(new URL("../../", import.meta.url));

const REFUSED: readonly [folder: string, specifier: string, message: string][] = [
  ["services/physics", "../contract/drive.ts", "services/physics imports nothing but itself"],
  ["services/physics", "../review/finding.ts", "services/physics imports nothing but itself"],
  ["services/physics/deep", "../../http/app.ts", "services/physics imports nothing but itself"],
  ["services/physics", "zod", "services/physics imports nothing but itself"],
  ["services/physics", "node:fs", "services/physics imports nothing but itself"],
  ["services/contract", "../review/finding.ts", "services/contract imports physics and zod only"],
  ["services/contract", "../http/app.ts", "services/contract imports physics and zod only"],
  ["services/review", "../http/app.ts", "services/review knows no HTTP"],
  ["services/review/checks", "express", "services/review knows no HTTP"],
  ["services/http/endpoints", "express", "An endpoint is a value"],
  ["sdk/src", "../../services/contract/drive.ts", "The SDK knows the service only through"],
  ["sdk/examples", "../../services/http/app.ts", "The SDK knows the service only through"],
];

const ALLOWED: readonly [folder: string, specifier: string][] = [
  ["services/review", "../contract/drive.ts"],
  ["services/review", "../physics/passband.ts"],
  ["services/contract", "../physics/transit.ts"],
  ["services/http/endpoints", "../../review/sign-off.ts"],
];

const POWERS: readonly [folder: string, source: string, refused: boolean][] = [
  ["services/physics", "export const square = (x: number) => x ** 2;", true],
  ["services/review/checks", "export const square = (x: number) => Math.pow(x, 2);", true],
  ["services/review", "export const square = (x: number) => x * x;", false],
];

let planted = "";
const complaints = new Map<string, string>();
const importing = (specifier: string) =>
  `import { thing } from "${specifier}";\nexport const other = thing;\n`;
const nameOf = (folder: string, source: string) =>
  `${folder}/planted-${createHash("sha256").update(source).digest("hex").slice(0, 12)}.ts`;

/** The committed lint rules, run once over planted files in a copy of the tree's shape. */
beforeAll(() => {
  planted = mkdtempSync(join(tmpdir(), "planted-"));
  for (const rules of ["biome.json", "no-power.grit"]) copyFileSync(join(ROOT, rules), join(planted, rules));
  const sources = [
    ...REFUSED.map(([folder, specifier]) => [folder, importing(specifier)] as const),
    ...ALLOWED.map(([folder, specifier]) => [folder, importing(specifier)] as const),
    ...POWERS.map(([folder, source]) => [folder, source] as const),
  ];
  for (const [folder, source] of sources) {
    const path = join(planted, nameOf(folder, source));
    mkdirSync(dirname(path), { recursive: true });
    writeFileSync(path, source);
  }
  const { stdout, stderr } = spawnSync(
    join(ROOT, "node_modules/.bin/biome"),
    ["lint", "--vcs-enabled=false", "--reporter=json", "--max-diagnostics=none", "."],
    { cwd: planted, encoding: "utf8" },
  );
  const report = JSON.parse(stdout || stderr) as {
    diagnostics: { category: string; message: unknown; location: { path: string | { file: string } } }[];
  };
  for (const { category, message, location } of report.diagnostics) {
    const path = typeof location.path === "string" ? location.path : location.path.file;
    complaints.set(path, `${complaints.get(path) ?? ""}${category} ${JSON.stringify(message)}\n`);
  }
});

afterAll(() => rmSync(planted, { recursive: true }));

const complaintsOf = (folder: string, source: string) => complaints.get(nameOf(folder, source)) ?? "";

describe("an import against the arrows is refused", () => {
  it.each(REFUSED)("%s may not import %s", (folder, specifier, message) => {
    expect(complaintsOf(folder, importing(specifier))).toContain(message);
  });

  it.each(ALLOWED)("%s may import %s", (folder, specifier) => {
    expect(complaintsOf(folder, importing(specifier))).not.toContain("noRestrictedImports");
  });
});

describe("exponentiation is refused where records must reproduce", () => {
  it.each(POWERS)("%s: %s", (folder, source, refused) => {
    const message = "Math.pow and ** differ by an ulp";
    if (refused) expect(complaintsOf(folder, source)).toContain(message);
    else expect(complaintsOf(folder, source)).not.toContain(message);
  });
});
