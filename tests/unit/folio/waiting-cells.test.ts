import { describe, expect, it } from "vitest";
import { replaceCell } from "@/components/folio/edit-file";
import { waitingCells } from "@/components/folio/waiting-cells";
import type { CellPresentation } from "@/lib/schema";
import { file, given, relation } from "./a-calculation";

const shown = (usedBy: Record<string, string[]>): Record<string, CellPresentation> =>
  Object.fromEntries(
    Object.entries(usedBy).map(([id, by]) => [
      id,
      { line: "", uses: [], usedBy: by, constants: [] },
    ]),
  );

const chain = file(
  given("a", "M", 10),
  relation("b", "R", "2 M"),
  relation("c", "L", "R^2"),
  given("z", "q", 1),
);
const links = shown({ a: ["b"], b: ["c"], c: [], z: [] });

describe("the cells that wait for new values", () => {
  it("are none when nothing changed", () => {
    expect([...waitingCells(chain, chain, links)]).toEqual([]);
  });
  it("are the changed one and all that rest on it", () => {
    const next = replaceCell(chain, given("a", "M", 11));
    expect([...waitingCells(next, chain, links)].sort()).toEqual(["a", "b", "c"]);
  });
  it("are all under other constants", () => {
    const next = { ...chain, edition: "codata-2018" as const };
    expect(waitingCells(next, chain, links).size).toBe(4);
  });
  it("are found in a cycle without end", () => {
    const cycle = shown({ a: ["b"], b: ["a"], c: [], z: [] });
    const next = replaceCell(chain, given("a", "M", 11));
    expect([...waitingCells(next, chain, cycle)].sort()).toEqual(["a", "b"]);
  });
  it("are not those that a change of the title leaves alone", () => {
    expect(waitingCells({ ...chain, title: "Another" }, chain, links).size).toBe(0);
  });
});
