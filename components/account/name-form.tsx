"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { sendJson } from "@/components/site/post-json";
import { Field } from "@/components/ui/field";
import { Message } from "@/components/ui/message";
import { AccountForm, type Entries } from "./account-form";
import { useSending } from "./use-sending";

/** Changes the name one publishes under. */
export function NameForm({ name }: { name: string }) {
  const sending = useSending();
  const router = useRouter();
  const [saved, setSaved] = useState<string>();
  const save = async (entries: Entries) => {
    setSaved(undefined);
    const change = { name: entries.name };
    const person = await sending.send(() => sendJson<{ name: string }>("PATCH", "/api/me", change));
    if (!person) return;
    setSaved(person.name);
    router.refresh();
  };
  return (
    <AccountForm sending={sending} onSend={save} button="Save the name">
      <Field
        label="Name"
        name="name"
        autoComplete="name"
        defaultValue={name}
        required
        hint="It stands on the versions you pin from now on; those already pinned keep theirs."
        error={sending.errorOf("name")}
      />
      {saved !== undefined && <Message tone="good">Saved: you publish as {saved}.</Message>}
    </AccountForm>
  );
}
