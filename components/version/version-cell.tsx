import { CellBody } from "@/components/typeset/cell-body";
import { CellFaults } from "@/components/typeset/cell-faults";
import { keptLine } from "@/components/typeset/kept-line";
import type { VersionCell as Shown } from "./read-version";

/** One cell of a version, read-only, with an address of its own within the page. */
export function VersionCell({ cell, result, shown }: Shown) {
  const isKept = cell.kind === "sweep" || cell.kind === "solve";
  return (
    <li id={`cell-${cell.id}`} className="break-inside-avoid py-2">
      {isKept ? (
        <>
          <code className="font-mono text-sm">{keptLine(cell)}</code>
          <p className="mt-1 font-sans text-sm text-faint">
            This {cell.kind} is kept in the file; this release does not evaluate or draw it.
          </p>
        </>
      ) : (
        <>
          <CellBody cell={cell} result={result} shown={shown} />
          <CellFaults result={result} />
        </>
      )}
    </li>
  );
}
