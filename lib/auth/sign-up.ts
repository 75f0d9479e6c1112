import { db, transaction } from "@/db";
import { enqueue } from "@/lib/mail";
import { confirmAddress, somebodyTriedToSignUp } from "@/lib/mail/templates";
import type { Person } from "@/lib/schema";
import { hashPassword } from "./passwords";
import { findAccounts, insertPerson, mostClaims, type PersonRow, reshapePerson } from "./people";
import { issueToken, spendToken } from "./tokens";

/**
 * Make an account and mail a link to confirm its address. Whether the address is known is not told:
 * an account is made in any case, with the same answer. Where a confirmed one exists its owner is told
 * by mail, and the new one can never be confirmed. Undefined when others claim the address without
 * having confirmed it; its owner gets at those by a link to set a new password.
 */
export async function signUp(entry: {
  email: string;
  name: string;
  password: string;
}): Promise<Person | undefined> {
  const passwordHash = await hashPassword(entry.password);
  return transaction(async (tx) => {
    const accounts = await findAccounts(tx, entry.email);
    const owner = accounts.find((account) => account.email_confirmed_at !== null);
    // The owner is not counted: a refusal that came one claim earlier would tell of them.
    if (accounts.length - (owner ? 1 : 0) >= mostClaims) return undefined;
    const row = await insertPerson(tx, { ...entry, passwordHash });
    if (owner) await enqueue(tx, somebodyTriedToSignUp(owner));
    else await enqueue(tx, confirmAddress(row, await issueToken(tx, row.id, "confirm")));
    return reshapePerson(row);
  });
}

/** Mail the link again; does nothing for a confirmed address. */
export async function resendConfirmation(person: Person): Promise<void> {
  if (person.emailConfirmed) return;
  await transaction(async (tx) => {
    const accounts = await findAccounts(tx, person.email);
    if (accounts.some((account) => account.email_confirmed_at !== null)) return;
    await enqueue(tx, confirmAddress(person, await issueToken(tx, person.id, "confirm")));
  });
}

/** Confirm an address by its mailed token; false where the token is not good any more. */
export async function confirmEmail(token: string): Promise<boolean> {
  return transaction(async (tx) => {
    const userId = await spendToken(tx, token, "confirm");
    return userId !== undefined && markConfirmed(tx, userId);
  });
}

/** Enter that the person reads the address, unless another account holds it confirmed. */
export async function markConfirmed(
  tx: Parameters<Parameters<typeof transaction>[0]>[0],
  userId: string,
): Promise<boolean> {
  const row = await tx("users").where({ id: userId }).first<PersonRow>();
  if (!row) return false;
  const taken = (await findAccounts(tx, row.email)).some(
    (account) => account.email_confirmed_at !== null && account.id !== userId,
  );
  if (taken) return false;
  const at = row.email_confirmed_at ?? new Date().toISOString();
  await tx("users").where({ id: userId }).update({ email_confirmed_at: at });
  return true;
}

/** The person with this id. */
export async function findPerson(id: string): Promise<Person | undefined> {
  const row = await db()("users").where({ id }).first<PersonRow>();
  return row && reshapePerson(row);
}
