import type { Dimension } from "../physics";
import type { ErrorCode } from "../schema/results";

/**
 * A fault of something typed, as data. English is made of it in `sentences.ts`; `from` and `to`
 * count characters of the field as it was typed.
 */
export interface Fault {
  readonly code: ErrorCode;
  /** Which sentence tells it. */
  readonly reason: string;
  readonly from?: number;
  readonly to?: number;
  readonly field?: string;
  readonly suggestion?: string;
  /** What the sentence is made with. */
  readonly with?: Readonly<Record<string, string | Dimension>>;
  /** The fault inside a function that this call met. */
  readonly inner?: Fault;
}

/** Carries a fault out of a deep walk; caught where the walk began, never further. */
export class FaultSignal extends Error {
  constructor(readonly fault: Fault) {
    super(fault.reason);
  }
}

/** Leave the walk with a fault. */
export function raise(fault: Fault): never {
  throw new FaultSignal(fault);
}

/** Run a walk; give what it returns, or the fault it raised. Other errors pass through. */
export function attempt<T>(walk: () => T): { ok: true; value: T } | { ok: false; fault: Fault } {
  try {
    return { ok: true, value: walk() };
  } catch (error) {
    if (error instanceof FaultSignal) return { ok: false, fault: error.fault };
    throw error;
  }
}
