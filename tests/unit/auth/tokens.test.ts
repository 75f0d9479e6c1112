import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { db } from "@/db";
import { issueToken, spendToken, type TokenPurpose } from "@/lib/auth/tokens";
import { withDatabase } from "@/tests/support/database";
import { newPerson } from "@/tests/support/people";

withDatabase();

const start = Date.parse("2028-02-29T23:30:00Z");
const hours = (count: number) => count * 3600 * 1000;
let userId = "";

beforeEach(async () => {
  vi.useFakeTimers({ toFake: ["Date"], now: start });
  userId = (await newPerson()).id;
});
afterEach(() => {
  vi.useRealTimers();
});

const issue = (purpose: TokenPurpose = "reset") => issueToken(db(), userId, purpose);
const spend = (token: string, purpose: TokenPurpose = "reset") => spendToken(db(), token, purpose);
const at = (ms: number) => vi.setSystemTime(start + ms);

describe("a mailed token", () => {
  it("says whose it is, once", async () => {
    const token = await issue();
    expect(await spend(token)).toBe(userId);
    expect(await spend(token)).toBeUndefined();
  });

  it("is random: 32 bytes, and never the same", async () => {
    const [a, b] = [await issue(), await issue()];
    expect(Buffer.from(a, "base64url")).toHaveLength(32);
    expect(a).not.toBe(b);
  });

  it("is nowhere in the database", async () => {
    const token = await issue();
    const rows = await db()("email_tokens").where({ user_id: userId });
    expect(JSON.stringify(rows)).not.toContain(token);
    expect(await spend(rows.find((row) => row.purpose === "reset").token_hash)).toBeUndefined();
  });

  it("is good for its purpose alone", async () => {
    expect(await spend(await issue("confirm"), "reset")).toBeUndefined();
  });

  it("ends the one before it", async () => {
    const before = await issue();
    const after = await issue();
    expect(await spend(before)).toBeUndefined();
    expect(await spend(after)).toBe(userId);
  });

  it.each<[TokenPurpose, number]>([
    ["reset", 1],
    ["confirm", 48],
  ])("to %s lasts %s h, leap day or not", async (purpose, last) => {
    const good = await issue(purpose);
    at(hours(last) - 1000);
    expect(await spend(good, purpose)).toBe(userId);
    at(0);
    const late = await issue(purpose);
    at(hours(last));
    expect(await spend(late, purpose)).toBeUndefined();
  });

  it("does not live longer when the clock is set back", async () => {
    const token = await issue();
    at(-hours(24));
    expect(await spend(token)).toBeUndefined();
    at(0);
    expect(await spend(token)).toBeUndefined();
  });

  it.each(["", "x", "' OR 1=1 --", "\u0000"])("is not %j", async (text) => {
    expect(await spend(text)).toBeUndefined();
  });
});
