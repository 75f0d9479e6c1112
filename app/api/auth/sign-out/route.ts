import { blankCookie, closeSession } from "@/lib/auth";
import { json, route } from "@/lib/http";

/** End the session of this browser; done as well where there is none. */
export const POST = route({ permission: "anyone" }, async ({ person }) => {
  if (person) await closeSession(person);
  return json({ signedOut: true }, { headers: { "set-cookie": blankCookie() } });
});
