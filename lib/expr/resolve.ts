import type { CalculationFile, Cell } from "../schema/calculation";
import { attempt, type Fault } from "./faults";
import type { FormulaCache } from "./formula-cache";
import { type Declaration, kindOf, type Reading } from "./kinds";
import type { Roles } from "./parse";

/** A cell with what it defines and what it rests on; `fault` where either cannot be told. */
export interface ResolvedCell {
  readonly cell: Cell;
  readonly declaration?: Declaration;
  readonly reading?: Reading;
  /** Ids of the cells it uses, in the order in which it names them. */
  readonly uses: readonly string[];
  readonly fault?: Fault;
  /** Everything about it that its values, and those of what it uses, do not change. */
  readonly structure: string;
}

/** A calculation whose names are known: cells in the order of evaluation. */
export interface Resolved {
  readonly roles: Roles;
  /** The id of the cell that defines a symbol. */
  readonly definers: ReadonlyMap<string, string>;
  readonly order: readonly ResolvedCell[];
}

interface Declared {
  readonly cell: Cell;
  readonly declaration?: Declaration;
  readonly fault?: Fault;
}

function declareAll(cells: readonly Cell[], formulas: FormulaCache): Declared[] {
  const seen = new Set<string>();
  return cells.map((cell) => {
    const declared = attempt(() => kindOf(cell).declare(cell, formulas));
    if (!declared.ok) return { cell, fault: { field: "formula", ...declared.fault } };
    if (!declared.value) return { cell };
    const { symbol } = declared.value;
    if (seen.has(symbol)) return { cell, fault: duplicate(symbol, cell, seen) };
    seen.add(symbol);
    return { cell, declaration: declared.value };
  });
}

function duplicate(symbol: string, cell: Cell, seen: ReadonlySet<string>): Fault {
  let number = 2;
  while (seen.has(`${symbol}_${number}`)) number += 1;
  const typed = "symbol" in cell ? cell.symbol : symbol;
  return {
    code: "duplicate-name",
    reason: "duplicate-name",
    field: "symbol",
    from: 0,
    to: typed.length,
    suggestion: `${symbol}_${number}`,
    with: { symbol, suggestion: `${symbol}_${number}` },
  };
}

function rolesOf(declared: readonly Declared[]): Roles {
  const functions = new Set<string>();
  const quantities = new Set<string>();
  for (const { declaration } of declared) {
    if (declaration) (declaration.isFunction ? functions : quantities).add(declaration.symbol);
  }
  return { functions, quantities };
}

function readOne(declared: Declared, roles: Roles, formulas: FormulaCache): ResolvedCell {
  const { cell, declaration, fault } = declared;
  const base = { cell, uses: [], structure: "", ...(declaration ? { declaration } : {}) };
  if (fault) return { ...base, fault };
  const reading = attempt(() => kindOf(cell).read(cell, roles, formulas));
  if (!reading.ok) return { ...base, fault: reading.fault };
  return { ...base, reading: reading.value };
}

function linked(read: ResolvedCell, definers: ReadonlyMap<string, string>): ResolvedCell {
  const uses = new Set<string>();
  const names = (read.reading?.formulas ?? []).flatMap((formula) => formula.names);
  for (const name of [...names, ...(read.reading?.symbols ?? [])]) {
    const definer = definers.get(name);
    if (definer !== undefined) uses.add(definer);
  }
  return { ...read, uses: [...uses], structure: structureOf(read, definers) };
}

/** What a cell is, which of its names the calculation defines, and its fault, as one text. */
function structureOf(read: ResolvedCell, definers: ReadonlyMap<string, string>): string {
  const { cell, reading, fault } = read;
  const defined = (reading?.formulas ?? []).map((formula) =>
    formula.names.map((name) => (definers.has(name) ? 1 : 0)).join(""),
  );
  const told = fault ? JSON.stringify([fault.reason, fault.with]) : "";
  return [cell.kind, defined.join(), told, kindOf(cell).structure(cell)].join("\u0000");
}

/** Cells in an order in which each comes behind what it uses; members of a cycle get its fault. */
function inOrder(cells: readonly ResolvedCell[]): ResolvedCell[] {
  const byId = new Map(cells.map((one) => [one.cell.id, one]));
  const state = new Map<string, "open" | "done">();
  const path: string[] = [];
  const order: ResolvedCell[] = [];
  const cyclic = new Map<string, Fault>();
  const visit = (one: ResolvedCell): void => {
    const { id } = one.cell;
    state.set(id, "open");
    path.push(id);
    for (const used of one.uses) {
      const next = byId.get(used);
      if (state.get(used) === "open") markCycle(path.slice(path.indexOf(used)), byId, cyclic);
      else if (next && !state.has(used)) visit(next);
    }
    path.pop();
    state.set(id, "done");
    const fault = cyclic.get(id);
    const faulty = fault && !one.fault;
    order.push(faulty ? { ...one, fault, structure: `${one.structure}${names(fault)}` } : one);
  };
  for (const one of cells) if (!state.has(one.cell.id)) visit(one);
  return order;
}

function names(cycle: Fault): string {
  return `\u0000${String(cycle.with?.members)}`;
}

function markCycle(
  members: readonly string[],
  byId: ReadonlyMap<string, ResolvedCell>,
  cyclic: Map<string, Fault>,
): void {
  const symbols = members.map((id) => byId.get(id)?.declaration?.symbol ?? id);
  const names = [...symbols, symbols[0]].join(" → ");
  for (const id of members) {
    cyclic.set(id, { code: "cycle", reason: "cycle", with: { members: names } });
  }
}

/** The text on which the resolution of a calculation depends: what cells are, not their values. */
export function structureKey(file: CalculationFile): string {
  const parts = file.cells.map(
    (cell) => `${cell.id}\u0001${cell.kind}\u0001${kindOf(cell).structure(cell)}`,
  );
  return [file.edition, file.em, ...parts].join("\u0002");
}

/** The same resolution for a file of the same structure, with the cells of that file in it. */
export function withCellsOf(resolved: Resolved, file: CalculationFile): Resolved {
  const byId = new Map(file.cells.map((cell) => [cell.id, cell]));
  const order = resolved.order.map((one) => ({ ...one, cell: byId.get(one.cell.id) ?? one.cell }));
  return { ...resolved, order };
}

/** Names and order of a calculation. Every fault stays with its cell; nothing is raised. */
export function resolve(file: CalculationFile, formulas: FormulaCache): Resolved {
  const declared = declareAll(file.cells, formulas);
  const roles = rolesOf(declared);
  const definers = new Map<string, string>();
  for (const { cell, declaration } of declared) {
    if (declaration) definers.set(declaration.symbol, cell.id);
  }
  const read = declared.map((one) => linked(readOne(one, roles, formulas), definers));
  return { roles, definers, order: inOrder(read) };
}
