"use client";

import { useState } from "react";
import { postJson } from "@/components/site/post-json";
import { ProblemMessage } from "@/components/site/problem-message";
import { Button } from "@/components/ui/button";
import { useSending } from "./use-sending";

/** Mails the link that confirms one's address once more. */
export function ResendButton() {
  const sending = useSending();
  const [sent, setSent] = useState(false);
  const resend = async () => {
    if (await sending.send(() => postJson("/api/auth/resend-confirmation"))) setSent(true);
  };
  return (
    <>
      <Button look="quiet" onClick={resend} disabled={sending.busy || sent}>
        {sent ? "The link is on its way" : "Mail the link again"}
      </Button>
      <ProblemMessage problem={sending.problem} />
    </>
  );
}
