"use client";

import { type KeyboardEvent, useMemo, useReducer, useRef, useState } from "react";
import { MarginConstants } from "@/components/margin/margin-constants";
import { MarginGivens } from "@/components/margin/margin-givens";
import { MarginVersions } from "@/components/margin/margin-versions";
import { Button } from "@/components/ui/button";
import { Message } from "@/components/ui/message";
import type { CalculationFile, Draft, EvaluateAnswer } from "@/lib/schema";
import { ConflictPanel } from "./conflict-panel";
import { insertCell, newCellId } from "./edit-file";
import { FolioCell } from "./folio-cell";
import { FolioContext } from "./folio-context";
import { FolioHead } from "./folio-head";
import { folioReducer, startFolio } from "./folio-state";
import { KeyHelp } from "./key-help";
import { newCell, systemOf } from "./line-edit";
import { NewLine } from "./new-line";
import { PinDialog } from "./pin-dialog";
import { ResultSummary } from "./result-summary";
import { SavingLine } from "./saving-line";
import { Thread } from "./thread";
import { useCellActs } from "./use-cell-acts";
import { useEvaluation } from "./use-evaluation";
import { useJournal } from "./use-journal";
import { useSaving } from "./use-saving";
import { VisibilityChoice } from "./visibility-choice";

const nothing: readonly string[] = [];

function isTextField(target: EventTarget): boolean {
  return (
    target instanceof HTMLElement &&
    target.closest("input, textarea, select, [contenteditable]") !== null
  );
}

/** The calculation as its author works on it: cells, thread and margin. */
export function Folio({ draft, first }: { draft: Draft; first: EvaluateAnswer }) {
  const [state, dispatch] = useReducer(folioReducer, draft, startFolio);
  const [versions, setVersions] = useState(draft.versions);
  const [visibility, setVisibility] = useState(draft.visibility);
  const [showing, setShowing] = useState<"pin" | "keys" | null>(null);
  const column = useRef<HTMLDivElement>(null);
  const newLine = useRef<HTMLTextAreaElement>(null);
  const { answer, waiting, trouble } = useEvaluation(state.file, first);
  const saving = useSaving(draft.id, state, dispatch);
  const journal = useJournal(draft.id, state, dispatch);
  const acts = useCellActs(state, dispatch, newLine);

  const edit = useMemo(
    () => (file: CalculationFile, quiet?: boolean) =>
      dispatch({ type: "edit", file, ...(quiet ? { quiet } : {}) }),
    [],
  );
  const context = useMemo(() => ({ state, dispatch, answer, edit }), [state, answer, edit]);
  const shown = answer.presentation?.cells;
  const inHand = state.current === null ? undefined : shown?.[state.current];

  const onKeyDown = (event: KeyboardEvent) => {
    if (isTextField(event.target)) return;
    if ((event.ctrlKey || event.metaKey) && event.key.toLowerCase() === "z") {
      event.preventDefault();
      dispatch({ type: event.shiftKey ? "redo" : "undo" });
    }
    if (event.key === "?") setShowing("keys");
    if (event.key === "End") {
      event.preventDefault();
      newLine.current?.focus();
    }
  };
  const write = (line: string) => {
    const id = newCellId(state.file);
    const cell = newCell(line, id, systemOf(state.file));
    if (!cell) return;
    edit(insertCell(state.file, cell, state.current));
    dispatch({ type: "hold", id: state.current === null ? null : id });
  };

  return (
    <FolioContext value={context}>
      {/* biome-ignore lint/a11y/noStaticElementInteractions: keys that belong to the whole folio. */}
      <div className="folio" onKeyDown={onKeyDown}>
        <div className="folio-column" ref={column}>
          <div className="folio-bar">
            <SavingLine status={saving.status} base={state.base} keeping={journal.keeping} />
            <span className="flex gap-2">
              <Button
                look="quiet"
                disabled={state.past.length === 0}
                onClick={() => dispatch({ type: "undo" })}
              >
                undo
              </Button>
              <Button
                look="quiet"
                disabled={state.future.length === 0}
                onClick={() => dispatch({ type: "redo" })}
              >
                redo
              </Button>
              <Button look="quiet" onClick={() => setShowing("keys")}>
                keys
              </Button>
              <Button look="primary" onClick={() => setShowing("pin")}>
                Pin a version
              </Button>
            </span>
          </div>
          {journal.restored && (
            <Message>Work that was kept in this browser was brought back.</Message>
          )}
          {trouble && (
            <Message tone="error">The numbers are those of a moment ago: {trouble}</Message>
          )}
          <ConflictPanel />
          <FolioHead file={state.file} edit={edit} />
          <div className="folio-cells">
            <Thread
              column={column}
              current={state.current}
              uses={inHand?.uses ?? nothing}
              usedBy={inHand?.usedBy ?? nothing}
            />
            {state.file.cells.map((cell, index) => (
              <FolioCell
                key={cell.id}
                cell={cell}
                index={index}
                result={answer.cells[cell.id]}
                shown={shown?.[cell.id]}
                inHand={state.current === cell.id}
                isOpen={state.open === cell.id}
                stale={waiting && state.open === cell.id}
                acts={acts}
              />
            ))}
            <NewLine
              ref={newLine}
              file={state.file}
              below={state.current}
              onWrite={write}
              onLeave={() => dispatch({ type: "hold", id: null })}
            />
          </div>
          <ResultSummary answer={answer} waiting={waiting} />
        </div>
        <aside className="margin" aria-label="Margin">
          <details open>
            <summary>Givens, constants and versions</summary>
            <MarginGivens />
            <MarginConstants />
            <MarginVersions id={draft.id} versions={versions} />
            <section className="margin-part" aria-labelledby="margin-readers">
              <h2 id="margin-readers">Readers</h2>
              <VisibilityChoice id={draft.id} visibility={visibility} onChange={setVisibility} />
            </section>
          </details>
        </aside>
      </div>
      <PinDialog
        id={draft.id}
        open={showing === "pin"}
        visibility={visibility}
        answer={answer}
        flush={saving.flush}
        onPinned={(number) =>
          setVersions([
            ...versions,
            { number, summary: "", pinnedAt: new Date().toISOString(), withdrawn: false },
          ])
        }
        onClose={() => setShowing(null)}
      />
      <KeyHelp open={showing === "keys"} onClose={() => setShowing(null)} />
    </FolioContext>
  );
}
