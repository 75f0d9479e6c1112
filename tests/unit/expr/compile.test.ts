import fc from "fast-check";
import { all, create } from "mathjs";
import { describe, expect, it } from "vitest";
import { compile } from "@/lib/expr/compile";
import { attempt } from "@/lib/expr/faults";
import { readFormula, readWords } from "@/lib/expr/formula";
import { infer } from "@/lib/expr/infer";
import { Runtime } from "@/lib/expr/runtime";
import { makeScope } from "@/lib/expr/scope";
import { dimensionless } from "@/lib/physics";
import { bracketed, formulas, written } from "./random-formulas";
import { shape } from "./tree-shape";

// The library calls nearly equal numbers equal; kernels do so in comparisons only, and never round up.
const library = create(all ?? {}, { number: "number", relTol: 1e-15, absTol: 0 });
library.import({ floor: Math.floor, ceil: Math.ceil }, { override: true });
const roles = { functions: new Set<string>(), quantities: new Set(["x", "y", "z"]) };
const scope = makeScope({ edition: "codata-2018", em: "si" }, (name) =>
  roles.quantities.has(name) ? { kind: "quantity", dimension: dimensionless } : undefined,
);
const treeOf = (text: string) => readFormula(readWords(text), roles).tree;

/** Value of a formula, or the code of its fault. */
function computed(text: string, values: Record<string, number>): number | string {
  const outcome = attempt(() => {
    const { inputs, run } = compile(infer(treeOf(text), scope));
    return run(
      inputs.map((key) => values[key.slice("symbol:".length)] ?? Number.NaN),
      new Runtime(),
    );
  });
  return outcome.ok ? outcome.value : outcome.fault.code;
}

/** What the library makes of it; undefined where it refuses. */
function evaluatedByLibrary(text: string, at: Record<string, number>): unknown {
  try {
    return library.evaluate(text, { ...at });
  } catch {
    return undefined;
  }
}

const number = fc.oneof(
  fc.double({ min: -5, max: 5, noNaN: true }).filter((x) => Math.abs(x) > 1e-9),
  fc.constantFrom(0, 1, -1, 1e-8, 1e8),
);
const values = fc.record({ x: number, y: number, z: number });
const runs = { seed: 20261204, numRuns: 3_000 };

/** Factors by which rounding may grow on the way are not bounded; the library meets the same ones. */
function agree(a: number, b: number): boolean {
  return a === b || Math.abs(a - b) <= 1e-9 * Math.max(Math.abs(a), Math.abs(b), 1e-6);
}

describe("kernels", () => {
  it("compute what the expression library evaluates", () => {
    let compared = 0;
    fc.assert(
      fc.property(formulas, values, (made, at) => {
        const text = written(made);
        const value = computed(text, at);
        if (typeof value === "string") return;
        const expected = evaluatedByLibrary(text, at);
        if (typeof expected !== "number") throw new Error(`${text}: ${String(expected)}`);
        compared += 1;
        expect(agree(value, expected), `${text}: ${value} and ${expected}`).toBe(true);
      }),
      runs,
    );
    expect(compared).toBeGreaterThan(1_000);
  });

  it("have a value wherever the library has a finite one at every step", () => {
    fc.assert(
      fc.property(formulas, values, (made, at) => {
        const text = written(made);
        const value = computed(text, at);
        if (typeof value === "number") return;
        const steps: unknown[] = [];
        library.parse(text).traverse((node) => {
          if (node.type !== "SymbolNode" || !(node as { isFunction?: boolean }).isFunction) {
            steps.push(evaluatedByLibrary(node.toString(), at));
          }
        });
        const finite = steps.every(
          (step) =>
            typeof step === "function" || (typeof step === "number" && Number.isFinite(step)),
        );
        expect(finite && !steps.includes(0), `${text} is ${value}`).toBe(false);
      }),
      runs,
    );
  });

  it("agree, however the formula is written", () => {
    fc.assert(
      fc.property(formulas, values, (made, at) => {
        expect(computed(written(made), at)).toEqual(computed(bracketed(made), at));
      }),
      runs,
    );
  });
});

describe("formulas written and read back", () => {
  it("have the tree they were written from", () => {
    fc.assert(
      fc.property(formulas, (made) => {
        expect(shape(treeOf(written(made)))).toBe(shape(treeOf(bracketed(made))));
        expect(shape(treeOf(shape(treeOf(written(made)))))).toBe(shape(treeOf(written(made))));
      }),
      runs,
    );
  });

  it("do not mind how signs and blanks are typed", () => {
    fc.assert(
      fc.property(formulas, (made) => {
        const typed = written(made)
          .replaceAll(" * ", "·")
          .replaceAll(" - ", " − ")
          .replaceAll(" + ", "+");
        expect(shape(treeOf(typed))).toBe(shape(treeOf(written(made))));
      }),
      runs,
    );
  });
});
