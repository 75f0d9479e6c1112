import { setTimeout } from "node:timers/promises";
import { db, type Knex, transaction } from "@/db";
import { enqueue } from "@/lib/mail";
import { passwordChanged, resetPassword as resetMail } from "@/lib/mail/templates";
import type { Person } from "@/lib/schema";
import { findPassword, hashPassword, verifyPassword } from "./passwords";
import { findAccounts, mostAccounts, type PersonRow, reshapePerson } from "./people";
import type { SignedIn } from "./sessions";
import { markConfirmed } from "./sign-up";
import { issueToken, spendToken } from "./tokens";

/** The person with this address and password; undefined otherwise, in the same time. */
export async function signIn(email: string, password: string): Promise<Person | undefined> {
  const accounts = await findAccounts(db(), email);
  const hashes = accounts.map((account) => account.password_hash);
  const account = accounts[await findPassword(hashes, password, mostAccounts)];
  return account && reshapePerson(account);
}

async function mailReset(email: string): Promise<void> {
  await transaction(async (tx) => {
    const accounts = await findAccounts(tx, email);
    const confirmed = accounts.filter((account) => account.email_confirmed_at !== null);
    for (const account of confirmed.length > 0 ? confirmed : accounts) {
      await enqueue(tx, resetMail(account, await issueToken(tx, account.id, "reset")));
    }
  });
}

/** A request for a link takes this long, whether or not there is something to write and to mail. */
const resetRequestMs = 250;

/** Mail a link to set a new password, if the address is known. The caller is told nothing. */
export async function requestReset(email: string): Promise<void> {
  await Promise.all([mailReset(email), setTimeout(resetRequestMs)]);
}

async function replacePassword(tx: Knex, id: string, passwordHash: string): Promise<void> {
  await tx("users").where({ id }).update({ password_hash: passwordHash });
  await tx("sessions").where({ user_id: id }).delete();
  await tx("email_tokens").where({ user_id: id, purpose: "reset" }).delete();
}

/**
 * Set a new password by a mailed token; ends every session. Who can read the mail has confirmed the
 * address. Undefined where the token is not good any more.
 */
export async function resetPassword(token: string, password: string): Promise<Person | undefined> {
  const passwordHash = await hashPassword(password);
  const userId = await transaction(async (tx) => {
    const id = await spendToken(tx, token, "reset");
    if (id === undefined) return undefined;
    await replacePassword(tx, id, passwordHash);
    await markConfirmed(tx, id);
    return id;
  });
  const row = userId && (await db()("users").where({ id: userId }).first<PersonRow>());
  return row ? reshapePerson(row) : undefined;
}

/**
 * Change one's password; ends every session, this one too, and links to set a new password. The caller
 * opens a new session. False where the current password is wrong.
 */
export async function changePassword(
  person: SignedIn,
  current: string,
  next: string,
): Promise<boolean> {
  const row = await db()("users").where({ id: person.id }).first<PersonRow>();
  if (!row || !(await verifyPassword(row.password_hash, current))) return false;
  const passwordHash = await hashPassword(next);
  await transaction(async (tx) => {
    await replacePassword(tx, person.id, passwordHash);
    if (person.emailConfirmed) await enqueue(tx, passwordChanged(person));
  });
  return true;
}
