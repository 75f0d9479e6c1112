import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { build } from "esbuild";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { createEvaluatorPool, type EvaluatorPool } from "@/lib/evaluator/pool";
import { EvaluatorBusyError } from "@/lib/evaluator/waiting-line";
import type { CalculationFile } from "@/lib/schema";

const folder = mkdtempSync(path.join(tmpdir(), "evaluator-pool-"));
const script = path.join(folder, "hostile.cjs");
const deadlineMs = 800;

/** A fresh process is to answer within a second; a loaded test machine gets some more. */
const answeredWithinMs = 5_000;

const start = (options: { processes?: number; queueLength?: number; patienceMs?: number } = {}) =>
  createEvaluatorPool({
    script,
    processes: 1,
    deadlineMs,
    heapMegabytes: 64,
    queueLength: 8,
    patienceMs: 10_000,
    ...options,
  });

const task = (title: string) => ({
  file: { format: "leading-order/1", title, edition: "codata-2018", cells: [] } as CalculationFile,
  contentHash: "",
  present: false,
});

let pool: EvaluatorPool;
const run = (title: string) => pool.run("evaluate", task(title));

async function answersPromptly() {
  const before = performance.now();
  expect(await run("good")).toEqual({ status: "done", answer: "good" });
  expect(performance.now() - before).toBeLessThan(answeredWithinMs);
}

beforeAll(async () => {
  await build({
    entryPoints: [path.join(__dirname, "hostile-worker.ts")],
    outfile: script,
    bundle: true,
    platform: "node",
    format: "cjs",
    logLevel: "silent",
  });
  pool = start();
});

afterAll(async () => {
  await pool.close();
  rmSync(folder, { recursive: true });
});

describe("a pool of evaluator processes", () => {
  it("answers", answersPromptly);

  it.each(["spin", "hoard", "exit"])("survives a task that would %s", async (title) => {
    expect(await run(title)).toEqual({ status: "stopped" });
    await answersPromptly();
  });

  it("stops a task that spins at the deadline, not much later", async () => {
    const before = performance.now();
    await run("spin");
    expect(performance.now() - before).toBeLessThan(deadlineMs + 1_000);
  });

  it("passes on what a method throws and keeps the process", async () => {
    await expect(run("throw")).rejects.toThrow("as asked");
    await answersPromptly();
  });

  it("shows its processes nothing of the environment", async () => {
    process.env.LEADING_ORDER_TEST_SECRET = "not to be seen";
    const outcome = await run("environment");
    expect(outcome.status).toBe("done");
    expect(JSON.stringify(outcome)).not.toContain("LEADING_ORDER_TEST_SECRET");
  });

  it("answers others while one process spins", async () => {
    const two = start({ processes: 2 });
    const spinning = two.run("evaluate", task("spin"));
    const good = await Promise.all(
      Array.from({ length: 5 }, () => two.run("evaluate", task("good"))),
    );
    expect(good.every((outcome) => outcome.status === "done")).toBe(true);
    expect(await spinning).toEqual({ status: "stopped" });
    await two.close();
  });

  it("answers those who waited behind a task that was stopped", async () => {
    const outcomes = await Promise.all(["spin", "good", "hoard", "good"].map(run));
    expect(outcomes.map((outcome) => outcome.status)).toEqual([
      "stopped",
      "done",
      "stopped",
      "done",
    ]);
  });

  it("refuses more than the queue holds, and says to come back", async () => {
    const small = start({ queueLength: 2 });
    const outcomes = await Promise.allSettled(
      ["spin", "good", "good", "good", "good"].map((title) => small.run("evaluate", task(title))),
    );
    const refused = outcomes.filter((outcome) => outcome.status === "rejected");
    expect(refused.length).toBeGreaterThan(0);
    for (const outcome of refused) expect(outcome.reason).toBeInstanceOf(EvaluatorBusyError);
    await small.close();
  });

  it("does not let anybody wait for ever", async () => {
    const impatient = start({ patienceMs: 100 });
    const spinning = impatient.run("evaluate", task("spin"));
    await expect(impatient.run("evaluate", task("good"))).rejects.toThrow(EvaluatorBusyError);
    expect(await spinning).toEqual({ status: "stopped" });
    await impatient.close();
  });

  it("replaces a process that was killed while idle", async () => {
    const outcome = await run("pid");
    if (outcome.status !== "done") throw new Error("no process id");
    process.kill(Number(outcome.answer), "SIGKILL");
    await answersPromptly();
  });

  it("closes while a task spins", async () => {
    const closing = start();
    const spinning = closing.run("evaluate", task("spin"));
    await closing.run("ping").catch(() => undefined);
    await closing.close();
    expect(await spinning).toEqual({ status: "stopped" });
  });
});
