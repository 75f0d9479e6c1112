import type { Problem } from "@/lib/schema";

/** What became of a request: its answer, or the problem that the server told. */
export type Answer<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problem: Problem };

/** Said in place of an answer where none came. */
const unreachable: Problem = {
  type: "/problems/unreachable",
  title: "The server cannot be reached",
  status: 0,
  detail: "The server cannot be reached. Look at the connection and try again.",
};

/** True for problem details (RFC 9457); light, since the schema library is not sent to browsers. */
function isProblem(body: unknown): body is Problem {
  return typeof body === "object" && body !== null && "type" in body && "title" in body;
}

async function readAnswer<T>(response: Response): Promise<Answer<T>> {
  const body: unknown = await response.json().catch(() => undefined);
  if (response.ok) return { ok: true, value: body as T };
  return { ok: false, problem: isProblem(body) ? body : unreachable };
}

/** Send JSON to the API. Never throws: a connection that fails is a problem like others. */
export async function sendJson<T>(
  method: "GET" | "POST" | "PATCH" | "DELETE",
  path: string,
  body?: unknown,
  signal?: AbortSignal,
): Promise<Answer<T>> {
  const headers = { "content-type": "application/json" };
  const sent = body === undefined ? {} : { body: JSON.stringify(body) };
  try {
    return await readAnswer(
      await fetch(path, { method, headers, signal: signal ?? null, ...sent }),
    );
  } catch {
    return { ok: false, problem: unreachable };
  }
}

/** `POST` of `sendJson`. */
export function postJson<T>(path: string, body?: unknown): Promise<Answer<T>> {
  return sendJson<T>("POST", path, body);
}
