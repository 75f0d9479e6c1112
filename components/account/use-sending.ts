"use client";

import { useState } from "react";
import type { Answer } from "@/components/site/post-json";
import type { Problem } from "@/lib/schema";

/** The sending of one form: whether it is under way, and what the server found wrong with it. */
export interface Sending {
  readonly busy: boolean;
  readonly problem: Problem | undefined;
  /** What is wrong with one field. */
  errorOf(field: string): string | undefined;
  /** Send; gives the answer's value, or undefined where there was a problem. */
  send<T>(work: () => Promise<Answer<T>>): Promise<T | undefined>;
}

/** Once the errors are on the page, the caret goes to the first field concerned. */
function focusFirstFault(): void {
  requestAnimationFrame(() => {
    document.querySelector<HTMLElement>("[aria-invalid=true]")?.focus();
  });
}

export function useSending(): Sending {
  const [busy, setBusy] = useState(false);
  const [problem, setProblem] = useState<Problem>();
  return {
    busy,
    problem,
    errorOf: (field) => problem?.errors?.find((error) => error.path === field)?.message,
    async send(work) {
      setBusy(true);
      setProblem(undefined);
      const answer = await work();
      setBusy(false);
      if (answer.ok) return answer.value;
      setProblem(answer.problem);
      focusFirstFault();
      return undefined;
    },
  };
}
