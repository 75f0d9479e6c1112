"use client";

import { useState } from "react";
import { replaceCell } from "@/components/folio/edit-file";
import { useFolio } from "@/components/folio/folio-context";
import { finishLine, systemOf } from "@/components/folio/line-edit";
import { Tex } from "@/components/typeset/tex";
import { cellLine } from "@/lib/expr/entry";
import type { GivenCell } from "@/lib/schema";

function valueOf(cell: GivenCell): string {
  return cellLine(cell).slice(cell.symbol.length + 3);
}

function GivenRow({ cell }: { cell: GivenCell }) {
  const { state, answer, edit, dispatch } = useFolio();
  const [typed, setTyped] = useState<string>();
  const shown = answer.presentation?.cells[cell.id];
  const isFaulty = answer.cells[cell.id]?.status === "error";
  const change = (value: string) => {
    setTyped(value);
    const next = finishLine(cell, `${cell.symbol} = ${value}`, systemOf(state.file));
    // A value that is not one yet stays in this field only.
    if (next.kind === "given") edit(replaceCell(state.file, next), typed !== undefined);
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
        value={typed ?? valueOf(cell)}
        onChange={(event) => change(event.target.value)}
        onBlur={() => setTyped(undefined)}
        onKeyDown={(event) => event.key === "Enter" && event.currentTarget.blur()}
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
