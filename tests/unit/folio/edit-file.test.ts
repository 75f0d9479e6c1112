import fc from "fast-check";
import { describe, expect, it } from "vitest";
import {
  duplicateCell,
  insertCell,
  moveCellBy,
  moveCellTo,
  newCellId,
  removeCell,
  replaceCell,
} from "@/components/folio/edit-file";
import { cellIdSchema } from "@/lib/schema";
import { file, given, ids, relation } from "./a-calculation";

const abc = file(given("a", "M", 10), given("b", "R", 3), relation("c", "L", "M R"));

describe("an edit of a calculation", () => {
  it("puts a cell behind another one", () => {
    expect(ids(insertCell(abc, given("n", "x", 1), "a"))).toEqual(["a", "n", "b", "c"]);
  });
  it("puts a cell at the end without one, or behind one that is gone", () => {
    expect(ids(insertCell(abc, given("n", "x", 1), null))).toEqual(["a", "b", "c", "n"]);
    expect(ids(insertCell(abc, given("n", "x", 1), "gone"))).toEqual(["a", "b", "c", "n"]);
  });
  it("moves a cell up, down and not beyond the ends", () => {
    expect(ids(moveCellBy(abc, "b", -1))).toEqual(["b", "a", "c"]);
    expect(ids(moveCellBy(abc, "b", 1))).toEqual(["a", "c", "b"]);
    expect(ids(moveCellBy(abc, "c", 5))).toEqual(["a", "b", "c"]);
    expect(ids(moveCellBy(abc, "gone", 1))).toEqual(["a", "b", "c"]);
  });
  it("takes the symbol of a copy further, since each is defined once", () => {
    const twice = duplicateCell(duplicateCell(abc, "a", "a2"), "a", "a3");
    const symbols = twice.cells.map((cell) => "symbol" in cell && cell.symbol);
    expect(symbols).toEqual(["M", "M_3", "M_2", "R", "L"]);
  });
  it("keeps the parameters of a copied function", () => {
    const f = file(relation("f", "f(x, y)", "x + y"));
    expect(duplicateCell(f, "f", "g").cells[1]).toMatchObject({ symbol: "f_2(x, y)" });
  });
  it("replaces one cell and leaves the others the same objects", () => {
    const next = replaceCell(abc, given("b", "R", 4));
    expect(next.cells[0]).toBe(abc.cells[0]);
    expect(next.cells[1]).toMatchObject({ value: 4 });
  });
  it("never changes the file it was given", () => {
    const before = JSON.stringify(abc);
    removeCell(moveCellTo(duplicateCell(abc, "a", "z"), "z", 0), "b");
    expect(JSON.stringify(abc)).toBe(before);
  });
  it("comes back to the same order when a move is reversed", () => {
    const place = fc.integer({ min: 0, max: 2 });
    fc.assert(
      fc.property(place, place, (from, to) => {
        const id = ids(abc)[from] ?? "";
        expect(moveCellTo(moveCellTo(abc, id, to), id, from)).toEqual(abc);
      }),
    );
  });
});

describe("a new cell id", () => {
  it("is one that the schema takes", () => {
    expect(cellIdSchema.safeParse(newCellId(abc)).success).toBe(true);
  });
  it("is not one that a cell has", () => {
    const rolls = [0, 0, 0, 0, 0, 0, 0.5, 0.5, 0.5, 0.5, 0.5, 0.5];
    const taken = file(given("caaaaaa", "x", 1));
    expect(newCellId(taken, () => rolls.shift() ?? 0)).not.toBe("caaaaaa");
  });
});
