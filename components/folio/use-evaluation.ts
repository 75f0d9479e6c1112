"use client";

import { useEffect, useRef, useState } from "react";
import type { CalculationFile, EvaluateAnswer } from "@/lib/schema";
import { evaluateFile, tellProblem } from "./folio-api";

/** Keystrokes closer together than this are evaluated once. */
const debounceMs = 150;

export interface Evaluation {
  readonly answer: EvaluateAnswer;
  /** True while what is shown is older than what is typed. */
  readonly waiting: boolean;
  /** Why there is no newer answer, if there should be one. */
  readonly trouble: string | undefined;
}

function afterPaint(work: () => void): void {
  requestAnimationFrame(() => setTimeout(work, 0));
}

/** The results of the file, asked of the server as it changes; old ones stay until new ones come. */
export function useEvaluation(file: CalculationFile, first: EvaluateAnswer): Evaluation {
  const [answer, setAnswer] = useState(first);
  const [evaluated, setEvaluated] = useState(file);
  const [trouble, setTrouble] = useState<string>();
  const start = useRef(file);

  useEffect(() => {
    if (file === start.current) return;
    const controller = new AbortController();
    performance.mark("lo:keystroke");
    const ask = async () => {
      performance.mark("lo:asked");
      const sent = await evaluateFile(file, controller.signal).catch(() => undefined);
      if (!sent || controller.signal.aborted) return;
      if (!sent.ok) return setTrouble(tellProblem(sent.problem));
      setTrouble(undefined);
      setAnswer(sent.value);
      setEvaluated(file);
      afterPaint(() => performance.mark("lo:painted"));
    };
    const timer = setTimeout(ask, debounceMs);
    return () => {
      clearTimeout(timer);
      controller.abort();
    };
  }, [file]);

  return { answer, waiting: evaluated !== file, trouble };
}
