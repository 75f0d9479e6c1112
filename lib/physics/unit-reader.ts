import Fraction from "fraction.js";
import { findUnit, type Unit, unitOfOtherConvention } from "./find-unit";
import { suggestUnits } from "./suggest-units";
import type { UnitSystem } from "./unit-system";

/** One factor of a unit: `cm^-2`. */
export interface UnitFactor {
  readonly unit: Unit;
  /** As it is shown, prefix included. */
  readonly symbol: string;
  readonly exponent: Fraction;
}

/** Why a text is no unit, and where: `from` up to `to`, in the text as typed. */
export interface UnitFailure {
  readonly ok: false;
  readonly code: "syntax" | "unit";
  readonly from: number;
  readonly to: number;
  /** The name that is no unit. */
  readonly name?: string;
  readonly suggestions: readonly string[];
  /** It is one, but of the other electromagnetic convention. */
  readonly otherConvention?: boolean;
}

/** How the reader leaves a text that it cannot read. */
export class UnitFault extends Error {
  constructor(readonly failure: UnitFailure) {
    super(failure.code);
  }
}

/** Longer than any unit that means something, and short enough for the stack. */
const mostCharacters = 500;
const deepest = 60;

const blank = /\s+/uy;
const word = /[\p{L}%°][\p{L}\p{M}\p{Nd}_⊙☉⊕]*/uy;
const beginsUnit = /[\p{L}(%°]/u;
const plainNumber = /\d+(?:\.\d+)?/y;
const leadingNumber = /\d+(?:\.\d+)?(?:[eE][+-]?\d+)?/y;
const raisedRun = /[⁺⁻]?[⁰¹²³⁴⁵⁶⁷⁸⁹]+(?:ᐟ[⁰¹²³⁴⁵⁶⁷⁸⁹]+)?/uy;
const raisedCharacters = "⁰¹²³⁴⁵⁶⁷⁸⁹";

/**
 * Reads one unit string into its factors: products, quotients and rational powers, with the
 * precedence of formulas. Throws a `UnitFault`.
 */
export class UnitReader {
  #at = 0;
  #depth = 0;

  constructor(
    readonly text: string,
    readonly system: UnitSystem,
  ) {}

  read(): UnitFactor[] {
    if (this.text.length > mostCharacters) this.#fail(0, this.text.length);
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

  #next(): string {
    this.#skip();
    return this.text.charAt(this.#at);
  }

  #take(...signs: string[]): string | undefined {
    const next = this.#next();
    if (next === "" || !signs.includes(next)) return undefined;
    this.#at += 1;
    return next;
  }

  /** Marks at least one character, the last one where the text ends too soon. */
  #fail(from: number, to: number): never {
    const length = this.text.trimEnd().length;
    const start = Math.max(0, Math.min(from, length - 1));
    const end = Math.max(start + 1, Math.min(to, length));
    throw new UnitFault({ ok: false, code: "syntax", from: start, to: end, suggestions: [] });
  }

  /** `product / product * product`, from the left. */
  #quotient(): UnitFactor[] {
    const factors = this.#product();
    for (;;) {
      const sign = this.#take("/", "*", "·", "⋅", "×");
      if (sign === undefined) return factors;
      const next = this.#product();
      factors.push(...(sign === "/" ? raised(next, new Fraction(-1)) : next));
    }
  }

  /** Units side by side multiply, and bind tighter than `/`. */
  #product(): UnitFactor[] {
    const factors = this.#power();
    while (beginsUnit.test(this.#next())) factors.push(...this.#power());
    return factors;
  }

  #power(): UnitFactor[] {
    const base = this.#atom();
    const run = this.#match(raisedRun);
    if (run !== undefined) return raised(base, this.#raisedExponent(run));
    return this.#take("^") === undefined ? base : raised(base, this.#exponent());
  }

  #atom(): UnitFactor[] {
    const next = this.#next();
    if (next === "(") return this.#bracket();
    if (/\d/.test(next)) return this.#one();
    const from = this.#at;
    const name = this.#match(word);
    if (name === undefined) this.#fail(from, from + 1);
    const unit = this.#unit(name, from);
    return [{ unit, symbol: unit.symbol, exponent: new Fraction(1) }];
  }

  #bracket(): UnitFactor[] {
    const from = this.#at;
    if (this.#depth >= deepest) this.#fail(from, from + 1);
    this.#at += 1;
    this.#depth += 1;
    const inner = this.#quotient();
    this.#depth -= 1;
    if (this.#take(")") === undefined) this.#fail(from, from + 1);
    return inner;
  }

  /** A unit carries no number of its own but the 1 of `1/s`. */
  #one(): UnitFactor[] {
    const from = this.#at;
    const digits = this.#match(leadingNumber);
    const to = this.#at;
    if (digits !== "1" || this.#next() !== "/") this.#fail(from, to);
    return [];
  }

  #unit(name: string, from: number): Unit {
    const unit = findUnit(name.normalize("NFC"), this.system);
    if (unit) return unit;
    const other = unitOfOtherConvention(name, this.system.em);
    throw new UnitFault({
      ok: false,
      code: "unit",
      from,
      to: from + name.length,
      name,
      suggestions: suggestUnits(name, this.system),
      ...(other ? { otherConvention: true } : {}),
    });
  }

  /** `-2`, `0.5`, `(1/2)`, `(-3/2)`. */
  #exponent(): Fraction {
    this.#skip();
    const from = this.#at;
    if (this.#take("(") === undefined) return this.#signed();
    const value = this.#signed();
    const rational = this.#take("/") === undefined ? value : value.div(this.#signed());
    if (this.#take(")") === undefined) this.#fail(from, from + 1);
    return rational;
  }

  #signed(): Fraction {
    const sign = this.#take("-", "−", "+");
    this.#skip();
    const from = this.#at;
    const digits = this.#match(plainNumber);
    if (digits === undefined || Number(digits) === 0) this.#fail(from, this.#at);
    const value = new Fraction(digits);
    return sign === "-" || sign === "−" ? value.neg() : value;
  }

  #raisedExponent(run: string): Fraction {
    const plain = [...run].map((ch) => {
      if (ch === "⁻") return "-";
      return ch === "⁺" ? "" : ch === "ᐟ" ? "/" : String(raisedCharacters.indexOf(ch));
    });
    const [above = "", below = "1"] = plain.join("").split("/");
    if (Number(above) === 0 || Number(below) === 0) this.#fail(this.#at - run.length, this.#at);
    return new Fraction(above).div(below);
  }
}

function raised(factors: readonly UnitFactor[], by: Fraction): UnitFactor[] {
  return factors.map((factor) => ({ ...factor, exponent: factor.exponent.mul(by) }));
}
