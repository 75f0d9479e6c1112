"use client";

import { useEffect, useState } from "react";
import type { Base } from "./folio-state";
import type { SavingStatus } from "./use-saving";

function clock(iso: string): string {
  return new Intl.DateTimeFormat("en-GB", { timeStyle: "medium" }).format(new Date(iso));
}

const words: Record<Exclude<SavingStatus["word"], "saved" | "refused" | "signed-out">, string> = {
  saving: "saving…",
  unsaved: "kept in this browser, not yet saved",
  offline:
    "The server cannot be reached. Your work is kept in this browser and saved when it is back.",
  conflict: "not saved: somebody else changed the same cell",
};

/** Whether the work is safe, in words: “saved 12:04:31, revision 42”. */
export function SavingLine({
  status,
  base,
  keeping,
}: {
  status: SavingStatus;
  base: Base;
  keeping: boolean;
}) {
  // The reader's clock is known only after scripts run.
  const [saved, setSaved] = useState("");
  useEffect(() => setSaved(clock(base.savedAt)), [base.savedAt]);
  return (
    <p
      className={`saving-line ${status.word === "saved" ? "text-oiii" : "text-sodium"}`}
      role="status"
    >
      {status.word === "saved" && `saved ${saved}, revision ${base.revision}`}
      {status.word === "refused" && `not saved: ${status.why} Your work is kept in this browser.`}
      {status.word === "signed-out" && (
        <>
          You are signed out. Your work is kept in this browser.{" "}
          <a className="underline" href="/sign-in?return=/desk" target="_blank" rel="noreferrer">
            Sign in
          </a>{" "}
          in a new tab, and it is saved when you come back here.
        </>
      )}
      {status.word in words && words[status.word as keyof typeof words]}
      {!keeping && " This browser keeps nothing: do not close the page before it is saved."}
    </p>
  );
}
