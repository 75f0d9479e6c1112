import { closeSession, openSession, signIn } from "@/lib/auth";
import { addressOf, countTry, forgiveTries, HttpProblem, json, route } from "@/lib/http";
import { signInSchema } from "@/lib/schema";

/** Open a session, and end the one this browser had. The same answer, in similar time, for a wrong password and an unknown address. */
export const POST = route(
  { permission: "anyone", body: signInSchema },
  async ({ request, person: before, body }) => {
    const account = body.email.trim().toLowerCase();
    await countTry("sign-in-address", addressOf(request));
    await countTry("sign-in-account", account);
    const person = await signIn(body.email, body.password);
    if (!person) throw new HttpProblem("wrong-credentials");
    await forgiveTries("sign-in-account", account);
    if (before) await closeSession(before);
    const cookie = await openSession(person.id, request.headers.get("user-agent") ?? "");
    return json(person, { headers: { "set-cookie": cookie } });
  },
);
