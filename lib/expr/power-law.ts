import Fraction from "fraction.js";
import type { InputKey, Local, Typed } from "./typed";

/**
 * How a formula scales, read off its form: for each input the exact exponent e where the formula is
 * x^e times something that does not contain x, and `null` where it is no power law in x. An input that
 * is not listed is not contained at all.
 */
export type Exponents = ReadonlyMap<InputKey, Fraction | null>;

type Mutable = Map<InputKey, Fraction | null>;

const zero = new Fraction(0);
const nothing: Exponents = new Map();

function combine(
  a: Exponents,
  b: Exponents,
  join: (x: Fraction | null, y: Fraction | null) => Fraction | null,
): Exponents {
  const joined: Mutable = new Map();
  for (const key of new Set([...a.keys(), ...b.keys()])) {
    joined.set(
      key,
      join(a.get(key) ?? (a.has(key) ? null : zero), b.get(key) ?? (b.has(key) ? null : zero)),
    );
  }
  return joined;
}

function sum(a: Exponents, b: Exponents, sign: 1 | -1): Exponents {
  return combine(a, b, (x, y) => (x && y ? x.add(y.mul(sign)) : null));
}

/** Terms of a sum share a power of x, or there is none. */
function shared(a: Exponents, b: Exponents): Exponents {
  return combine(a, b, (x, y) => (x && y && x.equals(y) ? x : null));
}

function raised(of: Exponents, power: Fraction): Exponents {
  return new Map([...of].map(([key, exponent]) => [key, exponent?.mul(power) ?? null]));
}

/** Whatever is contained is contained in no simple way. */
function lost(of: Exponents): Exponents {
  return new Map([...of].map(([key, exponent]) => [key, exponent?.equals(0) ? zero : null]));
}

function all(
  parts: readonly Exponents[],
  join: (a: Exponents, b: Exponents) => Exponents,
): Exponents {
  return parts.slice(1).reduce(join, parts[0] ?? nothing);
}

/** The rational that a number of the tree stands for, if it is a simple one. */
function rationalOf(node: Typed): Fraction | undefined {
  if (node.op === "number") {
    const value = new Fraction(node.value);
    return value.d <= 1_000n && value.valueOf() === node.value ? value : simplified(node.value);
  }
  if (node.op === "negate") return rationalOf(node.argument)?.neg();
  if (node.op !== "divide" && node.op !== "multiply") return undefined;
  const [a, b] = [rationalOf(node.left), rationalOf(node.right)];
  if (!a || !b || (node.op === "divide" && b.n === 0n)) return undefined;
  return node.op === "divide" ? a.div(b) : a.mul(b);
}

/** 0.333…, as 1/3 was rounded to a double, is a third. */
function simplified(value: number): Fraction | undefined {
  const near = new Fraction(value).simplify(1e-12);
  return near.d <= 1_000n && Math.abs(near.valueOf() - value) <= 1e-15 * Math.abs(value)
    ? near
    : undefined;
}

const roots: Readonly<Record<string, Fraction>> = {
  sqrt: new Fraction(1, 2),
  cbrt: new Fraction(1, 3),
};
const likeSum = new Set(["min", "max", "hypot"]);

type Bindings = ReadonlyMap<Local, Exponents>;

function ofCall(node: Extract<Typed, { op: "call" }>, bindings: Bindings): Exponents {
  const parts = node.parts.map((part) => exponents(part, bindings));
  const [first = nothing] = parts;
  const root = roots[node.name];
  if (root) return raised(first, root);
  if (node.name === "abs") return first;
  if (node.name === "nthRoot") {
    const degree = node.parts[1] && rationalOf(node.parts[1]);
    if (degree && degree.n !== 0n) return raised(first, degree.inverse());
  }
  if (likeSum.has(node.name)) return all(parts, shared);
  return lost(all(parts, (a, b) => sum(a, b, 1)));
}

function ofPower(node: Extract<Typed, { left: Typed }>, bindings: Bindings): Exponents {
  const base = exponents(node.left, bindings);
  const power = rationalOf(node.right);
  if (power) return raised(base, power);
  return lost(sum(base, exponents(node.right, bindings), 1));
}

function ofLoop(node: Extract<Typed, { variable: Local }>, bindings: Bindings): Exponents {
  const body = exponents(node.body, new Map(bindings).set(node.variable, nothing));
  const limits = lost(sum(exponents(node.lower, bindings), exponents(node.upper, bindings), 1));
  // A factor that does not contain the variable stands outside the sign; a root has no such factor.
  return node.op === "root"
    ? lost(sum(body, limits, 1))
    : combine(body, limits, (x, y) => (x && y ? x : null));
}

function exponents(node: Typed, bindings: Bindings): Exponents {
  switch (node.op) {
    case "number":
      return nothing;
    case "input":
      return new Map([[node.key, new Fraction(1)]]);
    case "local":
      return bindings.get(node.local) ?? nothing;
    case "negate":
      return exponents(node.argument, bindings);
    case "add":
    case "subtract":
      return shared(exponents(node.left, bindings), exponents(node.right, bindings));
    case "multiply":
      return sum(exponents(node.left, bindings), exponents(node.right, bindings), 1);
    case "divide":
      return sum(exponents(node.left, bindings), exponents(node.right, bindings), -1);
    case "power":
      return ofPower(node, bindings);
    case "call":
      return ofCall(node, bindings);
    case "choose": {
      const branches = shared(exponents(node.yes, bindings), exponents(node.no, bindings));
      return combine(branches, lost(exponents(node.test, bindings)), (x, y) => (x && y ? x : null));
    }
    case "apply": {
      const inner = new Map(bindings);
      for (const [i, local] of node.instance.parameters.entries()) {
        const part = node.parts[i];
        if (part) inner.set(local, exponents(part, bindings));
      }
      return exponents(node.instance.body, inner);
    }
    case "integrate":
    case "sum":
    case "root":
      return ofLoop(node, bindings);
    case "not":
      return lost(exponents(node.argument, bindings));
    case "and":
    case "or":
      return lost(sum(exponents(node.left, bindings), exponents(node.right, bindings), 1));
    case "compare":
      return lost(
        all(
          node.parts.map((part) => exponents(part, bindings)),
          (a, b) => sum(a, b, 1),
        ),
      );
  }
}

/** The exact exponents of a formula in its inputs. */
export function powerLaw(typed: Typed): Exponents {
  return exponents(typed, new Map());
}
