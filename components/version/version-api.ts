import type { CalculationFile, Problem, Verdict } from "@/lib/schema";

/** What a version was asked to do, and what came of it: the answer, or a sentence that says why not. */
export type Asked<T> = { readonly answer: T } | { readonly why: string };

async function post<T>(path: string, body: object): Promise<Asked<T>> {
  const response = await fetch(path, {
    method: "POST",
    headers: { "content-type": "application/json" },
    body: JSON.stringify(body),
  }).catch(() => undefined);
  const told: unknown = await response?.json().catch(() => undefined);
  if (!response || told === undefined) {
    return { why: "The server cannot be reached. Try again in a moment." };
  }
  if (response.ok) return { answer: told as T };
  const problem = told as Problem;
  return { why: problem.errors?.[0]?.message ?? problem.detail ?? `${problem.title}.` };
}

const address = (id: string, number: number) => `/api/calculations/${id}/versions/${number}`;

/** Evaluates a version again; saves nothing. */
export function recompute(
  id: string,
  number: number,
  edition: CalculationFile["edition"],
): Promise<Asked<Verdict>> {
  return post(`${address(id, number)}/recompute`, { edition });
}

/** Withdraws a version for good. */
export function withdraw(
  id: string,
  number: number,
  reason: string,
): Promise<Asked<{ withdrawnAt: string; reason: string }>> {
  return post(`${address(id, number)}/withdraw`, { reason });
}
