import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { readSettings, SettingsError } from "../../services/http/settings.ts";
import { VERSION } from "../../services/http/version.ts";

function complaintAbout(environment: Record<string, string>): string {
  try {
    readSettings(environment);
  } catch (error) {
    expect(error).toBeInstanceOf(SettingsError);
    return (error as SettingsError).message;
  }
  throw new Error("The settings were accepted.");
}

describe("the settings", () => {
  it("are safe on a laptop when nothing is set", () => {
    expect(readSettings({ PATH: "/bin", HOME: "/root" })).toEqual({
      host: "127.0.0.1",
      port: 8080,
      adminPort: 8081,
      logLevel: "info",
      bodyLimit_kB: 512,
      drain_s: 10,
      sealKeyFile: "none",
      sealTrustedKeysFile: "none",
    });
  });

  it("are read from the variables", () => {
    const environment = {
      RODSET_HOST: "0.0.0.0",
      RODSET_PORT: "0",
      RODSET_ADMIN_PORT: "65535",
      RODSET_LOG_LEVEL: "silent",
      RODSET_BODY_LIMIT_KB: "16384",
      RODSET_DRAIN_S: "0",
      RODSET_SEAL_KEY_FILE: "/run/secrets/seal.pem",
      RODSET_SEAL_TRUSTED_KEYS_FILE: "trusted.json",
    };
    expect(readSettings(environment)).toEqual({
      host: "0.0.0.0",
      port: 0,
      adminPort: 65535,
      logLevel: "silent",
      bodyLimit_kB: 16384,
      drain_s: 0,
      sealKeyFile: "/run/secrets/seal.pem",
      sealTrustedKeysFile: "trusted.json",
    });
  });

  it.each([
    ["RODSET_PORT", "65536", "a whole number from 0 to 65535"],
    ["RODSET_PORT", "-1", "a whole number from 0 to 65535"],
    ["RODSET_PORT", "8080.0", "a whole number from 0 to 65535"],
    ["RODSET_PORT", "0x50", "a whole number from 0 to 65535"],
    ["RODSET_ADMIN_PORT", "", "a whole number from 0 to 65535"],
    ["RODSET_HOST", "", "a host name or an IP address"],
    ["RODSET_LOG_LEVEL", "INFO", "one of debug, info, warn, error, silent"],
    ["RODSET_BODY_LIMIT_KB", "0", "a whole number from 1 to 16384"],
    ["RODSET_DRAIN_S", "601", "a whole number from 0 to 600"],
    ["RODSET_SEAL_KEY_FILE", "", "the path of a file, or none"],
    ["RODSET_SEAL_TRUSTED_KEYS_FILE", "a\nb", "the path of a file, or none"],
  ])("name %s when it is %j, the format it wants, and where to read", (name, text, format) => {
    expect(complaintAbout({ [name]: text })).toBe(
      `${name} is ${JSON.stringify(text)}; it must be ${format}.\nThe variables are described in README.md, section Settings.`,
    );
  });

  it("take a variable they do not know for a slip of the pen", () => {
    expect(complaintAbout({ RODSET_PROT: "80" })).toMatch(
      /^RODSET_PROT is no setting; there are RODSET_HOST, RODSET_PORT, /,
    );
  });

  it("name everything that is wrong at once", () => {
    expect(complaintAbout({ RODSET_PORT: "x", RODSET_DRAIN_S: "y", RODSET_X: "z" }).split("\n")).toHaveLength(
      4,
    );
  });

  it("stand in the README, every one with its default", () => {
    const readme = readFileSync("README.md", "utf8");
    const section = readme.slice(readme.indexOf("## Settings"));
    const rows = [...section.matchAll(/^\| `(RODSET_\w+)` \| `([^`]+)` \|/gm)];
    expect(rows.length).toBeGreaterThanOrEqual(6);
    const documented = Object.fromEntries(rows.map(([, name, fallback]) => [name!, fallback!]));
    expect(readSettings(documented)).toEqual(readSettings({}));
  });
});

it("answers with the version of the package", () => {
  expect(VERSION).toBe(JSON.parse(readFileSync("package.json", "utf8")).version);
});
