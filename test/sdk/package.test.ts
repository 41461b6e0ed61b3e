import { spawnSync } from "node:child_process";
import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { homedir, hostname, tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { README_SETTING } from "../reference/readme-setting.ts";
import { ROOT, type RunningService, requireBuilt, startService } from "../running-service.ts";

/** The package as it would be published, installed where nothing else is. */
let folder: string;
let tarball: string;
let service: RunningService;

function run(command: string, args: readonly string[]): string {
  const { status, stdout, stderr } = spawnSync(command, args, { cwd: folder, encoding: "utf8" });
  if (status !== 0) throw new Error(`${command} ${args.join(" ")} ended with ${status}:\n${stdout}${stderr}`);
  return stdout;
}

const tool = (name: string, ...args: string[]) => run(join(ROOT, "node_modules/.bin", name), args);
const write = (name: string, text: string) => writeFileSync(join(folder, name), text);

beforeAll(async () => {
  requireBuilt("sdk/dist/index.js");
  service = await startService();
  folder = mkdtempSync(join(tmpdir(), "rodset-sdk-"));
  write("package.json", '{ "private": true }');
  const packed = JSON.parse(run("npm", ["pack", join(ROOT, "sdk"), "--json"])) as [{ filename: string }];
  tarball = join(folder, packed[0].filename);
  run("npm", ["install", "--prefer-offline", "--no-save", tarball]);
});

afterAll(async () => {
  if (folder !== undefined) rmSync(folder, { recursive: true });
  await service?.stop();
});

const installed = () => join(folder, "node_modules/@rodset/sdk");

describe("the tarball", () => {
  it("holds what is built, the manifest, the licence and the page, and nothing else", () => {
    const files = readdirSync(installed(), { recursive: true, withFileTypes: true })
      .filter((entry) => entry.isFile())
      .map((entry) => join(entry.parentPath, entry.name).slice(installed().length + 1))
      .sort();
    expect(files.filter((file) => !/^dist\/[a-z-]+\.(js|cjs|d\.ts|d\.cts)$/.test(file))).toEqual([
      "LICENSE",
      "README.md",
      "package.json",
    ]);
    expect(files).toContain("dist/index.js");
    expect(files).toContain("dist/index.cjs");
  });

  it("names no place of the machine that built it, and nothing of the service's sources", () => {
    for (const entry of readdirSync(installed(), { recursive: true, withFileTypes: true })) {
      if (!entry.isFile()) continue;
      const text = readFileSync(join(entry.parentPath, entry.name), "utf8");
      for (const trace of [
        ROOT,
        homedir(),
        hostname(),
        tmpdir(),
        "file://",
        "sourceMappingURL",
        "services/",
      ]) {
        expect(text.includes(trace), `${entry.name} names ${trace}`).toBe(false);
      }
    }
  });

  it("has a manifest that means the same outside the workspace", () => {
    const manifest = JSON.parse(readFileSync(join(installed(), "package.json"), "utf8")) as Record<
      string,
      unknown
    >;
    expect(manifest).not.toHaveProperty("devDependencies");
    expect(manifest).not.toHaveProperty("private");
    expect(manifest).not.toHaveProperty("workspaces");
    const { scripts, ...entries } = manifest;
    expect(JSON.stringify(entries)).not.toMatch(/workspace:|file:|src\/|\.\.\//);
    // A script of these names would run on the machine of whoever installs the package.
    expect(Object.keys(scripts ?? {})).not.toEqual(
      expect.arrayContaining([expect.stringMatching(/install$|^prepare$/)]),
    );
  });

  it("carries the licence of the project", () => {
    expect(readFileSync(join(installed(), "LICENSE"), "utf8")).toBe(
      readFileSync(join(ROOT, "LICENSE"), "utf8"),
    );
  });

  it("satisfies the judges of packages: types for every way of loading it, a manifest without mistakes", () => {
    expect(tool("attw", tarball, "--no-color", "--no-emoji")).toMatch(/No problems found/);
    expect(tool("publint", tarball, "--strict")).toMatch(/All good!/);
  });
});

const CALL = `
const { passbands } = await createClient({ baseUrl: process.argv[2]! }).passband({
  rodSet: { fieldRadius_mm: 4, frequency_MHz: 1.2 },
  drive: {
    rf: { volts: 1663.4998, as: "zero-to-peak", between: "pole-and-ground" },
    dc: { volts: 279.0608, between: "pole-and-ground" },
  },
});
console.log(JSON.stringify([passbands[0]!.mzLow, passbands[0]!.mzHigh]));
`;

function expectReference(printed: string): void {
  const [mzLow, mzHigh] = JSON.parse(printed) as [number, number];
  expect(Math.abs(mzLow / README_SETTING.mzLow - 1)).toBeLessThan(2e-15);
  expect(Math.abs(mzHigh / README_SETTING.mzHigh - 1)).toBeLessThan(2e-15);
}

/** Compiles with everything strict, the declarations of the package included where they can be read alone. */
function compile(files: readonly string[], options: Record<string, unknown>): void {
  const compilerOptions = {
    target: "ES2023",
    strict: true,
    exactOptionalPropertyTypes: true,
    noUncheckedIndexedAccess: true,
    skipDefaultLibCheck: true,
    ...options,
  };
  write("tsconfig.json", JSON.stringify({ compilerOptions, files }));
  tool("tsc", "--project", folder);
}

describe("the installed package", () => {
  it("is called from TypeScript, as an ES module and as CommonJS", () => {
    write("module.mts", `import { createClient } from "@rodset/sdk";\n${CALL}`);
    write("common.cts", `import { createClient } from "@rodset/sdk";\nvoid (async () => {${CALL}})();\n`);
    compile(["module.mts", "common.cts"], {
      lib: ["ES2023"],
      module: "NodeNext",
      typeRoots: [join(ROOT, "node_modules/@types")],
      types: ["node"],
      skipLibCheck: true,
    });
    expectReference(run("node", ["module.mjs", service.address]));
    expectReference(run("node", ["common.cjs", service.address]));
  });

  it("is called from a plain CommonJS script", () => {
    const call = CALL.replaceAll("!", "");
    write("plain.cjs", `const { createClient } = require("@rodset/sdk");\n(async () => {${call}})();\n`);
    expectReference(run("node", ["plain.cjs", service.address]));
  });

  it("compiles for a browser, without the types of Node.js, and refuses a voltage without its convention", () => {
    write(
      "browser.ts",
      `import { createClient } from "@rodset/sdk";
const client = createClient({ baseUrl: location.origin });
const rodSet = { fieldRadius_mm: 4, frequency_MHz: 1.2 };
export const window = client.passband({ rodSet, drive: { rf: { volts: 1, as: "rms", between: "pole-and-pole" } } });
// @ts-expect-error how the volts are read is missing
export const refused = client.passband({ rodSet, drive: { rf: { volts: 1, as: "rms" } } });
`,
    );
    compile(["browser.ts"], {
      lib: ["ES2023", "DOM"],
      types: [],
      module: "ESNext",
      moduleResolution: "Bundler",
    });
  });

  it("keeps the sentence of each operation for the editor", () => {
    expect(readFileSync(join(installed(), "dist/index.d.ts"), "utf8")).toContain(
      "/** The m/z that a mass filter lets through: `POST /v1/passband` */",
    );
  });
});
