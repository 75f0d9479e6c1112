import { codata2018 } from "./constants/codata-2018";
import { codata2022 } from "./constants/codata-2022";
import { type Dimension, dimension } from "./dimension";
import { prefixes } from "./prefixes";
import type { EditionName, EmConvention, UnitSystem } from "./unit-system";
import { type UnitRow, unitRows } from "./units";

/** A unit as found: one symbol, with its prefix, under an edition and a convention. */
export interface Unit {
  /** As it is shown: `kpc`, `Msun`, `µJy`. */
  readonly symbol: string;
  /** To coherent SI; Gaussian units to kg, m and s with half powers. */
  readonly factor: number;
  readonly dimension: Dimension;
  /** The nominal GM of a body mass: the factor is this over the edition's G. */
  readonly nominalGM?: number;
  /** Set for a unit that only one electromagnetic convention has in this sense. */
  readonly conventionOnly?: EmConvention;
  /** Its row in the table, for the symbol without the prefix. */
  readonly row: UnitRow;
}

/** A row of the table as help and completion show it: with its factor settled. */
export interface ListedUnit {
  readonly symbol: string;
  readonly name: string;
  readonly aliases: readonly string[];
  readonly dimension: Dimension;
  /** To coherent SI, under the edition and the convention asked for. */
  readonly factor: number;
  readonly prefixes: readonly string[];
  readonly source: string;
}

const kilogram = dimension({ mass: 1 });

function editionValue(edition: EditionName, symbol: string): number {
  const rows = edition === "codata-2018" ? codata2018 : codata2022;
  return Number(rows.find((row) => row.symbol === symbol)?.value);
}

function toUnit(row: UnitRow, prefix: string, system: UnitSystem): Unit {
  const symbol = prefix === "u" ? `µ${row.symbol}` : prefix + row.symbol;
  if (row.massParameter) {
    const factor = row.factor / editionValue(system.edition, "G");
    return { symbol, factor, dimension: kilogram, nominalGM: row.factor, row };
  }
  const scale = prefixes[prefix] ?? 1;
  // The atomic mass unit is measured, so it is the edition's.
  const factor = Number.isNaN(row.factor) ? editionValue(system.edition, "u_amu") : row.factor;
  const only = row.convention === undefined ? {} : { conventionOnly: row.convention };
  return { symbol, factor: factor * scale, dimension: row.dimension, row, ...only };
}

function rowsOf(em: EmConvention): readonly UnitRow[] {
  return unitRows.filter((row) => row.convention === undefined || row.convention === em);
}

/** A row, and the prefix that stands before its name. */
interface Entry {
  readonly row: UnitRow;
  readonly prefix: string;
}

/** Whole names come first, so that `min` is a minute, `cd` a candela and `mas` an angle. */
function readIndex(em: EmConvention): Map<string, Entry> {
  const index = new Map<string, Entry>();
  const add = (name: string, entry: Entry) => index.has(name) || index.set(name, entry);
  const rows = rowsOf(em);
  for (const row of rows) {
    for (const name of [row.symbol, ...row.aliases]) add(name, { row, prefix: "" });
  }
  for (const row of rows) {
    const names = [row.symbol, ...row.aliases, ...(row.prefixedAliases ?? [])];
    for (const prefix of row.prefixes) {
      for (const name of names) add(prefix + name, { row, prefix });
    }
  }
  return index;
}

const indices = new Map<EmConvention, Map<string, Entry>>();

function indexOf(em: EmConvention): Map<string, Entry> {
  const index = indices.get(em) ?? readIndex(em);
  indices.set(em, index);
  return index;
}

/** Units as found so far; there are no more than names in the indices. */
const found = new Map<string, Unit>();

/** One unit by its exact symbol, prefix included; undefined where it is none under the convention. */
export function findUnit(name: string, system: UnitSystem): Unit | undefined {
  const plain = name.length > 1 ? name.replace(/^[µμ]/u, "u") : name;
  const entry = indexOf(system.em).get(plain);
  if (!entry) return undefined;
  const key = `${system.edition} ${system.em} ${plain}`;
  const unit = found.get(key) ?? toUnit(entry.row, entry.prefix, system);
  found.set(key, unit);
  return unit;
}

const current = 3;

/**
 * True for a unit that belongs to the other electromagnetic convention: `esu` in an SI calculation,
 * where it is no unit at all; `T` or `C` in a Gaussian one, where it keeps its SI dimension, so that
 * mixing it with Gaussian quantities is a dimension error that can name the converter.
 */
export function unitOfOtherConvention(name: string, em: EmConvention): boolean {
  const here = findUnit(name, { edition: "codata-2018", em });
  if (em === "gaussian") return here !== undefined && here.dimension.exponents[current]?.n !== 0n;
  return !here && findUnit(name, { edition: "codata-2018", em: "gaussian" }) !== undefined;
}

/** Every unit of a convention, in the order of the table. */
export function listUnits(system: UnitSystem): ListedUnit[] {
  return rowsOf(system.em).map((row) => {
    const { symbol, name, aliases, prefixes: allowed, source } = row;
    const { factor, dimension: of } = toUnit(row, "", system);
    return { symbol, name, aliases, dimension: of, factor, prefixes: allowed, source };
  });
}
