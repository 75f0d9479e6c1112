"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { CopyButton } from "@/components/ui/copy-button";
import { Dialog } from "@/components/ui/dialog";
import { Field } from "@/components/ui/field";
import { Message } from "@/components/ui/message";
import type { EvaluateAnswer, Visibility } from "@/lib/schema";
import { pinDraft, tellProblem } from "./folio-api";

interface PinDialogProps {
  readonly id: string;
  readonly open: boolean;
  readonly visibility: Visibility;
  readonly answer: EvaluateAnswer;
  readonly flush: () => Promise<boolean>;
  readonly onPinned: (version: number) => void;
  readonly onClose: () => void;
}

const audience: Record<Visibility, string> = {
  private: "Only you can read it, until you open the calculation to others.",
  link: "Everybody who has the link will be able to read it.",
  public: "Everybody will be able to read and find it.",
};

/** Pinning: an act with a summary, after which the version never changes. */
export function PinDialog(props: PinDialogProps) {
  const { id, answer, flush } = props;
  const [summary, setSummary] = useState("");
  const [accepts, setAccepts] = useState(false);
  const [trouble, setTrouble] = useState<string>();
  const [busy, setBusy] = useState(false);
  const [pinned, setPinned] = useState<{ version: number; url: string }>();
  const faulty = Object.values(answer.cells).filter((cell) => cell.status === "error").length;

  const pin = async () => {
    setBusy(true);
    setTrouble(undefined);
    const isSaved = await flush();
    const sent = isSaved
      ? await pinDraft(id, { summary, ...(accepts ? { acceptErrors: true } : {}) })
      : undefined;
    setBusy(false);
    if (!sent)
      return setTrouble(
        "The draft is not saved yet. Look at the line above the calculation, then pin again.",
      );
    if (!sent.ok) return setTrouble(tellProblem(sent.problem));
    setPinned({ version: sent.value.version, url: new URL(sent.value.url, location.href).href });
    props.onPinned(sent.value.version);
  };
  const close = () => {
    setPinned(undefined);
    setSummary("");
    setAccepts(false);
    props.onClose();
  };

  return (
    <Dialog
      title={pinned ? `Version ${pinned.version} is pinned` : "Pin a version"}
      open={props.open}
      onClose={close}
    >
      {pinned ? (
        <div className="space-y-3 font-sans text-sm">
          <p>Its page will always show these numbers:</p>
          <p className="break-all">
            <a className="text-calcium underline" href={pinned.url}>
              {pinned.url}
            </a>{" "}
            <CopyButton text={pinned.url} label="copy the link" />
          </p>
          <p>{audience[props.visibility]}</p>
        </div>
      ) : (
        <form
          className="space-y-4 font-sans text-sm"
          onSubmit={(event) => {
            event.preventDefault();
            void pin();
          }}
        >
          <p>
            A version keeps the calculation and its results as they are now, for good. It can be
            withdrawn with a reason, but not changed or deleted. {audience[props.visibility]}
          </p>
          <Field
            label="Summary"
            hint="What this version is, in a line."
            value={summary}
            maxLength={500}
            required
            onChange={(event) => setSummary(event.target.value)}
          />
          {faulty > 0 && (
            <Message tone="error">
              {faulty === 1 ? "One cell has an error." : `${faulty} cells have errors.`}{" "}
              <label className="mt-1 flex gap-2">
                <input
                  type="checkbox"
                  checked={accepts}
                  onChange={(event) => setAccepts(event.target.checked)}
                />
                Pin it all the same; readers will see the errors.
              </label>
            </Message>
          )}
          {trouble && <Message tone="error">{trouble}</Message>}
          <Button
            look="primary"
            type="submit"
            disabled={busy || summary.trim() === "" || (faulty > 0 && !accepts)}
          >
            {busy ? "Pinning…" : "Pin this version"}
          </Button>
        </form>
      )}
    </Dialog>
  );
}
