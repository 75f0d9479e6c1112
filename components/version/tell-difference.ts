import type { Difference } from "@/lib/schema";

/** One side of a difference as text; a number with the digits of a double that matter. */
export function tellValue(value: Difference["recorded"]): string {
  if (value === null) return "none";
  if (typeof value === "boolean") return value ? "holds" : "fails";
  return typeof value === "number" ? String(Number(value.toPrecision(12))) : value;
}

/** A ratio near one as what it adds to one, since that is what a reader looks for. */
export function ratioText(ratio: number | null): string {
  if (ratio === null) return "";
  const excess = ratio - 1;
  if (excess === 0 || Math.abs(excess) >= 1e-3) return String(Number(ratio.toPrecision(6)));
  return `1 ${excess < 0 ? "−" : "+"} ${Math.abs(excess).toExponential(2)}`;
}
