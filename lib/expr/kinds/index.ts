import type { Cell, CellKind } from "../../schema/calculation";
import { checkKind } from "./check";
import { givenKind } from "./given";
import type { KindOfCell } from "./kind";
import { relationKind } from "./relation";
import { textKind } from "./text";

const kinds = { text: textKind, given: givenKind, relation: relationKind, check: checkKind };

/** The engine's entry for a cell's kind. */
export function kindOf(cell: Cell): KindOfCell {
  return (kinds as Partial<Record<CellKind, unknown>>)[cell.kind] as KindOfCell;
}

export * from "./kind";
