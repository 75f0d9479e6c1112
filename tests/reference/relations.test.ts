import { execFileSync } from "node:child_process";
import path from "node:path";
import { describe, expect, it } from "vitest";
import { createEngine } from "@/lib/expr";
import type { CalculationFile, CellResult } from "@/lib/schema";
import relations from "./relations.json";

/**
 * Standard relations of accretion, radiation, stars, dynamics and plasma: our engine, from formulas
 * as one types them, against a Python program that states the same physics by hand in plain SI
 * numbers (relations.py, run here). Each row names the published source of the relation; citations
 * are from memory, not re-read. Constants are the same on both sides: CODATA 2018 and IAU 2015 B3.
 */
const tolerance = 1e-9;

interface Row {
  readonly id: string;
  /** Symbol, value, our unit, and the same unit as the Python library spells it. */
  readonly givens: readonly (readonly [string, number, string, string])[];
  readonly formula: string;
  readonly unit: readonly [string, string];
  readonly source: string;
}
const rows = relations as unknown as readonly Row[];

function calculation(row: Row): CalculationFile {
  const givens = row.givens.map(([symbol, value, unit], i) => ({
    id: `g${i}`,
    kind: "given" as const,
    symbol,
    value,
    unit,
  }));
  const [unit] = row.unit;
  return {
    format: "leading-order/1",
    title: row.id,
    edition: "codata-2018",
    cells: [
      ...givens,
      { id: "r", kind: "relation", symbol: "y_result", formula: row.formula, unit },
    ],
  };
}

function python(): Record<string, number> {
  const tasks = rows.map((row) => ({
    id: row.id,
    givens: row.givens.map(([symbol, value, , unit]) => [symbol, value, unit]),
    unit: row.unit[1],
  }));
  const script = path.join(import.meta.dirname, "relations.py");
  const input = JSON.stringify(tasks);
  return JSON.parse(execFileSync("/usr/bin/python3", [script], { input, encoding: "utf8" }));
}

describe("standard relations against a program that states them by hand", () => {
  const reference = python();
  const engine = createEngine();

  it.each(rows.map((row) => [row.id, row.source, row] as const))("%s (%s)", (id, _source, row) => {
    const result = engine.evaluate(calculation(row), "").cells.r as CellResult;
    if (result.status !== "ok" || !("value" in result)) throw new Error(JSON.stringify(result));
    expect(Math.abs(result.value / (reference[id] ?? Number.NaN) - 1)).toBeLessThan(tolerance);
  });
});

describe("what the trade knows by heart", () => {
  it("gives about 10³⁸ erg/s for one solar mass (common practice, no source)", () => {
    const row = rows.find(({ id }) => id === "eddington_luminosity") as Row;
    const file = calculation({ ...row, givens: [["M", 1, "Msun", "solMass"]] });
    const result = createEngine().evaluate(file, "").cells.r as CellResult;
    expect("value" in result && Math.log10(result.value)).toBeCloseTo(38, 0);
  });
});
