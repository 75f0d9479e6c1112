"use client";

import { type ReactNode, useEffect, useId, useRef } from "react";
import { Button } from "./button";

/** Opens or closes the element; once open, the first field has the focus. */
function show(dialog: HTMLDialogElement, open: boolean): void {
  if (!open && dialog.open) dialog.close();
  if (!open || dialog.open) return;
  dialog.showModal();
  dialog.querySelector<HTMLElement>("input, textarea, select")?.focus();
}

/** A dialog of the browser's own kind: it keeps the focus, and Escape closes it. */
export function Dialog({
  title,
  open,
  onClose,
  children,
}: {
  title: string;
  open: boolean;
  onClose: () => void;
  children: ReactNode;
}) {
  const dialog = useRef<HTMLDialogElement>(null);
  const id = useId();
  useEffect(() => {
    if (dialog.current) show(dialog.current, open);
  }, [open]);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={id}
      onClose={onClose}
      className="m-auto max-h-[calc(100dvh-2rem)] w-[min(36rem,calc(100vw-2rem))] overflow-y-auto border border-ink bg-ground p-5 text-ink backdrop:bg-black/50 sm:p-6"
    >
      {open && (
        <>
          <div className="mb-4 flex items-baseline justify-between gap-4 border-b border-rule pb-2">
            <h2 id={id} className="text-xl">
              {title}
            </h2>
            <Button look="quiet" onClick={onClose}>
              close
            </Button>
          </div>
          {children}
        </>
      )}
    </dialog>
  );
}
