"use client";

import { useState } from "react";
import { postJson } from "@/components/site/post-json";
import { Field } from "@/components/ui/field";
import { Message } from "@/components/ui/message";
import { AccountForm, type Entries } from "./account-form";
import { useSending } from "./use-sending";

/** Asks for a mail with a link; the answer does not tell whether the address is known. */
export function ResetRequestForm() {
  const sending = useSending();
  const [sentTo, setSentTo] = useState<string>();
  const ask = async ({ email = "" }: Entries) => {
    const accepted = await sending.send(() => postJson("/api/auth/reset-request", { email }));
    if (accepted) setSentTo(email);
  };
  if (sentTo !== undefined) {
    return (
      <Message tone="good">
        If an account has the address {sentTo}, a mail with a link is on its way. The link is good
        for one hour.
      </Message>
    );
  }
  return (
    <AccountForm sending={sending} onSend={ask} button="Mail me a link">
      <Field
        label="E-mail address"
        name="email"
        type="email"
        autoComplete="username"
        required
        error={sending.errorOf("email")}
      />
    </AccountForm>
  );
}
