import type { GivenCell } from "../schema/calculation";
import type { Normalised, Scaling } from "../schema/results";
import type { Gradient, Powers } from "./propagate";
import type { InputKey } from "./typed";

/** A given as a root of others: its cell holds value, unit and fiducial. */
export type GivenOf = (root: InputKey) => GivenCell | undefined;

/** An exponent smaller than this is none. */
const negligible = 1e-12;

interface Exponent {
  readonly given: GivenCell;
  readonly exponent: number;
  readonly exact: boolean;
}

function exponentsIn(si: number, gradient: Gradient, powers: Powers, givenOf: GivenOf): Exponent[] {
  const found: Exponent[] = [];
  for (const root of new Set([...powers.keys(), ...gradient.keys()])) {
    const given = givenOf(root);
    if (!given || given.value === 0 || si === 0) continue;
    const power = powers.get(root);
    const local = ((gradient.get(root) ?? 0) * given.value) / si;
    const exponent = power ? power.valueOf() : local;
    if (!Number.isFinite(exponent) || Math.abs(exponent) < negligible) continue;
    found.push({ given, exponent, exact: Boolean(power) });
  }
  return found;
}

/**
 * Local exponents d ln y / d ln x of a value in every given it rests on; `exact` where it is a true
 * power law in that given.
 */
export function scalingOf(
  si: number,
  gradient: Gradient,
  powers: Powers,
  givenOf: GivenOf,
): Scaling[] {
  return exponentsIn(si, gradient, powers, givenOf).map(({ given, exponent, exact }) => ({
    symbol: given.symbol,
    exponent,
    exact,
  }));
}

/**
 * The normalised form: the value at the fiducials, times powers of (input / fiducial). Where the
 * power law is only local it is carried from the value to the fiducial by that law.
 */
export function normalisedForm(
  value: number,
  si: number,
  gradient: Gradient,
  powers: Powers,
  givenOf: GivenOf,
): Normalised | undefined {
  const exponents = exponentsIn(si, gradient, powers, givenOf);
  if (exponents.length === 0) return undefined;
  let prefactor = value;
  const terms = exponents.map(({ given, exponent }) => {
    const fiducial = given.fiducial ?? given.value;
    if (fiducial !== given.value) prefactor *= (fiducial / given.value) ** exponent;
    return { symbol: given.symbol, fiducial, unit: given.unit ?? "", exponent };
  });
  return Number.isFinite(prefactor) ? { prefactor, terms } : undefined;
}
