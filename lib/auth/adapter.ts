import { createHash } from "node:crypto";
import type { Adapter, DatabaseSession, DatabaseUser } from "lucia";
import { db } from "@/db";
import { type PersonRow, reshapePerson } from "./people";

interface SessionRow {
  id: string;
  user_id: string;
  expires_at: string;
  created_at: string;
  last_seen_at: string;
  user_agent: string;
}

/** The secret in the cookie is never stored; its SHA-256 is. */
export function sessionKey(secret: string): string {
  return createHash("sha256").update(secret).digest("hex");
}

function reshapeSession(row: SessionRow, id: string): DatabaseSession {
  return {
    id,
    userId: row.user_id,
    expiresAt: new Date(row.expires_at),
    attributes: {
      createdAt: row.created_at,
      lastSeenAt: row.last_seen_at,
      userAgent: row.user_agent,
    },
  };
}

async function sessionAndUser(
  secret: string,
): Promise<[session: DatabaseSession | null, user: DatabaseUser | null]> {
  const row = await db()("sessions")
    .where({ id: sessionKey(secret) })
    .first<SessionRow>();
  if (!row) return [null, null];
  const user = await db()("users").where({ id: row.user_id }).first<PersonRow>();
  if (!user) return [null, null];
  return [reshapeSession(row, secret), { id: user.id, attributes: reshapePerson(user) }];
}

/** Sessions in our own tables, for the session library. */
export const sessionAdapter: Adapter = {
  getSessionAndUser: sessionAndUser,
  getUserSessions: async (userId) => {
    const rows = await db()("sessions").where({ user_id: userId }).select<SessionRow[]>();
    return rows.map((row) => reshapeSession(row, row.id));
  },
  setSession: async (session) => {
    await db()("sessions").insert({
      id: sessionKey(session.id),
      user_id: session.userId,
      expires_at: session.expiresAt.toISOString(),
      created_at: session.attributes.createdAt,
      last_seen_at: session.attributes.lastSeenAt,
      user_agent: session.attributes.userAgent,
    });
  },
  updateSessionExpiration: async (secret, expiresAt) => {
    await db()("sessions")
      .where({ id: sessionKey(secret) })
      .update({ expires_at: expiresAt.toISOString() });
  },
  deleteSession: async (secret) => {
    await db()("sessions")
      .where({ id: sessionKey(secret) })
      .delete();
  },
  deleteUserSessions: async (userId) => {
    await db()("sessions").where({ user_id: userId }).delete();
  },
  deleteExpiredSessions: async () => {
    await db()("sessions").where("expires_at", "<=", new Date().toISOString()).delete();
  },
};
