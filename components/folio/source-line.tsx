"use client";

import { autocompletion, type Completion, completionKeymap } from "@codemirror/autocomplete";
import { history, historyKeymap, standardKeymap } from "@codemirror/commands";
import { type Diagnostic, setDiagnostics } from "@codemirror/lint";
import { EditorState } from "@codemirror/state";
import { EditorView, keymap } from "@codemirror/view";
import { useEffect, useRef } from "react";
import type { LineDiagnostic } from "./diagnostics";

export interface SourceLineProps {
  readonly line: string;
  readonly label: string;
  readonly diagnostics: readonly LineDiagnostic[];
  readonly completions: () => readonly Completion[];
  readonly onType: (line: string) => void;
  readonly onFinish: (line: string) => void;
  readonly onClose: () => void;
}

const theme = EditorView.theme({
  "&": {
    fontFamily: "var(--font-mono)",
    fontSize: "0.9rem",
    background: "transparent",
    color: "var(--color-ink)",
  },
  "&.cm-focused": { outline: "none" },
  ".cm-content": { caretColor: "var(--color-calcium)", padding: "0.35rem 0" },
  ".cm-line": { padding: "0 0.25rem" },
  ".cm-tooltip": {
    background: "var(--color-ground)",
    color: "var(--color-ink)",
    border: "1px solid var(--color-rule)",
  },
  ".cm-tooltip-autocomplete ul li[aria-selected]": {
    background: "var(--color-calcium)",
    color: "var(--color-ground)",
  },
  ".cm-completionDetail": { fontStyle: "normal", opacity: "0.75", marginLeft: "1rem" },
  ".cm-diagnostic": { fontFamily: "var(--font-sans)", borderLeft: "3px solid var(--color-sodium)" },
  ".cm-diagnostic-error": { borderLeftColor: "var(--color-halpha)" },
  ".cm-lintRange-error": { backgroundImage: "none", borderBottom: "2px solid var(--color-halpha)" },
  ".cm-lintRange-warning, .cm-lintRange-info": {
    backgroundImage: "none",
    borderBottom: "2px dotted var(--color-sodium)",
  },
});

/** Only one line: a pasted line break becomes a space. */
const oneLine = EditorState.transactionFilter.of((transaction) =>
  transaction.newDoc.lines > 1
    ? [transaction, { changes: joinLines(transaction.newDoc.toString()), sequential: true }]
    : transaction,
);

function joinLines(text: string) {
  return [...text.matchAll(/\s*\n\s*/g)].map((match) => ({
    from: match.index,
    to: match.index + match[0].length,
    insert: " ",
  }));
}

function toDiagnostic(one: LineDiagnostic, length: number): Diagnostic {
  const { severity, message } = one;
  return { from: Math.min(one.from, length), to: Math.min(one.to, length), severity, message };
}

/** The pencil line under an equation: its source, with completion and faults under the characters. */
export default function SourceLine(props: SourceLineProps) {
  const holder = useRef<HTMLDivElement>(null);
  const view = useRef<EditorView | null>(null);
  const latest = useRef(props);
  latest.current = props;

  useEffect(() => {
    const parent = holder.current;
    if (!parent) return;
    const { line, label } = latest.current;
    const editor = new EditorView({ parent, state: startState(line, label, latest) });
    view.current = editor;
    editor.focus();
    editor.dispatch({ selection: { anchor: editor.state.doc.length } });
    return () => {
      view.current = null;
      editor.destroy();
    };
  }, []);

  useEffect(() => {
    const editor = view.current;
    // A change from outside (undo, a merge, an accepted suggestion) replaces the text.
    if (editor && editor.state.doc.toString() !== props.line) {
      editor.dispatch({ changes: { from: 0, to: editor.state.doc.length, insert: props.line } });
    }
  }, [props.line]);

  useEffect(() => {
    const editor = view.current;
    if (!editor) return;
    const { length } = editor.state.doc;
    const shown = props.diagnostics.map((one) => toDiagnostic(one, length));
    editor.dispatch(setDiagnostics(editor.state, shown));
  }, [props.diagnostics]);

  return <div ref={holder} className="source-line" />;
}

function startState(
  line: string,
  label: string,
  latest: { current: SourceLineProps },
): EditorState {
  const text = (view: EditorView) => view.state.doc.toString();
  return EditorState.create({
    doc: line,
    extensions: [
      theme,
      history(),
      oneLine,
      EditorView.lineWrapping,
      EditorView.contentAttributes.of({
        "aria-label": label,
        spellcheck: "false",
        autocapitalize: "off",
      }),
      autocompletion({
        icons: false,
        // Enter finishes the line as it was typed; a name of the list is taken once it was chosen.
        selectOnOpen: false,
        override: [
          (context) => {
            const word = context.matchBefore(/[\p{L}][\p{L}\p{N}_]*/u);
            if (!word && !context.explicit) return null;
            return {
              from: word?.from ?? context.pos,
              options: latest.current.completions(),
              validFor: /^[\p{L}\p{N}_]*$/u,
            };
          },
        ],
      }),
      keymap.of([
        ...completionKeymap,
        {
          key: "Enter",
          run: (view) => {
            latest.current.onFinish(text(view));
            return true;
          },
        },
        {
          key: "Escape",
          run: () => {
            latest.current.onClose();
            return true;
          },
        },
        ...historyKeymap,
        ...standardKeymap,
      ]),
      EditorView.updateListener.of((update) => {
        if (update.docChanged && text(update.view) !== latest.current.line) {
          latest.current.onType(text(update.view));
        }
      }),
    ],
  });
}
