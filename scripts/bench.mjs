import { spawn } from "node:child_process";
import { build, installPackages, requireNode, root, run } from "./setup.mjs";

/** `npm run bench`: a production server on a database of its own, then every measurement in one run. */
requireNode();
installPackages();
build();

const port = process.env.PORT ?? "4300";
const base = `http://localhost:${port}`;
const server = spawn(process.execPath, ["scripts/test-server.mjs"], {
  cwd: root,
  env: { ...process.env, PORT: port },
  stdio: ["ignore", "ignore", "inherit"],
});

async function isUp() {
  try {
    return (await fetch(`${base}/api/health`)).ok;
  } catch {
    return false;
  }
}

async function publicVersion() {
  const { items } = await (await fetch(`${base}/api/calculations?scope=public`)).json();
  const found = items.find((item) => item.latestVersion !== null);
  return `/c/${found.id}/v/${found.latestVersion}`;
}

try {
  while (!(await isUp())) await new Promise((resolve) => setTimeout(resolve, 300));
  run(process.execPath, ["--import", "tsx", "tests/bench/main.ts", base, await publicVersion()]);
} catch (error) {
  console.error(error.message);
  process.exitCode = 1;
} finally {
  server.kill("SIGTERM");
}
