import { changePassword } from "@/lib/auth";
import { countTry, forgiveTries, HttpProblem, json, route } from "@/lib/http";
import { changePasswordSchema } from "@/lib/schema";

/** Change one's password; every other session ends. */
export const POST = route(
  { permission: "signed-in", body: changePasswordSchema },
  async ({ person, body }) => {
    await countTry("sign-in-account", `password ${person.id}`);
    if (!(await changePassword(person, body.currentPassword, body.newPassword))) {
      const errors = [{ path: "currentPassword", message: "This is not your current password." }];
      throw new HttpProblem("validation", { errors });
    }
    await forgiveTries("sign-in-account", `password ${person.id}`);
    return json({ changed: true });
  },
);
