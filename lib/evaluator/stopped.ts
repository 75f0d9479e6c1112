import {
  type CalculationFile,
  type Cell,
  type CellResult,
  limitSentences,
  type Results,
  resultsFormat,
} from "@/lib/schema";

function stoppedCell(cell: Cell): CellResult {
  if (cell.kind === "text") return { kind: "text", status: "ok" };
  return {
    kind: cell.kind,
    status: "error",
    ...("symbol" in cell ? { symbol: cell.symbol } : {}),
    error: { code: "limit", message: limitSentences.evaluation() },
  };
}

/**
 * The results of an evaluation that had to be stopped: a `limit` error in every cell but text,
 * since nobody can say which of them would have been the one too many.
 */
export function stoppedResults(file: CalculationFile, hash: string, engine: string): Results {
  return {
    format: resultsFormat,
    engine,
    edition: file.edition,
    contentHash: hash,
    cells: Object.fromEntries(file.cells.map((cell) => [cell.id, stoppedCell(cell)])),
  };
}
