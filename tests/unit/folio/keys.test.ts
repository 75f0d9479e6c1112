import type { KeyboardEvent } from "react";
import { describe, expect, it } from "vitest";
import { onCellKey } from "@/components/folio/cell-keys";
import { folioKeys } from "@/components/folio/keys";
import type { CellActs } from "@/components/folio/use-cell-acts";

/** Acts that only say which of them was asked for. */
function acts() {
  const asked: string[] = [];
  const to = new Proxy({} as CellActs, {
    get: (_, name) => () => asked.push(String(name)),
  });
  return { asked, to };
}

function press(key: string, more: Partial<KeyboardEvent<HTMLElement>> = {}) {
  const { asked, to } = acts();
  const cell = {} as HTMLElement;
  let isTaken = false;
  const event = {
    key,
    target: cell,
    currentTarget: cell,
    preventDefault: () => {
      isTaken = true;
    },
    ...more,
  } as unknown as KeyboardEvent<HTMLElement>;
  onCellKey(event, "a", to);
  return { asked, isTaken };
}

const typed: Record<string, string> = { "↑": "ArrowUp", "↓": "ArrowDown" };
/** Keys that the browser or the source line act upon, not the cell. */
const others = ["Tab", "Esc", "Ctrl + Z", "Ctrl + Shift + Z"];
const told = folioKeys.flatMap(({ keys }) => keys).filter((key) => !others.includes(key));

describe("the keys of the folio", () => {
  it("are each told once", () => {
    const all = folioKeys.flatMap(({ keys }) => keys);
    expect(new Set(all).size).toBe(all.length);
  });
  it.each(told)("act on the cell: %s", (key) => {
    const { asked, isTaken } = press(typed[key] ?? key);
    expect(asked).toHaveLength(1);
    expect(isTaken).toBe(true);
  });
  it.each(told)("leave %s to the browser with Ctrl, Alt or Meta", (key) => {
    for (const modifier of ["ctrlKey", "altKey", "metaKey"]) {
      expect(press(typed[key] ?? key, { [modifier]: true })).toEqual({ asked: [], isTaken: false });
    }
  });
  it("do nothing while something within the cell has the focus", () => {
    expect(press("d", { target: {} as EventTarget })).toEqual({ asked: [], isTaken: false });
  });
});
