import { beforeAll, describe, expect, it } from "vitest";
import { dimension, parseUnit, toGaussian, toSi, type UnitSystem } from "@/lib/physics";
import { lastOf } from "../unit/expr/calculations";
import { expectWithin } from "../unit/physics/approximately";
import { askPython } from "./python";
import { gaussianStrings, unitStrings } from "./unit-strings";

/**
 * Compound units against Astropy; the Gaussian ones and the converters against energies and forces
 * stated by hand in `units.py`; conversions of a calculation against printed factors.
 */
const si: UnitSystem = { edition: "codata-2018", em: "si" };
const gaussian: UnitSystem = { edition: "codata-2018", em: "gaussian" };

interface Answer {
  readonly units: Record<string, { factor: number; exponents: Record<string, string> }>;
  readonly correspondences: Record<string, number>;
  readonly esu: number;
}

let answer: Answer;

beforeAll(async () => {
  answer = await askPython("units.py", { units: { ...unitStrings, ...gaussianStrings } });
});

function expectSame(text: string, system: UnitSystem): void {
  const ours = parseUnit(text, system);
  const theirs = answer.units[text];
  if (!ours.ok || !theirs) throw new Error(`${text}: ${JSON.stringify(ours)}`);
  expectWithin(ours.factor, theirs.factor, 1e-12);
  expect(ours.dimension, text).toBe(dimension(theirs.exponents));
}

describe("units as one writes them, against Astropy", () => {
  it("are more than sixty", () => {
    expect(Object.keys(unitStrings).length).toBeGreaterThan(60);
  });

  it.each(Object.keys(unitStrings))("have the same factor to 1e-12 and dimension: %s", (text) => {
    expectSame(text, si);
  });

  it.each(Object.keys(gaussianStrings))("have half powers of g and cm: %s", (text) => {
    expectSame(text, gaussian);
  });

  it("are Gaussian by one name and SI by another", () => {
    expect(lastOf(["q = 1 esu"]).status).toBe("error");
    expect(lastOf(["q = 1 esu"], gaussian).status).toBe("ok");
    expect(lastOf(["x = 1 gauss + 1e-4 T"]).status).toBe("ok");
    expect(lastOf(["x = 1 gauss + 1e-4 T"], gaussian).status).toBe("error");
  });
});

/** Jackson, Classical Electrodynamics, 3rd ed., appendix, tables 3 and 4; from memory. */
const corresponding: Readonly<Record<string, string>> = {
  C: "esu",
  A: "statA",
  V: "statV",
  "V/m": "statV/cm",
  T: "gauss",
  "A/m": "Oe",
  "C/m^2": "statV/cm",
  Wb: "Mx",
  "A m^2": "erg/gauss",
  ohm: "s/cm",
  "S/m": "s^-1",
  F: "cm",
  H: "s^2/cm",
  "C/m^3": "esu/cm^3",
  "A/m^2": "statA/cm^2",
  "C m": "esu cm",
  "T m": "gauss cm",
  "ohm m": "s",
};

describe("the bridge between the conventions", () => {
  it.each(Object.entries(corresponding))("turns %s into %s and back, to 1e-12", (from, to) => {
    const [one, other] = [parseUnit(from, si), parseUnit(to, gaussian)];
    if (!one.ok || !other.ok) throw new Error(from);
    const count = answer.correspondences[from] ?? Number.NaN;
    const there = toGaussian(one.dimension);
    const back = toSi(other.dimension, one.dimension);
    expect(there?.dimension).toBe(other.dimension);
    expect(back?.dimension).toBe(one.dimension);
    expectWithin(((there?.factor ?? 0) * one.factor) / other.factor, count, 1e-12);
    expectWithin(((back?.factor ?? 0) * other.factor) / one.factor, 1 / count, 1e-12);
  });

  it("has the charge of Astropy’s constants", () => {
    expectWithin(answer.correspondences.C ?? Number.NaN, answer.esu, 1e-12);
  });
});

function converted(lines: readonly string[], system: UnitSystem = si): number {
  const result = lastOf(lines, system);
  if (result.status !== "ok" || !("value" in result)) throw new Error(JSON.stringify(result));
  return Number(result.value);
}

/** Factors as NIST SP 811 (2008), appendix B, prints them; from memory, arithmetic checked. */
const sp811 = "NIST SP 811 (2008), appendix B";

describe("conversions of a calculation, against printed factors", () => {
  it.each([
    ["x = 1 atm to Pa", 101325, 1e-15],
    ["x = 1 arcsec to rad", 4.84813681109536e-6, 1e-14],
    ["x = 1 bar to Pa", 1e5, 1e-15],
    ["x = 1 dyn to N", 1e-5, 1e-15],
    ["x = 1 erg to J", 1e-7, 1e-15],
    ["x = 1 angstrom to m", 1e-10, 1e-15],
    ["x = 1 barn to m^2", 1e-28, 1e-15],
    ["x = 1 P to Pa s", 0.1, 1e-15],
    ["x = 1 St to m^2/s", 1e-4, 1e-15],
    ["x = 1 Gal to m/s^2", 1e-2, 1e-15],
    ["x = 1 gauss to T", 1e-4, 1e-15],
    ["x = 1 eV to J", 1.602176634e-19, 1e-15],
  ])(`have %s as %d (${sp811})`, (line, factor, tolerance) => {
    expectWithin(converted([line]), factor, tolerance);
  });

  it.each([
    ["x = to_si(1 esu) to C", 3.3356409519815207e-10],
    ["x = to_si(1 statV) to V", 299.792458],
    ["x = to_si(1 statA) to A", 3.3356409519815207e-10],
    ["x = to_si(1 gauss) to T", 1e-4],
  ])(`have %s as %d, Gaussian (${sp811})`, (line, factor) => {
    expectWithin(converted([line], gaussian), factor, 1e-12);
  });

  it.each([
    ["x = to_gaussian(1 C) to esu", 2997924580],
    ["x = to_gaussian(1 V) to statV", 3.33564095198152e-3],
    ["x = to_gaussian(1 V/m) to statV/cm", 3.33564095198152e-5],
    ["x = to_gaussian(1 T) to gauss", 1e4],
    ["x = to_gaussian(1 A/m) to Oe", 0.012566370614359173],
    ["x = to_gaussian(1 C/m^2) to statV/cm", 3767303.134617706],
    ["x = to_gaussian(1 Wb) to Mx", 1e8],
    ["x = to_gaussian(1 ohm) to s/cm", 1.1126500560536185e-12],
    ["x = to_gaussian(1 F) to cm", 898755178736.8176],
    ["x = to_gaussian(1 S/m) to s^-1", 8987551787.368176],
    ["x = to_gaussian(q_e) to esu", 4.803204712570264e-10],
  ])("have %s as %d (Jackson, appendix, table 4)", (line, factor) => {
    expectWithin(converted([line], gaussian), factor, 1e-12);
  });
});
