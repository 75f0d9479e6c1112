import { afterAll, beforeAll, describe, expect, it, vi } from "vitest";
import * as calculationRoute from "@/app/api/calculations/[id]/route";
import * as recomputeRoute from "@/app/api/calculations/[id]/versions/[n]/recompute/route";
import * as versionRoute from "@/app/api/calculations/[id]/versions/[n]/route";
import * as withdrawRoute from "@/app/api/calculations/[id]/versions/[n]/withdraw/route";
import * as versionsRoute from "@/app/api/calculations/[id]/versions/route";
import * as listRoute from "@/app/api/calculations/route";
import * as constantsRoute from "@/app/api/constants/route";
import * as evaluateRoute from "@/app/api/evaluate/route";
import { openSession } from "@/lib/auth";
import { closeEvaluators, contentHash } from "@/lib/evaluator";
import type { CalculationFile } from "@/lib/schema";
import {
  dropTemporaryDatabase,
  openTemporaryDatabase,
  person,
} from "../unit/calculations/temporary-database";

type Handler = (
  request: Request,
  next: { params: Promise<Record<string, string>> },
) => Promise<Response>;
type Call = {
  as?: string | undefined;
  body?: unknown;
  headers?: Record<string, string>;
  params?: Record<string, string>;
  query?: string;
};

const cookies: Record<string, string> = {};

beforeAll(async () => {
  await openTemporaryDatabase();
  for (const id of ["author", "other"]) {
    await person(id);
    cookies[id] = (await openSession(id, "test")).split(";")[0] ?? "";
  }
});
afterAll(async () => {
  await closeEvaluators();
  await dropTemporaryDatabase();
});

/** Calls a handler as somebody's browser would. */
async function call(handler: unknown, method: string, options: Call = {}) {
  const { as, body, headers = {}, params = {}, query = "" } = options;
  const request = new Request(`http://localhost:3000/api${query}`, {
    method,
    headers: {
      "sec-fetch-site": "same-origin",
      ...(body === undefined ? {} : { "content-type": "application/json" }),
      ...(as ? { cookie: cookies[as] ?? "" } : {}),
      ...headers,
    },
    ...(body === undefined ? {} : { body: typeof body === "string" ? body : JSON.stringify(body) }),
  });
  const response = await (handler as Handler)(request, { params: Promise.resolve(params) });
  const text = await response.text();
  return {
    status: response.status,
    headers: response.headers,
    body: text ? JSON.parse(text) : null,
  };
}

const content = (title = "Rest energy", formula = "M c^2"): CalculationFile => ({
  format: "leading-order/1",
  title,
  edition: "codata-2022",
  cells: [
    { id: "g1", kind: "given", symbol: "M", value: 10, unit: "Msun" },
    { id: "r1", kind: "relation", symbol: "E", formula, unit: "erg" },
  ],
});

async function create(file = content()): Promise<string> {
  const { status, body } = await call(listRoute.POST, "POST", { as: "author", body: { file } });
  expect(status).toBe(201);
  return body.id;
}

const put = (id: string, file: CalculationFile, headers: Record<string, string>, as = "author") =>
  call(calculationRoute.PUT, "PUT", { as, body: { file }, headers, params: { id } });
const pin = (id: string, body: object = { summary: "v" }, as: string | undefined = "author") =>
  call(versionsRoute.POST, "POST", { as, body, params: { id } });
const version = (id: string, n = "1", as?: string, query = "") =>
  call(versionRoute.GET, "GET", { as, params: { id, n }, query });
const open = (id: string, visibility: string) =>
  call(calculationRoute.PATCH, "PATCH", { as: "author", body: { visibility }, params: { id } });

async function pinned(visibility: string): Promise<string> {
  const id = await create();
  expect((await pin(id)).status).toBe(201);
  expect((await open(id, visibility)).status).toBe(200);
  return id;
}

describe("drafts over the API", () => {
  it("carry their revision as the entity tag", async () => {
    const id = await create();
    const read = await call(calculationRoute.GET, "GET", { as: "author", params: { id } });
    expect(read.headers.get("etag")).toBe('"1"');
    expect(read.headers.get("cache-control")).toBe("no-store");
    const saved = await put(id, content("Second"), { "if-match": '"1"' });
    expect([saved.status, saved.headers.get("etag")]).toEqual([200, '"2"']);
  });

  it("want If-Match, and give the current draft when somebody saved first", async () => {
    const id = await create();
    expect((await put(id, content("x"), {})).status).toBe(428);
    expect((await put(id, content("x"), { "if-match": "*" })).status).toBe(422);
    expect((await put(id, content("Second"), { "if-match": '"1"' })).status).toBe(200);
    const late = await put(id, content("Late"), { "if-match": '"1"' });
    expect(late.status).toBe(412);
    expect(late.body).toMatchObject({
      type: "/problems/precondition-failed",
      current: { revision: 2, file: { title: "Second" } },
    });
  });

  it("are thrown away only without versions", async () => {
    const id = await create();
    const drop = () => call(calculationRoute.DELETE, "DELETE", { as: "author", params: { id } });
    await pin(id);
    expect((await drop()).status).toBe(409);
  });

  it.each<[string, unknown, number]>([
    ["an unknown field", { file: { ...content(), colour: 1 } }, 422],
    [
      "too many cells",
      {
        file: {
          ...content(),
          cells: Array.from({ length: 501 }, (_, i) => ({
            id: `t${i}`,
            kind: "text",
            markdown: "",
          })),
        },
      },
      422,
    ],
    [
      "a cell twice",
      { file: { ...content(), cells: [content().cells[0], content().cells[0]] } },
      422,
    ],
    [
      "half a character",
      '{"file":{"format":"leading-order/1","title":"\\ud800","edition":"codata-2022","cells":[]}}',
      422,
    ],
    ["__proto__", '{"file":{"__proto__":{"admin":true}}}', 400],
    [
      "a number beyond double",
      JSON.stringify({ file: content() }).replace('"value":10', '"value":1e999'),
      400,
    ],
    ["more than a megabyte", { file: { ...content(), abstract: "x".repeat(1_200_000) } }, 413],
    ["no JSON", "{", 400],
  ])("refuse %s", async (_title, body, status) => {
    const answer = await call(listRoute.POST, "POST", { as: "author", body });
    expect(answer.status).toBe(status);
    expect(answer.headers.get("content-type")).toMatch(/^application\/problem\+json/);
  });
});

describe("versions over the API", () => {
  it("are kept for ever by caches when public, by none otherwise", async () => {
    const id = await pinned("public");
    const answer = await version(id);
    expect(answer.headers.get("cache-control")).toBe("public, max-age=31536000, immutable");
    expect(answer.body.version.contentHash).toBe(contentHash(content()));
    expect((await version(await pinned("link"))).headers.get("cache-control")).toBe("no-store");
    const download = await version(id, "1", undefined, "?download=1");
    expect(download.headers.get("content-disposition")).toBe(
      `attachment; filename="${id}-v1.json"`,
    );
  });

  it("say why they are not pinned", async () => {
    const id = await create();
    await pin(id);
    expect(await pin(id)).toMatchObject({
      status: 409,
      body: { type: "/problems/same-content", version: 1 },
    });
    await put(id, content("Slip", "M + c"), { "if-match": '"1"' });
    expect(await pin(id)).toMatchObject({
      status: 409,
      body: { type: "/problems/has-errors", errors: [{ path: "cells.r1" }] },
    });
    expect((await pin(id, { summary: "v", acceptErrors: true })).status).toBe(201);
    expect((await pin(id, { summary: " " })).status).toBe(422);
  });

  it("are made once under one Idempotency-Key", async () => {
    const id = await create();
    const again = () =>
      call(versionsRoute.POST, "POST", {
        as: "author",
        body: { summary: "v" },
        params: { id },
        headers: { "idempotency-key": "once" },
      });
    expect((await again()).body).toEqual((await again()).body);
  });

  it("are withdrawn in public and once", async () => {
    const id = await pinned("public");
    const params = { id, n: "1" };
    const withdraw = () =>
      call(withdrawRoute.POST, "POST", { as: "author", body: { reason: "Wrong mass." }, params });
    expect(await withdraw()).toMatchObject({ status: 200, body: { reason: "Wrong mass." } });
    expect((await withdraw()).status).toBe(409);
    const answer = await version(id);
    expect(answer.status).toBe(200);
    expect(answer.headers.get("cache-control")).toBe("no-store");
    expect(answer.headers.get("leading-order-withdrawn")).toMatch(/^\d{4}-/);
  });

  it.each(["0", "-1", "1.0", "01", "x", "9999999999", "2"])("are not numbered “%s”", async (n) => {
    const id = await pinned("public");
    expect((await version(id, n)).status).toBe(404);
  });
});

type Square = [act: string, handler: unknown, method: string, more: Call];
const reason = { reason: "x" };
const squares: Square[] = [
  ["read the draft", calculationRoute.GET, "GET", {}],
  [
    "save",
    calculationRoute.PUT,
    "PUT",
    { body: { file: content("x") }, headers: { "if-match": '"1"' } },
  ],
  ["open", calculationRoute.PATCH, "PATCH", { body: { visibility: "public" } }],
  ["delete", calculationRoute.DELETE, "DELETE", {}],
  ["pin", versionsRoute.POST, "POST", { body: { summary: "x" } }],
  ["withdraw", withdrawRoute.POST, "POST", { body: reason }],
  ["list versions", versionsRoute.GET, "GET", {}],
  ["read a version", versionRoute.GET, "GET", {}],
  ["recompute", recomputeRoute.POST, "POST", { body: {} }],
];
const forReaders = new Set(["list versions", "read a version", "recompute"]);
const needsAccount = (method: string, act: string) => method !== "GET" && !forReaders.has(act);

describe.each(squares)("who may %s", (act, handler, method, more) => {
  const as = (who: string | undefined, id: string) =>
    call(handler, method, { ...more, as: who, params: { id, n: "1" } });

  it("is nobody else while private: 404, the same as for what is not there", async () => {
    const id = await pinned("private");
    const [there, nowhere] = [await as("other", id), await as("other", "0000000000")];
    expect(there.status).toBe(404);
    expect(there.body).toEqual(nowhere.body);
    expect((await as(undefined, id)).status).toBe(needsAccount(method, act) ? 401 : 404);
  });

  it.each(["link", "public"])("follows the table of roles when %s", async (visibility) => {
    const id = await pinned(visibility);
    expect((await as("other", id)).status).toBe(forReaders.has(act) ? 200 : 403);
    const visitor = (await as(undefined, id)).status;
    if (forReaders.has(act)) expect(visitor).toBe(200);
    else expect(visitor).toBe(needsAccount(method, act) ? 401 : 403);
  });

  it("is refused to a write from another site", async () => {
    if (method === "GET") return;
    const id = await pinned("public");
    const headers = { ...more.headers, "sec-fetch-site": "cross-site" };
    const answer = await call(handler, method, {
      ...more,
      headers,
      as: "author",
      params: { id, n: "1" },
    });
    expect(answer).toMatchObject({ status: 403, body: { type: "/problems/cross-site" } });
  });
});

describe("the rest of the API", () => {
  it("evaluates for anybody and saves nothing", async () => {
    const answer = await call(evaluateRoute.POST, "POST", {
      body: { file: content(), present: true },
    });
    expect(answer).toMatchObject({
      status: 200,
      body: { cells: { r1: { status: "ok" } }, presentation: { cells: { r1: { number: 1 } } } },
    });
    const list = await call(listRoute.GET, "GET", { query: "?scope=mine" });
    expect(list.body).toEqual({ items: [], nextCursor: null });
  });

  it("lists the constants of one edition, or of all", async () => {
    const one = await call(constantsRoute.GET, "GET", { query: "?edition=codata-2018" });
    expect(one.body.constants.find((row: { symbol: string }) => row.symbol === "c")).toMatchObject({
      value: 299792458,
      uncertainty: null,
      unit: "m s^-1",
    });
    const all = await call(constantsRoute.GET, "GET");
    expect(all.body.editions.map((edition: { edition: string }) => edition.edition)).toEqual([
      "codata-2018",
      "codata-2022",
    ]);
    expect((await call(constantsRoute.GET, "GET", { query: "?edition=x" })).status).toBe(422);
  });

  it("tells nothing of an error but its incident", async () => {
    const quiet = vi.spyOn(console, "error").mockImplementation(() => {});
    const { db } = await import("@/db");
    const id = await pinned("private");
    await db()("revisions").where({ calculation_id: id }).delete();
    const answer = await call(calculationRoute.GET, "GET", { as: "author", params: { id } });
    expect(answer.status).toBe(500);
    expect(JSON.stringify(answer.body)).not.toMatch(/revision|sqlite|select/i);
    expect(JSON.stringify(answer.body)).not.toContain(process.cwd());
    expect(quiet).toHaveBeenCalledOnce();
    quiet.mockRestore();
  });
});
