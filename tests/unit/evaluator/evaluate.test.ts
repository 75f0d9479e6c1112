import { afterAll, describe, expect, it } from "vitest";
import {
  closeEvaluators,
  contentHash,
  evaluate,
  evaluatorIsWarm,
  recompute,
} from "@/lib/evaluator";
import { stoppedResults } from "@/lib/evaluator/stopped";
import { type CalculationFile, limitSentences, resultsSchema } from "@/lib/schema";

afterAll(closeEvaluators);

const file = (title: string): CalculationFile => ({
  format: "leading-order/1",
  title,
  edition: "codata-2018",
  cells: [
    { id: "t1", kind: "text", markdown: "Prose" },
    { id: "g1", kind: "given", symbol: "M", value: 10, unit: "Msun" },
    { id: "r1", kind: "relation", symbol: "E", formula: "M c^2", unit: "erg" },
    { id: "k1", kind: "check", condition: "E > 0 erg" },
  ],
});

describe("evaluate", () => {
  it("is warm before anything was asked", async () => {
    expect(await evaluatorIsWarm()).toBe(true);
  });

  it("gives results of the shape in the contract, with the content's hash", async () => {
    const answer = await evaluate(file("Shape"));
    expect(resultsSchema.parse(answer)).toEqual(answer);
    expect(answer.contentHash).toBe(contentHash(file("Shape")));
    expect(answer).not.toHaveProperty("presentation");
  });

  it("adds the presentation when asked", async () => {
    const { presentation } = await evaluate(file("Shown"), { present: true });
    expect(presentation?.cells.r1).toMatchObject({ number: 1, uses: ["g1"], constants: ["c"] });
  });

  it("gives the same object to those who ask the same, at once or later", async () => {
    const [first, second] = await Promise.all([evaluate(file("Same")), evaluate(file("Same"))]);
    expect(second).toBe(first);
    expect(await evaluate(file("Same"))).toBe(first);
  });

  it("starts again after it was closed", async () => {
    await closeEvaluators();
    expect((await evaluate(file("Again"))).cells.r1?.status).toBe("ok");
  });
});

describe("recompute", () => {
  it("reproduces what it has just given, and moves with the edition", async () => {
    const calculation = { ...file("Verdict"), cells: file("").cells };
    const results = await evaluate(calculation);
    expect(await recompute({ calculation, results })).toMatchObject({ verdict: "reproduces" });
    const moved = { ...calculation, cells: [...calculation.cells] };
    moved.cells[1] = { id: "g1", kind: "relation", symbol: "M", formula: "m_e", unit: "kg" };
    const recorded = { calculation: moved, results: await evaluate(moved) };
    expect(await recompute(recorded, "codata-2022")).toMatchObject({
      verdict: "differs",
      differences: [
        { cell: "g1", what: "value" },
        { cell: "r1", what: "value" },
      ],
      results: { edition: "codata-2022" },
    });
  });
});

describe("stoppedResults", () => {
  it("has a limit error in every cell but text", () => {
    const { cells } = stoppedResults(file("Stopped"), "sha256:0", "1.0.0");
    const error = { code: "limit", message: limitSentences.evaluation() };
    expect(cells).toEqual({
      t1: { kind: "text", status: "ok" },
      g1: { kind: "given", status: "error", symbol: "M", error },
      r1: { kind: "relation", status: "error", symbol: "E", error },
      k1: { kind: "check", status: "error", error },
    });
  });
});
