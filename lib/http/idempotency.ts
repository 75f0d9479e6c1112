import { createHash } from "node:crypto";
import { db } from "@/db";
import { HttpProblem } from "./problems";

const keyPattern = /^[\x21-\x7e]{1,200}$/;

interface Entry {
  readonly userId: string;
  readonly key: string;
  readonly route: string;
  readonly requestHash: string;
}

interface KeptRow {
  request_hash: string;
  status: number | null;
  body: string | null;
}

function hashOf(body: unknown): string {
  return createHash("sha256")
    .update(JSON.stringify(body ?? null))
    .digest("hex");
}

async function claim(entry: Entry): Promise<KeptRow | undefined> {
  const where = { user_id: entry.userId, route: entry.route, key: entry.key };
  const inserted = await db()("idempotency_keys")
    .insert({ ...where, request_hash: entry.requestHash, created_at: new Date().toISOString() })
    .onConflict(["user_id", "route", "key"])
    .ignore()
    .returning("key");
  if (inserted.length > 0) return undefined;
  return db()("idempotency_keys").where(where).first<KeptRow>();
}

function answerAgain(row: KeptRow, entry: Entry): Response {
  if (row.request_hash !== entry.requestHash) {
    throw new HttpProblem("conflict", {
      detail: "This Idempotency-Key was used with another body.",
    });
  }
  if (row.status === null) {
    throw new HttpProblem("conflict", {
      detail: "The first request with this Idempotency-Key is still under way.",
    });
  }
  return new Response(row.body, {
    status: row.status,
    headers: { "content-type": "application/json; charset=utf-8", "idempotent-replay": "true" },
  });
}

/**
 * Do `work` once for a person, route and `Idempotency-Key`; a repeat gets the first answer. A failed
 * request is forgotten, so that it may be tried again.
 */
export async function once(
  request: Request,
  userId: string,
  body: unknown,
  work: () => Promise<Response>,
): Promise<Response> {
  const key = request.headers.get("idempotency-key");
  if (key === null) return work();
  if (!keyPattern.test(key)) {
    const errors = [{ path: "Idempotency-Key", message: "1 to 200 printable ASCII characters." }];
    throw new HttpProblem("validation", { errors });
  }
  const route = `${request.method} ${new URL(request.url).pathname}`.slice(0, 200);
  const entry = { userId, key, route, requestHash: hashOf(body) };
  const kept = await claim(entry);
  if (kept) return answerAgain(kept, entry);
  const where = { user_id: userId, route, key };
  try {
    const response = await work();
    const text = await response.clone().text();
    if (response.ok)
      await db()("idempotency_keys").where(where).update({ status: response.status, body: text });
    else await db()("idempotency_keys").where(where).delete();
    return response;
  } catch (error) {
    await db()("idempotency_keys").where(where).delete();
    throw error;
  }
}
