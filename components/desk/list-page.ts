import type { Answer } from "@/components/site/post-json";
import { sendJson } from "@/components/site/post-json";
import type { CalculationPage, Problem } from "@/lib/schema";

export type Scope = "mine" | "public";

/** A request that came to nothing, as SWR wants it: thrown. */
export class ListProblem extends Error {
  constructor(readonly problem: Problem) {
    super(problem.title);
  }
}

/** The address of a page of the list. */
export function listPath(scope: Scope, q: string, cursor: string | null): string {
  const query = new URLSearchParams({ scope });
  if (q !== "") query.set("q", q);
  if (cursor !== null) query.set("cursor", cursor);
  return `/api/calculations?${query}`;
}

/** Fetch a page of the list. Throws ListProblem. */
export async function fetchPage(path: string): Promise<CalculationPage> {
  const answer: Answer<CalculationPage> = await sendJson("GET", path);
  if (!answer.ok) throw new ListProblem(answer.problem);
  return answer.value;
}
