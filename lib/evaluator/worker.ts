import vm from "node:vm";
import workerpool from "workerpool";
import { createEngine } from "@/lib/expr";
import { limits } from "@/lib/schema";
import type { EvaluationTask, EvaluatorMethods, StartSignal } from "./task";

/**
 * The entry of an evaluator process, bundled into dist/evaluator.cjs. It holds one engine, reads a
 * task, answers with plain data, and touches nothing else: no file, no network, no environment.
 */
const engine = createEngine();

/** The parent ends a process at the deadline; this is for a parent that was ended itself. */
const orphanDeadlineMs = limits.evaluationMs + 2_000;

// A process that spins cannot notice that its parent is gone. V8's own watchdog can: it interrupts
// the script from another thread, and the process ends.
const guarded = new vm.Script("leadingOrderTask()");

function underWatchdog<Result>(work: () => Result): Result {
  let answer: { value: Result } | undefined;
  Object.assign(globalThis, {
    leadingOrderTask: () => {
      answer = { value: work() };
    },
  });
  try {
    guarded.runInThisContext({ timeout: orphanDeadlineMs });
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === "ERR_SCRIPT_EXECUTION_TIMEOUT") process.exit(1);
    throw error;
  }
  if (!answer) throw new Error("The evaluation ended without an answer.");
  return answer.value;
}

const methods: EvaluatorMethods = {
  evaluate: ({ file, contentHash, present }: EvaluationTask) => {
    workerpool.workerEmit({ startedBy: process.pid } satisfies StartSignal);
    return underWatchdog(() => {
      const results = engine.evaluate(file, contentHash);
      return present ? { ...results, presentation: engine.present(file, results) } : results;
    });
  },
  ping: () => "ready",
};

workerpool.worker(methods);
