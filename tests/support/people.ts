import { db } from "@/db";
import { signUp } from "@/lib/auth";
import type { Person } from "@/lib/schema";

export const password = "a long enough password";

let count = 0;

/** An address that no test has used before. */
export function freshEmail(): string {
  count += 1;
  return `person-${count}@tarn-hollow.example`;
}

/** A new account; its address is confirmed unless said otherwise. */
export async function newPerson(
  more: { email?: string; name?: string; confirmed?: boolean } = {},
): Promise<Person> {
  const { email = freshEmail(), name = "Ilse Wray", confirmed = true } = more;
  const person = await signUp({ email, name, password });
  if (!person) throw new Error(`${email} was not signed up`);
  if (!confirmed) return person;
  await db()("users")
    .where({ id: person.id })
    .update({ email_confirmed_at: new Date().toISOString() });
  return { ...person, emailConfirmed: true };
}

/** The token in the latest mail of a kind to an address. */
export async function mailedToken(email: string, kind: string): Promise<string> {
  const mail = await db()("outbox")
    .where({ recipient: email, kind })
    .orderBy("id", "desc")
    .first<{ text: string } | undefined>();
  return /token=([\w-]+)/.exec(mail?.text ?? "")?.[1] ?? "no mail";
}

/** How many mails of a kind were written to an address. */
export async function mailsTo(email: string, kind: string): Promise<number> {
  const rows = await db()("outbox").where({ recipient: email, kind }).select("id");
  return rows.length;
}
