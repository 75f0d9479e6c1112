import { afterEach, beforeAll, describe, expect, it, vi } from "vitest";
import { z } from "zod";
import * as mailRoute from "@/app/api/mail/route";
import { openSession } from "@/lib/auth";
import { HttpProblem, json, problems, route } from "@/lib/http";
import { limits, problemSchema } from "@/lib/schema";
import { type Browser, browser, type Sent } from "../support/browser";
import { withDatabase } from "../support/database";
import { newPerson } from "../support/people";

withDatabase();

const signedIn = browser();
beforeAll(async () => {
  signedIn.cookie = (await openSession((await newPerson()).id, "test")).split(";")[0];
});
afterEach(() => {
  vi.restoreAllMocks();
});

const body = z.strictObject({ value: z.unknown() });
const write = route({ permission: "anyone", body }, ({ person, body: { value } }) =>
  json({ who: person?.id ?? null, value }),
);
const own = route({ permission: "signed-in" }, ({ person }) => json({ id: person.id }));
const ok = { value: 1 };

function isProblem(answer: { status: number; headers: Headers; body: unknown }, slug: string) {
  expect(answer.body).toMatchObject({ type: `/problems/${slug}`, status: answer.status });
  expect(problemSchema.safeParse(answer.body).success).toBe(true);
  expect(answer.headers.get("content-type")).toMatch(/^application\/problem\+json/);
  expect(answer.headers.get("cache-control")).toBe("no-store");
}

describe("a write from another site", () => {
  const from = (headers: Sent["headers"], who: Browser = signedIn) =>
    who.post(write, ok, { headers: { "sec-fetch-site": undefined, ...headers } });

  it.each<[string, Sent["headers"]]>([
    ["a page of another site", { "sec-fetch-site": "cross-site" }],
    ["a page of a sister site", { "sec-fetch-site": "same-site" }],
    ["another origin", { origin: "https://evil.example" }],
    ["another port", { origin: "http://localhost:3001" }],
    ["a frame without an origin", { origin: "null" }],
    ["an origin that is none", { origin: "localhost:3000" }],
    [
      "a host that begins like ours",
      { origin: "http://localhost:3000.evil.example", host: "localhost:3000" },
    ],
    [
      "another origin that claims ours",
      { "sec-fetch-site": "same-origin", origin: "https://evil.example" },
    ],
    ["nobody knows where, with a cookie", {}],
  ])("is refused: from %s", async (_from, headers) => {
    isProblem(await from(headers), "cross-site");
  });

  it.each(["POST", "PUT", "PATCH", "DELETE"])("is refused by every method: %s", async (method) => {
    const headers = { "sec-fetch-site": "cross-site" };
    isProblem(await signedIn.call(own, method, { headers }), "cross-site");
  });

  it.each<[string, Sent["headers"]]>([
    ["our pages", { "sec-fetch-site": "same-origin" }],
    ["our address", { origin: "http://localhost:3000" }],
    ["the host it is sent to", { origin: "http://127.0.0.1:3000", host: "127.0.0.1:3000" }],
  ])("is not: from %s", async (_from, headers) => {
    expect((await from(headers)).status).toBe(200);
  });

  it("is not, from a script without a cookie", async () => {
    expect(await from({}, browser())).toMatchObject({ status: 200, body: { who: null } });
  });

  it("is no matter where nothing is written", async () => {
    const headers = { "sec-fetch-site": "cross-site" };
    expect((await signedIn.get(own, { headers })).status).toBe(200);
  });
});

describe("a route for people who are signed in", () => {
  it.each([undefined, "session=", "session=guess", "session=x; session=y", "other=1", "session"])(
    "is closed to the cookie %j",
    async (cookie) => {
      const visitor = browser();
      visitor.cookie = cookie;
      isProblem(await visitor.get(own), "signed-out");
    },
  );

  it("is closed to the hash of a session, which the database holds", async () => {
    const { db } = await import("@/db");
    const row = await db()("sessions").first<{ id: string }>();
    const thief = browser();
    thief.cookie = `session=${row?.id}`;
    isProblem(await thief.get(own), "signed-out");
  });

  it("asks before it reads the body", async () => {
    const closed = route({ permission: "signed-in", body }, () => json({}));
    isProblem(await browser().post(closed, "{"), "signed-out");
  });
});

describe("a body", () => {
  const send = (text: unknown, headers: Sent["headers"] = {}) =>
    browser().post(write, text, { headers });

  it.each<[string, string, string]>([
    [
      "nested deep",
      `{"value":${"[".repeat(limits.jsonDepth)}${"]".repeat(limits.jsonDepth)}}`,
      "bad-json",
    ],
    ["nested 100 000 levels deep", "[".repeat(100_000), "bad-json"],
    ["with __proto__", '{"value": {"__proto__": {"admin": true}}}', "bad-json"],
    ["with a field twice", '{"value": 1, "value": 2}', "bad-json"],
    ["with a number beyond a double", '{"value": 1e999}', "bad-json"],
    ["that is empty", "", "bad-json"],
    ["that is not JSON", "value=1", "bad-json"],
    ["with an unknown field", '{"value": 1, "admin": true}', "validation"],
    ["of another type", "[1]", "validation"],
    ["that is null", "null", "validation"],
  ])("%s is refused", async (_what, text, slug) => {
    isProblem(await send(text), slug);
  });

  it("is refused with the line and column of the fault", async () => {
    const answer = await send('{"value": 1,\n "value": 2}');
    expect(answer.body.detail).toBe(
      "Line 2, column 2: The field “value” stands twice in one object.",
    );
  });

  it("is refused with the path of each fault", async () => {
    const inner = z.strictObject({ a: z.strictObject({ b: z.array(z.number()) }), c: z.string() });
    const handler = route({ permission: "anyone", body: inner }, () => json({}));
    const answer = await browser().post(handler, { a: { b: [1, "x"] } });
    isProblem(answer, "validation");
    expect(answer.body.errors.map((error: { path: string }) => error.path)).toEqual(["a.b.1", "c"]);
  });

  it.each([
    undefined,
    "text/plain",
    "application/x-www-form-urlencoded",
    "application/json-seq",
    "x/application/json",
  ])("is not read as %s", async (type) => {
    isProblem(await send(ok, { "content-type": type }), "unsupported-media-type");
  });

  it("is read with a charset", async () => {
    expect((await send(ok, { "content-type": "application/json; charset=utf-8" })).status).toBe(
      200,
    );
  });

  it("too large is refused by its announced length, unread", async () => {
    isProblem(await send(ok, { "content-length": "5000000" }), "too-large");
  });

  it("too large is refused without a length, after so many bytes", async () => {
    let pulled = 0;
    const endless = new ReadableStream({
      pull(controller) {
        pulled += 1;
        controller.enqueue(new Uint8Array(100_000).fill(0x20));
      },
    });
    const request = new Request("http://localhost:3000/api", {
      method: "POST",
      headers: { "content-type": "application/json" },
      body: endless,
      duplex: "half",
    } as RequestInit);
    const response = await write(request, { params: Promise.resolve({}) });
    expect(response.status).toBe(413);
    expect(pulled).toBeLessThan(20);
  });

  it("that is not UTF-8 is refused", async () => {
    const request = new Request("http://localhost:3000/api", {
      method: "POST",
      headers: { "content-type": "application/json" },
      body: new Uint8Array([0x22, 0xff, 0xfe, 0x22]),
    });
    expect((await write(request, { params: Promise.resolve({}) })).status).toBe(400);
  });
});

describe("an answer", () => {
  it("tells nothing of what broke but a number that the log repeats", async () => {
    const logged = vi.spyOn(console, "error").mockImplementation(() => {});
    const broken = route({ permission: "anyone" }, () => {
      throw new Error("SELECT password_hash FROM users at /srv/secret.ts");
    });
    const answer = await browser().get(broken);
    isProblem(answer, "internal");
    expect(JSON.stringify(answer.body)).not.toMatch(/SELECT|secret|users|\.ts/);
    const [incident] = /[0-9a-f-]{36}/.exec(answer.body.detail) ?? ["none"];
    expect(logged.mock.calls[0]?.[0]).toContain(incident);
  });

  it.each([
    ["SQLITE_FULL", "storage-full", 507],
    ["SQLITE_BUSY", "storage-busy", 503],
  ])("says when the storage is in the way: %s", async (code, slug, status) => {
    vi.spyOn(console, "error").mockImplementation(() => {});
    const full = route({ permission: "anyone" }, () => {
      throw Object.assign(new Error("INSERT INTO revisions"), { code });
    });
    const answer = await browser().post(full);
    isProblem(answer, slug);
    expect(answer.status).toBe(status);
    expect(Number(answer.headers.get("retry-after"))).toBeGreaterThan(0);
    expect(JSON.stringify(answer.body)).not.toContain("INSERT");
  });

  it.each(Object.keys(problems) as (keyof typeof problems)[])(
    "tells %s by RFC 9457",
    async (slug) => {
      const refusing = route({ permission: "anyone" }, () => {
        throw new HttpProblem(slug, { detail: "Why." });
      });
      const answer = await browser().get(refusing);
      isProblem(answer, slug);
      expect(answer.body).toMatchObject({ title: problems[slug].title, detail: "Why." });
    },
  );

  it("is kept by no cache unless it says so", async () => {
    expect((await signedIn.get(own)).headers.get("cache-control")).toBe("no-store");
  });
});

describe("the local mail", () => {
  it("is there for a local start, and absent from a deployment", async () => {
    expect((await browser().get(mailRoute.GET)).status).toBe(200);
    vi.stubEnv("NODE_ENV", "production");
    vi.stubEnv("APP_URL", "https://estimates.example");
    vi.resetModules();
    const deployed = await import("@/app/api/mail/route");
    isProblem(await browser().get(deployed.GET), "not-found");
    vi.unstubAllEnvs();
  });
});
