import { create, erfDependencies, gammaDependencies, lgammaDependencies } from "mathjs/number";
import {
  angularDiameterDistance,
  comovingDistance,
  hubble,
  hubbleSlope,
  lookbackTime,
  luminosityDistance,
  planckLambda,
  planckNu,
} from "../physics";

/**
 * What the functions of the language compute, on plain numbers in SI. A kernel answers NaN where it
 * is not defined; the caller makes that a *domain* fault.
 */
export type Kernel = (...parts: number[]) => number;

const special = create({ ...gammaDependencies, ...lgammaDependencies, ...erfDependencies }, {});
const gammaOf = special.gamma as (x: number) => number;
const lgammaOf = special.lgamma as (x: number) => number;
const erf = special.erf as (x: number) => number;

/** Γ(x); NaN at the poles 0, −1, −2, … */
function gamma(x: number): number {
  if (x <= 0 && Number.isInteger(x)) return Number.NaN;
  return x > 171.7 ? Number.POSITIVE_INFINITY : gammaOf(x);
}

/** ln Γ(x) for x > 0. */
function lgamma(x: number): number {
  return x > 0 ? lgammaOf(x) : Number.NaN;
}

/** n!, extended by Γ(n + 1); NaN below zero. */
function factorial(n: number): number {
  return n < 0 ? Number.NaN : gamma(n + 1);
}

/** n over k for whole numbers 0 ≤ k ≤ n, otherwise NaN. */
function combinations(n: number, k: number): number {
  if (!Number.isInteger(n) || !Number.isInteger(k) || k < 0 || k > n) return Number.NaN;
  const few = Math.min(k, n - k);
  if (few > 2_000) return Math.exp(lgamma(n + 1) - lgamma(k + 1) - lgamma(n - k + 1));
  let ways = 1;
  for (let i = 1; i <= few; i++) ways = (ways * (n - few + i)) / i;
  return Number.isSafeInteger(Math.round(ways)) ? Math.round(ways) : ways;
}

/**
 * 1 − erf(x) without cancellation. Above 2 by the continued fraction of Abramowitz & Stegun 7.1.14,
 * evaluated by the modified Lentz method; below, the difference is exact enough.
 */
function erfc(x: number): number {
  if (x < 2) return 1 - erf(x);
  if (x > 27.3) return 0;
  const tiny = 1e-300;
  let f = x;
  let c = x;
  let d = 0;
  for (let n = 1; n <= 500; n++) {
    const a = n / 2;
    d = 1 / (x + a * d || tiny);
    c = x + a / c || tiny;
    const change = c * d;
    f *= change;
    if (Math.abs(change - 1) < 1e-16) break;
  }
  return Math.exp(-x * x) / (Math.sqrt(Math.PI) * f);
}

/** The real n-th root; of negative numbers for odd n. */
function nthRoot(x: number, n: number): number {
  const odd = Number.isInteger(n) && Math.abs(n % 2) === 1;
  return x < 0 && odd ? -((-x) ** (1 / n)) : x ** (1 / n);
}

/**
 * Digamma function ψ(x): the recurrence up to 10, then the asymptotic series (Abramowitz & Stegun
 * 6.3.5 and 6.3.18); by reflection (6.3.7) for negative x.
 */
function digamma(x: number): number {
  if (x <= 0) return digamma(1 - x) - Math.PI / Math.tan(Math.PI * x);
  let shifted = x;
  let sum = 0;
  while (shifted < 10) {
    sum -= 1 / shifted;
    shifted += 1;
  }
  const q = 1 / (shifted * shifted);
  const series =
    q *
    (1 / 12 - q * (1 / 120 - q * (1 / 252 - q * (1 / 240 - q * (1 / 132 - (q * 691) / 32760)))));
  return sum + Math.log(shifted) - 0.5 / shifted - series;
}

const planckPerHertz = 6.62607015e-34 / 1.380649e-23;
const planckPerMetre = planckPerHertz * 299792458;

/** d ln(1/(eᵘ − 1)) / d ln u = −u eᵘ/(eᵘ − 1), for u = hν/kT. */
function thermalSlope(u: number): number {
  return -u / -Math.expm1(-u);
}

/** Slopes that only derivatives need, by the names that `derivatives.ts` writes. */
const slopeKernels: Record<string, Kernel> = {
  digamma,
  planckNuSlope: (nu = Number.NaN, t = Number.NaN) => 3 + thermalSlope((planckPerHertz * nu) / t),
  planckNuWarmth: (nu = Number.NaN, t = Number.NaN) => -thermalSlope((planckPerHertz * nu) / t),
  planckLambdaSlope: (l = Number.NaN, t = Number.NaN) =>
    -5 - thermalSlope(planckPerMetre / (l * t)),
  planckLambdaWarmth: (l = Number.NaN, t = Number.NaN) => -thermalSlope(planckPerMetre / (l * t)),
  hubbleLength: (z = Number.NaN) => 299792458 / hubble(z),
  hubbleSlope: (z = Number.NaN) => hubbleSlope(z),
};

function round(x: number): number {
  return x < 0 ? -Math.round(-x) : Math.round(x);
}

/** Functions that the language takes from the platform unchanged. */
export const nativeFunctions: ReadonlySet<string> = new Set(
  `sqrt cbrt exp expm1 log log2 log10 log1p sin cos tan asin acos atan atan2 sinh cosh tanh asinh
  acosh atanh abs sign floor ceil min max hypot`.split(/\s+/),
);

/** Every other function of the language. */
export const kernels: Readonly<Record<string, Kernel>> = Object.freeze({
  nthRoot,
  round,
  gamma,
  lgamma,
  factorial,
  combinations,
  erf,
  erfc,
  planck_nu: planckNu,
  planck_lambda: planckLambda,
  luminosity_distance: luminosityDistance,
  angular_diameter_distance: angularDiameterDistance,
  lookback_time: lookbackTime,
  comoving_distance: comovingDistance,
  hubble,
  ...slopeKernels,
} as Record<string, Kernel>);

/** Functions whose infinite result means that it is too large, not that it is undefined. */
export const growsBeyond: ReadonlySet<string> = new Set(
  "exp expm1 sinh cosh gamma factorial combinations hypot".split(" "),
);
