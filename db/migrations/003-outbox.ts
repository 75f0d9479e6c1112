import type { Knex } from "knex";

/** Mail waiting to be sent, and answers to writes that may be repeated. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable("outbox", (table) => {
    table.increments("id");
    table.string("recipient", 254).notNullable();
    table.string("kind").notNullable();
    table.string("subject", 300).notNullable();
    table.text("text").notNullable();
    table.text("html").notNullable();
    table.string("created_at").notNullable();
    table.string("sent_at");
    table.integer("attempts").notNullable().defaultTo(0);
    table.string("next_attempt_at").notNullable();
    table.text("last_error");
    table.index(["sent_at", "next_attempt_at"]);
  });
  await knex.schema.createTable("idempotency_keys", (table) => {
    table.string("user_id", 26).notNullable().references("id").inTable("users").onDelete("CASCADE");
    table.string("key", 200).notNullable();
    table.string("route", 200).notNullable();
    table.string("request_hash", 64).notNullable();
    // Empty until the first request with the key is answered.
    table.integer("status");
    table.text("headers");
    table.text("body");
    table.string("created_at").notNullable();
    table.primary(["user_id", "route", "key"]);
  });
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("idempotency_keys");
  await knex.schema.dropTable("outbox");
}
