import type { CalculationFile, Cell } from "../../lib/schema";

/** A hundred relations over twenty givens, in formulas that a Python program can take over as they are. */
const units = ["Msun", "km", "s", "K", "cm"] as const;

const patterns = [
  "4 * pi * G * A * m_p * c / sigma_T",
  "2 * G * A / c^2 + 3 * B",
  "sqrt(G * A / B^3) * C",
  "(G * A * C^2 / (4 * pi^2))^(1/3) / B",
  "sigma_SB * D^4 * 4 * pi * B^2",
  "k_B * D / (m_p * c^2) * exp(-B / E)",
  "3 * k_B * D / (2 * E^3) + m_p * c^2 / E^3",
  "h * c / (E * k_B * D)",
  "log(B / E) + sqrt(D / (10 * D))",
  "A * c^2 / C * (1 - exp(-2))",
] as const;

/** The letters of a pattern with the givens they stand for in one relation. */
function formulaOf(index: number): string {
  const pattern = patterns[index % patterns.length] as string;
  const set = Math.floor(index / patterns.length) % 4;
  return pattern.replace(/\b([A-E])\b/g, (letter) => `${letter}${set}`);
}

export const relationFormulas: readonly string[] = Array.from({ length: 100 }, (_, i) =>
  formulaOf(i),
);

export const givens = Array.from({ length: 20 }, (_, i) => ({
  symbol: `${"ABCDE"[i % 5]}${Math.floor(i / 5)}`,
  value: 1.5 + i / 7,
  unit: units[i % 5] as string,
}));

/** The calculation with each given scaled by its share, so that nothing of a run is remembered. */
export function hundredRelations(scale: (index: number) => number): CalculationFile {
  const givenCells: Cell[] = givens.map((given, i) => ({
    id: `g${i}`,
    kind: "given",
    symbol: given.symbol,
    value: given.value * scale(i),
    unit: given.unit,
  }));
  const relationCells: Cell[] = relationFormulas.map((formula, i) => ({
    id: `r${i}`,
    kind: "relation",
    symbol: `y_${i}`,
    formula,
  }));
  return {
    format: "leading-order/1",
    title: "A hundred relations",
    edition: "codata-2018",
    cells: [...givenCells, ...relationCells],
  };
}
