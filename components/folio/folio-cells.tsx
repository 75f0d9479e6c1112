"use client";

import { Fragment, useMemo, useRef } from "react";
import type { CalculationFile, CellPresentation } from "@/lib/schema";
import { insertCell, newCellId } from "./edit-file";
import { focusCell } from "./focus-cell";
import { FolioCell } from "./folio-cell";
import { useFolio } from "./folio-context";
import { newLineKey } from "./folio-state";
import { newCell, systemOf } from "./line-edit";
import { NewLine } from "./new-line";
import { Thread } from "./thread";
import { type CellActs, focusLastLine } from "./use-cell-acts";
import { waitingCells } from "./waiting-cells";

const nothing: readonly string[] = [];
const nothingShown: Readonly<Record<string, CellPresentation>> = {};

/** The column of cells, with the thread beside it and the empty line at its end. */
export function FolioCells({ evaluated, acts }: { evaluated: CalculationFile; acts: CellActs }) {
  const { state, dispatch, answer, edit } = useFolio();
  const { file, current, open, writingBelow, pending } = state;
  const column = useRef<HTMLDivElement>(null);
  const shown = answer.presentation?.cells ?? nothingShown;
  const waiting = useMemo(() => waitingCells(file, evaluated, shown), [file, evaluated, shown]);
  const { edition, em = "si" } = file;
  // The same object while it says the same, so that cells are not redrawn.
  const system = useMemo(() => ({ edition, em }), [edition, em]);
  const inHand = current === null ? undefined : shown[current];

  const write = (line: string, below: string | null) => {
    const id = newCellId(file);
    const cell = newCell(line, id, systemOf(file));
    if (!cell) return;
    edit(insertCell(file, cell, below));
    dispatch({ type: "pend", id: newLineKey(below), line: undefined });
    if (below === null) return;
    dispatch({ type: "write", below: null });
    focusCell(id);
  };
  const leave = (below: string | null) => {
    if (below === null) return focusCell(file.cells[file.cells.length - 1]?.id);
    dispatch({ type: "write", below: null });
    focusCell(below);
  };
  const line = (below: string | null) => (
    <NewLine file={file} below={below} onWrite={write} onLeave={() => leave(below)} />
  );

  return (
    <div className="folio-cells" ref={column}>
      <Thread
        column={column}
        current={current}
        uses={inHand?.uses ?? nothing}
        usedBy={inHand?.usedBy ?? nothing}
      />
      {file.cells.map((cell, index) => (
        <Fragment key={cell.id}>
          <FolioCell
            cell={cell}
            index={index}
            result={answer.cells[cell.id]}
            shown={shown[cell.id]}
            inHand={current === cell.id}
            isOpen={open === cell.id}
            waits={waiting.has(cell.id)}
            pending={pending[cell.id]}
            system={system}
            acts={acts}
          />
          {(writingBelow === cell.id || pending[newLineKey(cell.id)] !== undefined) &&
            line(cell.id)}
        </Fragment>
      ))}
      {line(null)}
      {file.cells.length === 0 && (
        <p className="font-serif text-faint">
          Nothing is written yet.{" "}
          <button type="button" className="link" onClick={focusLastLine}>
            Begin with a given
          </button>
          , such as <code>M = 10 Msun</code>.
        </p>
      )}
    </div>
  );
}
