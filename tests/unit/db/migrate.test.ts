import { readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import knex, { type Knex } from "knex";
import { afterEach, describe, expect, it, vi } from "vitest";
import { DamagedDatabaseError, migrate } from "@/db/migrate";
import { migrationSource } from "@/db/migrations";
import { knexConfig } from "@/knexfile";
import { withFolder } from "@/tests/support/database";

const folder = withFolder();
const open: Knex[] = [];
let files = 0;

function database(file = path.join(folder, `${files++}.sqlite`)): Knex {
  const made = knex(knexConfig(file));
  open.push(made);
  return made;
}

async function tables(one: Knex): Promise<string[]> {
  const rows: { name: string }[] = await one("sqlite_master")
    .where({ type: "table" })
    .whereNot("name", "like", "sqlite%")
    .whereNot("name", "like", "knex%")
    .orderBy("name")
    .select("name");
  return rows.map((row) => row.name);
}

const pragma = async (one: Knex, name: string) =>
  Object.values((await one.raw(`PRAGMA ${name}`))[0])[0];

afterEach(async () => {
  await Promise.all(open.splice(0).map((one) => one.destroy()));
});

describe("migrate", () => {
  it("makes every table, and finds nothing to do the second time", async () => {
    const one = database();
    await migrate(one);
    await migrate(one);
    expect(await tables(one)).toEqual([
      "calculations",
      "email_tokens",
      "idempotency_keys",
      "outbox",
      "revisions",
      "sessions",
      "users",
      "versions",
    ]);
  });

  it("goes all the way down and up again", async () => {
    const one = database();
    await migrate(one);
    await one.migrate.rollback({ migrationSource }, true);
    expect(await tables(one)).toEqual([]);
    await migrate(one);
    expect(await tables(one)).toContain("versions");
  });

  it("rolls a migration that fails back whole", async () => {
    const one = database();
    await migrate(one);
    const failing: Knex.MigrationSource<string> = {
      ...migrationSource,
      getMigrations: async (extensions) => [
        ...(await migrationSource.getMigrations(extensions)),
        "999-fails",
      ],
      getMigration: async (name) =>
        name === "999-fails"
          ? {
              up: async (tx: Knex) => {
                await tx.schema.createTable("half_done", (table) => table.increments());
                await tx.raw("this is not SQL");
              },
              down: async () => {},
            }
          : migrationSource.getMigration(name),
    };
    const quiet = vi.spyOn(console, "log").mockImplementation(() => {});
    await expect(one.migrate.latest({ migrationSource: failing })).rejects.toThrow();
    quiet.mockRestore();
    expect(await tables(one)).not.toContain("half_done");
    await migrate(one);
  });

  it("refuses a file that is no database", async () => {
    const file = path.join(folder, "garbage.sqlite");
    writeFileSync(file, "this was never a database".repeat(100));
    const quiet = vi.spyOn(console, "log").mockImplementation(() => {});
    await expect(migrate(database(file))).rejects.toThrow(DamagedDatabaseError);
    quiet.mockRestore();
    expect(readFileSync(file, "utf8")).toMatch(/^this was never/);
  });

  it("refuses a database with a damaged page, and leaves it as it is", async () => {
    const file = path.join(folder, "damaged.sqlite");
    const one = database(file);
    await migrate(one);
    await one.destroy();
    const bytes = readFileSync(file);
    bytes.fill(0x5a, 4096 * 3, 4096 * 5);
    writeFileSync(file, bytes);
    await expect(migrate(database(file))).rejects.toThrow(/damaged.*backup/s);
    expect(readFileSync(file).equals(bytes)).toBe(true);
  });
});

describe("a connection", () => {
  it.each([
    ["journal_mode", "wal"],
    ["synchronous", 2],
    ["foreign_keys", 1],
    ["busy_timeout", 5000],
  ])("has %s = %s", async (name, value) => {
    expect(await pragma(database(), name)).toBe(value);
  });
});
