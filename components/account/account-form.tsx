"use client";

import type { ReactNode } from "react";
import { ProblemMessage } from "@/components/site/problem-message";
import { Button } from "@/components/ui/button";
import type { Sending } from "./use-sending";

/** The texts of a form, by the names of its fields. */
export type Entries = Readonly<Record<string, string>>;

function entriesOf(form: HTMLFormElement): Entries {
  const entries = [...new FormData(form)].map(([name, value]) => [name, String(value)]);
  return Object.fromEntries(entries);
}

/** A form that sends its fields as JSON: its fields, what went wrong, and one button. */
export function AccountForm({
  sending,
  onSend,
  button,
  children,
}: {
  sending: Sending;
  onSend: (entries: Entries, form: HTMLFormElement) => void;
  button: string;
  children: ReactNode;
}) {
  return (
    <form
      noValidate
      // Without scripts nothing is sent: a password must not end up in an address.
      method="post"
      className="flex flex-col gap-5"
      onSubmit={(event) => {
        event.preventDefault();
        onSend(entriesOf(event.currentTarget), event.currentTarget);
      }}
    >
      <ProblemMessage problem={sending.problem} />
      {children}
      <div>
        <Button type="submit" look="primary" disabled={sending.busy}>
          {button}
        </Button>
      </div>
    </form>
  );
}
