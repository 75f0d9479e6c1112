import { cellLine, fieldOffset } from "@/lib/expr/entry";
import type { Cell, CellResult } from "@/lib/schema";

/** A fault or a notice, placed in the cell's one-line source. */
export interface LineDiagnostic {
  readonly from: number;
  readonly to: number;
  readonly severity: "error" | "warning" | "info";
  readonly message: string;
  readonly suggestion?: string;
}

interface Placed {
  readonly field?: string | undefined;
  readonly from?: number | undefined;
  readonly to?: number | undefined;
}

/** The field that a cell's faults refer to when they name none. */
const mainFields: Partial<Record<Cell["kind"], string>> = {
  given: "value",
  relation: "formula",
  check: "condition",
};

/**
 * Where a field of the cell begins in the line as it was typed, whose blanks may differ from the
 * line that the cell would be written as.
 */
function startInLine(cell: Cell, line: string, field: string): number {
  if (line === cellLine(cell)) return fieldOffset(cell, field);
  const text = (cell as Record<string, unknown>)[field];
  if (typeof text !== "string" || text === "") return 0;
  const at =
    field === "unit" ? line.lastIndexOf(text) : line.indexOf(text, afterSign(cell, line, field));
  return Math.max(0, at);
}

/** A formula is looked for behind the `=`: its text may also stand before it. */
function afterSign(cell: Cell, line: string, field: string): number {
  return cell.kind === "relation" && field === "formula" ? line.indexOf("=") + 1 : 0;
}

function inLine(cell: Cell, line: string, place: Placed): { from: number; to: number } {
  const { length } = line;
  const start = startInLine(cell, line, place.field ?? mainFields[cell.kind] ?? "");
  const from = Math.min(length, start + (place.from ?? 0));
  const to = place.to === undefined ? length : Math.min(length, start + place.to);
  return { from, to: Math.max(to, Math.min(length, from + 1)) };
}

/** Everything the engine says of a cell, where it belongs in the line that is typed. */
export function diagnosticsOf(
  cell: Cell,
  result: CellResult | undefined,
  line: string = cellLine(cell),
): LineDiagnostic[] {
  const found: LineDiagnostic[] = [];
  if (result?.status === "error") {
    const { message, suggestion } = result.error;
    found.push({
      ...inLine(cell, line, result.error),
      severity: "error",
      message,
      ...(suggestion === undefined ? {} : { suggestion }),
    });
  }
  for (const notice of result?.notices ?? []) {
    const severity = notice.level === "warning" ? "warning" : "info";
    found.push({ ...inLine(cell, line, notice), severity, message: notice.message });
  }
  return found;
}

/** The line with a suggestion put in place of the marked characters. */
export function applySuggestion(line: string, diagnostic: LineDiagnostic): string {
  if (diagnostic.suggestion === undefined) return line;
  return line.slice(0, diagnostic.from) + diagnostic.suggestion + line.slice(diagnostic.to);
}
