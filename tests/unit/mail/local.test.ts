import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { db } from "@/db";
import { withDatabase } from "@/tests/support/database";

withDatabase();

afterEach(() => {
  vi.unstubAllEnvs();
});
beforeEach(async () => {
  await db()("outbox").delete();
});

/** The mail of a server with these settings, with one mail waiting. */
async function server(environment: Record<string, string>) {
  for (const [name, value] of Object.entries(environment)) vi.stubEnv(name, value);
  vi.resetModules();
  const mail = await import("@/lib/mail");
  const message = { kind: "test", recipient: "a@tarn-hollow.example", paragraphs: ["One."] };
  await mail.enqueue(db(), mail.compose({ ...message, subject: "First" }));
  await mail.enqueue(db(), mail.compose({ ...message, subject: "Second" }));
  return mail;
}

describe("mail without a mail server", () => {
  it("is kept and listed by a local start, the newest first", async () => {
    const mail = await server({ NODE_ENV: "production", LOCAL: "1" });
    expect(await mail.deliverDueMail()).toBe(2);
    expect(await mail.deliverDueMail()).toBe(0);
    const listed = await mail.listLocalMail();
    expect(listed.map((one) => one.subject)).toEqual(["Second", "First"]);
  });

  it("waits in a deployment, and is not lost", async () => {
    const mail = await server({ NODE_ENV: "production", APP_URL: "https://estimates.example" });
    expect(await mail.deliverDueMail()).toBe(0);
    expect(await db()("outbox").whereNull("sent_at")).toHaveLength(2);
  });
});
