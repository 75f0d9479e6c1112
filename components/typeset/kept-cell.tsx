import { showNumber, shownText } from "@/lib/expr/digits";
import { formatUnit, type UnitSystem } from "@/lib/physics";
import type { CellResult, SolveCell, SweepCell } from "@/lib/schema";
import { keptLine } from "./kept-line";

/** The solutions that were found, in words; nothing for a sweep. */
function solutionsText(result: CellResult | undefined, system: UnitSystem): string | undefined {
  if (result?.status !== "ok" || result.kind !== "solve") return undefined;
  const unit = result.unit === "" ? "" : ` ${formatUnit(result.unit, system)}`;
  const values = result.solutions.map((value) => `${shownText(showNumber(value))}${unit}`);
  return `${result.symbol} = ${values.join(" or ")}`;
}

/** A sweep or a solve: its line as it is kept, and what is found; there is no plot yet. */
export function KeptCell({
  cell,
  result,
  system,
}: {
  cell: SweepCell | SolveCell;
  result: CellResult | undefined;
  system: UnitSystem;
}) {
  const found = solutionsText(result, system);
  return (
    <>
      <code className="font-mono text-sm">{keptLine(cell)}</code>
      {found && <p className="figures text-sm">{found}</p>}
      <p className="font-sans text-sm text-faint">
        {cell.kind === "sweep"
          ? "The sweep is kept in the file; this release does not draw it."
          : "The solve is kept in the file; this release does not edit it."}
      </p>
    </>
  );
}
