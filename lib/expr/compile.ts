import { Emitter } from "./emitter";
import { kernels } from "./kernels";
import type { Runtime } from "./runtime";
import type { InputKey, Typed } from "./typed";

/**
 * A typed formula as one numeric function. The kernel carries no units: they were settled by
 * `infer`. Its text is made only of numbers, counters and names of kernels, never of anything typed.
 */
export interface CompiledFormula {
  /** What the kernel reads, in the order of its values. */
  readonly inputs: readonly InputKey[];
  /** The value in SI, or 1 and 0 for a condition. Raises `domain`, `overflow`, `limit`, `no-solution`. */
  readonly run: (values: ArrayLike<number>, runtime: Runtime) => number;
}

/** A kernel that gives its first derivatives too. */
export interface CompiledGradient {
  readonly inputs: readonly InputKey[];
  /** The value in SI; the partial derivative with respect to each input is left in `slopes`. */
  readonly run: (values: ArrayLike<number>, slopes: Float64Array, runtime: Runtime) => number;
}

type Program = (
  k: typeof kernels,
  values: ArrayLike<number>,
  slopes: Float64Array,
  runtime: Runtime,
) => number;

function toProgram(text: string): Program {
  // The text holds numbers and counters only: see Emitter.
  return new Function("k", "v", "g", "$", text) as Program;
}

const noSlopes = new Float64Array(0);

/** The kernel of a typed formula. */
export function compile(typed: Typed): CompiledFormula {
  const emitter = new Emitter();
  const run = toProgram(emitter.program(typed));
  return {
    inputs: emitter.inputs,
    run: (values, runtime) => run(kernels, values, noSlopes, runtime),
  };
}

/** The kernel with exact first derivatives with respect to each of its inputs (forward mode). */
export function compileGradient(typed: Typed, inputs: readonly InputKey[]): CompiledGradient {
  const emitter = new Emitter(inputs, inputs.length);
  const run = toProgram(emitter.program(typed));
  return { inputs, run: (values, slopes, runtime) => run(kernels, values, slopes, runtime) };
}
