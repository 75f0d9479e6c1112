import { beforeAll, describe, expect, it } from "vitest";
import { createEngine, functionEntries } from "@/lib/expr";
import type { CalculationFile, CellResult } from "@/lib/schema";
import { expectWithin } from "../unit/physics/approximately";
import { integrals, roots, sums } from "./binding-cases";
import { farRedshifts, functionPoints } from "./function-points";
import { askPython } from "./python";

/**
 * Every function of the language, as a calculation calls it, against SciPy and NumPy; the Planck
 * functions against Astropy’s black body, the distances and times against its flat universe of
 * H₀ = 70, Ω_m = 0.3 without radiation (both have the law of the physics library’s sources).
 */
interface Answer {
  readonly calls: Record<string, readonly number[]>;
  readonly integrals: Record<string, number>;
  readonly sums: Record<string, number>;
  readonly roots: Record<string, number>;
}

const binding = new Set(["integrate", "sum", "root"]);
/** The converters are compared in `units.test.ts`. */
const converting = new Set(["to_gaussian", "to_si"]);
const distances = "luminosity_distance angular_diameter_distance comoving_distance lookback_time";
const cosmological = [...distances.split(" "), "hubble"];
const unitsOf: Record<string, readonly string[]> = {
  planck_nu: ["Hz", "K"],
  planck_lambda: ["m", "K"],
};

/** Relative. The series behind lgamma is good to some 3e-12 only. */
const tolerances: Readonly<Record<string, number>> = {
  lgamma: 1e-11,
  ...Object.fromEntries(cosmological.map((name) => [name, 1e-9])),
};

const far = (name: string) => `${name} far`;

const engine = createEngine();

function siValues(cells: CalculationFile["cells"]): number[] {
  const file = { format: "leading-order/1", title: "", edition: "codata-2018", cells } as const;
  const results = engine.evaluate(file as CalculationFile, "").cells;
  return Object.values(results as Record<string, CellResult>).flatMap((result) => {
    if (result.kind !== "relation") return [];
    if (result.status !== "ok" || !("si" in result)) throw new Error(JSON.stringify(result));
    return [result.si.value];
  });
}

/** One relation a point, its arguments givens. */
function called(name: string, points: readonly (readonly number[])[]): number[] {
  const cells = points.flatMap((point, i) => {
    const symbols = point.map((_, j) => `x_${i}_${j}`);
    const givens = point.map((value, j) => ({
      id: `g${i}_${j}`,
      kind: "given" as const,
      symbol: symbols[j] ?? "",
      value,
      unit: unitsOf[name]?.[j] ?? "",
    }));
    const formula = `${name}(${symbols.join(", ")})`;
    return [...givens, { id: `r${i}`, kind: "relation" as const, symbol: `y_${i}`, formula }];
  });
  return siValues(cells);
}

let answer: Answer;

beforeAll(async () => {
  const farCalls = cosmological.map((name) => [far(name), farRedshifts.map((z) => [z])]);
  answer = await askPython("functions.py", {
    calls: { ...functionPoints, ...Object.fromEntries(farCalls) },
  });
});

describe("the functions of the language", () => {
  it("are all compared, at twenty points or more", () => {
    const compared = [...Object.keys(functionPoints), ...binding, ...converting].sort();
    expect(compared).toEqual(functionEntries.map(({ name }) => name).sort());
    for (const points of Object.values(functionPoints)) {
      expect(points.length).toBeGreaterThanOrEqual(20);
    }
    for (const cases of [integrals, sums, roots]) {
      expect(Object.keys(cases).length).toBeGreaterThanOrEqual(20);
    }
  });

  it.each(Object.entries(functionPoints))("agree: %s", (name, points) => {
    const ours = called(name, points);
    expect(ours).toHaveLength(points.length);
    for (const [i, value] of ours.entries()) {
      expectWithin(value, answer.calls[name]?.[i] ?? Number.NaN, tolerances[name] ?? 1e-12);
    }
  });

  it.each(cosmological)("agree up to z = 1100, to 1e-6: %s", (name) => {
    const ours = called(
      name,
      farRedshifts.map((z) => [z]),
    );
    for (const [i, value] of ours.entries()) {
      expectWithin(value, answer.calls[far(name)]?.[i] ?? Number.NaN, 1e-6);
    }
  });
});

const formulas = (cases: Readonly<Record<string, string>>) => Object.entries(cases);
const computed = (formula: string) =>
  siValues([{ id: "r", kind: "relation", symbol: "y_result", formula }])[0] ?? Number.NaN;

describe("integrals, against closed forms and QUADPACK, to 1e-11", () => {
  it.each(formulas(integrals))("agree: %s, %s", (key, formula) => {
    expectWithin(computed(formula), answer.integrals[key] ?? Number.NaN, 1e-11);
  });
});

describe("sums, against closed forms and exactly rounded sums, to 1e-13", () => {
  it.each(formulas(sums))("agree: %s, %s", (key, formula) => {
    expectWithin(computed(formula), answer.sums[key] ?? Number.NaN, 1e-13);
  });
});

describe("roots, against closed forms and SciPy’s Brent, to 1e-12", () => {
  it.each(formulas(roots))("agree: %s, %s", (key, formula) => {
    expectWithin(computed(formula), answer.roots[key] ?? Number.NaN, 1e-12);
  });
});
