import { afterEach, describe, expect, it, vi } from "vitest";
import * as confirmRoute from "@/app/api/auth/confirm/route";
import * as resendRoute from "@/app/api/auth/resend-confirmation/route";
import * as resetRoute from "@/app/api/auth/reset/route";
import * as resetRequestRoute from "@/app/api/auth/reset-request/route";
import * as signInRoute from "@/app/api/auth/sign-in/route";
import * as signOutRoute from "@/app/api/auth/sign-out/route";
import * as signUpRoute from "@/app/api/auth/sign-up/route";
import * as passwordRoute from "@/app/api/me/password/route";
import * as meRoute from "@/app/api/me/route";
import * as sessionRoute from "@/app/api/me/sessions/[id]/route";
import * as sessionsRoute from "@/app/api/me/sessions/route";
import { db } from "@/db";
import { countTry, forgiveEverybody } from "@/lib/http";
import { personSchema, sessionSchema } from "@/lib/schema";
import { type Answer, type Browser, browser, type Sent } from "../support/browser";
import { withDatabase } from "../support/database";
import { freshEmail, mailedToken, mailsTo, newPerson, password } from "../support/people";

withDatabase();
afterEach(() => {
  vi.useRealTimers();
  forgiveEverybody();
});

const name = "Ilse Wray";
const signUp = (who: Browser, email: string, secret = password) =>
  who.post(signUpRoute.POST, { email, name, password: secret });
const signIn = (who: Browser, email: string, secret = password, sent: Sent = {}) =>
  who.post(signInRoute.POST, { email, password: secret }, sent);
const me = async (who: Browser) => (await who.get(meRoute.GET)).status;

async function signedIn(email: string): Promise<Browser> {
  const who = browser();
  expect((await signIn(who, email)).status).toBe(200);
  return who;
}

/** What an answer tells, without what differs from one account to the next. */
function told(answer: Answer, email: string) {
  const headers = Object.fromEntries(answer.headers);
  headers["set-cookie"] = (headers["set-cookie"] ?? "").replace(/session=\w+/, "session=…");
  const text = JSON.stringify(answer.body).replaceAll(email, "…");
  return { status: answer.status, headers, text: text.replace(/"id":"\w+"/, '"id":"…"') };
}

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

describe("whether an address is known", () => {
  it("is not told by signing up", async () => {
    const [known, unknown] = [(await newPerson()).email, freshEmail()];
    const answers = [await signUp(browser(), known), await signUp(browser(), unknown)] as const;
    expect(answers[0].status).toBe(201);
    expect(told(answers[0], known)).toEqual(told(answers[1], unknown));
    expect(await mailsTo(known, "sign-up-again")).toBe(1);
    expect(await mailsTo(known, "confirm")).toBe(1);
  });

  it("is not told by what such an account sees or may do afterwards", async () => {
    const seen = [];
    const secret = "of the stranger";
    for (const email of [(await newPerson()).email, freshEmail()]) {
      const who = browser();
      await signUp(who, email, secret);
      const answers = [
        await who.get(meRoute.GET),
        await who.post(resendRoute.POST),
        await signIn(who, email, secret),
        await signUp(browser(), email, secret),
        await signUp(browser(), email, secret),
      ];
      seen.push(answers.map((answer) => told(answer, email)));
    }
    expect(seen[0]).toEqual(seen[1]);
  });

  it("is not told by signing in", async () => {
    const [known, unknown] = [(await newPerson()).email, freshEmail()];
    const answers = [
      await signIn(browser(), known, "not the password"),
      await signIn(browser(), unknown, "not the password"),
    ] as const;
    expect(answers[0].body.type).toBe("/problems/wrong-credentials");
    expect(told(answers[0], known)).toEqual(told(answers[1], unknown));
  });

  it("is not told by asking for a new password, nor by how long that takes", async () => {
    const [known, unknown] = [(await newPerson()).email, freshEmail()];
    const ask = async (email: string) => {
      const from = performance.now();
      const answer = await browser().post(resetRequestRoute.POST, { email });
      return { ms: performance.now() - from, told: told(answer, email) };
    };
    const [yes, no] = [await ask(known), await ask(unknown)];
    expect(yes.told).toEqual(no.told);
    expect(yes.told.status).toBe(202);
    for (const { ms } of [yes, no]) expect(ms).toBeGreaterThan(240);
    expect([await mailsTo(known, "reset"), await mailsTo(unknown, "reset")]).toEqual([1, 0]);
  });
});

describe("an account that was signed up with somebody else's address", () => {
  it("cannot be confirmed, and opens nothing of theirs", async () => {
    const owner = await newPerson();
    const stranger = browser();
    const answer = await signUp(stranger, owner.email.toUpperCase());
    expect(personSchema.parse(answer.body).id).not.toBe(owner.id);
    await stranger.post(resendRoute.POST);
    expect(await mailsTo(owner.email, "confirm")).toBe(1);
    expect((await stranger.get(meRoute.GET)).body).toMatchObject({ emailConfirmed: false });
    expect((await (await signedIn(owner.email)).get(meRoute.GET)).body.id).toBeTypeOf("string");
  });

  it("is not confirmed by the link that its rightful owner follows", async () => {
    const email = freshEmail();
    const [stranger, owner] = [browser(), browser()];
    await signUp(stranger, email, "of the stranger");
    await signUp(owner, email);
    const token = await mailedToken(email, "confirm");
    expect((await owner.post(confirmRoute.POST, { token })).status).toBe(200);
    expect((await owner.get(meRoute.GET)).body.emailConfirmed).toBe(true);
    expect((await stranger.get(meRoute.GET)).body.emailConfirmed).toBe(false);
  });

  it("cannot keep the owner out by claiming the address often", async () => {
    const email = freshEmail();
    const stranger = browser();
    while ((await signUp(stranger, email)).status === 201);
    await browser().post(resetRequestRoute.POST, { email });
    const owner = browser();
    const token = await mailedToken(email, "reset");
    expect((await owner.post(resetRoute.POST, { token, password: "of the owner" })).status).toBe(
      200,
    );
    expect((await owner.get(meRoute.GET)).body.emailConfirmed).toBe(true);
    expect((await signIn(browser(), email, "of the owner")).body.emailConfirmed).toBe(true);
  });
});

describe("a link to confirm an address", () => {
  it("works once", async () => {
    const email = freshEmail();
    const who = browser();
    await signUp(who, email);
    const token = await mailedToken(email, "confirm");
    const follow = () => browser().post(confirmRoute.POST, { token });
    expect([(await follow()).status, (await follow()).status]).toEqual([200, 400]);
    expect((await who.get(meRoute.GET)).body.emailConfirmed).toBe(true);
  });
});

describe("a link to set a new password", () => {
  const next = "set by a mailed link";
  const ask = (email: string) => browser().post(resetRequestRoute.POST, { email });
  const follow = (token: string, who = browser()) =>
    who.post(resetRoute.POST, { token, password: next });

  it("works once, and ends every session", async () => {
    const { email } = await newPerson();
    const before = await signedIn(email);
    await ask(email);
    const token = await mailedToken(email, "reset");
    const who = browser();
    expect((await follow(token, who)).status).toBe(200);
    expect((await follow(token)).status).toBe(400);
    expect([await me(who), await me(before)]).toEqual([200, 401]);
    expect((await signIn(browser(), email)).status).toBe(401);
    expect((await signIn(browser(), email, next)).status).toBe(200);
  });

  it("works once when followed twice at the same time", async () => {
    const { email } = await newPerson();
    await ask(email);
    const token = await mailedToken(email, "reset");
    const statuses = (await Promise.all([follow(token), follow(token)])).map((one) => one.status);
    expect(statuses.sort()).toEqual([200, 400]);
  });

  it("is not sent more than three times an hour, and the answer does not tell", async () => {
    const { email } = await newPerson();
    const answers = [];
    for (let tries = 0; tries < 5; tries++) answers.push(told(await ask(email), email));
    expect(new Set(answers.map((answer) => JSON.stringify(answer))).size).toBe(1);
    expect(await mailsTo(email, "reset")).toBe(3);
  });

  it("cannot be guessed without end", async () => {
    let status = 400;
    for (let tries = 0; status === 400 && tries < 100; tries++) {
      status = (await browser().post(confirmRoute.POST, { token: `guess ${tries}` })).status;
    }
    expect(status).toBe(429);
    expect((await follow("guess")).status).toBe(429);
  });
});

describe("guessing passwords", () => {
  const guess = (email: string, address?: string) =>
    signIn(browser(), email, "a wrong guess", { headers: { "x-forwarded-for": address } });

  it("of one account is slowed down, right or wrong, from wherever it comes", async () => {
    const { email } = await newPerson();
    for (let tries = 0; tries < 8; tries++) {
      expect((await guess(email, `198.51.100.${tries}`)).status).toBe(401);
    }
    const answer = await signIn(browser(), email.toUpperCase());
    expect(answer.status).toBe(429);
    expect(Number(answer.headers.get("retry-after"))).toBeGreaterThan(50);
  });

  it("of many accounts from one address is slowed down, whatever the sender claims", async () => {
    const address = "203.0.113.9";
    for (let tries = 0; tries < 55; tries++) await countTry("sign-in-address", address);
    const statuses = [];
    for (let tries = 0; tries < 6; tries++) {
      statuses.push((await guess(freshEmail(), `6.6.6.${tries}, ${address}`)).status);
    }
    expect(statuses).toEqual([401, 401, 401, 401, 401, 429]);
    expect((await guess(freshEmail(), "203.0.113.10")).status).toBe(401);
  });

  it("is forgiven who remembers in time", async () => {
    const { email } = await newPerson();
    for (let round = 0; round < 2; round++) {
      for (let tries = 0; tries < 7; tries++) await guess(email, `203.0.113.${round}`);
      expect((await signIn(browser(), email)).status).toBe(200);
    }
  });
});

describe("what is typed at the door", () => {
  it.each([
    ["an address of two lines", { email: "a@tarn-hollow.example\r\nBcc: b@evil.example" }],
    ["two addresses", { email: "a@tarn-hollow.example,b@evil.example" }],
    ["a name of two lines", { name: "Ilse\r\nBcc: b@evil.example" }],
    ["a name with markup", { name: "<script>alert(1)</script>" }],
    ["a short password", { password: "short" }],
    ["a long password", { password: "x".repeat(201) }],
    ["a wish to be more", { emailConfirmed: true }],
  ])("%s is refused", async (_what, typed) => {
    const entry = { email: freshEmail(), name, password, ...typed };
    expect((await browser().post(signUpRoute.POST, entry)).status).toBe(422);
    expect(await db()("users").where({ email: entry.email })).toEqual([]);
  });

  it("never comes back: no answer holds a password or its hash", async () => {
    const who = browser();
    const answers = [await signUp(who, freshEmail()), await who.get(meRoute.GET)];
    expect(JSON.stringify(answers.map((answer) => answer.body))).not.toMatch(/password|argon2/);
  });

  it.each(["' OR 1=1 --", "%", "*", "\u0000", "a".repeat(254)])(
    "is no way in without an account: %j",
    async (email) => {
      expect((await signIn(browser(), email)).status).toBe(401);
    },
  );
});

describe("one's own profile", () => {
  it("takes a new name, and nothing else", async () => {
    const who = await signedIn((await newPerson()).email);
    const patch = (body: unknown) => who.call(meRoute.PATCH, "PATCH", { body });
    expect((await patch({ name: "Ilse W. Wray" })).status).toBe(200);
    expect((await who.get(meRoute.GET)).body.name).toBe("Ilse W. Wray");
    for (const more of [{ id: "x" }, { email: "b@evil.example" }, { emailConfirmed: true }]) {
      expect((await patch({ name, ...more })).status).toBe(422);
    }
  });
});
