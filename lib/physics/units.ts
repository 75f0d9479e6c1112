import { type Dimension, dimension, dimensionless, multiplyDimensions } from "./dimension";
import { allPrefixes } from "./prefixes";
import type { EmConvention } from "./unit-system";

/** One unit as it stands in the table; `find-unit.ts` looks it up, with prefixes. */
export interface UnitRow {
  readonly symbol: string;
  readonly name: string;
  readonly aliases: readonly string[];
  /** Names that hold behind a prefix only: `µG` is a microgauss, `G` alone the constant. */
  readonly prefixedAliases?: readonly string[];
  readonly dimension: Dimension;
  /**
   * To coherent SI; for the body masses, the nominal GM, to be divided by the edition's G; not a
   * number for the atomic mass unit, which is the edition's.
   */
  readonly factor: number;
  readonly prefixes: readonly string[];
  readonly source: string;
  readonly massParameter?: true;
  /** A unit of one electromagnetic convention only. */
  readonly convention?: EmConvention;
}

const length = dimension({ length: 1 });
const mass = dimension({ mass: 1 });
const time = dimension({ time: 1 });
const frequency = dimension({ time: -1 });
const force = dimension({ length: 1, mass: 1, time: -2 });
const energy = dimension({ length: 2, mass: 1, time: -2 });
const power = dimension({ length: 2, mass: 1, time: -3 });
const pressure = dimension({ length: -1, mass: 1, time: -2 });
const area = dimension({ length: 2 });
const charge = dimension({ current: 1, time: 1 });
const potential = dimension({ length: 2, mass: 1, time: -3, current: -1 });
const fluxDensity = dimension({ mass: 1, time: -2, current: -1 });

/** Gaussian dimensions: those of g^½ cm^½ s^-1 and its kin. */
const gaussianField = dimension({ mass: "1/2", length: "-1/2", time: -1 });
const gaussianCharge = dimension({ mass: "1/2", length: "3/2", time: -1 });
const gaussianPotential = dimension({ mass: "1/2", length: "1/2", time: -1 });

/** g^½ cm^½ in kg^½ m^½, and so on: the coherent factors of the Gaussian units. */
const gaussianFieldFactor = Math.sqrt(0.1);
const gaussianChargeFactor = Math.sqrt(1e-9);
const gaussianPotentialFactor = Math.sqrt(1e-5);

const brochure = "SI Brochure, 9th edition (BIPM 2019)";
const sp811 = "NIST SP 811 (2008), appendix B";
const iauStyle = "IAU Style Manual (Wilkins 1989)";
const iau2015 = "IAU 2015 Resolution B3";
const byDefinition = "by definition";
const large = ["k", "M", "G"];
const wide = ["p", "n", "u", "m", "k", "M", "G", "T", "P"];
const si = allPrefixes;
const none: readonly string[] = [];

type Options = Partial<
  Pick<UnitRow, "aliases" | "prefixedAliases" | "massParameter" | "convention">
>;

function row(
  symbol: string,
  name: string,
  of: Dimension,
  factor: number,
  allowed: readonly string[],
  source: string,
  options: Options = {},
): UnitRow {
  return {
    symbol,
    name,
    dimension: of,
    factor,
    prefixes: allowed,
    source,
    aliases: [],
    ...options,
  };
}

/** The units of the language, one row each. */
export const unitRows: readonly UnitRow[] = [
  row("m", "metre", length, 1, si, brochure),
  row("g", "gram", mass, 1e-3, si, brochure),
  row("s", "second", time, 1, si, brochure),
  row("A", "ampere", dimension({ current: 1 }), 1, si, brochure),
  row("K", "kelvin", dimension({ temperature: 1 }), 1, si, brochure),
  row("mol", "mole", dimension({ amount: 1 }), 1, si, brochure),
  row("cd", "candela", dimension({ "luminous intensity": 1 }), 1, si, brochure),
  row("Hz", "hertz", frequency, 1, si, brochure),
  row("N", "newton", force, 1, si, brochure),
  row("Pa", "pascal", pressure, 1, si, brochure),
  row("J", "joule", energy, 1, si, brochure),
  row("W", "watt", power, 1, si, brochure),
  row("C", "coulomb", charge, 1, si, brochure),
  row("V", "volt", potential, 1, si, brochure),
  row("F", "farad", dimension({ length: -2, mass: -1, time: 4, current: 2 }), 1, si, brochure),
  row("ohm", "ohm", dimension({ length: 2, mass: 1, time: -3, current: -2 }), 1, si, brochure, {
    aliases: ["Ω"],
  }),
  row("S", "siemens", dimension({ length: -2, mass: -1, time: 3, current: 2 }), 1, si, brochure),
  row("Wb", "weber", dimension({ length: 2, mass: 1, time: -2, current: -1 }), 1, si, brochure),
  row("T", "tesla", fluxDensity, 1, si, brochure),
  row("H", "henry", dimension({ length: 2, mass: 1, time: -2, current: -2 }), 1, si, brochure),
  row("lm", "lumen", dimension({ "luminous intensity": 1 }), 1, si, brochure),
  row("lx", "lux", dimension({ "luminous intensity": 1, length: -2 }), 1, si, brochure),
  row("Bq", "becquerel", frequency, 1, si, brochure),
  row("Gy", "gray", dimension({ length: 2, time: -2 }), 1, ["n", "u", "m", "c", "k"], brochure),
  row("Sv", "sievert", dimension({ length: 2, time: -2 }), 1, ["n", "u", "m"], brochure),
  row("kat", "katal", dimension({ amount: 1, time: -1 }), 1, si, brochure),
  row("rad", "radian", dimensionless, 1, ["m", "u", "n"], brochure),
  row("sr", "steradian", dimensionless, 1, ["m", "u"], brochure),

  row("erg", "erg", energy, 1e-7, ["k", "M"], sp811),
  row("dyn", "dyne", force, 1e-5, ["k", "M"], sp811, { aliases: ["dyne"] }),
  row("Ba", "barye", pressure, 0.1, none, sp811),
  row("P", "poise", dimension({ mass: 1, length: -1, time: -1 }), 0.1, ["c", "m"], sp811),
  row("St", "stokes", dimension({ length: 2, time: -1 }), 1e-4, ["c"], sp811),
  row("Gal", "gal", dimension({ length: 1, time: -2 }), 0.01, ["m", "u"], sp811),

  row("eV", "electronvolt", energy, 1.602176634e-19, si, brochure),
  row("u", "unified atomic mass unit", mass, Number.NaN, none, brochure),
  row("Da", "dalton", mass, Number.NaN, ["k", "M"], brochure),
  row("Msun", "solar mass (nominal GM over G)", mass, 1.3271244e20, none, iau2015, {
    aliases: ["M_sun", "M⊙", "M☉"],
    massParameter: true,
  }),
  row("Mearth", "Earth mass (nominal GM over G)", mass, 3.986004e14, none, iau2015, {
    aliases: ["M_earth", "M⊕"],
    massParameter: true,
  }),
  row("Mjup", "Jupiter mass (nominal GM over G)", mass, 1.2668653e17, none, iau2015, {
    aliases: ["M_jup"],
    massParameter: true,
  }),
  row("Rsun", "nominal solar radius", length, 6.957e8, none, iau2015, {
    aliases: ["R_sun", "R⊙", "R☉"],
  }),
  row("Rearth", "nominal terrestrial equatorial radius", length, 6.3781e6, none, iau2015, {
    aliases: ["R_earth", "R⊕"],
  }),
  row("Rjup", "nominal jovian equatorial radius", length, 7.1492e7, none, iau2015, {
    aliases: ["R_jup"],
  }),
  row("Lsun", "nominal solar luminosity", power, 3.828e26, none, iau2015, {
    aliases: ["L_sun", "L⊙", "L☉"],
  }),
  row("au", "astronomical unit", length, 149597870700, none, "IAU 2012 Resolution B2", {
    aliases: ["AU"],
  }),
  row(
    "pc",
    "parsec",
    length,
    (648000 / Math.PI) * 149597870700,
    ["m", ...large],
    "IAU 2015 Resolution B2",
  ),
  row("ly", "light-year", length, 9460730472580800, large, iauStyle),
  row("yr", "Julian year", time, 31557600, ["k", "M", "G"], iauStyle),
  row("day", "day", time, 86400, none, brochure, { aliases: ["days"] }),
  row("hr", "hour", time, 3600, none, brochure, { aliases: ["hour"] }),
  row("min", "minute", time, 60, none, brochure, { aliases: ["minute"] }),
  row("Jy", "jansky", dimension({ mass: 1, time: -2 }), 1e-26, ["n", "u", "m", "k", "M"], iauStyle),
  row("angstrom", "ångström", length, 1e-10, none, sp811, { aliases: ["Å", "Angstrom"] }),
  row("barn", "barn", area, 1e-28, ["m", "u", "n", "p", "f", "k", "M"], sp811),
  // A photon radiance: 10^10/(4 pi) photons per m^2, s and sr; photon and sr are pure numbers here.
  row(
    "rayleigh",
    "rayleigh",
    dimension({ length: -2, time: -1 }),
    1e10 / (4 * Math.PI),
    ["k"],
    "Baker & Romick 1976, Applied Optics 15, 1966 (as cited by others)",
  ),
  row("atm", "standard atmosphere", pressure, 101325, none, sp811),
  row("bar", "bar", pressure, 1e5, ["m", "u", "k", "M", "G"], sp811),

  row("deg", "degree", dimensionless, Math.PI / 180, none, brochure, { aliases: ["°"] }),
  row("arcmin", "minute of arc", dimensionless, Math.PI / 10800, none, brochure),
  row("arcsec", "second of arc", dimensionless, Math.PI / 648000, none, brochure),
  row("mas", "thousandth of a second of arc", dimensionless, Math.PI / 648e6, none, iauStyle),
  row("uas", "millionth of a second of arc", dimensionless, Math.PI / 648e9, none, iauStyle),
  // A count of revolutions, so 2 pi less than the angular velocity of the same name.
  row("rpm", "revolution per minute, as a frequency", frequency, 1 / 60, none, byDefinition),
  row("percent", "per cent", dimensionless, 0.01, none, brochure, { aliases: ["%"] }),
  row("ppm", "part per million", dimensionless, 1e-6, none, byDefinition),

  row("gauss", "gauss", fluxDensity, 1e-4, wide, sp811, {
    convention: "si",
    prefixedAliases: ["G"],
  }),
  row("gauss", "gauss", gaussianField, gaussianFieldFactor, wide, sp811, {
    convention: "gaussian",
    prefixedAliases: ["G"],
  }),
  row("esu", "electrostatic unit of charge", gaussianCharge, gaussianChargeFactor, none, sp811, {
    convention: "gaussian",
  }),
  row("statC", "statcoulomb", gaussianCharge, gaussianChargeFactor, none, sp811, {
    convention: "gaussian",
    aliases: ["Fr"],
  }),
  row("statV", "statvolt", gaussianPotential, gaussianPotentialFactor, none, sp811, {
    convention: "gaussian",
  }),
  row(
    "statA",
    "statampere",
    multiplyDimensions(gaussianCharge, frequency),
    gaussianChargeFactor,
    none,
    sp811,
    { convention: "gaussian" },
  ),
  row(
    "Mx",
    "maxwell",
    multiplyDimensions(gaussianField, area),
    gaussianFieldFactor * 1e-4,
    none,
    sp811,
    { convention: "gaussian" },
  ),
  row("Oe", "oersted", gaussianField, gaussianFieldFactor, ["k", "m"], sp811, {
    convention: "gaussian",
  }),
];
