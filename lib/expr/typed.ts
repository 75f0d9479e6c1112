import type { Dimension } from "../physics";
import type { Comparison, Place } from "./tree";

/**
 * A formula whose names are known and whose dimensions are settled: what `infer` makes of a tree and
 * what `compile` reads. Values are in coherent SI; no unit is left in it.
 */
export type Typed = Place & {
  readonly dimension: Dimension;
  /** True where the node is a condition rather than a quantity. */
  readonly truth: boolean;
} & TypedForm;

export type TypedForm =
  | { readonly op: "number"; readonly value: number }
  /** A value given from outside: a symbol of the calculation or a constant of the edition. */
  | { readonly op: "input"; readonly key: InputKey }
  /** A parameter of a function or a variable bound by `integrate`, `sum`, `root`. */
  | { readonly op: "local"; readonly local: Local }
  | { readonly op: "negate" | "not"; readonly argument: Typed }
  | {
      readonly op: "add" | "subtract" | "multiply" | "divide" | "power" | "and" | "or";
      readonly left: Typed;
      readonly right: Typed;
    }
  | {
      readonly op: "compare";
      readonly operators: readonly Comparison[];
      readonly parts: readonly Typed[];
    }
  | { readonly op: "choose"; readonly test: Typed; readonly yes: Typed; readonly no: Typed }
  | { readonly op: "call"; readonly name: string; readonly parts: readonly Typed[] }
  | { readonly op: "apply"; readonly instance: FunctionInstance; readonly parts: readonly Typed[] }
  | {
      readonly op: "integrate" | "sum" | "root";
      readonly variable: Local;
      readonly body: Typed;
      readonly lower: Typed;
      readonly upper: Typed;
    };

/** `symbol:M` or `constant:G`: two name spaces, since a calculation may define its own `G`. */
export type InputKey = `symbol:${string}` | `constant:${string}`;

/** A bound name; identity, not spelling, tells two of them apart. */
export interface Local {
  readonly name: string;
  readonly dimension: Dimension;
}

/** A function of the calculation, for arguments of certain dimensions. */
export interface FunctionInstance {
  readonly name: string;
  readonly parameters: readonly Local[];
  readonly body: Typed;
}
