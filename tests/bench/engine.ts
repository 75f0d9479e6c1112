import { execFileSync } from "node:child_process";
import path from "node:path";
import { createEngine } from "../../lib/expr";
import { givens, hundredRelations, relationFormulas } from "./hundred-relations";
import type { Measurement } from "./report";

const rounds = 200;

function bestMs(work: (round: number) => void): number {
  for (let i = 0; i < 50; i++) work(-i - 1);
  let best = Number.POSITIVE_INFINITY;
  for (let i = 0; i < rounds; i++) {
    const start = performance.now();
    work(i);
    best = Math.min(best, performance.now() - start);
  }
  return best;
}

function astropy(): { bestMs: number; values: number[] } {
  const input = JSON.stringify({ formulas: relationFormulas, givens, rounds: 20 });
  const script = path.join(import.meta.dirname, "relations.py");
  return JSON.parse(execFileSync("/usr/bin/python3", [script], { input, encoding: "utf8" }));
}

/** Both programs must compute the same numbers, or the times mean nothing. */
function requireSame(values: readonly number[]): void {
  const { cells } = createEngine().evaluate(
    hundredRelations(() => 1),
    "",
  );
  for (const [i, value] of values.entries()) {
    const ours = cells[`r${i}`];
    if (ours?.status !== "ok" || !("si" in ours))
      throw new Error(`${relationFormulas[i]}: ${JSON.stringify(ours)}`);
    if (Math.abs(ours.si.value / value - 1) > 1e-9) {
      throw new Error(`${relationFormulas[i]}: ${ours.si.value} here, ${value} there`);
    }
  }
}

/** The engine in this process, warm: all values new in every round, formulas known. */
export function measureEngine(): Measurement[] {
  const reference = astropy();
  requireSame(reference.values);
  const engine = createEngine();
  const whole = bestMs((round) =>
    engine.evaluate(
      hundredRelations(() => 1 + round * 1e-6),
      "",
    ),
  );
  const one = bestMs((round) =>
    engine.evaluate(
      hundredRelations((i) => (i === 0 ? 1 + round * 1e-6 : 1)),
      "",
    ),
  );
  return [
    {
      what: "100 relations over 20 givens, dimensions and values, warm",
      ours: whole,
      reference: reference.bestMs,
      unit: "ms",
      referenceName: "astropy quantities",
      figure: whole / reference.bestMs,
      target: "≤ 0.10",
      met: whole / reference.bestMs <= 0.1,
    },
    {
      what: "one changed given in that calculation, warm",
      ours: one,
      reference: whole,
      unit: "ms",
      referenceName: "evaluating it whole",
      figure: one / whole,
      target: "≤ 0.3",
      met: one / whole <= 0.3,
    },
  ];
}
