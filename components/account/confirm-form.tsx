"use client";

import { useState } from "react";
import { postJson } from "@/components/site/post-json";
import { ButtonLink } from "@/components/ui/button";
import { Message } from "@/components/ui/message";
import { AccountForm } from "./account-form";
import { useSending } from "./use-sending";

/**
 * Confirms an address by a press, not by the mere visit: programs that look through mail follow links
 * and would spend the token.
 */
export function ConfirmForm({ token }: { token: string }) {
  const sending = useSending();
  const [confirmed, setConfirmed] = useState(false);
  const confirm = async () => {
    if (await sending.send(() => postJson("/api/auth/confirm", { token }))) setConfirmed(true);
  };
  if (confirmed) {
    return (
      <div className="flex flex-col items-start gap-5">
        <Message tone="good">Your address is confirmed.</Message>
        <ButtonLink href="/desk" look="primary">
          Go to the desk
        </ButtonLink>
      </div>
    );
  }
  return (
    <AccountForm sending={sending} onSend={confirm} button="Confirm this address">
      {null}
    </AccountForm>
  );
}
