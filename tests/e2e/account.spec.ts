import { expect, type Page, test } from "@playwright/test";
import { type Account, newcomer, signIn, signInByForm, signUp } from "./people";

interface Mail {
  readonly recipient: string;
  readonly subject: string;
  readonly text: string;
}

/** The link in the latest mail to a person whose subject has the words. */
async function mailedLink(page: Page, { email }: Account, words: RegExp): Promise<string> {
  let link: string | undefined;
  await expect
    .poll(async () => {
      const { items } = (await (await page.request.get("/api/mail")).json()) as { items: Mail[] };
      const mail = items.find((one) => one.recipient === email && words.test(one.subject));
      link = mail?.text.match(/https?:\/\/\S+/)?.[0];
      return link;
    })
    .toBeDefined();
  return link ?? "";
}

async function askForReset(page: Page, email: string): Promise<string> {
  await page.goto("/reset");
  await page.getByLabel("E-mail address").fill(email);
  await page.getByRole("button", { name: "Mail me a link" }).click();
  const answer = page.getByRole("main").getByRole("status");
  await expect(answer).toContainText("a mail with a link is on its way");
  return ((await answer.textContent()) ?? "").replace(email, "");
}

/** A second browser in which the person is signed in. */
async function elsewhere(page: Page, person: Account): Promise<Page> {
  const browser = page.context().browser();
  if (!browser) throw new Error("The context has no browser.");
  const other = await (await browser.newContext()).newPage();
  await signIn(other.request, person);
  return other;
}

async function isSignedIn(page: Page): Promise<boolean> {
  return (await page.request.get("/api/me")).ok();
}

test("I confirm my address by the mailed link, and Settings says so", async ({ page, context }) => {
  const person = await signUp(context);
  await page.goto("/settings");
  await expect(page.getByText("not confirmed")).toBeVisible();
  await page.goto(await mailedLink(page, person, /Confirm/));
  await page.getByRole("button", { name: "Confirm this address" }).click();
  await expect(page.getByText("Your address is confirmed.")).toBeVisible();
  await page.goto("/settings");
  await expect(page.getByText("not confirmed")).toBeHidden();
  await expect(page.getByText("confirmed")).toBeVisible();
});

test("I forgot my password: a mailed link sets a new one and ends every other session", async ({
  page,
  context,
}) => {
  const person = await signUp(context);
  const other = await elsewhere(page, person);
  await context.clearCookies();
  await askForReset(page, person.email);
  const link = await mailedLink(page, person, /new password/);
  await page.goto(link);
  await page.getByLabel("New password").fill("a different corona 42");
  await page.getByRole("button", { name: "Set the password" }).click();
  await page.waitForURL("/desk");
  expect(await isSignedIn(other)).toBe(false);

  await other.goto("/sign-in");
  await signInByForm(other, person.email, person.password);
  await expect(other.getByRole("main").getByRole("alert")).toBeVisible();
  expect(await isSignedIn(other)).toBe(false);
  await signInByForm(other, person.email, "a different corona 42");
  await other.waitForURL("/desk");

  await context.clearCookies();
  await page.goto(link);
  await page.getByLabel("New password").fill("the link once more 43");
  await page.getByRole("button", { name: "Set the password" }).click();
  await expect(page.getByRole("main").getByRole("alert")).toBeVisible();
});

test("Asking for a reset says the same of an address that nobody has", async ({
  page,
  context,
}) => {
  const { email } = await signUp(context);
  await context.clearCookies();
  const ofKnown = await askForReset(page, email);
  const ofUnknown = await askForReset(page, newcomer().email);
  expect(ofUnknown).toBe(ofKnown);
});

test("Signing in says the same of a wrong password and of an address that nobody has", async ({
  page,
  context,
}) => {
  const { email } = await signUp(context);
  await context.clearCookies();
  const said: (string | null)[] = [];
  for (const address of [email, newcomer().email]) {
    await page.goto("/sign-in");
    await signInByForm(page, address, "not the password");
    const alert = page.getByRole("main").getByRole("alert");
    await expect(alert).toBeVisible();
    said.push(await alert.textContent());
  }
  expect(said[1]).toBe(said[0]);
});

test("Settings lists my sessions, and I end the one in another browser", async ({
  page,
  context,
}) => {
  const person = await signUp(context);
  const other = await elsewhere(page, person);
  expect(await isSignedIn(other)).toBe(true);
  await page.goto("/settings");
  const sessions = page.getByRole("region", { name: "Sessions" }).getByRole("listitem");
  await expect(sessions).toHaveCount(2);
  await sessions.getByRole("button", { name: /^end/ }).click();
  await expect(sessions).toHaveCount(1);
  await expect(sessions).toContainText("this one");
  expect(await isSignedIn(other)).toBe(false);
  expect(await isSignedIn(page)).toBe(true);
});

test("I change my password in Settings: other sessions end, the old one is refused", async ({
  page,
  context,
}) => {
  const person = await signUp(context);
  const other = await elsewhere(page, person);
  await page.goto("/settings");
  await page.getByLabel("Current password").fill(person.password);
  await page.getByLabel("New password").fill("a different corona 42");
  await page.getByRole("button", { name: "Change the password" }).click();
  await expect(page.getByText("The password is changed")).toBeVisible();
  expect(await isSignedIn(page)).toBe(true);
  expect(await isSignedIn(other)).toBe(false);
  await other.goto("/sign-in");
  await signInByForm(other, person.email, person.password);
  await expect(other.getByRole("main").getByRole("alert")).toBeVisible();
});

test("After signing out, the desk asks me to sign in and the way back leads to it", async ({
  page,
  context,
}) => {
  const person = await signUp(context);
  await page.goto("/desk");
  await page.getByRole("button", { name: "Sign out" }).click();
  await page.waitForURL("/");
  await page.goto("/desk");
  await page.waitForURL(/\/sign-in\?return=/);
  await signInByForm(page, person.email, person.password);
  await page.waitForURL(/\/desk(\?|$)/);
});
