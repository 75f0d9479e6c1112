import type { CalculationFile, Draft, EvaluateAnswer, Problem, Visibility } from "@/lib/schema";

/** What became of a request: its answer, or why not. */
export type Sent<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problem: Problem }
  /** The server was not reached. */
  | { readonly ok: false; readonly problem: undefined };

async function send<T>(path: string, init: RequestInit): Promise<Sent<T>> {
  let response: Response;
  try {
    response = await fetch(path, {
      ...init,
      headers: { "content-type": "application/json", ...init.headers },
    });
  } catch (error) {
    if (error instanceof DOMException && error.name === "AbortError") throw error;
    return { ok: false, problem: undefined };
  }
  const body: unknown = await response.json().catch(() => undefined);
  if (response.ok && body !== undefined) return { ok: true, value: body as T };
  const problem = body as Problem | undefined;
  if (problem?.status !== undefined) return { ok: false, problem };
  return { ok: false, problem: undefined };
}

export function evaluateFile(
  file: CalculationFile,
  signal: AbortSignal,
): Promise<Sent<EvaluateAnswer>> {
  const body = JSON.stringify({ file, present: true });
  return send("/api/evaluate", { method: "POST", body, signal });
}

export function saveFile(
  id: string,
  file: CalculationFile,
  revision: number,
): Promise<Sent<{ revision: number; savedAt: string }>> {
  const body = JSON.stringify({ file });
  return send(`/api/calculations/${id}`, {
    method: "PUT",
    body,
    headers: { "if-match": `"${revision}"` },
  });
}

export function readDraft(id: string): Promise<Sent<Draft>> {
  return send(`/api/calculations/${id}`, { method: "GET" });
}

export function pinDraft(
  id: string,
  pin: { summary: string; acceptErrors?: boolean; revision: number },
): Promise<Sent<{ version: number; contentHash: string; url: string }>> {
  return send(`/api/calculations/${id}/versions`, { method: "POST", body: JSON.stringify(pin) });
}

export function changeVisibility(
  id: string,
  visibility: Visibility,
): Promise<Sent<{ visibility: Visibility }>> {
  return send(`/api/calculations/${id}`, { method: "PATCH", body: JSON.stringify({ visibility }) });
}

/** One sentence for a request that failed. */
export function tellProblem(problem: Problem | undefined): string {
  if (!problem) return "The server cannot be reached.";
  const first = problem.errors?.[0];
  return problem.detail ?? (first ? `${first.path}: ${first.message}` : problem.title);
}
