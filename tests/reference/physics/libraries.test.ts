import { beforeAll, describe, expect, it } from "vitest";
import {
  angularDiameterDistance,
  comovingDistance,
  dimension,
  findConstant,
  hubble,
  lookbackTime,
  luminosityDistance,
  parseUnit,
  planckLambda,
  planckNu,
  toGaussian,
  toSi,
  type UnitSystem,
} from "@/lib/physics";
import { expectWithin } from "../../unit/physics/approximately";
import { askLibraries, type Reference } from "./reference";

/** Against SciPy's CODATA 2018 listing and Astropy's constants, units, cosmology and black body. */
const si: UnitSystem = { edition: "codata-2018", em: "si" };
const gaussian: UnitSystem = { edition: "codata-2018", em: "gaussian" };

/** In the unit language, and in the spelling of Astropy. */
const units: Record<string, string> = {
  m: "m",
  cm: "cm",
  km: "km",
  nm: "nm",
  um: "um",
  fm: "fm",
  Em: "Em",
  g: "g",
  kg: "kg",
  s: "s",
  ms: "ms",
  A: "A",
  K: "K",
  mol: "mol",
  cd: "cd",
  Hz: "Hz",
  GHz: "GHz",
  N: "N",
  Pa: "Pa",
  hPa: "hPa",
  J: "J",
  W: "W",
  kW: "kW",
  C: "C",
  V: "V",
  F: "F",
  ohm: "Ohm",
  S: "S",
  Wb: "Wb",
  T: "T",
  H: "H",
  lm: "lm / sr",
  lx: "lx / sr",
  Bq: "Bq",
  kat: "mol / s",
  erg: "erg",
  dyn: "dyn",
  Ba: "Ba",
  P: "P",
  St: "St",
  Gal: "Gal",
  eV: "eV",
  meV: "meV",
  keV: "keV",
  TeV: "TeV",
  u: "u",
  Da: "Da",
  Msun: "Msun",
  Rsun: "Rsun",
  Lsun: "Lsun",
  Mearth: "Mearth",
  Rearth: "Rearth",
  Mjup: "Mjup",
  Rjup: "Rjup",
  au: "au",
  pc: "pc",
  kpc: "kpc",
  Gpc: "Gpc",
  ly: "lyr",
  yr: "yr",
  Gyr: "Gyr",
  day: "day",
  hr: "h",
  min: "min",
  Jy: "Jy",
  mJy: "mJy",
  angstrom: "Angstrom",
  barn: "barn",
  mbarn: "mbarn",
  rayleigh: "R",
  bar: "bar",
  mbar: "mbar",
  deg: "deg",
  arcmin: "arcmin",
  arcsec: "arcsec",
  mas: "mas",
  uas: "uas",
  rad: "rad",
  percent: "percent",
  rpm: "1 / min",
  gauss: "G",
  kgauss: "kG",
  "erg s^-1 cm^-2 Hz^-1": "erg / (s cm2 Hz)",
  "km/s/Mpc": "km / (s Mpc)",
  "Msun/pc^3": "Msun / pc3",
  "g^(1/2) cm^(-1/2) s^-1": "g(1/2) cm(-1/2) s-1",
};

const gaussianUnits: Record<string, string> = { esu: "Fr", statA: "statA", "esu/s": "Fr / s" };

const redshifts = [1e-3, 0.01, 0.1, 0.5, 1, 2, 6, 20, 1100];
const points = [1e8, 1e11, 1e14, 5e14, 2e15].flatMap((nu) =>
  [30, 5772, 1e6].map((kelvin) => [nu, kelvin] as const),
);

let reference: Reference;

beforeAll(async () => {
  reference = await askLibraries({
    units: { ...units, ...gaussianUnits },
    redshifts,
    // Far down the Wien tail both are sums of rounding errors.
    planck: points.filter(([nu, kelvin]) => (4.8e-11 * nu) / kelvin < 200),
  });
});

const constant = (symbol: string, system = si) => {
  const found = findConstant(symbol, system);
  if (!found) throw new Error(symbol);
  return found;
};

/** Constants that the listing prints cut off; the library carries the printed digits. */
const cutOff = new Set(["hbar", "R_gas", "F_faraday", "sigma_SB", "b_wien"]);

describe("SciPy’s CODATA 2018", () => {
  it("has the values and uncertainties of the edition, to 1e-12", () => {
    expect(Object.keys(reference.scipy)).toHaveLength(28);
    for (const [symbol, { value, uncertainty }] of Object.entries(reference.scipy)) {
      const ours = constant(symbol);
      expectWithin(ours.value, value, cutOff.has(symbol) ? 1e-9 : 1e-12);
      expectWithin(ours.uncertainty, uncertainty, 1e-12);
    }
  });
});

describe("Astropy’s constants", () => {
  it("have the values and uncertainties of CODATA 2018 and IAU 2015, to 1e-12", () => {
    expect(Object.keys(reference.astropy)).toHaveLength(33);
    for (const [symbol, { value, uncertainty }] of Object.entries(reference.astropy)) {
      expectWithin(constant(symbol).siValue, value, 1e-12);
      expectWithin(constant(symbol).siUncertainty, uncertainty, 1e-12);
    }
  });

  it("have the elementary charge in esu", () => {
    expectWithin(constant("q_esu", gaussian).value, reference.elementaryChargeEsu, 1e-12);
  });
});

describe("Astropy’s units", () => {
  const compare = (names: string[], system: UnitSystem) => {
    for (const name of names) {
      const theirs = reference.units[name];
      const ours = parseUnit(name, system);
      if (!ours.ok || !theirs) throw new Error(name);
      expectWithin(ours.factor, theirs.factor, 1e-12);
      expect(ours.dimension, name).toBe(dimension(theirs.exponents));
    }
  };

  it("have the factors and dimensions of ours, more than 80 of them, to 1e-12", () => {
    expect(Object.keys(units).length).toBeGreaterThan(80);
    compare(Object.keys(units), si);
  });

  it("have the Gaussian charge and current", () => {
    compare(Object.keys(gaussianUnits), gaussian);
  });
});

describe("Astropy’s electromagnetic conversions", () => {
  it("have the counts of the converters, there and back, to 1e-12", () => {
    expect(Object.keys(reference.gaussian)).toHaveLength(5);
    for (const [unit, { unit: other, count }] of Object.entries(reference.gaussian)) {
      const [from, to] = [parseUnit(unit, si), parseUnit(other, gaussian)];
      if (!from.ok || !to.ok) throw new Error(unit);
      const [there, back] = [toGaussian(from.dimension), toSi(to.dimension, from.dimension)];
      expectWithin(((there?.factor ?? 0) * from.factor) / to.factor, count, 1e-12);
      expectWithin(((back?.factor ?? 0) * to.factor) / from.factor, 1 / count, 1e-12);
    }
  });
});

describe("Astropy’s flat universe of H₀ = 70, Ω_m = 0.3", () => {
  it("has our rates, distances and times, to 1e-10", () => {
    expect(reference.cosmology).toHaveLength(redshifts.length);
    for (const row of reference.cosmology) {
      expectWithin(hubble(row.z), row.hubble, 1e-10);
      expectWithin(comovingDistance(row.z), row.comoving, 1e-10);
      expectWithin(luminosityDistance(row.z), row.luminosity, 1e-10);
      expectWithin(angularDiameterDistance(row.z), row.angular, 1e-10);
      expectWithin(lookbackTime(row.z), row.lookback, 1e-10);
    }
  });
});

describe("Astropy’s black body", () => {
  it("has our Planck functions, to 1e-10", () => {
    expect(reference.planck.length).toBeGreaterThan(10);
    for (const row of reference.planck) {
      expectWithin(planckNu(row.nu, row.temperature), row.perFrequency, 1e-10);
      expectWithin(planckLambda(row.wavelength, row.temperature), row.perWavelength, 1e-10);
    }
  });
});
