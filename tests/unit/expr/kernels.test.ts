import { describe, expect, it } from "vitest";
import { kernels } from "@/lib/expr/kernels";

const call = (name: string, ...parts: number[]) =>
  kernels[name]?.(...parts) ?? Number.NEGATIVE_INFINITY;

/** Values of Abramowitz & Stegun (1964) tables 6.1, 6.3, 7.1, 7.3 and of exact identities. */
describe("special functions", () => {
  it.each([
    ["gamma", [0.5], Math.sqrt(Math.PI)],
    ["gamma", [1 / 3], 2.678938534707748],
    ["gamma", [5], 24],
    ["gamma", [-0.5], -2 * Math.sqrt(Math.PI)],
    ["gamma", [-2.5], (-8 / 15) * Math.sqrt(Math.PI)],
    ["gamma", [171], 7.257415615307999e306],
    ["lgamma", [100], 359.1342053695754],
    ["lgamma", [0.1], 2.252712651734206],
    ["lgamma", [1e10], 220258509288.8112],
    ["factorial", [0], 1],
    ["factorial", [20], 2432902008176640000],
    ["factorial", [0.5], Math.sqrt(Math.PI) / 2],
    ["combinations", [52, 5], 2598960],
    ["combinations", [10, 0], 1],
    ["combinations", [100, 50], 1.0089134454556415e29],
    ["erf", [0.5], 0.5204998778130465],
    ["erf", [-1], -0.8427007929497149],
    ["erf", [3], 0.9999779095030014],
    ["erfc", [0.5], 0.4795001221869535],
    ["erfc", [-1], 1.8427007929497148],
    ["erfc", [1.99], 0.004888586800383003],
    ["erfc", [2], 0.004677734981047266],
    ["erfc", [5], 1.5374597944280349e-12],
    ["erfc", [10], 2.088487583762545e-45],
    ["erfc", [27], 5.23705e-319],
    ["digamma", [1], -0.5772156649015329],
    ["digamma", [0.5], -1.9635100260214235],
    ["digamma", [100], 4.600161852738087],
    ["digamma", [-0.5], 0.03648997397857652],
    ["nthRoot", [-27, 3], -3],
    ["nthRoot", [16, 4], 2],
    ["nthRoot", [8, -3], 0.5],
    ["round", [2.5], 3],
    ["round", [-2.5], -3],
    ["round", [0.49], 0],
  ] as const)("%s %j is %d", (name, parts, exact) => {
    const value = call(name, ...parts);
    const tolerance = exact === 0 ? 0 : Math.abs(exact) < 1e-300 ? 1e-4 : 1e-10;
    expect(Math.abs(value - exact)).toBeLessThanOrEqual(tolerance * Math.abs(exact));
  });

  it.each([
    ["gamma", [0]],
    ["gamma", [-3]],
    ["lgamma", [0]],
    ["lgamma", [-0.5]],
    ["factorial", [-1]],
    ["factorial", [-0.5]],
    ["combinations", [5, 7]],
    ["combinations", [5, -1]],
    ["combinations", [5.5, 2]],
    ["nthRoot", [-16, 4]],
    ["nthRoot", [-2, 2.5]],
    ["luminosity_distance", [-1]],
  ] as const)("%s %j is not defined", (name, parts) => {
    expect(call(name, ...parts)).toBeNaN();
  });

  it("are too large where a double ends", () => {
    expect(call("gamma", 172)).toBe(Number.POSITIVE_INFINITY);
    expect(call("factorial", 171)).toBe(Number.POSITIVE_INFINITY);
    expect(Number.isFinite(call("factorial", 170))).toBe(true);
  });

  it("join where one formula takes over from another", () => {
    for (const [name, at] of [
      ["erfc", 2],
      ["digamma", 10],
    ] as const) {
      const below = call(name, at * (1 - 1e-12));
      expect(below / call(name, at * (1 + 1e-12))).toBeCloseTo(1, 9);
    }
  });

  it("agree with one another", () => {
    for (const x of [0.3, 1.7, 4.2, 20.5]) {
      expect(call("lgamma", x)).toBeCloseTo(Math.log(call("gamma", x)), 9);
      expect(call("gamma", x + 1) / call("gamma", x) / x).toBeCloseTo(1, 11);
      expect(call("digamma", x + 1) - call("digamma", x) - 1 / x).toBeCloseTo(0, 12);
      expect(call("erf", x) + call("erfc", x)).toBeCloseTo(1, 14);
    }
  });
});

describe("functions of astrophysics", () => {
  it("have the Rayleigh–Jeans and the Wien limit", () => {
    const [h, k, c] = [6.62607015e-34, 1.380649e-23, 299792458];
    const jeans = 2 * (1e6 / c) ** 2 * k * 1e4;
    expect(call("planck_nu", 1e6, 1e4) / jeans).toBeCloseTo(1, 8);
    const nu = 1e17;
    const wien = ((2 * h * nu ** 3) / c ** 2) * Math.exp((-h * nu) / (k * 1e5));
    expect(call("planck_nu", nu, 1e5) / wien).toBeCloseTo(1, 12);
  });

  it("are one function per frequency and per wavelength", () => {
    const [c, wavelength] = [299792458, 5e-7];
    const perFrequency = call("planck_nu", c / wavelength, 5772) * (c / wavelength ** 2);
    expect(call("planck_lambda", wavelength, 5772) / perFrequency).toBeCloseTo(1, 12);
  });

  it("relate distances by powers of 1 + z", () => {
    for (const z of [0.01, 0.5, 1, 6, 20]) {
      const comoving = call("comoving_distance", z);
      expect(call("luminosity_distance", z) / comoving).toBeCloseTo(1 + z, 10);
      expect(comoving / call("angular_diameter_distance", z)).toBeCloseTo(1 + z, 10);
    }
  });

  it("have the distance as c over H where it is small, and the age as the bound of look-back", () => {
    expect((call("comoving_distance", 1e-6) * call("hubble", 0)) / (299792458 * 1e-6)).toBeCloseTo(
      1,
      5,
    );
    const hubbleTime = 1 / call("hubble", 0);
    expect(call("lookback_time", 1e4) / hubbleTime).toBeCloseTo(0.9641, 3);
  });
});
