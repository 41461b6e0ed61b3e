import { readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { CAUTIONS } from "../../services/contract/cautions.ts";

const read = (path: string) => readFileSync(new URL(`../../${path}`, import.meta.url), "utf8");

describe("the cautions stand wherever these numbers could hurt someone", () => {
  it.each(CAUTIONS)("README: %s", (caution) => {
    expect(read("README.md")).toContain(caution);
  });

  it.each(CAUTIONS)("the OpenAPI description: %s", (caution) => {
    const { info } = JSON.parse(read("openapi/openapi.json")) as { info: { description: string } };
    expect(info.description).toContain(caution);
  });
});
