import type { FaultyCell, Refusal, Stale } from "@/lib/calculations";
import { HttpProblem } from "@/lib/http";

/** Everything that lib/calculations refuses, and what the API says to it. */
type AnyRefusal =
  | Refusal
  | Stale
  | { refused: "errors"; cells: FaultyCell[] }
  | { refused: "same"; version: number }
  | { refused: "has-versions" | "withdrawn" | "hash" };

function problemOf(refusal: AnyRefusal): HttpProblem {
  switch (refusal.refused) {
    case "missing":
      return new HttpProblem("not-found");
    case "forbidden":
      return new HttpProblem("forbidden");
    case "stale":
      return new HttpProblem("precondition-failed", { more: { current: refusal.current } });
    case "same":
      return new HttpProblem("same-content", {
        detail: `Version ${refusal.version} has exactly this content. Cite that one.`,
        more: { version: refusal.version },
      });
    case "errors":
      return new HttpProblem("has-errors", {
        detail: "Mend these cells, or say that the version is to have errors.",
        errors: refusal.cells.map(({ cell, message }) => ({ path: `cells.${cell}`, message })),
      });
    case "has-versions":
      return new HttpProblem("conflict", {
        detail: "It has versions, which somebody may have cited. Withdraw them instead.",
      });
    case "hash":
      return new HttpProblem("conflict", {
        detail:
          "The hash does not match: what is stored is not what was pinned. Tell who runs this server.",
      });
    case "withdrawn":
      return new HttpProblem("conflict", { detail: "This version is withdrawn already." });
  }
}

/** The answer, if it is none of the refusals; those are thrown as problems. */
export function granted<Answer extends object>(
  answer: Answer,
): Exclude<Answer, { refused: string }> {
  if ("refused" in answer) throw problemOf(answer as AnyRefusal);
  return answer as Exclude<Answer, { refused: string }>;
}
