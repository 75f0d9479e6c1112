import { limits } from "@/lib/schema";
import { evaluatorScript } from "./bundle";
import { createEvaluatorPool, type EvaluatorPool } from "./pool";

/** Tasks that may wait for a process, and milliseconds one waits; then EvaluatorBusyError. */
const queueLength = 200;
const patienceMs = 20_000;
/** Milliseconds that `evaluatorIsWarm` waits for processes that are just being started. */
const warmUpMs = 3_000;

type Evaluators = { pool: Promise<EvaluatorPool>; warm: boolean };

// On globalThis, since a development server loads this module anew at each change of code.
const home = globalThis as { leadingOrderEvaluators?: Evaluators | undefined };

/** `EVALUATORS` of the environment: how many processes evaluate side by side. */
function processesFromEnvironment(): number {
  const asked = Number(process.env.EVALUATORS);
  return Number.isInteger(asked) && asked > 0 ? asked : 2;
}

async function startPool(processes: number): Promise<EvaluatorPool> {
  return createEvaluatorPool({
    script: await evaluatorScript(),
    processes,
    deadlineMs: limits.evaluationMs,
    heapMegabytes: limits.evaluationMegabytes,
    queueLength,
    patienceMs,
  });
}

async function warmUp(evaluators: Evaluators): Promise<void> {
  const outcome = await (await evaluators.pool).run("ping");
  evaluators.warm = outcome.status === "done";
}

/**
 * Starts the evaluator processes unless they run. Called by the first evaluation; a server calls it
 * at start, so that the first reader does not wait.
 */
export function startEvaluators(processes = processesFromEnvironment()): Promise<EvaluatorPool> {
  if (!home.leadingOrderEvaluators) {
    const evaluators: Evaluators = { pool: startPool(processes), warm: false };
    home.leadingOrderEvaluators = evaluators;
    // A pool that could not start is reported to who asked for it, and tried again next time.
    warmUp(evaluators).catch(() => {
      if (home.leadingOrderEvaluators === evaluators) home.leadingOrderEvaluators = undefined;
    });
  }
  return home.leadingOrderEvaluators.pool;
}

/** Whether an evaluator process is up with its engine loaded; starts them when none is. */
export async function evaluatorIsWarm(): Promise<boolean> {
  startEvaluators().catch(() => undefined);
  const patience = Date.now() + warmUpMs;
  while (!home.leadingOrderEvaluators?.warm && Date.now() < patience) {
    await new Promise((resolve) => setTimeout(resolve, 50));
  }
  return home.leadingOrderEvaluators?.warm ?? false;
}

/** Ends the evaluator processes; the next evaluation starts new ones. */
export async function closeEvaluators(): Promise<void> {
  const evaluators = home.leadingOrderEvaluators;
  home.leadingOrderEvaluators = undefined;
  await evaluators?.pool.then((pool) => pool.close());
}
