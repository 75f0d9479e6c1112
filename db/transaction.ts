import "server-only";
import type { Knex } from "knex";
import { db } from "./connection";

type Work<T> = (tx: Knex.Transaction) => Promise<T>;

/**
 * Take the write lock before anything is read. Without it a transaction that reads first is refused
 * when it comes to write, if another process has written in between.
 */
async function takeWriteLock(tx: Knex.Transaction): Promise<void> {
  await tx.raw("DELETE FROM outbox WHERE 0 = 1");
}

/**
 * Run `work` in one transaction: all of its writes are on disk when this resolves, or none. There is
 * one connection, so transactions of this process follow one another; inside, use `tx` alone. Rejects
 * with the error of the work.
 */
export async function transaction<T>(work: Work<T>): Promise<T> {
  const causes: unknown[] = [];
  const run = async (tx: Knex.Transaction) => {
    await takeWriteLock(tx);
    return work(tx);
  };
  try {
    return await db().transaction((tx) =>
      run(tx).catch((error: unknown) => {
        causes.push(error);
        throw error;
      }),
    );
  } catch (error) {
    // On a full disk the file rolls back by itself, and the second rollback would hide the cause.
    throw causes.length > 0 ? causes[0] : error;
  }
}
