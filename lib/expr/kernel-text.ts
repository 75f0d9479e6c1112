/** Small pieces of a kernel's text. */

/** A number as the text that reads back as the same double. */
export function numberText(value: number): string {
  return value < 0 || Object.is(value, -0) ? `(${value})` : String(value);
}

/** A power; squares and cubes as products, which are exact and fast. */
export function powerText(a: string, b: string, exponent: number | undefined): string {
  if (exponent === 2) return `${a} * ${a}`;
  return exponent === 3 ? `${a} * ${a} * ${a}` : `Math.pow(${a}, ${b})`;
}
