"use client";

import { type Dispatch, useEffect, useState } from "react";
import { sameValue } from "@/lib/calculations/merge";
import type { FolioAction, FolioState } from "./folio-state";
import { forgetWork, keepWork, takeWork } from "./journal";

function tabName(): string {
  const key = "leading-order:tab";
  const known = sessionStorage.getItem(key);
  if (known) return known;
  const made = crypto.randomUUID();
  sessionStorage.setItem(key, made);
  return made;
}

const heartbeatMs = 5_000;

export interface JournalState {
  /** True after work that was kept in this browser came back. */
  readonly restored: boolean;
  /** False where the browser cannot keep anything. */
  readonly keeping: boolean;
  /** The person has seen that work came back. */
  readonly dismiss: () => void;
}

/** Keeps unsaved work in this browser until the server has confirmed it, and brings it back. */
export function useJournal(
  id: string,
  state: FolioState,
  dispatch: Dispatch<FolioAction>,
): JournalState {
  const [restored, setRestored] = useState(false);
  const [keeping, setKeeping] = useState(true);
  const [ready, setReady] = useState(false);

  useEffect(() => {
    for (const entry of takeWork(localStorage, id, tabName(), Date.now())) {
      dispatch({ type: "restored", ...entry });
      setRestored(true);
    }
    setReady(true);
  }, [id, dispatch]);

  const { file, base, pending } = state;
  useEffect(() => {
    if (!ready) return;
    const unsaved = !sameValue(file, base.file) || Object.keys(pending).length > 0;
    if (!unsaved) return forgetWork(localStorage, id, tabName());
    const keep = () => {
      const entry = { base: base.file, file, pending, at: Date.now() };
      setKeeping(keepWork(localStorage, id, tabName(), entry));
    };
    keep();
    // The time of the entry tells other tabs that this one is alive.
    const timer = setInterval(keep, heartbeatMs);
    return () => clearInterval(timer);
  }, [id, file, base, pending, ready]);

  return { restored, keeping, dismiss: () => setRestored(false) };
}
