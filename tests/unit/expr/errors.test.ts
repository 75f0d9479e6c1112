import { describe, expect, it } from "vitest";
import type { CellResult } from "@/lib/schema";
import { lastOf, resultsOf } from "./calculations";

const errorOf = (result: CellResult) => {
  if (result.status !== "error") throw new Error(`${JSON.stringify(result)} has no error`);
  return result.error;
};

/** Code, what is marked of the formula, and what the message says of one relation. */
type Case = readonly [string, string, string, RegExp];

const known = ["A = 2 kg", "B = 3 m", "C = 5 s", "τ = 3"];

function expectError(line: string, code: string, marked: string, says: RegExp): void {
  const error = errorOf(lastOf([...known, line]));
  const formula = line.slice(line.indexOf("=") + 1).trim();
  expect(error.code).toBe(code);
  expect(error.message).toMatch(says);
  expect(error.field).toBe("formula");
  expect(formula.slice(error.from, error.to)).toBe(marked);
}

describe("dimension errors mark the expression and say by what the sides differ", () => {
  it.each<Case>([
    ["x = A + B", "dimension", "A + B", /a mass \(g\), right is a length \(cm\).*differ by/],
    ["x = 2 (A - B C) / A", "dimension", "A - B C", /left is a mass/i],
    ["x = B / C + B", "dimension", "B / C + B", /a velocity.*differ by a time/],
    [
      "x = A B²/C² + A B²/C³",
      "dimension",
      "A B²/C² + A B²/C³",
      /an energy.*a power|an energy.*a luminosity/,
    ],
    ["x = exp(B)", "dimension", "B", /argument of exp must be dimensionless; this is a length/],
    ["x = 1 + log(2 A)", "dimension", "2 A", /argument of log/],
    ["x = 2^B", "dimension", "B", /exponent must be dimensionless/],
    ["x = B^pi", "dimension", "pi", /plain number/],
    ["x = B^τ^0.5", "dimension", "τ^0.5", /plain number/],
    ["x = min(A, B)", "dimension", "A, B", /differ/],
    ["x = hypot(A, 2 B)", "dimension", "A, 2 B", /differ/],
    ["x = atan2(A, B)", "dimension", "A, B", /differ/],
    ["x = τ > 2 ? A : B", "dimension", "A : B", /differ/],
    ["x = A > B ? 1 : 2", "dimension", "A > B", /differ/],
    ["x = A > 2 ? 1 : 2", "dimension", "A > 2", /a pure number: they differ by a mass/],
    ["x = 2 > 1 ? 1 : 1 + A", "dimension", "1 + A", /differ/],
    ["x = sum(A^i, i, 1, 3)", "dimension", "i", /plain number/],
    ["x = integrate(t, t, 0 m, C)", "dimension", "0 m, C", /differ/],
    ["x = planck_nu(B, 300 K)", "dimension", "B", /takes a frequency/],
    ["x = luminosity_distance(B)", "dimension", "B", /takes a pure number/],
    ["x = to_gaussian(A)", "dimension", "A", /no counterpart of a mass/],
    ["x = nthRoot(B, 0)", "dimension", "0", /other than zero/],
    ["x = floor(B)", "dimension", "B", /dimensionless/],
    ["x = σ_T² + m_p", "dimension", "σ_T² + m_p", /differ/],
    ["x = 2 τ² (√(A) − B²)", "dimension", "√(A) − B²", /differ/],
  ])("%s", expectError);
});

describe("errors of syntax mark what was typed", () => {
  it.each<Case>([
    ["x = 3 2", "syntax", "3 2", /Did you mean 3 \* 2/],
    ["x = sin^2(B)", "syntax", "sin^2(B)", /sin\(B\)\^2/],
    ["x = τ² + sin²(τ)", "syntax", "sin²(τ)", /Did you mean sin\(tau\)\^2/],
    ["x = 2 sin τ", "syntax", "sin", /brackets/],
    ["x = 2 (τ + 1", "syntax", "(", /never closed/],
    ["x = 2 τ²)", "syntax", ")", /closes nothing/],
    ["x = τ² +", "syntax", "+", /ends too early/],
    ["x = τ² * / 2", "syntax", "/", /does not fit/],
    ["x = sqrt()", "syntax", "sqrt()", /0 arguments.*sqrt\(x\)/],
    ["x = 1 + atan2(τ)", "syntax", "atan2(τ)", /1 argument; it is written atan2/],
    ["x = integrate(t, 3, 0, 1)", "syntax", "3", /plain name/],
    ["x = 1 + (τ > 2)", "syntax", "(τ > 2)", /condition/],
    ["x = τ ? 1 : 2", "syntax", "τ", /Compare it/],
    ["x = 0x1F", "syntax", "0x1", /decimals/],
  ])("%s", expectError);
});

describe("words and names that are not there", () => {
  it.each<Case>([
    ["x = 2 sigmaT", "unknown-name", "sigmaT", /Did you mean “sigma_T”/],
    ["x = τ² kB / 2", "unknown-name", "kB", /Did you mean “k_B”/],
    ["x = 3 + e", "unknown-name", "e", /exp\(1\).*q_e/],
    ["x = sqrt(-1) i", "unknown-name", "i", /complex/],
    ["x = 2 sinn(τ, 1)", "unknown-name", "sinn", /function.*Did you mean “sin”/],
    ["x = 1 + import(τ)", "forbidden", "import", /may use/],
    ["x = [1, 2]", "forbidden", "[", /not part/],
    ["x = τ.length", "forbidden", ".", /not part/],
    ["x = 7 mod τ", "forbidden", "mod", /.+/],
    ["x = τ % 2", "forbidden", "%", /percent/],
    ["x = NaN", "forbidden", "NaN", /another name/],
    ["x = τ | 2", "forbidden", "|", /not part/],
  ])("%s", expectError);
});

describe("values that a double or a function does not have", () => {
  it.each<Case>([
    ["x = 2 / (τ - 3)", "domain", "2 / (τ - 3)", /divides by zero/],
    ["x = 1 + sqrt(1 - τ)", "domain", "sqrt(1 - τ)", /“sqrt”/],
    ["x = log(τ - 3)", "domain", "log(τ - 3)", /“log”/],
    ["x = (−8)^(1/3)", "domain", "(−8)^(1/3)", /cbrt/],
    ["x = asin(τ)", "domain", "asin(τ)", /“asin”/],
    ["x = factorial(-1)", "domain", "factorial(-1)", /“factorial”/],
    ["x = integrate(1/t, t, -1, 1.5)", "domain", "integrate(1/t, t, -1, 1.5)", /converge/],
    ["x = sum(i, i, 0.5, 3)", "domain", "sum(i, i, 0.5, 3)", /whole/],
    ["x = 1e200 τ 1e200", "overflow", "1e200 τ 1e200", /1\.8 × 10³⁰⁸/],
    ["x = 1 + 1e-200 * 1e-200", "overflow", "1e-200 * 1e-200", /smaller than a double/],
    ["x = (1e-200)^2", "overflow", "(1e-200)^2", /smaller than a double/],
    ["x = 1e-300 / 1e300", "overflow", "1e-300 / 1e300", /smaller than a double/],
    ["x = exp(1000)", "overflow", "exp(1000)", /larger/],
    ["x = 1e308 + 1e308", "overflow", "1e308 + 1e308", /larger/],
    ["x = τ 1e400", "overflow", "1e400", /1e400/],
    ["x = τ 1e-400", "overflow", "1e-400", /1e-400/],
    ["x = root(t² + 1, t, 0, 5)", "no-solution", "root(t² + 1, t, 0, 5)", /Widen/],
    ["x = root(tan(t), t, 1, 2)", "no-solution", "root(tan(t), t, 1, 2)", /Widen/],
    ["x = sum(i, i, 1, 1e12)", "limit", "sum(i, i, 1, 1e12)", /terms/],
  ])("%s", expectError);
});

describe("units", () => {
  it.each([
    ["x = 2 A to furlongs", /not a unit/],
    ["x = 2 A to cm", /This is a mass.*“cm” measures a length.*differ by/],
    ["x = 2 A to 3", /cannot be read/],
    ["x = 3(1) furlong", /not a unit/],
  ])("%s", (line, says) => {
    const error = errorOf(lastOf([...known, line]));
    expect(error).toMatchObject({ code: "unit", field: "unit", from: 0 });
    expect(error.message).toMatch(says);
  });

  it("are missing behind a bare `to`", () => {
    expect(errorOf(lastOf([...known, "x = A to"]))).toMatchObject({ code: "unit", from: 2, to: 4 });
  });
});

describe("errors of one cell and of the others", () => {
  it("name the symbol that has the error, all the way down", () => {
    const results = resultsOf(["x = sqrt(0 - 1)", "y = 2 x", "z = y + 1", "w = 3 + 0", "z > 1"]);
    expect(results.map((r) => (r.status === "error" ? r.error.code : r.status))).toEqual([
      "domain",
      "depends",
      "depends",
      "ok",
      "depends",
    ]);
    expect(errorOf(results[1] as CellResult)).toMatchObject({ from: 2, to: 3 });
    expect(errorOf(results[1] as CellResult).message).toMatch(/“x”/);
    expect(errorOf(results[2] as CellResult).message).toMatch(/“y”/);
  });

  it("name the members of every cycle, and of none else", () => {
    const results = resultsOf(["a = b", "b = a", "p = q 2", "q = p + p", "r = q", "s = 2 + 0"]);
    expect(results.map((r) => (r.status === "error" ? r.error.code : r.status))).toEqual([
      "cycle",
      "cycle",
      "cycle",
      "cycle",
      "depends",
      "ok",
    ]);
    expect(errorOf(results[0] as CellResult).message).toMatch(/a → b → a|b → a → b/);
    expect(errorOf(results[3] as CellResult).message).toMatch(/p → q → p|q → p → q/);
  });

  it("find functions that use each other", () => {
    const results = resultsOf(["f(x) = g(x)", "g(x) = f(x)", "y = f(1)"]);
    expect(results.map((r) => errorOf(r).code)).toEqual(["cycle", "cycle", "depends"]);
  });

  it("place a fault inside a function in the call, and say where it lies", () => {
    const error = errorOf(lastOf(["f(x) = 1 + x", "y = 2 f(3 m)"]));
    expect(error).toMatchObject({ code: "dimension", from: 2, to: 8 });
    expect(error.message).toMatch(/^Inside f\(…\): left is a pure number/i);
  });

  it("tell a name given twice, in Greek and spelled", () => {
    const error = errorOf(lastOf(["alpha = 2", "α = 3"]));
    expect(error).toMatchObject({ code: "duplicate-name", suggestion: "alpha_2", field: "symbol" });
    expect(errorOf(lastOf(["f(x) = x", "f = 3"])).code).toBe("duplicate-name");
  });

  it("tell the uncertainty that cannot be", () => {
    const cases = ["x = 3 ± -1", "x = 3 within a factor 0.5", "x = 2 .. 1", "x = -3 ± 0.2 dex"];
    for (const line of cases) expect(errorOf(lastOf([line])).code).toBe("domain");
  });

  it("stop a calculation that would run for minutes", () => {
    const nested = "x = sum(sum(sum(i j k, i, 1, 1000), j, 1, 1000), k, 1, 1000)";
    expect(errorOf(lastOf([nested]))).toMatchObject({ code: "limit" });
  });
});
