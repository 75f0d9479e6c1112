import { type Dimension, dimensionless, formatDimension } from "./dimension";
import { formatUnit } from "./format-unit";
import { parseUnit } from "./parse-unit";
import type { EmConvention, UnitSystem } from "./unit-system";

/** A name that the trade gives to a dimension, with a unit one would state it in. */
type NameRow = readonly [name: string, unit: string];

/**
 * One row a dimension. Where the trade has several names for one (energy density and pressure, angular
 * velocity and rate), the plainest stands.
 */
const common: readonly NameRow[] = [
  ["length", "cm"],
  ["area", "cm^2"],
  ["volume", "cm^3"],
  ["wavenumber", "cm^-1"],
  ["time", "s"],
  ["frequency", "s^-1"],
  ["mass", "g"],
  ["temperature", "K"],
  ["amount of substance", "mol"],
  ["luminous intensity", "cd"],
  ["velocity", "cm/s"],
  ["acceleration", "cm/s^2"],
  ["momentum", "g cm/s"],
  ["force", "dyn"],
  ["energy", "erg"],
  ["luminosity", "erg/s"],
  ["energy density", "erg/cm^3"],
  ["emissivity", "erg/s/cm^3"],
  ["flux", "erg/s/cm^2"],
  ["spectral flux density", "erg/s/cm^2/Hz"],
  ["spectral luminosity per unit wavelength", "erg/s/cm"],
  ["surface density", "g/cm^2"],
  ["mass density", "g/cm^3"],
  ["number density", "cm^-3"],
  ["number density squared", "cm^-6"],
  ["emission measure", "cm^-5"],
  ["column density", "cm^-2"],
  ["particle flux", "cm^-2 s^-1"],
  ["particle flux per unit energy", "cm^-2 s^-1 erg^-1"],
  ["particle flux per unit wavelength", "cm^-3 s^-1"],
  ["number density per unit energy", "cm^-3 erg^-1"],
  ["rate coefficient", "cm^3/s"],
  ["cooling coefficient", "erg cm^3/s"],
  ["opacity", "cm^2/g"],
  ["specific volume", "cm^3/g"],
  ["mass rate", "g/s"],
  ["mass flux", "g/s/cm^2"],
  ["mass rate per volume", "g/s/cm^3"],
  ["mass per luminosity", "g s/erg"],
  ["mass per length", "g/cm"],
  ["density gradient", "g/cm^4"],
  ["pressure gradient", "dyn/cm^3"],
  ["temperature gradient", "K/cm"],
  ["phase-space density", "g s^3/cm^6"],
  ["angular momentum", "erg s"],
  ["moment of inertia", "g cm^2"],
  ["specific energy", "cm^2/s^2"],
  ["kinematic viscosity", "cm^2/s"],
  ["dynamic viscosity", "P"],
  ["specific heating rate", "erg/s/g"],
  ["entropy", "erg/K"],
  ["specific entropy", "erg/K/g"],
  ["entropy density", "erg/K/cm^3"],
  ["thermal conductivity", "erg/s/cm/K"],
  ["flux per temperature to the fourth", "erg/s/cm^2/K^4"],
  ["energy density per temperature to the fourth", "erg/cm^3/K^4"],
  ["length times temperature", "cm K"],
  ["reciprocal of a temperature", "K^-1"],
  ["mass parameter", "cm^3/s^2"],
  ["gravitational constant", "cm^3/g/s^2"],
  ["length per mass", "cm/g"],
  ["reciprocal of a mass", "g^-1"],
  ["mass squared", "g^2"],
  ["reciprocal of an energy", "erg^-1"],
  ["energy squared", "erg^2"],
  ["energy times length", "erg cm"],
  ["power per mass squared", "erg/s/g^2"],
  ["time squared", "s^2"],
  ["frequency squared", "s^-2"],
  ["time per length", "s/cm"],
  ["molar energy", "erg/mol"],
  ["molar heat capacity", "erg/mol/K"],
  ["molar mass", "g/mol"],
  ["reciprocal of an amount of substance", "mol^-1"],
  ["illuminance", "lx"],
];

const siOnly: readonly NameRow[] = [
  ["electric current", "A"],
  ["electric charge", "C"],
  ["electric potential", "V"],
  ["electric field", "V/m"],
  ["electric displacement", "C/m^2"],
  ["electric dipole moment", "C m"],
  ["magnetic field", "T"],
  ["magnetic field strength", "A/m"],
  ["magnetic flux", "Wb"],
  ["magnetic moment", "A m^2"],
  ["magnetic vector potential", "T m"],
  ["electric resistance", "ohm"],
  ["electric resistivity", "ohm m"],
  ["electric conductivity", "S/m"],
  ["capacitance", "F"],
  ["inductance", "H"],
  ["permittivity", "F/m"],
  ["permeability", "H/m"],
  ["charge density", "C/m^3"],
  ["current density", "A/m^2"],
  ["charge-to-mass ratio", "C/kg"],
  ["molar charge", "C/mol"],
];

/** The electric field shares the dimension of the magnetic one, a magnetic flux that of a charge. */
const gaussianOnly: readonly NameRow[] = [
  ["magnetic field", "gauss"],
  ["electric charge", "esu"],
  ["electric potential", "statV"],
  ["electric current", "statA"],
  ["magnetic moment", "erg/gauss"],
  ["charge density", "esu/cm^3"],
  ["current density", "statA/cm^2"],
  ["charge-to-mass ratio", "esu/g"],
];

/** What a dimension is called and stated in. */
export interface Named {
  readonly name: string;
  readonly unit: string;
}

function tableFor(em: EmConvention): Map<Dimension, Named> {
  const system: UnitSystem = { edition: "codata-2018", em };
  const table = new Map<Dimension, Named>();
  const gaussian = em === "gaussian" ? gaussianOnly : [];
  for (const [name, unit] of [...common, ...gaussian, ...siOnly]) {
    const parsed = parseUnit(unit, system);
    if (!parsed.ok) throw new Error(`the dimension ${name} has ${unit}, which is no unit`);
    if (table.has(parsed.dimension)) throw new Error(`${name} has a name already`);
    table.set(parsed.dimension, { name, unit });
  }
  table.set(dimensionless, { name: "pure number", unit: "" });
  return table;
}

const tables = new Map<EmConvention, Map<Dimension, Named>>();

/** Every dimension that has a name under a convention, with that name and a customary unit. */
export function namedDimensions(em: EmConvention): ReadonlyMap<Dimension, Named> {
  const table = tables.get(em) ?? tableFor(em);
  tables.set(em, table);
  return table;
}

function rowOf(of: Dimension, em: EmConvention): Named | undefined {
  return namedDimensions(em).get(of);
}

/** “luminosity”, “opacity”, …; undefined for a dimension that the trade has no name for. */
export function dimensionName(of: Dimension, em: EmConvention = "si"): string | undefined {
  return rowOf(of, em)?.name;
}

/** The unit one would state a named dimension in, in the unit language. */
export function customaryUnit(of: Dimension, em: EmConvention = "si"): string | undefined {
  return rowOf(of, em)?.unit;
}

/** “a luminosity (erg s⁻¹)”, “an energy (erg)”, “a quantity of dimension M L (g cm)”. */
export function describeDimension(of: Dimension, em: EmConvention = "si"): string {
  const row = rowOf(of, em);
  if (of === dimensionless) return "a pure number";
  const unit = formatUnit(row?.unit ?? baseUnits(of), { edition: "codata-2018", em });
  if (!row) return `a quantity of dimension ${formatDimension(of)} (${unit})`;
  return `${/^[aeio]/.test(row.name) ? "an" : "a"} ${row.name} (${unit})`;
}

const cgs = ["cm", "g", "s", "A", "K", "mol", "cd"];
const order = [1, 0, 2, 3, 4, 5, 6];

/** Any dimension in base units, CGS for mechanics: `g cm^-3`. */
export function baseUnits(of: Dimension): string {
  const parts = order.flatMap((i) => {
    const exponent = of.exponents[i];
    if (!exponent || exponent.equals(0)) return [];
    if (exponent.equals(1)) return [cgs[i]];
    return [
      exponent.d === 1n
        ? `${cgs[i]}^${exponent.toFraction()}`
        : `${cgs[i]}^(${exponent.toFraction()})`,
    ];
  });
  return parts.join(" ");
}
