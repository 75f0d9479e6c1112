import { parseUnit, type UnitSystem } from "../physics";
import type { Cell, CheckCell, GivenCell, RelationCell, TextCell } from "../schema/calculation";
import { readValue } from "./entry-value";
import { greekNames } from "./normalise";
import { valueLine } from "./value-line";

/**
 * The one-line entry: a line of typing and the cell it makes, both ways. Light enough for a browser:
 * it looks at the shape of the line and at units, and leaves formulas to the engine.
 */

/** A cell that has no id yet. */
export type NewCell = DistributiveOmit<Cell, "id">;
type DistributiveOmit<T, K extends PropertyKey> = T extends unknown ? Omit<T, K> : never;

const name = "[\\p{L}][\\p{L}\\p{N}_\\p{M}⊙☉⊕₀-₉]*";
const definition = new RegExp(`^\\s*(${name}(?:\\s*\\([^()=]*\\))?)\\s*=(?![=>])\\s*(.*)$`, "su");
// An arrow (`->`, `=>`) compares nothing.
const comparison = /<=|>=|==|!=|[<≤≥≠]|(?<![-=])>/;

/** True where a line compares two things rather than being a sentence with a `<` in it. */
function looksLikeCondition(line: string): boolean {
  const match = comparison.exec(line);
  if (!match) return false;
  const [before, after] = [line.slice(0, match.index), line.slice(match.index + match[0].length)];
  return isFormulaLike(before) && isFormulaLike(after);
}

const prose = /[\p{L}]{2,}[ ,;:.]+[\p{L}]{3,}[ ,;:.]+[\p{L}]{2,}/u;

/** Words that stand side by side in formulas as they do in prose. */
const formulaWords = new RegExp(
  `(?<!\\p{L})(?:and|or|not|\\p{L}+dot|${[...greekNames].join("|")})(?!\\p{L})`,
  "gu",
);
/** A colon belongs to a formula behind a question mark only. */
const foreign = /[$`#"“”;]|^[^?]*:/;

function isFormulaLike(part: string): boolean {
  return part.trim() !== "" && !foreign.test(part) && !prose.test(part.replace(formulaWords, "+"));
}

function toGiven(symbol: string, right: string, system: UnitSystem): NewCell | undefined {
  const read = readValue(right);
  if (!read || symbol.includes("(")) return undefined;
  const { unit, ...value } = read;
  const trimmed = unit.trim();
  const isUnit = parseUnit(trimmed, system).ok;
  const statesUncertainty = Object.keys(value).length > 1;
  if (!isUnit && !statesUncertainty) return undefined;
  // A file holds finite numbers only; as a formula it gets the engine's fault.
  if (!Object.values(value).flat().every(Number.isFinite)) return undefined;
  return { kind: "given", symbol, ...value, ...(trimmed ? { unit: trimmed } : {}) };
}

/** `formula to unit`, taken apart so that the unit stands in its own field. */
function splitUnit(right: string): { formula: string; unit?: string } {
  const match = /^(.*\S)\s+to\s+(\S.*)$/su.exec(right);
  return match ? { formula: match[1] ?? right, unit: (match[2] ?? "").trim() } : { formula: right };
}

/**
 * The cell that a line of typing makes: `M = 10 Msun` a given, `L = …names…` a relation, `x > y` a
 * check, anything else text. Never fails: what cannot be read as one kind is kept as another.
 */
export function readEntry(line: string, system: UnitSystem): NewCell {
  const match = definition.exec(line);
  if (match) {
    const symbol = (match[1] ?? "").trim();
    const right = (match[2] ?? "").trim();
    const split = splitUnit(right);
    const hasUnit = split.unit !== undefined && parseUnit(split.unit, system).ok;
    if (isFormulaLike(hasUnit ? split.formula : right) || readValue(right)) {
      return toGiven(symbol, right, system) ?? { kind: "relation", symbol, ...split };
    }
  }
  if (looksLikeCondition(line)) return { kind: "check", condition: line.trim() };
  return { kind: "text", markdown: line.trim() };
}

function relationLine(cell: RelationCell): string {
  const unit = cell.unit ? ` to ${cell.unit}` : "";
  return `${cell.symbol} = ${cell.formula}${unit}`;
}

const lines: { [K in Cell["kind"]]?: (cell: never) => string } = {
  given: (cell: GivenCell) => `${cell.symbol} = ${valueLine(cell)}`,
  relation: relationLine,
  check: (cell: CheckCell) => cell.condition,
  text: (cell: TextCell) => cell.markdown,
};

/** The line that makes this cell; for text its prose, for kinds without a line nothing. */
export function cellLine(cell: Cell): string {
  return lines[cell.kind]?.(cell as never) ?? "";
}

/**
 * The cell after its line was edited: what the line says, with the note, source and fiducial that a
 * line does not show kept from before.
 */
export function editedCell(cell: Cell, line: string, system: UnitSystem): Cell {
  const made = readEntry(line, system);
  const kept: Record<string, unknown> = {};
  for (const field of ["note", "source", "because", "fiducial"] as const) {
    const value = (cell as Record<string, unknown>)[field];
    if (value !== undefined && made.kind === cell.kind) kept[field] = value;
  }
  if (sameInterval(made, cell)) kept.value = cell.value;
  return { ...made, ...kept, id: cell.id } as Cell;
}

/** An interval's line does not show a value off its middle; while the interval stays, so does it. */
function sameInterval(made: NewCell, cell: Cell): cell is GivenCell {
  if (made.kind !== "given" || cell.kind !== "given") return false;
  return made.interval !== undefined && String(made.interval) === String(cell.interval);
}

/** Where a field of a cell begins in its line, so that a fault can be marked there. */
export function fieldOffset(cell: Cell, field: string): number {
  const line = cellLine(cell);
  if (cell.kind === "relation" && field === "formula") return cell.symbol.length + 3;
  if ((cell.kind === "given" || cell.kind === "relation") && field === "unit" && cell.unit) {
    return cell.kind === "given"
      ? line.indexOf(` ${cell.unit}`) + 1
      : line.length - cell.unit.length;
  }
  if (cell.kind === "given" && field === "value") return cell.symbol.length + 3;
  return 0;
}
