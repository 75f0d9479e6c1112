import { renameSync } from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { build } from "esbuild";
import { bundleFile } from "../lib/evaluator/bundle";

/** Bundles the evaluator's process, engine and all, into one file that needs nothing beside it. */
const root = fileURLToPath(new URL("..", import.meta.url));
const target = path.join(root, bundleFile);
// Written aside and moved into place: somebody else may be starting a process from the old one.
const draft = `${target}.${process.pid}`;

await build({
  entryPoints: [path.join(root, "lib/evaluator/worker.ts")],
  outfile: draft,
  bundle: true,
  platform: "node",
  format: "cjs",
  target: "node20",
  alias: { "@": root.replace(/\/$/, "") },
  legalComments: "none",
  logLevel: "warning",
});
renameSync(draft, target);
