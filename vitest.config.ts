import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

export default defineConfig({
  resolve: { alias: { "@rodset/sdk": fileURLToPath(new URL("./sdk/src/index.ts", import.meta.url)) } },
  test: {
    include: ["test/**/*.test.ts"],
    setupFiles: ["test/seed.ts"],
    testTimeout: 60_000,
    hookTimeout: 120_000,
    coverage: { include: ["services/**", "sdk/src/**"], exclude: ["sdk/src/generated/**"] },
  },
});
