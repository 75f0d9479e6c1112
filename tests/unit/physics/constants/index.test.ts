import { describe, expect, it } from "vitest";
import {
  dimensionName,
  editionNames,
  editionText,
  editionTitle,
  findConstant,
  listConstants,
  parseUnit,
  type UnitSystem,
} from "@/lib/physics";
import { expectExactly, expectWithin } from "../approximately";

const si: UnitSystem = { edition: "codata-2018", em: "si" };
const gaussian: UnitSystem = { edition: "codata-2018", em: "gaussian" };
const systems: UnitSystem[] = editionNames.flatMap((edition) => [
  { edition, em: "si" as const },
  { edition, em: "gaussian" as const },
]);

const ofTheLanguage =
  `G c h hbar k_B m_e m_p m_n m_alpha u_amu q_e N_A R_gas F_faraday alpha_fs eps_0
  mu_0 R_inf a_0 r_e lambda_C sigma_T sigma_SB a_rad b_wien mu_B mu_N G_F Ry M_sun R_sun L_sun T_sun
  GM_sun M_earth R_earth GM_earth M_jup R_jup GM_jup au pc ly`.split(/\s+/);

const value = (symbol: string, system = si) => findConstant(symbol, system)?.siValue ?? Number.NaN;

describe("every constant", () => {
  it("of the language is in each edition, and no other", () => {
    for (const system of systems) {
      const own = system.em === "gaussian" ? [...ofTheLanguage, "q_esu"] : ofTheLanguage;
      const listed = listConstants(system).map((constant) => constant.symbol);
      expect(listed.toSorted()).toEqual(own.toSorted());
    }
  });

  it("has a decimal string, a unit, an uncertainty or exactness, and a source", () => {
    for (const constant of systems.flatMap(listConstants)) {
      const { symbol } = constant;
      expect(constant.text, symbol).toMatch(/^\d+(\.\d+)?(e-?\d+)?$/);
      expect(constant.exact, symbol).toBe(constant.uncertainty === 0);
      expect(constant.exact, symbol).toBe(constant.uncertaintyText === null);
      expect(constant.name, symbol).not.toBe("");
      expect(constant.source, symbol).toMatch(/CODATA|IAU|exact/);
      expect(constant.sourceStatus, symbol).not.toBe("");
    }
  });

  it("is the same in its unit as in SI", () => {
    for (const system of systems) {
      for (const constant of listConstants(system)) {
        const unit = parseUnit(constant.unit, system);
        if (!unit.ok) throw new Error(constant.unit);
        expect(constant.dimension).toBe(unit.dimension);
        expectWithin(constant.siValue, constant.value * unit.factor, 1e-15);
        expectWithin(constant.value, Number(constant.text), 1e-11);
        expect(constant.siUncertainty).toBe(constant.uncertainty * unit.factor);
      }
    }
  });

  it("is undefined under a name it does not have", () => {
    for (const symbol of ["pi", "k", "constructor", "__proto__", ""]) {
      expect(findConstant(symbol, si)).toBeUndefined();
    }
    expect(findConstant("q_esu", si)).toBeUndefined();
  });
});

describe("derived exact constants", () => {
  it("have full double precision, not printed digits", () => {
    expectWithin(value("hbar"), value("h") / (2 * Math.PI), 4e-16);
    expectWithin(value("R_gas"), value("N_A") * value("k_B"), 4e-16);
    expectWithin(value("F_faraday"), value("N_A") * value("q_e"), 4e-16);
    const stefan =
      (2 * Math.PI ** 5 * value("k_B") ** 4) / (15 * value("h") ** 3 * value("c") ** 2);
    expectWithin(value("sigma_SB"), stefan, 2e-15);
    expectWithin(value("a_rad"), (4 * value("sigma_SB")) / value("c"), 4e-16);
    const x = (value("h") * value("c")) / (value("b_wien") * value("k_B"));
    expectWithin(5 * -Math.expm1(-x), x, 4e-15);
  });

  it("are exact in both editions and equal in them", () => {
    for (const symbol of ["hbar", "sigma_SB", "a_rad", "R_gas", "F_faraday", "b_wien", "h", "c"]) {
      const [old, later] = editionNames.map((edition) =>
        findConstant(symbol, { edition, em: "si" }),
      );
      expect(old?.exact, symbol).toBe(true);
      expect(later?.text, symbol).toBe(old?.text);
    }
  });
});

describe("body masses", () => {
  it("are the nominal GM over the edition’s G, with its relative uncertainty", () => {
    for (const edition of editionNames) {
      const system: UnitSystem = { edition, em: "si" };
      const g = findConstant("G", system);
      for (const body of ["sun", "earth", "jup"]) {
        const mass = findConstant(`M_${body}`, system);
        expect(mass?.nominalGM).toBe(value(`GM_${body}`, system));
        expectWithin((mass?.siValue ?? 0) * (g?.siValue ?? 0), mass?.nominalGM ?? 0, 4e-16);
        const relative = (mass?.siUncertainty ?? 0) / (mass?.siValue ?? 1);
        expectWithin(relative, (g?.siUncertainty ?? 0) / (g?.siValue ?? 1), 1e-14);
      }
    }
  });

  it("have no nominal GM where they are no masses", () => {
    expect(findConstant("R_sun", si)).not.toHaveProperty("nominalGM");
  });
});

describe("the Gaussian convention", () => {
  it("has the magnetons in erg/gauss, digit for digit", () => {
    expect(findConstant("mu_B", gaussian)).toMatchObject({
      text: "9.2740100783e-21",
      unit: "erg gauss^-1",
    });
    expect(findConstant("mu_B", si)?.unit).toBe("J T^-1");
    const dimension = findConstant("mu_N", gaussian)?.dimension;
    expect(dimension && dimensionName(dimension, "gaussian")).toBe("magnetic moment");
  });

  it("keeps charge, permittivity and permeability in SI", () => {
    for (const symbol of ["q_e", "eps_0", "mu_0"]) {
      expect(findConstant(symbol, gaussian)?.siValue).toBe(value(symbol));
      expect(findConstant(symbol, gaussian)?.dimension).toBe(findConstant(symbol, si)?.dimension);
    }
  });
});

describe("editions", () => {
  it("have titles and texts of their own", () => {
    expect(editionNames).toEqual(["codata-2018", "codata-2022"]);
    expect(editionNames.map(editionTitle)).toEqual(["CODATA 2018", "CODATA 2022"]);
    expect(editionText("codata-2018")).not.toBe(editionText("codata-2022"));
  });

  it("write out every row, the same each time", () => {
    for (const edition of editionNames) {
      const rows = JSON.parse(editionText(edition)) as string[][];
      expect(rows.map((row) => row[0]).toSorted()).toEqual(ofTheLanguage.toSorted());
      expect(editionText(edition)).toBe(editionText(edition));
    }
  });

  it("differ in the masses of particles, not in G", () => {
    expect(value("m_e", { edition: "codata-2022", em: "si" })).not.toBe(value("m_e"));
    expectExactly(value("G", { edition: "codata-2022", em: "si" }), value("G"));
  });
});

describe("relations between constants", () => {
  it.each([
    [
      "alpha_fs = q²/(4π ε₀ ħ c)",
      () => value("q_e") ** 2 / (4 * Math.PI * value("eps_0") * value("hbar") * value("c")),
      "alpha_fs",
    ],
    [
      "a_0 = ħ/(m_e c α)",
      () => value("hbar") / (value("m_e") * value("c") * value("alpha_fs")),
      "a_0",
    ],
    ["r_e = α² a_0", () => value("alpha_fs") ** 2 * value("a_0"), "r_e"],
    ["sigma_T = 8π r_e²/3", () => (8 * Math.PI * value("r_e") ** 2) / 3, "sigma_T"],
    ["lambda_C = h/(m_e c)", () => value("h") / (value("m_e") * value("c")), "lambda_C"],
    ["mu_B = q ħ/(2 m_e)", () => (value("q_e") * value("hbar")) / (2 * value("m_e")), "mu_B"],
    ["mu_N = q ħ/(2 m_p)", () => (value("q_e") * value("hbar")) / (2 * value("m_p")), "mu_N"],
    ["Ry = h c R_inf", () => value("h") * value("c") * value("R_inf"), "Ry"],
    ["eps_0 = 1/(mu_0 c²)", () => 1 / (value("mu_0") * value("c") ** 2), "eps_0"],
  ])("hold to the listing’s digits: %s", (_, computed, symbol) => {
    const constant = findConstant(symbol, si);
    const relative = (constant?.siUncertainty ?? 0) / (constant?.siValue ?? 1);
    expectWithin(computed(), value(symbol), 2 * relative + 1e-11);
  });
});
