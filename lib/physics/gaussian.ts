import { type Dimension, dimension } from "./dimension";
import { parseUnit } from "./parse-unit";

/**
 * The bridge between the electromagnetic conventions: a table of corresponding units, since it cannot
 * be had by unit algebra (Jackson, Classical Electrodynamics, 3rd ed., appendix, table 3; from memory,
 * checked against a general-purpose library). Factors are exact numbers with c = 2.99792458e10 cm/s.
 */
const c = 299792458;

/** Name, SI unit, Gaussian unit, and how many of the latter correspond to one of the former. */
const correspondences: readonly (readonly [string, string, string, number])[] = [
  ["charge", "C", "esu", 10 * c],
  ["current", "A", "statA", 10 * c],
  ["potential", "V", "statV", 1e6 / c],
  ["electric field", "V/m", "statV/cm", 1e4 / c],
  ["magnetic flux density", "T", "gauss", 1e4],
  ["magnetic field strength", "A/m", "Oe", 4 * Math.PI * 1e-3],
  ["magnetic flux", "Wb", "Mx", 1e8],
  ["magnetic moment", "A m^2", "erg/gauss", 1e3],
  ["charge density", "C/m^3", "esu/cm^3", 10 * c * 1e-6],
  ["current density", "A/m^2", "statA/cm^2", 10 * c * 1e-4],
  ["electric displacement", "C/m^2", "statV/cm", 4 * Math.PI * 1e-3 * c],
  ["resistance", "ohm", "s/cm", 1e5 / c ** 2],
  ["conductivity", "S/m", "s^-1", c ** 2 * 1e-7],
  ["capacitance", "F", "cm", c ** 2 * 1e-5],
  ["inductance", "H", "s^2/cm", 1e5 / c ** 2],
];

export interface Conversion {
  readonly quantity: string;
  /** Multiply a value in coherent SI units by this for the value in coherent units of the other side. */
  readonly factor: number;
  readonly dimension: Dimension;
}

function build() {
  const toG = new Map<Dimension, Conversion>();
  const toS = new Map<Dimension, Conversion>();
  for (const [quantity, siUnit, gaussianUnit, count] of correspondences) {
    const si = parseUnit(siUnit, { edition: "codata-2018", em: "si" });
    const gaussian = parseUnit(gaussianUnit, { edition: "codata-2018", em: "gaussian" });
    if (!si.ok || !gaussian.ok) throw new Error(`no unit ${siUnit} or ${gaussianUnit}`);
    const factor = (count * gaussian.factor) / si.factor;
    if (!toG.has(si.dimension))
      toG.set(si.dimension, { quantity, factor, dimension: gaussian.dimension });
    if (!toS.has(gaussian.dimension)) {
      toS.set(gaussian.dimension, { quantity, factor: 1 / factor, dimension: si.dimension });
    }
  }
  return { toG, toS };
}

let tables: ReturnType<typeof build> | undefined;

/** How an electromagnetic quantity of SI converts to Gaussian; undefined for other dimensions. */
export function toGaussian(si: Dimension): Conversion | undefined {
  tables ??= build();
  return tables.toG.get(si);
}

/**
 * How a Gaussian quantity converts to SI. Fields E, D, B, H and M share one Gaussian dimension, which
 * is taken as a magnetic flux density when written in gauss would be usual: M^½ L^-½ T^-1 gives tesla.
 * Purely mechanical dimensions (a capacitance in cm, a conductivity in s^-1) are not converted back.
 */
export function toSi(gaussian: Dimension): Conversion | undefined {
  tables ??= build();
  if (gaussian === field) return tables.toS.get(gaussian) && magneticFlux(tables.toG);
  return gaussian.exponents.some((exponent) => exponent.d === 2n)
    ? tables.toS.get(gaussian)
    : undefined;
}

const field = dimension({ mass: "1/2", length: "-1/2", time: -1 });
const tesla = dimension({ mass: 1, time: -2, current: -1 });

function magneticFlux(toG: ReadonlyMap<Dimension, Conversion>): Conversion | undefined {
  const row = toG.get(tesla);
  return row && { quantity: row.quantity, factor: 1 / row.factor, dimension: tesla };
}
