"use client";

import { postJson } from "@/components/site/post-json";
import { Field } from "@/components/ui/field";
import { AccountForm, type Entries } from "./account-form";
import { useSending } from "./use-sending";

/** A new account: name, address, password. */
export function SignUpForm({ returnTo }: { returnTo: string }) {
  const sending = useSending();
  const signUp = async ({ name, email, password }: Entries) => {
    const entry = { name, email, password };
    const person = await sending.send(() => postJson("/api/auth/sign-up", entry));
    if (person) window.location.assign(returnTo);
  };
  return (
    <AccountForm sending={sending} onSend={signUp} button="Sign up">
      <Field
        label="Name"
        name="name"
        autoComplete="name"
        required
        hint="The name you publish under; it stands on the versions you pin."
        error={sending.errorOf("name")}
      />
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
        autoComplete="new-password"
        required
        hint="At least 10 characters; several words make a good one."
        error={sending.errorOf("password")}
      />
    </AccountForm>
  );
}
