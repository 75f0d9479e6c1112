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

function inLine(cell: Cell, place: Placed): { from: number; to: number } {
  const { length } = cellLine(cell);
  const start = fieldOffset(cell, place.field ?? "formula");
  const from = Math.min(length, start + (place.from ?? 0));
  const to = place.to === undefined ? length : Math.min(length, start + place.to);
  return { from, to: Math.max(to, Math.min(length, from + 1)) };
}

/** Everything the engine says of a cell, where it belongs in the line that is typed. */
export function diagnosticsOf(cell: Cell, result: CellResult | undefined): LineDiagnostic[] {
  const found: LineDiagnostic[] = [];
  if (result?.status === "error") {
    const { message, suggestion } = result.error;
    found.push({
      ...inLine(cell, result.error),
      severity: "error",
      message,
      ...(suggestion === undefined ? {} : { suggestion }),
    });
  }
  for (const notice of result?.notices ?? []) {
    const severity = notice.level === "warning" ? "warning" : "info";
    found.push({ ...inLine(cell, notice), severity, message: notice.message });
  }
  return found;
}

/** The line with a suggestion put in place of the marked characters. */
export function applySuggestion(line: string, diagnostic: LineDiagnostic): string {
  if (diagnostic.suggestion === undefined) return line;
  return line.slice(0, diagnostic.from) + diagnostic.suggestion + line.slice(diagnostic.to);
}
