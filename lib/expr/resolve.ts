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
  const base = { cell, uses: [], ...(declaration ? { declaration } : {}) };
  if (fault) return { ...base, fault };
  const reading = attempt(() => kindOf(cell).read(cell, roles, formulas));
  if (!reading.ok) return { ...base, fault: reading.fault };
  return { ...base, reading: reading.value };
}

function linked(read: ResolvedCell, definers: ReadonlyMap<string, string>): ResolvedCell {
  const uses = new Set<string>();
  for (const formula of read.reading?.formulas ?? []) {
    for (const name of formula.names) {
      const definer = definers.get(name);
      if (definer !== undefined) uses.add(definer);
    }
  }
  return { ...read, uses: [...uses] };
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
    order.push(fault && !one.fault ? { ...one, fault } : one);
  };
  for (const one of cells) if (!state.has(one.cell.id)) visit(one);
  return order;
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
