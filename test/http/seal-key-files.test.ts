import { generateKeyPairSync } from "node:crypto";
import { chmodSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, describe, expect, it } from "vitest";
import { readSealing } from "../../services/http/seal-key-files.ts";
import { SettingsError } from "../../services/http/settings.ts";

const folder = mkdtempSync(join(tmpdir(), "seal-keys-"));
afterAll(() => rmSync(folder, { recursive: true }));

const { privateKey, publicKey } = generateKeyPairSync("ed25519");
const earlier = generateKeyPairSync("ed25519").publicKey.export({ format: "jwk" });
const pem = privateKey.export({ type: "pkcs8", format: "pem" }).toString();
const secret = privateKey.export({ format: "jwk" }).d!;

let files = 0;
function file(text: string, mode: number): string {
  const path = join(folder, `key-${files++}`);
  writeFileSync(path, text);
  chmodSync(path, mode);
  return path;
}

const read = (sealKeyFile: string, sealTrustedKeysFile = "none") =>
  readSealing({ sealKeyFile, sealTrustedKeysFile });

async function complaint(sealKeyFile: string, sealTrustedKeysFile = "none"): Promise<string> {
  const error = await read(sealKeyFile, sealTrustedKeysFile).catch((thrown: unknown) => thrown);
  expect(error).toBeInstanceOf(SettingsError);
  const { message } = error as SettingsError;
  expect(message).not.toContain(secret);
  expect(message).not.toContain("PRIVATE");
  return message;
}

describe("the keys of seals", () => {
  it("are none when the settings name none", async () => {
    expect(await read("none")).toMatchObject({ key: null, known: [] });
  });

  it.each([0o600, 0o400])("are read from a file of mode %o", async (mode) => {
    const { key, known } = await read(file(pem, mode));
    expect(known).toEqual([key!.published]);
    expect(key!.published.x).toBe(publicKey.export({ format: "jwk" }).x);
  });

  it("may stand in a JWK as well", async () => {
    const { key } = await read(file(JSON.stringify(privateKey.export({ format: "jwk" })), 0o600));
    expect(key!.published.x).toBe(publicKey.export({ format: "jwk" }).x);
  });

  it.each([0o640, 0o604, 0o644, 0o660, 0o602, 0o610])(
    "are refused from a file of mode %o, naming variable, problem and the wanted mode",
    async (mode) => {
      const path = file(pem, mode);
      expect(await complaint(path)).toBe(
        `RODSET_SEAL_KEY_FILE: the file ${JSON.stringify(path)} can be read or changed by others than its owner (mode ${mode.toString(8).padStart(4, "0")}); its mode must be 0600 or 0400.\nThe variables are described in README.md, section Settings.`,
      );
    },
  );

  it("of earlier generations stand behind the current one, each once", async () => {
    const set = { keys: [earlier, publicKey.export({ format: "jwk" })] };
    const { key, known } = await read(file(pem, 0o600), file(JSON.stringify(set), 0o644));
    expect(known.map(({ x }) => x)).toEqual([key!.published.x, earlier.x]);
  });

  it("name every file that is wrong at once", async () => {
    const complaints = await complaint(join(folder, "absent"), file("{}", 0o644));
    expect(complaints).toMatch(/^RODSET_SEAL_KEY_FILE: .*absent" cannot be opened \(ENOENT\)\.$/m);
    expect(complaints).toMatch(
      /^RODSET_SEAL_TRUSTED_KEYS_FILE: .* holds no JWK set of up to 100 Ed25519 keys\.$/m,
    );
  });

  it("are no folder, no huge file, no other text", async () => {
    expect(await complaint(folder)).toContain("is no regular file");
    expect(await complaint(file("x".repeat(70_000), 0o600))).toContain("is larger than 65536 bytes");
    expect(await complaint(file(`${pem.slice(0, 60)}`, 0o600))).toContain("holds no private key");
    expect(await complaint(file("", 0o600))).toContain("holds no private key");
  });
});
