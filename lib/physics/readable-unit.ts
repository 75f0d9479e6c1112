import type { Dimension } from "./dimension";
import { baseUnits, customaryUnit } from "./dimension-names";
import { parseUnit } from "./parse-unit";
import type { EmConvention, UnitSystem } from "./unit-system";

/** A unit, and the least number of it at which it is taken; 1 where nothing is said. */
type Rung = string | readonly [unit: string, least: number];

/**
 * Ladders of units that the field reads a quantity in, upwards: the last one is taken whose least
 * number is reached, or the first. Solar masses begin early, since a ten-thousandth of one is still
 * an ejecta mass; a flux density far beyond a megajansky is one at the source.
 */
const ladders: readonly (readonly Rung[])[] = [
  ["fm", "pm", "nm", "µm", "mm", "cm", "km", "Rsun", "au", "pc", "kpc", "Mpc", "Gpc"],
  ["ns", "µs", "ms", "s", "day", "yr", "Myr", "Gyr"],
  ["s^-1", "Hz", "kHz", "MHz", "GHz", "THz"],
  ["g", ["Msun", 1e-4]],
  ["g/s", ["Msun/yr", 1e-14]],
  ["µK", "mK", "K"],
  ["cm/s", "km/s"],
  ["µeV", "meV", "eV", "keV", "MeV", "GeV", "erg"],
  ["µgauss", "mgauss", "gauss"],
  ["µJy", "mJy", "Jy", ["erg/s/cm^2/Hz", 1e-17]],
];

interface Step {
  readonly unit: string;
  readonly dimension: Dimension;
  /** In SI. */
  readonly from: number;
}

function toStep(rung: Rung, system: UnitSystem): Step {
  const [unit, least] = typeof rung === "string" ? [rung, 1] : rung;
  const parsed = parseUnit(unit, system);
  if (!parsed.ok) throw new Error(`a ladder has ${unit}, which is no unit`);
  // A value that is one of a unit to within rounding has reached it.
  return { unit, dimension: parsed.dimension, from: least * parsed.factor * (1 - 1e-12) };
}

function readLadders(em: EmConvention): Map<Dimension, readonly Step[]> {
  const system: UnitSystem = { edition: "codata-2018", em };
  const table = new Map<Dimension, readonly Step[]>();
  for (const ladder of ladders) {
    const steps = ladder.map((rung) => toStep(rung, system));
    if (steps[0]) table.set(steps[0].dimension, steps);
  }
  return table;
}

const tables = new Map<EmConvention, ReturnType<typeof readLadders>>();

function ladderOf(of: Dimension, em: EmConvention): readonly Step[] | undefined {
  const table = tables.get(em) ?? readLadders(em);
  tables.set(em, table);
  return table.get(of);
}

/**
 * A readable unit for a value of this dimension, as the field would choose it: by its size where there
 * is a ladder, else (and for zero and what is not finite) the customary unit, else base units in CGS.
 * Always a valid unit of the dimension.
 */
export function readableUnit(of: Dimension, siValue: number, em: EmConvention): string {
  const size = Math.abs(siValue);
  const ladder = size > 0 && Number.isFinite(size) ? ladderOf(of, em) : undefined;
  const step = ladder?.findLast(({ from }) => size >= from) ?? ladder?.[0];
  return step?.unit ?? customaryUnit(of, em) ?? baseUnits(of);
}
