import type { UnitSystem } from "../physics";
import type { CalculationFile, Cell, GivenCell } from "../schema/calculation";
import type { CellPresentation, Presentation } from "../schema/presentation";
import type { CellResult, Results } from "../schema/results";
import { showExactly, shownTex, shownText } from "./digits";
import { cellLine } from "./entry";
import { canonicalName } from "./normalise";
import type { Resolved, ResolvedCell } from "./resolve";
import { builtIn } from "./scope";
import { formulaTex, type TexContext } from "./tex";
import { nameTex } from "./tex-names";
import { concise } from "./value-line";
import { type ShownForm, shownRelation, withUnit } from "./value-shown";

interface ShownValue {
  readonly valueTex: string;
  readonly valueText: string;
}

function toShown({ tex, text }: ShownForm): ShownValue {
  return { valueTex: tex, valueText: text };
}

/** A given is shown with the digits and the uncertainty it was stated with. */
function givenNumber(cell: GivenCell): { tex: string; text: string } {
  const plain = showExactly(cell.value);
  if (cell.uncertainty !== undefined && cell.uncertainty > 0) {
    return uncertainNumber(cell.value, cell.uncertainty);
  }
  const shown = { tex: shownTex(plain), text: shownText(plain) };
  if (cell.interval) {
    const [low, high] = cell.interval.map(showExactly) as [typeof plain, typeof plain];
    return {
      tex: `${shownTex(low)}\\,\\ldots\\,${shownTex(high)}`,
      text: `${shownText(low)} … ${shownText(high)}`,
    };
  }
  if (cell.dex !== undefined) {
    return {
      tex: `${shown.tex} \\pm ${cell.dex}\\,\\mathrm{dex}`,
      text: `${shown.text} ± ${cell.dex} dex`,
    };
  }
  if (cell.factor !== undefined) {
    return {
      tex: `${shown.tex}\\,{}^{\\times ${cell.factor}}_{\\div ${cell.factor}}`,
      text: `${shown.text} within a factor ${cell.factor}`,
    };
  }
  return shown;
}

function uncertainNumber(value: number, uncertainty: number): { tex: string; text: string } {
  const short = concise(value, uncertainty);
  const [, mantissa, power] = /^(.*\))(?:e(-?\d+))?$/.exec(short ?? "") ?? [];
  if (mantissa !== undefined) {
    const shown = { mantissa, exponent: Number(power ?? 0) };
    return { tex: shownTex(shown), text: shownText(shown) };
  }
  const [a, b] = [showExactly(value), showExactly(uncertainty)];
  return { tex: `${shownTex(a)} \\pm ${shownTex(b)}`, text: `${shownText(a)} ± ${shownText(b)}` };
}

/** A spread written with ± is put in brackets, so that the unit belongs to both numbers. */
function givenValue(cell: GivenCell, unit: string, system: UnitSystem): ShownForm {
  const number = givenNumber(cell);
  const isSpread = number.text.includes(" ± ") && cell.dex === undefined && unit !== "";
  if (!isSpread) return withUnit(number, unit, system);
  return withUnit({ tex: `(${number.tex})`, text: `(${number.text})` }, unit, system);
}

function shownValue(
  cell: Cell,
  result: CellResult | undefined,
  system: UnitSystem,
): Partial<CellPresentation> {
  if (result?.status !== "ok" || !("value" in result)) return {};
  if (cell.kind === "given") return toShown(givenValue(cell, result.unit, system));
  if (result.kind !== "relation") return {};
  return shownRelation(result, system);
}

function headTex(symbol: string, parameters: readonly string[] | undefined): string {
  if (!parameters) return nameTex(symbol);
  return `${nameTex(symbol)}\\left(${parameters.map(nameTex).join(", ")}\\right)`;
}

function equationTex(
  one: ResolvedCell,
  result: CellResult | undefined,
  context: TexContext,
): string | undefined {
  const { cell, declaration, reading } = one;
  if (cell.kind === "given") return declaration ? nameTex(declaration.symbol) : undefined;
  const formula = reading?.formulas[0];
  if (!formula) return declaration ? nameTex(declaration.symbol) : undefined;
  const parameters =
    result && "parameters" in result ? result.parameters : formula.words.head?.parameters;
  const inner: TexContext = parameters
    ? { ...context, isQuantity: (name) => parameters.includes(name) || context.isQuantity(name) }
    : context;
  const body = formulaTex(formula.tree, inner);
  return declaration ? `${headTex(declaration.symbol, parameters)} = ${body}` : body;
}

function constantsOf(one: ResolvedCell, resolved: Resolved, system: UnitSystem): string[] {
  const names = new Set<string>();
  for (const formula of one.reading?.formulas ?? []) {
    for (const name of formula.names) {
      if (!resolved.definers.has(name) && builtIn(name, system)?.kind === "constant")
        names.add(name);
    }
  }
  return [...names];
}

/** How a calculation is shown beside its results. */
export function present(
  file: CalculationFile,
  results: Results,
  resolved: Resolved,
  system: UnitSystem,
): Presentation {
  const context: TexContext = {
    system,
    isQuantity: (name) => resolved.definers.has(canonicalName(name)),
  };
  const byId = new Map(resolved.order.map((one) => [one.cell.id, one]));
  const usedBy = new Map<string, string[]>();
  for (const one of byId.values()) {
    for (const used of one.uses) usedBy.set(used, [...(usedBy.get(used) ?? []), one.cell.id]);
  }
  const cells: Record<string, CellPresentation> = {};
  let number = 0;
  for (const cell of file.cells) {
    const one = byId.get(cell.id) as ResolvedCell;
    const result = results.cells[cell.id];
    const tex = equationTex(one, result, context);
    if (cell.kind === "relation") number += 1;
    cells[cell.id] = {
      ...(cell.kind === "relation" ? { number } : {}),
      line: cellLine(cell),
      ...(tex !== undefined ? { tex } : {}),
      ...shownValue(cell, result, system),
      uses: [...one.uses],
      usedBy: usedBy.get(cell.id) ?? [],
      constants: constantsOf(one, resolved, system),
    };
  }
  return { cells };
}
