import type { Knex } from "knex";

/** People, their sessions, and the tokens that are mailed to them. Times are UTC, ISO 8601. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable("users", (table) => {
    table.string("id", 26).primary();
    table.string("email", 254).notNullable();
    // The address as it is compared: lower case.
    table.string("email_key", 254).notNullable().index();
    table.string("name", 120).notNullable();
    table.string("password_hash").notNullable();
    table.string("email_confirmed_at");
    table.string("created_at").notNullable();
  });
  // Until an address is confirmed anybody may have typed it; only one account can hold it confirmed.
  await knex.raw(
    "CREATE UNIQUE INDEX users_confirmed_email ON users (email_key) WHERE email_confirmed_at IS NOT NULL",
  );
  await knex.schema.createTable("sessions", (table) => {
    // Only the hash of the session's secret is kept.
    table.string("id", 64).primary();
    table.string("user_id", 26).notNullable().references("id").inTable("users").onDelete("CASCADE");
    table.string("expires_at").notNullable();
    table.string("created_at").notNullable();
    table.string("last_seen_at").notNullable();
    table.string("user_agent", 300).notNullable().defaultTo("");
    table.index("user_id");
  });
  await knex.schema.createTable("email_tokens", (table) => {
    table.string("token_hash", 64).primary();
    table.string("user_id", 26).notNullable().references("id").inTable("users").onDelete("CASCADE");
    table.enu("purpose", ["confirm", "reset"]).notNullable();
    table.string("created_at").notNullable();
    table.string("expires_at").notNullable();
    table.index("user_id");
  });
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("email_tokens");
  await knex.schema.dropTable("sessions");
  await knex.schema.dropTable("users");
}
