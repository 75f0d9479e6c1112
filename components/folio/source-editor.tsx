"use client";

import dynamic from "next/dynamic";
import { useMemo, useRef, useState } from "react";
import { cellLine } from "@/lib/expr/entry";
import type { Cell } from "@/lib/schema";
import { completionsFor } from "./completions";
import { diagnosticsOf } from "./diagnostics";
import { replaceCell } from "./edit-file";
import { focusCell } from "./focus-cell";
import { useFolio } from "./folio-context";
import { finishLine, systemOf, typeLine } from "./line-edit";
import { ProseEditor } from "./prose-editor";

// The editor is loaded when the caret first enters a line, not with the page.
const SourceLine = dynamic(() => import("./source-line"), {
  ssr: false,
  loading: () => <div className="source-line font-mono text-sm text-faint">…</div>,
});

/** The open source of a cell: one line for mathematics, a field of its own for prose. */
export function SourceEditor({ cell }: { cell: Cell }) {
  const { state, dispatch, edit } = useFolio();
  // Keystrokes of one opening are one step of undo.
  const hasTyped = useRef(false);
  const change = (next: Cell) => {
    edit(replaceCell(state.file, next), hasTyped.current);
    hasTyped.current = true;
  };
  const close = () => {
    dispatch({ type: "open", id: null });
    focusCell(cell.id);
  };
  return cell.kind === "text" ? (
    <ProseEditor cell={cell} onChange={change} onClose={close} />
  ) : (
    <LineEditor cell={cell} onChange={change} onClose={close} />
  );
}

interface LineEditorProps {
  readonly cell: Cell;
  readonly onChange: (cell: Cell) => void;
  readonly onClose: () => void;
}

function LineEditor({ cell, onChange, onClose }: LineEditorProps) {
  const { state, dispatch, answer } = useFolio();
  const system = systemOf(state.file);
  const result = answer.cells[cell.id];
  const pending = state.pending[cell.id];
  // The line as typed stands for the cell it made; if the cell changes otherwise, its line is shown.
  const [typed, setTyped] = useState<{ line: string; made: Cell }>();
  const line = pending ?? (typed?.made === cell ? typed.line : cellLine(cell));
  const diagnostics = useMemo(
    () => (pending === undefined ? diagnosticsOf(cell, result, line) : []),
    [cell, result, line, pending],
  );
  const pend = (next: string | undefined) => dispatch({ type: "pend", id: cell.id, line: next });
  const type = (next: string) => {
    const made = typeLine(cell, next, system);
    if ("pending" in made) return pend(made.pending);
    if (pending !== undefined) pend(undefined);
    setTyped({ line: next, made: made.cell });
    onChange(made.cell);
  };
  const finish = (next: string) => {
    if (pending !== undefined) {
      pend(undefined);
      if (next.trim() !== "") onChange(finishLine(cell, next, system));
    }
    onClose();
  };
  return (
    <SourceLine
      line={line}
      label={`source of this ${cell.kind}`}
      diagnostics={diagnostics}
      completions={() => completionsFor(state.file, answer.presentation?.cells ?? {})}
      onType={type}
      onFinish={finish}
      onClose={onClose}
    />
  );
}
