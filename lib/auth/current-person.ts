import "server-only";
import { cookies } from "next/headers";
import { cache } from "react";
import { personOfSession, type SignedIn, sessionCookieName } from "./sessions";

/** The signed-in person of the page being made, asked for once a request; null for a visitor. */
export const currentPerson = cache(async (): Promise<SignedIn | null> => {
  const jar = await cookies();
  return personOfSession(jar.get(sessionCookieName())?.value);
});
