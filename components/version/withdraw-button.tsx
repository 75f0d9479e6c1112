"use client";

import { useRouter } from "next/navigation";
import { type FormEvent, useId, useState } from "react";
import { Button } from "@/components/ui/button";
import { Dialog } from "@/components/ui/dialog";
import { Message } from "@/components/ui/message";
import { withdraw } from "./version-api";

const longestReason = 2_000;

/** Withdraw a version: asks for the reason, and says that it is for good. */
export function WithdrawButton({ id, number }: { id: string; number: number }) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button look="danger" onClick={() => setOpen(true)}>
        withdraw…
      </Button>
      <Dialog title={`Withdraw v${number}`} open={open} onClose={() => setOpen(false)}>
        <WithdrawForm id={id} number={number} onDone={() => setOpen(false)} />
      </Dialog>
    </>
  );
}

function WithdrawForm({ id, number, onDone }: { id: string; number: number; onDone: () => void }) {
  const router = useRouter();
  const field = useId();
  const [reason, setReason] = useState("");
  const [sending, setSending] = useState(false);
  const [why, setWhy] = useState<string>();
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    if (reason.trim() === "") return setWhy("Give the reason; readers will see it.");
    setSending(true);
    const asked = await withdraw(id, number, reason.trim());
    setSending(false);
    if ("why" in asked) return setWhy(asked.why);
    onDone();
    router.refresh();
  };
  return (
    <form onSubmit={submit} className="space-y-4 font-sans text-sm">
      <p>
        A withdrawn version stays readable at its address, with a notice and your reason above it
        for everybody who opens it. This cannot be undone.
      </p>
      <div>
        <label htmlFor={field} className="block font-medium">
          Reason
        </label>
        <textarea
          id={field}
          required
          rows={4}
          maxLength={longestReason}
          value={reason}
          onChange={(event) => setReason(event.target.value)}
          className="mt-1 block w-full border border-ink bg-transparent p-2"
        />
      </div>
      {why && <Message tone="error">{why}</Message>}
      <Button type="submit" look="danger" disabled={sending}>
        {sending ? "withdrawing…" : `withdraw v${number}`}
      </Button>
    </form>
  );
}
