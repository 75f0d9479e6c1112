import { beforeAll, describe, expect, it } from "vitest";
import { createEngine } from "@/lib/expr";
import type { CalculationFile, CellResult } from "@/lib/schema";
import { expectWithin } from "../unit/physics/approximately";
import { askPython } from "./python";
import relations from "./relations.json";

/**
 * Standard relations of accretion, radiation, stars, dynamics and plasma: our engine, from formulas
 * as one types them, against Python programs that state the same physics by hand in plain SI numbers
 * (relations.py; for Gaussian electromagnetism relations_gaussian.py, in tesla and coulomb). Each row
 * names the published source of the relation and how it is known: all are from memory, not re-read.
 * Constants are the same on both sides: CODATA 2018 and IAU 2015 B3.
 */
const tolerance = 1e-9;

interface Row {
  readonly id: string;
  readonly em?: "gaussian";
  /** Symbol, value, our unit, and the same unit as the Python library spells it. */
  readonly givens: readonly (readonly [string, number, string, string])[];
  readonly formula: string;
  readonly unit: readonly [string, string];
  readonly source: string;
  readonly status: string;
  /** Where the relation holds; true of the givens. */
  readonly validity?: string;
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
  const conditions = row.validity === undefined ? [] : [row.validity, `not (${row.validity})`];
  const checks = conditions.map((condition, i) => ({
    id: `k${i}`,
    kind: "check" as const,
    condition,
  }));
  return {
    format: "leading-order/1",
    title: row.id,
    edition: "codata-2018",
    em: row.em ?? "si",
    cells: [
      ...givens,
      { id: "r", kind: "relation", symbol: "y_result", formula: row.formula, unit },
      ...checks,
    ],
  };
}

const engine = createEngine();
const resultOf = (row: Row, cell: string) =>
  engine.evaluate(calculation(row), "").cells[cell] as CellResult;

describe("standard relations against programs that state them by hand", () => {
  let reference: Record<string, number>;
  beforeAll(async () => {
    const tasks = rows.map((row) => ({
      id: row.id,
      givens: row.givens.map(([symbol, value, , unit]) => [symbol, value, unit]),
      unit: row.unit[1],
    }));
    reference = await askPython("relations.py", tasks);
  });

  it("are 136, 27 of them Gaussian", () => {
    expect(new Set(rows.map(({ id }) => id)).size).toBe(136);
    expect(rows.filter(({ em }) => em === "gaussian")).toHaveLength(27);
  });

  it.each(rows.map((row) => [row.id, row.source, row.status, row] as const))(
    "agree: %s (%s; %s)",
    (id, _source, _status, row) => {
      const result = resultOf(row, "r");
      if (result.status !== "ok" || !("value" in result)) throw new Error(JSON.stringify(result));
      expectWithin(Number(result.value), reference[id] ?? Number.NaN, tolerance);
    },
  );
});

describe("the validity of standard relations, as checks", () => {
  it.each(
    rows.filter(({ validity }) => validity !== undefined).map((row) => [row.id, row] as const),
  )("holds where they are used, and its opposite does not: %s", (_id, row) => {
    expect(resultOf(row, "k0")).toMatchObject({ status: "ok", holds: true });
    expect(resultOf(row, "k1")).toMatchObject({ status: "ok", holds: false });
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
