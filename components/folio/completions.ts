import type { Completion } from "@codemirror/autocomplete";
import { functionEntries } from "@/lib/expr/functions";
import { formatUnit, listConstants, listUnits } from "@/lib/physics";
import type { CalculationFile, EvaluateAnswer } from "@/lib/schema";
import { systemOf } from "./line-edit";

type Presented = NonNullable<EvaluateAnswer["presentation"]>["cells"];

/** Names the calculation defines, each with its value as last evaluated. */
function ownNames(file: CalculationFile, shown: Presented): Completion[] {
  return file.cells.flatMap((cell) =>
    "symbol" in cell
      ? [
          {
            label: cell.symbol,
            type: "own",
            detail: shown[cell.id]?.valueText ?? cell.kind,
            boost: 2,
          },
        ]
      : [],
  );
}

/** Everything that may be named in a formula: own names, constants, units and functions. */
export function completionsFor(file: CalculationFile, shown: Presented): Completion[] {
  const system = systemOf(file);
  const constants = listConstants(system).map((constant) => ({
    label: constant.symbol,
    type: "constant",
    detail: `${constant.text} ${formatUnit(constant.unit, system)}`,
    info: `${constant.name}. ${constant.source}.`,
    boost: 1,
  }));
  const units = listUnits(system).map((unit) => ({
    label: unit.symbol,
    type: "unit",
    detail: unit.name,
    info: unit.source,
  }));
  const functions = functionEntries.map((entry) => ({
    label: entry.name,
    type: "function",
    detail: entry.meaning,
    apply: `${entry.name}(`,
    info: entry.signature,
  }));
  return [...ownNames(file, shown), ...constants, ...functions, ...units];
}
