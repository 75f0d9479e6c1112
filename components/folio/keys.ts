/** The keys of the folio, in the order in which the help shows them. */
export interface FolioKey {
  readonly keys: readonly string[];
  readonly does: string;
}

/**
 * Single letters act only while a cell has the focus, so that they meet neither typing nor the keys
 * of a browser or a screen reader; every act has a button too.
 */
export const folioKeys: readonly FolioKey[] = [
  { keys: ["Tab"], does: "go through the cells and what is in them" },
  { keys: ["↑", "↓"], does: "go to the cell above or below" },
  { keys: ["Enter"], does: "open the source of the cell; in the source line, finish it" },
  { keys: ["Esc"], does: "close the source; what was typed stays" },
  { keys: ["w"], does: "write a new cell below this one" },
  { keys: ["l"], does: "go to the empty last line" },
  { keys: ["u"], does: "move the cell up" },
  { keys: ["d"], does: "move the cell down" },
  { keys: ["c"], does: "copy the cell below itself" },
  { keys: ["Delete"], does: "delete the cell" },
  { keys: ["Ctrl + Z", "Ctrl + Shift + Z"], does: "undo and redo, outside a text field" },
  { keys: ["?"], does: "show these keys" },
];
