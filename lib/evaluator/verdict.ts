import { equalWithin } from "@/lib/expr/equal-within";
import type { CellResult, Difference, Results, Verdict } from "@/lib/schema";

/** Values agree when they differ by less than this fraction of the larger. */
export const valueTolerance = 1e-12;
/** Uncertainties agree when they differ by less than this fraction of the larger. */
export const uncertaintyTolerance = 1e-9;

type Scalar = Difference["recorded"];

/** Equal to within a relative tolerance; zero equals only zero, null only null. */
function sameWithin(tolerance: number, a: Scalar | undefined, b: Scalar | undefined): boolean {
  if (typeof a !== "number" || typeof b !== "number") return (a ?? null) === (b ?? null);
  return equalWithin(a, b, tolerance);
}

/** recomputed / recorded for two numbers; null where that says nothing. */
function ratioOf(recorded: Scalar, recomputed: Scalar): number | null {
  if (typeof recorded !== "number" || typeof recomputed !== "number" || recorded === 0) return null;
  const ratio = recomputed / recorded;
  return Number.isFinite(ratio) ? ratio : null;
}

/** A field of a result whatever its kind, `undefined` where this kind does not have it. */
function field(result: CellResult, name: string): Scalar | undefined {
  const value = (result as Record<string, unknown>)[name];
  return value === null || ["number", "string", "boolean"].includes(typeof value)
    ? (value as Scalar)
    : undefined;
}

/** Every number of a result that has many: the points and series of a sweep, the roots of a solve. */
function listOf(result: CellResult): Scalar[] {
  if ("series" in result) {
    const series = result.series.flatMap(({ symbol, unit, values }) => [symbol, unit, ...values]);
    return [...result.points, ...series];
  }
  return "solutions" in result ? result.solutions : [];
}

/** The first place where two lists differ; a list that is shorter differs where it ends. */
function listDifference(cell: string, was: Scalar[], is: Scalar[], symbol: { symbol?: string }) {
  const length = Math.max(was.length, is.length);
  const at = Array.from({ length }, (_, i) => i).find(
    (i) => i >= was.length || i >= is.length || !sameWithin(valueTolerance, was[i], is[i]),
  );
  return at === undefined
    ? []
    : [difference(cell, "value", was[at] ?? null, is[at] ?? null, symbol)];
}

/** What is compared of two results that both went well, each with its tolerance. */
const compared = [
  { what: "unit", tolerance: 0 },
  { what: "value", tolerance: valueTolerance },
  { what: "uncertainty", tolerance: uncertaintyTolerance },
  { what: "holds", tolerance: 0 },
] as const;

/** “ok”, or the code of the error: what a difference of status shows on each side. */
function statusOf(result: CellResult): string {
  return result.status === "ok" ? "ok" : result.error.code;
}

function symbolOf(...results: (CellResult | undefined)[]): { symbol?: string } {
  const symbol = results.map((result) => result && field(result, "symbol")).find(Boolean);
  return typeof symbol === "string" ? { symbol } : {};
}

function difference(
  cell: string,
  what: Difference["what"],
  recorded: Scalar,
  recomputed: Scalar,
  symbol: { symbol?: string },
): Difference {
  return { cell, ...symbol, what, recorded, recomputed, ratio: ratioOf(recorded, recomputed) };
}

/** The differences of one cell that both sides have; none when it is reproduced. */
function cellDifferences(cell: string, recorded: CellResult, recomputed: CellResult): Difference[] {
  const symbol = symbolOf(recorded, recomputed);
  const before = statusOf(recorded);
  const after = statusOf(recomputed);
  if (before !== after) return [difference(cell, "status", before, after, symbol)];
  const scalars = compared.flatMap(({ what, tolerance }) => {
    const was = field(recorded, what);
    const is = field(recomputed, what);
    if (sameWithin(tolerance, was, is)) return [];
    return [difference(cell, what, was ?? null, is ?? null, symbol)];
  });
  return [...scalars, ...listDifference(cell, listOf(recorded), listOf(recomputed), symbol)];
}

/** A cell's result, never something that every object inherits. */
function resultOf(results: Results, id: string): CellResult | undefined {
  return Object.hasOwn(results.cells, id) ? results.cells[id] : undefined;
}

/**
 * What differs between two results objects, in the order of the recorded cells; cells that one side
 * lacks come as `missing`. Values are equal within 1e-12 relative, uncertainties within 1e-9; a
 * unit, a status (or the code of an error) and the outcome of a check must be the same.
 */
export function compareResults(recorded: Results, recomputed: Results): Difference[] {
  const ids = new Set([...Object.keys(recorded.cells), ...Object.keys(recomputed.cells)]);
  return [...ids].flatMap((id) => {
    const before = resultOf(recorded, id);
    const after = resultOf(recomputed, id);
    if (before && after) return cellDifferences(id, before, after);
    const [was, is] = [before, after].map((result) => (result ? statusOf(result) : null));
    return [difference(id, "missing", was ?? null, is ?? null, symbolOf(before, after))];
  });
}

/** *Reproduces* when nothing differs. The results are those of today. */
export function verdictOn(recorded: Results, recomputed: Results): Verdict {
  const differences = compareResults(recorded, recomputed);
  return {
    verdict: differences.length === 0 ? "reproduces" : "differs",
    differences,
    results: recomputed,
  };
}
