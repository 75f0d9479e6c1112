import { type ParsedUnit, parseUnit, type UnitSystem } from "../physics";
import { type Fault, raise } from "./faults";
import { canonicalName } from "./normalise";

/** Checks that several kinds of cell share. */

const symbolPattern =
  /^[A-Za-z\u00C0-\u00D6\u00D8-\u00F6\u00F8-\u024F\u0370-\u03FF][A-Za-z0-9_\u00C0-\u00D6\u00D8-\u00F6\u00F8-\u024F\u0370-\u03FF]*$/;
const reserved = new Set(
  "and or not to in mod xor true false null undefined NaN Infinity end pi".split(" "),
);

/** The canonical form of a cell's symbol. Raises `syntax` where it is none. */
export function requireSymbol(typed: string): string {
  const symbol = canonicalName(typed);
  const place = { field: "symbol", from: 0, to: typed.length };
  if (!symbolPattern.test(symbol)) {
    raise({ code: "syntax", reason: "symbol", ...place, with: { symbol: typed } });
  }
  if (reserved.has(symbol)) {
    raise({ code: "syntax", reason: "symbol-word", ...place, with: { symbol: typed } });
  }
  return symbol;
}

export type GoodUnit = Extract<ParsedUnit, { ok: true }>;

/** A unit field or the unit behind `to`. Raises `unit`, with the place counted from `offset`. */
export function requireUnit(text: string, system: UnitSystem, field: string, offset = 0): GoodUnit {
  const parsed = parseUnit(text, system);
  if (parsed.ok) return parsed;
  const place = { field, from: offset + parsed.from, to: offset + parsed.to };
  return raise({ ...unitFault(text, parsed), ...place });
}

function unitFault(text: string, parsed: Extract<ParsedUnit, { ok: false }>): Fault {
  const name = parsed.name ?? text;
  if (parsed.otherConvention) {
    return { code: "unit", reason: "unit-other-convention", with: { name } };
  }
  if (parsed.code === "syntax")
    return { code: "unit", reason: "unit-syntax", with: { unit: text } };
  const suggestion = parsed.suggestions[0];
  return {
    code: "unit",
    reason: "unit-unknown",
    with: { name },
    ...(suggestion ? { suggestion } : {}),
  };
}
