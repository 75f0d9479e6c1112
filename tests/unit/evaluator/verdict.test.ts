import { describe, expect, it } from "vitest";
import { compareResults, verdictOn } from "@/lib/evaluator/verdict";
import type { CellResult, Results } from "@/lib/schema";

const results = (cells: Record<string, unknown>): Results => ({
  format: "leading-order/results/1",
  engine: "1.0.0",
  edition: "codata-2022",
  contentHash: "sha256:0",
  cells: cells as Record<string, CellResult>,
});

const given = (more: object = {}) => ({
  kind: "given",
  status: "ok",
  symbol: "M",
  value: 10,
  unit: "Msun",
  uncertainty: 0.5,
  ...more,
});
const check = (holds: boolean) => ({ kind: "check", status: "ok", holds, ratio: 1 });
const failed = (code: string) => ({
  kind: "given",
  status: "error",
  error: { code, message: code },
});

/** What differs, as “what: recorded → recomputed”. */
const differs = (recorded: object | undefined, recomputed: object | undefined) =>
  compareResults(
    results(recorded ? { c: recorded } : {}),
    results(recomputed ? { c: recomputed } : {}),
  ).map(({ what, recorded: a, recomputed: b }) => `${what}: ${a} → ${b}`);

describe("compareResults", () => {
  it("finds nothing in equal results", () => {
    expect(differs(given(), given())).toEqual([]);
    expect(differs(failed("domain"), failed("domain"))).toEqual([]);
    expect(differs(given({ uncertainty: null }), given({ uncertainty: null }))).toEqual([]);
  });

  it("forgives values 1e-12 and uncertainties 1e-9, and no more", () => {
    expect(differs(given(), given({ value: 10 * (1 + 9e-13) }))).toEqual([]);
    expect(differs(given(), given({ value: 10 * (1 + 2e-12) }))).toHaveLength(1);
    expect(differs(given(), given({ uncertainty: 0.5 * (1 + 9e-10) }))).toEqual([]);
    expect(differs(given(), given({ uncertainty: 0.5 * (1 + 2e-9) }))).toHaveLength(1);
  });

  it("takes zero for equal to zero only", () => {
    expect(differs(given({ value: 0 }), given({ value: 1e-300 }))).toHaveLength(1);
    expect(differs(given({ value: 0 }), given({ value: -0 }))).toEqual([]);
  });

  it.each([
    ["a unit", given(), given({ unit: "kg" }), "unit: Msun → kg"],
    ["an uncertainty that went", given(), given({ uncertainty: null }), "uncertainty: 0.5 → null"],
    ["a status", given(), failed("overflow"), "status: ok → overflow"],
    ["another error", failed("syntax"), failed("limit"), "status: syntax → limit"],
    ["a check", check(true), check(false), "holds: true → false"],
    ["a cell that is gone", given(), undefined, "missing: ok → null"],
    ["a cell that is new", undefined, given(), "missing: null → ok"],
  ])("names %s", (_title, recorded, recomputed, expected) => {
    expect(differs(recorded, recomputed)).toEqual([expected]);
  });

  it("gives the ratio of two numbers and the symbol", () => {
    const [found] = compareResults(results({ c: given() }), results({ c: given({ value: 20 }) }));
    expect(found).toMatchObject({ cell: "c", symbol: "M", ratio: 2 });
  });

  it("does not take what every object inherits for a result", () => {
    const [found] = compareResults(results({ constructor: given() }), results({}));
    expect(found).toMatchObject({ cell: "constructor", what: "missing", recomputed: null });
  });

  it("gives no ratio to zero", () => {
    const zero = results({ c: given({ value: 0 }) });
    expect(compareResults(zero, results({ c: given() }))[0]?.ratio).toBeNull();
  });
});

describe("results with many numbers", () => {
  const sweep = (values: (number | null)[]) => ({
    kind: "sweep",
    status: "ok",
    over: "M",
    unit: "Msun",
    spacing: "log",
    points: [1, 10],
    series: [{ symbol: "L", unit: "erg/s", values }],
  });
  const solve = (solutions: number[]) => ({
    kind: "solve",
    status: "ok",
    symbol: "M",
    unit: "",
    solutions,
  });

  it("compares every point of a sweep, gaps included", () => {
    expect(differs(sweep([1, 2]), sweep([1, 2 * (1 + 1e-13)]))).toEqual([]);
    expect(differs(sweep([1, 2]), sweep([1, 2.5]))).toEqual(["value: 2 → 2.5"]);
    expect(differs(sweep([1, null]), sweep([1, 2]))).toEqual(["value: null → 2"]);
  });

  it("compares every solution, and how many there are", () => {
    expect(differs(solve([1, 2]), solve([1, 2]))).toEqual([]);
    expect(differs(solve([1, 2]), solve([1, 3]))).toEqual(["value: 2 → 3"]);
    expect(differs(solve([1, 2]), solve([1]))).toEqual(["value: 2 → null"]);
  });
});

describe("verdictOn", () => {
  it("reproduces when nothing differs, and carries today's results", () => {
    const today = results({ c: given() });
    const verdict = verdictOn(results({ c: given() }), today);
    expect(verdict).toEqual({ verdict: "reproduces", differences: [], results: today });
  });

  it("differs when something does", () => {
    expect(verdictOn(results({ c: check(true) }), results({ c: check(false) })).verdict).toBe(
      "differs",
    );
  });
});
