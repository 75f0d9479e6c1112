"use client";

import { Button } from "@/components/ui/button";
import { settle } from "@/lib/calculations/merge";
import { cellLine } from "@/lib/expr/entry";
import type { Cell } from "@/lib/schema";
import { useFolio } from "./folio-context";
import type { Conflict } from "./folio-state";

function cellText(cell: Cell | null): string {
  if (!cell) return "(deleted)";
  const line = cellLine(cell);
  const beside = (["source", "note", "because"] as const).flatMap((field) => {
    const value = (cell as Record<string, unknown>)[field];
    return typeof value === "string" ? [`${field}: ${value}`] : [];
  });
  return [line, ...beside].join("\n");
}

function sidesOf(conflict: Conflict): { name: string; mine: string; theirs: string } {
  if ("field" in conflict) {
    return { name: conflict.field, mine: conflict.mine ?? "", theirs: conflict.theirs ?? "" };
  }
  const cell = conflict.mine ?? conflict.theirs ?? conflict.base;
  const name = cell && "symbol" in cell ? `${cell.kind} ${cell.symbol}` : (cell?.kind ?? "a cell");
  return { name, mine: cellText(conflict.mine), theirs: cellText(conflict.theirs) };
}

/** What two people changed at once: both texts side by side, and the question which stays. */
export function ConflictPanel() {
  const { state, dispatch } = useFolio();
  if (state.conflicts.length === 0) return null;
  const keep = (conflict: Conflict, side: "mine" | "theirs") =>
    dispatch({ type: "settled", conflict, file: settle(state.file, conflict, side) });
  return (
    <section
      className="mt-4 border-y-2 border-sodium py-3 font-sans"
      aria-label="Changes that meet"
      role="alert"
    >
      <h2 className="font-semibold">Somebody else saved a change to the same place</h2>
      <p className="text-sm">
        Everything else was merged. Choose what stays; nothing is saved until then.
      </p>
      {state.conflicts.map((conflict) => {
        const { name, mine, theirs } = sidesOf(conflict);
        return (
          <div
            key={"field" in conflict ? conflict.field : conflict.cellId}
            className="mt-3 grid gap-4 sm:grid-cols-2"
          >
            {(
              [
                ["mine", "Yours", mine],
                ["theirs", "Theirs", theirs],
              ] as const
            ).map(([side, title, text]) => (
              <div key={side}>
                <h3 className="text-sm text-faint">
                  {title}: {name}
                </h3>
                <pre className="whitespace-pre-wrap border-l-2 border-rule pl-2 font-mono text-sm">
                  {text}
                </pre>
                <Button className="mt-1" onClick={() => keep(conflict, side)}>
                  Keep {title.toLowerCase()}
                </Button>
              </div>
            ))}
          </div>
        );
      })}
    </section>
  );
}
