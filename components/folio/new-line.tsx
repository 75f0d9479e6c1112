"use client";

import { useEffect, useRef } from "react";
import type { CalculationFile } from "@/lib/schema";
import { useFolio } from "./folio-context";
import { newLineKey } from "./folio-state";
import { newCell, systemOf } from "./line-edit";

interface NewLineProps {
  readonly file: CalculationFile;
  /** The cell that the new one is put below; null for the last line. */
  readonly below: string | null;
  readonly onWrite: (line: string, below: string | null) => void;
  readonly onLeave: () => void;
}

/** The last line's field, for those that bring the caret there. */
export const lastLineId = "new-line";

/** An empty line: what is typed here becomes a given, a relation, a check or text. */
export function NewLine({ file, below, onWrite, onLeave }: NewLineProps) {
  const { state, dispatch } = useFolio();
  const key = newLineKey(below);
  const line = state.pending[key] ?? "";
  const made = newCell(line, "new", systemOf(file));
  const field = useRef<HTMLTextAreaElement>(null);
  useEffect(() => {
    if (below !== null) field.current?.focus();
  }, [below]);
  const type = (next: string) =>
    dispatch({ type: "pend", id: key, line: next === "" ? undefined : next });
  const id = below === null ? lastLineId : `${lastLineId}-${below}`;
  return (
    <div className="new-line">
      <label className="sr-only" htmlFor={id}>
        {below === null ? "New cell at the end" : "New cell here"}
      </label>
      <textarea
        id={id}
        ref={field}
        rows={Math.max(1, line.split("\n").length)}
        value={line}
        placeholder="M = 10 Msun,  L = 4 pi G M m_p c / sigma_T,  L > 1e38 erg/s,  or text"
        aria-describedby={`${id}-makes`}
        spellCheck={false}
        onChange={(event) => type(event.target.value)}
        onKeyDown={(event) => {
          event.stopPropagation();
          if (event.key === "Enter" && !event.shiftKey && !event.nativeEvent.isComposing) {
            event.preventDefault();
            if (made) onWrite(line, below);
          }
          if (event.key === "Escape") onLeave();
        }}
      />
      <p id={`${id}-makes`} className="new-line-makes">
        {made ? `Enter makes this a ${made.kind}.` : "A line makes a cell; Enter finishes it."}
      </p>
    </div>
  );
}
