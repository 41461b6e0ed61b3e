import { describe, expect, it } from "vitest";
import { VERSION } from "../../services/http/version.ts";
import { read, tableRows } from "./code-blocks.ts";

interface Manifest {
  readonly version: string;
  readonly license: string;
  readonly dependencies?: Record<string, string>;
  readonly devDependencies?: Record<string, string>;
}
const manifest = (path: string) => JSON.parse(read(path)) as Manifest;
const root = manifest("package.json");
const sdk = manifest("sdk/package.json");
const dependenciesOf = ({ dependencies, devDependencies }: Manifest) => ({
  ...dependencies,
  ...devDependencies,
});

describe("the manifests", () => {
  it("agree on one version with the service, the contract and the lockfile", () => {
    const { packages } = JSON.parse(read("package-lock.json")) as { packages: Record<string, Manifest> };
    const { info } = JSON.parse(read("openapi/openapi.json")) as { info: Manifest };
    expect([sdk.version, VERSION, info.version, packages[""]!.version, packages.sdk!.version]).toEqual(
      Array.from({ length: 5 }, () => root.version),
    );
  });

  it("name the licence that is there", () => {
    expect([root.license, sdk.license]).toEqual(["MIT", "MIT"]);
    expect(read("LICENSE")).toMatch(/^MIT License\n/);
  });

  it("take exact versions, the same in both", () => {
    const all = [...Object.entries(dependenciesOf(root)), ...Object.entries(dependenciesOf(sdk))];
    expect(all.filter(([, version]) => !/^\d+\.\d+\.\d+$/.test(version))).toEqual([]);
    for (const [name, version] of Object.entries(dependenciesOf(sdk))) {
      expect([name, dependenciesOf(root)[name] ?? version]).toEqual([name, version]);
    }
  });

  it("give every dependency its sentence in DEVELOPERS.md, and no sentence to what is gone", () => {
    const rows = tableRows("DEVELOPERS.md", "package");
    const explained = rows.flatMap(([names]) => names!.split(", "));
    expect(explained.sort()).toEqual(Object.keys({ ...dependenciesOf(root), ...dependenciesOf(sdk) }).sort());
    for (const [names, reason] of rows) expect(reason, names).toMatch(/\w+ \w+/);
  });
});

describe("the lockfile", () => {
  it("names no host, and the settings keep it so", () => {
    expect(read(".npmrc").split("\n")).toContain("omit-lockfile-registry-resolved=true");
    expect(read("package-lock.json")).not.toMatch(/"resolved": *"[a-z+]+:/);
  });
});
