import { execFile } from "node:child_process";
import { createHash } from "node:crypto";
import { readFileSync, rmSync } from "node:fs";
import { delimiter, join } from "node:path";
import { promisify } from "node:util";
import canonicalize from "canonicalize";
import { beforeAll, describe, expect, it } from "vitest";
import { demoRequest } from "../../sdk/examples/demo-request.ts";
import { CAUTIONS } from "../../services/contract/cautions.ts";
import { ROOT, requireBuilt } from "../running-service.ts";

/** What `npm run demo` runs once everything is built. It ends only when the service has let go of the output too. */
function demo(environment: Record<string, string> = {}) {
  requireBuilt("dist/services/http/main.js");
  const { scripts } = JSON.parse(readFileSync(join(ROOT, "package.json"), "utf8")) as {
    scripts: { demo: string };
  };
  const path = `${join(ROOT, "node_modules/.bin")}${delimiter}${process.env.PATH}`;
  return promisify(execFile)("sh", ["-c", scripts.demo], {
    cwd: ROOT,
    env: { ...process.env, PATH: path, ...environment },
  });
}

const written = (name: string) => readFileSync(join(ROOT, "demo-out", name), "utf8");

describe("the demo", () => {
  let printed = "";
  beforeAll(async () => {
    rmSync(join(ROOT, "demo-out"), { recursive: true, force: true });
    const { stdout, stderr } = await demo();
    expect(stderr).toBe("");
    printed = stdout;
  });

  const section = (title: string) => printed.split(`\n${title}`)[1]!.split("\n\n")[0]!;

  /*
   * By hand: 65.0386/1.2 = 54.1988, 1.2 being the limit on a product over its cutoff (common practice, no source). At m/z
   * 123.18 the tune report gives a width of 0.70 + 0.01 (123.18 − 59.05)/(175.12 − 59.05) = 0.7055, of which 0.15 (common
   * practice, no source) is 0.1058 on either side of 123.0665; the set value is 0.1135 off.
   */
  it("finds the one product that the cell loses, and from which cutoff on it would not", () => {
    expect(section("Fail")).toBe(` (1)
  SDZ-2 in q2: product-above-cutoff
    m/z 65.0386 is below the cutoff of q2, m/z 70: the ion is lost there.
    Passes if /instrument/stages/1/rf/mz is at most 54.1988.`);
  });

  it("finds the one set m/z that was typed a little off, and where it would not be", () => {
    expect(section("Caution").replaceAll(/\s+/g, " ")).toMatch(
      /^ \(1\) TMP-2 in Q3: set-mz Set m\/z 123.18 is 0.114 from the ion's m\/z 123.0665 in Q3, 0.16 of the window's width 0.706. .* Passes if \/method\/acquisition\/5\/setProductMz is from 122.961 to 123.172.$/,
    );
  });

  it("prints the verdict first, and says what was not shown and what that would take", () => {
    expect(printed.replaceAll(/\s+/g, " ")).toContain(
      "Verdict: FAIL. At least one required check missed its limit; not shown: ",
    );
    expect(section("Not shown")).toContain(
      "\n  cell-well-depth\n    /instrument/stages/1/maxRadialEnergy_eVPerCharge\n",
    );
    expect(printed).toContain(CAUTIONS[0]);
    for (const line of printed.split("\n")) expect(line.length).toBeLessThanOrEqual(100);
  });

  it("writes the report, with the verdict, every acquisition and the cautions", () => {
    const report = written("report.html").replaceAll("&#39;", "'");
    for (const { id } of demoRequest.method.acquisition) expect(report).toContain(id);
    for (const caution of CAUTIONS) expect(report).toContain(caution);
    expect(report).toContain("At least one required check missed its limit");
  });

  it("posts the record back, which holds; the demo has no key to seal it with", () => {
    expect(section("Written")).toMatch(
      /record\.json +the record; posted back: intact, reproduced, seal absent$/,
    );
  });

  it("writes the record of exactly this request, under its digest", () => {
    const record = JSON.parse(written("record.json"));
    expect(record.input).toEqual(demoRequest);
    expect(record.result.verdict).toBe("fail");
    expect(record.digests.input).toBe(createHash("sha256").update(canonicalize(demoRequest)!).digest("hex"));
  });

  it("fails where the service does not start, and lets the service say why", async () => {
    await expect(demo({ RODSET_PROT: "8080" })).rejects.toMatchObject({
      code: 1,
      stderr: expect.stringMatching(/RODSET_PROT is no setting[\s\S]*The service ended before it listened\./),
    });
  });
});
