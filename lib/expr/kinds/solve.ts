import type { SolveCell } from "../../schema/calculation";
import { requireUnit } from "../cell-faults";
import { chainFrom, dependsOn } from "../chain";
import { raise } from "../faults";
import { canonicalName } from "../normalise";
import { brent, isZero, spread } from "../root-finding";
import type { EvaluationContext, KindOfCell } from "./kind";
import { requireGiven, requireRelation } from "./sweep";

const samples = 400;

function targetValue(cell: SolveCell, context: EvaluationContext) {
  const target = requireRelation(cell.target, "target", context);
  const text = cell.targetUnit ?? "";
  const unit = requireUnit(text, context.system, "targetUnit");
  if (unit.dimension !== target.dimension) {
    const found = { found: target.dimension, expected: unit.dimension, unit: text };
    const place = { field: "targetUnit", from: 0, to: text.length };
    raise({ code: "unit", reason: "unit-dimension", ...place, with: found });
  }
  return { symbol: target.symbol, factor: unit.factor, wanted: cell.equals * unit.factor };
}

/** Every value between the ends at which `f` is zero, found from its changes of sign. */
function rootsOf(f: (x: number) => number | null, from: number, to: number): number[] {
  const roots: number[] = [];
  let before: { x: number; y: number } | undefined;
  for (const x of spread(from, to, samples)) {
    const y = f(x);
    if (y === 0) roots.push(x);
    // A gap in the domain is no change of sign.
    else if (y !== null && before && before.y !== 0 && Math.sign(before.y) !== Math.sign(y)) {
      const root = brent((at) => f(at) ?? Number.NaN, { from: before.x, to: x });
      if (isZero(f(root) ?? Number.POSITIVE_INFINITY, [before.y, y])) roots.push(root);
    }
    before = y === null ? undefined : { x, y };
  }
  return roots;
}

function refuseWithRange(
  cell: SolveCell,
  values: readonly (number | null)[],
  factor: number,
): never {
  const numbers = values.filter((value): value is number => value !== null).map((v) => v / factor);
  const range = { lower: String(Math.min(...numbers)), upper: String(Math.max(...numbers)) };
  const unit = cell.targetUnit ?? "";
  raise({
    code: "no-solution",
    reason: "no-solution",
    field: "equals",
    with: { target: cell.target, equals: `${cell.equals} ${unit}`.trim(), unit, ...range },
  });
}

/** The value of one given for which a relation takes a stated value. */
export const solveKind: KindOfCell<SolveCell> = {
  kind: "solve",
  declare: () => undefined,
  read: (cell) => ({ formulas: [], symbols: [cell.for, cell.target].map(canonicalName) }),
  structure: (cell) => [cell.for, cell.target].join("\u0000"),
  values: (cell) => [cell.from, cell.to, cell.unit, cell.equals, cell.targetUnit].join("\u0000"),
  evaluate: (cell, _reading, context) => {
    const given = requireGiven(cell.for, cell.unit, "for", context);
    const target = targetValue(cell, context);
    if (cell.from === cell.to) raise({ code: "domain", reason: "range-order", field: "from" });
    if (!dependsOn(target.symbol, given.symbol, context)) {
      const told = { target: target.symbol, symbol: given.symbol };
      raise({ code: "no-solution", reason: "does-not-depend", field: "target", with: told });
    }
    const chain = chainFrom(given.symbol, [target.symbol], context);
    const value = (x: number) => chain.at(x * given.factor)[0] ?? null;
    const away = (x: number) => {
      const y = value(x);
      return y === null ? null : y - target.wanted;
    };
    const solutions = rootsOf(away, cell.from, cell.to);
    if (solutions.length === 0) {
      refuseWithRange(cell, spread(cell.from, cell.to, samples).map(value), target.factor);
    }
    return {
      result: {
        kind: "solve",
        status: "ok",
        symbol: given.symbol,
        unit: cell.unit ?? "",
        solutions,
      },
    };
  },
};
