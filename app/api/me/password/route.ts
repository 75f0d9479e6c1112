import { changePassword, openSession } from "@/lib/auth";
import { countTry, forgiveTries, HttpProblem, json, route } from "@/lib/http";
import { changePasswordSchema } from "@/lib/schema";

/** Change one's password; every session ends, and a new one is opened here. */
export const POST = route(
  { permission: "signed-in", body: changePasswordSchema },
  async ({ request, person, body }) => {
    await countTry("sign-in-account", `password ${person.id}`);
    if (!(await changePassword(person, body.currentPassword, body.newPassword))) {
      const errors = [{ path: "currentPassword", message: "This is not your current password." }];
      throw new HttpProblem("validation", { errors });
    }
    await forgiveTries("sign-in-account", `password ${person.id}`);
    const cookie = await openSession(person.id, request.headers.get("user-agent") ?? "");
    return json({ changed: true }, { headers: { "set-cookie": cookie } });
  },
);
