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
  readonly row: UnitRow;
}

const kilogram = dimension({ mass: 1 });

function editionValue(edition: EditionName, symbol: string): number {
  const rows = edition === "codata-2018" ? codata2018 : codata2022;
  return Number(rows.find((row) => row.symbol === symbol)?.value);
}

function toUnit(row: UnitRow, prefix: string, system: UnitSystem): Unit {
  const scale = prefix === "" ? 1 : (prefixes[prefix] ?? 1);
  const symbol = prefix === "μ" || prefix === "u" ? `µ${row.symbol}` : prefix + row.symbol;
  if (row.massParameter) {
    const factor = row.factor / editionValue(system.edition, "G");
    return { symbol, factor, dimension: kilogram, nominalGM: row.factor, row };
  }
  // The atomic mass unit is measured, so it is the edition's.
  const factor = Number.isNaN(row.factor) ? editionValue(system.edition, "u_amu") : row.factor;
  return { symbol, factor: factor * scale, dimension: row.dimension, row };
}

function applies(row: UnitRow, em: EmConvention): boolean {
  return row.convention === undefined || row.convention === em;
}

function search(name: string, system: UnitSystem): Unit | undefined {
  const rows = unitRows.filter((row) => applies(row, system.em));
  const exact = rows.find((row) => row.symbol === name || row.aliases.includes(name));
  if (exact) return toUnit(exact, "", system);
  for (const row of rows) {
    for (const prefix of row.prefixes) {
      if ([row.symbol, ...row.aliases].some((one) => prefix + one === name)) {
        return toUnit(row, prefix, system);
      }
    }
  }
  return undefined;
}

const found = new Map<string, Unit | undefined>();
const mostFound = 5_000;

/** One unit by its exact symbol, prefix included; undefined where it is none under the convention. */
export function findUnit(name: string, system: UnitSystem): Unit | undefined {
  const key = `${name} ${system.edition} ${system.em}`;
  if (found.has(key)) return found.get(key);
  if (found.size >= mostFound) found.clear();
  const unit = search(name, system);
  found.set(key, unit);
  return unit;
}

/** True for a unit that only the other electromagnetic convention has. */
export function unitOfOtherConvention(name: string, em: EmConvention): boolean {
  const other = { edition: "codata-2018", em: em === "si" ? "gaussian" : "si" } as const;
  const here = { edition: "codata-2018", em } as const;
  return findUnit(name, here) === undefined && findUnit(name, other) !== undefined;
}

/** Every unit of a convention, in the order of the table. */
export function listUnits(system: UnitSystem): readonly (UnitRow & { readonly unit: Unit })[] {
  return unitRows
    .filter((row) => applies(row, system.em))
    .map((row) => ({ ...row, unit: toUnit(row, "", system) }));
}
