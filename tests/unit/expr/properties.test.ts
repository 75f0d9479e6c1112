import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { createEngine } from "@/lib/expr";
import { cellLine, readEntry } from "@/lib/expr/entry";
import { parseUnit } from "@/lib/physics";
import { type CalculationFile, type Cell, errorCodes, type RelationResult } from "@/lib/schema";
import { calculation } from "./calculations";

const system = { edition: "codata-2018", em: "si" } as const;
const runs = { numRuns: 150, seed: 20261201 };

/** Units of one dimension each, to type one quantity in different ways. */
const lengths = ["m", "cm", "km", "Rsun", "au", "pc", "angstrom"];
const masses = ["g", "kg", "Msun", "Mearth", "u"];
const times = ["s", "yr", "hr", "day", "Myr"];
const relations = [
  "x = G A / B^2",
  "x = sqrt(G A / B^3) C",
  "x = A B^2 / C^2",
  "x = 4 pi B^2 sigma_SB (300 K)^4",
  "x = B / (c C) + exp(-B / (c C))",
  "x = integrate(A t / C^2, t, 0 m, B)",
];

function inUnit(value: number, from: string, to: string): number {
  const [a, b] = [parseUnit(from, system), parseUnit(to, system)];
  return a.ok && b.ok ? (value * a.factor) / b.factor : Number.NaN;
}

const givens = (values: readonly [string, number, string][]): Cell[] =>
  values.map(([symbol, value, unit], i) => ({ id: `g${i}`, kind: "given", symbol, value, unit }));

function withRelation(cells: readonly Cell[], line: string): CalculationFile {
  const relation = { ...readEntry(line, system), id: "r" } as Cell;
  return {
    format: "leading-order/1",
    title: "",
    edition: "codata-2018",
    cells: [...cells, relation],
  };
}

const relationOf = (file: CalculationFile) =>
  createEngine().evaluate(file, "").cells.r as RelationResult;

describe("a result", () => {
  it("does not depend on the units its inputs are typed in", () => {
    const value = fc.double({ min: 0.1, max: 100, noNaN: true });
    const pick = (units: readonly string[]) => fc.constantFrom(...units);
    fc.assert(
      fc.property(
        value,
        value,
        value,
        pick(masses),
        pick(lengths),
        pick(times),
        fc.constantFrom(...relations),
        (a, b, c, m, l, t, line) => {
          const plain = relationOf(
            withRelation(
              givens([
                ["A", a, "kg"],
                ["B", b, "m"],
                ["C", c, "s"],
              ]),
              line,
            ),
          );
          const typed = relationOf(
            withRelation(
              givens([
                ["A", inUnit(a, "kg", m), m],
                ["B", inUnit(b, "m", l), l],
                ["C", inUnit(c, "s", t), t],
              ]),
              line,
            ),
          );
          expect(typed.status).toBe(plain.status);
          if (plain.status === "ok") {
            expect(typed.si.dimension).toEqual(plain.si.dimension);
            expect(Math.abs(typed.si.value / plain.si.value - 1)).toBeLessThan(1e-11);
          }
        },
      ),
      runs,
    );
  });
});

describe("inferred dimensions", () => {
  const dimensionOf = (line: string) => {
    const result = relationOf(
      withRelation(
        givens([
          ["A", 2, "kg"],
          ["B", 3, "m"],
          ["C", 5, "s"],
        ]),
        line,
      ),
    );
    return result.status === "ok" ? result.si.dimension : undefined;
  };

  it("agree with how the value scales when the base units are scaled", () => {
    const scale = fc.double({ min: 1.5, max: 9, noNaN: true });
    fc.assert(
      fc.property(
        scale,
        scale,
        scale,
        fc.constantFrom(
          "A B / C^2",
          "sqrt(A B^3) / C",
          "A^2 / (A B^(1/2)) C",
          "cbrt(A) B^2 - 3 cbrt(A) B^2",
          "hypot(A, 2 A) C^-3",
        ),
        (m, l, t, formula) => {
          const scaled = relationOf(
            withRelation(
              givens([
                ["A", 2 * m, "kg"],
                ["B", 3 * l, "m"],
                ["C", 5 * t, "s"],
              ]),
              `x = ${formula}`,
            ),
          );
          const plain = relationOf(
            withRelation(
              givens([
                ["A", 2, "kg"],
                ["B", 3, "m"],
                ["C", 5, "s"],
              ]),
              `x = ${formula}`,
            ),
          );
          const exponent = (quantity: string) => {
            const [n = "0", d = "1"] = (dimensionOf(`x = ${formula}`)?.[quantity] ?? "0").split(
              "/",
            );
            return Number(n) / Number(d);
          };
          const expected = m ** exponent("mass") * l ** exponent("length") * t ** exponent("time");
          expect(scaled.si.value / plain.si.value / expected).toBeCloseTo(1, 10);
        },
      ),
      runs,
    );
  });
});

describe("a given's line", () => {
  const value = fc.double({ min: 1e-30, max: 1e30, noNaN: true });
  const small = fc.double({ min: 1e-3, max: 0.9, noNaN: true });
  const unit = fc.constantFrom("", "Msun", "erg s^-1 cm^-2", "km/s", "gauss");
  const form = fc.oneof(
    fc.constant({}),
    small.map((share) => ({ share })),
    small.map((dex) => ({ dex })),
    fc.double({ min: 1.1, max: 9, noNaN: true }).map((factor) => ({ factor })),
  );

  it("comes back from the cell it makes", () => {
    fc.assert(
      fc.property(value, unit, form, (v, u, f) => {
        const spread = "share" in f ? { uncertainty: v * f.share } : f;
        const cell = {
          id: "g",
          kind: "given",
          symbol: "x_1",
          value: v,
          ...spread,
          ...(u ? { unit: u } : {}),
        } as Cell;
        expect({ ...readEntry(cellLine(cell), system), id: "g" }).toEqual(cell);
      }),
      { ...runs, numRuns: 500 },
    );
  });
});

describe("whatever is typed", () => {
  const words = [
    "M",
    "x",
    "sigma_T",
    "sin(",
    "(",
    ")",
    "^2",
    "²",
    "+",
    "-",
    "*",
    "/",
    "3",
    "1e400",
    "erg",
    "to",
    "=",
    ",",
    "?",
    ":",
    "%",
    "!",
    "integrate(",
    "σ",
    " ",
    "'",
    "[",
    "and",
    "<",
    "root(x, x, 0, 1)",
  ];
  const text = fc.oneof(
    fc.string(),
    fc.string({ unit: "grapheme" }),
    fc.array(fc.constantFrom(...words), { maxLength: 25 }).map((parts) => parts.join("")),
  );

  it("throws nothing and ends in a value or one of the listed codes", () => {
    const engine = createEngine();
    fc.assert(
      fc.property(text, text, text, (formula, symbol, unit) => {
        const cells: Cell[] = [
          { id: "a", kind: "relation", symbol: "x", formula },
          { id: "b", kind: "relation", symbol, formula: "2 x", unit },
          { id: "c", kind: "check", condition: formula },
          { id: "d", kind: "given", symbol, value: 1, unit },
        ];
        const file: CalculationFile = {
          format: "leading-order/1",
          title: "",
          edition: "codata-2022",
          cells,
        };
        const results = engine.evaluate(file, "");
        engine.present(file, results);
        for (const result of Object.values(results.cells)) {
          if (result.status === "error") {
            expect(errorCodes).toContain(result.error.code);
            expect(result.error.message.length).toBeGreaterThan(10);
          }
        }
      }),
      { ...runs, numRuns: 1_500 },
    );
  });

  it("becomes a cell whose line makes the same cell", () => {
    fc.assert(
      fc.property(text, (line) => {
        const cell = { ...readEntry(line, system), id: "c" } as Cell;
        if (cell.kind === "given") return;
        expect({ ...readEntry(cellLine(cell), system), id: "c" }).toEqual(cell);
      }),
      { ...runs, numRuns: 600 },
    );
  });
});

describe("an engine that remembers", () => {
  const lines = [
    "A = 2 kg",
    "B = 3 m",
    "C = 5.0(2) s",
    "v = B / C",
    "E = A v^2 / 2",
    "f(x) = x^2 + v^2",
    "w = sqrt(f(2 m/s))",
    "E > 1 erg",
    "p = A v",
  ];
  const edits = fc.array(
    fc.tuple(
      fc.nat(lines.length - 1),
      fc.constantFrom(
        "A = 4 kg",
        "B = 7 km",
        "C = 5 s",
        "v = 2 B / C",
        "v = B",
        "E = A v",
        "f(x) = x + v",
        "w = f(3 m/s)",
        "x < 2",
        "G = 2",
        "m = 3",
        "p = A v m",
      ),
    ),
    { minLength: 1, maxLength: 12 },
  );

  it("answers as a fresh one does, after any edits and in any order of cells", () => {
    const engine = createEngine();
    fc.assert(
      fc.property(edits, fc.boolean(), (changes, reverse) => {
        const current = [...lines];
        for (const [at, line] of changes) {
          current[at] = line;
          const file = calculation(current);
          const ordered = reverse ? { ...file, cells: [...file.cells].reverse() } : file;
          expect(engine.evaluate(ordered, "")).toEqual(createEngine().evaluate(ordered, ""));
        }
      }),
      { ...runs, numRuns: 60 },
    );
  });
});
