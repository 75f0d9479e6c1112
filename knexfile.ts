import { mkdirSync } from "node:fs";
import path from "node:path";
import type { Knex } from "knex";

interface SqliteConnection {
  pragma(text: string): unknown;
}

/**
 * The database: one SQLite file. Write-ahead log so that readers never wait; every commit reaches the
 * disk before it is acknowledged.
 */
export function knexConfig(file: string): Knex.Config {
  if (file !== ":memory:") mkdirSync(path.dirname(path.resolve(file)), { recursive: true });
  return {
    client: "better-sqlite3",
    connection: { filename: file },
    useNullAsDefault: true,
    pool: {
      min: 1,
      max: 1,
      afterCreate(connection: SqliteConnection, done: (error: Error | null) => void) {
        connection.pragma("journal_mode = WAL");
        connection.pragma("synchronous = FULL");
        connection.pragma("foreign_keys = ON");
        connection.pragma("busy_timeout = 5000");
        done(null);
      },
    },
    migrations: {
      directory: path.join(import.meta.dirname ?? ".", "db", "migrations"),
      extension: "ts",
    },
  };
}

export default knexConfig(process.env.DATABASE_FILE ?? "var/leading-order.sqlite");
