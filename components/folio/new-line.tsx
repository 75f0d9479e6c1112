"use client";

import { forwardRef, useState } from "react";
import { kindNames } from "@/components/typeset/cell-body";
import type { CalculationFile } from "@/lib/schema";
import { newCell, systemOf } from "./line-edit";

/** The empty last line: what is typed here becomes a given, a relation, a check or text. */
export const NewLine = forwardRef<
  HTMLTextAreaElement,
  {
    file: CalculationFile;
    below: string | null;
    onWrite: (line: string) => void;
    onLeave: () => void;
  }
>(function NewLine({ file, below, onWrite, onLeave }, ref) {
  const [line, setLine] = useState("");
  const made = newCell(line, "new", systemOf(file));
  const write = () => {
    if (!made) return;
    onWrite(line);
    setLine("");
  };
  return (
    <div className="new-line">
      <label className="sr-only" htmlFor="new-line">
        {below === null ? "New cell" : "New cell below the one in hand"}
      </label>
      <textarea
        id="new-line"
        ref={ref}
        rows={Math.max(1, line.split("\n").length)}
        value={line}
        placeholder="M = 10 Msun,  L = 4 pi G M m_p c / sigma_T,  L > 1e38 erg/s,  or text"
        spellCheck={false}
        onChange={(event) => setLine(event.target.value)}
        onKeyDown={(event) => {
          event.stopPropagation();
          if (event.key === "Enter" && !event.shiftKey) {
            event.preventDefault();
            write();
          }
          if (event.key === "Escape") onLeave();
        }}
      />
      <p className="text-xs text-faint" aria-live="polite">
        {made
          ? `Enter makes this a ${kindNames[made.kind]}.`
          : "A line makes a cell; Enter finishes it."}
      </p>
    </div>
  );
});
