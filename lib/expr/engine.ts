import Fraction from "fraction.js";
import { findConstant, type UnitSystem } from "../physics";
import type { CalculationFile, GivenCell } from "../schema/calculation";
import type { Presentation } from "../schema/presentation";
import { type CellResult, type Notice, type Results, resultsFormat } from "../schema/results";
import { attempt, type Fault } from "./faults";
import type { Formula } from "./formula";
import { FormulaCache } from "./formula-cache";
import { failure, kindOf, type Outcome } from "./kinds";
import { standardUncertainty } from "./kinds/given";
import { noticesOf } from "./notices";
import { present } from "./present";
import type { Gradient, Powers } from "./propagate";
import { refusedFunctions } from "./refused-functions";
import { engineRelease } from "./release";
import { type Resolved, type ResolvedCell, resolve, structureKey, withCellsOf } from "./resolve";
import { Runtime } from "./runtime";
import { type Meaning, makeScope, type Scope } from "./scope";
import { tellFault } from "./sentences";
import { habitHint, suggestName } from "./suggest";
import type { InputKey } from "./typed";

/** An outcome with a number that is the same wherever all it rests on is the same. */
interface Kept extends Outcome {
  readonly serial: number;
}

const mostKept = 20_000;

/** One evaluation under way. */
interface Run {
  readonly system: UnitSystem;
  readonly resolved: Resolved;
  readonly scope: Scope;
  readonly runtime: Runtime;
  /** Formulas of relations, by the symbol they define. */
  readonly formulas: ReadonlyMap<string, Formula>;
  /** Givens, by the symbol they define. */
  readonly givens: ReadonlyMap<string, GivenCell>;
  /** Outcomes so far, by cell id. */
  readonly outcomes: Map<string, Kept>;
}

/** The engine: a calculation in, results out. */
export interface Engine {
  /** Results of every cell; a bad cell never stops the others. Throws nothing for what people type. */
  evaluate(file: CalculationFile, contentHash: string): Results;
  /** How the calculation is shown: typeset forms, lines, links between cells. */
  present(file: CalculationFile, results: Results): Presentation;
}

function systemOf(file: CalculationFile): UnitSystem {
  return { edition: file.edition, em: file.em ?? "si" };
}

/** The field of a cell that its formula stands in. */
function formulaField(kind: string): string {
  return kind === "check" ? "condition" : "formula";
}

/**
 * An engine with its memory: formulas already compiled, and outcomes of cells that have not changed
 * nor anything they depend on. One per process; what it remembers never changes what it answers.
 */
class RememberingEngine implements Engine {
  readonly #formulas = new FormulaCache();
  readonly #kept = new Map<string, Kept>();
  readonly #structures = new Map<string, number>();
  #last: { key: string; resolved: Resolved } | undefined;
  #serial = 0;

  evaluate(file: CalculationFile, contentHash: string): Results {
    const run = this.#start(file);
    for (const one of run.resolved.order) run.outcomes.set(one.cell.id, this.#outcome(one, run));
    const cells: Record<string, CellResult> = {};
    for (const { id } of file.cells) {
      const outcome = run.outcomes.get(id);
      if (outcome) cells[id] = outcome.result;
    }
    return {
      format: resultsFormat,
      engine: engineRelease,
      edition: file.edition,
      contentHash,
      cells,
    };
  }

  present(file: CalculationFile, results: Results): Presentation {
    return present(file, results, this.#resolve(file), systemOf(file));
  }

  #start(file: CalculationFile): Run {
    const system = systemOf(file);
    const resolved = this.#resolve(file);
    const outcomes = new Map<string, Kept>();
    const scope = makeScope(system, (name) => meaningOf(name, resolved, outcomes));
    const formulas = formulasBySymbol(resolved);
    const givens = givensBySymbol(resolved);
    return { system, resolved, scope, runtime: new Runtime(), formulas, givens, outcomes };
  }

  #outcome(one: ResolvedCell, run: Run): Kept {
    const key = this.#keyOf(one, run);
    const known = this.#kept.get(key);
    if (known) return known;
    if (this.#kept.size >= mostKept) {
      this.#kept.clear();
      this.#structures.clear();
      return this.#outcome(one, run);
    }
    this.#serial += 1;
    const kept = { ...this.#evaluate(one, run), serial: this.#serial };
    this.#kept.set(key, kept);
    return kept;
  }

  /** What a cell is, its values, and which outcomes it rests on. */
  #keyOf(one: ResolvedCell, run: Run): string {
    const structure = `${run.system.edition}${run.system.em}${one.structure}`;
    let serial = this.#structures.get(structure);
    if (serial === undefined) {
      serial = this.#structures.size;
      this.#structures.set(structure, serial);
    }
    let key = `${serial}|${kindOf(one.cell).values(one.cell)}`;
    for (const id of one.uses) key += `|${run.outcomes.get(id)?.serial ?? "?"}`;
    return key;
  }

  /** Names and order, remembered for the structure that was evaluated last. */
  #resolve(file: CalculationFile): Resolved {
    const key = structureKey(file);
    if (this.#last?.key === key) return withCellsOf(this.#last.resolved, file);
    const resolved = resolve(file, this.#formulas);
    this.#last = { key, resolved };
    return resolved;
  }

  #evaluate(one: ResolvedCell, run: Run): Outcome {
    const { cell, declaration, reading, fault } = one;
    const field = formulaField(cell.kind);
    const notices = noticesOf(declaration?.symbol, reading, run.resolved.roles, run.system, field);
    if (fault || !reading) return failed(one, fault as Fault, notices, run);
    const context = {
      system: run.system,
      scope: run.scope,
      formulas: this.#formulas,
      runtime: run.runtime,
      value: (key: InputKey) => inputValue(key, run),
      gradientOf: (key: InputKey) => outcomeOf(key, run)?.gradient ?? itself(key),
      powersOf: (key: InputKey) => outcomeOf(key, run)?.powers ?? toTheFirst(key),
      uncertaintyOf: (root: InputKey) => rootUncertainty(root, run),
      givenOf: (root: InputKey) => givenOf(root, run),
      formulaOf: (symbol: string) => run.formulas.get(symbol),
    };
    const outcome = attempt(() => kindOf(cell).evaluate(cell, reading, context));
    if (!outcome.ok) return failed(one, outcome.fault, notices, run);
    if (notices.length === 0) return outcome.value;
    return { ...outcome.value, result: { ...outcome.value.result, notices } };
  }
}

function formulasBySymbol(resolved: Resolved): Map<string, Formula> {
  const formulas = new Map<string, Formula>();
  for (const { declaration, reading } of resolved.order) {
    const formula = reading?.formulas[0];
    if (declaration && formula && !declaration.isFunction)
      formulas.set(declaration.symbol, formula);
  }
  return formulas;
}

function givensBySymbol(resolved: Resolved): Map<string, GivenCell> {
  const givens = new Map<string, GivenCell>();
  for (const { cell, declaration } of resolved.order) {
    if (declaration && cell.kind === "given") givens.set(declaration.symbol, cell);
  }
  return givens;
}

function meaningOf(
  name: string,
  resolved: Resolved,
  outcomes: ReadonlyMap<string, Outcome>,
): Meaning | undefined {
  const id = resolved.definers.get(name);
  if (id === undefined) return undefined;
  return outcomes.get(id)?.meaning ?? { kind: "faulty", cell: id, symbol: name };
}

function inputValue(key: InputKey, run: Run): number {
  const at = key.indexOf(":");
  const name = key.slice(at + 1);
  const value = key.startsWith("symbol:")
    ? run.outcomes.get(run.resolved.definers.get(name) ?? "")?.si
    : findConstant(name, run.system)?.siValue;
  if (value === undefined) throw new Error(`no value for ${key}`);
  return value;
}

/** The outcome of the cell that defines an input; undefined for a constant. */
function outcomeOf(key: InputKey, run: Run): Kept | undefined {
  if (!key.startsWith("symbol:")) return undefined;
  const id = run.resolved.definers.get(key.slice("symbol:".length));
  return id === undefined ? undefined : run.outcomes.get(id);
}

/** A constant rests on itself. */
function itself(key: InputKey): Gradient {
  return new Map([[key, 1]]);
}

function toTheFirst(key: InputKey): Powers {
  return new Map([[key, new Fraction(1)]]);
}

function givenOf(root: InputKey, run: Run): GivenCell | undefined {
  return root.startsWith("symbol:") ? run.givens.get(root.slice("symbol:".length)) : undefined;
}

function rootUncertainty(root: InputKey, run: Run): number {
  const given = givenOf(root, run);
  if (given) return standardUncertainty(given) ?? 0;
  return findConstant(root.slice("constant:".length), run.system)?.siUncertainty ?? 0;
}

/** An unknown name may be a refused function, or a slip that can be mended. */
function enrich(fault: Fault, run: Run): Fault {
  if (fault.inner) return { ...fault, inner: enrich(fault.inner, run) };
  const name = fault.with?.name;
  if (fault.code !== "unknown-name" || typeof name !== "string") return fault;
  const isCall = fault.reason === "unknown-function";
  if (isCall && refusedFunctions.has(name)) {
    return { ...fault, code: "forbidden", reason: "refused-function" };
  }
  const hint = habitHint(name);
  if (hint) return { ...fault, with: { ...fault.with, hint } };
  const suggestion = suggestName(name, run.resolved.definers.keys(), run.system);
  return suggestion ? { ...fault, suggestion } : fault;
}

function failed(one: ResolvedCell, fault: Fault, notices: readonly Notice[], run: Run): Outcome {
  const { cell, declaration } = one;
  const placed = { field: formulaField(cell.kind), ...enrich(fault, run) };
  const symbol = declaration?.symbol ?? ("symbol" in cell ? cell.symbol : undefined);
  return { result: failure(cell.kind, symbol, tellFault(placed, run.system.em), notices) };
}

/** A fresh engine. */
export function createEngine(): Engine {
  return new RememberingEngine();
}
