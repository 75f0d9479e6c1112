import type { CalculationFile, Cell } from "@/lib/schema";
import { mergeOrder } from "./merge-order";

/** The parts of a calculation beside its cells. */
const mergedFields = ["title", "abstract", "edition", "em"] as const;
type MergedField = (typeof mergedFields)[number];

/** One thing that two people changed differently. `null` means it is not there on that side. */
export type CellConflict = {
  cellId: string;
  base: Cell | null;
  mine: Cell | null;
  theirs: Cell | null;
};
export type FieldConflict = {
  field: MergedField;
  base: string | null;
  mine: string | null;
  theirs: string | null;
};
export type Conflict = CellConflict | FieldConflict;

export type Merge = {
  /**
   * Everything merged. Where there is a conflict, *mine* stands in it, except that a cell which one
   * side removed and the other changed is kept as changed: nothing typed is dropped.
   */
  file: CalculationFile;
  /** What has to be asked; empty when the merge is done. */
  conflicts: Conflict[];
  /** Ids that cells of mine got because theirs took the same id for another cell: old → new. */
  renamed: Record<string, string>;
};

/** Equality of JSON values whatever the order of keys; a field that is undefined is not there. */
export function sameValue(a: unknown, b: unknown): boolean {
  if (Object.is(a, b)) return true;
  if (typeof a !== "object" || typeof b !== "object" || a === null || b === null) return a === b;
  if (Array.isArray(a) !== Array.isArray(b)) return false;
  const left = a as Record<string, unknown>;
  const right = b as Record<string, unknown>;
  const keys = new Set([...Object.keys(left), ...Object.keys(right)]);
  return [...keys].every((key) => sameValue(left[key], right[key]));
}

type Choice<T> = { value: T; conflict: boolean };

/** The three-way rule: who did not change it yields; both alike agree; else it is a conflict. */
function choose<T>(base: T, mine: T, theirs: T): Choice<T> {
  if (sameValue(mine, theirs) || sameValue(base, theirs)) return { value: mine, conflict: false };
  if (sameValue(base, mine)) return { value: theirs, conflict: false };
  return { value: mine, conflict: true };
}

type CellsById = ReadonlyMap<string, Cell>;
const byId = (cells: readonly Cell[]): CellsById => new Map(cells.map((cell) => [cell.id, cell]));

/** An id like `wanted` that is not taken. */
function freeId(wanted: string, taken: ReadonlySet<string>): string {
  const stem = wanted.slice(0, 34);
  let count = 2;
  while (taken.has(`${stem}-${count}`)) count += 1;
  return `${stem}-${count}`;
}

/**
 * Two people may each have added a cell under the same id. Theirs is saved and keeps it; mine, not
 * yet seen by anybody, takes a free one, so that both stay.
 */
function withFreshIds(base: CellsById, mine: readonly Cell[], theirs: CellsById) {
  const taken = new Set([...base.keys(), ...theirs.keys(), ...mine.map((cell) => cell.id)]);
  const renamed: [string, string][] = [];
  const cells = mine.map((cell) => {
    const other = theirs.get(cell.id);
    if (base.has(cell.id) || !other || sameValue(cell, other)) return cell;
    const id = freeId(cell.id, taken);
    taken.add(id);
    renamed.push([cell.id, id]);
    return { ...cell, id };
  });
  return { cells, renamed: Object.fromEntries(renamed) };
}

function mergeCell(base: Cell | null, mine: Cell | null, theirs: Cell | null): Choice<Cell | null> {
  const { value, conflict } = choose(base, mine, theirs);
  return { value: conflict ? (mine ?? theirs) : value, conflict };
}

function mergeCells(base: readonly Cell[], mine: readonly Cell[], theirs: readonly Cell[]) {
  const [inBase, inMine, inTheirs] = [byId(base), byId(mine), byId(theirs)];
  const conflicts: CellConflict[] = [];
  const kept = new Map<string, Cell>();
  for (const id of new Set([...inMine.keys(), ...inTheirs.keys()])) {
    const sides = [inBase.get(id) ?? null, inMine.get(id) ?? null, inTheirs.get(id) ?? null];
    const [b = null, m = null, t = null] = sides;
    const { value, conflict } = mergeCell(b, m, t);
    if (value) kept.set(id, value);
    if (conflict) conflicts.push({ cellId: id, base: b, mine: m, theirs: t });
  }
  const order = mergeOrder([...inBase.keys()], [...inMine.keys()], [...inTheirs.keys()]);
  const cells = order.flatMap((id) => kept.get(id) ?? []);
  return { cells, conflicts };
}

function mergeFields(base: CalculationFile, mine: CalculationFile, theirs: CalculationFile) {
  const fields: Record<string, unknown> = {};
  const conflicts: FieldConflict[] = [];
  for (const field of mergedFields) {
    const [b, m, t] = [base[field], mine[field], theirs[field]];
    const { value, conflict } = choose(b, m, t);
    if (value !== undefined) fields[field] = value;
    if (conflict) conflicts.push({ field, base: b ?? null, mine: m ?? null, theirs: t ?? null });
  }
  return { fields, conflicts };
}

/**
 * Merges two changed copies of a calculation that started from the same one. Changes to different
 * cells, additions, removals and moves merge by cell id; a cell or a field that both changed
 * differently is a conflict to be shown side by side. Pure: the client uses it before saving again.
 */
export function merge(
  base: CalculationFile,
  mine: CalculationFile,
  theirs: CalculationFile,
): Merge {
  const fresh = withFreshIds(byId(base.cells), mine.cells, byId(theirs.cells));
  const merged = mergeCells(base.cells, fresh.cells, theirs.cells);
  const { fields, conflicts } = mergeFields(base, mine, theirs);
  const file = { format: mine.format, ...fields, cells: merged.cells } as CalculationFile;
  return { file, conflicts: [...conflicts, ...merged.conflicts], renamed: fresh.renamed };
}

function settleField(file: CalculationFile, { field }: FieldConflict, value: string | null) {
  const { [field]: _before, ...rest } = file;
  return (value === null ? rest : { ...rest, [field]: value }) as CalculationFile;
}

/**
 * The merged file with one conflict decided: my side, or theirs. A side that has removed the cell
 * removes it.
 */
export function settle(
  file: CalculationFile,
  conflict: Conflict,
  side: "mine" | "theirs",
): CalculationFile {
  if ("field" in conflict) return settleField(file, conflict, conflict[side]);
  const chosen = conflict[side];
  const cells = file.cells.flatMap((cell) => (cell.id === conflict.cellId ? (chosen ?? []) : cell));
  return { ...file, cells };
}
