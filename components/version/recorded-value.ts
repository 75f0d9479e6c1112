import { showNumber, shownTex, shownText } from "@/lib/expr/digits";
import { formatUnit, type UnitSystem, unitTex } from "@/lib/physics";
import type { CellResult } from "@/lib/schema";

/** A value as TeX and as plain text. */
export interface RecordedValue {
  readonly tex: string;
  readonly text: string;
}

/**
 * The value that a version recorded for a relation, with its unit: what was pinned, whatever the
 * engine of today would say. Undefined where nothing was recorded.
 */
export function recordedValue(
  result: CellResult | undefined,
  system: UnitSystem,
): RecordedValue | undefined {
  if (result?.status !== "ok" || !("value" in result)) return undefined;
  const shown = showNumber(result.value);
  if (result.unit === "") return { tex: shownTex(shown), text: shownText(shown) };
  return {
    tex: `${shownTex(shown)}\\,${unitTex(result.unit, system)}`,
    text: `${shownText(shown)} ${formatUnit(result.unit, system)}`,
  };
}
