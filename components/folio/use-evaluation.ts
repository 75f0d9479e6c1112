"use client";

import { useEffect, useRef, useState } from "react";
import { type CalculationFile, type EvaluateAnswer, resultsFormat } from "@/lib/schema";
import { evaluateFile, tellProblem } from "./folio-api";

/** Keystrokes closer together than this are evaluated once. */
const debounceMs = 150;
/** After a failure, it is tried again by itself. */
const retryMs = 4_000;

export interface Evaluation {
  readonly answer: EvaluateAnswer;
  /** The file that the answer is of: older than what is typed while an answer is waited for. */
  readonly evaluated: CalculationFile;
  /** Why there is no newer answer, if there should be one. */
  readonly trouble: string | undefined;
}

/** A mark that keeps its latest moment only, so that a long session does not pile them up. */
export function markMoment(name: "lo:keystroke" | "lo:painted"): void {
  performance.clearMarks(name);
  performance.mark(name);
}

function afterPaint(work: () => void): void {
  requestAnimationFrame(() => setTimeout(work, 0));
}

/** What is shown before there is any answer: nothing. */
function noAnswer(file: CalculationFile): EvaluateAnswer {
  return { format: resultsFormat, engine: "", edition: file.edition, contentHash: "", cells: {} };
}

/** The results of the file, asked of the server as it changes; old ones stay until new ones come. */
export function useEvaluation(
  file: CalculationFile,
  first: EvaluateAnswer | undefined,
): Evaluation {
  const [current, setCurrent] = useState(() => ({
    answer: first ?? noAnswer(file),
    evaluated: file,
  }));
  const [trouble, setTrouble] = useState<string>();
  const [tries, setTries] = useState(first ? 0 : 1);
  const latest = useRef(file);

  useEffect(() => {
    if (file === latest.current && tries === 0) return;
    latest.current = file;
    const controller = new AbortController();
    let retry: ReturnType<typeof setTimeout> | undefined;
    const ask = async () => {
      const sent = await evaluateFile(file, controller.signal).catch(() => undefined);
      if (!sent || controller.signal.aborted) return;
      if (!sent.ok) {
        setTrouble(tellProblem(sent.problem));
        retry = setTimeout(() => setTries((count) => count + 1), retryMs);
        return;
      }
      setTrouble(undefined);
      setCurrent({ answer: sent.value, evaluated: file });
      afterPaint(() => markMoment("lo:painted"));
    };
    const timer = setTimeout(ask, debounceMs);
    return () => {
      clearTimeout(timer);
      clearTimeout(retry);
      controller.abort();
    };
  }, [file, tries]);

  return { ...current, trouble };
}
