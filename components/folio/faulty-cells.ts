import type { CalculationFile, EvaluateAnswer } from "@/lib/schema";

/** A cell with an error, by the name that a reader finds it by. */
export interface FaultyCell {
  readonly id: string;
  readonly name: string;
  readonly message: string;
}

/** The cells that have errors, in reading order. */
export function faultyCells(file: CalculationFile, answer: EvaluateAnswer): FaultyCell[] {
  return file.cells.flatMap((cell, index) => {
    const result = answer.cells[cell.id];
    if (result?.status !== "error") return [];
    const name =
      "symbol" in cell && cell.symbol ? cell.symbol : `${cell.kind} in cell ${index + 1}`;
    return [{ id: cell.id, name, message: result.error.message }];
  });
}
