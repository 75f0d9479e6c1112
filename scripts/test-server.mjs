import { spawn } from "node:child_process";
import { rmSync } from "node:fs";
import path from "node:path";
import { root, run } from "./setup.mjs";

/** The production server that browser tests use, on a fresh database with the demo in it. */
const port = process.env.PORT ?? "4200";
const file = path.join(root, "var", `e2e-${port}.sqlite`);
for (const suffix of ["", "-wal", "-shm"]) rmSync(file + suffix, { force: true });
const env = { ...process.env, PORT: port, LOCAL: "1", NODE_ENV: "production", DATABASE_FILE: file };
run(process.execPath, ["--conditions=react-server", "--import", "tsx", "scripts/seed.ts"], env);
const server = spawn(process.execPath, ["node_modules/next/dist/bin/next", "start", "-p", port], {
  cwd: root,
  env,
  stdio: "inherit",
});
for (const signal of ["SIGINT", "SIGTERM"]) process.on(signal, () => server.kill("SIGTERM"));
server.on("exit", (code) => process.exit(code ?? 0));
