import { randomUUID } from "node:crypto";
import {
  type APIRequestContext,
  type BrowserContext,
  expect,
  type Page,
  test,
} from "@playwright/test";

/** A person with a fresh account. */
export interface Account {
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

/** Where the product runs in these tests. */
export function address(): string {
  return test.info().project.use.baseURL ?? "";
}

/** What a browser sends with a write of its own pages. */
export function fromHere(): { origin: string } {
  return { origin: address() };
}

/** Somebody who has no account yet. */
export function newcomer(name = "Oriane Feldt"): Account {
  return {
    name,
    email: `reader-${randomUUID()}@tarn-hollow.example`,
    password: `quiet corona ${randomUUID()}`,
  };
}

/** Make an account; the context is signed in afterwards. */
export async function signUp(context: BrowserContext, person = newcomer()): Promise<Account> {
  const answer = await context.request.post("/api/auth/sign-up", {
    data: person,
    headers: fromHere(),
  });
  expect(answer.status()).toBe(201);
  return person;
}

/** Sign in without the form. */
export async function signIn(request: APIRequestContext, person: Account): Promise<void> {
  const { email, password } = person;
  const answer = await request.post("/api/auth/sign-in", {
    data: { email, password },
    headers: fromHere(),
  });
  expect(answer.ok()).toBe(true);
}

/** Fill the form on the page one is on and send it. */
export async function signInByForm(page: Page, email: string, password: string): Promise<void> {
  await page.getByLabel("E-mail address").fill(email);
  await page.getByLabel("Password").fill(password);
  await page.getByRole("button", { name: "Sign in" }).click();
}
