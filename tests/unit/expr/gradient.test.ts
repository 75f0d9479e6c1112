import { describe, expect, it } from "vitest";
import { compile, compileGradient } from "@/lib/expr/compile";
import { readFormula, readWords } from "@/lib/expr/formula";
import { functionEntries } from "@/lib/expr/functions";
import { infer } from "@/lib/expr/infer";
import { Runtime } from "@/lib/expr/runtime";
import { type Meaning, makeScope } from "@/lib/expr/scope";
import { dimension, dimensionless } from "@/lib/physics";

const dimensions: Record<string, ReturnType<typeof dimension>> = {
  nu: dimension({ time: -1 }),
  lambda_0: dimension({ length: 1 }),
  T: dimension({ temperature: 1 }),
};
const body = readFormula(readWords("g(a, b) = a^2 exp(-b) + q a"), {
  functions: new Set(["g"]),
  quantities: new Set(["a", "b", "q", "x", "y"]),
}).tree;
const roles = {
  functions: new Set(["g"]),
  quantities: new Set(["x", "y", "q", ...Object.keys(dimensions)]),
};
const meanings: Record<string, Meaning> = {
  g: { kind: "function", definition: { symbol: "g", parameters: ["a", "b"], body }, identity: "g" },
};
const scope = makeScope({ edition: "codata-2018", em: "si" }, (name) => {
  if (meanings[name]) return meanings[name];
  if (!roles.quantities.has(name)) return undefined;
  return { kind: "quantity", dimension: dimensions[name] ?? dimensionless };
});

/** Largest deviation of the exact slopes from a central difference of sixth order, relative. */
function deviation(formula: string, values: Record<string, number>): number {
  const typed = infer(readFormula(readWords(formula), roles).tree, scope);
  const { inputs, run } = compile(typed);
  const at = inputs.map((key) => values[key.slice("symbol:".length)] ?? Number.NaN);
  const slopes = new Float64Array(inputs.length);
  const value = compileGradient(typed, inputs).run(at, slopes, new Runtime());
  expect(value).toBe(run(at, new Runtime()));
  const differences = inputs.map((_, i) => {
    const h = Math.abs(at[i] ?? 1) * 1e-3;
    const f = (steps: number) =>
      run(
        at.map((x, j) => (j === i ? x + steps * h : x)),
        new Runtime(),
      );
    return (45 * (f(1) - f(-1)) - 9 * (f(2) - f(-2)) + (f(3) - f(-3))) / (60 * h);
  });
  const deviations = differences.map((difference, i) => {
    const slope = slopes[i] ?? Number.NaN;
    return Math.abs(slope - difference) / Math.max(Math.abs(slope), Math.abs(difference), 1e-12);
  });
  return Math.max(0, ...deviations);
}

const points: Record<string, Record<string, number>> = {
  usual: { x: 0.43, y: 1.27, q: 0.8 },
  acosh: { x: 1.43, y: 1.27 },
  combinations: { x: 7, y: 3 },
  planck_nu: { nu: 3.1e14, T: 5800 },
  planck_lambda: { lambda_0: 4.3e-7, T: 5800 },
};
const calls: Record<string, string> = {
  atan2: "atan2(x, y)",
  nthRoot: "nthRoot(x, 5)",
  min: "min(x, y, 3)",
  max: "max(x, y, 3 x)",
  hypot: "hypot(x, y)",
  planck_nu: "planck_nu(nu, T)",
  planck_lambda: "planck_lambda(lambda_0, T)",
  integrate: "integrate(exp(-x t^2) y, t, x, 2 y)",
  sum: "sum(x^n / (n + y), n, 1, 12)",
  root: "root(t^3 - x t - y, t, 0, 5)",
};
/** Functions whose slope is zero between their jumps, or that convert only, are tried otherwise. */
const others = new Set(["combinations", "to_gaussian", "to_si"]);

describe("exact first derivatives", () => {
  it.each(functionEntries.map((entry) => entry.name).filter((name) => !others.has(name)))(
    "of %s agree with finite differences",
    (name) => {
      const formula = calls[name] ?? `${name}(x)`;
      expect(deviation(formula, points[name] ?? points.usual ?? {})).toBeLessThan(2e-8);
    },
  );

  it.each([
    "x * y + y / x - x",
    "x^2.5 * y^-3",
    "x^y",
    "2^x",
    "x > y ? x^2 : y^3 x",
    "x < y ? x^2 : y^3 x",
    "g(x, y) + g(y, x) * g(g(x, y), 0.3)",
    "integrate(g(x, t) / (1 + t), t, 0.1, y)",
    "root(g(t, y) - x, t, 0, 5) * x",
    "sqrt(x^2 + integrate(integrate(x s t, s, 0, t), t, 0, y))",
    "abs(x - y) + log(x / y)",
    "5% * x",
  ])("of %s agree with finite differences", (formula) => {
    expect(deviation(formula, points.usual ?? {})).toBeLessThan(2e-8);
  });

  it("of x − x are exactly zero, and G cancels in G M", () => {
    const typed = infer(readFormula(readWords("x - x"), roles).tree, scope);
    const slopes = new Float64Array(1);
    compileGradient(typed, ["symbol:x"]).run([3.7], slopes, new Runtime());
    expect(slopes[0]).toBe(0);
    const mass = infer(readFormula(readWords("G M_sun"), roles).tree, scope);
    const value = compileGradient(mass, ["constant:G"]).run([6.6743e-11], slopes, new Runtime());
    expect(Math.abs((slopes[0] ?? 1) * 6.6743e-11) / value).toBeLessThan(1e-15);
  });
});
