"use client";

import { postJson } from "@/components/site/post-json";
import { Field } from "@/components/ui/field";
import { AccountForm, type Entries } from "./account-form";
import { useSending } from "./use-sending";

/** Address and password; afterwards the page one came for. */
export function SignInForm({ returnTo }: { returnTo: string }) {
  const sending = useSending();
  const signIn = async ({ email, password }: Entries) => {
    const person = await sending.send(() => postJson("/api/auth/sign-in", { email, password }));
    // A whole load, so that every part of the page knows who is there.
    if (person) window.location.assign(returnTo);
  };
  return (
    <AccountForm sending={sending} onSend={signIn} button="Sign in">
      <Field
        label="E-mail address"
        name="email"
        type="email"
        autoComplete="username"
        required
        error={sending.errorOf("email")}
      />
      <Field
        label="Password"
        name="password"
        type="password"
        autoComplete="current-password"
        required
        error={sending.errorOf("password")}
      />
    </AccountForm>
  );
}
