import { describe, expect, it } from "vitest";
import {
  type Dimension,
  dimension,
  findConstant,
  parseUnit,
  toGaussian,
  toSi,
} from "@/lib/physics";
import { expectWithin } from "./approximately";

const c = 299792458;
const si = { edition: "codata-2018", em: "si" } as const;
const gaussian = { edition: "codata-2018", em: "gaussian" } as const;

function unit(text: string, system: typeof si | typeof gaussian) {
  const parsed = parseUnit(text, system);
  if (!parsed.ok) throw new Error(text);
  return parsed;
}

/** How many of a Gaussian unit correspond to one SI unit. */
function count(from: string, to: string): number {
  const [one, other] = [unit(from, si), unit(to, gaussian)];
  const conversion = toGaussian(one.dimension);
  expect(conversion?.dimension, `${from} to ${to}`).toBe(other.dimension);
  return ((conversion?.factor ?? Number.NaN) * one.factor) / other.factor;
}

const quantities = [
  "C",
  "A",
  "V",
  "V/m",
  "T",
  "A/m",
  "C/m^2",
  "Wb",
  "A m^2",
  "C m",
  "T m",
  "C/m^3",
  "A/m^2",
  "ohm",
  "ohm m",
  "S/m",
  "F",
  "H",
];

describe("toGaussian", () => {
  it.each([
    ["C", "esu", 2.99792458e9],
    ["A", "statA", 2.99792458e9],
    ["V", "statV", 1 / 299.792458],
    ["V/m", "statV/cm", 1 / 29979.2458],
    ["T", "gauss", 1e4],
    ["A/m", "Oe", 4e-3 * Math.PI],
    ["C/m^2", "statV/cm", 4 * Math.PI * 2.99792458e5],
    ["Wb", "Mx", 1e8],
    ["A m^2", "erg/gauss", 1e3],
    ["C m", "esu cm", 2.99792458e11],
    ["T m", "gauss cm", 1e6],
    ["F", "cm", c ** 2 * 1e-5],
    ["ohm", "s/cm", 1e5 / c ** 2],
    ["H", "s^2/cm", 1e5 / c ** 2],
    ["S/m", "s^-1", c ** 2 * 1e-7],
  ])("makes one %s that many %s: %d", (from, to, expected) => {
    expectWithin(count(from, to), expected, 1e-14);
  });

  it("leaves mechanical quantities alone", () => {
    for (const text of ["erg", "cm", "s^-1", ""]) {
      expect(toGaussian(unit(text, si).dimension)).toBeUndefined();
    }
  });

  it("keeps energies: q V, B²/8π, L I²/c²", () => {
    const factor = (text: string) => toGaussian(unit(text, si).dimension)?.factor ?? Number.NaN;
    expectWithin(factor("C") * factor("V"), 1, 1e-14);
    const mu0 = 4e-7 * Math.PI;
    expectWithin(factor("T") ** 2 / (8 * Math.PI), 1 / (2 * mu0), 1e-14);
    expectWithin(factor("C") ** 2 / factor("F"), 1, 1e-14);
    expectWithin(factor("A") ** 2 * factor("ohm"), 1, 1e-14);
  });
});

describe("toSi", () => {
  it("undoes toGaussian, with the quantity as target", () => {
    for (const text of quantities) {
      const from = unit(text, si).dimension;
      const there = toGaussian(from);
      const back = there && toSi(there.dimension, from);
      expect(back?.dimension, text).toBe(from);
      expectWithin((there?.factor ?? 0) * (back?.factor ?? 0), 1, 1e-15);
    }
  });

  const meant = (text: string, target?: Dimension) => toSi(unit(text, gaussian).dimension, target);

  it.each([
    ["gauss", "T"],
    ["esu", "C"],
    ["statA", "A"],
    ["statV", "V"],
    ["erg/gauss", "A m^2"],
    ["esu/cm^3", "C/m^3"],
  ])("takes what is in %s to be in %s", (from, to) => {
    expect(meant(from)?.dimension).toBe(unit(to, si).dimension);
  });

  it("takes the quantity asked for where several share a dimension", () => {
    expectWithin(
      meant("gauss", unit("V/m", si).dimension)?.factor ?? 0,
      29979.2458 * Math.sqrt(10),
      1e-14,
    );
    expect(meant("esu", unit("Wb", si).dimension)?.quantity).toBe("magnetic flux");
    expect(meant("esu", unit("T", si).dimension)).toBeUndefined();
  });

  it("does not guess at mechanical dimensions, but converts them to a target", () => {
    expect(toSi(dimension({ length: 1 }))).toBeUndefined();
    expect(toSi(dimension({ length: 1 }), unit("F", si).dimension)?.quantity).toBe("capacitance");
    expect(toSi(dimension({ mass: 1 }))).toBeUndefined();
  });
});

describe("constants in the Gaussian convention", () => {
  it("have the charge that the converter makes of the coulombs", () => {
    const charge = findConstant("q_e", gaussian);
    const converted =
      (charge?.siValue ?? 0) * (toGaussian(dimension({ current: 1, time: 1 }))?.factor ?? 0);
    expectWithin(findConstant("q_esu", gaussian)?.siValue ?? 0, converted, 1e-14);
  });

  it("have the fine-structure constant as q²/ħc", () => {
    const of = (symbol: string) => findConstant(symbol, gaussian)?.siValue ?? Number.NaN;
    expectWithin(of("q_esu") ** 2 / (of("hbar") * of("c")), of("alpha_fs"), 1e-9);
    expectWithin((of("q_esu") * of("hbar")) / (2 * of("m_e") * of("c")), of("mu_B"), 1e-9);
  });
});
