"use client";

import { type FormEvent, useState } from "react";
import { Button } from "@/components/ui/button";
import { Field } from "@/components/ui/field";
import { Message } from "@/components/ui/message";
import { StatusWord } from "@/components/ui/status-word";
import type { CalculationFile, EvaluateAnswer, Visibility } from "@/lib/schema";
import { type FaultyCell, faultyCells } from "./faulty-cells";
import { audience } from "./pin-dialog";

interface PinFormProps {
  readonly file: CalculationFile;
  readonly answer: EvaluateAnswer;
  readonly visibility: Visibility;
  /** Resolves to a sentence that says why not, or to nothing. */
  readonly onPin: (summary: string, acceptErrors: boolean) => Promise<string | undefined>;
}

const longestSummary = 500;
const mostListed = 8;

function FaultList({ faults }: { faults: readonly FaultyCell[] }) {
  return (
    <ul className="mt-1 space-y-1">
      {faults.slice(0, mostListed).map((fault) => (
        <li key={fault.id}>
          <StatusWord status="error">{fault.name}</StatusWord> {fault.message}
        </li>
      ))}
      {faults.length > mostListed && <li>and {faults.length - mostListed} more</li>}
    </ul>
  );
}

/** The summary of a version to be pinned, and what pinning means. */
export function PinForm({ file, answer, visibility, onPin }: PinFormProps) {
  const [summary, setSummary] = useState("");
  const [accepts, setAccepts] = useState(false);
  const [busy, setBusy] = useState(false);
  const [trouble, setTrouble] = useState<string>();
  const faults = faultyCells(file, answer);
  const count = faults.length === 1 ? "one fault" : `${faults.length} faults`;
  const submit = async (event: FormEvent) => {
    event.preventDefault();
    setBusy(true);
    setTrouble(await onPin(summary.trim(), accepts));
    setBusy(false);
  };
  return (
    <form className="space-y-4 font-sans text-sm" onSubmit={submit}>
      <p>
        A version keeps the calculation and its results as they are now, for good. It can be
        withdrawn with a reason, but never changed or deleted. {audience[visibility]}
      </p>
      <Field
        label="Summary"
        hint="What this version is, in a line."
        value={summary}
        maxLength={longestSummary}
        required
        autoFocus
        onChange={(event) => setSummary(event.target.value)}
      />
      {faults.length > 0 && (
        <div className="border-l-4 border-halpha py-1 pl-3">
          <p>{faults.length === 1 ? "A cell has an error." : "Some cells have errors."}</p>
          <FaultList faults={faults} />
          <label className="mt-2 flex items-baseline gap-2">
            <input
              type="checkbox"
              checked={accepts}
              onChange={(event) => setAccepts(event.target.checked)}
            />
            Pin in spite of {count}; readers will see {faults.length === 1 ? "it" : "them"}.
          </label>
        </div>
      )}
      {trouble && <Message tone="error">{trouble}</Message>}
      <Button
        look="primary"
        type="submit"
        disabled={busy || summary.trim() === "" || (faults.length > 0 && !accepts)}
      >
        {busy ? "pinning…" : visibility === "private" ? "pin" : "pin for everybody to read"}
      </Button>
    </form>
  );
}
