import type { Dimension } from "./dimension";
import { baseUnits, customaryUnit } from "./dimension-names";
import { parseUnit } from "./parse-unit";
import type { EmConvention, UnitSystem } from "./unit-system";

/**
 * Ladders of units that the field reads a quantity in; the largest one that leaves the number at 1 or
 * more is taken, from the value in SI.
 */
const ladders: readonly (readonly string[])[] = [
  ["fm", "pm", "nm", "µm", "cm", "km", "Rsun", "au", "pc", "kpc", "Mpc", "Gpc"],
  ["ns", "µs", "ms", "s", "day", "yr", "Myr", "Gyr"],
  ["Hz", "kHz", "MHz", "GHz", "THz"],
  ["g", "Msun"],
  ["µK", "mK", "K"],
  ["cm/s", "km/s"],
  ["mas", "arcsec"],
  ["µeV", "meV", "eV", "keV", "MeV", "GeV", "erg"],
  ["µgauss", "mgauss", "gauss"],
  ["µJy", "mJy", "Jy"],
];

/** Mass rates are read in solar masses a year wherever they are not tiny. */
const preferred: readonly (readonly [unit: string, least: number])[] = [["Msun/yr", 1e-14]];

const factors = new Map<string, Map<Dimension, readonly (readonly [string, number])[]>>();

function laddersFor(em: EmConvention) {
  const known = factors.get(em);
  if (known) return known;
  const system: UnitSystem = { edition: "codata-2018", em };
  const table = new Map<Dimension, readonly (readonly [string, number])[]>();
  for (const ladder of ladders) {
    const steps = ladder.flatMap((unit) => {
      const parsed = parseUnit(unit, system);
      return parsed.ok ? [{ unit, factor: parsed.factor, dimension: parsed.dimension }] : [];
    });
    const of = steps[0]?.dimension;
    if (of && of.key !== "0,0,0,0,0,0,0" && !table.has(of)) {
      table.set(
        of,
        steps.map(({ unit, factor }) => [unit, factor] as const),
      );
    }
  }
  factors.set(em, table);
  return table;
}

function preferredUnit(of: Dimension, size: number, em: EmConvention): string | undefined {
  const system: UnitSystem = { edition: "codata-2018", em };
  for (const [unit, least] of preferred) {
    const parsed = parseUnit(unit, system);
    if (parsed.ok && parsed.dimension === of && size / parsed.factor >= least) return unit;
  }
  return undefined;
}

/**
 * A readable unit for a value of this dimension, as the field would choose it: by its size where there
 * is a ladder, else the customary unit, else base units in CGS. Always a valid unit of the dimension.
 */
export function readableUnit(of: Dimension, siValue: number, em: EmConvention): string {
  const size = Math.abs(siValue);
  const chosen = preferredUnit(of, size, em);
  if (chosen !== undefined) return chosen;
  const ladder = laddersFor(em).get(of);
  if (ladder) {
    const fitting = ladder.filter(([, factor]) => size >= factor * 0.999_999);
    return (fitting[fitting.length - 1] ?? ladder[0] ?? ["", 1])[0];
  }
  return customaryUnit(of, em) ?? baseUnits(of);
}
