"use client";

import { useRef } from "react";
import type { Cell } from "@/lib/schema";
import { replaceCell } from "./edit-file";
import { useFolio } from "./folio-context";
import { asKind, systemOf } from "./line-edit";

type Detail = "source" | "note" | "because";

const details: Partial<Record<Cell["kind"], readonly (readonly [Detail, string])[]>> = {
  given: [
    ["source", "Where it comes from"],
    ["note", "Note"],
  ],
  relation: [
    ["source", "Where it comes from"],
    ["note", "Note"],
  ],
  check: [["because", "Why it must hold"]],
};

const kinds = ["given", "relation", "check", "text"] as const;

/** What a cell holds beside its line, and the kind it is of. */
export function CellDetails({ cell }: { cell: Cell }) {
  const { state, edit } = useFolio();
  const system = systemOf(state.file);
  const hasTyped = useRef<Detail>(undefined);
  const set = (field: Detail, value: string) => {
    const { [field]: _old, ...rest } = cell as Record<string, unknown>;
    const next = (value === "" ? rest : { ...rest, [field]: value }) as Cell;
    // One visit to a field is one step of undo.
    edit(replaceCell(state.file, next), hasTyped.current === field);
    hasTyped.current = field;
  };
  return (
    <div className="cell-details">
      {details[cell.kind]?.map(([field, label]) => (
        <label key={field} className="flex min-w-48 flex-1 flex-col text-xs text-faint">
          {label}
          <input
            className="border-b border-rule bg-transparent py-1 text-sm text-ink"
            value={((cell as Record<string, unknown>)[field] as string | undefined) ?? ""}
            onChange={(event) => set(field, event.target.value)}
          />
        </label>
      ))}
      <label className="flex flex-col text-xs text-faint">
        Kind
        <select
          className="border-b border-rule bg-ground py-1 text-sm text-ink"
          value={cell.kind}
          onChange={(event) => {
            const kind = kinds.find((one) => one === event.target.value);
            if (kind && kind !== cell.kind)
              edit(replaceCell(state.file, asKind(cell, kind, system)));
          }}
        >
          {kinds.map((kind) => (
            <option key={kind}>{kind}</option>
          ))}
        </select>
      </label>
    </div>
  );
}
