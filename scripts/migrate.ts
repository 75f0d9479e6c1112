import knex from "knex";
import { DamagedDatabaseError, migrate } from "../db/migrate";
import { knexConfig } from "../knexfile";
import { settings } from "../lib/settings";

/** `npm run migrate`: bring the database file to the newest shape. */
const database = knex(knexConfig(settings().databaseFile));
try {
  await migrate(database);
} catch (error) {
  if (!(error instanceof DamagedDatabaseError)) throw error;
  console.error(`${settings().databaseFile}: ${error.message}`);
  process.exitCode = 1;
} finally {
  await database.destroy();
}
