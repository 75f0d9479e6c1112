import { closeSession, openSession, signUp } from "@/lib/auth";
import { addressOf, countTry, HttpProblem, json, route } from "@/lib/http";
import { signUpSchema } from "@/lib/schema";

/** Make an account and open a session at once. The answer does not tell whether the address is known. */
export const POST = route(
  { permission: "anyone", body: signUpSchema },
  async ({ request, person: before, body }) => {
    await countTry("sign-up-address", addressOf(request));
    const person = await signUp(body);
    if (!person) {
      throw new HttpProblem("too-many-requests", {
        detail:
          "This address was signed up and not confirmed. If it is yours, ask for a new password.",
      });
    }
    if (before) await closeSession(before);
    const cookie = await openSession(person.id, request.headers.get("user-agent") ?? "");
    return json(person, { status: 201, headers: { "set-cookie": cookie } });
  },
);
