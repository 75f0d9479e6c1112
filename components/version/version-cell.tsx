import { CellBody } from "@/components/typeset/cell-body";
import { CellFaults } from "@/components/typeset/cell-faults";
import { KeptCell } from "@/components/typeset/kept-cell";
import type { UnitSystem } from "@/lib/physics";
import type { VersionCell as Shown } from "./read-version";

/** One cell of a version, read-only, with an address of its own within the page. */
export function VersionCell({ cell, result, shown, system }: Shown & { system: UnitSystem }) {
  const isKept = cell.kind === "sweep" || cell.kind === "solve";
  return (
    <li id={`cell-${cell.id}`} className="break-inside-avoid py-2">
      {isKept ? (
        <KeptCell cell={cell} result={result} system={system} />
      ) : (
        <CellBody cell={cell} result={result} shown={shown} />
      )}
      <CellFaults result={result} />
    </li>
  );
}
