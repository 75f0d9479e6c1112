import { db } from "@/db";
import type { Person, SessionInfo } from "@/lib/schema";
import { sessionKey } from "./adapter";
import { lucia } from "./session-library";

/** A signed-in person and the secret of the session they came with. */
export interface SignedIn extends Person {
  readonly sessionSecret: string;
}

/** Times of a session are refreshed at most this often. */
const refreshMs = 60_000;
/** A session ends this long after signing in, however much it is used. */
const longestMs = 30 * 24 * 3600 * 1000;

/** Open a session; gives the `Set-Cookie` header that carries it. */
export async function openSession(userId: string, userAgent: string): Promise<string> {
  const now = new Date().toISOString();
  const attributes = { createdAt: now, lastSeenAt: now, userAgent: userAgent.slice(0, 300) };
  const session = await lucia().createSession(userId, attributes);
  return lucia().createSessionCookie(session.id).serialize();
}

/** The `Set-Cookie` header that takes the cookie away. */
export function blankCookie(): string {
  return lucia().createBlankSessionCookie().serialize();
}

async function noteSeen(secret: string, lastSeenAt: string): Promise<void> {
  if (Date.now() - Date.parse(lastSeenAt) < refreshMs) return;
  await db()("sessions")
    .where({ id: sessionKey(secret) })
    .update({ last_seen_at: new Date().toISOString() });
}

/** Not from the future, which would mean a clock set back and a session that outlives its time. */
function isInItsTime(createdAt: string): boolean {
  const ageMs = Date.now() - Date.parse(createdAt);
  return ageMs > -refreshMs && ageMs < longestMs;
}

/** The person a session secret belongs to; null for an unknown or expired one. */
export async function personOfSession(secret: string | null | undefined): Promise<SignedIn | null> {
  if (!secret) return null;
  const { session, user } = await lucia().validateSession(secret);
  if (!session || !isInItsTime(session.createdAt)) return null;
  await noteSeen(secret, session.lastSeenAt);
  const { id, name, email, emailConfirmed } = user;
  return { id, name, email, emailConfirmed, sessionSecret: secret };
}

/** The person a request comes from, by its cookie. */
export async function personFromRequest(request: Request): Promise<SignedIn | null> {
  return personOfSession(lucia().readSessionCookie(request.headers.get("cookie") ?? ""));
}

/** Under TLS the name has the prefix that ties the cookie to this host. */
export function sessionCookieName(): string {
  return lucia().sessionCookieName;
}

/** End the session a person came with: its secret is worth nothing from now on. */
export async function closeSession(person: SignedIn): Promise<void> {
  await lucia().invalidateSession(person.sessionSecret);
}

/** A person's open sessions, the latest first. */
export async function listSessions(person: SignedIn): Promise<SessionInfo[]> {
  const rows = await db()("sessions")
    .where({ user_id: person.id })
    .where("expires_at", ">", new Date().toISOString())
    .orderBy("last_seen_at", "desc")
    .select<{ id: string; created_at: string; last_seen_at: string; user_agent: string }[]>(
      "id",
      "created_at",
      "last_seen_at",
      "user_agent",
    );
  const current = sessionKey(person.sessionSecret);
  return rows.map((row) => ({
    id: row.id,
    createdAt: row.created_at,
    lastSeenAt: row.last_seen_at,
    userAgent: row.user_agent,
    current: row.id === current,
  }));
}

/** End one of a person's own sessions; false where it is none of theirs. */
export async function revokeSession(person: SignedIn, id: string): Promise<boolean> {
  const ended = await db()("sessions").where({ id, user_id: person.id }).delete();
  return ended > 0;
}
