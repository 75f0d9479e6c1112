import { cellLine, editedCell, type NewCell, readEntry } from "@/lib/expr/entry";
import type { CalculationFile, Cell } from "@/lib/schema";

type System = { edition: CalculationFile["edition"]; em: "si" | "gaussian" };

/** What a keystroke in a source line does: the cell it makes, or a line that waits. */
export type LineEdit =
  | { readonly cell: Cell }
  /** The line is not of the cell's kind yet; it is kept as typed until Enter decides. */
  | { readonly pending: string };

const definition = /^\s*([^\s=<>!]+(?:\s*\([^()=]*\))?)\s*=(?!=)\s*(.*)$/su;

export function systemOf(file: CalculationFile): System {
  return { edition: file.edition, em: file.em ?? "si" };
}

/** Givens and relations turn into each other as their line says; a check stays a check. */
const compatible: Record<string, readonly string[]> = {
  given: ["given", "relation"],
  relation: ["given", "relation"],
  check: ["check"],
};

/** The outcome of typing `line` into the source line of `cell`. */
export function typeLine(cell: Cell, line: string, system: System): LineEdit {
  const made = editedCell(cell, line, system);
  if (compatible[cell.kind]?.includes(made.kind)) return { cell: made };
  const match = definition.exec(line);
  if ((cell.kind === "relation" || cell.kind === "given") && match && match[2]) {
    const [, symbol = "", formula = ""] = match;
    return { cell: { id: cell.id, kind: "relation", symbol, formula } };
  }
  return { pending: line };
}

/** The cell that a finished line makes, of whatever kind it reads as. */
export function finishLine(cell: Cell, line: string, system: System): Cell {
  return line.trim() === "" ? cell : editedCell(cell, line, system);
}

/** A new cell from the empty last line; undefined for blank typing. */
export function newCell(line: string, id: string, system: System): Cell | undefined {
  if (line.trim() === "") return undefined;
  return { ...readEntry(line, system), id } as Cell;
}

/** The same words as another kind of cell. */
export function asKind(
  cell: Cell,
  kind: "given" | "relation" | "check" | "text",
  system: System,
): Cell {
  const line = cellLine(cell);
  if (kind === "text") return { id: cell.id, kind, markdown: line };
  if (kind === "check") return { id: cell.id, kind, condition: line };
  const match = definition.exec(line);
  const [symbol, formula] = match ? [match[1] ?? "", match[2] ?? ""] : ["x", line];
  const made: NewCell = readEntry(`${symbol} = ${formula}`, system);
  if (made.kind === kind) return { ...made, id: cell.id } as Cell;
  if (kind === "relation") return { id: cell.id, kind, symbol, formula };
  return { id: cell.id, kind: "given", symbol, value: Number.parseFloat(formula) || 0, unit: "" };
}
