"use client";

import { postJson } from "@/components/site/post-json";
import { Field } from "@/components/ui/field";
import { AccountForm, type Entries } from "./account-form";
import { useSending } from "./use-sending";

/** A new password, by the token of a mailed link; afterwards the desk. */
export function ResetForm({ token }: { token: string }) {
  const sending = useSending();
  const reset = async ({ password }: Entries) => {
    const person = await sending.send(() => postJson("/api/auth/reset", { token, password }));
    if (person) window.location.assign("/desk");
  };
  return (
    <AccountForm sending={sending} onSend={reset} button="Set the password">
      <Field
        label="New password"
        name="password"
        type="password"
        autoComplete="new-password"
        required
        hint="At least 10 characters. Every other session will be ended."
        error={sending.errorOf("password")}
      />
    </AccountForm>
  );
}
