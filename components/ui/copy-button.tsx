"use client";

import { useState } from "react";
import { Button } from "./button";

const saidMs = 1_500;

/** True once the text is on the clipboard; browsers refuse it on pages without TLS. */
async function writeClipboard(text: string): Promise<boolean> {
  try {
    await navigator.clipboard.writeText(text);
    return true;
  } catch {
    return false;
  }
}

/** Copies a text and says so. `what` names the thing for those who cannot see what stands beside. */
export function CopyButton({
  text,
  label = "copy",
  what,
}: {
  text: string;
  label?: string;
  what?: string;
}) {
  const [said, setSaid] = useState<string>();
  const copy = async () => {
    setSaid((await writeClipboard(text)) ? "copied" : "not copied: select it by hand");
    setTimeout(() => setSaid(undefined), saidMs);
  };
  return (
    <>
      <Button look="quiet" onClick={copy}>
        {said ?? label}
        {what && !said && <span className="sr-only">&nbsp;{what}</span>}
      </Button>
      <span role="status" className="sr-only">
        {said}
      </span>
    </>
  );
}
