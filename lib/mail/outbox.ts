import type { Knex } from "knex";
import { db } from "@/db";
import type { MailMessage } from "./message";

/** A mail in the outbox. */
export interface WaitingMail extends MailMessage {
  readonly id: number;
  readonly createdAt: string;
  readonly attempts: number;
}

interface OutboxRow {
  id: number;
  recipient: string;
  kind: string;
  subject: string;
  text: string;
  html: string;
  created_at: string;
  attempts: number;
}

/** Put a mail into the outbox, in the transaction of what it tells of: both happen or neither. */
export async function enqueue(tx: Knex, message: MailMessage): Promise<void> {
  const now = new Date().toISOString();
  await tx("outbox").insert({ ...message, created_at: now, next_attempt_at: now });
}

function reshape(row: OutboxRow): WaitingMail {
  const { id, kind, recipient, subject, text, html, attempts } = row;
  return { id, kind, recipient, subject, text, html, attempts, createdAt: row.created_at };
}

/** Mail that is due, oldest first. */
export async function dueMail(most: number): Promise<WaitingMail[]> {
  const rows = await db()("outbox")
    .whereNull("sent_at")
    .where("next_attempt_at", "<=", new Date().toISOString())
    .orderBy("id")
    .limit(most)
    .select<OutboxRow[]>();
  return rows.map(reshape);
}

export async function markSent(id: number): Promise<void> {
  await db()("outbox")
    .where({ id })
    .update({ sent_at: new Date().toISOString(), last_error: null });
}

/** Milliseconds until the next try: a minute, doubling, at most six hours. */
export function backOffMs(attempts: number): number {
  return Math.min(60_000 * 2 ** Math.min(attempts, 12), 6 * 3600 * 1000);
}

export async function markFailed(mail: WaitingMail, error: unknown): Promise<void> {
  const next = new Date(Date.now() + backOffMs(mail.attempts)).toISOString();
  const text = error instanceof Error ? error.message : String(error);
  await db()("outbox")
    .where({ id: mail.id })
    .update({ attempts: mail.attempts + 1, next_attempt_at: next, last_error: text.slice(0, 500) });
}

/** The latest mail, newest first: what the local mail page shows. */
export async function listLocalMail(most = 100): Promise<WaitingMail[]> {
  const rows = await db()("outbox").orderBy("id", "desc").limit(most).select<OutboxRow[]>();
  return rows.map(reshape);
}
