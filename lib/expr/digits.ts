/** How many digits of a number are shown, and how. */

/** Significant digits of an estimate without an uncertainty of its own. */
export const estimateDigits = 3;

/** A number taken apart for showing: mantissa digits and a power of ten, 0 where none is needed. */
export interface Shown {
  readonly mantissa: string;
  readonly exponent: number;
}

const superscriptDigits = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/** An integer as superscript characters: −27 as “⁻²⁷”. */
export function superscript(n: number): string {
  return [...String(n)].map((ch) => (ch === "-" ? "⁻" : superscriptDigits[Number(ch)])).join("");
}

/** Powers of ten are written out from a hundredth up to a thousand. */
function needsPower(exponent: number): boolean {
  return exponent < -2 || exponent > 2;
}

/** A number to `digits` significant digits. */
export function showNumber(value: number, digits: number = estimateDigits): Shown {
  if (value === 0) return { mantissa: "0", exponent: 0 };
  const [mantissa = "0", power = "0"] = value.toExponential(digits - 1).split("e");
  const exponent = Number(power);
  if (needsPower(exponent)) return { mantissa, exponent };
  return { mantissa: value.toFixed(Math.max(0, digits - 1 - exponent)), exponent: 0 };
}

/** A number with all the digits it was typed with, in powers of ten where it is long. */
export function showExactly(value: number): Shown {
  const text = String(Math.abs(value));
  const sign = value < 0 ? "-" : "";
  const [, mantissa, power] = /^(.*)e([+-]?\d+)$/.exec(text) ?? [];
  if (mantissa !== undefined) return { mantissa: sign + mantissa, exponent: Number(power) };
  const zeros = /0+$/.exec(text)?.[0].length ?? 0;
  const isLong = !text.includes(".") && zeros >= 4;
  if (!isLong && !(Math.abs(value) < 1e-3 && value !== 0))
    return { mantissa: String(value), exponent: 0 };
  const [digits = "0", exponent = "0"] = value.toExponential().split("e");
  return { mantissa: digits, exponent: Number(exponent) };
}

/** “1.26 × 10³⁹”, with a true minus sign; a mantissa of 1 is left out. */
export function shownText({ mantissa, exponent }: Shown): string {
  const digits = mantissa.replace("-", "−");
  if (exponent === 0) return digits;
  const power = `10${superscript(exponent)}`;
  if (mantissa === "1") return power;
  return mantissa === "-1" ? `−${power}` : `${digits} × ${power}`;
}

/** The same as TeX; a mantissa of 1 is left out. */
export function shownTex({ mantissa, exponent }: Shown): string {
  if (exponent === 0) return mantissa;
  const power = `10^{${exponent}}`;
  if (mantissa === "1") return power;
  return mantissa === "-1" ? `-${power}` : `${mantissa} \\times ${power}`;
}
