"use client";

import { useEffect, useState } from "react";
import { Button } from "@/components/ui/button";
import type { Base } from "./folio-state";
import type { SavingStatus } from "./use-saving";

function clock(iso: string): string {
  return new Intl.DateTimeFormat("en-GB", { timeStyle: "medium" }).format(new Date(iso));
}

type Trouble = Exclude<SavingStatus["word"], "saved" | "saving" | "unsaved">;

function isTrouble(word: SavingStatus["word"]): word is Trouble {
  return word !== "saved" && word !== "saving" && word !== "unsaved";
}

interface SavingLineProps {
  readonly id: string;
  readonly status: SavingStatus;
  readonly base: Base;
  /** False where the browser cannot keep anything. */
  readonly keeping: boolean;
  /** True while a typed line waits to be finished. */
  readonly hasPending: boolean;
  readonly onRetry: () => void;
}

/** Whether the work is safe, in words: “saved 12:04:31, revision 42”. */
export function SavingLine(props: SavingLineProps) {
  const { id, status, base, keeping, hasPending, onRetry } = props;
  // The reader's clock is known only after scripts run.
  const [time, setTime] = useState("");
  useEffect(() => setTime(clock(base.savedAt)), [base.savedAt]);
  return (
    <div className={`saving-line ${status.word === "saved" ? "text-oiii" : "text-sodium"}`}>
      {status.word === "saved" && <p>{`saved ${time}, revision ${base.revision}`}</p>}
      {status.word === "saving" && <p>saving…</p>}
      {status.word === "unsaved" && <p>kept in this browser, not yet saved</p>}
      {/* Only what needs the person is announced; “saving… saved” after each pause would be noise. */}
      <div role="status">
        {isTrouble(status.word) && <SavingTrouble id={id} status={status} onRetry={onRetry} />}
        {!keeping && <p>This browser keeps nothing: leave the page only after it is saved.</p>}
      </div>
      {hasPending && status.word === "saved" && (
        <p className="text-sodium">an unfinished line is kept in this browser</p>
      )}
    </div>
  );
}

function SavingTrouble({
  id,
  status,
  onRetry,
}: {
  id: string;
  status: SavingStatus;
  onRetry: () => void;
}) {
  const retry = (
    <Button look="quiet" onClick={onRetry}>
      save now
    </Button>
  );
  switch (status.word) {
    case "offline":
      return (
        <p>
          kept in this browser, not yet saved: the server cannot be reached. Go on working; it is
          saved when the server is back. {retry}
        </p>
      );
    case "signed-out":
      return (
        <p>
          kept in this browser, not yet saved: you are signed out.{" "}
          <a className="link" href={`/sign-in?return=/c/${id}`} target="_blank" rel="noreferrer">
            Sign in (in a new tab)
          </a>
          , and it is saved when you come back here. {retry}
        </p>
      );
    case "conflict":
      return <p>kept in this browser, not yet saved: choose below what stays</p>;
    case "refused":
      return (
        <p>
          kept in this browser, not saved: {status.why} {retry}
        </p>
      );
    default:
      return null;
  }
}
