import { resendConfirmation } from "@/lib/auth";
import { countTry, json, route } from "@/lib/http";

/** Mail the link that confirms one's address again. */
export const POST = route({ permission: "signed-in" }, async ({ person }) => {
  await countTry("reset-account", `confirm ${person.id}`);
  await resendConfirmation(person);
  return json({ accepted: true }, { status: 202 });
});
