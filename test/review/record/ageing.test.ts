import { execFileSync } from "node:child_process";
import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath, pathToFileURL } from "node:url";
import { afterAll, describe, expect, it } from "vitest";
import { ENGINE } from "../../../services/http/engine.ts";
import { readTrustedKeys } from "../../../services/review/record/seal-keys.ts";
import { verifyContent, verifySeal } from "../../../services/review/record/verification.ts";
import { type Stored, storedRecords } from "../../records/made-record.ts";

const HOME = new URL("../../records/", import.meta.url);
const folder = mkdtempSync(join(tmpdir(), "records-"));
afterAll(() => rmSync(folder, { recursive: true }));

async function expectToHold({ file, record, keySet }: Stored): Promise<void> {
  const content = verifyContent({ record }, ENGINE);
  expect(content.differences, file).toEqual([]);
  expect(content, file).toMatchObject({ intact: true, reproduced: true });
  expect(await verifySeal(record, content.recordDigest, await readTrustedKeys(keySet)), file).toMatchObject({
    seal: "valid",
  });
}

describe("records that were stored once", () => {
  const kept = storedRecords(HOME);
  it.skipIf(kept.length === 0)("hold from now on", async () => {
    for (const stored of kept) await expectToHold(stored);
  });

  it("are made by the script beside them, which leaves what is there alone", async () => {
    const make = () =>
      execFileSync(process.execPath, ["--import", "tsx", fileURLToPath(new URL("make.ts", HOME)), folder], {
        stdio: "pipe",
        encoding: "utf8",
      });
    make();
    const stored = storedRecords(pathToFileURL(`${folder}/`));
    expect(stored.map(({ file }) => file).sort()).toEqual([
      "format-1/forty-transitions.json",
      "format-1/one-transition.json",
    ]);
    for (const each of stored) {
      await expectToHold(each);
      expect(each.keySet).not.toContain('"d"');
    }
    expect(make).toThrow(/stays as it is/);
  });
});
