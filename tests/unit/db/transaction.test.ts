import knex from "knex";
import { afterAll, describe, expect, it } from "vitest";
import { db, storageFault, transaction } from "@/db";
import { knexConfig } from "@/knexfile";
import { withDatabase } from "@/tests/support/database";

const { file } = withDatabase();
const other = knex(knexConfig(file));
afterAll(() => other.destroy());

const mail = (subject: string) => ({
  recipient: "a@tarn-hollow.example",
  kind: "test",
  subject,
  text: "",
  html: "",
  created_at: "2026-01-01T00:00:00.000Z",
  next_attempt_at: "2026-01-01T00:00:00.000Z",
});
const subjects = async (like: string) =>
  (await db()("outbox").where("subject", "like", like).select("subject")).length;
const rejection = (work: PromiseLike<unknown>) =>
  Promise.resolve(work).then(
    () => undefined,
    (error: unknown) => error,
  );

describe("transaction", () => {
  it("gives what the work gives, and keeps what it wrote", async () => {
    expect(
      await transaction((tx) =>
        tx("outbox")
          .insert(mail("kept"))
          .then(() => 7),
      ),
    ).toBe(7);
    expect(await subjects("kept")).toBe(1);
  });

  it("keeps nothing when the work fails", async () => {
    const work = transaction(async (tx) => {
      await tx("outbox").insert(mail("lost"));
      throw new Error("no");
    });
    await expect(work).rejects.toThrow("no");
    expect(await subjects("lost")).toBe(0);
  });

  it("lets nobody write between its first reading and its writing", async () => {
    await other.raw("PRAGMA busy_timeout = 20");
    const refused = await transaction(async (tx) => {
      await tx("outbox").select();
      const error = await rejection(other("outbox").insert(mail("between")));
      await tx("outbox").insert(mail("after reading"));
      return error;
    });
    expect(storageFault(refused)).toBe("storage-busy");
    expect(await subjects("between")).toBe(0);
    expect(await subjects("after reading")).toBe(1);
  });

  it("lets others read while it writes", async () => {
    await transaction(async (tx) => {
      await tx("outbox").insert(mail("under way"));
      expect(await other("outbox").where("subject", "under way")).toEqual([]);
    });
    expect(await other("outbox").where("subject", "under way")).toHaveLength(1);
  });
});

describe("a full disk", () => {
  it("refuses the write, keeps what was there, and goes on reading", async () => {
    const before = await subjects("%");
    const [{ page_count: pages }] = await db().raw("PRAGMA page_count");
    await db().raw(`PRAGMA max_page_count = ${pages}`);
    const large = { ...mail("too much"), text: "x".repeat(1_000_000) };
    const error = await rejection(transaction((tx) => tx("outbox").insert(large)));
    expect(storageFault(error)).toBe("storage-full");
    expect(await subjects("%")).toBe(before);
    await db().raw("PRAGMA max_page_count = 1073741823");
    await transaction((tx) => tx("outbox").insert(large));
    expect(await subjects("too much")).toBe(1);
  });
});

describe("storageFault", () => {
  it.each([
    ["SQLITE_FULL", "storage-full"],
    ["SQLITE_BUSY", "storage-busy"],
    ["SQLITE_BUSY_SNAPSHOT", "storage-busy"],
    ["SQLITE_CONSTRAINT_UNIQUE", undefined],
  ])("takes %s for %s", (code, fault) => {
    expect(storageFault(Object.assign(new Error(), { code }))).toBe(fault);
  });

  it("takes other errors for none", () => {
    expect(storageFault(new Error("SQLITE_FULL"))).toBeUndefined();
    expect(storageFault("SQLITE_FULL")).toBeUndefined();
  });
});
