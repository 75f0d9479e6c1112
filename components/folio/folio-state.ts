import { merge } from "@/lib/calculations/merge";
import type { CalculationFile, Draft } from "@/lib/schema";

/** What is known to be on the server. */
export interface Base {
  readonly file: CalculationFile;
  readonly revision: number;
  readonly savedAt: string;
}

export type Conflict = ReturnType<typeof merge>["conflicts"][number];

/** Everything the folio remembers while it is open. */
export interface FolioState {
  readonly file: CalculationFile;
  readonly base: Base;
  readonly past: readonly CalculationFile[];
  readonly future: readonly CalculationFile[];
  /** The cell in hand. */
  readonly current: string | null;
  /** The cell whose source line is open. */
  readonly open: string | null;
  /** A line being typed that its cell cannot hold yet, such as `L =`. */
  readonly pending: Readonly<Record<string, string>>;
  /** Cells that both sides changed; saving waits until they are settled. */
  readonly conflicts: readonly Conflict[];
}

export type FolioAction =
  /** A change by hand; with `quiet`, one more keystroke of the change before. */
  | { readonly type: "edit"; readonly file: CalculationFile; readonly quiet?: boolean }
  | { readonly type: "pend"; readonly id: string; readonly line: string | undefined }
  | { readonly type: "hold"; readonly id: string | null }
  | { readonly type: "open"; readonly id: string | null }
  | { readonly type: "undo" }
  | { readonly type: "redo" }
  | { readonly type: "saved"; readonly base: Base }
  /** Somebody saved first: theirs and ours are merged by cell. */
  | { readonly type: "stale"; readonly theirs: Draft }
  /** Work kept in this browser comes back. */
  | {
      readonly type: "restored";
      readonly base: CalculationFile;
      readonly file: CalculationFile;
      readonly pending: FolioState["pending"];
    }
  | { readonly type: "settled"; readonly file: CalculationFile; readonly conflict: Conflict };

const mostSteps = 200;

export function startFolio(draft: Draft): FolioState {
  return {
    file: draft.file,
    base: { file: draft.file, revision: draft.revision, savedAt: draft.savedAt },
    past: [],
    future: [],
    current: null,
    open: null,
    pending: {},
    conflicts: [],
  };
}

function edited(state: FolioState, file: CalculationFile, quiet: boolean): FolioState {
  if (file === state.file) return state;
  const past = quiet ? state.past : [...state.past, state.file].slice(-mostSteps);
  return { ...state, file, past, future: [] };
}

function stepped(state: FolioState, from: "past" | "future"): FolioState {
  const steps = state[from];
  const file = steps[steps.length - 1];
  if (!file) return state;
  const rest = steps.slice(0, -1);
  return from === "past"
    ? { ...state, file, past: rest, future: [...state.future, state.file], open: null, pending: {} }
    : { ...state, file, future: rest, past: [...state.past, state.file], open: null, pending: {} };
}

function merged(
  state: FolioState,
  mine: CalculationFile,
  from: CalculationFile,
  theirs: Base,
): FolioState {
  const { file, conflicts } = merge(from, mine, theirs.file);
  return { ...state, file, base: theirs, conflicts };
}

function pended(state: FolioState, id: string, line: string | undefined): FolioState {
  const { [id]: _dropped, ...rest } = state.pending;
  return { ...state, pending: line === undefined ? rest : { ...rest, [id]: line } };
}

/** The folio after an action. Pure. */
export function folioReducer(state: FolioState, action: FolioAction): FolioState {
  switch (action.type) {
    case "edit":
      return edited(state, action.file, action.quiet === true);
    case "pend":
      return pended(state, action.id, action.line);
    case "hold":
      return { ...state, current: action.id };
    case "open":
      return { ...state, open: action.id, current: action.id ?? state.current };
    case "undo":
      return stepped(state, "past");
    case "redo":
      return stepped(state, "future");
    case "saved":
      return { ...state, base: action.base };
    case "stale": {
      const { file, revision, savedAt } = action.theirs;
      return merged(state, state.file, state.base.file, { file, revision, savedAt });
    }
    case "restored": {
      const next = merged(state, action.file, action.base, state.base);
      return { ...next, pending: { ...action.pending, ...state.pending } };
    }
    case "settled":
      return {
        ...state,
        file: action.file,
        conflicts: state.conflicts.filter((one) => one !== action.conflict),
      };
  }
}
