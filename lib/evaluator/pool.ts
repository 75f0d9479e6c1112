import { setImmediate as nextTurn } from "node:timers/promises";
import workerpool, { type Pool, type WorkerPoolOptions } from "workerpool";
import type { EvaluatorMethods, StartSignal } from "./task";
import { createWaitingLine } from "./waiting-line";

/** Milliseconds a process gets to leave when the pool is closed, before it is killed. */
const graceMs = 50;

export type EvaluatorPoolOptions = {
  /** The bundled script each process runs. */
  script: string;
  /** How many processes; all are started at once and kept. */
  processes: number;
  /** Milliseconds one task may take, counted from its start; then its process is killed. */
  deadlineMs: number;
  /** Heap of one process in megabytes; one that needs more dies. */
  heapMegabytes: number;
  /** How many tasks may wait for a free process, and for how many milliseconds. */
  queueLength: number;
  patienceMs: number;
};

/** What became of a task: its answer, or that its process had to be ended. */
export type Outcome<Answer> = { status: "done"; answer: Answer } | { status: "stopped" };

export type EvaluatorPool = {
  /**
   * Runs one method in a free process. A task that takes too long, takes too much memory or loses
   * its process costs itself alone: it comes back as `stopped`, and a fresh process is started.
   * Throws EvaluatorBusyError when too many wait, and what the method throws.
   */
  run<Name extends keyof EvaluatorMethods>(
    method: Name,
    ...args: Parameters<EvaluatorMethods[Name]>
  ): Promise<Outcome<ReturnType<EvaluatorMethods[Name]>>>;
  /** Ends the processes at once, whatever they are doing. */
  close(): Promise<void>;
};

function poolOptions(options: EvaluatorPoolOptions): WorkerPoolOptions {
  return {
    workerType: "process",
    minWorkers: "max",
    maxWorkers: options.processes,
    workerTerminateTimeout: graceMs,
    // What a dying process writes (V8's report of an exhausted heap) stays off the server's log.
    emitStdStreams: true,
    forkOpts: {
      // Nothing of the parent's settings or secrets is in reach of a formula.
      env: {},
      execArgv: [`--max-old-space-size=${options.heapMegabytes}`],
    },
  };
}

const isDeath = (error: unknown) =>
  error instanceof workerpool.TerminateError ||
  // A task in flight while the pool is closed.
  (error instanceof Error && error.message === "Worker terminated");

const isStart = (event: unknown): event is StartSignal =>
  typeof event === "object" && event !== null && "startedBy" in event;

/**
 * A deadline that begins when the process says it has begun, and ends with the process. The kill is
 * ours, not the library's: its own time-out first asks the process to leave, and waits for an
 * answer that one in an endless loop cannot give.
 */
function createDeadline(deadlineMs: number) {
  let timer: NodeJS.Timeout | undefined;
  return {
    hasBegun: () => timer !== undefined,
    onEvent: (event: unknown) => {
      if (!isStart(event)) return;
      timer = setTimeout(() => process.kill(event.startedBy, "SIGKILL"), deadlineMs);
    },
    lift: () => clearTimeout(timer),
  };
}

/** Starts the processes. One pool is enough for a server; `evaluators.ts` keeps it. */
export function createEvaluatorPool(options: EvaluatorPoolOptions): EvaluatorPool {
  const pool: Pool = workerpool.pool(options.script, poolOptions(options));
  let closed = false;
  // Waiting is done here, not in the library's queue, which stands still when a process dies.
  const line = createWaitingLine({
    places: options.processes,
    length: options.queueLength,
    patienceMs: options.patienceMs,
  });

  async function attempt<Answer>(
    method: string,
    args: unknown[],
    retries: number,
  ): Promise<Outcome<Answer>> {
    const deadline = createDeadline(options.deadlineMs);
    try {
      const answer = await pool.exec(method, args, { on: deadline.onEvent });
      return { status: "done", answer: answer as Answer };
    } catch (error) {
      if (!isDeath(error)) throw error;
      // The process had died while it was idle: not this task's fault.
      const again = retries > 0 && !closed && !deadline.hasBegun();
      if (!again) return { status: "stopped" };
      await nextTurn();
      return attempt(method, args, retries - 1);
    } finally {
      deadline.lift();
    }
  }

  return {
    run: (method, ...args) => line.enter(() => attempt(method, args, options.processes + 1)),
    close: async () => {
      closed = true;
      await pool.terminate(true);
    },
  };
}
