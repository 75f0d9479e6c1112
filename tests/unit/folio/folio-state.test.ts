import { describe, expect, it } from "vitest";
import { insertCell, removeCell, replaceCell } from "@/components/folio/edit-file";
import {
  type FolioAction,
  type FolioState,
  folioReducer,
  newLineKey,
  startFolio,
} from "@/components/folio/folio-state";
import { cellIdSchema } from "@/lib/schema";
import { draft, file, given, ids, relation } from "./a-calculation";

const start = file(given("a", "M", 10), relation("b", "L", "2 M"));
const begin = startFolio(draft(start, 7));
const played = (state: FolioState, ...actions: FolioAction[]) =>
  actions.reduce(folioReducer, state);

const M = (value: number) => given("a", "M", value);
const setM = (state: FolioState, value: number, quiet = false): FolioState =>
  played(state, { type: "edit", file: replaceCell(state.file, M(value)), quiet });

describe("undo", () => {
  it("brings a deleted cell back, and redo takes it away again", () => {
    const deleted = played(begin, { type: "edit", file: removeCell(start, "a") });
    const back = played(deleted, { type: "undo" });
    expect(back.file).toBe(start);
    expect(ids(played(back, { type: "redo" }).file)).toEqual(["b"]);
  });
  it("takes the keystrokes of one visit back as one step", () => {
    const typed = setM(setM(setM(begin, 1), 12, true), 123, true);
    expect(played(typed, { type: "undo" }).file).toBe(start);
  });
  it("does nothing at the beginning", () => {
    expect(played(begin, { type: "undo" })).toBe(begin);
    expect(played(begin, { type: "redo" })).toBe(begin);
  });
  it("has nothing to redo after a new change", () => {
    const state = setM(played(setM(begin, 1), { type: "undo" }), 2);
    expect(state.future).toEqual([]);
  });
  it("remembers two hundred steps, not all", () => {
    let state = begin;
    for (let value = 0; value < 250; value++) state = setM(state, value);
    expect(state.past).toHaveLength(200);
  });
  it("keeps what somebody else saved meanwhile", () => {
    const theirs = insertCell(start, given("t", "R", 3), "b");
    const merged = played(setM(begin, 1), { type: "stale", theirs: draft(theirs, 8) });
    expect(ids(played(merged, { type: "undo" }).file)).toEqual(["a", "b", "t"]);
    expect(played(merged, { type: "undo" }).file.cells[0]).toMatchObject({ value: 10 });
  });
});

describe("a draft that somebody saved first", () => {
  it("merges cells that only one side changed", () => {
    const theirs = replaceCell(start, relation("b", "L", "3 M"));
    const state = played(setM(begin, 20), { type: "stale", theirs: draft(theirs, 8) });
    expect(state.file.cells).toMatchObject([{ value: 20 }, { formula: "3 M" }]);
    expect(state.conflicts).toEqual([]);
    expect(state.base.revision).toBe(8);
  });
  it("asks about a cell that both changed, and meanwhile shows mine", () => {
    const state = played(setM(begin, 20), {
      type: "stale",
      theirs: draft(replaceCell(start, M(30)), 8),
    });
    expect(state.conflicts).toMatchObject([
      { cellId: "a", mine: { value: 20 }, theirs: { value: 30 } },
    ]);
    expect(state.file.cells[0]).toMatchObject({ value: 20 });
  });
  it("has no conflict left once it is settled", () => {
    const state = played(setM(begin, 20), {
      type: "stale",
      theirs: draft(replaceCell(start, M(30)), 8),
    });
    const [conflict] = state.conflicts;
    if (!conflict) throw new Error("there is no conflict to settle");
    const settled = played(state, { type: "settled", conflict, file: replaceCell(start, M(30)) });
    expect(settled.conflicts).toEqual([]);
    expect(settled.file.cells[0]).toMatchObject({ value: 30 });
  });
  it("follows a new cell whose id somebody else took first", () => {
    const mine = played(
      begin,
      { type: "edit", file: insertCell(start, given("n", "x", 1), null) },
      { type: "open", id: "n" },
      { type: "pend", id: "n", line: "x = 1 +" },
    );
    const theirs = draft(insertCell(start, given("n", "y", 2), null), 8);
    const state = played(mine, { type: "stale", theirs });
    const own = state.file.cells.find((cell) => "symbol" in cell && cell.symbol === "x");
    expect(own?.id).not.toBe("n");
    expect(state.open).toBe(own?.id);
    expect(state.pending).toEqual({ [own?.id ?? ""]: "x = 1 +" });
  });
});

describe("work that was kept in the browser", () => {
  const left = (value: number) => ({
    type: "restored" as const,
    base: start,
    file: replaceCell(start, M(value)),
    pending: { b: "L =" },
  });
  it("comes back merged with what is saved", () => {
    const server = startFolio(draft(replaceCell(start, relation("b", "L", "9 M")), 12));
    const state = played(server, left(99));
    expect(state.file.cells).toMatchObject([{ value: 99 }, { formula: "9 M" }]);
    expect(state.pending).toEqual({ b: "L =" });
    expect(state.base.revision).toBe(12);
  });
  it("is asked about where the saved draft changed the same cell", () => {
    const server = startFolio(draft(replaceCell(start, M(50)), 12));
    expect(played(server, left(99)).conflicts).toMatchObject([{ cellId: "a" }]);
  });
  it("of two tabs is all kept", () => {
    const other = {
      ...left(10),
      file: insertCell(start, given("z", "z", 5), null),
    };
    const state = played(begin, left(99), other);
    expect(state.file.cells).toMatchObject([{ value: 99 }, { id: "b" }, { id: "z" }]);
  });
  it("can be set aside by undo", () => {
    expect(played(begin, left(99), { type: "undo" }).file).toBe(start);
  });
});

describe("an unfinished line", () => {
  it("is kept by its cell until it is finished", () => {
    const state = played(begin, { type: "pend", id: "b", line: "L =" });
    expect(state.pending).toEqual({ b: "L =" });
    expect(played(state, { type: "pend", id: "b", line: undefined }).pending).toEqual({});
  });
  it("of a new cell is kept under a key that no cell can have", () => {
    expect(cellIdSchema.safeParse(newLineKey("a")).success).toBe(false);
    expect(cellIdSchema.safeParse(newLineKey(null)).success).toBe(false);
    expect(newLineKey("a")).not.toBe(newLineKey(null));
  });
});
