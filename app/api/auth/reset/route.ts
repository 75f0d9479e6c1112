import { openSession, resetPassword } from "@/lib/auth";
import { addressOf, countTry, HttpProblem, json, route } from "@/lib/http";
import { resetSchema } from "@/lib/schema";

/** Set a new password by a mailed token; ends every session and opens a new one here. */
export const POST = route(
  { permission: "anyone", body: resetSchema },
  async ({ request, body }) => {
    await countTry("token-address", addressOf(request));
    const person = await resetPassword(body.token, body.password);
    if (!person) {
      throw new HttpProblem("token-invalid", {
        detail: "The link was used before, or is older than an hour. Ask for a new one.",
      });
    }
    const cookie = await openSession(person.id, request.headers.get("user-agent") ?? "");
    return json(person, { headers: { "set-cookie": cookie } });
  },
);
