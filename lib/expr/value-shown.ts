import Fraction from "fraction.js";
import { formatUnit, type UnitSystem, unitTex } from "../physics";
import type { CellPresentation } from "../schema/presentation";
import type { Normalised, RelationResult, Scaling } from "../schema/results";
import { type Shown, showExactly, showNumber, shownTex, shownText, superscript } from "./digits";
import { nameTex } from "./tex-names";

/** Something as it is shown: TeX, and plain text that says the same. */
export interface ShownForm {
  readonly tex: string;
  readonly text: string;
}

/** A number with its unit behind it; percent and degree signs stand close. */
export function withUnit(number: ShownForm, unit: string, system: UnitSystem): ShownForm {
  if (unit === "") return number;
  const text = formatUnit(unit, system);
  return {
    tex: `${number.tex}\\,${unitTex(unit, system)}`,
    text: /^[%°]/.test(text) ? number.text + text : `${number.text} ${text}`,
  };
}

/**
 * A value to the place of the second digit of its uncertainty (JCGM 100:2008, 7.2.6), the uncertainty
 * in brackets in units of the last place: 1.257(63) × 10³⁹.
 */
export function showUncertain(value: number, uncertainty: number): Shown {
  let power = Math.floor(Math.log10(uncertainty));
  let figures = Math.round(uncertainty / 10 ** (power - 1));
  if (figures === 100) {
    power += 1;
    figures = 10;
  }
  const place = power - 1;
  const size = value === 0 ? power : Math.floor(Math.log10(Math.abs(value)));
  const shift = Math.max(size, power);
  const exponent = shift < -2 || shift > 2 || place > 0 ? shift : 0;
  const mantissa = (value / 10 ** exponent).toFixed(Math.max(0, exponent - place));
  return { mantissa: `${mantissa}(${figures})`, exponent };
}

/** Uncertain only through constants, an estimate keeps its three digits. */
function restsOnUncertainGiven(result: RelationResult): boolean {
  const givens = new Set((result.scaling ?? []).map(({ symbol }) => symbol));
  return (result.budget ?? []).some(({ symbol }) => givens.has(symbol));
}

function isWritable(uncertainty: number | null | undefined): uncertainty is number {
  return typeof uncertainty === "number" && uncertainty > 1e-290 && uncertainty < 1e290;
}

/** The value of a relation with its unit, as a paper would print it. */
export function relationValue(result: RelationResult, system: UnitSystem): ShownForm {
  const { value, uncertainty, unit } = result;
  const shown =
    isWritable(uncertainty) && restsOnUncertainGiven(result)
      ? showUncertain(value, uncertainty)
      : showNumber(value);
  return withUnit({ tex: shownTex(shown), text: shownText(shown) }, unit, system);
}

/** An exponent as a short rational, or to two digits where it is only local. */
function exponentText(exponent: number, exact: boolean): string {
  if (!exact) return String(Number(exponent.toPrecision(2)));
  const near = new Fraction(exponent).simplify(1e-10);
  const isShort = near.d <= 100n && Math.abs(near.valueOf() - exponent) < 1e-9;
  return isShort ? near.toFraction() : String(Number(exponent.toPrecision(4)));
}

function raisedText(exponent: string): string {
  if (exponent === "1") return "";
  return /^-?\d+$/.test(exponent) ? superscript(Number(exponent)) : `^(${exponent})`;
}

type Term = Normalised["terms"][number];

function showTerm(term: Term, exact: boolean, system: UnitSystem): ShownForm {
  const fiducial = showExactly(term.fiducial);
  const below = withUnit({ tex: shownTex(fiducial), text: shownText(fiducial) }, term.unit, system);
  const exponent = exponentText(term.exponent, exact);
  const power = exponent === "1" ? "" : `^{${exponent}}`;
  return {
    tex: `\\left(${nameTex(term.symbol)} / ${below.tex}\\right)${power}`,
    text: `(${term.symbol} / ${below.text})${raisedText(exponent)}`,
  };
}

/** The normalised form of a relation, ready to paste; undefined where it has none. */
export function normalisedShown(
  result: RelationResult,
  system: UnitSystem,
): (ShownForm & { readonly local: boolean }) | undefined {
  const { normalised } = result;
  if (!normalised || normalised.terms.length === 0) return undefined;
  const exact = new Map((result.scaling ?? []).map((one: Scaling) => [one.symbol, one.exact]));
  const terms = normalised.terms.map((term) =>
    showTerm(term, exact.get(term.symbol) ?? false, system),
  );
  const prefactor = showNumber(normalised.prefactor);
  const product = {
    tex: [shownTex(prefactor), ...terms.map((term) => term.tex)].join("\\,"),
    text: [shownText(prefactor), ...terms.map((term) => term.text)].join(" "),
  };
  return {
    ...withUnit(product, result.unit, system),
    local: normalised.terms.some((term) => !exact.get(term.symbol)),
  };
}

/** Value and normalised form of a relation, under the names of a cell's presentation. */
export function shownRelation(
  result: RelationResult,
  system: UnitSystem,
): Pick<
  CellPresentation,
  "valueTex" | "valueText" | "normalisedTex" | "normalisedText" | "normalisedLocal"
> {
  const value = relationValue(result, system);
  const normalised = normalisedShown(result, system);
  return {
    valueTex: value.tex,
    valueText: value.text,
    ...(normalised
      ? {
          normalisedTex: normalised.tex,
          normalisedText: normalised.text,
          normalisedLocal: normalised.local,
        }
      : {}),
  };
}
