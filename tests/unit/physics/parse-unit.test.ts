import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  dimension,
  dimensionless,
  dimensionToJson,
  listUnits,
  parseUnit,
  type UnitSystem,
} from "@/lib/physics";
import { expectWithin } from "./approximately";

const si: UnitSystem = { edition: "codata-2018", em: "si" };
const gaussian: UnitSystem = { edition: "codata-2018", em: "gaussian" };

function read(text: string, system = si) {
  const parsed = parseUnit(text, system);
  if (!parsed.ok) throw new Error(`${text}: ${JSON.stringify(parsed)}`);
  return parsed;
}

function fail(text: string, system = si) {
  const parsed = parseUnit(text, system);
  if (parsed.ok) throw new Error(`${text} was read`);
  return parsed;
}

/** The factors in a compact notation: `erg s^-1`. */
const factors = (text: string) =>
  read(text)
    .factors.map(({ symbol, exponent }) =>
      exponent.equals(1) ? symbol : `${symbol}^${exponent.toFraction()}`,
    )
    .join(" ");

describe("parseUnit", () => {
  it.each([
    ["erg/s/cm^2", "erg s^-1 cm^-2"],
    ["erg s^-1 cm^-2", "erg s^-1 cm^-2"],
    ["erg s⁻¹ cm⁻²", "erg s^-1 cm^-2"],
    ["(erg/s)/cm^2", "erg s^-1 cm^-2"],
    ["erg·s^-1·cm^-2", "erg s^-1 cm^-2"],
    ["erg*s^-1*cm^-2", "erg s^-1 cm^-2"],
    ["erg\u00a0s^−1\u2009cm^-2", "erg s^-1 cm^-2"],
    ["erg / s cm^2", "erg s^-1 cm^-2"],
    ["erg/(s cm^2)", "erg s^-1 cm^-2"],
    ["erg/s*cm^2", "erg s^-1 cm^2"],
    ["1/s", "s^-1"],
    ["1/(s cm^2)", "s^-1 cm^-2"],
    ["(1/s)", "s^-1"],
    ["cm²", "cm^2"],
    ["cm³ g⁻¹", "cm^3 g^-1"],
    ["(km/s)^2", "km^2 s^-2"],
    ["(km/s)²", "km^2 s^-2"],
    ["g^(1/2) cm^(-1/2) s^-1", "g^1/2 cm^-1/2 s^-1"],
    ["g¹ᐟ² cm⁻¹ᐟ²", "g^1/2 cm^-1/2"],
    ["g^0.5", "g^1/2"],
    ["cm^+2", "cm^2"],
    ["((m))", "m"],
    ["M⊙ yr⁻¹", "Msun yr^-1"],
    ["Msun/yr", "Msun yr^-1"],
    ["km/s/Mpc", "km s^-1 Mpc^-1"],
    ["µJy", "µJy"],
    ["μJy", "µJy"],
    ["A\u030a", "angstrom"],
    ["\u212b", "angstrom"],
    ["\u2126", "ohm"],
    ["%", "percent"],
    ["", ""],
    ["  ", ""],
  ])("reads “%s” as %s", (text, expected) => {
    expect(factors(text)).toBe(expected);
  });

  it("settles the factor to SI and the dimension", () => {
    const flux = read("erg/s/cm^2");
    expectWithin(flux.factor, 1e-3, 1e-15);
    expect(dimensionToJson(flux.dimension)).toEqual({ mass: "1", time: "-3" });
    expect(read("")).toMatchObject({ factor: 1, dimension: dimensionless });
    expectWithin(read("km/s/Mpc").factor, 1e3 / 3.085677581491367e22, 1e-15);
  });

  it("reads half powers into the Gaussian dimension", () => {
    const written = read("g^(1/2) cm^(-1/2) s^-1", gaussian);
    const named = read("gauss", gaussian);
    expect(written.dimension).toBe(named.dimension);
    expect(written.dimension).toBe(dimension({ mass: "1/2", length: "-1/2", time: -1 }));
    expectWithin(written.factor, named.factor, 1e-15);
  });

  it("gives the same for the forms of one unit", () => {
    const same = ["erg/s/cm^2", "erg s^-1 cm^-2", "erg s⁻¹ cm⁻²", "erg / s cm²", "erg/(cm^2 s)"];
    for (const text of same) {
      expect(read(text).dimension).toBe(read("W/m^2").dimension);
      expectWithin(read(text).factor, 1e-3, 1e-15);
    }
  });

  it("tells the body masses and their powers", () => {
    const rate = read("Msun^2/Mearth/yr");
    expect(
      rate.nominalMassExponents?.map(({ symbol, nominalGM, exponent }) => [
        symbol,
        nominalGM,
        exponent.toFraction(),
      ]),
    ).toEqual([
      ["Msun", 1.3271244e20, "2"],
      ["Mearth", 3.986004e14, "-1"],
    ]);
    expect(read("g/s")).not.toHaveProperty("nominalMassExponents");
  });

  it("remembers what it read", () => {
    expect(parseUnit("erg/s", si)).toBe(parseUnit("erg/s", si));
    expect(parseUnit("gauss", si)).not.toBe(parseUnit("gauss", gaussian));
  });
});

describe("a unit that cannot be read", () => {
  it.each([
    ["1e-8 erg", 0, 4],
    ["10^-8 erg/s", 0, 2],
    ["1 erg", 0, 1],
    ["1", 0, 1],
    ["2/s", 0, 1],
    ["1.0/s", 0, 3],
    ["erg 2", 4, 5],
    ["erg*1", 4, 5],
    ["erg/", 3, 4],
    ["erg/ ", 3, 4],
    ["erg^", 3, 4],
    ["erg^s", 4, 5],
    ["erg^0", 4, 5],
    ["cm⁰", 2, 3],
    ["cm^(1/0)", 6, 7],
    ["(erg", 0, 1],
    ["erg)", 3, 4],
    ["cm^(1/2", 3, 4],
    ["g^1/2", 4, 5],
    ["cm**2", 3, 4],
    ["erg//s", 4, 5],
    ["erg,s", 3, 4],
    ["s^-1^2", 4, 5],
    ["/s", 0, 1],
  ])("is a syntax fault in “%s” from %d to %d", (text, from, to) => {
    expect(fail(text)).toMatchObject({ code: "syntax", from, to });
  });

  it.each([
    ["erg/foo", 4, 7, "foo"],
    ["  Erg", 2, 5, "Erg"],
    ["cm2", 0, 3, "cm2"],
    ["erg s^-1 (kpx)", 10, 13, "kpx"],
  ])("names what is no unit in “%s” from %d to %d", (text, from, to, name) => {
    expect(fail(text)).toMatchObject({ code: "unit", from, to, name });
  });

  it("is no unit of a double’s range", () => {
    expect(fail("cm^99999999999")).toMatchObject({ code: "syntax", from: 0, to: 14 });
    expect(fail("Qm^20 Qs^20")).toMatchObject({ code: "syntax" });
  });

  it("says when it is one of the other convention", () => {
    expect(fail("esu/cm^2")).toMatchObject({ name: "esu", otherConvention: true });
    expect(fail("foo")).not.toHaveProperty("otherConvention");
    expect(parseUnit("esu/cm^2", gaussian).ok).toBe(true);
  });

  it("is a fault however long or deep it is", () => {
    for (const text of [
      "(".repeat(200_000),
      `${"(".repeat(100)}m${")".repeat(100)}`,
      "m ".repeat(9e4),
    ]) {
      expect(parseUnit(text, si).ok).toBe(false);
    }
  });

  it("never throws, and marks a place inside the text", () => {
    const piece = fc.constantFrom(
      ..."erg s^-1 cm/()²⁻¹ᐟ*·1.0−%°µÅ⊙_ {}[]'\\é\u0301".split(""),
      "km",
      "gauss",
    );
    fc.assert(
      fc.property(fc.array(piece, { maxLength: 14 }), (pieces) => {
        const text = pieces.join("");
        const parsed = parseUnit(text, si);
        if (parsed.ok) expect(parsed.factor).toBeGreaterThan(0);
        else {
          expect(parsed.from).toBeGreaterThanOrEqual(0);
          expect(parsed.to).toBeGreaterThan(parsed.from);
          expect(parsed.to).toBeLessThanOrEqual(text.length);
        }
      }),
      { numRuns: 3_000, seed: 20150 },
    );
  });
});

describe("the law of units", () => {
  const symbols = listUnits(gaussian).map((unit) => unit.symbol);
  const anyUnit = fc.constantFrom(...symbols);
  const power = fc.constantFrom("1", "-1", "2", "-3", "(1/2)", "(-3/2)");

  it("is that factors multiply and exponents add", () => {
    fc.assert(
      fc.property(anyUnit, anyUnit, power, (a, b, p) => {
        const whole = read(`${a}^${p} ${b}`, gaussian);
        const left = read(`${a}^${p}`, gaussian);
        const right = read(b, gaussian);
        expectWithin(whole.factor, left.factor * right.factor, 1e-14);
        const quotient = read(`(${a}^${p} ${b})/${b}`, gaussian);
        expect(quotient.dimension).toBe(left.dimension);
      }),
      { seed: 2015 },
    );
  });
});
