import { describe, expect, it } from "vitest";
import { readFormula, readWords } from "@/lib/expr/formula";
import { infer } from "@/lib/expr/infer";
import { powerLaw } from "@/lib/expr/power-law";
import { makeScope } from "@/lib/expr/scope";
import { dimensionless } from "@/lib/physics";

const names = new Set(["x", "y", "z"]);
const scope = makeScope({ edition: "codata-2018", em: "si" }, (name) =>
  names.has(name) ? { kind: "quantity", dimension: dimensionless } : undefined,
);

/** Exponents in a compact notation: “x:1/2 y:-3”, `?` where there is no power law. */
function law(formula: string): string {
  const typed = infer(
    readFormula(readWords(formula), { functions: new Set(), quantities: names }).tree,
    scope,
  );
  return [...powerLaw(typed)]
    .filter(([, exponent]) => exponent === null || !exponent.equals(0))
    .map(([key, exponent]) => `${key.slice("symbol:".length)}:${exponent?.toFraction() ?? "?"}`)
    .sort()
    .join(" ");
}

describe("power laws read off a formula", () => {
  it.each([
    ["3 x y^2", "x:1 y:2"],
    ["x / y", "x:1 y:-1"],
    ["sqrt(x^3 / y)", "x:3/2 y:-1/2"],
    ["x^(1/3) y^0.25", "x:1/3 y:1/4"],
    ["cbrt(x) nthRoot(y, 5)", "x:1/3 y:1/5"],
    ["x (1 + y)", "x:1 y:?"],
    ["x y + 3 x z", "x:1 y:? z:?"],
    ["x^2 - 4 x^2", "x:2"],
    ["x - 4", "x:?"],
    ["x exp(-y)", "x:1 y:?"],
    ["x^y", "x:? y:?"],
    ["x / x", ""],
    ["exp(x / x) y", "y:1"],
    ["max(x y, 2 x)", "x:1 y:?"],
    ["y > 1 ? x^2 : 3 x^2", "x:2 y:?"],
    ["integrate(x t^2 exp(-t y), t, 0, 1)", "x:1 y:?"],
    ["integrate(x t, t, 0, y)", "x:1 y:?"],
    ["sum(y^2 / n^2, n, 1, 9)", "y:2"],
    ["root(t^2 - x, t, 0, 9)", "x:?"],
    ["abs(-x)", "x:1"],
  ])("%s has %s", (formula, expected) => {
    expect(law(formula)).toBe(expected);
  });
});
