/**
 * First derivatives of the functions of the language: for each, the partial derivatives as text over
 * the names of its arguments and of its result. Piecewise constant functions have slope 0; at a kink
 * the slope of the side that was taken is given.
 */
export type Partials = (parts: readonly string[], result: string) => readonly string[];

const one =
  (slope: (x: string, result: string) => string): Partials =>
  ([x = "NaN"], result) => [slope(x, result)];

const flat: Partials = (parts) => parts.map(() => "0");

/** Of several arguments, the one that was taken has slope 1. */
const taken: Partials = (parts, result) =>
  parts.map((part, i) => {
    const earlier = parts.slice(0, i).map((other) => `${other} !== ${result} && `);
    return `(${earlier.join("")}${part} === ${result} ? 1 : 0)`;
  });

const twoOverRootPi = 2 / Math.sqrt(Math.PI);

export const derivatives: Readonly<Record<string, Partials>> = {
  sqrt: one((_, y) => `0.5 / ${y}`),
  cbrt: one((x, y) => `${y} / (3 * ${x})`),
  nthRoot: ([x = "NaN", n = "NaN"], y) => [
    `${y} / (${n} * ${x})`,
    `-${y} * Math.log(Math.abs(${x})) / (${n} * ${n})`,
  ],
  exp: one((_, y) => y),
  expm1: one((_, y) => `${y} + 1`),
  log: one((x) => `1 / ${x}`),
  log2: one((x) => `${Math.LOG2E} / ${x}`),
  log10: one((x) => `${Math.LOG10E} / ${x}`),
  log1p: one((x) => `1 / (1 + ${x})`),
  sin: one((x) => `Math.cos(${x})`),
  cos: one((x) => `-Math.sin(${x})`),
  tan: one((_, y) => `1 + ${y} * ${y}`),
  asin: one((x) => `1 / Math.sqrt((1 - ${x}) * (1 + ${x}))`),
  acos: one((x) => `-1 / Math.sqrt((1 - ${x}) * (1 + ${x}))`),
  atan: one((x) => `1 / (1 + ${x} * ${x})`),
  atan2: ([y = "NaN", x = "NaN"]) => {
    const square = `(${x} * ${x} + ${y} * ${y})`;
    return [`${x} / ${square}`, `-${y} / ${square}`];
  },
  sinh: one((x) => `Math.cosh(${x})`),
  cosh: one((x) => `Math.sinh(${x})`),
  tanh: one((_, y) => `1 - ${y} * ${y}`),
  asinh: one((x) => `1 / Math.sqrt(${x} * ${x} + 1)`),
  acosh: one((x) => `1 / Math.sqrt((${x} - 1) * (${x} + 1))`),
  atanh: one((x) => `1 / ((1 - ${x}) * (1 + ${x}))`),
  abs: one((x) => `Math.sign(${x})`),
  sign: flat,
  floor: flat,
  ceil: flat,
  round: flat,
  min: taken,
  max: taken,
  hypot: (parts, y) => parts.map((x) => `${x} / ${y}`),
  gamma: one((x, y) => `${y} * k.digamma(${x})`),
  lgamma: one((x) => `k.digamma(${x})`),
  erf: one((x) => `${twoOverRootPi} * Math.exp(-${x} * ${x})`),
  erfc: one((x) => `-${twoOverRootPi} * Math.exp(-${x} * ${x})`),
  factorial: one((x, y) => `${y} * k.digamma(${x} + 1)`),
  combinations: ([n = "NaN", k = "NaN"], y) => [
    `${y} * (k.digamma(${n} + 1) - k.digamma(${n} - ${k} + 1))`,
    `${y} * (k.digamma(${n} - ${k} + 1) - k.digamma(${k} + 1))`,
  ],
  planck_nu: ([nu = "NaN", t = "NaN"], y) => [
    `${y} * k.planckNuSlope(${nu}, ${t}) / ${nu}`,
    `${y} * k.planckNuWarmth(${nu}, ${t}) / ${t}`,
  ],
  planck_lambda: ([lambda = "NaN", t = "NaN"], y) => [
    `${y} * k.planckLambdaSlope(${lambda}, ${t}) / ${lambda}`,
    `${y} * k.planckLambdaWarmth(${lambda}, ${t}) / ${t}`,
  ],
  comoving_distance: one((z) => `k.hubbleLength(${z})`),
  luminosity_distance: one((z, y) => `${y} / (1 + ${z}) + (1 + ${z}) * k.hubbleLength(${z})`),
  angular_diameter_distance: one((z, y) => `(k.hubbleLength(${z}) - ${y}) / (1 + ${z})`),
  lookback_time: one((z) => `1 / ((1 + ${z}) * k.hubble(${z}))`),
  hubble: one((z) => `k.hubbleSlope(${z})`),
};
