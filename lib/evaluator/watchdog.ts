import vm from "node:vm";

// A process that spins cannot notice anything, not even that its parent is gone. V8's own watchdog
// can: it interrupts a script from another thread.
const guarded = new vm.Script("leadingOrderTask()");

/** Runs `work`; when it takes longer than `deadlineMs`, interrupts it and calls `onOverrun`. */
export function underWatchdog<Result>(
  deadlineMs: number,
  work: () => Result,
  onOverrun: () => never,
): Result {
  let answer: { value: Result } | undefined;
  Object.assign(globalThis, {
    leadingOrderTask: () => {
      answer = { value: work() };
    },
  });
  try {
    guarded.runInThisContext({ timeout: deadlineMs });
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === "ERR_SCRIPT_EXECUTION_TIMEOUT") onOverrun();
    throw error;
  }
  if (!answer) throw new Error("The work ended without an answer.");
  return answer.value;
}
