import type { TextCell } from "../../schema/calculation";
import type { KindOfCell } from "./kind";

/** Prose: nothing to evaluate, nothing to go wrong. */
export const textKind: KindOfCell<TextCell> = {
  kind: "text",
  declare: () => undefined,
  read: () => ({ formulas: [] }),
  structure: () => "",
  values: () => "",
  evaluate: () => ({ result: { kind: "text", status: "ok" } }),
};
