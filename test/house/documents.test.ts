import { execFile } from "node:child_process";
import { existsSync, mkdirSync, mkdtempSync, rmSync, symlinkSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { promisify } from "node:util";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { VARIABLES } from "../../services/http/settings.ts";
import { README_SETTING } from "../reference/readme-setting.ts";
import { ROOT, type RunningService, requireBuilt, startService } from "../running-service.ts";
import { codeBlocks, read, tableRows } from "./code-blocks.ts";

const execute = promisify(execFile);
const WRITTEN_ADDRESS = "http://127.0.0.1:8080";
const PAGES = ["README.md", "sdk/README.md"] as const;

let service: RunningService;
let folder: string;

/** Every TypeScript block of the pages, compiled once in a folder where only the built SDK is installed. */
beforeAll(async () => {
  requireBuilt("sdk/dist/index.js");
  service = await startService();
  folder = mkdtempSync(join(tmpdir(), "rodset-documents-"));
  mkdirSync(join(folder, "node_modules/@rodset"), { recursive: true });
  symlinkSync(join(ROOT, "sdk"), join(folder, "node_modules/@rodset/sdk"));
  const files = PAGES.flatMap((page) =>
    codeBlocks(page, "ts").map((code, index) => {
      expect(code).toContain(WRITTEN_ADDRESS);
      const name = `${page.replaceAll(/\W/g, "-")}-${index}.mts`;
      writeFileSync(join(folder, name), code.replaceAll(WRITTEN_ADDRESS, service.address));
      return name;
    }),
  );
  const compilerOptions = {
    target: "ES2023",
    lib: ["ES2023"],
    module: "NodeNext",
    strict: true,
    noUncheckedIndexedAccess: true,
    skipLibCheck: true,
    typeRoots: [join(ROOT, "node_modules/@types")],
    types: ["node"],
  };
  writeFileSync(join(folder, "tsconfig.json"), JSON.stringify({ compilerOptions, files }));
  await execute(join(ROOT, "node_modules/.bin/tsc"), ["--project", folder]).catch(({ stdout }) => {
    throw new Error(`A block of the pages does not compile:\n${stdout}`);
  });
});

afterAll(async () => {
  if (folder !== undefined) rmSync(folder, { recursive: true });
  await service?.stop();
});

const runBlock = async (page: (typeof PAGES)[number], index: number) =>
  (await execute("node", [`${page.replaceAll(/\W/g, "-")}-${index}.mjs`], { cwd: folder })).stdout.trim();

function expectReadmeWindow(mzLow: number, mzHigh: number): void {
  expect(Math.abs(mzLow / README_SETTING.mzLow - 1)).toBeLessThan(2e-15);
  expect(Math.abs(mzHigh / README_SETTING.mzHigh - 1)).toBeLessThan(2e-15);
}

describe("README", () => {
  it("shows a first call with the SDK that compiles, runs and prints the reference window", async () => {
    expect(codeBlocks("README.md", "ts")).toHaveLength(1);
    const [mzLow, mzHigh, lostTo] = (await runBlock("README.md", 0)).split(" ");
    expectReadmeWindow(Number(mzLow), Number(mzHigh));
    expect(lostTo).toBe("x");
  });

  it("shows a curl call that gives the same window", async () => {
    const curl = codeBlocks("README.md", "sh").filter((block) => block.startsWith("curl"));
    expect(curl).toHaveLength(1);
    expect(curl[0]).toContain(WRITTEN_ADDRESS);
    const { stdout } = await execute("sh", ["-ec", curl[0]!.replaceAll(WRITTEN_ADDRESS, service.address)]);
    const { passbands } = JSON.parse(stdout) as { passbands: { mzLow: number; mzHigh: number }[] };
    expectReadmeWindow(passbands[0]!.mzLow, passbands[0]!.mzHigh);
  });

  it("promises two commands, which the gate runs, and the first call within thirty lines of them", () => {
    const [commands] = codeBlocks("README.md", "sh");
    const promised = commands!
      .trim()
      .split("\n")
      .map((line) => line.replace(/\s*#.*/, ""));
    expect(promised).toEqual(["npm ci && npm run demo", "npm cit"]);
    expect(read(".ci/run")).toMatch(/ npm cit$/m);
    expect(read(".ci/run")).toMatch(/ npm run demo$/m);
    const lines = read("README.md").split("\n");
    const line = (text: string) => lines.findIndex((candidate) => candidate.includes(text));
    expect(line("createClient(") - line("npm cit")).toBeLessThanOrEqual(30);
  });

  it("lists the settings that the service reads, with their defaults", () => {
    expect(tableRows("README.md", "variable")).toEqual(
      Object.entries(VARIABLES).map(([name, { fallback, means }]) => [name, fallback ?? "", means]),
    );
  });

  it("lists the requests that the service takes, and no others", () => {
    const { paths } = JSON.parse(read("openapi/openapi.json")) as { paths: Record<string, object> };
    const served = Object.entries(paths).flatMap(([path, methods]) =>
      Object.keys(methods).map((method) => `${method.toUpperCase()} ${path}`),
    );
    // The document describes the operations; where it stands itself is none.
    if (!served.includes("GET /openapi.json")) served.push("GET /openapi.json");
    const listed = tableRows("README.md", "request").flatMap(([requests]) => requests!.split(", "));
    expect(listed.sort()).toEqual(served.sort());
  });
});

describe("the page of the SDK", () => {
  it("shows calls that compile and run, the first with the reference window", async () => {
    expect(codeBlocks("sdk/README.md", "ts")).toHaveLength(2);
    const [mzLow, mzHigh] = (await runBlock("sdk/README.md", 0)).split(" ");
    expectReadmeWindow(Number(mzLow), Number(mzHigh));
    expect(await runBlock("sdk/README.md", 1)).toBe("");
  });
});

describe("every page", () => {
  it.each([...PAGES, "DEVELOPERS.md"])("%s names only scripts and files that exist", (page) => {
    const { scripts } = JSON.parse(read("package.json")) as { scripts: Record<string, string> };
    const named = [...read(page).matchAll(/npm run ([\w:-]+)|npm (start|test)\b/g)].map(
      ([, run, own]) => run ?? own!,
    );
    expect(named.filter((name) => !Object.hasOwn(scripts, name))).toEqual([]);
    const files = [...read(page).matchAll(/`((?:services|openapi|sdk|test|\.ci)\/[\w./-]+)`/g)].map(
      ([, path]) => path!,
    );
    expect(files.filter((path) => !existsSync(ROOT + path))).toEqual([]);
  });

  it("DEVELOPERS.md explains every script", () => {
    const { scripts } = JSON.parse(read("package.json")) as { scripts: Record<string, string> };
    for (const name of Object.keys(scripts).filter((script) => !/^(pre|post)/.test(script))) {
      expect(read("DEVELOPERS.md")).toMatch(new RegExp(`\`npm (run )?${name}\``));
    }
  });
});
