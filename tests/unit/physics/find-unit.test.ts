import { describe, expect, it } from "vitest";
import {
  dimension,
  dimensionless,
  findUnit,
  listUnits,
  type UnitSystem,
  unitOfOtherConvention,
} from "@/lib/physics";
import { expectWithin } from "./approximately";

const si: UnitSystem = { edition: "codata-2018", em: "si" };
const later: UnitSystem = { edition: "codata-2022", em: "si" };
const gaussian: UnitSystem = { edition: "codata-2018", em: "gaussian" };
const factor = (name: string, system = si) => findUnit(name, system)?.factor;

describe("findUnit", () => {
  it.each([
    ["kpc", "kpc"],
    ["keV", "keV"],
    ["mJy", "mJy"],
    ["AU", "au"],
    ["hour", "hr"],
    ["minute", "min"],
    ["M_sun", "Msun"],
    ["M⊙", "Msun"],
    ["M☉", "Msun"],
    ["M⊕", "Mearth"],
    ["Å", "angstrom"],
    ["Ω", "ohm"],
    ["kΩ", "kohm"],
    ["°", "deg"],
    ["%", "percent"],
    ["TG", "Tgauss"],
    ["µG", "µgauss"],
    ["quettag", undefined],
  ])("reads %s as %s", (name, symbol) => {
    expect(findUnit(name, si)?.symbol).toBe(symbol);
  });

  it("takes a whole name before a prefix and a shorter one", () => {
    expect(factor("min")).toBe(60);
    expect(findUnit("cd", si)?.dimension).toBe(dimension({ "luminous intensity": 1 }));
    expect(findUnit("mas", si)?.dimension).toBe(dimensionless);
    expect(findUnit("Pa", si)?.dimension).toBe(dimension({ mass: 1, length: -1, time: -2 }));
    expect(findUnit("Gy", si)?.dimension).toBe(dimension({ length: 2, time: -2 }));
    expect(findUnit("u", si)?.dimension).toBe(dimension({ mass: 1 }));
  });

  it("minds the case", () => {
    expect(findUnit("KPC", si)).toBeUndefined();
    expect(findUnit("Erg", si)).toBeUndefined();
    expectWithin((factor("MeV") ?? 0) / (factor("meV") ?? 1), 1e9, 1e-15);
  });

  it("leaves short names to the quantities of a formula", () => {
    for (const name of ["G", "L", "t", "d", "h", "a", "b", "R", "M", "e", "x", "pi"]) {
      expect(findUnit(name, si), name).toBeUndefined();
      expect(findUnit(name, gaussian), name).toBeUndefined();
    }
  });

  it("gives no prefix where the trade has none", () => {
    for (const name of ["kMsun", "mmin", "kau", "kday", "mdeg", "kG_", "kpercent"]) {
      expect(findUnit(name, si), name).toBeUndefined();
    }
  });

  it("answers for names of JavaScript as for any other", () => {
    for (const name of ["constructor", "__proto__", "toString", ""]) {
      expect(findUnit(name, si)).toBeUndefined();
    }
  });

  it("divides the body masses by the edition’s G and says so", () => {
    expect(findUnit("Msun", si)?.nominalGM).toBe(1.3271244e20);
    expectWithin((factor("Msun") ?? 0) * 6.6743e-11, 1.3271244e20, 1e-15);
    expect(findUnit("Rsun", si)?.nominalGM).toBeUndefined();
  });

  it("takes the atomic mass unit from the edition", () => {
    expect(factor("u")).toBe(1.6605390666e-27);
    expect(factor("u", later)).toBe(1.66053906892e-27);
    expectWithin((factor("kDa", later) ?? 0) / 1e3, 1.66053906892e-27, 1e-15);
  });
});

describe("the electromagnetic convention", () => {
  it("makes gauss 1e-4 T in SI and g^½ cm^-½ s^-1 in Gaussian", () => {
    expect(findUnit("gauss", si)).toMatchObject({ factor: 1e-4, conventionOnly: "si" });
    const field = findUnit("gauss", gaussian);
    expect(field?.conventionOnly).toBe("gaussian");
    expect(field?.dimension).toBe(dimension({ mass: "1/2", length: "-1/2", time: -1 }));
    expectWithin(field?.factor ?? 0, Math.sqrt(1e-3 / 1e-2), 1e-15);
  });

  it("leaves units that both have without a mark", () => {
    expect(findUnit("erg", si)).not.toHaveProperty("conventionOnly");
    expect(findUnit("T", gaussian)).not.toHaveProperty("conventionOnly");
  });

  it("has the electrostatic units in Gaussian only", () => {
    for (const name of ["esu", "statC", "Fr", "statV", "statA", "Mx", "Oe"]) {
      expect(findUnit(name, si), name).toBeUndefined();
      expect(findUnit(name, gaussian), name).toBeDefined();
      expect(unitOfOtherConvention(name, "si"), name).toBe(true);
      expect(unitOfOtherConvention(name, "gaussian"), name).toBe(false);
    }
  });

  it("keeps the SI units findable in Gaussian, as those of the other convention", () => {
    for (const name of ["T", "C", "A", "V", "ohm", "F", "H", "S", "Wb", "mT", "kV"]) {
      expect(findUnit(name, gaussian), name).toBeDefined();
      expect(unitOfOtherConvention(name, "gaussian"), name).toBe(true);
      expect(unitOfOtherConvention(name, "si"), name).toBe(false);
    }
  });

  it("is no concern of mechanical units or of names that are none", () => {
    for (const name of ["erg", "cm", "gauss", "nonsense"]) {
      expect(unitOfOtherConvention(name, "si")).toBe(false);
      expect(unitOfOtherConvention(name, "gaussian")).toBe(false);
    }
  });

  it("makes Gaussian units agree with each other and with mechanics", () => {
    const of = (name: string) => factor(name, gaussian) ?? Number.NaN;
    expectWithin(of("esu") ** 2 / of("cm") ** 2, of("dyn"), 1e-14);
    expectWithin(of("gauss") ** 2 * of("cm") ** 3, of("erg"), 1e-14);
    expectWithin(of("statV") * of("esu"), of("erg"), 1e-14);
    expectWithin(of("gauss") * of("cm") ** 2, of("Mx"), 1e-14);
  });
});

describe("listUnits", () => {
  it("lists each unit of a convention once, with a factor that findUnit agrees with", () => {
    for (const system of [si, later, gaussian]) {
      const rows = listUnits(system);
      expect(new Set(rows.map((row) => row.symbol)).size).toBe(rows.length);
      for (const row of rows) {
        expect(row.factor, row.symbol).toBe(findUnit(row.symbol, system)?.factor);
        expect(row.dimension).toBe(findUnit(row.symbol, system)?.dimension);
        expect(row.source).not.toBe("");
      }
    }
  });

  it("offers aliases and prefixes that are found again as the same unit", () => {
    for (const row of listUnits(gaussian)) {
      for (const name of row.aliases) expect(factor(name, gaussian), name).toBe(row.factor);
      for (const prefix of row.prefixes) {
        expect(findUnit(prefix + row.symbol, gaussian), prefix + row.symbol).toBeDefined();
      }
    }
  });
});
