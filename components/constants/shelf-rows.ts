import {
  type Constant,
  dimensionName,
  type EmConvention,
  editionNames,
  editionTitle,
  formatDimension,
  formatUnit,
  listConstants,
  listUnits,
} from "@/lib/physics";
import { parenthesisNotation, signedPower } from "./notation";

/** A value of a constant as one edition has it. */
export interface EditionValue {
  readonly edition: string;
  readonly notation: string;
  readonly exact: boolean;
  /** For copying: the figures as published, with the unit in the language of formulas. */
  readonly typed: string;
}

export interface ConstantEntry {
  readonly symbol: string;
  readonly name: string;
  readonly unit: string;
  readonly values: readonly EditionValue[];
  readonly change: string;
  readonly sources: readonly string[];
}

export interface UnitEntry {
  readonly symbol: string;
  readonly shown: string;
  readonly name: string;
  readonly aliases: string;
  readonly prefixes: string;
  readonly dimension: string;
  readonly factor: string;
  readonly source: string;
}

function editionValue(constant: Constant, edition: string): EditionValue {
  const { text, uncertaintyText, unit, exact } = constant;
  return {
    edition,
    notation: parenthesisNotation(text, uncertaintyText),
    exact,
    typed: `${text} ${unit}`.trim(),
  };
}

/** What became of a value from one edition to the next. */
function changeBetween(old: Constant, next: Constant): string {
  if (old.text === next.text && old.uncertaintyText === next.uncertaintyText) return "unchanged";
  const moved = (next.value - old.value) / old.value;
  if (moved === 0) return "uncertainty only";
  const relative = `${signedPower(moved)} relative`;
  if (old.uncertainty === 0) return relative;
  const spreads = Math.abs(next.value - old.value) / old.uncertainty;
  return `${relative}, ${spreads.toPrecision(2)} times the old uncertainty`;
}

/** Every constant of a convention, its editions side by side. */
export function constantEntries(em: EmConvention): ConstantEntry[] {
  const tables = editionNames.map((edition) => listConstants({ edition, em }));
  const last = tables.at(-1) ?? [];
  return last.map((newest) => {
    const all = tables.flatMap((table) => table.find((one) => one.symbol === newest.symbol) ?? []);
    const oldest = all[0] ?? newest;
    return {
      symbol: newest.symbol,
      name: newest.name,
      unit: formatUnit(newest.unit, { edition: "codata-2022", em }),
      values: all.map((one, index) =>
        editionValue(one, editionTitle(editionNames[index] ?? "codata-2022")),
      ),
      change: changeBetween(oldest, newest),
      // The edition is the heading of its column.
      sources: [...new Set(all.map((one) => one.source.replace(/^CODATA \d{4}/, "CODATA")))],
    };
  });
}

/** The constants whose value differs by convention, as the Gaussian one has them. */
export function gaussianEntries(): ConstantEntry[] {
  const si = new Map(constantEntries("si").map((entry) => [entry.symbol, entry]));
  return constantEntries("gaussian").filter((entry) => entry.unit !== si.get(entry.symbol)?.unit);
}

/** True for what the IAU has set or named, rather than measured. */
export function isNominal(entry: ConstantEntry): boolean {
  return entry.sources.every((source) => source.startsWith("IAU"));
}

/** The units of a convention; of the Gaussian one those that mean something else in SI, or nothing. */
export function unitEntries(em: EmConvention): UnitEntry[] {
  const system = { edition: "codata-2022", em } as const;
  const mostPrefixes = Math.max(...listUnits(system).map((row) => row.prefixes.length));
  const others = em === "si" ? [] : listUnits({ ...system, em: "si" });
  const known = new Set(others.map((row) => `${row.symbol} ${row.factor}`));
  return listUnits(system)
    .filter((row) => !known.has(`${row.symbol} ${row.factor}`))
    .map((row) => ({
      symbol: row.symbol,
      shown: formatUnit(row.symbol, system),
      name: row.name,
      aliases: row.aliases.join(", "),
      prefixes: row.prefixes.length === mostPrefixes ? "all of the SI" : row.prefixes.join(" "),
      dimension: dimensionName(row.dimension, em) ?? formatDimension(row.dimension),
      factor: parenthesisNotation(String(row.factor), null),
      source: row.source,
    }));
}
