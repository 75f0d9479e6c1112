import { type Dimension, dimensionToJson, readableUnit, type UnitSystem } from "../../physics";
import type { RelationCell } from "../../schema/calculation";
import type { Share } from "../../schema/results";
import { type GoodUnit, requireSymbol, requireUnit } from "../cell-faults";
import { attempt, type Fault, raise } from "../faults";
import { type Formula, type FormulaHead, type FormulaWords, readHead } from "../formula";
import type { SettledFormula } from "../formula-cache";
import { functionNames } from "../functions";
import { normalise, typedRange } from "../normalise";
import {
  type Contribution,
  chainPowers,
  chainRule,
  combinedUncertainty,
  contributions,
  type Gradient,
  type Powers,
} from "../propagate";
import { normalisedForm, scalingOf } from "../scale";
import { readTokens } from "../tokens";
import type { EvaluationContext, KindOfCell, Outcome } from "./kind";

/**
 * The symbol and, for a function, its parameters: from the symbol field (`L` or `f(x, y)`), which the
 * head of the formula (`L = …`), if there is one, must repeat.
 */
export function relationHead(cell: RelationCell, words: FormulaWords): FormulaHead {
  const named = headOfSymbol(cell.symbol);
  const { head } = words;
  if (head && head.name !== named.name) {
    const place = { field: "formula", from: 0, to: words.typed.indexOf("=") };
    raise({
      code: "syntax",
      reason: "head-other",
      ...place,
      with: { found: head.name, symbol: named.name },
    });
  }
  const parameters = named.parameters ?? head?.parameters;
  return { name: named.name, ...(parameters ? { parameters } : {}) };
}

function headOfSymbol(typed: string): FormulaHead {
  if (!typed.includes("(")) return { name: requireSymbol(typed) };
  const normalised = normalise(typed);
  const head = readHead(readTokens(normalised.text));
  requireSymbol(head.name);
  return head;
}

interface DisplayUnit {
  readonly text: string;
  readonly factor: number;
}

function requireDimension(
  unit: GoodUnit,
  text: string,
  of: Dimension,
  field: string,
  from: number,
) {
  if (unit.dimension === of) return;
  raise({
    code: "unit",
    reason: "unit-dimension",
    field,
    from,
    to: from + text.length,
    with: { found: of, expected: unit.dimension, unit: text },
  });
}

function statedUnit(cell: RelationCell, words: FormulaWords, of: Dimension, system: UnitSystem) {
  const stated = words.unit && { ...words.unit, field: "formula" };
  const chosen = cell.unit !== undefined ? { text: cell.unit, from: 0, field: "unit" } : stated;
  for (const one of [stated, chosen]) {
    if (one)
      requireDimension(
        requireUnit(one.text, system, one.field, one.from),
        one.text,
        of,
        one.field,
        one.from,
      );
  }
  return chosen?.text;
}

function displayUnit(
  text: string | undefined,
  of: Dimension,
  si: number,
  system: UnitSystem,
): DisplayUnit {
  const chosen = text ?? readableUnit(of, si, system.em);
  return { text: chosen, factor: requireUnit(chosen, system, "unit").factor };
}

function defineFunction(formula: Formula, head: FormulaHead, context: EvaluationContext): Outcome {
  for (const name of formula.names) {
    const meaning = context.scope.lookup(name);
    if (meaning?.kind === "faulty") {
      raise({
        code: "depends",
        reason: "depends",
        field: "formula",
        with: { symbol: meaning.symbol, cell: meaning.cell },
      });
    }
    if (!meaning && !functionNames.has(name)) raise(unknownIn(formula, name));
  }
  const { name: symbol, parameters = [] } = head;
  return {
    meaning: {
      kind: "function",
      definition: { symbol, parameters, body: formula.tree },
      identity: context.formulas.identify(formula, context.scope),
    },
    result: { kind: "relation", status: "ok", symbol, parameters: [...parameters] },
  };
}

function unknownIn(formula: Formula, name: string): Fault {
  const token = formula.words.body.find((one) => one.text === name);
  const place = token ? typedRange(formula.words.normalised, token.from, token.to) : {};
  return { code: "unknown-name", reason: "unknown-name", ...place, with: { name } };
}

interface Valued {
  readonly si: number;
  readonly gradient: Gradient;
  readonly powers: Powers;
}

/** The value, and what it rests on through its inputs. */
function evaluateWithSlopes(settled: SettledFormula, context: EvaluationContext): Valued {
  const { inputs, run } = settled.gradient;
  const slopes = new Float64Array(inputs.length);
  const si = run(
    inputs.map((key) => context.value(key)),
    slopes,
    context.runtime,
  );
  const gradient = chainRule(inputs, slopes, context.gradientOf);
  return { si, gradient, powers: chainPowers(settled.powerLaw, context.powersOf) };
}

/** Shares of a variance smaller than this are left out of the budget. */
const smallestShare = 1e-6;

function shareOf(part: Contribution, variance: number): Share {
  const symbol = part.root.slice(part.root.indexOf(":") + 1);
  return { symbol, share: part.amount ** 2 / variance };
}

/** Uncertainty and budget, exponents and normalised form, as far as they are defined. */
function assessment(value: number, factor: number, valued: Valued, context: EvaluationContext) {
  const { si, gradient, powers } = valued;
  const parts = contributions(gradient, context.uncertaintyOf);
  const uncertainty = combinedUncertainty(parts) / factor;
  const variance = parts.reduce((sum, part) => sum + part.amount ** 2, 0);
  // An infinite slope (a root at zero) leaves the first order without meaning.
  const isDefined = Number.isFinite(uncertainty) && variance > 0;
  const budget = parts
    .map((part) => shareOf(part, variance))
    .filter(({ share }) => share >= smallestShare);
  const normalised = normalisedForm(value, si, gradient, powers, context.givenOf);
  return {
    uncertainty: isDefined ? uncertainty : null,
    ...(isDefined ? { budget } : {}),
    scaling: scalingOf(si, gradient, powers, context.givenOf),
    ...(normalised ? { normalised } : {}),
  };
}

/** `symbol = formula`, or a function definition, with the unit to show it in. */
export const relationKind: KindOfCell<RelationCell> = {
  kind: "relation",
  declare: (cell, formulas) => {
    // A fault of the formula is told when it is read; the symbol stands all the same.
    const words = attempt(() => formulas.words(cell.formula));
    const head = words.ok ? relationHead(cell, words.value) : headOfSymbol(cell.symbol);
    return { symbol: head.name, isFunction: head.parameters !== undefined };
  },
  read: (cell, roles, formulas) => {
    const { parameters } = relationHead(cell, formulas.words(cell.formula));
    return { formulas: [formulas.read(cell.formula, roles, parameters)] };
  },
  structure: (cell) => [cell.symbol, cell.formula, cell.unit].join("\u0000"),
  values: () => "",
  evaluate: (cell, reading, context) => {
    const formula = reading.formulas[0] as Formula;
    const head = relationHead(cell, formula.words);
    if (head.parameters) return defineFunction(formula, head, context);
    const settled = context.formulas.settle(formula, context.scope, "quantity");
    const of = settled.typed.dimension;
    const unitText = statedUnit(cell, formula.words, of, context.system);
    const valued = evaluateWithSlopes(settled, context);
    const unit = displayUnit(unitText, of, valued.si, context.system);
    const value = valued.si / unit.factor;
    return {
      ...valued,
      meaning: { kind: "quantity", dimension: of },
      result: {
        kind: "relation",
        status: "ok",
        symbol: head.name,
        value,
        unit: unit.text,
        si: { value: valued.si, dimension: dimensionToJson(of) },
        ...assessment(value, unit.factor, valued, context),
      },
    };
  },
};
