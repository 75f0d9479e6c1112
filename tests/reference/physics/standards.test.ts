import { describe, expect, it } from "vitest";
import { findConstant, parseUnit, toSi, type UnitSystem } from "@/lib/physics";
import { expectWithin } from "../../unit/physics/approximately";

/** Against factors that standards print. Each case names its source. */
const si: UnitSystem = { edition: "codata-2018", em: "si" };
const gaussian: UnitSystem = { edition: "codata-2018", em: "gaussian" };

function unit(text: string, system = si) {
  const parsed = parseUnit(text, system);
  if (!parsed.ok) throw new Error(text);
  return parsed;
}

const sp811 = "NIST SP 811 (2008), appendix B";

describe("NIST SP 811, appendix B", () => {
  it.each([
    ["atm", 101325, "Pa"],
    ["arcsec", 4.84813681109536e-6, "rad"],
  ])(`has one %s as %d %s (${sp811})`, (text, factor, to) => {
    expect(unit(text).dimension).toBe(unit(to).dimension);
    expectWithin(unit(text).factor / unit(to).factor, factor, 1e-9);
  });

  it.each([
    ["Oe", 79.57747154594767, "A/m"],
    ["statC", 3.3356409519815207e-10, "C"],
    ["statV", 299.792458, "V"],
  ])(`has one %s correspond to %d %s (${sp811})`, (text, factor, to) => {
    const from = unit(text, gaussian);
    const conversion = toSi(from.dimension, unit(to).dimension);
    expect(conversion?.dimension).toBe(unit(to).dimension);
    expectWithin(from.factor * (conversion?.factor ?? Number.NaN), factor, 1e-9);
  });
});

describe("the IAU’s resolutions", () => {
  const value = (symbol: string) => findConstant(symbol, si)?.siValue ?? Number.NaN;

  it("have 648000/π au in a parsec (IAU 2015 Resolution B2)", () => {
    expectWithin(unit("pc").factor, 3.085677581491367e16, 1e-15);
    expectWithin(unit("pc").factor, value("pc"), 1e-15);
  });

  it("have GM_sun/c² and GM_sun/c³ (IAU 2015 Resolution B3)", () => {
    const length = (value("G") * unit("Msun").factor) / value("c") ** 2;
    expectWithin(length, 1476.6250380501249, 1e-12);
    expectWithin(length / value("c"), 4.9254909476412675e-6, 1e-12);
  });

  it("have the effective temperature that radius and luminosity make (IAU 2015 Resolution B3)", () => {
    const area = 4 * Math.PI * value("R_sun") ** 2;
    const of = (sigma: number) => (value("L_sun") / (area * sigma)) ** 0.25;
    const temperature = of(value("sigma_SB"));
    // The figure was had from the printed digits of sigma_SB; all of them lower it by 8e-12.
    expectWithin(of(5.670374419e-8), 5772.003429145849, 1e-15);
    expectWithin(temperature, 5772.003429098915, 1e-15);
    expectWithin(temperature, value("T_sun"), 1e-6);
  });

  it("have a year of the Earth’s orbit (IAU 2012 B2, IAU 2015 B3)", () => {
    const period = 2 * Math.PI * Math.sqrt(unit("au").factor ** 3 / value("GM_sun"));
    expectWithin(period / unit("day").factor, 365.2568983840419, 1e-12);
  });
});

describe("the CGS equivalences of a Gaussian field", () => {
  it("have 3.98e-3 J/m³ in B²/8π for 1 gauss, as B²/2µ₀ for 1e-4 T", () => {
    const density = unit("gauss", gaussian).factor ** 2 / (8 * Math.PI);
    expectWithin(density, 1 / (8 * Math.PI) / 10, 1e-14);
    expect(density).toBeCloseTo(3.98e-3, 5);
    const permeability = findConstant("mu_0", si)?.siValue ?? Number.NaN;
    expectWithin(density, unit("gauss").factor ** 2 / (2 * permeability), 1e-9);
  });
});
