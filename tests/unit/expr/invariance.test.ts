import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { createEngine } from "@/lib/expr";
import type { CalculationFile, Cell, CellResult } from "@/lib/schema";
import { calculation, siOf } from "./calculations";
import { formulas, type Made, written } from "./random-formulas";

const runs = { seed: 20261208, numRuns: 400 };

const lines = [
  "A = 2.0(1) kg",
  "B = 3 m",
  "n = 2",
  "C = 5.0(2) s",
  "v = B / C",
  "E = A v^n / 2",
  "f(x) = x^2 + v^2",
  "w = sqrt(f(2 m/s))",
  "E > 1 erg",
  "bad = A + B",
  "worse = 2 bad",
  "round_a = round_b + 1",
  "round_b = round_a + 1",
  "q = integrate(A t, t, 0 s, C) to g s^2",
];

const resultsById = (file: CalculationFile) => createEngine().evaluate(file, "").cells;

describe("the order of cells", () => {
  it("does not change what any of them says", () => {
    const file = calculation(lines);
    const expected = resultsById(file);
    const withoutCycle = ([, result]: [string, CellResult]) =>
      result.status === "ok" || result.error.code !== "cycle";
    fc.assert(
      fc.property(fc.shuffledSubarray(file.cells, { minLength: lines.length }), (cells) => {
        const found = resultsById({ ...file, cells });
        expect(Object.keys(found)).toEqual(cells.map((cell) => cell.id));
        // A cycle may be told from another of its members.
        for (const [id, result] of Object.entries(expected).filter(withoutCycle)) {
          expect(found[id]).toEqual(result);
        }
        for (const id of ["c11", "c12"])
          expect(found[id]).toMatchObject({ error: { code: "cycle" } });
      }),
      { ...runs, numRuns: 100 },
    );
  });
});

describe("what an engine remembers", () => {
  type Edit = (file: CalculationFile) => CalculationFile;
  const at = fc.nat(lines.length - 1);
  const other = fc.constantFrom(
    "A = 4 kg",
    "A = 2 g",
    "B = 7(1) km",
    "B = 3 kg",
    "n = 1",
    "n = 2.0(1)",
    "n = 1 + 1",
    "v = 2 B / C",
    "f(x) = x + v",
    "f = 3",
    "E > 1e9 erg",
    "bad = 3 A",
    "round_a = 1",
    "G = 2",
    "k = G A to erg cm/g",
    "u_B = (1 gauss)^2 / (8 pi)",
    "w = f(3 m/s) m_p / m_e",
    "Some words",
  );
  const withCells = (file: CalculationFile, cells: readonly Cell[]) => ({
    ...file,
    cells: [...cells],
  });
  const retype =
    (line: string, i: number): Edit =>
    (file) => {
      const made = calculation([line], { edition: file.edition, em: file.em ?? "si" })
        .cells[0] as Cell;
      return withCells(
        file,
        file.cells.map((cell, j) => (j === i ? ({ ...made, id: cell.id } as Cell) : cell)),
      );
    };
  const edits: fc.Arbitrary<Edit> = fc.oneof(
    { arbitrary: fc.tuple(other, at).map(([line, i]) => retype(line, i)), weight: 5 },
    fc.tuple(fc.nat(20), at).map(
      ([value, i]): Edit =>
        (file) =>
          withCells(
            file,
            file.cells.map((c, j) => (j === i && c.kind === "given" ? { ...c, value } : c)),
          ),
    ),
    at.map(
      (i): Edit =>
        (file) =>
          withCells(
            file,
            file.cells.filter((_, j) => j !== i || j < 4),
          ),
    ),
    at.map(
      (i): Edit =>
        (file) =>
          withCells(file, [...file.cells.slice(i), ...file.cells.slice(0, i)]),
    ),
    fc.constantFrom("si", "gaussian" as const).map(
      (em): Edit =>
        (file) => ({ ...file, em }),
    ),
    fc.constantFrom("codata-2018", "codata-2022" as const).map(
      (edition): Edit =>
        (file) => ({ ...file, edition }),
    ),
  );

  it("never changes what it answers nor how it is shown", () => {
    const engine = createEngine();
    fc.assert(
      fc.property(fc.array(edits, { minLength: 1, maxLength: 15 }), (changes) => {
        let file = calculation(lines);
        for (const change of changes) {
          file = change(file);
          const fresh = createEngine();
          const results = fresh.evaluate(file, "");
          expect(engine.evaluate(file, "")).toEqual(results);
          expect(engine.present(file, results)).toEqual(fresh.present(file, results));
        }
      }),
      { ...runs, numRuns: 120 },
    );
  });
});

describe("dimensions of formulas of any shape", () => {
  /** The formula with x a length, y a mass and z a time. */
  const typed = (made: Made, scale: readonly number[]) => [
    `x = ${1.3 * (scale[0] ?? 1)} m`,
    `y = ${0.7 * (scale[1] ?? 1)} kg`,
    `z = ${2.9 * (scale[2] ?? 1)} s`,
    `r = ${written(made)}`,
  ];
  const resultOf = (made: Made, scale: readonly number[]) =>
    Object.values(resultsById(calculation(typed(made, scale)))).at(-1) as CellResult;
  const factor = fc.double({ min: 0.5, max: 2, noNaN: true });

  it("tell how a value scales with the base units", () => {
    let scaled = 0;
    fc.assert(
      fc.property(formulas, fc.tuple(factor, factor, factor), (made, scale) => {
        const [plain, other] = [resultOf(made, [1, 1, 1]), resultOf(made, scale)];
        if (plain.status === "error" && plain.error.code === "dimension") {
          expect(other).toMatchObject({ error: { code: "dimension" } });
        }
        if (plain.status !== "ok" || other.status !== "ok") return;
        if (!("si" in plain) || !("si" in other)) return;
        const { dimension } = plain.si;
        expect(other.si.dimension).toEqual(dimension);
        const power = (name: string) => {
          const [n = "0", d = "1"] = (dimension[name as "mass"] ?? "0").split("/");
          return Number(n) / Number(d);
        };
        const expected =
          scale[0] ** power("length") * scale[1] ** power("mass") * scale[2] ** power("time");
        const found = other.si.value / plain.si.value;
        if (Object.keys(dimension).length > 0) scaled += 1;
        if (plain.si.value !== 0) expect(Math.abs(found / expected - 1)).toBeLessThan(1e-9);
      }),
      { ...runs, numRuns: 2_000 },
    );
    expect(scaled).toBeGreaterThan(150);
  });
});

describe("a formula typed in other words", () => {
  const quantities = ["x = 1.3", "y = 0.7", "z = 2.9"];

  it("has the same value", () => {
    fc.assert(
      fc.property(formulas, (made) => {
        const text = written(made);
        const value = siOf([...quantities, `r = ${text}`]);
        expect(siOf([...quantities, `r = ${text.replaceAll(" * ", " × ")}`])).toBe(value);
        expect(siOf([...quantities, `r = (${text}) to percent`])).toBe(value);
        expect(siOf([...quantities, `f(x, y, z) = ${text}`, "r = f(x, y, z)"])).toBe(value);
        expect(siOf([...quantities, `h = ${text}`, "r = h"])).toBe(value);
      }),
      runs,
    );
  });
});
