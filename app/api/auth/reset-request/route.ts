import { requestReset } from "@/lib/auth";
import { addressOf, countTry, HttpProblem, json, route } from "@/lib/http";
import { resetRequestSchema } from "@/lib/schema";

/** Mail a link to set a new password. Answers the same whether or not the address is known. */
export const POST = route(
  { permission: "anyone", body: resetRequestSchema },
  async ({ request, body }) => {
    await countTry("reset-address", addressOf(request));
    if (await withinReach(body.email)) await requestReset(body.email);
    return json({ accepted: true }, { status: 202 });
  },
);

/** Mails to one address are limited; beyond that the answer stays the same and none is sent. */
async function withinReach(email: string): Promise<boolean> {
  try {
    await countTry("reset-account", email.trim().toLowerCase());
    return true;
  } catch (error) {
    if (error instanceof HttpProblem) return false;
    throw error;
  }
}
