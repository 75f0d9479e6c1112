import { parseUnit } from "../parse-unit";
import type { EditionName, UnitSystem } from "../unit-system";
import { codata2018 } from "./codata-2018";
import { codata2022 } from "./codata-2022";
import type { Constant, ConstantRow } from "./constant";
import { gaussianForms, gaussianOnly } from "./gaussian";
import { iauConstants } from "./iau";

const editions: Readonly<Record<EditionName, { title: string; rows: readonly ConstantRow[] }>> = {
  "codata-2018": { title: "CODATA 2018", rows: [...codata2018, ...iauConstants] },
  "codata-2022": { title: "CODATA 2022", rows: [...codata2022, ...iauConstants] },
};

/** The editions of constants, oldest first. */
export const editionNames = Object.keys(editions) as readonly EditionName[];

/** “CODATA 2018”. */
export function editionTitle(name: EditionName): string {
  return editions[name].title;
}

/**
 * Every row of an edition as canonical text; its SHA-256 is the edition's hash. Only what decides a
 * result is in it: a better wording of a name or a source leaves the hash as it is.
 */
export function editionText(name: EditionName): string {
  return JSON.stringify(
    editions[name].rows.map((row) => [
      row.symbol,
      row.value,
      row.uncertainty,
      row.unit,
      row.massParameter ?? null,
    ]),
  );
}

function gaussianForm(row: ConstantRow): ConstantRow {
  const form = gaussianForms[row.symbol];
  if (!form) return row;
  return {
    ...row,
    value: shifted(row.value, form.shift),
    uncertainty: row.uncertainty && shifted(row.uncertainty, form.shift),
    unit: form.unit,
    source: `${row.source}; 1 J/T = 10³ erg/gauss`,
  };
}

/** A decimal string times a power of ten, digit for digit. */
function shifted(text: string, by: number): string {
  const [digits = "", power = "0"] = text.split("e");
  return `${digits}e${Number(power) + by}`;
}

/** A number as a decimal string of so many digits, in the spelling of the tables. */
function decimal(value: number, digits: number): string {
  return value.toExponential(digits - 1).replace("e+", "e");
}

/** A mass parameter over G, with G's relative uncertainty. */
function massOverG(row: ConstantRow, system: UnitSystem): Constant {
  const g = findConstant("G", system) as Constant;
  const nominalGM = Number(row.massParameter);
  const value = nominalGM / g.siValue;
  const uncertainty = (value * g.siUncertainty) / g.siValue;
  return finish(
    { ...row, value: decimal(value, 12), uncertainty: decimal(uncertainty, 2) },
    value,
    uncertainty,
    system,
    nominalGM,
  );
}

function finish(
  row: ConstantRow,
  value: number,
  uncertainty: number,
  system: UnitSystem,
  nominalGM?: number,
): Constant {
  const unit = parseUnit(row.unit, system);
  if (!unit.ok) throw new Error(`the constant ${row.symbol} has the unknown unit ${row.unit}`);
  return {
    symbol: row.symbol,
    name: row.name,
    text: row.value,
    value,
    uncertainty,
    uncertaintyText: row.uncertainty,
    unit: row.unit,
    siValue: value * unit.factor,
    siUncertainty: uncertainty * unit.factor,
    dimension: unit.dimension,
    exact: row.uncertainty === null,
    source: row.source,
    sourceStatus: row.sourceStatus,
    ...(nominalGM === undefined ? {} : { nominalGM }),
  };
}

function build(row: ConstantRow, system: UnitSystem): Constant {
  if (row.massParameter !== undefined) return massOverG(row, system);
  return finish(row, Number(row.value), Number(row.uncertainty ?? 0), system);
}

const tables = new Map<string, Map<string, Constant>>();

function tableOf(system: UnitSystem): Map<string, Constant> {
  const key = `${system.edition} ${system.em}`;
  const known = tables.get(key);
  if (known) return known;
  const table = new Map<string, Constant>();
  tables.set(key, table);
  const gaussian = system.em === "gaussian";
  const { rows } = editions[system.edition];
  // Masses divide by G, so they are built last.
  const ordered = [...rows.filter((r) => !r.massParameter), ...rows.filter((r) => r.massParameter)];
  for (const row of gaussian ? [...ordered, gaussianOnly] : ordered) {
    table.set(row.symbol, build(gaussian ? gaussianForm(row) : row, system));
  }
  return table;
}

/** A constant of the edition, under the convention of the calculation. */
export function findConstant(symbol: string, system: UnitSystem): Constant | undefined {
  return tableOf(system).get(symbol);
}

/** Every constant of the edition, in the order of its table. */
export function listConstants(system: UnitSystem): Constant[] {
  return [...tableOf(system).values()];
}

export type { Constant } from "./constant";
