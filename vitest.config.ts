import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const root = fileURLToPath(new URL(".", import.meta.url));

export default defineConfig({
  resolve: {
    alias: {
      "@": root.replace(/\/$/, ""),
      // The guard has no meaning outside a React server bundle.
      "server-only": fileURLToPath(new URL("tests/empty-module.ts", import.meta.url)),
    },
  },
  test: {
    env: { TZ: "UTC" },
    testTimeout: 30_000,
    hookTimeout: 60_000,
    include: ["tests/{unit,reference,security}/**/*.test.ts"],
    maxWorkers: 2,
  },
});
