import { createHash } from "node:crypto";
import { db } from "@/db";
import { HttpProblem } from "./problems";

const keyPattern = /^[\x21-\x7e]{1,200}$/;

/** A write that may be repeated: who sends what. */
interface Attempt {
  readonly request: Request;
  readonly userId: string;
  readonly body: unknown;
}

/** What names a write: the primary key of its row. */
interface Name {
  readonly user_id: string;
  readonly route: string;
  readonly key: string;
}

interface KeptRow {
  request_hash: string;
  status: number | null;
  headers: string | null;
  body: string | null;
}

function hashOf(body: unknown): string {
  return createHash("sha256")
    .update(JSON.stringify(body ?? null))
    .digest("hex");
}

function requireKey(key: string): void {
  if (keyPattern.test(key)) return;
  const errors = [{ path: "Idempotency-Key", message: "1 to 200 printable ASCII characters." }];
  throw new HttpProblem("validation", { errors });
}

/** Enter the name as ours; the row of the first request where there was one. */
async function claim(name: Name, requestHash: string): Promise<KeptRow | undefined> {
  const inserted = await db()("idempotency_keys")
    .insert({ ...name, request_hash: requestHash, created_at: new Date().toISOString() })
    .onConflict(["user_id", "route", "key"])
    .ignore()
    .returning("key");
  if (inserted.length > 0) return undefined;
  return db()("idempotency_keys").where(name).first<KeptRow>();
}

function answerAgain(row: KeptRow, requestHash: string): Response {
  if (row.request_hash !== requestHash) {
    throw new HttpProblem("conflict", {
      detail: "This Idempotency-Key was used with another body.",
    });
  }
  if (row.status === null) {
    throw new HttpProblem("conflict", {
      detail: "The first request with this Idempotency-Key is still under way.",
    });
  }
  const headers = { ...JSON.parse(row.headers ?? "{}"), "idempotent-replay": "true" };
  return new Response(row.body || null, { status: row.status, headers });
}

async function forget(name: Name): Promise<void> {
  await db()("idempotency_keys").where(name).delete();
}

/** Keep an answer for repeats. A failure is forgotten, and a session is never handed out twice. */
async function keep(name: Name, response: Response): Promise<void> {
  if (!response.ok || response.headers.has("set-cookie")) return forget(name);
  const { status } = response;
  const headers = JSON.stringify(Object.fromEntries(response.headers));
  const body = await response.clone().text();
  await db()("idempotency_keys").where(name).update({ status, headers, body });
}

/**
 * Do `work` once for a person, route and `Idempotency-Key`; a repeat gets the first answer. A failed
 * request is forgotten, so that it may be tried again.
 */
export async function once(attempt: Attempt, work: () => Promise<Response>): Promise<Response> {
  const { request, userId, body } = attempt;
  const key = request.headers.get("idempotency-key");
  if (key === null) return work();
  requireKey(key);
  const route = `${request.method} ${new URL(request.url).pathname}`.slice(0, 200);
  const name = { user_id: userId, route, key };
  const kept = await claim(name, hashOf(body));
  if (kept) return answerAgain(kept, hashOf(body));
  try {
    const response = await work();
    await keep(name, response);
    return response;
  } catch (error) {
    await forget(name);
    throw error;
  }
}

/** Forget writes that a stopped server left half done: nobody is working on them any more. */
export async function forgetUnfinished(): Promise<void> {
  await db()("idempotency_keys").whereNull("status").delete();
}

/** Forget the answers given before a time. */
export async function forgetAnswersBefore(time: Date): Promise<void> {
  await db()("idempotency_keys").where("created_at", "<", time.toISOString()).delete();
}
