import { spawn } from "node:child_process";
import { build, giveUp, installPackages, requireNode, root, run } from "./setup.mjs";

/** `npm start`: everything from a clean clone to a served product with its demo. */
requireNode();
installPackages();
build();

const port = process.env.PORT ?? "3000";
// Unless this is a deployment with an address of its own, mail is kept on a page and the demo made.
const local = process.env.APP_URL === undefined ? { LOCAL: "1" } : {};
const env = { ...process.env, ...local, PORT: port, NODE_ENV: "production" };
run(process.execPath, ["--conditions=react-server", "--import", "tsx", "scripts/migrate.ts"], env);
const wantsDemo = env.LOCAL === "1" || env.SEED_DEMO === "1";

// A local start shows mail to whoever reaches it, so only this machine does.
const host = env.LOCAL === "1" ? ["-H", "127.0.0.1"] : [];
const server = spawn(
  process.execPath,
  ["node_modules/next/dist/bin/next", "start", "-p", port, ...host],
  {
    cwd: root,
    env,
    stdio: ["ignore", "ignore", "inherit"],
  },
);
const stop = () => server.kill("SIGTERM");
process.on("SIGINT", stop);
process.on("SIGTERM", stop);
server.on("exit", (code) => process.exit(code ?? 0));

const waitMs = 500;
const mostTries = 120;

async function isUp() {
  try {
    return (await fetch(`http://localhost:${port}/api/health`)).ok;
  } catch {
    return false;
  }
}

for (let tries = 0; !(await isUp()); tries++) {
  if (tries === mostTries) {
    stop();
    giveUp(`The server did not come up on port ${port} within a minute.`);
  }
  await new Promise((resolve) => setTimeout(resolve, waitMs));
}
console.log(`Leading Order is served on http://localhost:${port}`);
if (wantsDemo)
  run(process.execPath, ["--conditions=react-server", "--import", "tsx", "scripts/seed.ts"], env);
if (env.LOCAL === "1")
  console.log(`Mail is not sent; it is shown on http://localhost:${port}/mail`);
