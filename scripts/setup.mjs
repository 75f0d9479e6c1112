import { execFileSync, spawnSync } from "node:child_process";
import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import path from "node:path";

/** What both commands need before anything else; plain Node, since nothing is installed yet. */
export const root = path.resolve(import.meta.dirname, "..");

/** Run a program in the project's folder, its output shown; throws when it fails. */
export function run(program, args, env = {}) {
  execFileSync(program, args, { cwd: root, stdio: "inherit", env: { ...process.env, ...env } });
}

/** Say what is missing, without a stack. */
export function giveUp(message) {
  console.error(message);
  process.exit(1);
}

export function requireNode() {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major > 20 || (major === 20 && minor >= 9)) return;
  giveUp(`Node 20.9 or newer is needed; this is ${process.versions.node}.`);
}

function isInstalled() {
  const installed = path.join(root, "node_modules", ".package-lock.json");
  const lock = path.join(root, "package-lock.json");
  return existsSync(installed) && statSync(installed).mtimeMs >= statSync(lock).mtimeMs - 1000;
}

/** Install the packages of the lock file where they are missing or older than it. */
export function installPackages() {
  if (isInstalled()) return;
  console.log("Installing packages…");
  const exact = spawnSync("npm", ["ci", "--no-audit", "--no-fund"], {
    cwd: root,
    stdio: "inherit",
  });
  // Some platforms lack an optional build that the lock names; a plain install leaves it out.
  if (exact.status !== 0) run("npm", ["install", "--no-audit", "--no-fund"]);
}

const sourceFolders = ["app", "components", "lib", "db", "public"];
const sourceFiles = [
  "package-lock.json",
  "next.config.ts",
  "proxy.ts",
  "instrumentation.ts",
  "tsconfig.json",
  "knexfile.ts",
];

function newest(place) {
  const full = path.join(root, place);
  if (!existsSync(full)) return 0;
  const stat = statSync(full);
  if (!stat.isDirectory()) return stat.mtimeMs;
  return Math.max(stat.mtimeMs, ...readdirSync(full).map((name) => newest(path.join(place, name))));
}

function isBuilt() {
  const built = path.join(root, ".next", "BUILD_ID");
  if (!existsSync(built) || !existsSync(path.join(root, "dist", "evaluator.cjs"))) return false;
  const since = statSync(built).mtimeMs;
  return [...sourceFolders, ...sourceFiles].every((place) => newest(place) <= since);
}

/** Make the production build, if its sources are newer than it. */
export function build() {
  if (isBuilt()) return;
  console.log("Building…");
  run(process.execPath, ["--import", "tsx", "scripts/build-evaluator.ts"]);
  run(process.execPath, ["node_modules/next/dist/bin/next", "build"], {
    NODE_ENV: "production",
    LOCAL: "1",
    NEXT_TELEMETRY_DISABLED: "1",
  });
}

export function packageVersion() {
  return JSON.parse(readFileSync(path.join(root, "package.json"), "utf8")).version;
}
