"use client";

import { type ReactNode, useEffect, useId, useRef } from "react";
import { Button } from "./button";

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
    const { current } = dialog;
    if (open && !current?.open) current?.showModal();
    if (!open && current?.open) current.close();
  }, [open]);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={id}
      onClose={onClose}
      className="m-auto w-[min(36rem,calc(100vw-2rem))] border border-ink bg-ground p-6 text-ink backdrop:bg-black/40"
    >
      {open && (
        <>
          <div className="mb-4 flex items-baseline justify-between gap-4 border-b border-rule pb-2">
            <h2 id={id} className="font-serif text-xl font-semibold">
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
