import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { closeEvaluators, evaluate, startEvaluators } from "@/lib/evaluator";
import { type CalculationFile, limits } from "@/lib/schema";
import { hostileFormulas } from "./hostile-formulas";

/** A calculation with one good cell, one under test, and one that uses neither. */
function calculation(formula: string, title = formula.slice(0, 200)): CalculationFile {
  return {
    format: "leading-order/1",
    title: title.replaceAll(/\p{Cc}/gu, ""),
    edition: "codata-2022",
    cells: [
      { id: "m", kind: "given", symbol: "M", value: 10, unit: "Msun" },
      { id: "x", kind: "relation", symbol: "y", formula },
      { id: "g", kind: "relation", symbol: "E", formula: "M c^2", unit: "erg" },
    ],
  };
}

let number = 0;
/** Evaluates something good that no cache has seen. */
async function evaluatesWell() {
  number += 1;
  const { cells } = await evaluate(calculation("M / 2", `good ${number}`));
  expect(cells.x).toMatchObject({ status: "ok" });
  expect(cells.g).toMatchObject({ status: "ok", value: expect.closeTo(1.787e55, -53) });
}

beforeAll(async () => {
  await startEvaluators(2);
});
afterAll(closeEvaluators);

it("has at least 150 hostile formulas", () => {
  const all = hostileFormulas.flatMap((group) => group.formulas);
  expect(new Set(all).size).toBe(all.length);
  expect(all.length).toBeGreaterThanOrEqual(150);
});

describe.each(hostileFormulas)("$about", ({ code, formulas }) => {
  it.each(formulas)(`gives ${code}: %s`, async (formula) => {
    const before = performance.now();
    const { cells } = await evaluate(calculation(formula));
    expect(performance.now() - before).toBeLessThan(limits.evaluationMs + 2_000);
    expect(cells.x).toMatchObject({ status: "error", error: { code } });
    await evaluatesWell();
  });
});

describe("hostile symbols, units and conditions", () => {
  it.each([
    ["__proto__", "1"],
    ["constructor", "1"],
    ["a.b", "1"],
    ["a[1]", "1"],
    ["f(x", "1"],
    ["", "1"],
    ["hasOwnProperty", "1 + hasOwnProperty"],
  ])("keeps “%s” from standing for anything it is not", async (symbol, formula) => {
    const file = calculation("1");
    file.cells[1] = { id: "x", kind: "relation", symbol, formula };
    const { cells } = await evaluate(file);
    expect(cells.g).toMatchObject({ status: "ok" });
    expect(Object.keys(cells).sort()).toEqual(["g", "m", "x"]);
    expect(({} as Record<string, unknown>).polluted).toBeUndefined();
  });

  it.each([
    "constructor",
    "__proto__",
    "kg; m",
    '"kg"',
    "kg.m",
    "toString",
    "kg^(9^9^9)",
    "kg^1e9",
  ])("refuses the unit “%s”", async (unit) => {
    const file = calculation("1");
    file.cells[1] = { id: "x", kind: "given", symbol: "y", value: 1, unit };
    const { cells } = await evaluate(file);
    expect(cells.x).toMatchObject({ status: "error" });
    expect(cells.g).toMatchObject({ status: "ok" });
  });

  it("keeps cell ids like __proto__ apart from the results", async () => {
    const file = calculation("2");
    file.cells[1] = { id: "__proto__", kind: "relation", symbol: "y", formula: "2" };
    const { cells } = await evaluate(file);
    expect(Object.keys(cells)).toContain("g");
    expect(({} as Record<string, unknown>).status).toBeUndefined();
  });
});

describe("many at once", () => {
  it("answers good calculations while bombs go off, and keeps the server's memory flat", async () => {
    const bombs = hostileFormulas.at(-1)?.formulas ?? [];
    const memoryBefore = process.memoryUsage().rss;
    const work = bombs.map((bomb, i) => evaluate(calculation(bomb, `bomb ${i}`)));
    await Promise.all(Array.from({ length: 20 }, evaluatesWell));
    for (const { cells } of await Promise.all(work))
      expect(cells.x).toMatchObject({ status: "error", error: { code: "limit" } });
    expect(process.memoryUsage().rss - memoryBefore).toBeLessThan(150e6);
  });
});
