"use client";

import { useState } from "react";
import { Button } from "./button";

const saidMs = 1_500;

/** Copies a text and says so. */
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
    const done = await navigator.clipboard.writeText(text).then(
      () => "copied",
      () => "not copied: select it by hand",
    );
    setSaid(done);
    setTimeout(() => setSaid(undefined), saidMs);
  };
  return (
    <Button look="quiet" onClick={copy} aria-label={what ? `${label} ${what}` : undefined}>
      <span aria-live="polite">{said ?? label}</span>
    </Button>
  );
}
