import { distance } from "fastest-levenshtein";
import { findUnit, type ListedUnit, listUnits } from "./find-unit";
import type { UnitSystem } from "./unit-system";

/** Symbols that the unit language leaves to quantities and constants, and the name it has for them. */
const symbolsOfUnits: Readonly<Record<string, string>> = {
  G: "gauss",
  d: "day",
  h: "hr",
  a: "yr",
  b: "barn",
  R: "rayleigh",
  sec: "s",
  year: "yr",
  years: "yr",
  Msol: "Msun",
  Rsol: "Rsun",
  Lsol: "Lsun",
};

/** `pc` for `parsec`, `s` for `seconds`: the name of a unit written out. */
function writtenOut(name: string, units: readonly ListedUnit[]): string[] {
  const wanted = name.toLowerCase();
  return units
    .filter((unit) => [unit.name, `${unit.name}s`].includes(wanted))
    .map(({ symbol }) => symbol);
}

function namesOf(unit: ListedUnit): string[] {
  return [unit.symbol, ...unit.aliases];
}

/** How far a name is from a unit; a different case only is the likeliest slip. */
function closeness(name: string, candidate: string): number {
  return name.toLowerCase() === candidate.toLowerCase() ? 0.5 : distance(name, candidate);
}

/** `keV` for `KeV`, `kpc` for `KPC`: the same letters with a prefix, in another case. */
function inAnotherCase(name: string, units: readonly ListedUnit[]): string[] {
  const wanted = name.toLowerCase();
  return units.flatMap((unit) =>
    unit.prefixes
      .map((prefix) => prefix + unit.symbol)
      .filter((one) => one !== name && one.toLowerCase() === wanted),
  );
}

/** Up to three units that may have been meant by a name that is none, the likeliest first. */
export function suggestUnits(name: string, system: UnitSystem): string[] {
  const known = Object.hasOwn(symbolsOfUnits, name) ? symbolsOfUnits[name] : undefined;
  const units = listUnits(system);
  // In a short name nearly every letter counts.
  const most = name.length <= 2 ? 0.5 : name.length <= 4 ? 1 : 2;
  const close = units
    .flatMap(namesOf)
    .map((candidate) => ({ candidate, far: closeness(name, candidate) }))
    .filter(({ far }) => far <= most)
    .sort((a, b) => a.far - b.far)
    .map(({ candidate }) => candidate);
  const named = [...(known ? [known] : []), ...writtenOut(name, units)];
  const all = [...named, ...inAnotherCase(name, units), ...close];
  return [...new Set(all)].filter((one) => findUnit(one, system)).slice(0, 3);
}
