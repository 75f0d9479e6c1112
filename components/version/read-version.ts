import { shownRelation } from "@/lib/expr/value-shown";
import type { UnitSystem } from "@/lib/physics";
import type { Cell, CellPresentation, CellResult, EvaluateAnswer, VersionFile } from "@/lib/schema";

/** A cell of a version with what was recorded for it and how it is typeset. */
export interface VersionCell {
  readonly cell: Cell;
  readonly result: CellResult | undefined;
  readonly shown: CellPresentation | undefined;
}

/**
 * How a cell is shown: typeset as the engine of today understands it, with the value that was
 * recorded. A given keeps the figures it was stated with, which are part of the content.
 */
function withRecord(
  cell: Cell,
  result: CellResult | undefined,
  shown: CellPresentation | undefined,
  system: UnitSystem,
): CellPresentation | undefined {
  if (!shown || cell.kind !== "relation") return shown;
  const { number, line, tex, uses, usedBy, constants } = shown;
  const understood = { line, uses, usedBy, constants };
  return {
    ...understood,
    ...(number === undefined ? {} : { number }),
    ...(tex === undefined ? {} : { tex }),
    ...(result?.status === "ok" && "value" in result && result.kind === "relation"
      ? shownRelation(result, system)
      : {}),
  };
}

/** The cells of a version in reading order; `presentation` is missing if no evaluator was free. */
export function versionCells(
  file: VersionFile,
  presentation: EvaluateAnswer["presentation"],
): VersionCell[] {
  const system = { edition: file.edition, em: file.em ?? "si" };
  return file.cells.map((cell) => {
    const result = file.results.cells[cell.id];
    return { cell, result, shown: withRecord(cell, result, presentation?.cells[cell.id], system) };
  });
}

/** How many cells of a version have errors, and how many of its checks fail. */
export function countFaults(file: VersionFile): { errors: number; failing: number } {
  const results = Object.values(file.results.cells);
  return {
    errors: results.filter((result) => result.status === "error").length,
    failing: results.filter((result) => "holds" in result && !result.holds).length,
  };
}
