import {
  type Dimension,
  describeDimension,
  dimensionless,
  dimensionName,
  divideDimensions,
  type EmConvention,
} from "../physics";
import { limitSentences } from "../schema/limits";
import type { CellError } from "../schema/results";
import type { Fault } from "./faults";
import { stepBudget } from "./runtime";

/** The one place where faults become English: what is wrong, what was found, what would mend it. */

interface Told {
  readonly em: EmConvention;
  text(key: string): string;
  /** “a luminosity (erg s⁻¹)”. */
  dimension(key: string): string;
  between(a: string, b: string): string;
}

type Sentence = (fault: Fault, told: Told) => string;

const sentences: Record<string, Sentence> = {
  empty: () => "Nothing is written here yet. Write a formula, such as 4 pi G M m_p c / sigma_T.",
  character: (_, t) =>
    `The character “${t.text("character")}” means nothing in a formula. Take it out, or spell what it stands for.`,
  "syntax-forbidden": (_, t) =>
    `“${t.text("word")}” is not part of the language of formulas. Formulas have numbers, names, + - * / ^, brackets, comparisons and the functions of the help page.`,
  word: (_, t) =>
    `“${t.text("word")}” is a word the language of formulas does not have. Choose another name.`,
  "word-in": () => "To choose the unit of a result, write `to`: for example … to erg/s.",
  node: () =>
    "This formula uses syntax that formulas do not have: only numbers, names, operators, comparisons and function calls.",
  remainder: () =>
    "`%` means percent here, and nothing may stand right behind it. To multiply, write `*`; there is no remainder of a division.",
  assignment: () =>
    "A relation has one `=`, right behind its symbol. To compare two things, write `==` in a check.",
  "number-base": () => "Numbers are written in decimals, such as 31 or 3.1e1.",
  "number-too-large": (_, t) =>
    `The number ${t.text("word")} is larger than a double holds (1.8 × 10³⁰⁸).`,
  "number-too-small": (_, t) =>
    `The number ${t.text("word")} is smaller than a double holds (4.9 × 10⁻³²⁴).`,
  "formula-length": (_, t) => limitSentences.formulaLength(Number(t.text("found"))),
  "formula-depth": () => limitSentences.formulaDepth(),
  "bracket-extra": () => "This bracket closes nothing. Take it out, or open one before it.",
  "bracket-open": () => "This bracket is never closed. Add a `)` where it should end.",
  "two-numbers": (_, t) =>
    `Two numbers stand side by side. Did you mean ${t.text("first")} * ${t.text("second")}?`,
  "ends-early": () => "The formula ends too early: something must follow the last sign.",
  unexpected: (_, t) =>
    `“${t.text("word")}” does not fit here. Something is missing in front of it, or it is one sign too many.`,
  "raised-function": (_, t) =>
    `A function is raised after its brackets. Did you mean ${t.text("suggestion")}?`,
  "bare-function": (_, t) =>
    `“${t.text("name")}” is a function and needs its argument in brackets: ${t.text("name")}(…).`,
  arity: (_, t) =>
    `This call has ${t.text("found")} argument${t.text("found") === "1" ? "" : "s"}; it is written ${t.text("signature")}.`,
  "bound-name": (_, t) =>
    `“${t.text("of")}” is written ${t.text("of")}(expression, variable, from, to): the second argument is a plain name.`,
  head: () =>
    "In front of `=` stands a symbol, such as L_Edd, or a function with its arguments, such as f(x, y).",
  "head-twice": () => "The arguments of a function need different names.",
  "head-other": (_, t) =>
    `This formula defines “${t.text("found")}”, but the cell's symbol is “${t.text("symbol")}”. Make them the same.`,
  "head-in-condition": () =>
    "A check is a condition, such as tau > 1; to define a symbol, write a relation. To compare for equality, write `==`.",
  symbol: (_, t) =>
    `“${t.text("symbol")}” is not a symbol. A symbol is letters (Latin or Greek), digits and _, beginning with a letter: L_Edd, tau, Mdot.`,
  "symbol-word": (_, t) =>
    `“${t.text("symbol")}” is a word of the language and cannot be a symbol. Choose another name.`,
  "condition-as-number": () =>
    "This is a condition, which holds or fails; a number is needed here. To state a condition, make the cell a check.",
  "number-as-condition": () =>
    "A condition is needed here, such as tau > 1; this is a quantity. Compare it with something.",
  "relation-to-unit-in-check": () => "A check has no unit. Take out `to …`.",

  "unknown-name": (f, t) =>
    `“${t.text("name")}” is not defined here, nor is it a constant or a unit.${mend(f, t)}`,
  "unknown-function": (f, t) =>
    `“${t.text("name")}” is not a function of the language, nor defined here.${mend(f, t)}`,
  "refused-function": (_, t) =>
    `“${t.text("name")}” is not among the functions a formula may use. The help page lists them.`,

  differ: (f, t) =>
    `Left is ${t.dimension("left")}, right is ${t.dimension("right")}: ${t.between("left", "right")}.${converterHint(f, t)}`,
  "not-dimensionless": (f, t) =>
    `${inArgument(t)} must be dimensionless; this is ${t.dimension("found")}.${converterHint(f, t)}`,
  argument: (_, t) =>
    `“${t.text("of")}” takes ${t.dimension("expected")} here; this is ${t.dimension("found")}: ${t.between("found", "expected")}.`,
  "exponent-unknown": (_, t) =>
    `A power of ${t.dimension("found")} needs an exponent that is a plain number, such as 2 or 1/3, or a given without uncertainty: its dimension must be known before anything is evaluated.`,
  "root-degree": () =>
    "The degree of this root must be a plain number other than zero: the dimension of the result must be known before anything is evaluated.",
  "not-electromagnetic": (_, t) =>
    `“${t.text("of")}” converts electromagnetic quantities; it knows no counterpart of ${t.dimension("found")}.`,

  "unit-missing": () => "A unit is missing behind `to`.",
  "unit-syntax": (_, t) =>
    `“${t.text("unit")}” cannot be read as a unit. Units are written like erg s^-1 cm^-2 or erg/s/cm^2.`,
  "unit-unknown": (f, t) => `“${t.text("name")}” is not a unit.${mend(f, t)}`,
  "unit-other-convention": (_, t) =>
    `“${t.text("name")}” is a unit of the ${t.em === "si" ? "Gaussian" : "SI"} convention; this calculation uses the ${t.em === "si" ? "SI" : "Gaussian"} one. Convert with ${t.em === "si" ? "to_si" : "to_gaussian"}(…), or change the convention of the calculation.`,
  "unit-dimension": (f, t) =>
    `This is ${t.dimension("found")}, but “${t.text("unit")}” measures ${t.dimension("expected")}: ${t.between("found", "expected")}.${converterHint(f, t)}`,

  cycle: (_, t) =>
    `These symbols are defined by one another: ${t.text("members")}. One of them must be given.`,
  "duplicate-name": (_, t) =>
    `“${t.text("symbol")}” is already defined further up. Each symbol is defined once: choose another, such as ${t.text("suggestion")}.`,
  depends: (_, t) =>
    `This needs “${t.text("symbol")}”, which has an error of its own. Mend that first.`,
  "in-function": (f, t) => `Inside ${t.text("name")}(…): ${f.inner ? sentenceOf(f.inner, t) : ""}`,

  "division-by-zero": () => "This divides by zero for the values given.",
  "root-of-negative": (_, t) =>
    `A negative number (${t.text("base")}) to the power ${t.text("exponent")} is not real. For odd roots write cbrt(…) or nthRoot(…, n).`,
  "function-domain": (_, t) => `“${t.text("name")}” is not defined for the value it is given here.`,
  undefined: () => "This has no defined value for the values given.",
  "too-large": () =>
    "The result is larger than a double holds (1.8 × 10³⁰⁸ in SI). Group the factors differently, or use logarithms.",
  underflow: () =>
    "A product of numbers that are not zero is smaller than a double holds in SI, and would be lost as zero. Group the factors differently.",
  "integral-diverges": () =>
    "The integral does not converge over this range: the integrand is singular or changes too fast. Split the range, or keep away from the singular point.",
  "sum-limits": () => "A sum runs over whole numbers: its limits must be whole.",
  "sum-terms": (_, t) =>
    `This sum has ${t.text("terms")} terms; at most 10⁷ are added. Replace it by an integral, or shorten it.`,
  steps: () =>
    `This calculation needs more than ${stepBudget / 1e6} million evaluations of the expressions in its sums, integrals and functions. Shorten the sums or avoid integrals inside integrals.`,
  "no-root": (_, t) =>
    `No zero of the expression was found between the limits (it is ${short(t.text("lower"))} at the lower and ${short(t.text("upper"))} at the upper, in SI). Widen the range.`,

  "not-a-given": (_, t) =>
    `“${t.text("symbol")}” is not a given of this calculation. Only a given can be varied or solved for.`,
  "not-a-relation": (_, t) =>
    `“${t.text("symbol")}” is not a relation of this calculation that has a value.`,
  "does-not-depend": (_, t) =>
    `“${t.text("target")}” does not depend on “${t.text("symbol")}”, so it cannot be solved for it.`,
  "decides-dimension": (_, t) =>
    `“${t.text("symbol")}” stands in an exponent that decides a dimension; it cannot be varied.`,
  "range-order": () => "A range runs from one value to another, different one.",
  "range-log": () => "A range in equal ratios needs both ends positive. Choose linear spacing.",
  "sweep-points": (_, t) =>
    `This sweep has ${t.text("found")} values; at most 10⁶ are computed. Take fewer points, or show fewer relations.`,
  "no-solution": (_, t) =>
    `“${t.text("target")}” does not reach ${t.text("equals")} in this range: it runs from ${short(t.text("lower"))} to ${short(t.text("upper"))} ${t.text("unit")}.`,

  "uncertainty-negative": () => "An uncertainty is a standard deviation and cannot be negative.",
  "factor-below-one": () => "“Within a factor f” needs f of at least 1.",
  "interval-order": () =>
    "An interval runs from its lower to its upper end, and the value lies inside it.",
  "log-normal-sign": () => "An uncertainty in dex or as a factor needs a positive value.",
};

function mend(fault: Fault, told: Told): string {
  const hint = told.text("hint");
  if (hint) return ` ${hint}`;
  return fault.suggestion ? ` Did you mean “${fault.suggestion}”?` : "";
}

function inArgument(t: Told): string {
  const of = t.text("of");
  if (of === "exponent") return "An exponent";
  return of === "sum" ? "The index of a sum" : `The argument of ${of}`;
}

function short(value: string): string {
  return Number(value).toPrecision(4).replace("-", "−");
}

function converterHint(fault: Fault, told: Told): string {
  const found = Object.values(fault.with ?? {}).filter(
    (x): x is Dimension => typeof x !== "string",
  );
  const si = found.some((d) => d.exponents[3]?.valueOf() !== 0);
  const gaussian = found.some((d) => d.exponents.some((x) => x.d === 2n));
  if (told.em === "gaussian" && si) {
    return " Electromagnetic quantities of this calculation are Gaussian: bring an SI one over with to_gaussian(…).";
  }
  return si && gaussian
    ? " SI and Gaussian quantities meet here: convert one with to_si(…) or to_gaussian(…)."
    : "";
}

/** “they differ by a time”, or by a quantity without a name of its own. */
function difference(a: Dimension, b: Dimension, em: EmConvention): string {
  const ratio = divideDimensions(a, b);
  const inverse = divideDimensions(b, a);
  if (ratio === dimensionless) return "they are the same";
  const size = (d: Dimension) => d.exponents.reduce((sum, x) => sum + x.valueOf(), 0);
  // “a time” reads better than “a frequency”: take the side with the larger exponents.
  const candidates = size(ratio) >= size(inverse) ? [ratio, inverse] : [inverse, ratio];
  const named = candidates.find((d) => dimensionName(d, em) !== undefined) ?? inverse;
  return `they differ by ${describeDimension(named, em).replace(/ \([^)]*\)$/, "")}`;
}

function sentenceOf(fault: Fault, told: Told): string {
  const sentence = sentences[fault.reason];
  if (!sentence) throw new Error(`no sentence for the fault ${fault.reason}`);
  return sentence(fault, tellWith(fault, told.em));
}

function tellWith(fault: Fault, em: EmConvention): Told {
  const value = (key: string) => fault.with?.[key];
  const dimensionOf = (key: string): Dimension => {
    const found = value(key);
    return typeof found === "object" ? found : dimensionless;
  };
  return {
    em,
    text: (key) => {
      const found = value(key);
      return typeof found === "string" ? found : "";
    },
    dimension: (key) => describeDimension(dimensionOf(key), em),
    between: (a, b) => difference(dimensionOf(a), dimensionOf(b), em),
  };
}

/** A fault as it stands in a result: code, English, place, and a replacement where one is known. */
export function tellFault(fault: Fault, em: EmConvention): CellError {
  const message = sentenceOf(fault, tellWith(fault, em));
  return {
    code: fault.code,
    message: message.charAt(0).toUpperCase() + message.slice(1),
    ...(fault.field !== undefined ? { field: fault.field } : {}),
    ...(fault.from !== undefined ? { from: fault.from } : {}),
    ...(fault.to !== undefined ? { to: fault.to } : {}),
    ...(fault.suggestion !== undefined ? { suggestion: fault.suggestion } : {}),
  };
}

/** Every reason that has a sentence, for the test that none is missing. */
export const tellableReasons: readonly string[] = Object.keys(sentences);
