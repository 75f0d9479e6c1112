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
  /** The cell below which a new one is being written; null for the last line only. */
  readonly writingBelow: string | null;
  /** Lines that no cell can hold yet, such as `L =`, by cell; new ones by `newLineKey`. */
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
  | { readonly type: "write"; readonly below: string | null }
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

/** Where an unfinished new line is kept; no cell id begins with a plus sign. */
export function newLineKey(below: string | null): string {
  return `+${below ?? ""}`;
}

export function startFolio(draft: Draft): FolioState {
  return {
    file: draft.file,
    base: { file: draft.file, revision: draft.revision, savedAt: draft.savedAt },
    past: [],
    future: [],
    current: null,
    open: null,
    writingBelow: null,
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

/** Ids of one's own new cells change where somebody else's new cell has the same. */
function renameIn(state: FolioState, renamed: Readonly<Record<string, string>>): FolioState {
  const now = (id: string | null) => (id === null ? null : (renamed[id] ?? id));
  const pending = Object.entries(state.pending).map(([id, line]) => [renamed[id] ?? id, line]);
  return {
    ...state,
    current: now(state.current),
    open: now(state.open),
    writingBelow: now(state.writingBelow),
    pending: Object.fromEntries(pending),
  };
}

/** Theirs merged into ours, and into the steps to undo, so that undoing keeps what others did. */
function joined(state: FolioState, theirs: Base): FolioState {
  const from = state.base.file;
  const join = (mine: CalculationFile) => merge(from, mine, theirs.file).file;
  const { file, conflicts, renamed } = merge(from, state.file, theirs.file);
  return {
    ...renameIn(state, renamed),
    file,
    base: theirs,
    conflicts,
    past: state.past.map(join),
    future: state.future.map(join),
  };
}

/** Work that was left in this browser merged into what is here; undoing sets it aside. */
function restored(
  state: FolioState,
  left: { base: CalculationFile; file: CalculationFile; pending: FolioState["pending"] },
): FolioState {
  const { file, conflicts } = merge(left.base, left.file, state.file);
  const next = edited(state, file, false);
  return {
    ...next,
    conflicts: [...state.conflicts, ...conflicts],
    pending: { ...left.pending, ...state.pending },
  };
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
    case "write":
      return { ...state, writingBelow: action.below };
    case "undo":
      return stepped(state, "past");
    case "redo":
      return stepped(state, "future");
    case "saved":
      return { ...state, base: action.base };
    case "stale": {
      const { file, revision, savedAt } = action.theirs;
      return joined(state, { file, revision, savedAt });
    }
    case "restored":
      return restored(state, action);
    case "settled":
      return {
        ...state,
        file: action.file,
        conflicts: state.conflicts.filter((one) => one !== action.conflict),
      };
  }
}
