import type { UnitSystem } from "../../physics";
import type { Cell, CellKind, GivenCell } from "../../schema/calculation";
import type { CellError, CellResult, Notice } from "../../schema/results";
import type { Formula } from "../formula";
import type { FormulaCache } from "../formula-cache";
import type { Roles } from "../parse";
import type { Gradient, Powers } from "../propagate";
import type { Runtime } from "../runtime";
import type { Meaning, Scope } from "../scope";
import type { InputKey } from "../typed";

/** A symbol that a cell defines, as far as can be told before anything else is read. */
export interface Declaration {
  readonly symbol: string;
  readonly isFunction: boolean;
}

/** A cell as read under the roles of all names: the formulas it rests on. */
export interface Reading {
  readonly formulas: readonly Formula[];
  /** Symbols it rests on without a formula: those a sweep shows, or a solve looks at. */
  readonly symbols?: readonly string[];
}

/** What evaluation of one cell may use. */
export interface EvaluationContext {
  readonly system: UnitSystem;
  readonly scope: Scope;
  readonly formulas: FormulaCache;
  readonly runtime: Runtime;
  /** The value of an input in SI. */
  value(key: InputKey): number;
  /** What an input rests on: derivatives and exact exponents in givens and constants. */
  gradientOf(key: InputKey): Gradient;
  powersOf(key: InputKey): Powers;
  /** Standard uncertainty of a given in its own unit, of a constant in SI; 0 when exact. */
  uncertaintyOf(root: InputKey): number;
  /** The cell of a root that is a given. */
  givenOf(root: InputKey): GivenCell | undefined;
  /** The formula of the relation that defines a symbol; undefined for a given. */
  formulaOf(symbol: string): Formula | undefined;
}

/** What one cell comes to. */
export interface Outcome {
  readonly result: CellResult;
  /** What its symbol means to other cells; absent for cells that define none. */
  readonly meaning?: Meaning;
  /** Its value in SI, for cells that depend on it. */
  readonly si?: number;
  /** What that value rests on. */
  readonly gradient?: Gradient;
  readonly powers?: Powers;
}

/**
 * A kind of cell, as the engine sees it. A new kind is one entry here, one schema in `lib/schema` and
 * one component; nothing else asks what kind a cell is.
 */
export interface KindOfCell<C extends Cell = Cell> {
  readonly kind: CellKind;
  /** The symbol it defines, if it does. Raises `syntax` where the symbol is none. */
  declare(cell: C, formulas: FormulaCache): Declaration | undefined;
  /** Its formulas, read. Raises what reading raises. */
  read(cell: C, roles: Roles, formulas: FormulaCache): Reading;
  /** The text that decides what it defines and what it rests on. */
  structure(cell: C): string;
  /** The rest of what decides its outcome: values that may change while the structure stays. */
  values(cell: C): string;
  /** Its outcome. Raises what evaluation raises. */
  evaluate(cell: C, reading: Reading, context: EvaluationContext): Outcome;
}

/** A failed cell. */
export function failure(
  kind: CellKind,
  symbol: string | undefined,
  error: CellError,
  notices: readonly Notice[],
): CellResult {
  return {
    kind,
    status: "error",
    ...(symbol !== undefined ? { symbol } : {}),
    error,
    ...(notices.length > 0 ? { notices: [...notices] } : {}),
  };
}
