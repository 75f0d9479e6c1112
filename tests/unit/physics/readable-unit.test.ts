import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  dimension,
  type EmConvention,
  parseUnit,
  readableUnit,
  type UnitSystem,
} from "@/lib/physics";

const si: UnitSystem = { edition: "codata-2018", em: "si" };

/** The unit chosen for a value that is stated in some other unit. */
function chosen(value: number, unit: string, em: EmConvention = "si"): string {
  const parsed = parseUnit(unit, { ...si, em });
  if (!parsed.ok) throw new Error(unit);
  return readableUnit(parsed.dimension, value * parsed.factor, em);
}

describe("readableUnit", () => {
  it.each([
    [1.26e39, "erg/s", "erg/s"],
    [300, "km/s", "km/s"],
    [20, "cm/s", "cm/s"],
    [1, "pc", "pc"],
    [8.2, "kpc", "kpc"],
    [400, "Mpc", "Mpc"],
    [12, "km", "km"],
    [1.3, "mm", "mm"],
    [21, "cm", "cm"],
    [550, "nm", "nm"],
    [1, "Rsun", "Rsun"],
    [3, "yr", "yr"],
    [45, "Myr", "Myr"],
    [13.8, "Gyr", "Gyr"],
    [0.01, "s", "ms"],
    [6.4, "keV", "keV"],
    [1e51, "erg", "erg"],
    [10, "Msun", "Msun"],
    [0.02, "Msun", "Msun"],
    [5, "g", "g"],
    [1e-8, "Msun/yr", "Msun/yr"],
    [3, "g/s", "g/s"],
    [1.4, "GHz", "GHz"],
    [2e-18, "Hz", "s^-1"],
    [3, "mJy", "mJy"],
    [1e-5, "erg/s/cm^2/Hz", "erg/s/cm^2/Hz"],
    [2.7, "K", "K"],
    [0.34, "cm^2/g", "cm^2/g"],
    [3, "T", "gauss"],
    [5e-6, "gauss", "µgauss"],
    [1, "g cm", "g cm"],
    [4, "percent", ""],
  ])("reads %d %s in “%s”", (value, unit, readable) => {
    expect(chosen(value, unit)).toBe(readable);
    expect(chosen(-value, unit)).toBe(readable);
  });

  it("reads a Gaussian field in gauss, a charge in esu", () => {
    expect(chosen(3, "gauss", "gaussian")).toBe("gauss");
    expect(chosen(5, "esu", "gaussian")).toBe("esu");
  });

  it("takes the customary unit for zero and for what is not finite", () => {
    for (const value of [0, -0, Number.NaN, Number.POSITIVE_INFINITY]) {
      expect(chosen(value, "m")).toBe("cm");
      expect(chosen(value, "J")).toBe("erg");
    }
  });

  it("is always a unit of the dimension", () => {
    const exponent = fc.tuple(fc.integer({ min: -5, max: 5 }), fc.constantFrom(1, 2, 3));
    const text = exponent.map(([above, below]) => `${above}/${below}`);
    const any = fc.record({
      length: text,
      mass: text,
      time: text,
      current: text,
      temperature: text,
      amount: text,
      "luminous intensity": text,
    });
    fc.assert(
      fc.property(
        any,
        fc.double({ noNaN: true }),
        fc.constantFrom("si", "gaussian"),
        (of, value, em) => {
          const convention = em as EmConvention;
          const unit = parseUnit(readableUnit(dimension(of), value, convention), {
            ...si,
            em: convention,
          });
          expect(unit.ok && unit.dimension).toBe(dimension(of));
        },
      ),
      { numRuns: 500, seed: 1915 },
    );
  });

  it("is a unit of the dimension across each ladder too", () => {
    for (const unit of ["m", "s", "Hz", "kg", "kg/s", "K", "m/s", "J", "gauss", "Jy"]) {
      for (const em of ["si", "gaussian"] as const) {
        const of = parseUnit(unit, { ...si, em });
        for (let power = -60; power <= 60; power++) {
          const read = parseUnit(chosen(10 ** power, unit, em), { ...si, em });
          expect(read.ok && of.ok && read.dimension === of.dimension).toBe(true);
        }
      }
    }
  });
});
