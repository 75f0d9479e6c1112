/** Every place is taken and the line is full, or somebody waited in it too long: ask again later. */
export class EvaluatorBusyError extends Error {
  override readonly name = "EvaluatorBusyError";
  constructor() {
    super("Too many calculations are being evaluated at the moment. Try again in a few seconds.");
  }
}

export type WaitingLine = {
  /** Runs `work` as soon as a place is free, first come first served. */
  enter<Answer>(work: () => Promise<Answer>): Promise<Answer>;
};

type Waiting = { start: () => void };

/**
 * Lets `places` pieces of work run at a time and at most `length` wait. Throws EvaluatorBusyError
 * at once when the line is full, and for one who has waited `patienceMs` without a place.
 */
export function createWaitingLine(options: {
  places: number;
  length: number;
  patienceMs: number;
}): WaitingLine {
  const line: Waiting[] = [];
  let free = options.places;

  function waitForPlace(): Promise<void> {
    if (line.length >= options.length) throw new EvaluatorBusyError();
    return new Promise((resolve, reject) => {
      const giveUp = setTimeout(() => {
        line.splice(line.indexOf(waiting), 1);
        reject(new EvaluatorBusyError());
      }, options.patienceMs);
      const waiting = {
        start: () => {
          clearTimeout(giveUp);
          resolve();
        },
      };
      line.push(waiting);
    });
  }

  /** The place goes straight to who waits longest. */
  function leave(): void {
    const next = line.shift();
    if (next) next.start();
    else free += 1;
  }

  return {
    async enter(work) {
      if (free > 0) free -= 1;
      else await waitForPlace();
      try {
        return await work();
      } finally {
        leave();
      }
    },
  };
}
