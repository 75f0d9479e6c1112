/** The value of a given as it is typed: a number with one of the ways to state its uncertainty. */
export interface TypedValue {
  readonly value: number;
  readonly uncertainty?: number;
  readonly interval?: [number, number];
  readonly dex?: number;
  readonly factor?: number;
  /** What stands behind: the unit, as typed. */
  readonly unit: string;
}

const number = "[-+]?(?:\\d+\\.?\\d*|\\.\\d+)(?:[eE][-+]?\\d+)?";
const plain = "[-+]?(?:\\d+\\.?\\d*|\\.\\d+)";
const plusMinus = "(?:±|\\+/-|\\+-)";
const within = new RegExp(
  `^(${number})\\s*(.*?)\\s+within\\s+a\\s+factor\\s+(?:of\\s+)?(${number})$`,
);
const range = new RegExp(`^(${number})\\s*\\.\\.\\s*(${number})(?![\\d.])\\s*(.*)$`);
const inBrackets = new RegExp(
  `^\\(\\s*(${number})\\s*${plusMinus}\\s*(${number})\\s*\\)\\s*(?:[eE]\\s*([-+]?\\d+)|[*×·⋅]\\s*10\\^\\(?([-+]?\\d+)\\)?)?\\s*(.*)$`,
);
const sharedPower = new RegExp(
  `^(${plain})\\s*${plusMinus}\\s*(${plain})\\s+[eE]([-+]?\\d+)\\s*(.*)$`,
);
const spread = new RegExp(`^(${number})\\s*${plusMinus}\\s*(${number})\\s*(.*)$`);
const lastDigits = /^([-+]?(?:\d+\.?\d*|\.\d+))\((\d+\.?\d*|\.\d+)\)(?:[eE]([-+]?\d+))?\s*(.*)$/;
const bare = new RegExp(`^(${number})\\s*(.*)$`);

const superscripts = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/** True minus signs and powers of ten written out: “3 × 10⁻⁸” as “3e-8”. */
function plainNumbers(text: string): string {
  return text
    .replace(/[−–]/g, "-")
    .replace(/[\u00a0\u2009\u202f]/g, " ")
    .replace(/(\d)\s*[×·⋅*]\s*10([⁻⁺]?[⁰¹²³⁴⁵⁶⁷⁸⁹]+)/gu, (_, digit: string, power: string) => {
      const plainPower = [...power]
        .map((ch) => (ch === "⁻" ? "-" : ch === "⁺" ? "" : superscripts.indexOf(ch)))
        .join("");
      return `${digit}e${plainPower}`;
    })
    .replace(/(\d)\s*[×·⋅*]\s*10\^\(?([-+]?\d+)\)?/g, "$1e$2");
}

/** Scale a decimal text by a power of ten without a rounding of its own. */
function scaled(digits: string, power: string | undefined): number {
  return Number(power === undefined ? digits : `${digits}e${power}`);
}

/** `0.34(2)`: the figure in brackets counts in the last digits, unless it has a point itself. */
function readLastDigits(match: RegExpExecArray): TypedValue {
  const [, digits = "", last = "", power, unit = ""] = match;
  const decimals = digits.split(".")[1]?.length ?? 0;
  const shift = last.includes(".") ? 0 : -decimals;
  const exponent = Number(power ?? 0) + shift;
  return { value: scaled(digits, power), uncertainty: Number(`${last}e${exponent}`), unit };
}

/** A whole number that may be a power of ten keeps its uncertainty in the same scale. */
function readSpread(value: string, spreadText: string, rest: string): TypedValue {
  const dex = /^dex(?:\s+(.*))?$/.exec(rest);
  if (dex) return { value: Number(value), dex: Number(spreadText), unit: dex[1] ?? "" };
  return { value: Number(value), uncertainty: Number(spreadText), unit: rest };
}

/**
 * Read the right-hand side of a given. Undefined where it does not begin as a number does.
 * Forms: `10`, `0.34(2)`, `4.30 ± 0.01 e6`, `(4.3 ± 0.1)e6`, `10 ± 2`, `0.1 ± 0.3 dex`,
 * `1e3 … within a factor 3`, `0.01 .. 0.02`, each with a unit behind it.
 */
export function readValue(typed: string): TypedValue | undefined {
  const text = plainNumbers(typed.trim());
  const factor = within.exec(text);
  if (factor) {
    return { value: Number(factor[1]), factor: Number(factor[3]), unit: factor[2] ?? "" };
  }
  const ends = range.exec(text);
  if (ends) {
    const interval: [number, number] = [Number(ends[1]), Number(ends[2])];
    return {
      value: Number(((interval[0] + interval[1]) / 2).toPrecision(15)),
      interval,
      unit: ends[3] ?? "",
    };
  }
  const bracketed = inBrackets.exec(text);
  if (bracketed) {
    const power = bracketed[3] ?? bracketed[4];
    return {
      value: scaled(bracketed[1] ?? "", power),
      uncertainty: scaled(bracketed[2] ?? "", power),
      unit: bracketed[5] ?? "",
    };
  }
  const shared = sharedPower.exec(text);
  if (shared) {
    return {
      value: scaled(shared[1] ?? "", shared[3]),
      uncertainty: scaled(shared[2] ?? "", shared[3]),
      unit: shared[4] ?? "",
    };
  }
  const spreadOut = spread.exec(text);
  if (spreadOut)
    return readSpread(spreadOut[1] ?? "", spreadOut[2] ?? "", (spreadOut[3] ?? "").trim());
  const concise = lastDigits.exec(text);
  if (concise) return readLastDigits(concise);
  const simple = bare.exec(text);
  return simple ? { value: Number(simple[1]), unit: simple[2] ?? "" } : undefined;
}
