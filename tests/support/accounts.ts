import { expect } from "vitest";
import * as signInRoute from "@/app/api/auth/sign-in/route";
import * as signUpRoute from "@/app/api/auth/sign-up/route";
import * as meRoute from "@/app/api/me/route";
import { type Answer, type Browser, browser, type Sent } from "./browser";
import { password } from "./people";

export const name = "Ilse Wray";

/** Make an account over the API; the browser is signed in afterwards. */
export function signUp(who: Browser, email: string, secret = password): Promise<Answer> {
  return who.post(signUpRoute.POST, { email, name, password: secret });
}

/** Sign in over the API, or try to. */
export function signIn(
  who: Browser,
  email: string,
  secret = password,
  sent: Sent = {},
): Promise<Answer> {
  return who.post(signInRoute.POST, { email, password: secret }, sent);
}

/** A browser in which somebody is signed in. */
export async function signedIn(email: string): Promise<Browser> {
  const who = browser();
  expect((await signIn(who, email)).status).toBe(200);
  return who;
}

/** 200 for a browser that is signed in, 401 for one that is not. */
export async function me(who: Browser): Promise<number> {
  return (await who.get(meRoute.GET)).status;
}
