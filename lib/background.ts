import "server-only";
import { db } from "@/db";
import { DamagedDatabaseError, migrate } from "@/db/migrate";
import { sessionAdapter } from "@/lib/auth/adapter";
import { startEvaluators } from "@/lib/evaluator";
import { forgetAnswersBefore, forgetUnfinished, notePeerAddresses } from "@/lib/http";
import { deliverDueMail } from "@/lib/mail";
import { SettingsError, settings } from "@/lib/settings";

const mailEveryMs = 2_000;
const sweepEveryMs = 3600 * 1000;
/** Answers to repeated writes are kept this long. */
const idempotencyMs = 24 * 3600 * 1000;

const kept = globalThis as { leadingOrderBackground?: boolean };

/** Repeat some work, never two rounds at once; a round that fails is told and tried again. */
function repeat(everyMs: number, work: () => Promise<unknown>): void {
  const round = async () => {
    try {
      await work();
    } catch (error) {
      console.error("background work failed", error);
    }
    setTimeout(round, everyMs).unref();
  };
  setTimeout(round, everyMs).unref();
}

async function sweep(): Promise<void> {
  const now = Date.now();
  await sessionAdapter.deleteExpiredSessions();
  await db()("email_tokens").where("expires_at", "<", new Date(now).toISOString()).delete();
  await forgetAnswersBefore(new Date(now - idempotencyMs));
}

async function start(): Promise<void> {
  const { mailUrl, localMail } = settings();
  if (mailUrl === undefined && !localMail) {
    console.warn("MAIL_URL is not set: mail waits in the outbox and is not sent.");
  }
  notePeerAddresses();
  await migrate(db());
  await forgetUnfinished();
  await startEvaluators();
  repeat(mailEveryMs, deliverDueMail);
  repeat(sweepEveryMs, sweep);
}

/** End a server that cannot start; without a stack where the reader can put it right. */
function giveUp(error: unknown): never {
  if (error instanceof DamagedDatabaseError) {
    console.error(`${settings().databaseFile}: ${error.message}`);
  } else console.error(error instanceof SettingsError ? error.message : error);
  process.exit(1);
}

/**
 * Bring the database to its newest shape, warm the evaluators, send mail and sweep out. Ends the
 * process where that fails: a server that answers nothing but errors helps nobody.
 */
export async function startBackground(): Promise<void> {
  if (kept.leadingOrderBackground) return;
  kept.leadingOrderBackground = true;
  await start().catch(giveUp);
}
