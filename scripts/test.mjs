import { spawnSync } from "node:child_process";
import { existsSync, mkdirSync, readFileSync, rmSync } from "node:fs";
import path from "node:path";
import { build, giveUp, installPackages, requireNode, root } from "./setup.mjs";

/**
 * `npm test`: installs what is missing, then every suite, each told by its own program; the last line
 * is the true total. `npm test -- unit e2e` runs only those suites.
 */
const reports = path.join(root, "test-results");

const debianPackages = {
  chromium: () => existsSync("/usr/bin/chromium"),
  "python3-astropy": () => hasModule("astropy"),
  "python3-scipy": () => hasModule("scipy"),
  "python3-uncertainties": () => hasModule("uncertainties"),
};

function hasModule(name) {
  return spawnSync("/usr/bin/python3", ["-c", `import ${name}`]).status === 0;
}

function installDebian() {
  const missing = Object.keys(debianPackages).filter((name) => !debianPackages[name]());
  if (missing.length === 0) return;
  if (process.getuid?.() !== 0) {
    giveUp(
      `Some Debian packages are missing. As root:\n  apt-get update && apt-get install -y ${missing.join(" ")}`,
    );
  }
  console.log(`Installing ${missing.join(", ")}…`);
  const env = { ...process.env, DEBIAN_FRONTEND: "noninteractive" };
  spawnSync("apt-get", ["update", "-qq"], { stdio: "inherit", env });
  const installed = spawnSync(
    "apt-get",
    ["install", "-y", "-qq", "--no-install-recommends", ...missing],
    {
      stdio: ["ignore", "ignore", "inherit"],
      env,
    },
  );
  if (installed.status !== 0) giveUp(`apt-get could not install ${missing.join(" ")}.`);
}

/** The lighter build of the browser: used where it can be had, and not missed where it cannot. */
function installHeadlessShell() {
  if (existsSync("/usr/bin/chromium-headless-shell") || process.getuid?.() !== 0) return;
  const env = { ...process.env, DEBIAN_FRONTEND: "noninteractive" };
  spawnSync(
    "apt-get",
    ["install", "-y", "-qq", "--no-install-recommends", "chromium-headless-shell"],
    {
      stdio: "ignore",
      env,
    },
  );
}

function execute(args, env = {}) {
  const done = spawnSync(process.execPath, args, {
    cwd: root,
    stdio: "inherit",
    env: { ...process.env, ...env },
  });
  return done.status === 0;
}

/** A tool without tests of its own counts as one. */
function tool(args) {
  return () => (execute(args) ? { passed: 1, failed: 0 } : { passed: 0, failed: 1 });
}

function readReport(file) {
  return existsSync(file) ? JSON.parse(readFileSync(file, "utf8")) : undefined;
}

function vitest(folder) {
  return () => {
    const file = path.join(reports, `${folder}.json`);
    const ok = execute([
      "node_modules/vitest/vitest.mjs",
      "run",
      `tests/${folder}`,
      "--reporter=default",
      "--reporter=json",
      `--outputFile.json=${file}`,
    ]);
    const report = readReport(file);
    if (!report) return { passed: 0, failed: 1 };
    const failed = report.numFailedTests;
    // A file that cannot be loaded fails without a test of its own.
    return { passed: report.numPassedTests, failed: ok || failed > 0 ? failed : 1 };
  };
}

function playwright() {
  build();
  const file = path.join(reports, "e2e.json");
  const ok = execute(["node_modules/@playwright/test/cli.js", "test"], {
    PLAYWRIGHT_JSON_OUTPUT_NAME: file,
  });
  const report = readReport(file);
  if (!report) return { passed: 0, failed: 1 };
  const { expected, unexpected, flaky } = report.stats;
  return { passed: expected, failed: ok ? unexpected + flaky : Math.max(1, unexpected + flaky) };
}

const suites = {
  lint: tool(["node_modules/@biomejs/biome/bin/biome", "check", "--error-on-warnings", "."]),
  types: tool(["node_modules/typescript/bin/tsc", "--noEmit", "-p", "."]),
  unit: vitest("unit"),
  reference: vitest("reference"),
  security: vitest("security"),
  e2e: playwright,
};

requireNode();
installPackages();
installDebian();
installHeadlessShell();
rmSync(reports, { recursive: true, force: true });
mkdirSync(reports, { recursive: true });
execute(["node_modules/next/dist/bin/next", "typegen"]);

const asked = process.argv.slice(2);
const unknown = asked.find((name) => !(name in suites));
if (unknown) giveUp(`There is no suite ${unknown}; there are ${Object.keys(suites).join(", ")}.`);
const totals = { passed: 0, failed: 0 };
for (const name of asked.length > 0 ? asked : Object.keys(suites)) {
  console.log(`\n— ${name}`);
  const { passed, failed } = suites[name]();
  console.log(`${name}: ${passed} passed, ${failed} failed`);
  totals.passed += passed;
  totals.failed += failed;
}
console.log(`\n${totals.passed} passed, ${totals.failed} failed`);
process.exitCode = totals.failed === 0 ? 0 : 1;
