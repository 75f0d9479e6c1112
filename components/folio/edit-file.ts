import type { CalculationFile, Cell } from "@/lib/schema";

/** Changes to a calculation, each a new file; the old one is never touched. */

const alphabet = "abcdefghjkmnpqrstvwxyz0123456789";

/** An id that no cell of the file has; random, so that two browsers hardly ever choose the same. */
export function newCellId(file: CalculationFile, random: () => number = Math.random): string {
  for (;;) {
    const letters = Array.from(
      { length: 6 },
      () => alphabet[Math.floor(random() * alphabet.length)],
    );
    const id = `c${letters.join("")}`;
    if (!file.cells.some((cell) => cell.id === id)) return id;
  }
}

export function findCell(file: CalculationFile, id: string | null): Cell | undefined {
  return file.cells.find((cell) => cell.id === id);
}

/** Put a cell behind another one; at the end without one. */
export function insertCell(
  file: CalculationFile,
  cell: Cell,
  after: string | null,
): CalculationFile {
  const at = after === null ? -1 : file.cells.findIndex((one) => one.id === after);
  const index = at < 0 ? file.cells.length : at + 1;
  return { ...file, cells: [...file.cells.slice(0, index), cell, ...file.cells.slice(index)] };
}

export function replaceCell(file: CalculationFile, cell: Cell): CalculationFile {
  return { ...file, cells: file.cells.map((one) => (one.id === cell.id ? cell : one)) };
}

export function removeCell(file: CalculationFile, id: string): CalculationFile {
  return { ...file, cells: file.cells.filter((cell) => cell.id !== id) };
}

/** Move a cell to a place; places beyond the ends mean the ends. */
export function moveCellTo(file: CalculationFile, id: string, index: number): CalculationFile {
  const cell = findCell(file, id);
  if (!cell) return file;
  const others = file.cells.filter((one) => one.id !== id);
  const place = Math.max(0, Math.min(others.length, index));
  return { ...file, cells: [...others.slice(0, place), cell, ...others.slice(place)] };
}

export function moveCellBy(file: CalculationFile, id: string, by: number): CalculationFile {
  const at = file.cells.findIndex((cell) => cell.id === id);
  return at < 0 ? file : moveCellTo(file, id, at + by);
}

/** A copy behind the original; its symbol gets a number, since each symbol is defined once. */
export function duplicateCell(file: CalculationFile, id: string, newId: string): CalculationFile {
  const cell = findCell(file, id);
  if (!cell) return file;
  const copy = { ...cell, id: newId };
  if ("symbol" in copy) copy.symbol = freeSymbol(file, copy.symbol);
  return insertCell(file, copy, id);
}

function freeSymbol(file: CalculationFile, symbol: string): string {
  const [, stem = symbol, parameters = ""] = /^([^(]*)(\(.*)?$/.exec(symbol) ?? [];
  const taken = new Set(file.cells.map((cell) => ("symbol" in cell ? cell.symbol : "")));
  for (let number = 2; ; number++) {
    const candidate = `${stem}_${number}${parameters}`;
    if (!taken.has(candidate)) return candidate;
  }
}
