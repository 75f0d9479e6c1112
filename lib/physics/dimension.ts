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

/** More results than any calculation needs; beyond it a table is emptied, so that none grows for ever. */
const mostRemembered = 5_000;

/** Remembers what `make` answers for a dimension and a second key: two look-ups instead of algebra. */
function remembering<K>(make: (of: Dimension, key: K) => Dimension) {
  const known = new Map<Dimension, Map<K, Dimension>>();
  let size = 0;
  return (of: Dimension, key: K): Dimension => {
    const found = known.get(of)?.get(key);
    if (found) return found;
    if (size >= mostRemembered) {
      known.clear();
      size = 0;
    }
    const made = make(of, key);
    const row = known.get(of) ?? new Map<K, Dimension>();
    known.set(of, row.set(key, made));
    size += 1;
    return made;
  };
}

const zero = new Fraction(0);

/** The dimension of a product. */
export const multiplyDimensions: (a: Dimension, b: Dimension) => Dimension = remembering(
  (a, b: Dimension) => intern(a.exponents.map((x, i) => x.add(b.exponents[i] ?? zero))),
);

/** The dimension of a quotient. */
export const divideDimensions: (a: Dimension, b: Dimension) => Dimension = remembering(
  (a, b: Dimension) => intern(a.exponents.map((x, i) => x.sub(b.exponents[i] ?? zero))),
);

const power = remembering((of, key: string | number) => {
  const exponent = new Fraction(key);
  return intern(of.exponents.map((x) => x.mul(exponent)));
});

/** The dimension of a power; a number is taken as the rational nearest to it. */
export function powerDimension(of: Dimension, exponent: Fraction | number): Dimension {
  return power(of, typeof exponent === "number" ? exponent : exponent.toFraction());
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
