import { readableUnit } from "../../physics";
import type { SweepCell } from "../../schema/calculation";
import { limits } from "../../schema/limits";
import { requireUnit } from "../cell-faults";
import { chainFrom } from "../chain";
import { raise } from "../faults";
import { canonicalName } from "../normalise";
import type { EvaluationContext, KindOfCell } from "./kind";

/** Points of a sweep that states none. */
const usualPoints = 200;

/** A given that may be varied, with the factor of the unit its range is stated in. */
export function requireGiven(
  typed: string,
  unitText: string | undefined,
  field: string,
  context: EvaluationContext,
): { symbol: string; factor: number } {
  const symbol = canonicalName(typed);
  const meaning = context.scope.lookup(symbol);
  if (meaning?.kind === "faulty") {
    raise({ code: "depends", reason: "depends", field, with: { symbol, cell: meaning.cell } });
  }
  if (meaning?.kind !== "quantity" || context.formulaOf(symbol)) {
    raise({ code: "unknown-name", reason: "not-a-given", field, with: { symbol } });
  }
  const text = unitText ?? "";
  const unit = requireUnit(text, context.system, "unit");
  if (unit.dimension !== meaning.dimension) {
    const found = { found: meaning.dimension, expected: unit.dimension, unit: text };
    raise({
      code: "unit",
      reason: "unit-dimension",
      field: "unit",
      from: 0,
      to: text.length,
      with: found,
    });
  }
  return { symbol, factor: unit.factor };
}

/** A relation that has a value. */
export function requireRelation(typed: string, field: string, context: EvaluationContext) {
  const symbol = canonicalName(typed);
  const meaning = context.scope.lookup(symbol);
  if (meaning?.kind === "faulty") {
    raise({ code: "depends", reason: "depends", field, with: { symbol, cell: meaning.cell } });
  }
  if (meaning?.kind !== "quantity" || !context.formulaOf(symbol)) {
    raise({ code: "unknown-name", reason: "not-a-relation", field, with: { symbol } });
  }
  return { symbol, dimension: meaning.dimension };
}

function pointsOf(cell: SweepCell, spacing: "log" | "linear"): number[] {
  const count = cell.points ?? usualPoints;
  const { from, to } = cell;
  if (from === to) raise({ code: "domain", reason: "range-order", field: "from" });
  if (spacing === "log" && !(from > 0 && to > 0)) {
    raise({ code: "domain", reason: "range-log", field: "from" });
  }
  return Array.from({ length: count }, (_, i) => {
    if (i === 0) return from;
    if (i === count - 1) return to;
    const share = i / (count - 1);
    return spacing === "log" ? from * (to / from) ** share : from + (to - from) * share;
  });
}

function requireWithinLimit(cell: SweepCell): void {
  const found = (cell.points ?? usualPoints) * Math.max(1, cell.show.length);
  if (found > limits.sweepPoints) {
    raise({
      code: "limit",
      reason: "sweep-points",
      field: "points",
      with: { found: String(found) },
    });
  }
}

/** One given varied over a range, relations evaluated against it. */
export const sweepKind: KindOfCell<SweepCell> = {
  kind: "sweep",
  declare: () => undefined,
  read: (cell) => ({ formulas: [], symbols: [cell.over, ...cell.show].map(canonicalName) }),
  structure: (cell) => [cell.over, ...cell.show].join("\u0000"),
  values: (cell) => [cell.from, cell.to, cell.unit, cell.spacing, cell.points].join("\u0000"),
  evaluate: (cell, _reading, context) => {
    requireWithinLimit(cell);
    const spacing = cell.spacing ?? "log";
    const given = requireGiven(cell.over, cell.unit, "over", context);
    const shown = cell.show.map((typed) => requireRelation(typed, "show", context));
    const points = pointsOf(cell, spacing);
    const chain = chainFrom(
      given.symbol,
      shown.map(({ symbol }) => symbol),
      context,
    );
    const rows = points.map((point) => chain.at(point * given.factor));
    const series = shown.map(({ symbol, dimension }, i) => {
      const size = Math.max(...rows.map((row) => Math.abs(row[i] ?? 0)));
      const unit = readableUnit(dimension, size, context.system.em);
      const { factor } = requireUnit(unit, context.system, "unit");
      const values = rows.map((row) =>
        typeof row[i] === "number" ? (row[i] as number) / factor : null,
      );
      return { symbol, unit, values };
    });
    const unit = cell.unit ?? "";
    return {
      result: { kind: "sweep", status: "ok", over: given.symbol, unit, spacing, points, series },
    };
  },
};
