"use client";

import { type KeyboardEvent, useCallback, useMemo, useReducer, useState } from "react";
import { Margin } from "@/components/margin/margin";
import { Button } from "@/components/ui/button";
import { Message } from "@/components/ui/message";
import type { CalculationFile, Draft, EvaluateAnswer } from "@/lib/schema";
import { ConflictPanel } from "./conflict-panel";
import { FolioBar } from "./folio-bar";
import { FolioCells } from "./folio-cells";
import { FolioContext } from "./folio-context";
import { FolioHead } from "./folio-head";
import { folioReducer, startFolio } from "./folio-state";
import { KeyHelp } from "./key-help";
import { PinDialog } from "./pin-dialog";
import { ResultSummary } from "./result-summary";
import { useCellActs } from "./use-cell-acts";
import { markMoment, useEvaluation } from "./use-evaluation";
import { useJournal } from "./use-journal";
import { useSaving } from "./use-saving";

function isTextField(target: EventTarget): boolean {
  return (
    target instanceof HTMLElement &&
    target.closest("input, textarea, select, [contenteditable]") !== null
  );
}

/** The calculation as its author works on it: cells, thread and margin. */
export function Folio({ draft, first }: { draft: Draft; first: EvaluateAnswer | undefined }) {
  const [state, dispatch] = useReducer(folioReducer, draft, startFolio);
  const [versions, setVersions] = useState(draft.versions);
  const [visibility, setVisibility] = useState(draft.visibility);
  const [showing, setShowing] = useState<"pin" | "keys" | null>(null);
  const { answer, evaluated, trouble } = useEvaluation(state.file, first);
  const saving = useSaving(draft.id, state, dispatch);
  const journal = useJournal(draft.id, state, dispatch);
  const acts = useCellActs(state, dispatch, () => setShowing("keys"));

  const edit = useCallback((file: CalculationFile, quiet = false) => {
    markMoment("lo:keystroke");
    dispatch({ type: "edit", file, quiet });
  }, []);
  const context = useMemo(() => ({ state, dispatch, answer, edit }), [state, answer, edit]);
  const onKeyDown = (event: KeyboardEvent) => {
    const isUndo = (event.ctrlKey || event.metaKey) && event.key.toLowerCase() === "z";
    if (!isUndo || isTextField(event.target)) return;
    event.preventDefault();
    dispatch({ type: event.shiftKey ? "redo" : "undo" });
  };
  const setAside = () => {
    edit(state.base.file);
    journal.dismiss();
  };

  return (
    <FolioContext value={context}>
      {/* biome-ignore lint/a11y/noStaticElementInteractions: undo belongs to the whole folio. */}
      <div className="folio" onKeyDown={onKeyDown}>
        <div className="folio-column">
          <FolioBar
            id={draft.id}
            saving={saving}
            keeping={journal.keeping}
            onKeys={() => setShowing("keys")}
            onPin={() => setShowing("pin")}
          />
          {journal.restored && (
            <Message>
              Work that was kept in this browser was brought back and merged with what is saved.{" "}
              <Button look="quiet" onClick={journal.dismiss}>
                keep it
              </Button>{" "}
              <Button look="quiet" onClick={setAside}>
                set it aside
              </Button>
            </Message>
          )}
          {trouble && (
            <Message tone="error">The numbers are those of a moment ago: {trouble}</Message>
          )}
          <ConflictPanel />
          <FolioHead file={state.file} edit={edit} />
          <FolioCells evaluated={evaluated} acts={acts} />
          <ResultSummary answer={answer} waiting={evaluated !== state.file} />
        </div>
        <Margin
          id={draft.id}
          versions={versions}
          visibility={visibility}
          onVisibility={setVisibility}
        />
      </div>
      <PinDialog
        id={draft.id}
        open={showing === "pin"}
        visibility={visibility}
        file={state.file}
        answer={answer}
        flush={saving.flush}
        onPinned={(version) => setVersions([...versions, version])}
        onClose={() => setShowing(null)}
      />
      <KeyHelp open={showing === "keys"} onClose={() => setShowing(null)} />
    </FolioContext>
  );
}
