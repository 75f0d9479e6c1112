"use client";

import type { TextCell } from "@/lib/schema";

/** The field in which the prose of a text cell is written; it is set above as one types. */
export function ProseEditor({
  cell,
  onChange,
  onClose,
}: {
  cell: TextCell;
  onChange: (cell: TextCell) => void;
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
        event.stopPropagation();
        if (event.key === "Escape") onClose();
      }}
    />
  );
}
