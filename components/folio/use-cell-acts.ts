"use client";

import { type Dispatch, type RefObject, useMemo, useRef } from "react";
import {
  duplicateCell,
  findCell,
  moveCellBy,
  moveCellTo,
  newCellId,
  removeCell,
  replaceCell,
} from "./edit-file";
import type { CellActs } from "./folio-cell";
import type { FolioAction, FolioState } from "./folio-state";
import { finishLine, systemOf } from "./line-edit";

function focusCell(id: string | undefined): void {
  if (id === undefined) return;
  // After the change has been drawn.
  requestAnimationFrame(() => document.getElementById(`cell-${id}`)?.focus());
}

/** The acts on cells, the same functions for the life of the folio so that cells are not redrawn. */
export function useCellActs(
  state: FolioState,
  dispatch: Dispatch<FolioAction>,
  newLine: RefObject<HTMLTextAreaElement | null>,
): CellActs {
  const latest = useRef(state);
  latest.current = state;
  return useMemo(() => {
    const file = () => latest.current.file;
    const edit = (next: FolioState["file"]) => dispatch({ type: "edit", file: next });
    const neighbour = (id: string, by: number) => {
      const at = file().cells.findIndex((cell) => cell.id === id);
      return file().cells[at + by]?.id;
    };
    return {
      hold: (id) => {
        if (latest.current.current !== id) dispatch({ type: "hold", id });
      },
      open: (id) => dispatch({ type: "open", id }),
      step: (id, by) => {
        const next = neighbour(id, by);
        if (next === undefined && by === 1) newLine.current?.focus();
        else focusCell(next);
      },
      move: (id, by) => {
        edit(moveCellBy(file(), id, by));
        focusCell(id);
      },
      moveTo: (id, before) => {
        const at = file().cells.findIndex((cell) => cell.id === before);
        edit(moveCellTo(file(), id, at));
      },
      duplicate: (id) => {
        const copy = newCellId(file());
        edit(duplicateCell(file(), id, copy));
        focusCell(copy);
      },
      remove: (id) => {
        const next = neighbour(id, 1) ?? neighbour(id, -1);
        edit(removeCell(file(), id));
        if (next === undefined) newLine.current?.focus();
        else focusCell(next);
      },
      writeBelow: (id) => {
        dispatch({ type: "hold", id });
        newLine.current?.focus();
      },
      replaceLine: (id, line) => {
        const cell = findCell(file(), id);
        dispatch({ type: "pend", id, line: undefined });
        if (cell) edit(replaceCell(file(), finishLine(cell, line, systemOf(file()))));
      },
    };
  }, [dispatch, newLine]);
}
