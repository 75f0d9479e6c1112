import { distance } from "fastest-levenshtein";
import Fraction from "fraction.js";
import { type Dimension, dimensionless, multiplyDimensions, powerDimension } from "./dimension";
import { findUnit, listUnits, type Unit, unitOfOtherConvention } from "./find-unit";
import type { UnitSystem } from "./unit-system";

/** One factor of a unit: `cm^-2`. */
export interface UnitFactor {
  readonly unit: Unit;
  readonly exponent: Fraction;
}

export type ParsedUnit =
  | {
      readonly ok: true;
      /** To coherent SI. */
      readonly factor: number;
      readonly dimension: Dimension;
      readonly factors: readonly UnitFactor[];
    }
  | {
      readonly ok: false;
      readonly code: "syntax" | "unit";
      readonly from: number;
      readonly to: number;
      readonly name?: string;
      readonly suggestions: readonly string[];
      readonly otherConvention?: boolean;
    };

type Failure = Extract<ParsedUnit, { ok: false }>;

class UnitFault extends Error {
  constructor(readonly failure: Failure) {
    super(failure.code);
  }
}

const blank = /\s+/uy;
const word = /[\p{L}%°⊙☉⊕][\p{L}\p{N}_⊙☉⊕]*/uy;
const number = /\d+(?:\.\d+)?/y;
const raisedRun = /[⁺⁻]?[⁰¹²³⁴⁵⁶⁷⁸⁹]+/uy;
const raisedDigits = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/** Reads unit strings: products, quotients and rational powers, with the precedence of formulas. */
class UnitReader {
  #at = 0;
  constructor(
    readonly text: string,
    readonly system: UnitSystem,
  ) {}

  read(): UnitFactor[] {
    const factors = this.#quotient();
    this.#skip();
    if (this.#at < this.text.length) this.#fail(this.#at, this.#at + 1);
    return factors;
  }

  #match(pattern: RegExp): string | undefined {
    pattern.lastIndex = this.#at;
    const found = pattern.exec(this.text)?.[0];
    if (found !== undefined) this.#at += found.length;
    return found;
  }

  #skip(): void {
    this.#match(blank);
  }

  #take(...signs: string[]): string | undefined {
    this.#skip();
    const sign = signs.find((one) => this.text.startsWith(one, this.#at));
    if (sign !== undefined) this.#at += sign.length;
    return sign;
  }

  #fail(from: number, to: number): never {
    throw new UnitFault({ ok: false, code: "syntax", from, to, suggestions: [] });
  }

  /** `product / product * product`, from the left. */
  #quotient(): UnitFactor[] {
    let factors = this.#product();
    for (;;) {
      const sign = this.#take("/", "*", "·", "⋅", "×");
      if (sign === undefined) return factors;
      const next = this.#product();
      factors = [...factors, ...(sign === "/" ? raised(next, new Fraction(-1)) : next)];
    }
  }

  /** Units side by side multiply, and bind tighter than `/`. */
  #product(): UnitFactor[] {
    const factors = this.#power();
    for (;;) {
      this.#skip();
      const next = this.text.charAt(this.#at);
      if (next === "" || !/[\p{L}(%°]/u.test(next)) return factors;
      factors.push(...this.#power());
    }
  }

  #power(): UnitFactor[] {
    const base = this.#atom();
    const sign = this.#match(raisedRun);
    if (sign !== undefined) return raised(base, plainPower(sign));
    return this.#take("^") === undefined ? base : raised(base, this.#exponent());
  }

  #atom(): UnitFactor[] {
    this.#skip();
    const from = this.#at;
    if (this.#take("(") !== undefined) {
      const inner = this.#quotient();
      if (this.#take(")") === undefined) this.#fail(from, from + 1);
      return inner;
    }
    const digits = this.#match(number);
    if (digits !== undefined) {
      // Only the 1 of 1/s: a unit carries no number of its own.
      if (digits !== "1") this.#fail(from, this.#at);
      return [];
    }
    const name = this.#match(word);
    if (name === undefined) this.#fail(from, Math.min(this.text.length, from + 1));
    return [{ unit: this.#unit(name, from), exponent: new Fraction(1) }];
  }

  #unit(name: string, from: number): Unit {
    const unit = findUnit(name.normalize("NFC"), this.system);
    if (unit) return unit;
    throw new UnitFault({
      ok: false,
      code: "unit",
      from,
      to: from + name.length,
      name,
      suggestions: suggestUnits(name, this.system),
      ...(unitOfOtherConvention(name, this.system.em) ? { otherConvention: true } : {}),
    });
  }

  /** `-2`, `0.5`, `(1/2)`, `(-3/2)`. */
  #exponent(): Fraction {
    this.#skip();
    const from = this.#at;
    const inBrackets = this.#take("(") !== undefined;
    const value = this.#signed(from);
    if (!inBrackets) return value;
    const rational = this.#take("/") === undefined ? value : value.div(this.#signed(from));
    if (this.#take(")") === undefined) this.#fail(from, from + 1);
    return rational;
  }

  #signed(from: number): Fraction {
    const sign = this.#take("-", "−", "+");
    this.#skip();
    const digits = this.#match(number);
    if (digits === undefined || Number(digits) === 0) this.#fail(from, this.#at + 1);
    const value = new Fraction(digits);
    return sign === "-" || sign === "−" ? value.neg() : value;
  }
}

function plainPower(run: string): Fraction {
  const digits = [...run].map((ch) =>
    ch === "⁻" ? "-" : ch === "⁺" ? "" : raisedDigits.indexOf(ch),
  );
  return new Fraction(digits.join(""));
}

function raised(factors: readonly UnitFactor[], by: Fraction): UnitFactor[] {
  return factors.map(({ unit, exponent }) => ({ unit, exponent: exponent.mul(by) }));
}

function suggestUnits(name: string, system: UnitSystem): string[] {
  const most = name.length <= 3 ? 1 : 2;
  return listUnits(system)
    .flatMap((row) => [row.symbol, ...row.aliases])
    .map((symbol) => ({
      symbol,
      far: symbol.toLowerCase() === name.toLowerCase() ? 0.5 : distance(symbol, name),
    }))
    .filter(({ far }) => far <= most)
    .sort((a, b) => a.far - b.far)
    .slice(0, 3)
    .map(({ symbol }) => symbol);
}

function settle(factors: readonly UnitFactor[]): ParsedUnit {
  let factor = 1;
  let of = dimensionless;
  for (const { unit, exponent } of factors) {
    factor *= unit.factor ** exponent.valueOf();
    of = multiplyDimensions(of, powerDimension(unit.dimension, exponent));
  }
  return { ok: true, factor, dimension: of, factors };
}

function parse(text: string, system: UnitSystem): ParsedUnit {
  if (text.trim() === "") return settle([]);
  try {
    return settle(new UnitReader(text, system).read());
  } catch (error) {
    if (error instanceof UnitFault) return error.failure;
    throw error;
  }
}

const parsed = new Map<string, ParsedUnit>();
const mostParsed = 5_000;

/**
 * Read a unit string: `erg/s/cm^2`, `erg s^-1 cm^-2`, `g^(1/2) cm^(-1/2) s^-1`, `M⊙ yr⁻¹`; empty is
 * dimensionless. Units side by side multiply and bind tighter than `/`, as in formulas. Never throws:
 * a failure says where (`from`, `to`) and what may have been meant.
 */
export function parseUnit(text: string, system: UnitSystem): ParsedUnit {
  const key = `${system.edition} ${system.em} ${text}`;
  const known = parsed.get(key);
  if (known) return known;
  if (parsed.size >= mostParsed) parsed.clear();
  const made = parse(text, system);
  parsed.set(key, made);
  return made;
}
