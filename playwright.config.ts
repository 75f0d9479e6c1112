import { existsSync } from "node:fs";
import { defineConfig } from "@playwright/test";

const port = 4200;

/** Debian's Chromium; where its headless shell is there, that, which is the lighter of the two. */
const shell = "/usr/bin/chromium-headless-shell";
const chromium = existsSync(shell) ? shell : "/usr/bin/chromium";

/** Browser tests against a production build, with a database and mail of their own. */
export default defineConfig({
  testDir: "tests/e2e",
  outputDir: "test-results/e2e",
  timeout: 120_000,
  expect: { timeout: 20_000 },
  workers: 2,
  fullyParallel: true,
  reporter: [["list"], ["json"]],
  use: {
    baseURL: `http://localhost:${port}`,
    locale: "en-GB",
    timezoneId: "UTC",
    trace: "retain-on-failure",
    launchOptions: {
      executablePath: chromium,
      args: [
        "--no-sandbox",
        "--disable-gpu",
        "--disable-quic",
        "--no-first-run",
        "--disable-background-networking",
        "--disable-component-update",
        "--disable-sync",
      ],
    },
  },
  webServer: {
    command: "node scripts/test-server.mjs",
    url: `http://localhost:${port}/api/health`,
    timeout: 60_000,
    env: { PORT: String(port) },
  },
});
