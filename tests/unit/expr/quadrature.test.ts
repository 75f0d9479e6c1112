import { describe, expect, it } from "vitest";
import { quadrature } from "@/lib/expr/quadrature";

const gaussian = (t: number) => Math.exp(-t * t);

describe("integrals with a closed form", () => {
  it.each<[string, (x: number) => number, number, number, number]>([
    ["x⁹ from 0 to 1", (x) => x ** 9, 0, 1, 0.1],
    ["x³ − x from −2 to 3", (x) => x ** 3 - x, -2, 3, 13.75],
    ["exp x from 0 to 1", Math.exp, 0, 1, Math.E - 1],
    ["sin x from 0 to π", Math.sin, 0, Math.PI, 2],
    ["1/(1 + x²) from −10 to 10", (x) => 1 / (1 + x * x), -10, 10, 2 * Math.atan(10)],
    ["x⁻² over ten decades", (x) => x ** -2, 1, 1e10, 1 - 1e-10],
    ["x⁻²·³⁵ from 0.1 to 100", (x) => x ** -2.35, 0.1, 100, (0.1 ** -1.35 - 100 ** -1.35) / 1.35],
    ["1/x over sixty decades", (x) => 1 / x, 1e-30, 1e30, 60 * Math.LN10],
    ["1/√x from 0 to 1", (x) => 1 / Math.sqrt(x), 0, 1, 2],
    ["ln x from 0 to 1", Math.log, 0, 1, -1],
    ["|x − 0.3| from 0 to 1", (x) => Math.abs(x - 0.3), 0, 1, 0.29],
    ["a step at 0.7", (x) => (x < 0.7 ? 1 : 3), 0, 1, 1.6],
    ["x³/(exp x − 1) from 0 to 200", (x) => x ** 3 / Math.expm1(x), 0, 200, Math.PI ** 4 / 15],
  ])("%s", (_, f, from, to, exact) => {
    const { value, error } = quadrature(f, from, to);
    expect(Math.abs(value / exact - 1)).toBeLessThan(1e-11);
    expect(error).toBeLessThan(1e-8 * Math.abs(exact));
  });

  it.each([5, 50, 1e3, 1e4, 1e6, 1e12])("finds a Gaussian in the middle of ±%d", (reach) => {
    const exact =
      reach > 6 ? Math.sqrt(Math.PI) : Math.sqrt(Math.PI) * (1 - 1.5374597944280349e-12);
    expect(quadrature(gaussian, -reach, reach).value / exact).toBeCloseTo(1, 12);
  });

  it("finds a narrow peak among many decades", () => {
    const line = (x: number) => Math.exp(-(((x - 1e10) / 1e9) ** 2));
    expect(quadrature(line, 1, 1e20).value / (Math.sqrt(Math.PI) * 1e9)).toBeCloseTo(1, 11);
  });
});

describe("rules of integrals", () => {
  it("turns its sign with its limits, and is zero between equal ones", () => {
    expect(quadrature(Math.exp, 1, 0).value).toBe(-quadrature(Math.exp, 0, 1).value);
    expect(quadrature(Math.exp, 2, 2)).toEqual({ value: 0, error: 0, size: 0 });
  });

  it("adds up over neighbouring ranges", () => {
    const f = (x: number) => Math.sin(x) * Math.exp(-x / 3);
    const parts = quadrature(f, -1, 2).value + quadrature(f, 2, 7).value;
    expect(parts).toBeCloseTo(quadrature(f, -1, 7).value, 12);
  });

  it("is zero where parts cancel, and knows their size", () => {
    const { value, error, size } = quadrature(Math.sin, 0, 100 * Math.PI);
    expect(value).toBe(0);
    expect(error).toBeLessThan(1e-12 * size);
    expect(size).toBeCloseTo(200, 1);
  });

  it("does not depend on the unit of its variable", () => {
    const plain = quadrature(gaussian, 0, 3).value;
    for (const unit of [1e-40, 1e-10, 1e15, 1e45]) {
      expect(quadrature((x) => gaussian(x / unit), 0, 3 * unit).value / unit / plain).toBeCloseTo(
        1,
        12,
      );
    }
  });

  it("states a large error where it does not converge", () => {
    const { value, error } = quadrature((x) => 1 / x, 0, 1);
    expect(error).toBeGreaterThan(1e-8 * value);
  });

  it("asks for fewer than a thousand values of a smooth integrand", () => {
    let asked = 0;
    quadrature(
      (x) => {
        asked += 1;
        return Math.exp(-x) * x * x;
      },
      0,
      20,
    );
    expect(asked).toBeLessThan(1_000);
  });
});
