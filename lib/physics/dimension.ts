import Fraction from "fraction.js";

/** The base quantities of the SI, in the order of a dimension's exponents. */
export const baseQuantities = [
  "length",
  "mass",
  "time",
  "current",
  "temperature",
  "amount",
  "luminous intensity",
] as const;

export type BaseQuantity = (typeof baseQuantities)[number];

/**
 * A dimension: rational exponents over the base quantities. Equal dimensions are the same object, so
 * that `===` compares them.
 */
export interface Dimension {
  /** The exponents as text, the same for equal dimensions. */
  readonly key: string;
  readonly exponents: readonly Fraction[];
}

const interned = new Map<string, Dimension>();

function intern(exponents: readonly Fraction[]): Dimension {
  const key = exponents.map((exponent) => exponent.toFraction()).join(",");
  const known = interned.get(key);
  if (known) return known;
  const made = { key, exponents };
  interned.set(key, made);
  return made;
}

/** The dimension with the given exponents, numbers or rationals such as `"3/2"`; the rest are zero. */
export function dimension(exponents: Partial<Record<BaseQuantity, number | string>>): Dimension {
  return intern(baseQuantities.map((quantity) => new Fraction(exponents[quantity] ?? 0)));
}

/** The dimension of a pure number. */
export const dimensionless: Dimension = dimension({});

type Pairs = Map<Dimension, Map<Dimension, Dimension>>;

/** Remembered results of an operation on two dimensions: there are few of them in one calculation. */
function remembering(operation: (a: Fraction, b: Fraction) => Fraction) {
  const known: Pairs = new Map();
  return (a: Dimension, b: Dimension): Dimension => {
    let row = known.get(a);
    if (!row) {
      row = new Map();
      known.set(a, row);
    }
    const found = row.get(b);
    if (found) return found;
    const made = intern(a.exponents.map((x, i) => operation(x, b.exponents[i] ?? new Fraction(0))));
    row.set(b, made);
    return made;
  };
}

/** The dimension of a product. */
export const multiplyDimensions = remembering((a, b) => a.add(b));

/** The dimension of a quotient. */
export const divideDimensions = remembering((a, b) => a.sub(b));

/** The dimension of a power; a number is taken as the rational nearest to it. */
export function powerDimension(of: Dimension, exponent: Fraction | number): Dimension {
  const power = new Fraction(exponent);
  return intern(of.exponents.map((x) => x.mul(power)));
}

/** Exponents as rationals written as strings, zero ones left out: `{"mass": "1", "length": "3/2"}`. */
export function dimensionToJson(of: Dimension): Record<string, string> {
  const json: Record<string, string> = {};
  for (const [i, quantity] of baseQuantities.entries()) {
    const exponent = of.exponents[i];
    if (exponent && !exponent.equals(0)) json[quantity] = exponent.toFraction();
  }
  return json;
}

const letters = ["L", "M", "T", "I", "Θ", "N", "J"];
const order = [1, 0, 2, 3, 4, 5, 6];
const raised: Record<string, string> = {
  "-": "⁻",
  "/": "ᐟ",
  "0": "⁰",
  "1": "¹",
  "2": "²",
  "3": "³",
  "4": "⁴",
  "5": "⁵",
  "6": "⁶",
  "7": "⁷",
  "8": "⁸",
  "9": "⁹",
};

/** An exponent as superscript characters; empty for 1. */
export function superscriptExponent(exponent: Fraction): string {
  const text = exponent.toFraction();
  return text === "1" ? "" : [...text].map((ch) => raised[ch] ?? ch).join("");
}

/** “M L² T⁻³”; “1” for a pure number. */
export function formatDimension(of: Dimension): string {
  const parts = order.flatMap((i) => {
    const exponent = of.exponents[i];
    return exponent && !exponent.equals(0) ? [`${letters[i]}${superscriptExponent(exponent)}`] : [];
  });
  return parts.length === 0 ? "1" : parts.join(" ");
}
