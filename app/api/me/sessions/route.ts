import { listSessions } from "@/lib/auth";
import { json, route } from "@/lib/http";

/** One's open sessions. */
export const GET = route({ permission: "signed-in" }, async ({ person }) =>
  json({ items: await listSessions(person) }),
);
