import Fraction from "fraction.js";
import type { Scope } from "./scope";
import type { Tree } from "./tree";

/** Denominators beyond this are not exponents that anybody means. */
const largestDenominator = 10_000n;

function bounded(value: Fraction): Fraction | undefined {
  return value.d <= largestDenominator && value.n <= 1_000_000n ? value : undefined;
}

function fromNumber(value: number): Fraction | undefined {
  return Number.isFinite(value) ? bounded(new Fraction(value)) : undefined;
}

function combine(operator: string, a: Fraction, b: Fraction): Fraction | undefined {
  if (operator === "+") return bounded(a.add(b));
  if (operator === "-") return bounded(a.sub(b));
  if (operator === "*") return bounded(a.mul(b));
  if (operator === "/") return b.n === 0n ? undefined : bounded(a.div(b));
  const power = operator === "^" && b.d === 1n && b.n <= 64n ? a.pow(b) : null;
  return power === null ? undefined : bounded(power);
}

/**
 * The rational that a sub-formula is known to be: from numbers alone, or from a dimensionless given
 * without uncertainty. Undefined where it is not known before evaluation.
 */
export function rationalOf(tree: Tree, scope: Scope): Fraction | undefined {
  switch (tree.type) {
    case "number":
      return fromNumber(tree.value);
    case "name": {
      const meaning = scope.lookup(tree.name);
      if (meaning?.kind !== "quantity" || meaning.exact === undefined) return undefined;
      return fromNumber(meaning.exact);
    }
    case "unary": {
      const value = tree.operator === "not" ? undefined : rationalOf(tree.argument, scope);
      return tree.operator === "-" ? value?.neg() : value;
    }
    case "binary": {
      const left = rationalOf(tree.left, scope);
      const right = left && rationalOf(tree.right, scope);
      return left && right && combine(tree.operator, left, right);
    }
    default:
      return undefined;
  }
}
