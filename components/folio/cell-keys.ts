import type { KeyboardEvent } from "react";
import type { CellActs } from "./use-cell-acts";

/** What each key does to the cell that has the focus; `keys.ts` tells people of them. */
const acts: Readonly<Record<string, (acts: CellActs, id: string) => void>> = {
  ArrowUp: (to, id) => to.step(id, -1),
  ArrowDown: (to, id) => to.step(id, 1),
  Enter: (to, id) => to.open(id),
  w: (to, id) => to.writeBelow(id),
  l: (to) => to.goToEnd(),
  u: (to, id) => to.move(id, -1),
  d: (to, id) => to.move(id, 1),
  c: (to, id) => to.duplicate(id),
  Delete: (to, id) => to.remove(id),
  "?": (to) => to.showKeys(),
};

/** Acts on a key that was pressed on a cell itself, not on something within it. */
export function onCellKey(event: KeyboardEvent<HTMLElement>, id: string, to: CellActs): void {
  if (event.target !== event.currentTarget) return;
  if (event.altKey || event.metaKey || event.ctrlKey) return;
  const act = acts[event.key];
  if (!act) return;
  event.preventDefault();
  act(to, id);
}
