"use client";

import { Dialog } from "@/components/ui/dialog";
import { folioKeys } from "./keys";

/** The keys of the folio. */
export function KeyHelp({ open, onClose }: { open: boolean; onClose: () => void }) {
  return (
    <Dialog title="Keys" open={open} onClose={onClose}>
      <dl className="grid grid-cols-[auto_1fr] gap-x-4 gap-y-1 font-sans text-sm">
        {folioKeys.map(({ keys, does }) => (
          <div key={does} className="contents">
            <dt className="font-mono">{keys.join(", ")}</dt>
            <dd>{does}</dd>
          </div>
        ))}
      </dl>
      <p className="mt-3 font-sans text-sm text-faint">
        They work while a cell has the focus, not while you type.
      </p>
    </Dialog>
  );
}
