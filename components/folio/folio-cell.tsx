"use client";

import { type DragEvent, memo, useDeferredValue, useState } from "react";
import { CellBody, kindNames } from "@/components/typeset/cell-body";
import { CellFaults } from "@/components/typeset/cell-faults";
import { KeptCell } from "@/components/typeset/kept-cell";
import { cellLine } from "@/lib/expr/entry";
import type { UnitSystem } from "@/lib/physics";
import type { Cell, CellPresentation, CellResult } from "@/lib/schema";
import { CellDetails } from "./cell-details";
import { onCellKey } from "./cell-keys";
import { CellTools } from "./cell-tools";
import { applySuggestion, diagnosticsOf } from "./diagnostics";
import { SourceEditor } from "./source-editor";
import type { CellActs } from "./use-cell-acts";

interface FolioCellProps {
  readonly cell: Cell;
  readonly index: number;
  readonly result: CellResult | undefined;
  readonly shown: CellPresentation | undefined;
  readonly inHand: boolean;
  readonly isOpen: boolean;
  /** True while a newer value is waited for. */
  readonly waits: boolean;
  /** A typed line that the cell cannot hold yet. */
  readonly pending: string | undefined;
  readonly system: UnitSystem;
  readonly acts: CellActs;
}

const dragType = "application/x-leading-order-cell";

/** Dropping a cell on another puts it in that one's place. */
function useDrop(id: string, acts: CellActs) {
  const [isOver, setOver] = useState(false);
  return {
    isOver,
    onDragOver: (event: DragEvent) => {
      if (!event.dataTransfer.types.includes(dragType)) return;
      event.preventDefault();
      setOver(true);
    },
    onDragLeave: (event: DragEvent) => {
      // Leaving for something within the cell is not leaving it.
      if (!event.currentTarget.contains(event.relatedTarget as Node | null)) setOver(false);
    },
    onDrop: (event: DragEvent) => {
      setOver(false);
      const moved = event.dataTransfer.getData(dragType);
      if (!moved) return;
      event.preventDefault();
      acts.moveTo(moved, id);
    },
  };
}

/** Typing that waits: it is not lost, and it does not count yet. */
function PendingLine({ line, kind }: { line: string; kind: string }) {
  return (
    <p className="cell-fault">
      <code>{line || "(an empty line)"}</code> cannot be read as a {kind} yet. It is kept in this
      browser; until it is finished the {kind} counts as it was.
    </p>
  );
}

function nameOf(cell: Cell, index: number, shown: CellPresentation | undefined): string {
  const number = shown?.number === undefined ? "" : ` (${shown.number})`;
  const symbol = "symbol" in cell ? ` ${cell.symbol}` : "";
  return `cell ${index + 1}, ${kindNames[cell.kind]}${number}${symbol}`;
}

/** The cell as it is read; a click on it opens its source. */
/** The value is painted first; the form for a paper, which takes longer to set, follows it. */
function useValueFirst(shown: CellPresentation | undefined): CellPresentation | undefined {
  const later = useDeferredValue(shown?.normalisedTex);
  if (shown === undefined || later === shown.normalisedTex) return shown;
  const { normalisedTex: _now, ...rest } = shown;
  return later === undefined ? rest : { ...rest, normalisedTex: later };
}

function ReadCell({ cell, result, shown, isOpen, system, acts }: FolioCellProps) {
  const valueFirst = useValueFirst(shown);
  const isKept = cell.kind === "sweep" || cell.kind === "solve";
  return (
    // biome-ignore lint/a11y/useKeyWithClickEvents: Enter on the cell around it does the same.
    // biome-ignore lint/a11y/noStaticElementInteractions: the cell around it is the stop of the keyboard.
    <div
      className="cell-body"
      onClick={(event) => {
        const onLink = (event.target as HTMLElement).closest("a") !== null;
        const isSelecting = getSelection()?.isCollapsed === false;
        if (!onLink && !isSelecting && !isOpen) acts.open(cell.id);
      }}
    >
      {isKept ? (
        <KeptCell cell={cell} result={result} system={system} />
      ) : (
        <CellBody cell={cell} result={result} shown={valueFirst} />
      )}
    </div>
  );
}

function FolioCellView(props: FolioCellProps) {
  const { cell, index, result, shown, inHand, isOpen, pending, acts } = props;
  const { id } = cell;
  const { isOver, ...drop } = useDrop(id, acts);
  const isKept = cell.kind === "sweep" || cell.kind === "solve";
  const accept = () => {
    const fault = diagnosticsOf(cell, result).find((one) => one.suggestion !== undefined);
    if (fault) acts.replaceLine(id, applySuggestion(cellLine(cell), fault));
  };
  const states = [inHand && "in-hand", props.waits && "waits", isOver && "drop-here"];
  return (
    <article
      id={`cell-${id}`}
      // biome-ignore lint/a11y/noNoninteractiveTabindex: a cell is a stop of the keyboard, which acts on it.
      tabIndex={0}
      aria-label={nameOf(cell, index, shown)}
      className={["folio-cell", ...states.filter(Boolean)].join(" ")}
      onFocus={() => acts.hold(id)}
      onKeyDown={(event) => onCellKey(event, id, acts)}
      {...drop}
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
        <ReadCell {...props} />
        {pending !== undefined && !isOpen && <PendingLine line={pending} kind={cell.kind} />}
        {isOpen && !isKept && <SourceEditor key={id} cell={cell} />}
        <CellFaults result={result} onAccept={isKept ? undefined : accept} />
        {isOpen && !isKept && <CellDetails cell={cell} />}
        {inHand && <CellTools id={id} isOpen={isOpen} acts={acts} />}
      </div>
    </article>
  );
}

/** One cell of the folio; drawn again only when something of its own changed. */
export const FolioCell = memo(FolioCellView);
