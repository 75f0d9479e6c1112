import "server-only";
import type { Knex } from "knex";
import { db } from "./connection";

/**
 * Take the write lock before anything is read. Without it a transaction that reads first is refused
 * when it comes to write, if another process has written in between.
 */
async function takeWriteLock(tx: Knex.Transaction): Promise<void> {
  await tx.raw("DELETE FROM outbox WHERE 0 = 1");
}

/**
 * Run `work` in one transaction: all of its writes are on disk when this resolves, or none. There is
 * one connection, so transactions of this process follow one another; inside, use `tx` alone.
 */
export async function transaction<T>(work: (tx: Knex.Transaction) => Promise<T>): Promise<T> {
  return db().transaction(async (tx) => {
    await takeWriteLock(tx);
    return work(tx);
  });
}
