import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { type Conflict, merge, sameValue, settle } from "@/lib/calculations/merge";
import type { CalculationFile, Cell } from "@/lib/schema";

/** `file("a:1 b:2")` has two text cells, a and b, that say “1” and “2”. */
function file(cells: string, rest: Partial<CalculationFile> = {}): CalculationFile {
  const texts = cells
    .split(" ")
    .filter(Boolean)
    .map((word): Cell => {
      const [id = "", markdown = ""] = word.split(":");
      return { id, kind: "text", markdown };
    });
  return { format: "leading-order/1", title: "T", edition: "codata-2022", cells: texts, ...rest };
}

const inWords = (merged: CalculationFile) =>
  merged.cells.map((cell) => `${cell.id}:${cell.kind === "text" ? cell.markdown : "?"}`).join(" ");

const merged = (base: string, mine: string, theirs: string) =>
  merge(file(base), file(mine), file(theirs));

describe("merge of cells", () => {
  it.each([
    ["changes to different cells", "a:1 b:1", "a:2 b:1", "a:1 b:2", "a:2 b:2"],
    ["the same change twice", "a:1", "a:2", "a:2", "a:2"],
    ["additions in different places", "a:1 b:1", "a:1 x:1 b:1", "a:1 b:1 y:1", "a:1 x:1 b:1 y:1"],
    ["an addition at the top", "a:1", "x:1 a:1", "a:2", "x:1 a:2"],
    ["a removal and a change elsewhere", "a:1 b:1", "b:1", "a:1 b:2", "b:2"],
    ["a removal by both", "a:1 b:1", "b:1", "b:1", "b:1"],
    ["a move and a change", "a:1 b:1 c:1", "c:1 a:1 b:1", "a:1 b:2 c:1", "c:1 a:1 b:2"],
    ["their move and my addition", "a:1 b:1", "a:1 x:1 b:1", "b:1 a:1", "b:1 a:1 x:1"],
    ["their removal next to my addition", "a:1 b:1", "a:1 x:1 b:1", "b:1", "x:1 b:1"],
  ])("takes %s", (_title, base, mine, theirs, expected) => {
    const outcome = merged(base, mine, theirs);
    expect(outcome.conflicts).toEqual([]);
    expect(inWords(outcome.file)).toBe(expected);
  });

  it("asks about a cell that both changed differently, and shows both texts", () => {
    const outcome = merged("a:1 b:1", "a:2 b:1", "a:3 b:1");
    expect(outcome.conflicts).toMatchObject([
      { cellId: "a", base: { markdown: "1" }, mine: { markdown: "2" }, theirs: { markdown: "3" } },
    ]);
  });

  it.each([
    ["mine", "a:1", "", "a:2"],
    ["theirs", "a:1", "a:2", ""],
  ])("keeps a cell that %s removed while the other changed it, and asks", (_who, ...sides) => {
    const [base = "", mine = "", theirs = ""] = sides;
    const outcome = merged(base, mine, theirs);
    expect(outcome.conflicts).toHaveLength(1);
    expect(inWords(outcome.file)).toBe("a:2");
  });

  it("keeps both of two cells that were added under one id", () => {
    const outcome = merged("a:1", "a:1 x:mine", "a:1 x:theirs");
    expect(outcome.conflicts).toEqual([]);
    expect(outcome.renamed).toEqual({ x: "x-2" });
    expect(inWords(outcome.file).split(" ").sort()).toEqual(["a:1", "x-2:mine", "x:theirs"]);
  });
});

describe("merge of the rest", () => {
  it("takes a new title from one and a new edition from the other", () => {
    const outcome = merge(
      file("a:1"),
      file("a:1", { title: "Mine" }),
      file("a:1", { edition: "codata-2018" }),
    );
    expect(outcome).toMatchObject({
      conflicts: [],
      file: { title: "Mine", edition: "codata-2018" },
    });
  });

  it("asks about a field that both changed, also one that was not there", () => {
    const outcome = merge(file(""), file("", { em: "si" }), file("", { em: "gaussian" }));
    expect(outcome.conflicts).toEqual([
      { field: "em", base: null, mine: "si", theirs: "gaussian" },
    ]);
  });

  it("does not mind the order of keys", () => {
    const cell = { id: "a", kind: "text", markdown: "1" } as const;
    const turned = { markdown: "1", kind: "text", id: "a" } as const;
    expect(sameValue(cell, turned)).toBe(true);
    expect(sameValue(cell, { ...cell, note: undefined })).toBe(true);
    expect(sameValue(cell, [cell])).toBe(false);
  });
});

describe("settle", () => {
  const decide = (base: string, mine: string, theirs: string, side: "mine" | "theirs") => {
    const outcome = merged(base, mine, theirs);
    return inWords(settle(outcome.file, outcome.conflicts[0] as Conflict, side));
  };

  it("takes the side that was chosen", () => {
    expect(decide("a:1 b:1", "a:2 b:1", "a:3 b:1", "mine")).toBe("a:2 b:1");
    expect(decide("a:1 b:1", "a:2 b:1", "a:3 b:1", "theirs")).toBe("a:3 b:1");
    expect(decide("a:1 b:1", "b:1", "a:3 b:1", "mine")).toBe("b:1");
  });

  it("removes a field that the chosen side does not have", () => {
    const outcome = merge(file("", { abstract: "1" }), file(""), file("", { abstract: "2" }));
    const settled = settle(outcome.file, outcome.conflicts[0] as Conflict, "mine");
    expect("abstract" in settled).toBe(false);
  });
});

const ids = ["a", "b", "c", "d", "e", "f"];
const words = fc.constantFrom("1", "2", "3");
/** Any order of some of six cells, each saying one of three things. */
const cells = fc
  .shuffledSubarray(ids)
  .chain((order) => fc.tuple(...order.map((id) => words.map((word) => `${id}:${word}`))))
  .map((parts) => parts.join(" "));

const textsOf = (side: CalculationFile) =>
  new Set(side.cells.map((cell) => (cell.kind === "text" ? cell.markdown : "")));

describe("the laws of merge", () => {
  it("takes the only change there is", () => {
    fc.assert(
      fc.property(cells, cells, (base, other) => {
        expect(inWords(merged(base, other, base).file)).toBe(other);
        expect(inWords(merged(base, base, other).file)).toBe(other);
        expect(inWords(merged(base, other, other).file)).toBe(other);
      }),
    );
  });

  it("merges edits of different cells without asking, and loses neither", () => {
    const which = fc.array(fc.constantFrom("mine", "theirs", "none"), {
      minLength: 6,
      maxLength: 6,
    });
    fc.assert(
      fc.property(which, (editors) => {
        const base = file(ids.map((id) => `${id}:old`).join(" "));
        const by = (who: string) =>
          file(ids.map((id, i) => `${id}:${editors[i] === who ? who : "old"}`).join(" "));
        const outcome = merge(base, by("mine"), by("theirs"));
        expect(outcome.conflicts).toEqual([]);
        const expected = ids.map((id, i) => `${id}:${editors[i] === "none" ? "old" : editors[i]}`);
        expect(inWords(outcome.file)).toBe(expected.join(" "));
      }),
    );
  });

  it("drops nothing: every new text is in the merged file or in a conflict", () => {
    fc.assert(
      fc.property(cells, cells, cells, (b, m, t) => {
        const [base, mine, theirs] = [
          file(b),
          file(m.replaceAll(/(\d)/g, "m$1")),
          file(t.replaceAll(/(\d)/g, "t$1")),
        ];
        const outcome = merge(base, mine, theirs);
        const found = new Set(textsOf(outcome.file));
        for (const conflict of outcome.conflicts)
          for (const side of [conflict.mine, conflict.theirs])
            if (side && typeof side === "object" && side.kind === "text") found.add(side.markdown);
        for (const text of [...textsOf(mine), ...textsOf(theirs)]) expect(found).toContain(text);
      }),
    );
  });

  it("keeps ids unique", () => {
    fc.assert(
      fc.property(cells, cells, cells, (b, m, t) => {
        const found = merged(b, m, t).file.cells.map((cell) => cell.id);
        expect(new Set(found).size).toBe(found.length);
      }),
    );
  });

  it("finds the same conflicts from either side", () => {
    fc.assert(
      fc.property(cells, cells, cells, (b, m, t) => {
        const about = (outcome: ReturnType<typeof merged>) =>
          outcome.conflicts.map((c) => ("cellId" in c ? c.cellId : c.field)).sort();
        expect(about(merged(b, m, t))).toEqual(about(merged(b, t, m)));
      }),
    );
  });
});
