import { z } from "zod";
import { type CalculationFile, calculationSchema } from "@/lib/schema";

/**
 * Work that the server has not confirmed, kept in this browser. One entry a tab, so that two tabs of
 * one calculation do not overwrite each other's.
 */
export interface JournalEntry {
  readonly base: CalculationFile;
  readonly file: CalculationFile;
  readonly pending: Readonly<Record<string, string>>;
  /** Milliseconds since 1970 when it was written. */
  readonly at: number;
}

const schema = z.object({
  base: calculationSchema,
  file: calculationSchema,
  pending: z.record(z.string(), z.string()),
  at: z.number(),
});

type Store = Pick<Storage, "getItem" | "setItem" | "removeItem" | "key" | "length">;

const prefix = (calculation: string) => `leading-order:unsaved:${calculation}:`;
/** An entry of another tab that has not been touched for so long belongs to a tab that is gone. */
const abandonedMs = 15_000;

export function keepWork(
  store: Store,
  calculation: string,
  tab: string,
  entry: JournalEntry,
): boolean {
  try {
    store.setItem(prefix(calculation) + tab, JSON.stringify(entry));
    return true;
  } catch {
    // The browser refuses (its store is full or closed): the caller says so to the person.
    return false;
  }
}

export function forgetWork(store: Store, calculation: string, tab: string): void {
  store.removeItem(prefix(calculation) + tab);
}

/** Take over what this tab, or tabs that are gone, left unsaved; oldest first. */
export function takeWork(
  store: Store,
  calculation: string,
  tab: string,
  now: number,
): JournalEntry[] {
  const keys = Array.from({ length: store.length }, (_, i) => store.key(i) ?? "");
  const entries: JournalEntry[] = [];
  for (const key of keys.filter((one) => one.startsWith(prefix(calculation)))) {
    const entry = parseEntry(store.getItem(key));
    if (!entry) continue;
    if (key !== prefix(calculation) + tab && now - entry.at < abandonedMs) continue;
    entries.push(entry);
    if (key !== prefix(calculation) + tab) store.removeItem(key);
  }
  return entries.sort((a, b) => a.at - b.at);
}

function parseEntry(text: string | null): JournalEntry | undefined {
  if (text === null) return undefined;
  try {
    return schema.parse(JSON.parse(text));
  } catch {
    // An entry of another release that cannot be read stays where it is.
    return undefined;
  }
}
