import "server-only";
import knex, { type Knex } from "knex";
import { knexConfig } from "@/knexfile";
import { settings } from "@/lib/settings";

// Kept on the global object so that a development reload does not open the file again and again.
const kept = globalThis as { leadingOrderDatabase?: Knex };

/** The database of this process, opened when first asked for. */
export function db(): Knex {
  kept.leadingOrderDatabase ??= knex(knexConfig(settings().databaseFile));
  return kept.leadingOrderDatabase;
}

/** Close the database; the next call of `db` opens it again. */
export async function closeDatabase(): Promise<void> {
  await kept.leadingOrderDatabase?.destroy();
  delete kept.leadingOrderDatabase;
}
