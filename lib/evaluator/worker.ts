import workerpool from "workerpool";
import { createEngine } from "@/lib/expr";
import { limits } from "@/lib/schema";
import type { EvaluationTask, EvaluatorMethods, StartSignal } from "./task";
import { underWatchdog } from "./watchdog";

/**
 * The entry of an evaluator process, bundled into dist/evaluator.cjs. It holds one engine, reads a
 * task, answers with plain data, and touches nothing else: no file, no network, no environment.
 */
const engine = createEngine();

/** The parent ends a process at the deadline; this is for a parent that was ended itself. */
const orphanDeadlineMs = limits.evaluationMs + 2_000;

const methods: EvaluatorMethods = {
  evaluate: ({ file, contentHash, present }: EvaluationTask) => {
    workerpool.workerEmit({ startedBy: process.pid } satisfies StartSignal);
    const work = () => {
      const results = engine.evaluate(file, contentHash);
      return present ? { ...results, presentation: engine.present(file, results) } : results;
    };
    return underWatchdog(orphanDeadlineMs, work, () => process.exit(1));
  },
  ping: () => "ready",
};

workerpool.worker(methods);
