"use client";

import dynamic from "next/dynamic";
import { useMemo, useRef } from "react";
import { kindNames } from "@/components/typeset/cell-body";
import { cellLine } from "@/lib/expr/entry";
import type { Cell } from "@/lib/schema";
import { completionsFor } from "./completions";
import { diagnosticsOf } from "./diagnostics";
import { replaceCell } from "./edit-file";
import { useFolio } from "./folio-context";
import { finishLine, systemOf, typeLine } from "./line-edit";

// The editor is loaded when the caret first enters a line, not with the page.
const SourceLine = dynamic(() => import("./source-line"), {
  ssr: false,
  loading: () => <div className="source-line font-mono text-sm text-faint">…</div>,
});

/** The open source of a cell: one line for mathematics, a field of its own for prose. */
export function SourceEditor({ cell }: { cell: Cell }) {
  const { state, dispatch, answer, edit } = useFolio();
  const system = systemOf(state.file);
  // Keystrokes of one opening are one step of undo.
  const typed = useRef(false);
  const change = (next: Cell) => {
    edit(replaceCell(state.file, next), typed.current);
    typed.current = true;
  };
  const close = () => dispatch({ type: "open", id: null });
  const result = answer.cells[cell.id];
  const pending = state.pending[cell.id];
  const diagnostics = useMemo(
    () => (pending === undefined ? diagnosticsOf(cell, result) : []),
    [cell, result, pending],
  );
  if (cell.kind === "text") return <ProseEditor cell={cell} onChange={change} onClose={close} />;
  const line = pending ?? cellLine(cell);
  return (
    <SourceLine
      line={line}
      label={`source of this ${kindNames[cell.kind]}`}
      diagnostics={diagnostics}
      completions={() => completionsFor(state.file, answer.presentation?.cells ?? {})}
      onType={(next) => {
        const made = typeLine(cell, next, system);
        dispatch({ type: "pend", id: cell.id, line: "pending" in made ? made.pending : next });
        if ("cell" in made) change(made.cell);
      }}
      onFinish={(next) => {
        dispatch({ type: "pend", id: cell.id, line: undefined });
        if (pending !== undefined || next !== cellLine(cell))
          change(finishLine(cell, next, system));
        close();
      }}
      onClose={() => {
        dispatch({ type: "pend", id: cell.id, line: undefined });
        close();
      }}
    />
  );
}

function ProseEditor({
  cell,
  onChange,
  onClose,
}: {
  cell: Extract<Cell, { kind: "text" }>;
  onChange: (cell: Cell) => void;
  onClose: () => void;
}) {
  return (
    <textarea
      // biome-ignore lint/a11y/noAutofocus: the person has just asked to edit this text.
      autoFocus
      aria-label="text of this cell, CommonMark with $…$"
      className="prose-editor"
      rows={Math.min(24, cell.markdown.split("\n").length + 2)}
      value={cell.markdown}
      onChange={(event) => onChange({ ...cell, markdown: event.target.value })}
      onKeyDown={(event) => {
        if (event.key === "Escape") onClose();
        event.stopPropagation();
      }}
    />
  );
}
