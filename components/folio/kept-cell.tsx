import { keptLine } from "@/components/typeset/kept-line";
import type { SolveCell, SweepCell } from "@/lib/schema";

/** A cell of a kind that this release keeps as it is. */
export function KeptCell({ cell }: { cell: SweepCell | SolveCell }) {
  return (
    <>
      <code className="font-mono text-sm">{keptLine(cell)}</code>
      <p className="font-sans text-sm text-faint">
        This {cell.kind} is kept in the file; this release does not evaluate or draw it.
      </p>
    </>
  );
}
