import { confirmEmail } from "@/lib/auth";
import { addressOf, countTry, HttpProblem, json, route } from "@/lib/http";
import { confirmEmailSchema } from "@/lib/schema";

/** Confirm an address by the token that was mailed to it. */
export const POST = route(
  { permission: "anyone", body: confirmEmailSchema },
  async ({ request, body }) => {
    await countTry("token-address", addressOf(request));
    if (await confirmEmail(body.token)) return json({ confirmed: true });
    throw new HttpProblem("token-invalid", {
      detail: "The link was used before, or is older than 48 hours. Ask for a new one in Settings.",
    });
  },
);
