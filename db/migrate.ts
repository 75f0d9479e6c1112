import type { Knex } from "knex";
import { migrationSource } from "./migrations";

/** The database file is damaged: starting would make it worse. */
export class DamagedDatabaseError extends Error {}

async function requireSound(knex: Knex): Promise<void> {
  let report: unknown;
  try {
    report = await knex.raw("PRAGMA quick_check(1)");
  } catch (error) {
    report = error instanceof Error ? error.message : error;
  }
  const [row] = Array.isArray(report) ? (report as { quick_check?: string }[]) : [];
  if (row?.quick_check === "ok") return;
  throw new DamagedDatabaseError(
    "The database file is damaged. Stop the server, keep the file aside, and put a backup in its place.",
  );
}

/** Bring a database to the newest shape. A migration that fails is rolled back whole. */
export async function migrate(knex: Knex): Promise<void> {
  await requireSound(knex);
  await knex.migrate.latest({ migrationSource });
}
