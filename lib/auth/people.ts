import { randomBytes } from "node:crypto";
import type { Knex } from "knex";
import type { Person } from "@/lib/schema";

/** A row of the table of people; stays inside lib/auth. */
export interface PersonRow {
  id: string;
  email: string;
  email_key: string;
  name: string;
  password_hash: string;
  email_confirmed_at: string | null;
  created_at: string;
}

/** Row to domain; the password hash stays behind. */
export function reshapePerson(row: PersonRow): Person {
  return {
    id: row.id,
    name: row.name,
    email: row.email,
    emailConfirmed: row.email_confirmed_at !== null,
  };
}

/** An address as it is compared. */
export function emailKey(email: string): string {
  return email.trim().toLowerCase();
}

/** Unconfirmed claims to one address beyond this are refused. */
export const mostClaims = 2;
/** Accounts of one address: the confirmed one and the claims. */
export const mostAccounts = 1 + mostClaims;

/** Accounts that claim an address: the confirmed one first, then the oldest. */
export async function findAccounts(tx: Knex, email: string): Promise<PersonRow[]> {
  return tx("users")
    .where({ email_key: emailKey(email) })
    .orderByRaw("email_confirmed_at IS NULL")
    .orderBy("created_at")
    .limit(mostAccounts)
    .select<PersonRow[]>();
}

/** Enter a new account, its address unconfirmed. */
export async function insertPerson(
  tx: Knex,
  person: { email: string; name: string; passwordHash: string },
): Promise<PersonRow> {
  const row: PersonRow = {
    id: randomBytes(13).toString("hex"),
    email: person.email.trim(),
    email_key: emailKey(person.email),
    name: person.name,
    password_hash: person.passwordHash,
    email_confirmed_at: null,
    created_at: new Date().toISOString(),
  };
  await tx("users").insert(row);
  return row;
}

/** Change the name a person publishes under; versions already pinned keep the old one. */
export async function renamePerson(tx: Knex, id: string, name: string): Promise<void> {
  await tx("users").where({ id }).update({ name });
}
