import type { Cell } from "../../schema/calculation";
import { checkKind } from "./check";
import { givenKind } from "./given";
import type { KindOfCell } from "./kind";
import { relationKind } from "./relation";
import { solveKind } from "./solve";
import { sweepKind } from "./sweep";
import { textKind } from "./text";

const kinds = {
  text: textKind,
  given: givenKind,
  relation: relationKind,
  check: checkKind,
  sweep: sweepKind,
  solve: solveKind,
};

/** The engine's entry for a cell's kind. */
export function kindOf(cell: Cell): KindOfCell {
  return kinds[cell.kind] as KindOfCell;
}

export * from "./kind";
