import type { AddressInfo } from "node:net";
import { SMTPServer } from "smtp-server";
import { afterAll, afterEach, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { db, transaction } from "@/db";
import { compose, deliverDueMail, enqueue } from "@/lib/mail";
import { backOffMs } from "@/lib/mail/outbox";
import { withDatabase } from "@/tests/support/database";

interface Received {
  readonly to: readonly string[];
  readonly raw: string;
}

const received: Received[] = [];
let refusal: string | undefined;
const server = new SMTPServer({
  authOptional: true,
  disabledCommands: ["STARTTLS", "AUTH"],
  onRcptTo: (_address, _session, done) => done(refusal ? new Error(refusal) : null),
  onData(stream, session, done) {
    const parts: Buffer[] = [];
    stream.on("data", (part: Buffer) => parts.push(part));
    stream.on("end", () => {
      const to = session.envelope.rcptTo.map((one) => one.address);
      received.push({ to, raw: Buffer.concat(parts).toString("utf8") });
      done();
    });
  },
});

beforeAll(async () => {
  await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
  const { port } = server.server.address() as AddressInfo;
  process.env.MAIL_URL = `smtp://127.0.0.1:${port}`;
});
// After the address of the server is set: opening the database reads the settings.
withDatabase();
afterAll(() => new Promise<void>((resolve) => server.close(() => resolve())));
beforeEach(async () => {
  received.length = 0;
  refusal = undefined;
  await db()("outbox").delete();
});
afterEach(() => {
  vi.useRealTimers();
});

const write = (recipient = "a@tarn-hollow.example", subject = "A subject: ≈ 10³⁹ erg") =>
  enqueue(db(), compose({ kind: "test", recipient, subject, paragraphs: ["Réunion."] }));
const row = () => db()("outbox").first();

describe("deliverDueMail", () => {
  it("sends what waits, once, in text and in HTML", async () => {
    await write();
    expect([await deliverDueMail(), await deliverDueMail()]).toEqual([1, 0]);
    expect(received).toHaveLength(1);
    const [mail] = received;
    expect(mail?.to).toEqual(["a@tarn-hollow.example"]);
    expect(mail?.raw).toMatch(/^From: Leading Order <no-reply@localhost>$/m);
    expect(mail?.raw).toMatch(/^Content-Type: text\/plain/m);
    expect(mail?.raw).toMatch(/^Content-Type: text\/html/m);
    expect((await row()).sent_at).toBeTypeOf("string");
  });

  it("sends nothing that its transaction took back", async () => {
    const failing = transaction(async (tx) => {
      await enqueue(
        tx,
        compose({ kind: "t", recipient: "a@x.example", subject: "s", paragraphs: [] }),
      );
      throw new Error("no");
    });
    await expect(failing).rejects.toThrow("no");
    expect(await deliverDueMail()).toBe(0);
  });

  it("takes an address for one address", async () => {
    await write("a@tarn-hollow.example, b@evil.example");
    await deliverDueMail();
    expect(received.flatMap((mail) => mail.to)).not.toContain("b@evil.example");
  });

  it("lets no line of a subject become a header", async () => {
    await write("a@tarn-hollow.example", "Hello\r\nBcc: b@evil.example\r\n\r\nbody");
    await deliverDueMail();
    expect(received).toHaveLength(1);
    expect(received[0]?.raw).not.toMatch(/^Bcc:/im);
    expect(received[0]?.to).toEqual(["a@tarn-hollow.example"]);
  });

  it("keeps what the server refuses, says why, and tries again later", async () => {
    const start = Date.now();
    vi.useFakeTimers({ toFake: ["Date"], now: start });
    refusal = "mailbox is having a rest";
    await write();
    await deliverDueMail();
    expect(await row()).toMatchObject({ attempts: 1, sent_at: null });
    expect((await row()).last_error).toContain("mailbox is having a rest");
    expect(await deliverDueMail()).toBe(0);
    refusal = undefined;
    vi.setSystemTime(start + 61_000);
    expect(await deliverDueMail()).toBe(1);
    expect(received).toHaveLength(1);
    expect(await row()).toMatchObject({ last_error: null });
  });

  it("sends the others when one is refused", async () => {
    await write("not an address");
    await write("b@tarn-hollow.example");
    await deliverDueMail();
    expect(received.map((mail) => mail.to)).toEqual([["b@tarn-hollow.example"]]);
  });
});

describe("backOffMs", () => {
  it("doubles from a minute up to six hours", () => {
    const minutes = [0, 1, 2, 3, 8, 9, 10_000].map((attempts) => backOffMs(attempts) / 60_000);
    expect(minutes).toEqual([1, 2, 4, 8, 256, 360, 360]);
  });
});
