"use client";

import { useEffect, useState } from "react";
import { sendJson } from "@/components/site/post-json";
import type { EvaluateAnswer, Problem } from "@/lib/schema";
import { type ExampleInputs, exampleFile, firstInputs } from "./example-file";

/** Milliseconds without a change before the engine is asked. */
const restMs = 120;

export interface Example {
  readonly answer: EvaluateAnswer;
  readonly problem: Problem | undefined;
  /** True while what is shown belongs to inputs that have changed since. */
  readonly behind: boolean;
}

/** The results for the inputs, from the engine; the last ones stand until new ones have come. */
export function useExample(inputs: ExampleInputs | undefined, first: EvaluateAnswer): Example {
  const [shown, setShown] = useState<Omit<Example, "behind"> & { for: ExampleInputs }>({
    answer: first,
    problem: undefined,
    for: firstInputs,
  });
  const { mass, opacity } = inputs ?? shown.for;
  const behind = mass !== shown.for.mass || opacity !== shown.for.opacity;
  useEffect(() => {
    if (!behind) return;
    const stop = new AbortController();
    const timer = setTimeout(async () => {
      const asked = { mass, opacity };
      const body = { file: exampleFile(asked), present: true };
      const answer = await sendJson<EvaluateAnswer>("POST", "/api/evaluate", body, stop.signal);
      if (stop.signal.aborted) return;
      if (answer.ok) setShown({ answer: answer.value, problem: undefined, for: asked });
      else setShown((last) => ({ ...last, problem: answer.problem, for: asked }));
    }, restMs);
    return () => {
      clearTimeout(timer);
      stop.abort();
    };
  }, [mass, opacity, behind]);
  return { answer: shown.answer, problem: shown.problem, behind };
}
