import { type FileHandle, open } from "node:fs/promises";
import { readSealingKey, readTrustedKeys, SealKeyError } from "../review/record/seal-keys.ts";
import type { Host } from "../review/self-check/self-check-schema.ts";
import type { Sealing } from "./endpoint.ts";
import { type Settings, SettingsError } from "./settings.ts";

const HOST: Host = {
  runtime: "Node.js",
  version: process.version,
  architecture: process.arch,
  system: process.platform,
};

/** Stands in the settings for a file that was not given. */
const NONE = "none";

const LARGEST_FILE = 65_536;

/** Permission bits of group and others. */
const NOT_THE_OWNER = 0o077;

/**
 * The keys that the settings name, read once at the start. A private key that others than its owner can read could seal
 * in anybody's hands, so it is refused. An error names the variable and the problem and quotes nothing of a file.
 */
export async function readSealing({
  sealKeyFile,
  sealTrustedKeysFile,
}: Pick<Settings, "sealKeyFile" | "sealTrustedKeysFile">): Promise<Sealing> {
  const complaints: string[] = [];
  async function keysIn<Keys>(
    variable: string,
    path: string,
    access: "private" | "public",
    read: (text: string) => Promise<Keys>,
  ): Promise<Keys | null> {
    if (path === NONE) return null;
    try {
      return await read(await textOf(path, access));
    } catch (error) {
      if (!(error instanceof SealKeyError)) throw error;
      complaints.push(`${variable}: the file ${JSON.stringify(path)} ${error.message}.`);
      return null;
    }
  }
  const key = await keysIn("RODSET_SEAL_KEY_FILE", sealKeyFile, "private", readSealingKey);
  const trusted = await keysIn(
    "RODSET_SEAL_TRUSTED_KEYS_FILE",
    sealTrustedKeysFile,
    "public",
    readTrustedKeys,
  );
  if (complaints.length > 0) throw new SettingsError(complaints);
  const current = key === null ? [] : [key.published];
  const earlier = (trusted ?? []).filter(({ kid }) => kid !== key?.published.kid);
  return { key, known: [...current, ...earlier], host: HOST, now: () => new Date() };
}

async function textOf(path: string, access: "private" | "public"): Promise<string> {
  let file: FileHandle;
  try {
    file = await open(path, "r");
  } catch (error) {
    throw new SealKeyError(`cannot be opened (${(error as NodeJS.ErrnoException).code})`);
  }
  try {
    // Asking the open file and not the path: between two looks at a path another file can come to stand there.
    const status = await file.stat();
    if (!status.isFile()) throw new SealKeyError("is no regular file");
    const mode = status.mode & 0o777;
    if (access === "private" && (mode & NOT_THE_OWNER) !== 0) {
      const octal = mode.toString(8).padStart(4, "0");
      throw new SealKeyError(
        `can be read or changed by others than its owner (mode ${octal}); its mode must be 0600 or 0400`,
      );
    }
    if (status.size > LARGEST_FILE) throw new SealKeyError(`is larger than ${LARGEST_FILE} bytes`);
    return await file.readFile("utf8");
  } finally {
    await file.close();
  }
}
