/** Points to compare the functions of the language at; each list has at least twenty. */
type Points = readonly (readonly number[])[];

const count = 24;
const shares = Array.from({ length: count }, (_, i) => i / (count - 1));

/** Equal steps from one end to the other. */
function even(from: number, to: number): number[] {
  return shares.map((share) => from + (to - from) * share);
}

/** Equal ratios between two positive ends. */
export function ratios(from: number, to: number): number[] {
  return shares.map((share) => from ** (1 - share) * to ** share);
}

const mirrored = (values: readonly number[]) => [...values.map((x) => -x), 0, ...values];
const single = (values: readonly number[]): Points => values.map((x) => [x]);

/** Two arguments, the second list read backwards. */
function pairs(first: readonly number[], second: readonly number[]): Points {
  return first.map((x, i) => [x, second[second.length - 1 - i] ?? Number.NaN]);
}

/** One to four arguments of either sign and of all sizes. */
const bunches: Points = mirrored(ratios(1e-6, 1e6)).map((x, i, all) =>
  [x, all[(i * 7) % all.length] ?? 0, -x / 3, 2.5].slice(0, 1 + (i % 4)),
);
const halves = Array.from({ length: 25 }, (_, i) => -6 + i / 2);
const wide = mirrored(ratios(1e-8, 1e3));

/** Temperatures and photon energies hν/kT for the Planck functions. */
const temperatures = ratios(2.7255, 1e9);
const energies = ratios(1e-6, 50);
const hertzPerKelvin = 1.380649e-23 / 6.62607015e-34;
const frequencies = temperatures.map((t, i) => hertzPerKelvin * t * (energies[i] ?? 1));

/** By function, lists of arguments in SI. Functions of one name to one number unless said otherwise. */
export const functionPoints: Readonly<Record<string, Points>> = {
  sqrt: single([0, ...ratios(1e-300, 1e300)]),
  cbrt: single(mirrored(ratios(1e-100, 1e100))),
  nthRoot: [...ratios(1e-9, 1e9).map((x, i) => [x, 1 + (i % 9)]), [-32, 5], [-1e-9, 3]],
  exp: single([...even(-700, 700), ...ratios(1e-10, 1)]),
  expm1: single(mirrored(ratios(1e-15, 30))),
  log: single([...ratios(1e-300, 1e300), 0.999999, 1, 1.000001]),
  log2: single([...ratios(1e-300, 1e300), 1024]),
  log10: single([...ratios(1e-300, 1e300), 1000]),
  log1p: single([...ratios(1e-15, 1e6), ...ratios(1e-15, 0.999).map((x) => -x)]),
  sin: single([...wide, Math.PI, 1e6]),
  cos: single([...wide, Math.PI / 2, 1e6]),
  tan: single([...wide, 1.57, 1e6]),
  asin: single([...even(-1, 1), 1e-9]),
  acos: single([...even(-1, 1), 0.9999999]),
  atan: single(wide),
  atan2: pairs(wide, mirrored(ratios(1e-5, 1e5))),
  sinh: single(mirrored(ratios(1e-8, 700))),
  cosh: single(mirrored(ratios(1e-8, 700))),
  tanh: single(mirrored(ratios(1e-8, 30))),
  asinh: single(mirrored(ratios(1e-8, 1e8))),
  acosh: single([...ratios(1, 1e8), 1.0000001]),
  atanh: single(mirrored(ratios(1e-8, 0.999999))),
  abs: single(wide),
  sign: single(wide),
  floor: single([...even(-9.3, 9.7), ...halves]),
  ceil: single([...even(-9.3, 9.7), ...halves]),
  round: single([...even(-9.3, 9.7), ...halves]),
  min: bunches,
  max: bunches,
  hypot: bunches,
  gamma: single([...ratios(1e-6, 171), -0.5, -1.5, -2.25, -7.9, ...even(0.5, 20)]),
  lgamma: single([...ratios(1e-6, 1e6), ...even(0.55, 30), 0.999, 1.001, 1.999, 2.001]),
  erf: single(mirrored(ratios(1e-8, 5))),
  erfc: single([...mirrored(ratios(1e-8, 5)), ...even(1.9, 2.1), ...even(5, 26)]),
  factorial: single([...Array.from({ length: 25 }, (_, n) => n), 50, 100, 170, 0.5, 2.5]),
  combinations: Array.from({ length: 26 }, (_, i) => [2 * i + 4, (i * 5) % (2 * i + 5)]),
  planck_nu: pairs(frequencies, [...temperatures].reverse()),
  planck_lambda: pairs(
    frequencies.map((nu) => 299792458 / nu),
    [...temperatures].reverse(),
  ),
  luminosity_distance: single(ratios(1e-3, 10)),
  angular_diameter_distance: single(ratios(1e-3, 10)),
  comoving_distance: single(ratios(1e-3, 10)),
  lookback_time: single(ratios(1e-3, 10)),
  hubble: single([0, ...ratios(1e-3, 10)]),
};

/** The cosmological functions once more, from z = 10 to recombination. */
export const farRedshifts: readonly number[] = ratios(10, 1100);
