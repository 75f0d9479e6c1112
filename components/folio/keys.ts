/** The keys of the folio, in the order in which the help shows them. */
export interface FolioKey {
  readonly keys: readonly string[];
  readonly does: string;
}

export const folioKeys: readonly FolioKey[] = [
  { keys: ["↑", "↓"], does: "go to the cell above or below" },
  { keys: ["Enter"], does: "open the source line of the cell in hand; in it, finish" },
  { keys: ["Esc"], does: "close the source line" },
  { keys: ["n"], does: "write a new cell below the one in hand" },
  { keys: ["Shift + ↑", "Shift + ↓"], does: "move the cell up or down" },
  { keys: ["d"], does: "duplicate the cell" },
  { keys: ["Delete"], does: "delete the cell" },
  { keys: ["Ctrl + Z", "Ctrl + Shift + Z"], does: "undo, redo (outside a text field)" },
  { keys: ["End"], does: "go to the empty last line" },
  { keys: ["?"], does: "show these keys" },
];
