import { createEngine, type Engine } from "@/lib/expr";
import { readEntry } from "@/lib/expr/entry";
import type { CalculationFile, Cell, CellResult } from "@/lib/schema";

type Options = { em?: "si" | "gaussian"; edition?: CalculationFile["edition"] };

/** A calculation typed line by line; cells are called c0, c1, … */
export function calculation(lines: readonly string[], options: Options = {}): CalculationFile {
  const system = { edition: options.edition ?? "codata-2018", em: options.em ?? "si" } as const;
  const cells = lines.map((line, i) => ({ ...readEntry(line, system), id: `c${i}` }) as Cell);
  return { format: "leading-order/1", title: "", edition: system.edition, em: system.em, cells };
}

/** Results in the order of the lines. */
export function resultsOf(
  lines: readonly string[],
  options: Options = {},
  engine: Engine = createEngine(),
): CellResult[] {
  return Object.values(engine.evaluate(calculation(lines, options), "").cells);
}

/** The result of the last line. */
export function lastOf(lines: readonly string[], options: Options = {}): CellResult {
  return resultsOf(lines, options).at(-1) as CellResult;
}

/** The SI value of the last line; NaN where it has none. */
export function siOf(lines: readonly string[], options: Options = {}): number {
  const result = lastOf(lines, options);
  return result.status === "ok" && "si" in result ? result.si.value : Number.NaN;
}
