import { describe, expect, it } from "vitest";
import { lastOf, resultsOf, siOf } from "./calculations";

describe("checks", () => {
  it.each<[string, boolean | null, number | undefined]>([
    ["L > 1e38 erg/s", true, 10],
    ["L < 1e38 erg/s", false, 10],
    ["1e38 erg/s < L", true, 0.1],
    ["L == 1e39 erg/s", true, 1],
    ["L == 1e32 W", true, 1],
    ["L != 1e39 erg/s", false, 1],
    ["L >= 1e39 erg/s", true, 1],
    ["L > 1e39 erg/s", false, 1],
    ["L > 0", true, undefined],
    ["0 < L", true, 0],
    ["-L >= 0", false, undefined],
    ["0 erg/s < L < 1 Lsun", false, undefined],
    ["1 erg/s < L < 1e10 Lsun", true, undefined],
    ["not (L < 1 erg/s)", true, undefined],
    ["L > 1 erg/s and 1e-20 > 0", true, undefined],
    ["L < 1 erg/s or 9.3e-25 < 1.4e-21", true, undefined],
    ["L > 1 erg/s and not (L > 1 erg/s)", false, undefined],
    ["L < 1 erg/s and 2 > 1 or 3 > 2", true, undefined],
    ["-1e-16 >= 0", false, undefined],
    ["1e-20 cm > 0", true, undefined],
    ["1 + 1e-13 == 1", true, 1],
    ["1 + 1e-10 == 1", false, 1],
    ["1 + 1e-13 > 1", false, 1],
  ])("%s", (condition, holds, ratio) => {
    const result = lastOf(["L = 1e39 erg/s", condition]);
    expect(result).toMatchObject({ kind: "check", status: "ok", holds });
    const found = "ratio" in result ? result.ratio : undefined;
    if (ratio === undefined) expect(found ?? undefined).toBeUndefined();
    else expect(found).toBeCloseTo(ratio, 9);
  });

  it("compare a bare zero with anything, but no other bare number", () => {
    for (const left of ["3 km", "2 erg/s", "(5 K)", "G", "-m_p"]) {
      expect(lastOf([`${left} < 0`])).toMatchObject({ status: "ok" });
      expect(lastOf([`${left} < 1`])).toMatchObject({ error: { code: "dimension" } });
    }
    expect(siOf(["x = max(-3 m, 0) + min(2 m, 0)"])).toBe(0);
  });
});

describe("units of results", () => {
  it.each([
    ["x = 2 km to m", 2000, "m"],
    ["x = 3 kpc^2 to pc^2", 3e6, "pc^2"],
    ["x = 1 Msun/yr to g s^-1", 1.988409870698051e33 / 31557600, "g s^-1"],
    ["x = 300 K k_B to eV", 0.0258519998, "eV"],
    ["x = pi to deg", 180, "deg"],
    ["x = 0.5 + 0 to %", 50, "%"],
    ["x = sqrt(4 erg^2 s^-2) to Lsun", 2 / 3.828e33, "Lsun"],
  ])("%s", (line, value, unit) => {
    const result = lastOf([line]);
    expect(result).toMatchObject({ status: "ok", unit });
    if ("value" in result) expect(result.value / value).toBeCloseTo(1, 8);
  });

  it("are readable where none is asked for, and give the same quantity", () => {
    for (const line of ["x = G Msun / c^2", "x = 2 c", "x = m_p c^2", "x = 1 / (3 yr)"]) {
      const result = lastOf([line]);
      if (result.status !== "ok" || !("unit" in result) || !("value" in result))
        throw new Error(line);
      expect(result.unit).not.toBe("");
      const again = siOf([`x = ${result.value} * (1 ${result.unit})`]);
      expect(again / siOf([line])).toBeCloseTo(1, 12);
    }
  });
});

describe("dimensions of results", () => {
  it.each<[string, Record<string, string>]>([
    ["x = 2 + 0", {}],
    ["x = sqrt(3 m)", { length: "1/2" }],
    ["x = cbrt(2 kg) / (3 s)^(2/3)", { mass: "1/3", time: "-2/3" }],
    ["x = nthRoot(2 kg, 4)", { mass: "1/4" }],
    ["x = (2 m)^1.5", { length: "3/2" }],
    ["x = (2 m)^-2 1 mol cd", { length: "-2", amount: "1", "luminous intensity": "1" }],
    ["x = integrate(1 kg, t, 0 s, 3 s)", { mass: "1", time: "1" }],
    ["x = sum(i 2 K, i, 1, 3)", { temperature: "1" }],
    ["x = root(t - 3 A, t, 0 A, 5 A)", { current: "1" }],
    ["x = sign(-3 kg) + atan2(1 m, 2 m)", {}],
    ["x = abs(-3 kg)", { mass: "1" }],
    ["x = 3 deg + 2 arcsec + 1 sr", {}],
  ])("%s", (line, dimension) => {
    expect(lastOf([line])).toMatchObject({ status: "ok", si: { dimension } });
    const result = lastOf([line]);
    expect("si" in result && result.si.dimension).toEqual(dimension);
  });
});

describe("exponents known from givens", () => {
  it("decide a dimension where they have no uncertainty", () => {
    const lines = ["x = 4 m", "n = 1.5"];
    expect(lastOf([...lines, "y = x^n"])).toMatchObject({ si: { dimension: { length: "3/2" } } });
    expect(siOf([...lines, "y = x^n"])).toBeCloseTo(8, 12);
    expect(siOf([...lines, "y = x^(2 n - 1)"])).toBeCloseTo(16, 12);
    expect(siOf([...lines, "y = nthRoot(x, 2 n - 1)"])).toBeCloseTo(2, 12);
    expect(lastOf([...lines, "y = nthRoot(x, 2 n - 1)"])).toMatchObject({
      scaling: [{ symbol: "x", exponent: 0.5, exact: true }],
    });
  });

  it("do not where they are uncertain, or computed", () => {
    for (const n of ["n = 1.5(1)", "n = 1 .. 2", "n = 1 ± 0.1 dex", "n = 3 / 2", "n = 1 + 1"]) {
      expect(lastOf(["x = 4 m", n, "y = x^n"])).toMatchObject({ error: { code: "dimension" } });
      expect(lastOf(["x = 4", n, "y = x^n"])).toMatchObject({ status: "ok" });
    }
  });
});

describe("names that are bound", () => {
  it("hide what they are called like, inside only", () => {
    const lines = ["m = 2 kg", "G = 3", "f(c) = c^2", "x = f(5) + c / (1 km/s)"];
    expect(siOf(lines)).toBeCloseTo(25 + 299792.458, 9);
    expect(siOf(["t = 100", "x = sum(t, t, 1, 4) + t"])).toBe(110);
    expect(siOf(["t = 2", "x = integrate(t, t, 0, t)"])).toBeCloseTo(2, 12);
    expect(siOf(["x = sum(sum(i, i, 1, i), i, 1, 3)"])).toBe(1 + 3 + 6);
    expect(siOf(["x = root(s - 3 s / s, s, 1, 5)"])).toBeCloseTo(3, 12);
    expect(siOf(["gamma(x) = 2 x", "y = gamma(3)"])).toBe(6);
    expect(siOf(["x = sum(exp (2), exp, 1, 3)"])).toBe(12);
  });
});

describe("functions of the calculation", () => {
  it("may be nested, in any order of cells", () => {
    expect(siOf(["h(x) = g(g(x)) + 1", "g(x) = f(x, 2)", "f(a, b) = a b", "y = h(3)"])).toBe(13);
  });

  it("use what the calculation defines, as it is now", () => {
    expect(siOf(["f(x) = k x^2", "k = 3", "y = f(2)"])).toBe(12);
    expect(siOf(["k = 3 m", "f(x) = k x", "y = f(2 s) / f(1 s)"])).toBe(2);
  });

  it("hide units and constants, and say so", () => {
    expect(resultsOf(["c(x) = 2 x"])[0]?.notices).toMatchObject([{ code: "hides-constant" }]);
    expect(resultsOf(["m(x) = 2 x"])[0]?.notices).toMatchObject([{ code: "hides-unit" }]);
  });

  it("carry uncertainty through their arguments and through what they use", () => {
    const result = lastOf(["k = 3.0(3)", "x = 2.0(2)", "f(a) = k a", "y = f(x)"]);
    if (!("uncertainty" in result)) throw new Error("no uncertainty");
    expect(result.uncertainty).toBeCloseTo(6 * Math.hypot(0.1, 0.1), 10);
  });
});
