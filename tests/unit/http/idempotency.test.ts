import { beforeAll, describe, expect, it } from "vitest";
import { z } from "zod";
import { db } from "@/db";
import { openSession } from "@/lib/auth";
import { forgetAnswersBefore, forgetUnfinished, HttpProblem, json, route } from "@/lib/http";
import { type Browser, browser } from "@/tests/support/browser";
import { withDatabase } from "@/tests/support/database";
import { newPerson } from "@/tests/support/people";

withDatabase();

const ilse = browser();
const maren = browser();
beforeAll(async () => {
  for (const one of [ilse, maren]) {
    const cookie = await openSession((await newPerson()).id, "test");
    one.cookie = cookie.split(";")[0];
  }
});

let done = 0;
let gate: Promise<void> = Promise.resolve();
const body = z.object({ n: z.number() });
const count = route({ permission: "signed-in", body }, async ({ body: { n } }) => {
  await gate;
  if (n < 0) throw new HttpProblem("conflict");
  done += 1;
  const headers = { location: `/done/${done}`, etag: `"${done}"` };
  return json({ done, n }, { status: 201, headers });
});
const session = route({ permission: "signed-in", body }, async () => {
  done += 1;
  return json({}, { headers: { "set-cookie": "session=secret" } });
});
const empty = route({ permission: "signed-in" }, async () => new Response(null, { status: 204 }));

const send = (who: Browser, key: string, n = 1, handler: unknown = count, path = "/api/count") =>
  who.post(handler, { n }, { path, headers: { "idempotency-key": key } });
const rows = () => db()("idempotency_keys").select("*");

describe("a write under an Idempotency-Key", () => {
  it("happens once, and is answered again in full", async () => {
    const before = done;
    const [first, second] = [await send(ilse, "a"), await send(ilse, "a")];
    expect(done).toBe(before + 1);
    expect([second.status, second.body]).toEqual([first.status, first.body]);
    for (const name of ["location", "etag", "content-type", "cache-control"]) {
      expect(second.headers.get(name)).toBe(first.headers.get(name));
    }
    expect(second.headers.get("idempotent-replay")).toBe("true");
    expect(first.headers.get("idempotent-replay")).toBeNull();
  });

  it("may be an answer without a body", async () => {
    const post = () => ilse.post(empty, undefined, { headers: { "idempotency-key": "empty" } });
    expect([(await post()).status, (await post()).status]).toEqual([204, 204]);
  });

  it("is refused with another body", async () => {
    await send(ilse, "b", 1);
    expect(await send(ilse, "b", 2)).toMatchObject({
      status: 409,
      body: { type: "/problems/conflict" },
    });
  });

  it("is another write for another person or another path", async () => {
    const before = done;
    await send(ilse, "c");
    await send(maren, "c");
    await send(ilse, "c", 1, count, "/api/other");
    expect(done).toBe(before + 3);
  });

  it("is forgotten when it fails, so that it may be tried again", async () => {
    expect((await send(ilse, "d", -1)).status).toBe(409);
    expect((await send(ilse, "d", 1)).status).toBe(201);
  });

  it("happens once when ten come at the same time", async () => {
    const before = done;
    let openGate = () => {};
    gate = new Promise((resolve) => {
      openGate = resolve;
    });
    const all = Array.from({ length: 10 }, () => send(ilse, "e"));
    setTimeout(openGate, 100);
    const statuses = (await Promise.all(all)).map((answer) => answer.status).sort();
    expect(statuses).toEqual([201, ...Array(9).fill(409)]);
    expect(done).toBe(before + 1);
    expect((await send(ilse, "e")).status).toBe(201);
  });

  it("is not kept when it hands out a session", async () => {
    const { cookie } = ilse;
    await send(ilse, "f", 1, session);
    ilse.cookie = cookie;
    expect((await rows()).filter((row) => row.key === "f")).toEqual([]);
  });

  it.each(["", "with blanks", "\u00fc", "x".repeat(201)])(
    "is refused with the key %j",
    async (key) => {
      expect((await send(ilse, key)).status).toBe(422);
    },
  );
});

describe("forgetting", () => {
  it("frees the keys of writes that a stopped server left half done, and no others", async () => {
    await send(ilse, "g");
    const [row] = await rows();
    await db()("idempotency_keys").insert({ ...row, key: "half", status: null, body: null });
    expect((await send(ilse, "half")).status).toBe(409);
    await forgetUnfinished();
    const before = done;
    expect((await send(ilse, "half")).status).toBe(201);
    await send(ilse, "g");
    expect(done).toBe(before + 1);
  });

  it("lets answers go by their age", async () => {
    await forgetAnswersBefore(new Date(Date.now() - 60_000));
    expect((await rows()).length).toBeGreaterThan(0);
    await forgetAnswersBefore(new Date(Date.now() + 1000));
    expect(await rows()).toEqual([]);
  });
});
