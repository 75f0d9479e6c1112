import { Lucia, TimeSpan } from "lucia";
import type { Person } from "@/lib/schema";
import { settings } from "@/lib/settings";
import { sessionAdapter } from "./adapter";

interface SessionAttributes {
  createdAt: string;
  lastSeenAt: string;
  userAgent: string;
}

declare module "lucia" {
  interface Register {
    Lucia: ReturnType<typeof makeLucia>;
    DatabaseUserAttributes: Person;
    DatabaseSessionAttributes: SessionAttributes;
  }
}

function makeLucia() {
  const secure = settings().appUrl.startsWith("https://");
  return new Lucia(sessionAdapter, {
    sessionExpiresIn: new TimeSpan(30, "d"),
    sessionCookie: {
      // The __Host- prefix ties the cookie to this very host; browsers take it over TLS only.
      name: secure ? "__Host-session" : "session",
      attributes: { secure, sameSite: "lax", path: "/" },
    },
    getUserAttributes: (person) => ({ ...person }),
    getSessionAttributes: (attributes) => ({ ...attributes }),
  });
}

let made: ReturnType<typeof makeLucia> | undefined;

/** The session library, behind which nothing outside lib/auth looks. */
export function lucia() {
  made ??= makeLucia();
  return made;
}
