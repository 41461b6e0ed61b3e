import { defineConfig } from "vitest/config";

export default defineConfig({
  resolve: { conditions: ["rodset-source"] },
  ssr: { resolve: { conditions: ["rodset-source", "node", "import", "default"] } },
  test: {
    include: ["test/**/*.test.ts"],
    testTimeout: 60_000,
    hookTimeout: 120_000,
    coverage: { include: ["services/**", "sdk/src/**"], exclude: ["sdk/src/generated/**"] },
  },
});
