import { afterEach, describe, expect, it } from "vitest";
import * as confirmRoute from "@/app/api/auth/confirm/route";
import * as resendRoute from "@/app/api/auth/resend-confirmation/route";
import * as resetRoute from "@/app/api/auth/reset/route";
import * as resetRequestRoute from "@/app/api/auth/reset-request/route";
import * as signUpRoute from "@/app/api/auth/sign-up/route";
import * as meRoute from "@/app/api/me/route";
import { db } from "@/db";
import { countTry, forgiveEverybody } from "@/lib/http";
import { personSchema } from "@/lib/schema";
import { me, name, signedIn, signIn, signUp } from "../support/accounts";
import { type Answer, browser } from "../support/browser";
import { withDatabase } from "../support/database";
import { freshEmail, mailedToken, mailsTo, newPerson, password } from "../support/people";

withDatabase();
afterEach(forgiveEverybody);

/** What an answer tells, without what differs from one account to the next. */
function told(answer: Answer, email: string) {
  const headers = Object.fromEntries(answer.headers);
  headers["set-cookie"] = (headers["set-cookie"] ?? "").replace(/session=\w+/, "session=…");
  const text = JSON.stringify(answer.body).replaceAll(email, "…");
  return { status: answer.status, headers, text: text.replace(/"id":"\w+"/, '"id":"…"') };
}

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
