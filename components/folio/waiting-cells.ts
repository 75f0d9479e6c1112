import type { CalculationFile, CellPresentation } from "@/lib/schema";

/**
 * The cells whose shown values may be out of date: those that differ from the file that was
 * evaluated last, and all that use them, directly or through others.
 */
export function waitingCells(
  file: CalculationFile,
  evaluated: CalculationFile,
  shown: Readonly<Record<string, CellPresentation>>,
): ReadonlySet<string> {
  if (file === evaluated) return new Set();
  if (file.edition !== evaluated.edition || file.em !== evaluated.em) {
    return new Set(file.cells.map((cell) => cell.id));
  }
  const before = new Map(evaluated.cells.map((cell) => [cell.id, cell]));
  const reached = new Set<string>();
  const toVisit = file.cells.filter((cell) => before.get(cell.id) !== cell).map((cell) => cell.id);
  for (let id = toVisit.pop(); id !== undefined; id = toVisit.pop()) {
    if (reached.has(id)) continue;
    reached.add(id);
    toVisit.push(...(shown[id]?.usedBy ?? []));
  }
  return reached;
}
