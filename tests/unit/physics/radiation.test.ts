import { describe, expect, it } from "vitest";
import { findConstant, planckLambda, planckNu } from "@/lib/physics";
import { expectWithin } from "./approximately";

const c = 299792458;
const si = { edition: "codata-2018", em: "si" } as const;
const wien = findConstant("b_wien", si)?.siValue ?? Number.NaN;
const sigma = findConstant("sigma_SB", si)?.siValue ?? Number.NaN;

/** ∫ f over x = exp(u), by the trapezoidal rule, which converges fast for such a bell. */
function integral(f: (x: number) => number, from: number, to: number, steps = 4_000): number {
  const [low, step] = [Math.log(from), Math.log(to / from) / steps];
  let sum = 0;
  for (let i = 0; i <= steps; i++) sum += f(Math.exp(low + i * step)) * Math.exp(low + i * step);
  return sum * step;
}

describe("the Planck function", () => {
  it.each([2.7255, 5772, 1e7])("integrates to σT⁴/π at %d K", (temperature) => {
    const total = (sigma * temperature ** 4) / Math.PI;
    const peak = 5.878925757646825e10 * temperature;
    const nu = integral((x) => planckNu(x, temperature), peak * 1e-5, peak * 30);
    const lambda = integral(
      (x) => planckLambda(x, temperature),
      c / (peak * 30),
      c / (peak * 1e-5),
    );
    expectWithin(nu, total, 1e-10);
    expectWithin(lambda, total, 1e-10);
  });

  it("is one law in two variables: ν B_ν = λ B_λ", () => {
    for (const nu of [1e9, 1e14, 3e15]) {
      expectWithin(nu * planckNu(nu, 5772), (c / nu) * planckLambda(c / nu, 5772), 1e-13);
    }
  });

  it("tends to 2ν²kT/c² at long wavelengths", () => {
    expectWithin(planckNu(1e6, 1e4), (2 * 1e12 * 1.380649e-23 * 1e4) / c ** 2, 1e-8);
  });

  it("peaks where the displacement law says", () => {
    const [peak, temperature] = [wien / 5772, 5772];
    const there = planckLambda(peak, temperature);
    expect(planckLambda(peak * 1.001, temperature)).toBeLessThan(there);
    expect(planckLambda(peak * 0.999, temperature)).toBeLessThan(there);
  });

  it("is no number where temperature, frequency or wavelength is not positive", () => {
    for (const bad of [0, -1, Number.NaN]) {
      expect(planckNu(bad, 100)).toBeNaN();
      expect(planckNu(1e9, bad)).toBeNaN();
      expect(planckLambda(bad, 100)).toBeNaN();
      expect(planckLambda(1e-6, bad)).toBeNaN();
    }
  });
});
