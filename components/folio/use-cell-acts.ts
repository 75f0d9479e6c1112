"use client";

import { type Dispatch, useMemo, useRef } from "react";
import {
  duplicateCell,
  findCell,
  moveCellBy,
  moveCellTo,
  newCellId,
  removeCell,
  replaceCell,
} from "./edit-file";
import { focusCell } from "./focus-cell";
import type { FolioAction, FolioState } from "./folio-state";
import { finishLine, systemOf } from "./line-edit";
import { lastLineId } from "./new-line";

/** What can be done to a cell; the same acts by mouse and by keyboard. */
export interface CellActs {
  hold(id: string): void;
  open(id: string): void;
  close(id: string): void;
  step(id: string, by: -1 | 1): void;
  move(id: string, by: -1 | 1): void;
  moveTo(id: string, before: string): void;
  duplicate(id: string): void;
  remove(id: string): void;
  writeBelow(id: string): void;
  goToEnd(): void;
  showKeys(): void;
  replaceLine(id: string, line: string): void;
}

/** The caret to the empty last line. */
export function focusLastLine(): void {
  document.getElementById(lastLineId)?.focus();
}

/** The acts that change the order or the number of cells. */
function structuralActs(file: () => FolioState["file"], edit: (next: FolioState["file"]) => void) {
  const neighbour = (id: string, by: number) => {
    const at = file().cells.findIndex((cell) => cell.id === id);
    return at < 0 ? undefined : file().cells[at + by]?.id;
  };
  return {
    step: (id: string, by: -1 | 1) => {
      const next = neighbour(id, by);
      if (next === undefined && by === 1) focusLastLine();
      else focusCell(next);
    },
    move: (id: string, by: -1 | 1) => {
      if (neighbour(id, by) === undefined) return;
      edit(moveCellBy(file(), id, by));
      focusCell(id);
    },
    moveTo: (id: string, before: string) => {
      if (id === before || !findCell(file(), id)) return;
      edit(
        moveCellTo(
          file(),
          id,
          file().cells.findIndex((cell) => cell.id === before),
        ),
      );
      focusCell(id);
    },
    duplicate: (id: string) => {
      const copy = newCellId(file());
      edit(duplicateCell(file(), id, copy));
      focusCell(copy);
    },
    remove: (id: string) => {
      const next = neighbour(id, 1) ?? neighbour(id, -1);
      edit(removeCell(file(), id));
      if (next === undefined) focusLastLine();
      else focusCell(next);
    },
  };
}

/** The acts on cells, the same functions for the life of the folio so that cells are not redrawn. */
export function useCellActs(
  state: FolioState,
  dispatch: Dispatch<FolioAction>,
  showKeys: () => void,
): CellActs {
  const latest = useRef(state);
  latest.current = state;
  const show = useRef(showKeys);
  show.current = showKeys;
  return useMemo(() => {
    const file = () => latest.current.file;
    const edit = (next: FolioState["file"]) => dispatch({ type: "edit", file: next });
    return {
      ...structuralActs(file, edit),
      hold: (id) => {
        if (latest.current.current !== id) dispatch({ type: "hold", id });
      },
      open: (id) => dispatch({ type: "open", id }),
      close: (id) => {
        dispatch({ type: "open", id: null });
        focusCell(id);
      },
      writeBelow: (id) => dispatch({ type: "write", below: id }),
      goToEnd: focusLastLine,
      showKeys: () => show.current(),
      replaceLine: (id, line) => {
        const cell = findCell(file(), id);
        dispatch({ type: "pend", id, line: undefined });
        if (cell) edit(replaceCell(file(), finishLine(cell, line, systemOf(file()))));
      },
    };
  }, [dispatch]);
}
