import { describe, expect, it } from "vitest";
import { applySuggestion, diagnosticsOf } from "@/components/folio/diagnostics";
import type { Cell, CellError, CellResult, Notice } from "@/lib/schema";

const failed = (error: Omit<CellError, "code" | "message">, notices?: Notice[]): CellResult => ({
  kind: "relation",
  status: "error",
  error: { code: "unknown-name", message: "There is no x.", ...error },
  ...(notices ? { notices } : {}),
});

const L: Cell = { id: "r", kind: "relation", symbol: "L", formula: "4 pi x", unit: "erg/s" };
/** The characters that a fault marks in the line. */
const marked = (cell: Cell, result: CellResult, line?: string) =>
  diagnosticsOf(cell, result, line).map((one) =>
    (line ?? "L = 4 pi x to erg/s").slice(one.from, one.to),
  );

describe("a fault in a source line", () => {
  it("is marked where the formula stands in the line", () => {
    expect(marked(L, failed({ field: "formula", from: 5, to: 6 }))).toEqual(["x"]);
  });
  it("is marked where it was typed, whatever the blanks", () => {
    const fault = failed({ field: "formula", from: 5, to: 6 });
    expect(marked(L, fault, "L=4 pi x to erg/s")).toEqual(["x"]);
    expect(marked(L, fault, "  L   =   4 pi x   to erg/s")).toEqual(["x"]);
  });
  it("of the unit is marked at the unit", () => {
    const fault = failed({ field: "unit", from: 0, to: 3 });
    expect(marked(L, fault)).toEqual(["erg"]);
    expect(marked(L, fault, "L=4 pi x  to  erg/s")).toEqual(["erg"]);
  });
  it("looks for the formula behind the sign, not in the symbol", () => {
    const cell: Cell = { id: "r", kind: "relation", symbol: "x_2", formula: "x" };
    const fault = failed({ field: "formula", from: 0, to: 1 });
    expect(diagnosticsOf(cell, fault, "x_2=x")).toMatchObject([{ from: 4, to: 5 }]);
  });
  it("of a given's unit is marked behind its value", () => {
    const cell: Cell = { id: "g", kind: "given", symbol: "M", value: 10, unit: "Msum" };
    const fault = failed({ field: "unit", from: 0, to: 4 });
    expect(marked(cell, fault, "M = 10 Msum")).toEqual(["Msum"]);
    expect(marked(cell, fault, "M=10 Msum")).toEqual(["Msum"]);
  });
  it("of a condition is marked in the condition", () => {
    const cell: Cell = { id: "k", kind: "check", condition: "tau > y" };
    expect(marked(cell, failed({ from: 6, to: 7 }), "tau > y")).toEqual(["y"]);
  });
  it("without a place is marked to the end", () => {
    expect(marked(L, failed({}))).toEqual(["4 pi x to erg/s"]);
  });
  it("never lies outside the line", () => {
    const found = diagnosticsOf(L, failed({ field: "formula", from: 400, to: 900 }), "L = 4");
    for (const one of found) {
      expect(one.from).toBeLessThanOrEqual(5);
      expect(one.to).toBeLessThanOrEqual(5);
    }
  });
  it("stands beside the notices of the cell", () => {
    const notice: Notice = { code: "hides", level: "warning", message: "It hides a unit." };
    const found = diagnosticsOf(L, failed({ field: "formula", from: 5, to: 6 }, [notice]));
    expect(found.map((one) => one.severity)).toEqual(["error", "warning"]);
  });
});

describe("a suggestion", () => {
  it("takes the place of the marked characters", () => {
    const [fault] = diagnosticsOf(
      L,
      failed({ field: "formula", from: 5, to: 6, suggestion: "x_0" }),
    );
    if (!fault) throw new Error("there is no fault");
    expect(applySuggestion("L = 4 pi x to erg/s", fault)).toBe("L = 4 pi x_0 to erg/s");
  });
  it("that is not there changes nothing", () => {
    const fault = { from: 0, to: 1, severity: "error", message: "" } as const;
    expect(applySuggestion("L = 4", fault)).toBe("L = 4");
  });
});
