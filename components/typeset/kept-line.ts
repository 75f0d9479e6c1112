import type { SolveCell, SweepCell } from "@/lib/schema";

/** A sweep or a solve in one line, for reading. */
export function keptLine(cell: SweepCell | SolveCell): string {
  const unit = cell.unit ? ` ${cell.unit}` : "";
  if (cell.kind === "sweep") {
    const points = cell.points === undefined ? "" : `, ${cell.points} points`;
    const spacing = cell.spacing === undefined ? "" : `, ${cell.spacing}`;
    return `${cell.show.join(", ")} over ${cell.over} from ${cell.from} to ${cell.to}${unit}${spacing}${points}`;
  }
  const target = cell.targetUnit ? ` ${cell.targetUnit}` : "";
  return `${cell.for} from ${cell.from} to ${cell.to}${unit} where ${cell.target} = ${cell.equals}${target}`;
}
