import { readEntry } from "@/lib/expr/entry";
import type { CalculationFile, Cell } from "@/lib/schema";

/** Lines that the help shows: what they say and what they come to is the engine's own answer. */
export interface Examples {
  readonly id: string;
  /** Lines that the shown ones build upon. */
  readonly before: readonly string[];
  readonly shown: readonly string[];
}

export const lineExamples: Examples = {
  id: "lines",
  before: [],
  shown: [
    "M = 10 Msun",
    "kappa = 0.34(2) cm^2/g",
    "L = 4 pi G M c / kappa to erg/s",
    "L > 1e38 erg/s",
    "Balance of radiation and gravity, from $L = 4 \\pi G M c / \\kappa$.",
  ],
};

export const givenExamples: Examples = {
  id: "givens",
  before: [],
  shown: [
    "R = 12 km",
    "M = 4.30 ± 0.01 e6 Msun",
    "T_e = 6.674(15) keV",
    "n = 1e3 cm^-3 within a factor 3",
    "eta = 0.1 ± 0.3 dex",
    "z = 0.01 .. 0.02",
  ],
};

export const formulaExamples: Examples = {
  id: "formulas",
  before: ["r = 6 km", "M = 1.4 Msun", "L = 1e38 erg/s"],
  shown: [
    "a = 1/2 pi",
    "V_ns = 4/3 pi (r/2)^3 to km^3",
    "g_s = G M / r^2 to cm/s^2",
    "x = 2 G M / r c^2",
    "f(k) = sin(k)^2 + cos(k)^2",
    "q = f(0.3)",
    "D = luminosity_distance(0.1) to Mpc",
    "E = L + M c^2",
    "v = sqrt(2 G M_ns / r)",
  ],
};

export const nameExamples: Examples = {
  id: "names",
  before: [],
  shown: ["Mdot = 1e-8 Msun/yr", "v_rms = 300 km/s", "σ_x = 2", "T_eff = 5772 K"],
};

function toCell(line: string, id: string): Cell {
  const made = readEntry(line, { edition: "codata-2022", em: "si" });
  return { ...made, id } as Cell;
}

/** The calculation that a group of examples makes; shown line number n is the cell `e<n>`. */
export function examplesFile({ id, before, shown }: Examples): CalculationFile {
  return {
    format: "leading-order/1",
    title: id,
    edition: "codata-2022",
    em: "si",
    cells: [
      ...before.map((line, index) => toCell(line, `b${index}`)),
      ...shown.map((line, index) => toCell(line, `e${index}`)),
    ],
  };
}
