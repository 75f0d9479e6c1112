import type { Knex } from "knex";
import * as people from "./001-people";
import * as calculations from "./002-calculations";
import * as outbox from "./003-outbox";

interface Migration {
  up(knex: Knex): Promise<void>;
  down(knex: Knex): Promise<void>;
}

const migrations: Record<string, Migration> = {
  "001-people": people,
  "002-calculations": calculations,
  "003-outbox": outbox,
};

/** The migrations by name, so that they run wherever the code runs, bundled or not. */
export const migrationSource: Knex.MigrationSource<string> = {
  getMigrations: async () => Object.keys(migrations),
  getMigrationName: (name) => name,
  getMigration: async (name) => {
    const migration = migrations[name];
    if (!migration) throw new Error(`there is no migration ${name}`);
    return migration;
  },
};
