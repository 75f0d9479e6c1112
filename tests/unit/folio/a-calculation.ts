import type { CalculationFile, Cell, Draft, GivenCell, RelationCell } from "@/lib/schema";

/** Builders of small calculations, as every test of the folio needs them. */
export const given = (id: string, symbol: string, value: number, unit = ""): GivenCell => ({
  id,
  kind: "given",
  symbol,
  value,
  ...(unit ? { unit } : {}),
});

export const relation = (id: string, symbol: string, formula: string): RelationCell => ({
  id,
  kind: "relation",
  symbol,
  formula,
});

export const file = (...cells: Cell[]): CalculationFile => ({
  format: "leading-order/1",
  title: "Cooling of the inner flow",
  edition: "codata-2022",
  cells,
});

export const draft = (calculation: CalculationFile, revision = 1): Draft => ({
  id: "0123456789",
  file: calculation,
  revision,
  role: "author",
  visibility: "private",
  savedAt: "2026-12-01T12:04:31.000Z",
  versions: [],
});

export const ids = (calculation: CalculationFile): string[] =>
  calculation.cells.map((cell) => cell.id);
