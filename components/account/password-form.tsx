"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { postJson } from "@/components/site/post-json";
import { Field } from "@/components/ui/field";
import { Message } from "@/components/ui/message";
import { AccountForm, type Entries } from "./account-form";
import { useSending } from "./use-sending";

/** Changes the password; every other session ends. */
export function PasswordForm({ email }: { email: string }) {
  const sending = useSending();
  const router = useRouter();
  const [changed, setChanged] = useState(false);
  const change = async ({ currentPassword, newPassword }: Entries, form: HTMLFormElement) => {
    setChanged(false);
    const entry = { currentPassword, newPassword };
    if (!(await sending.send(() => postJson("/api/me/password", entry)))) return;
    setChanged(true);
    form.reset();
    router.refresh();
  };
  return (
    <AccountForm sending={sending} onSend={change} button="Change the password">
      {/* For password managers: whose password this is. */}
      <input type="hidden" name="username" autoComplete="username" defaultValue={email} />
      <Field
        label="Current password"
        name="currentPassword"
        type="password"
        autoComplete="current-password"
        required
        error={sending.errorOf("currentPassword")}
      />
      <Field
        label="New password"
        name="newPassword"
        type="password"
        autoComplete="new-password"
        required
        hint="At least 10 characters."
        error={sending.errorOf("newPassword")}
      />
      {changed && (
        <Message tone="good">The password is changed; your other sessions are ended.</Message>
      )}
    </AccountForm>
  );
}
