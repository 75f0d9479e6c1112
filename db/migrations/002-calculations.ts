import type { Knex } from "knex";

const fixed = [
  "calculation_id",
  "number",
  "body",
  "results",
  "content_hash",
  "edition",
  "edition_hash",
  "engine",
  "author_id",
  "authors",
  "summary",
  "lineage",
  "previous_hash",
  "pinned_at",
];

/** A version never changes and never goes: only its withdrawal may be entered, once and whole. */
const immutability = [
  `CREATE TRIGGER versions_are_immutable BEFORE UPDATE ON versions
   WHEN ${fixed.map((column) => `NEW.${column} IS NOT OLD.${column}`).join(" OR ")}
   BEGIN SELECT RAISE(ABORT, 'a version cannot be changed'); END`,
  `CREATE TRIGGER withdrawals_are_final BEFORE UPDATE ON versions
   WHEN OLD.withdrawn_at IS NOT NULL
     AND (NEW.withdrawn_at IS NOT OLD.withdrawn_at OR NEW.withdrawn_reason IS NOT OLD.withdrawn_reason)
   BEGIN SELECT RAISE(ABORT, 'a withdrawal cannot be changed'); END`,
  `CREATE TRIGGER withdrawals_have_reasons BEFORE UPDATE ON versions
   WHEN (NEW.withdrawn_at IS NULL) <> (NEW.withdrawn_reason IS NULL)
   BEGIN SELECT RAISE(ABORT, 'a withdrawal has a time and a reason'); END`,
  `CREATE TRIGGER versions_are_kept BEFORE DELETE ON versions
   BEGIN SELECT RAISE(ABORT, 'a version cannot be deleted'); END`,
  `CREATE TRIGGER versions_are_not_replaced BEFORE INSERT ON versions
   WHEN EXISTS (SELECT 1 FROM versions WHERE calculation_id = NEW.calculation_id AND number = NEW.number)
   BEGIN SELECT RAISE(ABORT, 'a version cannot be replaced'); END`,
  // The foreign key says the same, but a program that opens the file may have keys switched off.
  `CREATE TRIGGER calculations_with_versions_are_kept BEFORE DELETE ON calculations
   WHEN EXISTS (SELECT 1 FROM versions WHERE calculation_id = OLD.id)
   BEGIN SELECT RAISE(ABORT, 'a calculation with versions cannot be deleted'); END`,
  `CREATE TRIGGER calculations_keep_their_names BEFORE UPDATE OF id ON calculations
   WHEN NEW.id IS NOT OLD.id
   BEGIN SELECT RAISE(ABORT, 'a calculation keeps its id'); END`,
];

/** Calculations, every saved draft as a numbered revision, and the versions pinned from them. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable("calculations", (table) => {
    table.string("id", 10).primary();
    table.string("owner_id", 26).notNullable().references("id").inTable("users");
    table.enu("visibility", ["private", "link", "public"]).notNullable().defaultTo("private");
    table.integer("revision").notNullable().defaultTo(0);
    // Copied from the current revision, for lists.
    table.string("title", 300).notNullable().defaultTo("");
    table.text("abstract").notNullable().defaultTo("");
    table.string("forked_from_calculation", 10);
    table.integer("forked_from_version");
    table.string("created_at").notNullable();
    table.string("updated_at").notNullable();
    table.index(["owner_id", "updated_at"]);
    table.index(["visibility", "updated_at"]);
  });
  await knex.schema.createTable("revisions", (table) => {
    table.string("calculation_id", 10).notNullable().references("id").inTable("calculations");
    table.integer("number").notNullable();
    table.string("author_id", 26).notNullable().references("id").inTable("users");
    table.text("body").notNullable();
    table.string("hash", 71).notNullable();
    table.string("saved_at").notNullable();
    table.primary(["calculation_id", "number"]);
  });
  await knex.schema.createTable("versions", (table) => {
    table.string("calculation_id", 10).notNullable().references("id").inTable("calculations");
    table.integer("number").notNullable();
    table.text("body").notNullable();
    table.text("results").notNullable();
    table.string("content_hash", 71).notNullable();
    table.string("edition").notNullable();
    table.string("edition_hash", 71).notNullable();
    table.string("engine").notNullable();
    table.string("author_id", 26).notNullable().references("id").inTable("users");
    table.text("authors").notNullable();
    table.text("summary").notNullable();
    table.text("lineage").notNullable();
    // Hash of the version before this one: the chain that a changed row would break.
    table.string("previous_hash", 71);
    table.string("pinned_at").notNullable();
    table.string("withdrawn_at");
    table.text("withdrawn_reason");
    table.primary(["calculation_id", "number"]);
  });
  for (const trigger of immutability) await knex.raw(trigger);
}

export async function down(knex: Knex): Promise<void> {
  // Dropping a table deletes its rows, which the triggers of the table below it would refuse.
  await knex.raw("DROP TRIGGER calculations_with_versions_are_kept");
  await knex.schema.dropTable("versions");
  await knex.schema.dropTable("revisions");
  await knex.schema.dropTable("calculations");
}
