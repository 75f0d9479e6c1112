import type Fraction from "fraction.js";
import type { Exponents } from "./power-law";
import type { InputKey } from "./typed";

/**
 * First-order propagation (JCGM 100:2008, eq. 13) with correlations tracked: every quantity carries
 * its derivatives with respect to the *roots* it rests on, which are givens and constants. What two
 * quantities share therefore correlates by itself, and `x - x` has no uncertainty.
 */

/** Derivatives in SI with respect to roots: a given in its own unit, a constant in SI. */
export type Gradient = ReadonlyMap<InputKey, number>;

/** Exact exponents in roots; null where there is no power law. */
export type Powers = ReadonlyMap<InputKey, Fraction | null>;

/** A derivative smaller than this part of its terms is what rounding left of a cancellation. */
const dust = 1e-13;

/** The gradient of a formula from its slopes and the gradients of its inputs. */
export function chainRule(
  inputs: readonly InputKey[],
  slopes: ArrayLike<number>,
  gradientOf: (key: InputKey) => Gradient,
): Map<InputKey, number> {
  const sums = new Map<InputKey, number>();
  const sizes = new Map<InputKey, number>();
  for (const [i, key] of inputs.entries()) {
    const slope = slopes[i] ?? 0;
    if (slope === 0) continue;
    for (const [root, derivative] of gradientOf(key)) {
      const term = slope * derivative;
      sums.set(root, (sums.get(root) ?? 0) + term);
      sizes.set(root, (sizes.get(root) ?? 0) + Math.abs(term));
    }
  }
  for (const [root, total] of sums) {
    if (Math.abs(total) <= dust * (sizes.get(root) ?? 0)) sums.delete(root);
  }
  return sums;
}

/** Exponents in roots from those in inputs. */
export function chainPowers(
  exponents: Exponents,
  powersOf: (key: InputKey) => Powers,
): Map<InputKey, Fraction | null> {
  const powers = new Map<InputKey, Fraction | null>();
  for (const [key, exponent] of exponents) {
    for (const [root, inner] of powersOf(key)) {
      const before = powers.has(root) ? powers.get(root) : undefined;
      powers.set(root, joined(before, exponent, inner));
    }
  }
  return powers;
}

function joined(
  before: Fraction | null | undefined,
  exponent: Fraction | null,
  inner: Fraction | null,
): Fraction | null {
  if (before === null) return null;
  // Raised to the power 0, an input does not matter, whatever it is made of.
  if (exponent?.equals(0)) return before ?? exponent;
  if (inner?.equals(0)) return before ?? inner;
  if (!exponent || !inner) return null;
  const power = exponent.mul(inner);
  return before ? before.add(power) : power;
}

/** One root's part of a variance. */
export interface Contribution {
  readonly root: InputKey;
  /** Derivative times standard uncertainty, in SI, signed. */
  readonly amount: number;
}

/** What each uncertain root contributes, the largest first. */
export function contributions(
  gradient: Gradient,
  uncertaintyOf: (root: InputKey) => number,
): Contribution[] {
  const found: Contribution[] = [];
  for (const [root, derivative] of gradient) {
    const amount = derivative * uncertaintyOf(root);
    if (amount !== 0) found.push({ root, amount });
  }
  return found.sort((a, b) => Math.abs(b.amount) - Math.abs(a.amount));
}

/** Combined standard uncertainty of independent contributions, in SI. */
export function combinedUncertainty(parts: readonly Contribution[]): number {
  return Math.hypot(...parts.map((part) => part.amount));
}
