"use client";

import { useRef, useState } from "react";
import { replaceCell } from "@/components/folio/edit-file";
import { useFolio } from "@/components/folio/folio-context";
import { finishLine, systemOf } from "@/components/folio/line-edit";
import { Tex } from "@/components/typeset/tex";
import { cellLine } from "@/lib/expr/entry";
import type { GivenCell } from "@/lib/schema";

/** The line of a given behind its `=`. */
function behindSign(line: string): string {
  return line.replace(/^[^=]*=\s?/, "");
}

function GivenRow({ cell }: { cell: GivenCell }) {
  const { state, answer, edit, dispatch } = useFolio();
  // The value as typed stands for the cell it made; if the cell changes otherwise, its own is shown.
  const [typed, setTyped] = useState<{ value: string; made: GivenCell }>();
  const hasTyped = useRef(false);
  const shown = answer.presentation?.cells[cell.id];
  const pending = state.pending[cell.id];
  const isFaulty = answer.cells[cell.id]?.status === "error" || pending !== undefined;
  const value =
    pending === undefined
      ? typed?.made === cell
        ? typed.value
        : behindSign(cellLine(cell))
      : behindSign(pending);
  const change = (next: string) => {
    const line = `${cell.symbol} = ${next}`;
    const made = finishLine(cell, line, systemOf(state.file));
    // What is not a value yet waits with the cell, as in its source line.
    if (made.kind !== "given") return dispatch({ type: "pend", id: cell.id, line });
    if (pending !== undefined) dispatch({ type: "pend", id: cell.id, line: undefined });
    setTyped({ value: next, made });
    edit(replaceCell(state.file, made), hasTyped.current);
    hasTyped.current = true;
  };
  return (
    <li className="grid grid-cols-[minmax(3rem,auto)_1fr] items-baseline gap-x-3 py-0.5">
      <a
        href={`#cell-${cell.id}`}
        onClick={() => dispatch({ type: "hold", id: cell.id })}
        aria-label={`go to ${cell.symbol}`}
      >
        {shown?.tex ? <Tex tex={shown.tex} /> : cell.symbol}
      </a>
      <input
        aria-label={`value of ${cell.symbol}`}
        aria-invalid={isFaulty || undefined}
        className={`min-w-0 border-b bg-transparent px-1 font-mono text-sm ${isFaulty ? "border-halpha" : "border-rule"}`}
        value={value}
        onFocus={() => {
          hasTyped.current = false;
        }}
        onChange={(event) => change(event.target.value)}
      />
    </li>
  );
}

/** All givens together, to change one and see everything follow. */
export function MarginGivens() {
  const { state } = useFolio();
  const givens = state.file.cells.filter((cell): cell is GivenCell => cell.kind === "given");
  return (
    <section className="margin-part" aria-labelledby="margin-givens">
      <h2 id="margin-givens">Givens</h2>
      {givens.length === 0 ? (
        <p className="text-faint">
          None yet. Write one, such as <code>M = 10 Msun</code>.
        </p>
      ) : (
        <ul>
          {givens.map((cell) => (
            <GivenRow key={cell.id} cell={cell} />
          ))}
        </ul>
      )}
    </section>
  );
}
