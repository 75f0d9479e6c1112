import { afterEach, describe, expect, it, vi } from "vitest";
import * as resetRoute from "@/app/api/auth/reset/route";
import * as resetRequestRoute from "@/app/api/auth/reset-request/route";
import * as signOutRoute from "@/app/api/auth/sign-out/route";
import * as passwordRoute from "@/app/api/me/password/route";
import * as sessionRoute from "@/app/api/me/sessions/[id]/route";
import * as sessionsRoute from "@/app/api/me/sessions/route";
import { db } from "@/db";
import { forgiveEverybody } from "@/lib/http";
import { sessionSchema } from "@/lib/schema";
import { me, signedIn, signIn, signUp } from "../support/accounts";
import { type Browser, browser } from "../support/browser";
import { withDatabase } from "../support/database";
import { freshEmail, mailedToken, mailsTo, newPerson, password } from "../support/people";

withDatabase();
afterEach(() => {
  vi.useRealTimers();
  forgiveEverybody();
});

describe("the session cookie", () => {
  it("is out of reach of scripts and of other sites", async () => {
    const answer = await signUp(browser(), freshEmail());
    const cookie = answer.headers.get("set-cookie") ?? "";
    expect(cookie).toMatch(/^session=\w{30,}; /);
    for (const attribute of ["HttpOnly", "SameSite=Lax", "Path=/"]) {
      expect(cookie).toContain(attribute);
    }
    expect(cookie).not.toMatch(/Domain=/i);
  });

  it("is tied to its host and to TLS in a deployment", async () => {
    vi.stubEnv("APP_URL", "https://estimates.example");
    vi.resetModules();
    const { openSession } = await import("@/lib/auth");
    const cookie = await openSession((await newPerson()).id, "test");
    expect(cookie).toMatch(/^__Host-session=\w+; /);
    expect(cookie).toMatch(/; Secure/);
    vi.unstubAllEnvs();
  });

  it("holds a secret that the database does not", async () => {
    const who = await signedIn((await newPerson()).email);
    const secret = who.cookie?.split("=")[1] ?? "";
    const rows = JSON.stringify(await db()("sessions"));
    expect(secret.length).toBeGreaterThan(30);
    expect(rows).not.toContain(secret);
  });
});

describe("a session", () => {
  it("is not the one that the browser brought: nothing is fixed before signing in", async () => {
    const { email } = await newPerson();
    const who = browser();
    who.cookie = "session=chosenbysomebodyelse";
    await signIn(who, email);
    expect(who.cookie).not.toBe("session=chosenbysomebodyelse");
    const thief = browser();
    thief.cookie = "session=chosenbysomebodyelse";
    expect(await me(thief)).toBe(401);
  });

  it.each(["signing in", "signing up"])("ends by %s again", async (how) => {
    const { email } = await newPerson();
    const who = await signedIn(email);
    const thief = browser();
    thief.cookie = who.cookie;
    await (how === "signing in" ? signIn(who, email) : signUp(who, freshEmail()));
    expect(who.cookie).not.toBe(thief.cookie);
    expect([await me(who), await me(thief)]).toEqual([200, 401]);
  });

  it("is worth nothing after signing out", async () => {
    const who = await signedIn((await newPerson()).email);
    const thief = browser();
    thief.cookie = who.cookie;
    expect((await who.post(signOutRoute.POST)).status).toBe(200);
    expect(who.cookie).toBeUndefined();
    expect(await me(thief)).toBe(401);
    expect((await who.post(signOutRoute.POST)).status).toBe(200);
  });

  it("ends after 30 days, however much it is used", async () => {
    const { email } = await newPerson();
    const day = 24 * 3600 * 1000;
    const start = Date.now();
    vi.useFakeTimers({ toFake: ["Date"], now: start });
    const who = await signedIn(email);
    for (const days of [10, 20, 29]) {
      vi.setSystemTime(start + days * day);
      expect(await me(who)).toBe(200);
    }
    vi.setSystemTime(start + 30 * day);
    expect(await me(who)).toBe(401);
  });

  it("does not live longer when the clock is set back", async () => {
    const { email } = await newPerson();
    const start = Date.now();
    vi.useFakeTimers({ toFake: ["Date"], now: start });
    const who = await signedIn(email);
    vi.setSystemTime(start - 24 * 3600 * 1000);
    expect(await me(who)).toBe(401);
  });
});

describe("the list of sessions", () => {
  it("shows one's own, and which is this one", async () => {
    const { email } = await newPerson();
    const [laptop, desktop] = [await signedIn(email), await signedIn(email)];
    await signedIn((await newPerson()).email);
    const { items } = (await laptop.get(sessionsRoute.GET)).body;
    expect(items).toHaveLength(2);
    expect(items.map((item: unknown) => sessionSchema.safeParse(item).success)).toEqual([
      true,
      true,
    ]);
    expect(items.filter((item: { current: boolean }) => item.current)).toHaveLength(1);
    expect(JSON.stringify(items)).not.toContain(desktop.cookie?.split("=")[1]);
  });

  it("lets one end another of one's own", async () => {
    const { email } = await newPerson();
    const [laptop, desktop] = [await signedIn(email), await signedIn(email)];
    const { items } = (await laptop.get(sessionsRoute.GET)).body;
    const { id } = items.find((item: { current: boolean }) => !item.current);
    const ended = await laptop.call(sessionRoute.DELETE, "DELETE", { params: { id } });
    expect(ended.status).toBe(200);
    expect([await me(laptop), await me(desktop)]).toEqual([200, 401]);
  });

  it("does not let one end somebody else's, nor tell that it is there", async () => {
    const mine = await signedIn((await newPerson()).email);
    const theirs = await signedIn((await newPerson()).email);
    const { id } = (await theirs.get(sessionsRoute.GET)).body.items[0];
    const drop = (params: { id: string }) => mine.call(sessionRoute.DELETE, "DELETE", { params });
    const [there, nowhere] = [await drop({ id }), await drop({ id: "0".repeat(64) })];
    expect(there.status).toBe(404);
    expect(there.body).toEqual(nowhere.body);
    expect(await me(theirs)).toBe(200);
  });
});

describe("changing the password", () => {
  const next = "another long password";
  const change = (who: Browser, currentPassword = password) =>
    who.post(passwordRoute.POST, { currentPassword, newPassword: next });

  it("ends every other session and changes the secret of this one", async () => {
    const { email } = await newPerson();
    const [here, other] = [await signedIn(email), await signedIn(email)];
    const before = browser();
    before.cookie = here.cookie;
    expect((await change(here)).status).toBe(200);
    expect([await me(here), await me(other), await me(before)]).toEqual([200, 401, 401]);
    expect((await signIn(browser(), email)).status).toBe(401);
    expect((await signIn(browser(), email, next)).status).toBe(200);
    expect(await mailsTo(email, "password-changed")).toBe(1);
  });

  it("ends links to set a new one", async () => {
    const { email } = await newPerson();
    await browser().post(resetRequestRoute.POST, { email });
    const token = await mailedToken(email, "reset");
    await change(await signedIn(email));
    const late = await browser().post(resetRoute.POST, { token, password: "by an old link" });
    expect(late.status).toBe(400);
  });

  it("wants the current one, and not for ever", async () => {
    const { email } = await newPerson();
    const who = await signedIn(email);
    for (let tries = 0; tries < 8; tries++) expect((await change(who, "a guess")).status).toBe(422);
    expect((await change(who)).status).toBe(429);
    expect(await me(who)).toBe(200);
  });
});
