"use client";

import { CopyButton } from "@/components/ui/copy-button";

/** The address of a version, to be copied whole. */
export function CopyLink({ url, number }: { url: string; number: number }) {
  return <CopyButton text={url} label="copy link" what={`to v${number}`} />;
}
