import { execFile } from "node:child_process";
import { existsSync, readdirSync, statSync } from "node:fs";
import path from "node:path";
import { promisify } from "node:util";

/** Folders whose code ends up in the evaluator's bundle. */
const sourceFolders = ["lib/expr", "lib/physics", "lib/schema", "lib/evaluator"];

/** Where the evaluator's bundle lies, from the root of the product. */
export const bundleFile = "dist/evaluator.cjs";

function newestChange(folder: string): number {
  const changes = readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => statSync(path.join(entry.parentPath, entry.name)).mtimeMs);
  return Math.max(0, ...changes);
}

/** Whether the bundle is missing, or (outside production) older than what it is made from. */
function needsBuilding(root: string, bundle: string): boolean {
  if (!existsSync(bundle)) return true;
  if (process.env.NODE_ENV === "production") return false;
  const built = statSync(bundle).mtimeMs;
  return sourceFolders.some((folder) => {
    const sources = path.join(root, folder);
    return existsSync(sources) && newestChange(sources) > built;
  });
}

/**
 * The path of the script that evaluator processes run, built first when it is missing or stale.
 * The product is started from its root, as npm does.
 */
export async function evaluatorScript(root = process.cwd()): Promise<string> {
  const bundle = path.join(root, bundleFile);
  if (needsBuilding(root, bundle)) {
    const build = path.join(root, "scripts", "build-evaluator.ts");
    await promisify(execFile)(process.execPath, ["--import", "tsx", build], { cwd: root });
  }
  return bundle;
}
