import fc from "fast-check";
import katex from "katex";
import { describe, expect, it } from "vitest";
import { createEngine } from "@/lib/expr";
import { readFormula, readWords } from "@/lib/expr/formula";
import { functionEntries } from "@/lib/expr/functions";
import { formulaTex } from "@/lib/expr/tex";
import { nameTex } from "@/lib/expr/tex-names";
import { listConstants, listUnits, unitTex } from "@/lib/physics";
import { calculation } from "./calculations";
import { asFunction, formulas, type Made, written } from "./random-formulas";

const system = { edition: "codata-2018", em: "si" } as const;
const quantities = new Set(["M", "R", "x", "y", "z", "m", "Mdot", "v_rms", "gamma"]);
const roles = { functions: new Set(["f"]), quantities };
const texOf = (typed: string) =>
  formulaTex(readFormula(readWords(typed), roles).tree, {
    system,
    isQuantity: (name) => quantities.has(name),
  });
/** Throws where the TeX does not parse, or uses what it should not. */
const set = (tex: string) => katex.renderToString(tex, { throwOnError: true, strict: "error" });

describe("names", () => {
  it.each([
    ["M", "M"],
    ["sigma_T", "\\sigma_{\\mathrm{T}}"],
    ["Mdot", "\\dot{M}"],
    ["M_dot", "\\dot{M}"],
    ["M_dot_Edd", "\\dot{M}_{\\mathrm{Edd}}"],
    ["Mdot_Edd", "\\dot{M}_{\\mathrm{Edd}}"],
    ["M_Edd_dot", "\\dot{M}_{\\mathrm{Edd}}"],
    ["xddot", "\\ddot{x}"],
    ["v_rms", "v_{\\mathrm{rms}}"],
    ["T_4", "T_{4}"],
    ["T4", "T_{4}"],
    ["alpha_fs", "\\alpha_{\\mathrm{fs}}"],
    ["M_sun", "M_{\\odot}"],
    ["R_earth", "R_{\\oplus}"],
    ["hbar", "\\hbar"],
    ["k_B", "k_{\\mathrm{B}}"],
    ["tau_nu", "\\tau_{\\nu}"],
    ["rho_0_gas", "\\rho_{0,\\,\\mathrm{gas}}"],
    ["Omega", "\\Omega"],
    ["omicron", "o"],
    ["kT", "\\mathit{kT}"],
    ["gamma1", "\\gamma_{1}"],
    ["dot", "\\mathit{dot}"],
  ])("%s is %s", (name, tex) => {
    expect(nameTex(name)).toBe(tex);
    set(tex);
  });

  it("of every constant and unit can be set", () => {
    for (const em of ["si", "gaussian"] as const) {
      for (const { symbol } of listConstants({ edition: "codata-2022", em })) set(nameTex(symbol));
      for (const { name } of listUnits({ edition: "codata-2022", em })) {
        set(unitTex(name, { edition: "codata-2022", em }));
      }
    }
  });
});

describe("formulas", () => {
  it.each([
    ["M / R", "\\frac{M}{R}"],
    ["M / R x", "\\frac{M}{R\\,x}"],
    ["M / R * x", "\\frac{M}{R}\\,x"],
    ["1/2 x", "\\frac{1}{2}\\,x"],
    ["x^2", "{x}^{2}"],
    ["-x^2", "-{x}^{2}"],
    ["(-x)^2", "\\left(-x\\right)^{2}"],
    ["x^-1", "{x}^{-1}"],
    ["x^(1/3)", "{x}^{1/3}"],
    ["x^y^z", "{x}^{{y}^{z}}"],
    ["(x^y)^z", "\\left({x}^{y}\\right)^{z}"],
    ["(x + y) z", "\\left(x + y\\right)\\,z"],
    ["x - (y - z)", "x - \\left(y - z\\right)"],
    ["x - y + z", "x - y + z"],
    ["x + (y + z)", "x + y + z"],
    ["2 3^2", undefined],
    ["2 * 3", "2 \\times 3"],
    ["2 x", "2\\,x"],
    ["x * -y", "x\\,\\left(-y\\right)"],
    ["x - -y", "x - \\left(-y\\right)"],
    ["sqrt(x / y)", "\\sqrt{\\frac{x}{y}}"],
    ["sin(x)^2", "\\left(\\sin\\left(x\\right)\\right)^{2}"],
    ["abs(x)", "\\left|x\\right|"],
    ["x!", "x!"],
    ["(x + 1)!", "\\left(x + 1\\right)!"],
    ["log(x)", "\\ln\\left(x\\right)"],
    ["f(x, y)", "f\\left(x, y\\right)"],
    ["gamma (x + 1)", "\\gamma\\,\\left(x + 1\\right)"],
    ["1e-5 x", "10^{-5}\\,x"],
    ["3.2e38", "3.2 \\times 10^{38}"],
    ["x > 2", "x > 2"],
    ["x <= 2 and y != 3", "x \\le 2\\ \\text{and}\\ y \\ne 3"],
    ["sum(x^n, n, 0, 5)", "\\sum_{n=0}^{5} {x}^{n}"],
    ["integrate(x + t, t, 0, y)", "\\int_{0}^{y} \\left(x + t\\right)\\,\\mathrm{d}t"],
  ])("%s", (typed, tex) => {
    if (tex === undefined) return expect(() => texOf(typed)).toThrow();
    expect(texOf(typed)).toBe(tex);
    set(tex);
  });
});

describe("units in formulas", () => {
  it.each([
    ["10 Msun", "10\\,\\mathrm{M_\\odot}"],
    ["1e38 erg/s", "10^{38}\\,\\mathrm{erg}\\,\\mathrm{s}^{-1}"],
    ["400 erg/s/cm^2", "400\\,\\mathrm{erg}\\,\\mathrm{s}^{-1}\\,\\mathrm{cm}^{-2}"],
    ["3 cm^-3", "3\\,\\mathrm{cm}^{-3}"],
    ["x / (3 km)", "\\frac{x}{3\\,\\mathrm{km}}"],
    ["3 m", "3\\,m"],
    ["5%", "5\\,\\%"],
  ])("%s", (typed, tex) => {
    expect(texOf(typed)).toBe(tex);
    set(tex);
  });
});

describe("everything that is shown", () => {
  it("can be set, for each function of the language", () => {
    for (const { name, arity } of functionEntries) {
      const parts = name === "integrate" || name === "sum" || name === "root";
      const few = Array.from({ length: arity[0] }, (_, i) => ["x", "y + 1", "-z^2"][i] ?? "1");
      set(texOf(parts ? `${name}(t - x, t, 1, y/2)^2` : `${name}(${few.join(", ")})^2 / 3`));
    }
  });

  it("can be set, for formulas of any shape", () => {
    fc.assert(
      fc.property(formulas, (made) => {
        const tex = texOf(written(made));
        expect(tex).not.toMatch(/undefined|NaN|\[object/);
        set(tex);
      }),
      { seed: 20261207, numRuns: 1_000 },
    );
  });

  it("is told apart where the meaning differs", () => {
    const pairs: [string, string][] = [
      ["(x + y) z", "x + y z"],
      ["(x^y)^z", "x^(y^z)"],
      ["-x^2", "(-x)^2"],
      ["x - (y + z)", "x - y + z"],
      ["x - (y - z)", "x - y - z"],
      ["x / y z", "x / y * z"],
      ["x / (y / z)", "x / y / z"],
      ["(x y)^2", "x y^2"],
      ["sin(x)^2", "sin(x^2)"],
      ["(x > 0 ? y : z) + 1", "x > 0 ? y : z + 1"],
      ["x > 1 and (y > 1 or z > 1)", "x > 1 and y > 1 or z > 1"],
      ["(x > 1 or y > 1) and z > 1", "x > 1 or y > 1 and z > 1"],
      ["not (x > 1 and y > 1)", "not (x > 1) and y > 1"],
      ["integrate(t, t, 0, 1) x", "integrate(t x, t, 0, 1)"],
      ["(x / y)^2", "x / y^2"],
      ["(-x)!", "-x!"],
      ["(2 * 3)^x", "2 * 3^x"],
      ["(2e5)^x", "2 * 10^5^x"],
      ["x^(-y)", "x^-(y + 1)"],
    ];
    for (const [one, other] of pairs) expect(texOf(one), one).not.toBe(texOf(other));
  });

  it("is told apart wherever brackets change the value", () => {
    const x: Made = { leaf: "x" };
    const [y, z]: [Made, Made] = [{ leaf: "y" }, { leaf: "z" }];
    const two: Made = { leaf: "2" };
    const operators = ["+", "-", "*", "/", "^"] as const;
    const small: Made[] = [x, two, { leaf: "7e2" }, { sign: "-", of: y }];
    const operands = [...small, ...operators.map((op): Made => ({ op, left: z, right: two }))];
    let different = 0;
    for (const a of operands) {
      for (const b of operands) {
        for (const [first, second] of operators.flatMap((p) =>
          operators.map((q) => [p, q] as const),
        )) {
          const c = operands[(operands.indexOf(a) + operands.indexOf(b)) % operands.length] ?? x;
          const early: Made = { op: second, left: { op: first, left: a, right: b }, right: c };
          const late: Made = { op: first, left: a, right: { op: second, left: b, right: c } };
          const [f, g] = [asFunction(early)(1.3, 0.7, 2.9), asFunction(late)(1.3, 0.7, 2.9)];
          if (Math.abs(f - g) <= 1e-9 * Math.abs(f)) continue;
          different += 1;
          expect(texOf(written(early)), written(early)).not.toBe(texOf(written(late)));
        }
      }
    }
    expect(different).toBeGreaterThan(500);
  });

  it("can be set, for whole calculations", () => {
    const lines = [
      "M = 10.0(5) Msun",
      "eta = 0.1 ± 0.3 dex",
      "n_0 = 1e3 cm^-3 within a factor 3",
      "z_s = 0.01 .. 0.02",
      "theta_0 = 3 mas",
      "p_0 = 5 %",
      "phi_0 = 12 deg",
      "T = 1.2 ± 0.015 keV",
      "L_Edd = 4 pi G M m_p c / sigma_T to erg/s",
      "Mdot_Edd = L_Edd / (eta c^2) to Msun/yr",
      "t_S = M / Mdot_Edd",
      "f(x, y) = x^2 / (x + y)",
      "w = f(eta, 2) + p_0",
      "W = eta > 0.05 ? eta : 0.05",
      "E = integrate(planck_nu(nu, 5800 K), nu, 1e10 Hz, 1e17 Hz)",
      "bad = sqrt(",
      "worse = integrate(t, t, 0)",
      "angle = 3 M / M deg",
      "L_Edd > 1e38 erg/s and not (eta > 1)",
      "a_half = sqrt(M / Msun) (1 g)^(1/2)",
    ];
    const engine = createEngine();
    for (const em of ["si", "gaussian"] as const) {
      const file = calculation(lines, { em });
      const { cells } = engine.present(file, engine.evaluate(file, ""));
      const shown = Object.values(cells).flatMap((c) => [c.tex, c.valueTex, c.normalisedTex]);
      const texts = shown.filter((tex) => tex !== undefined);
      expect(texts.length).toBeGreaterThan(35);
      for (const tex of texts) {
        expect(tex).not.toMatch(/undefined|NaN/);
        set(tex);
      }
    }
  });
});
