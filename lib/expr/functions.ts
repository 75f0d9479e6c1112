import { type Dimension, dimension } from "../physics";

/**
 * The functions of the language, one entry each: how it is called, what it does to dimensions, how it
 * is typeset. What it computes is in `kernels.ts`. This file is light enough for a browser.
 */
export type DimensionRule =
  /** Every argument and the result are dimensionless. */
  | { readonly rule: "pure" }
  /** All arguments have one dimension, and so has the result. */
  | { readonly rule: "same" }
  /** All arguments have one dimension; the result is dimensionless. */
  | { readonly rule: "ratio" }
  /** Any dimension; the result is dimensionless. */
  | { readonly rule: "sign" }
  /** A root of the given degree; without one, the second argument is the degree. */
  | { readonly rule: "root"; readonly degree?: number }
  /** Arguments and result of stated dimensions. */
  | { readonly rule: "fixed"; readonly takes: readonly Dimension[]; readonly gives: Dimension }
  /** Between the electromagnetic conventions, by table. */
  | { readonly rule: "convert"; readonly to: "gaussian" | "si" }
  /** `(expression, variable, from, to)`: binds a name. */
  | { readonly rule: "binding" };

export interface FunctionEntry {
  readonly name: string;
  readonly signature: string;
  readonly meaning: string;
  /** Fewest and most arguments. */
  readonly arity: readonly [number, number];
  readonly dimensions: DimensionRule;
  /** TeX of a call from the TeX of its arguments; by default the name upright before brackets. */
  readonly tex?: (parts: readonly string[]) => string;
  /** How much of the step budget one call takes, in elementary calls. */
  readonly cost?: number;
}

const pure: DimensionRule = { rule: "pure" };
const same: DimensionRule = { rule: "same" };
const pure1 = (name: string, meaning: string, tex?: FunctionEntry["tex"]): FunctionEntry => ({
  name,
  signature: `${name}(x)`,
  meaning,
  arity: [1, 1],
  dimensions: pure,
  ...(tex ? { tex } : {}),
});

const brackets = (command: string) => (parts: readonly string[]) =>
  `${command}\\left(${parts.join(", ")}\\right)`;
const operator = (name: string) => brackets(`\\operatorname{${name}}`);

const frequency = dimension({ time: -1 });
const temperature = dimension({ temperature: 1 });
const length = dimension({ length: 1 });
const pureNumber = dimension({});
const time = dimension({ time: 1 });

const distance = (name: string, meaning: string, tex: string, gives = length): FunctionEntry => ({
  name,
  signature: `${name}(z)`,
  meaning,
  arity: [1, 1],
  dimensions: { rule: "fixed", takes: [pureNumber], gives },
  tex: brackets(tex),
  cost: 200,
});

export const functionEntries: readonly FunctionEntry[] = [
  {
    name: "sqrt",
    signature: "sqrt(x)",
    meaning: "square root",
    arity: [1, 1],
    dimensions: { rule: "root", degree: 2 },
    tex: ([x]) => `\\sqrt{${x}}`,
  },
  {
    name: "cbrt",
    signature: "cbrt(x)",
    meaning: "cube root, of negative numbers too",
    arity: [1, 1],
    dimensions: { rule: "root", degree: 3 },
    tex: ([x]) => `\\sqrt[3]{${x}}`,
  },
  {
    name: "nthRoot",
    signature: "nthRoot(x, n)",
    meaning: "the n-th root, n a number",
    arity: [2, 2],
    dimensions: { rule: "root" },
    tex: ([x, n]) => `\\sqrt[${n}]{${x}}`,
  },
  pure1("exp", "e to the power x", brackets("\\exp")),
  pure1("expm1", "exp(x) − 1, exact for small x", operator("expm1")),
  pure1("log", "natural logarithm", brackets("\\ln")),
  pure1("log2", "logarithm to base 2", brackets("\\log_{2}")),
  pure1("log10", "logarithm to base 10", brackets("\\log_{10}")),
  pure1("log1p", "log(1 + x), exact for small x", operator("log1p")),
  pure1("sin", "sine of an angle in radians", brackets("\\sin")),
  pure1("cos", "cosine of an angle in radians", brackets("\\cos")),
  pure1("tan", "tangent of an angle in radians", brackets("\\tan")),
  pure1("asin", "inverse sine, in radians", brackets("\\arcsin")),
  pure1("acos", "inverse cosine, in radians", brackets("\\arccos")),
  pure1("atan", "inverse tangent, in radians", brackets("\\arctan")),
  {
    name: "atan2",
    signature: "atan2(y, x)",
    meaning: "angle of the point (x, y), in radians",
    arity: [2, 2],
    dimensions: { rule: "ratio" },
    tex: operator("atan2"),
  },
  pure1("sinh", "hyperbolic sine", brackets("\\sinh")),
  pure1("cosh", "hyperbolic cosine", brackets("\\cosh")),
  pure1("tanh", "hyperbolic tangent", brackets("\\tanh")),
  pure1("asinh", "inverse hyperbolic sine", operator("arsinh")),
  pure1("acosh", "inverse hyperbolic cosine", operator("arcosh")),
  pure1("atanh", "inverse hyperbolic tangent", operator("artanh")),
  {
    name: "abs",
    signature: "abs(x)",
    meaning: "absolute value",
    arity: [1, 1],
    dimensions: same,
    tex: ([x]) => `\\left|${x}\\right|`,
  },
  {
    name: "sign",
    signature: "sign(x)",
    meaning: "−1, 0 or 1",
    arity: [1, 1],
    dimensions: { rule: "sign" },
    tex: operator("sgn"),
  },
  pure1("floor", "largest integer not above x", ([x]) => `\\left\\lfloor ${x}\\right\\rfloor`),
  pure1("ceil", "smallest integer not below x", ([x]) => `\\left\\lceil ${x}\\right\\rceil`),
  pure1("round", "nearest integer", operator("round")),
  {
    name: "min",
    signature: "min(a, b, …)",
    meaning: "the smallest",
    arity: [1, 20],
    dimensions: same,
    tex: brackets("\\min"),
  },
  {
    name: "max",
    signature: "max(a, b, …)",
    meaning: "the largest",
    arity: [1, 20],
    dimensions: same,
    tex: brackets("\\max"),
  },
  {
    name: "hypot",
    signature: "hypot(a, b, …)",
    meaning: "square root of the sum of squares",
    arity: [1, 20],
    dimensions: same,
    tex: (parts) => `\\sqrt{${parts.map((x) => `\\left(${x}\\right)^{2}`).join(" + ")}}`,
  },
  pure1("gamma", "gamma function", brackets("\\Gamma")),
  pure1("lgamma", "logarithm of the gamma function", brackets("\\ln\\Gamma")),
  pure1("erf", "error function", operator("erf")),
  pure1("erfc", "1 − erf(x), exact for large x", operator("erfc")),
  pure1("factorial", "n!, or gamma(n + 1)", ([x]) => `\\left(${x}\\right)!`),
  {
    name: "combinations",
    signature: "combinations(n, k)",
    meaning: "ways to choose k of n",
    arity: [2, 2],
    dimensions: pure,
    tex: ([n, k]) => `\\binom{${n}}{${k}}`,
  },
  {
    name: "integrate",
    signature: "integrate(expression, variable, from, to)",
    meaning: "definite integral, adaptive quadrature",
    arity: [4, 4],
    dimensions: { rule: "binding" },
    tex: ([f, x, a, b]) => `\\int_{${a}}^{${b}} ${f}\\,\\mathrm{d}${x}`,
  },
  {
    name: "root",
    signature: "root(expression, variable, from, to)",
    meaning: "where the expression is zero between from and to",
    arity: [4, 4],
    dimensions: { rule: "binding" },
    tex: ([f, x, a, b]) =>
      `\\operatorname*{root}_{${x}\\,\\in\\,[${a},\\,${b}]}\\left(${f}\\right)`,
  },
  {
    name: "sum",
    signature: "sum(expression, index, from, to)",
    meaning: "sum over an integer index",
    arity: [4, 4],
    dimensions: { rule: "binding" },
    tex: ([f, i, a, b]) => `\\sum_{${i}=${a}}^{${b}} ${f}`,
  },
  {
    name: "planck_nu",
    signature: "planck_nu(nu, T)",
    meaning: "Planck function B_ν, per unit frequency",
    arity: [2, 2],
    dimensions: {
      rule: "fixed",
      takes: [frequency, temperature],
      gives: dimension({ mass: 1, time: -2 }),
    },
    tex: brackets("B_{\\nu}"),
  },
  {
    name: "planck_lambda",
    signature: "planck_lambda(lambda, T)",
    meaning: "Planck function B_λ, per unit wavelength",
    arity: [2, 2],
    dimensions: {
      rule: "fixed",
      takes: [length, temperature],
      gives: dimension({ mass: 1, length: -1, time: -3 }),
    },
    tex: brackets("B_{\\lambda}"),
  },
  distance(
    "luminosity_distance",
    "luminosity distance, flat ΛCDM with H₀ = 70 km/s/Mpc, Ω_m = 0.3",
    "d_{\\mathrm{L}}",
  ),
  distance(
    "angular_diameter_distance",
    "angular-diameter distance, same cosmology",
    "d_{\\mathrm{A}}",
  ),
  distance("lookback_time", "look-back time, same cosmology", "t_{\\mathrm{lb}}", time),
  distance("comoving_distance", "comoving distance, same cosmology", "d_{\\mathrm{C}}"),
  { ...distance("hubble", "expansion rate, same cosmology", "H", frequency), cost: 1 },
  {
    name: "to_gaussian",
    signature: "to_gaussian(x)",
    meaning: "an electromagnetic quantity of SI in Gaussian units",
    arity: [1, 1],
    dimensions: { rule: "convert", to: "gaussian" },
    tex: operator("to\\_gaussian"),
  },
  {
    name: "to_si",
    signature: "to_si(x)",
    meaning: "an electromagnetic quantity in Gaussian units in SI",
    arity: [1, 1],
    dimensions: { rule: "convert", to: "si" },
    tex: operator("to\\_si"),
  },
];

const byName = new Map(functionEntries.map((entry) => [entry.name, entry]));

export const functionNames: ReadonlySet<string> = new Set(byName.keys());

/** The entry of a function of the language, by its exact name. */
export function findFunction(name: string): FunctionEntry | undefined {
  return byName.get(name);
}
