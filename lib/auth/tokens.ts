import { createHash, randomBytes } from "node:crypto";
import type { Knex } from "knex";

export type TokenPurpose = "confirm" | "reset";

const lifetimesMs: Record<TokenPurpose, number> = {
  confirm: 48 * 3600 * 1000,
  reset: 3600 * 1000,
};

function hashToken(token: string): string {
  return createHash("sha256").update(token).digest("hex");
}

/** Make a token to be mailed; earlier ones for the same purpose end. Only its hash is kept. */
export async function issueToken(tx: Knex, userId: string, purpose: TokenPurpose): Promise<string> {
  const token = randomBytes(32).toString("base64url");
  const now = Date.now();
  await tx("email_tokens").where({ user_id: userId, purpose }).delete();
  await tx("email_tokens").insert({
    token_hash: hashToken(token),
    user_id: userId,
    purpose,
    created_at: new Date(now).toISOString(),
    expires_at: new Date(now + lifetimesMs[purpose]).toISOString(),
  });
  return token;
}

/** Spend a token: gives whose it is, once; undefined when it is unknown, spent or expired. */
export async function spendToken(
  tx: Knex,
  token: string,
  purpose: TokenPurpose,
): Promise<string | undefined> {
  const where = { token_hash: hashToken(token), purpose };
  const row = await tx("email_tokens")
    .where(where)
    .first<{ user_id: string; created_at: string; expires_at: string } | undefined>();
  if (!row) return undefined;
  await tx("email_tokens").where(where).delete();
  const now = new Date().toISOString();
  // Created in the future: the clock was set back, and the token would live too long.
  return row.created_at <= now && now < row.expires_at ? row.user_id : undefined;
}
