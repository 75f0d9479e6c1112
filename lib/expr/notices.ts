import type { UnitSystem } from "../physics";
import type { Notice } from "../schema/results";
import type { Reading } from "./kinds";
import type { Roles } from "./parse";
import { builtIn } from "./scope";

/** What is worth saying about a cell though it stops nothing. */
export function noticesOf(
  symbol: string | undefined,
  reading: Reading | undefined,
  roles: Roles,
  system: UnitSystem,
  field: string,
): Notice[] {
  const formulas = reading?.formulas ?? [];
  return [
    ...(symbol === undefined ? [] : hides(symbol, system)),
    ...formulas.flatMap((formula) =>
      formula.ambiguous.map(({ from, to }) => ({
        code: "implicit-product-after-division",
        level: "notice" as const,
        message:
          "A product without a sign binds tighter than a division: all of this stands below the line. Put brackets to say so, or * to mean otherwise.",
        field,
        from,
        to,
      })),
    ),
    ...formulas.flatMap((formula) =>
      formula.behindNumbers
        .filter(({ name }) => roles.quantities.has(name) && builtIn(name, system)?.kind === "unit")
        .map(({ name, from, to }) => ({
          code: "hidden-unit",
          level: "warning" as const,
          message: `“${name}” is the quantity this calculation defines, not the unit.`,
          field,
          from,
          to,
        })),
    ),
  ];
}

function hides(symbol: string, system: UnitSystem): Notice[] {
  const meaning = builtIn(symbol, system);
  if (meaning?.kind !== "unit" && meaning?.kind !== "constant") return [];
  const what = meaning.kind === "unit" ? "the unit" : `the constant (${meaning.constant.name})`;
  return [
    {
      code: meaning.kind === "unit" ? "hides-unit" : "hides-constant",
      level: "notice",
      message: `“${symbol}” now means this quantity in formulas, not ${what} of the same name.`,
      field: "symbol",
    },
  ];
}
