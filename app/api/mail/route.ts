import { HttpProblem, json, route } from "@/lib/http";
import { listLocalMail } from "@/lib/mail";
import { settings } from "@/lib/settings";

/** The mail that a local start keeps instead of sending it; absent everywhere else. */
export const GET = route({ permission: "anyone" }, async () => {
  if (!settings().localMail) throw new HttpProblem("not-found");
  return json({ items: await listLocalMail() });
});
