"use client";

import { type DragEvent, type KeyboardEvent, memo } from "react";
import { CellBody, kindNames } from "@/components/typeset/cell-body";
import { CellFaults } from "@/components/typeset/cell-faults";
import { Button } from "@/components/ui/button";
import { cellLine } from "@/lib/expr/entry";
import type { Cell, CellPresentation, CellResult } from "@/lib/schema";
import { CellDetails } from "./cell-details";
import { applySuggestion, diagnosticsOf } from "./diagnostics";
import { SourceEditor } from "./source-editor";

/** What can be done to a cell; the same acts by mouse and by keyboard. */
export interface CellActs {
  hold(id: string): void;
  open(id: string): void;
  step(id: string, by: -1 | 1): void;
  move(id: string, by: -1 | 1): void;
  moveTo(id: string, before: string): void;
  duplicate(id: string): void;
  remove(id: string): void;
  writeBelow(id: string): void;
  replaceLine(id: string, line: string): void;
}

interface FolioCellProps {
  readonly cell: Cell;
  readonly index: number;
  readonly result: CellResult | undefined;
  readonly shown: CellPresentation | undefined;
  readonly inHand: boolean;
  readonly isOpen: boolean;
  readonly stale: boolean;
  readonly acts: CellActs;
}

const letterActs: Readonly<Record<string, "open" | "remove" | "duplicate" | "writeBelow">> = {
  Enter: "open",
  Delete: "remove",
  d: "duplicate",
  n: "writeBelow",
};

function onCellKey(event: KeyboardEvent<HTMLElement>, id: string, acts: CellActs): void {
  if (event.target !== event.currentTarget) return;
  if (event.altKey || event.metaKey || event.ctrlKey) return;
  const by = event.key === "ArrowUp" ? -1 : event.key === "ArrowDown" ? 1 : undefined;
  const act = letterActs[event.key];
  if (by === undefined && act === undefined) return;
  event.preventDefault();
  if (by !== undefined) (event.shiftKey ? acts.move : acts.step)(id, by);
  else if (act) acts[act](id);
}

const dragType = "application/x-leading-order-cell";

function CellTools({ id, acts }: { id: string; acts: CellActs }) {
  return (
    // biome-ignore lint/a11y/useSemanticElements: a fieldset would draw what is a plain row of words.
    <div className="cell-tools" role="group" aria-label="this cell">
      <Button look="quiet" onClick={() => acts.move(id, -1)}>
        up
      </Button>
      <Button look="quiet" onClick={() => acts.move(id, 1)}>
        down
      </Button>
      <Button look="quiet" onClick={() => acts.duplicate(id)}>
        duplicate
      </Button>
      <Button look="quiet" onClick={() => acts.remove(id)}>
        delete
      </Button>
      <Button look="quiet" onClick={() => acts.writeBelow(id)}>
        write below
      </Button>
    </div>
  );
}

/** A cell that this release keeps but has no body for. */
function Unknown({ cell }: { cell: Cell }) {
  return (
    <p className="font-sans text-sm text-faint">
      A {kindNames[cell.kind]}. It stays in the file as it is.
    </p>
  );
}

function FolioCellView(props: FolioCellProps) {
  const { cell, index, result, shown, inHand, isOpen, acts } = props;
  const { id } = cell;
  const accept = (_suggestion: string) => {
    const fault = diagnosticsOf(cell, result).find((one) => one.suggestion !== undefined);
    if (fault) acts.replaceLine(id, applySuggestion(cellLine(cell), fault));
  };
  const drop = (event: DragEvent) => {
    const moved = event.dataTransfer.getData(dragType);
    if (moved) acts.moveTo(moved, id);
  };
  return (
    <article
      id={`cell-${id}`}
      // biome-ignore lint/a11y/noNoninteractiveTabindex: a cell is a stop of the keyboard, which acts on it.
      tabIndex={0}
      aria-label={`cell ${index + 1}, ${kindNames[cell.kind]}${"symbol" in cell ? ` ${cell.symbol}` : ""}`}
      className={`folio-cell ${inHand ? "in-hand" : ""} ${props.stale ? "is-stale" : ""}`}
      onFocus={() => acts.hold(id)}
      onKeyDown={(event) => onCellKey(event, id, acts)}
      onDragOver={(event) => event.dataTransfer.types.includes(dragType) && event.preventDefault()}
      onDrop={drop}
    >
      <span
        className="cell-index"
        aria-hidden="true"
        draggable
        title="drag to move"
        onDragStart={(event) => event.dataTransfer.setData(dragType, id)}
      >
        {index + 1}
      </span>
      <div className="cell-main">
        {/* biome-ignore lint/a11y/useKeyWithClickEvents: Enter on the cell does the same. */}
        {/* biome-ignore lint/a11y/noStaticElementInteractions: the cell around it is the stop of the keyboard. */}
        <div
          className="cell-body"
          onClick={(event) => {
            if (!(event.target as HTMLElement).closest("a") && !isOpen) acts.open(id);
          }}
        >
          {cell.kind === "sweep" || cell.kind === "solve" ? (
            <Unknown cell={cell} />
          ) : (
            <CellBody cell={cell} result={result} shown={shown} />
          )}
        </div>
        {isOpen && <SourceEditor key={id} cell={cell} />}
        <CellFaults result={result} onAccept={accept} />
        {isOpen && <CellDetails cell={cell} />}
        {inHand && <CellTools id={id} acts={acts} />}
      </div>
    </article>
  );
}

/** One cell of the folio; drawn again only when something of its own changed. */
export const FolioCell = memo(FolioCellView);
