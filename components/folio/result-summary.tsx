"use client";

import { useEffect, useState } from "react";
import type { EvaluateAnswer } from "@/lib/schema";

/** Numbers are announced when typing rests, not at every keystroke. */
const restMs = 1_500;

function summaryOf(answer: EvaluateAnswer): string {
  const cells = Object.values(answer.cells);
  const errors = cells.filter((cell) => cell.status === "error").length;
  const fails = cells.filter(
    (cell) => cell.status === "ok" && "holds" in cell && !cell.holds,
  ).length;
  const parts = [
    errors === 0
      ? "no errors"
      : errors === 1
        ? "one cell has an error"
        : `${errors} cells have errors`,
    ...(fails === 0 ? [] : [fails === 1 ? "one check fails" : `${fails} checks fail`]),
  ];
  return `Evaluated: ${parts.join(", ")}.`;
}

/** For those who hear the page: what the evaluation came to. */
export function ResultSummary({ answer, waiting }: { answer: EvaluateAnswer; waiting: boolean }) {
  const [said, setSaid] = useState("");
  useEffect(() => {
    if (waiting) return;
    const timer = setTimeout(() => setSaid(summaryOf(answer)), restMs);
    return () => clearTimeout(timer);
  }, [answer, waiting]);
  return (
    <p className="sr-only" aria-live="polite">
      {said}
    </p>
  );
}
