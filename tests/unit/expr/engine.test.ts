import { describe, expect, it } from "vitest";
import { createEngine } from "@/lib/expr";
import type { CalculationFile } from "@/lib/schema";
import { lastOf, resultsOf, siOf } from "./calculations";

const relation = (symbol: string, formula: string, unit?: string): CalculationFile => ({
  format: "leading-order/1",
  title: "",
  edition: "codata-2018",
  cells: [{ id: "r", kind: "relation", symbol, formula, ...(unit === undefined ? {} : { unit }) }],
});
const single = (symbol: string, formula: string, unit?: string) =>
  createEngine().evaluate(relation(symbol, formula, unit), "").cells.r;

describe("the example of the results format", () => {
  const [mass, luminosity, check] = resultsOf([
    "M = 10.0(5) Msun",
    "L_Edd = 4 pi G M m_p c / sigma_T to erg/s",
    "L_Edd > 1e38 erg/s",
  ]);

  it("gives its values, dimensions, uncertainty, budget, scaling and normalised form", () => {
    expect(mass).toMatchObject({ kind: "given", status: "ok", value: 10, uncertainty: 0.5 });
    expect(luminosity).toMatchObject({
      kind: "relation",
      status: "ok",
      symbol: "L_Edd",
      unit: "erg/s",
      si: { dimension: { mass: "1", length: "2", time: "-3" } },
      scaling: [{ symbol: "M", exponent: 1, exact: true }],
      normalised: { terms: [{ symbol: "M", fiducial: 10, unit: "Msun", exponent: 1 }] },
    });
    if (luminosity?.status !== "ok" || !("value" in luminosity)) throw new Error("no value");
    expect(luminosity.value / 1.2570651798e39).toBeCloseTo(1, 9);
    expect((luminosity.uncertainty ?? 0) / 6.285e37).toBeCloseTo(1, 3);
    expect(check).toMatchObject({ kind: "check", holds: true });
    expect(check && "ratio" in check && check.ratio).toBeCloseTo(12.57, 2);
  });
});

describe("errors by code", () => {
  it.each([
    ["syntax", ["x = 3 2"]],
    ["syntax", ["x = sin^2(1)"]],
    ["unknown-name", ["x = sigmaT / 2 + 1"]],
    ["dimension", ["L = 3 erg/s", "E = 2 erg", "x = L + E"]],
    ["dimension", ["M = 3 g", "x = exp(M)"]],
    ["dimension", ["M = 3(1) g", "n = 2.0(1)", "x = M^n"]],
    ["unit", ["M = 3 g", "x = 2 M to cm"]],
    ["unit", ["M = 3 g", "x = 2 M to furlongs"]],
    ["cycle", ["x = y + 1", "y = x + 1"]],
    ["cycle", ["f(x) = f(x) + 1"]],
    ["domain", ["x = sqrt(-1 + 0)"]],
    ["domain", ["x = 1 / (1 - 1)"]],
    ["domain", ["x = log(1 - 1)"]],
    ["domain", ["x = (-8)^(1/3)"]],
    ["overflow", ["x = 1e200 * 1e200"]],
    ["overflow", ["x = 1 + 1e-200 * 1e-200"]],
    ["overflow", ["x = atan(1e200 * 1e200)"]],
    ["overflow", ["x = exp(1000)"]],
    ["forbidden", ["x = import(2)"]],
    ["forbidden", ["x = parser()"]],
    ["limit", ["x = sum(i, i, 1, 1e12)"]],
    ["limit", [`x = ${"(".repeat(61)}1${")".repeat(61)} + 1`]],
    ["depends", ["x = sqrt(-1 + 0)", "y = x + 1"]],
    ["no-solution", ["x = root(t^2 + 1, t, 0, 5)"]],
  ] as const)("%s: %j", (code, lines) => {
    const results = resultsOf(lines);
    expect(results.some((result) => result.status === "error" && result.error.code === code)).toBe(
      true,
    );
  });

  it("names the slip: what stands on each side and by what they differ", () => {
    const error = lastOf(["L = 3 erg/s", "E = 2 erg", "x = L + E"]);
    expect(error).toMatchObject({ error: { code: "dimension", field: "formula", from: 0, to: 5 } });
    const message = error.status === "error" ? error.error.message : "";
    expect(message).toMatch(
      /a luminosity \(erg s⁻¹\), right is an energy \(erg\): they differ by a time/,
    );
  });

  it("suggests the name that was meant", () => {
    expect(single("x", "2 sigmaT")).toMatchObject({
      error: { suggestion: "sigma_T", from: 2, to: 8 },
    });
  });

  it("refers to what was typed, Greek and superscripts included", () => {
    expect(single("x", "σ_T² + m_p")).toMatchObject({
      error: { code: "dimension", from: 0, to: 10 },
    });
    expect(single("x", "2 ρ² q")).toMatchObject({
      error: { code: "unknown-name", from: 2, to: 3 },
    });
  });

  it("names the members of a cycle", () => {
    const results = resultsOf(["a1 = b1 + 1", "b1 = c1 + 1", "c1 = a1 + 1", "d1 = a1"]);
    expect(
      results
        .slice(0, 3)
        .every((r) => r.status === "error" && /a1 → b1 → c1 → a1/.test(r.error.message)),
    ).toBe(true);
    expect(results[3]).toMatchObject({ error: { code: "depends" } });
  });

  it("keeps the first definition and refuses the second", () => {
    const results = resultsOf(["M = 1 g", "M = 2 g", "x = 2 M"]);
    expect(results.map((r) => r.status)).toEqual(["ok", "error", "ok"]);
    expect(results[1]).toMatchObject({ error: { code: "duplicate-name", suggestion: "M_2" } });
  });
});

describe("functions of the calculation", () => {
  it("are written in the symbol or in the formula", () => {
    expect(single("f(x, y)", "x y^2")).toMatchObject({
      status: "ok",
      symbol: "f",
      parameters: ["x", "y"],
    });
    expect(single("f", "f(x, y) = x y^2")).toMatchObject({ parameters: ["x", "y"] });
    expect(single("g", "f(x) = x")).toMatchObject({ error: { code: "syntax" } });
  });

  it("take arguments of any dimension that fits", () => {
    const lines = [
      "ratio(a, b) = (a - b) / (a + b)",
      "x = ratio(3 km, 1 km) + ratio(5 erg, 1 erg)",
    ];
    expect(siOf(lines)).toBeCloseTo(0.5 + 4 / 6, 12);
    expect(lastOf([...lines.slice(0, 1), "x = ratio(3 km, 1 s)"])).toMatchObject({
      error: { code: "dimension" },
    });
  });

  it("may use each other without growing", () => {
    const chain = Array.from({ length: 18 }, (_, i) => `f${i + 1}(x) = f${i}(x) + f${i}(x)`);
    expect(siOf(["f0(x) = x", ...chain, "y = f18(1)"])).toBe(2 ** 18);
    const bomb = Array.from({ length: 40 }, (_, i) => `f${i + 1}(x) = f${i}(x) + f${i}(x)`);
    expect(lastOf(["f0(x) = x", ...bomb, "y = f40(1)"])).toMatchObject({
      error: { code: "limit" },
    });
  });

  it("give way to a quantity of the same name", () => {
    expect(siOf(["gamma = 3", "x = gamma (1 + 1)"])).toBe(6);
  });
});

describe("names", () => {
  it("hide units and constants, and say so", () => {
    const [mass, length] = resultsOf(["m = 2 kg", "x = 3 m + m"]);
    expect(mass?.notices).toMatchObject([{ code: "hides-unit", level: "notice" }]);
    expect(length?.notices).toMatchObject([
      { code: "hidden-unit", level: "warning", from: 2, to: 3 },
    ]);
    expect(resultsOf(["G = 2"])[0]?.notices).toMatchObject([{ code: "hides-constant" }]);
    expect(lastOf(["a = 2", "b = 3", "x = 1/a b"]).notices).toMatchObject([
      { code: "implicit-product-after-division" },
    ]);
  });

  it("are defined anywhere, in the order of reading", () => {
    expect(resultsOf(["x = 2 y", "y = 3 + 0"])[0]).toMatchObject({ value: 6 });
  });

  it("are one, typed in Greek or spelled", () => {
    expect(siOf(["σ_0 = 2", "x = 3 sigma_0"])).toBe(6);
  });
});

describe("comparisons", () => {
  it.each([
    ["1e-20 > 0", true],
    ["9.3e-25 < 1.4e-21", true],
    ["-1e-16 >= 0", false],
    ["0.1 + 0.2 == 0.3", true],
    ["1e-20 == 0", false],
    ["1 < 2 < 3", true],
    ["1 < 3 < 2", false],
    ["1 < 2 and 2 < 1", false],
    ["1 > 2 or 2 > 1", true],
    ["not (1 > 2)", true],
    ["3 km > 0", true],
    ["2 erg != 3 erg", true],
  ])("%s is %s", (condition, holds) => {
    expect(lastOf([condition])).toMatchObject({ kind: "check", status: "ok", holds });
  });
});

describe("the Gaussian convention", () => {
  const gaussian = { em: "gaussian" } as const;

  it("has a force between charges without a constant", () => {
    expect(lastOf(["r = 1 cm", "F_e = q_esu^2 / r^2 to dyn"], gaussian)).toMatchObject({
      status: "ok",
    });
    expect(siOf(["r = 1 cm", "F_e = q_esu^2 / r^2"], gaussian)).toBeCloseTo(2.3070775e-24, 30);
  });

  it("has B²/8π as an energy density, and 1 gauss as 10⁻⁴ tesla converted", () => {
    expect(siOf(["B = 1 gauss", "u_B = B^2 / (8 pi) to erg/cm^3"], gaussian)).toBeCloseTo(
      0.1 / (8 * Math.PI),
      12,
    );
    expect(siOf(["B = 1 gauss", "b_si = to_si(B) to T"], gaussian)).toBeCloseTo(1e-4, 15);
  });

  it("names the converter where the conventions meet", () => {
    const mixed = lastOf(["B = 1 gauss", "x = B + 1 T"], gaussian);
    expect(mixed).toMatchObject({ error: { code: "dimension" } });
    expect(mixed.status === "error" && mixed.error.message).toMatch(/to_gaussian/);
    const unit = lastOf(["B = 1 esu"]);
    expect(unit).toMatchObject({ error: { code: "unknown-name" } });
  });
});

describe("bodies and constants", () => {
  it("let G cancel in G M", () => {
    const result = lastOf(["M = 1 Msun", "x = G M to m^3/s^2"]);
    expect(result).toMatchObject({ uncertainty: null });
    expect(siOf(["x = G M_sun + 0 G M_sun"])).toBeCloseTo(1.3271244e20, -8);
  });

  it("track what is shared: x − x is exactly certain", () => {
    expect(lastOf(["x = 3.0(5)", "y = 2 x", "z = y - 2 x + 1"])).toMatchObject({
      value: 1,
      uncertainty: null,
    });
  });
});

describe("integrals, sums and roots", () => {
  it("bind a name of their own", () => {
    expect(siOf(["x = 5", "y = integrate(x^2, x, 0, 3) + x"])).toBeCloseTo(14, 10);
    expect(siOf(["y = sum(1 / n^2, n, 1, 100000)"])).toBeCloseTo(Math.PI ** 2 / 6 - 1e-5, 9);
    expect(siOf(["y = root(cos(t) - t, t, 0, 1)"])).toBeCloseTo(0.7390851332151607, 12);
  });

  it("carry dimensions", () => {
    expect(lastOf(["y = integrate(3 erg/s + 0 erg/s, t, 0 s, 1 hr) to erg"])).toMatchObject({
      value: 10800,
    });
    expect(lastOf(["y = integrate(t, t, 0, 1 s)"])).toMatchObject({ error: { code: "dimension" } });
  });

  it("say where they do not converge", () => {
    expect(lastOf(["y = integrate(1/t, t, -1, 1.5)"])).toMatchObject({ error: { code: "domain" } });
  });
});

describe("sweeps and solves", () => {
  const base = relation("L", "4 pi G M m_p c / sigma_T", "erg/s");
  const file: CalculationFile = {
    ...base,
    cells: [{ id: "g", kind: "given", symbol: "M", value: 10, unit: "Msun" }, ...base.cells],
  };
  const withCell = (cell: CalculationFile["cells"][number]) =>
    createEngine().evaluate({ ...file, cells: [...file.cells, cell] }, "").cells[cell.id];
  const solve = {
    id: "v",
    kind: "solve",
    for: "M",
    unit: "Msun",
    target: "L",
    targetUnit: "erg/s",
  } as const;

  it("find the mass that shines with 10⁴⁶ erg/s", () => {
    const found = withCell({ ...solve, from: 1, to: 1e12, equals: 1e46 });
    expect(found && "solutions" in found && found.solutions[0]).toBeCloseTo(79550369.864, 2);
  });

  it("tell the range where there is no solution", () => {
    const none = withCell({ ...solve, from: 1, to: 100, equals: 1e46 });
    expect(none).toMatchObject({ error: { code: "no-solution" } });
    expect(none?.status === "error" && none.error.message).toMatch(
      /1\.257e\+38 to 1\.257e\+40 erg\/s/,
    );
  });

  it("find every solution", () => {
    const sine: CalculationFile = {
      ...file,
      cells: [
        { id: "g", kind: "given", symbol: "t", value: 1 },
        { id: "r", kind: "relation", symbol: "y", formula: "sin(t)" },
        { id: "v", kind: "solve", for: "t", from: 0.1, to: 10, target: "y", equals: 0 },
      ],
    };
    const found = createEngine().evaluate(sine, "").cells.v;
    expect(found && "solutions" in found && found.solutions.map((x) => x / Math.PI)).toEqual([
      expect.closeTo(1, 12),
      expect.closeTo(2, 12),
      expect.closeTo(3, 12),
    ]);
  });

  it("follow a relation over decades, with gaps where it has no value", () => {
    const swept = withCell({
      id: "s",
      kind: "sweep",
      over: "M",
      from: 1,
      to: 1e9,
      unit: "Msun",
      spacing: "log",
      points: 4,
      show: ["L"],
    });
    expect(swept).toMatchObject({
      kind: "sweep",
      status: "ok",
      points: [1, 1000, 1e6, 1e9].map((x) => expect.closeTo(x, 3)),
    });
    const root: CalculationFile = {
      ...file,
      cells: [
        { id: "g", kind: "given", symbol: "t", value: 1 },
        { id: "r", kind: "relation", symbol: "y", formula: "sqrt(t)" },
        {
          id: "s",
          kind: "sweep",
          over: "t",
          from: -1,
          to: 1,
          spacing: "linear",
          points: 3,
          show: ["y"],
        },
      ],
    };
    expect(createEngine().evaluate(root, "").cells.s).toMatchObject({
      series: [{ values: [null, 0, 1] }],
    });
  });
});
