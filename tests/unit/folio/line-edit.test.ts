import { describe, expect, it } from "vitest";
import { asKind, finishLine, newCell, typeLine } from "@/components/folio/line-edit";
import type { Cell } from "@/lib/schema";
import { given, relation } from "./a-calculation";

const si = { edition: "codata-2022", em: "si" } as const;
const check: Cell = { id: "k", kind: "check", condition: "tau > 1" };
const text: Cell = { id: "t", kind: "text", markdown: "M = 10 Msun" };

describe("typing into a source line", () => {
  it("changes the cell as soon as the line can be read", () => {
    expect(typeLine(given("a", "M", 10), "M = 12 Msun", si)).toEqual({
      cell: { id: "a", kind: "given", symbol: "M", value: 12, unit: "Msun" },
    });
  });
  it("turns a given into a relation as names come in, and back", () => {
    expect(typeLine(given("a", "M", 10), "M = 2 R", si)).toMatchObject({
      cell: { kind: "relation", formula: "2 R" },
    });
    expect(typeLine(relation("a", "M", "2 R"), "M = 2 Msun", si)).toMatchObject({
      cell: { kind: "given", value: 2 },
    });
  });
  it("keeps a value off the middle of its interval while the interval stays", () => {
    const odd: Cell = { id: "z", kind: "given", symbol: "z", value: 0.012, interval: [0.01, 0.02] };
    expect(typeLine(odd, "z_1 = 0.01 .. 0.02", si)).toMatchObject({ cell: { value: 0.012 } });
    expect(typeLine(odd, "z_1 = 0.01 .. 0.03", si)).toMatchObject({ cell: { value: 0.02 } });
  });
  it("waits while the line says nothing", () => {
    expect(typeLine(relation("a", "L", "2 M"), "L =", si)).toEqual({ pending: "L =" });
    expect(typeLine(relation("a", "L", "2 M"), "", si)).toEqual({ pending: "" });
  });
  it("waits while a condition compares nothing", () => {
    expect(typeLine(check, "tau", si)).toEqual({ pending: "tau" });
    expect(typeLine(check, "tau > 3", si)).toMatchObject({ cell: { condition: "tau > 3" } });
  });
  it("keeps a faulty formula in the cell, for the engine to tell the fault", () => {
    expect(typeLine(relation("a", "L", "2 M"), "L = 2 *", si)).toMatchObject({
      cell: { kind: "relation", formula: "2 *" },
    });
  });
});

describe("finishing a line", () => {
  it("makes the kind that the line reads as", () => {
    expect(finishLine(check, "just a remark on the flow", si).kind).toBe("text");
  });
  it("leaves the cell where the line is blank", () => {
    expect(finishLine(check, "  ", si)).toBe(check);
  });
  it("keeps what the line does not show", () => {
    const sourced: Cell = { ...given("a", "M", 10, "Msun"), source: "THX catalogue" };
    expect(finishLine(sourced, "M = 11 Msun", si)).toMatchObject({ source: "THX catalogue" });
  });
});

describe("the empty line", () => {
  it.each([
    ["M = 10 Msun", "given"],
    ["L = 4 pi G M m_p c / sigma_T", "relation"],
    ["L > 1e38 erg/s", "check"],
    ["The flow is optically thick.", "text"],
  ])("makes %s a %s", (line, kind) => {
    expect(newCell(line, "n", si)).toMatchObject({ id: "n", kind });
  });
  it("makes nothing of blanks", () => {
    expect(newCell("   ", "n", si)).toBeUndefined();
  });
});

describe("a change of kind", () => {
  it("keeps the words", () => {
    expect(asKind(text, "given", si)).toMatchObject({ kind: "given", value: 10, unit: "Msun" });
    expect(asKind(check, "text", si)).toMatchObject({ kind: "text", markdown: "tau > 1" });
    expect(asKind(relation("a", "L", "2 M"), "text", si)).toMatchObject({ markdown: "L = 2 M" });
  });
  it("keeps the id", () => {
    for (const kind of ["given", "relation", "check", "text"] as const) {
      expect(asKind(check, kind, si)).toMatchObject({ id: "k", kind });
    }
  });
});
