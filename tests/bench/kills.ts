import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { build } from "esbuild";
import { createEvaluatorPool } from "../../lib/evaluator/pool";
import type { CalculationFile } from "../../lib/schema";
import type { Measurement } from "./report";

const deadlineMs = 500;
const rounds = 10;

const task = (title: string) => ({
  file: { format: "leading-order/1", title, edition: "codata-2018", cells: [] } as CalculationFile,
  contentHash: "",
  present: false,
});

/** How long after an evaluator was killed the next evaluation is answered, in the same lone process. */
export async function measureKills(): Promise<Measurement[]> {
  const folder = mkdtempSync(path.join(tmpdir(), "evaluator-bench-"));
  const script = path.join(folder, "hostile.cjs");
  const worker = path.join(import.meta.dirname, "..", "unit", "evaluator", "hostile-worker.ts");
  await build({
    entryPoints: [worker],
    outfile: script,
    bundle: true,
    platform: "node",
    format: "cjs",
    logLevel: "silent",
  });
  const pool = createEvaluatorPool({
    script,
    processes: 1,
    deadlineMs,
    heapMegabytes: 64,
    queueLength: 8,
    patienceMs: 10_000,
  });
  const worst: Record<string, number> = { spin: 0, hoard: 0 };
  try {
    await pool.run("evaluate", task("good"));
    for (let i = 0; i < rounds; i++) {
      for (const bomb of Object.keys(worst)) {
        const ended = await pool.run("evaluate", task(bomb));
        if (ended.status !== "stopped") throw new Error(`the ${bomb} task was not stopped`);
        const start = performance.now();
        await pool.run("evaluate", task("good"));
        worst[bomb] = Math.max(worst[bomb] ?? 0, performance.now() - start);
      }
    }
  } finally {
    await pool.close();
    rmSync(folder, { recursive: true });
  }
  return Object.entries(worst).map(([bomb, ms]) => ({
    what: `evaluator killed (${bomb}): next evaluation answered, worst of ${rounds}`,
    ours: ms,
    reference: deadlineMs,
    unit: "ms",
    referenceName: "deadline in this run",
    figure: ms,
    target: "< 1000 ms",
    met: ms < 1_000,
  }));
}
