"use client";

import { type Dispatch, useCallback, useEffect, useRef, useState } from "react";
import { sameValue } from "@/lib/calculations/merge";
import type { Problem } from "@/lib/schema";
import { saveFile, tellProblem } from "./folio-api";
import type { FolioAction, FolioState } from "./folio-state";

/** A pause in typing after which the draft is saved, and the waits between tries that fail. */
const debounceMs = 700;
const firstRetryMs = 2_000;
const lastRetryMs = 60_000;

export type SavingStatus =
  | { readonly word: "saved" }
  | { readonly word: "saving" }
  | { readonly word: "unsaved" }
  /** The server is out of reach; tried again by itself. */
  | { readonly word: "offline" }
  | { readonly word: "signed-out" }
  /** Two people changed one cell; waits for a decision. */
  | { readonly word: "conflict" }
  | { readonly word: "refused"; readonly why: string };

export interface Saving {
  readonly status: SavingStatus;
  /** Save now; the revision once the server has everything, undefined where it could not. */
  readonly flush: () => Promise<number | undefined>;
}

function outcomeOf(problem: Problem | undefined): SavingStatus {
  if (!problem || problem.status >= 500) return { word: "offline" };
  if (problem.status === 401) return { word: "signed-out" };
  return { word: "refused", why: tellProblem(problem) };
}

/** Saves the draft by itself, merges what others saved, and tries again after a failure. */
export function useSaving(id: string, state: FolioState, dispatch: Dispatch<FolioAction>): Saving {
  const [outcome, setOutcome] = useState<SavingStatus>({ word: "saved" });
  const latest = useRef(state);
  latest.current = state;
  const running = useRef<Promise<number | undefined> | null>(null);
  const waitMs = useRef(firstRetryMs);

  const dirty = state.file !== state.base.file && !sameValue(state.file, state.base.file);

  const saveOnce = useCallback(async (): Promise<number | undefined> => {
    const { file, base, conflicts } = latest.current;
    if (conflicts.length > 0) return undefined;
    if (sameValue(file, base.file)) return base.revision;
    setOutcome({ word: "saving" });
    const sent = await saveFile(id, file, base.revision);
    if (sent.ok) {
      waitMs.current = firstRetryMs;
      const saved = { file, revision: sent.value.revision, savedAt: sent.value.savedAt };
      latest.current = { ...latest.current, base: saved };
      dispatch({ type: "saved", base: saved });
      setOutcome({ word: "saved" });
      return saved.revision;
    }
    if (sent.problem?.status === 412 && sent.problem.current) {
      dispatch({ type: "stale", theirs: sent.problem.current });
      setOutcome({ word: "unsaved" });
      return undefined;
    }
    setOutcome(outcomeOf(sent.problem));
    return undefined;
  }, [id, dispatch]);

  const flush = useCallback(async (): Promise<number | undefined> => {
    while (running.current) await running.current;
    running.current = saveOnce().finally(() => {
      running.current = null;
    });
    return running.current;
  }, [saveOnce]);

  // biome-ignore lint/correctness/useExhaustiveDependencies: each change of the file starts the pause anew.
  useEffect(() => {
    if (!dirty || state.conflicts.length > 0) return;
    const timer = setTimeout(flush, debounceMs);
    return () => clearTimeout(timer);
  }, [dirty, state.file, state.base, state.conflicts.length, flush]);

  // Each failure is a new outcome, so the next try is set with a longer wait.
  useEffect(() => {
    if (outcome.word !== "offline" && outcome.word !== "signed-out") return;
    const again = () => void flush();
    const timer = setTimeout(again, waitMs.current);
    waitMs.current = Math.min(waitMs.current * 2, lastRetryMs);
    window.addEventListener("online", again);
    window.addEventListener("focus", again);
    return () => {
      clearTimeout(timer);
      window.removeEventListener("online", again);
      window.removeEventListener("focus", again);
    };
  }, [outcome, flush]);

  return { status: statusOf(state, dirty, outcome), flush };
}

function statusOf(state: FolioState, dirty: boolean, outcome: SavingStatus): SavingStatus {
  if (state.conflicts.length > 0) return { word: "conflict" };
  if (!dirty && outcome.word !== "saving") return { word: "saved" };
  return outcome.word === "saved" ? { word: "unsaved" } : outcome;
}
