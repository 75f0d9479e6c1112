/**
 * How the shelf prints numbers: the parenthesis notation of CODATA, from decimal strings and without
 * floating point, so that every published digit stands as it was published.
 */

/** A decimal as an integer times a power of ten. */
interface Decimal {
  readonly digits: bigint;
  readonly power: number;
}

/** Figures of an exact number beyond these are left out, with “…”. */
const mostFigures = 12;

function parseDecimal(text: string): Decimal {
  const [mantissa = "0", exponent = "0"] = text.toLowerCase().split("e");
  const [whole = "0", fraction = ""] = mantissa.split(".");
  return { digits: BigInt(whole + fraction), power: Number(exponent) - fraction.length };
}

/** Rounded half up to a whole number of 10^power. */
function inUnitsOf({ digits, power: own }: Decimal, power: number): bigint {
  if (own >= power) return digits * 10n ** BigInt(own - power);
  const by = 10n ** BigInt(power - own);
  return (digits + (digits < 0n ? -by : by) / 2n) / by;
}

/** The uncertainty's last figure: two figures are kept, or one where only one was published. */
function lastFigure(uncertainty: Decimal): number {
  const length = String(uncertainty.digits).length;
  return uncertainty.power + Math.max(length - 2, 0);
}

/** “6.67430” as “6.674 30”: groups of three, counted from the point. */
function grouped(whole: string, fraction: string): string {
  const left = whole.length > 4 ? whole.replace(/\B(?=(\d{3})+$)/g, "\u2009") : whole;
  const right = fraction.length > 4 ? fraction.replace(/(\d{3})(?=\d)/g, "$1\u2009") : fraction;
  return right === "" ? left : `${left}.${right}`;
}

const superscripts = "⁰¹²³⁴⁵⁶⁷⁸⁹";

function raised(power: number): string {
  const figures = [...String(Math.abs(power))].map((ch) => superscripts[Number(ch)]).join("");
  return `${power < 0 ? "⁻" : ""}${figures}`;
}

/** Digits times 10^power, the point behind the first figure unless the number is handy as it is. */
function printed(digits: bigint, power: number, tail: string): string {
  const text = String(digits);
  const order = text.length - 1 + power;
  const plain = order >= -2 && order <= (power === 0 ? 11 : 5) && power <= 0;
  if (!plain && text === "1") return `10${raised(order)}`;
  if (!plain) return `${grouped(text.slice(0, 1), text.slice(1))}${tail} × 10${raised(order)}`;
  const padded = text.padStart(1 - power, "0");
  const point = padded.length + power;
  return grouped(padded.slice(0, point), padded.slice(point)) + tail;
}

/** Without zeros at the end of the figures, as an exact number needs none. */
function shortened({ digits, power }: Decimal): Decimal {
  const text = String(digits);
  const short = text.replace(/0+$/, "") || "0";
  const dropped = text.length - short.length;
  // Zeros before the point belong to the number.
  const kept = power >= 0 ? 0 : Math.min(dropped, -power);
  return { digits: digits / 10n ** BigInt(kept), power: power + kept };
}

function exact(text: string): string {
  const { digits, power } = shortened(parseDecimal(text));
  const length = String(digits).length;
  if (length <= mostFigures) return printed(digits, power, "");
  const cut = length - mostFigures;
  return printed(digits / 10n ** BigInt(cut), power + cut, "…");
}

/** “6.674 30(15) × 10⁻¹¹” from “6.67430e-11” and “0.00015e-11”; an exact number as it stands. */
export function parenthesisNotation(value: string, uncertainty: string | null): string {
  if (uncertainty === null) return exact(value);
  const spread = parseDecimal(uncertainty);
  const power = lastFigure(spread);
  const figures = `(${inUnitsOf(spread, power)})`;
  return printed(inUnitsOf(parseDecimal(value), power), power, figures);
}

/** “+4.6 × 10⁻¹⁰”, to two figures. */
export function signedPower(value: number): string {
  const [mantissa = "0", exponent = "0"] = value.toExponential(1).split("e");
  const sign = value < 0 ? "" : "+";
  return `${sign}${mantissa} × 10${raised(Number(exponent))}`.replace("-", "−");
}
