import { defineConfig } from "tsup";

export default defineConfig({
  entry: ["src/index.ts", "src/record.ts"],
  format: ["esm", "cjs"],
  target: "node20",
  dts: true,
  clean: true,
  silent: true,
});
