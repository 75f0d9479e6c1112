"use client";

import { useState } from "react";
import { CopyButton } from "@/components/ui/copy-button";
import { Dialog } from "@/components/ui/dialog";
import type { CalculationFile, Draft, EvaluateAnswer, Visibility } from "@/lib/schema";
import { pinDraft, type Sent, tellProblem } from "./folio-api";
import { PinForm } from "./pin-form";

interface PinDialogProps {
  readonly id: string;
  readonly open: boolean;
  readonly visibility: Visibility;
  readonly file: CalculationFile;
  readonly answer: EvaluateAnswer;
  readonly flush: () => Promise<number | undefined>;
  readonly onPinned: (version: Draft["versions"][number]) => void;
  readonly onClose: () => void;
}

interface Pinned {
  readonly version: number;
  readonly url: string;
}

const unsaved =
  "The draft is not saved yet. Look at the line above the calculation, then pin again.";

/** Who can read a pinned version, said before and after the act. */
export const audience: Record<Visibility, string> = {
  private: "Only you can read it, until you open the calculation to others.",
  link: "Everybody who has the link can read it, now and later.",
  public: "Everybody can find and read it, now and later.",
};

/** Pinning: an act with a summary, after which the version never changes. */
export function PinDialog(props: PinDialogProps) {
  const { id, open, visibility, file, answer, flush, onPinned, onClose } = props;
  const [pinned, setPinned] = useState<Pinned>();
  const pin = async (summary: string, acceptErrors: boolean): Promise<string | undefined> => {
    const revision = await flush();
    if (revision === undefined) return unsaved;
    const sent: Sent<Pinned> = await pinDraft(id, {
      summary,
      revision,
      ...(acceptErrors ? { acceptErrors } : {}),
    });
    if (!sent.ok) return tellProblem(sent.problem);
    const { version, url } = sent.value;
    setPinned({ version, url: new URL(url, location.href).href });
    onPinned({ number: version, summary, pinnedAt: new Date().toISOString(), withdrawn: false });
    return undefined;
  };
  const close = () => {
    setPinned(undefined);
    onClose();
  };
  return (
    <Dialog
      title={pinned ? `v${pinned.version} is pinned` : "Pin a version"}
      open={open}
      onClose={close}
    >
      {pinned ? (
        <div className="space-y-3 font-sans text-sm">
          <p>Its page always shows these numbers:</p>
          <p className="break-all">
            <a className="link" href={pinned.url}>
              {pinned.url}
            </a>{" "}
            <CopyButton text={pinned.url} label="copy link" what={`to v${pinned.version}`} />
          </p>
          <p>{audience[visibility]}</p>
        </div>
      ) : (
        <PinForm file={file} answer={answer} visibility={visibility} onPin={pin} />
      )}
    </Dialog>
  );
}
