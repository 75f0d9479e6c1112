import type { CheckCell } from "../../schema/calculation";
import { raise } from "../faults";
import type { Formula, FormulaWords } from "../formula";
import type { SettledFormula } from "../formula-cache";
import type { EvaluationContext, KindOfCell } from "./kind";

function refuseHeadAndUnit(words: FormulaWords): void {
  if (words.head) {
    const at = words.typed.indexOf("=");
    raise({ code: "syntax", reason: "head-in-condition", from: at, to: at + 1, suggestion: "==" });
  }
  if (words.unit) {
    const { from, text } = words.unit;
    raise({ code: "syntax", reason: "relation-to-unit-in-check", from, to: from + text.length });
  }
}

/** Left side over right side, for a condition that is one comparison. */
function ratioOf(settled: SettledFormula, context: EvaluationContext): number | null {
  const { typed } = settled;
  const [left, right] = typed.op === "compare" && typed.parts.length === 2 ? typed.parts : [];
  if (!left || !right) return null;
  const [above, below] = [left, right].map((part) => {
    const kernel = settled.kernelOf(part);
    return kernel.run(
      kernel.inputs.map((key) => context.value(key)),
      context.runtime,
    );
  });
  const ratio = (above as number) / (below as number);
  return Number.isFinite(ratio) ? ratio : null;
}

/** A condition that must hold for the estimate to be valid. */
export const checkKind: KindOfCell<CheckCell> = {
  kind: "check",
  declare: () => undefined,
  read: (cell, roles, formulas) => {
    refuseHeadAndUnit(formulas.words(cell.condition));
    return { formulas: [formulas.read(cell.condition, roles)] };
  },
  structure: (cell) => cell.condition,
  values: () => "",
  evaluate: (_cell, reading, context) => {
    const formula = reading.formulas[0] as Formula;
    const settled = context.formulas.settle(formula, context.scope, "condition");
    const { kernel } = settled;
    const truth = kernel.run(
      kernel.inputs.map((key) => context.value(key)),
      context.runtime,
    );
    return {
      result: { kind: "check", status: "ok", holds: truth === 1, ratio: ratioOf(settled, context) },
    };
  },
};
