import type { Dimension } from "./dimension";
import { parseUnit } from "./parse-unit";

/**
 * The bridge between the electromagnetic conventions: a table of corresponding units, since it cannot
 * be had by unit algebra (Jackson, Classical Electrodynamics, 3rd ed., appendix, table 3;
 * from memory, checked against a general-purpose library).
 * The factors are taken as exact, c = 2.99792458e10 cm/s; since 2019 they rest on mu_0 = 4 pi 1e-7
 * N/A^2 to 2e-10 relative.
 */
const c = 299792458;

/**
 * Name, SI unit, Gaussian unit, and how many of the latter correspond to one of the former. Where
 * several rows share a dimension on one side, the first of them is meant unless a target is named:
 * A/m is a field strength before a magnetisation, gauss a magnetic flux density before anything else.
 */
const correspondences: readonly (readonly [string, string, string, number])[] = [
  ["charge", "C", "esu", 10 * c],
  ["current", "A", "statA", 10 * c],
  ["potential", "V", "statV", 1e6 / c],
  ["magnetic flux density", "T", "gauss", 1e4],
  ["electric field", "V/m", "statV/cm", 1e4 / c],
  ["magnetic field strength", "A/m", "Oe", 4 * Math.PI * 1e-3],
  ["electric displacement", "C/m^2", "statV/cm", 4 * Math.PI * 1e-3 * c],
  ["magnetic flux", "Wb", "Mx", 1e8],
  ["magnetic moment", "A m^2", "erg/gauss", 1e3],
  ["electric dipole moment", "C m", "esu cm", 1e3 * c],
  ["vector potential", "T m", "gauss cm", 1e6],
  ["charge density", "C/m^3", "esu/cm^3", 10 * c * 1e-6],
  ["current density", "A/m^2", "statA/cm^2", 10 * c * 1e-4],
  ["resistance", "ohm", "s/cm", 1e5 / c ** 2],
  ["resistivity", "ohm m", "s", 1e7 / c ** 2],
  ["conductivity", "S/m", "s^-1", c ** 2 * 1e-7],
  ["capacitance", "F", "cm", c ** 2 * 1e-5],
  ["inductance", "H", "s^2/cm", 1e5 / c ** 2],
];

/** How the value of an electromagnetic quantity passes from one convention to the other. */
export interface Conversion {
  readonly quantity: string;
  /** Multiply a value in coherent SI units by this for the value in coherent units of the other side. */
  readonly factor: number;
  /** The dimension on the other side. */
  readonly dimension: Dimension;
}

interface Correspondence {
  readonly quantity: string;
  readonly si: Dimension;
  readonly gaussian: Dimension;
  /** From coherent SI to coherent Gaussian units in kg, m and s. */
  readonly factor: number;
}

function read([quantity, siUnit, gaussianUnit, count]: (typeof correspondences)[number]) {
  const si = parseUnit(siUnit, { edition: "codata-2018", em: "si" });
  const gaussian = parseUnit(gaussianUnit, { edition: "codata-2018", em: "gaussian" });
  if (!si.ok || !gaussian.ok) throw new Error(`no unit ${siUnit} or ${gaussianUnit}`);
  const factor = (count * gaussian.factor) / si.factor;
  return { quantity, si: si.dimension, gaussian: gaussian.dimension, factor };
}

let table: readonly Correspondence[] | undefined;

function rows(): readonly Correspondence[] {
  table ??= correspondences.map(read);
  return table;
}

/**
 * How an electromagnetic quantity of SI converts to Gaussian; undefined for other dimensions. A/m is
 * taken as a field strength H (4π·10⁻³ Oe), not as a magnetisation (10⁻³), C/m² as a displacement D.
 */
export function toGaussian(siDimension: Dimension): Conversion | undefined {
  const row = rows().find(({ si }) => si === siDimension);
  return row && { quantity: row.quantity, factor: row.factor, dimension: row.gaussian };
}

/** Half powers of mass are what only a Gaussian electromagnetic quantity has. */
function isElectromagnetic(gaussian: Dimension): boolean {
  return gaussian.exponents.some((exponent) => exponent.d === 2n);
}

/**
 * How a Gaussian quantity converts to SI. Several quantities share a Gaussian dimension; without the
 * SI dimension wanted as `target`, M^½ L^-½ T^-1 (B, E, H, D) gives tesla, M^½ L^3/2 T^-1 (charge,
 * flux) coulomb, M^½ L^½ T^-1 (potential, vector potential) volt, M^½ L^5/2 T^-1 (moments) A m².
 * Purely mechanical dimensions (a capacitance in cm, a conductivity in s^-1) convert to a target only.
 */
export function toSi(gaussianDimension: Dimension, target?: Dimension): Conversion | undefined {
  const row = rows().find(({ gaussian, si }) =>
    target === undefined
      ? gaussian === gaussianDimension && isElectromagnetic(gaussian)
      : gaussian === gaussianDimension && si === target,
  );
  return row && { quantity: row.quantity, factor: 1 / row.factor, dimension: row.si };
}
